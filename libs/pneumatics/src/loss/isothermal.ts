import { airGasConstantJPerKgK, airHeatRatio, airViscosityPaS } from '../atmosphere/air';
import { darcyFrictionFactor, reynoldsNumber } from './friction-factor';

/** One length of bore that air flows through. SI inside the losses. */
export interface Bore {
  diameterM: number;
  lengthM: number;
  roughnessM: number;
  /** Times the friction of the straight bore; 1 without couplings. */
  frictionMultiple: number;
}

/** Mach number at which isothermal flow chokes, 1/sqrt(k) = 0.845. */
export const isothermalLimitMach = 1 / Math.sqrt(airHeatRatio);

const areaM2 = (bore: Bore): number => (Math.PI / 4) * bore.diameterM * bore.diameterM;

/** f L/D of a bore at a flow, couplings included. */
export function frictionNumber(bore: Bore, flowKgS: number, temperatureK: number): number {
  const reynolds = reynoldsNumber(flowKgS, bore.diameterM, airViscosityPaS(temperatureK));
  const factor = darcyFrictionFactor(reynolds, bore.roughnessM / bore.diameterM);
  return (factor * bore.lengthM * bore.frictionMultiple) / bore.diameterM;
}

/** (m/A)^2 R T of a flow in a bore, Pa2: what friction and speed are multiplied by. */
const dynamicPa2 = (bore: Bore, flowKgS: number, temperatureK: number): number =>
  (flowKgS / areaM2(bore)) ** 2 * airGasConstantJPerKgK * temperatureK;

/** Newton's method; started beyond the isothermal limit, where the function rises and bends upwards. */
function inletFromOutletPa(outletPa: number, pushPa2: number, friction: number): number {
  let inletPa = Math.max(Math.sqrt(outletPa * outletPa + pushPa2 * friction), 1.001 * Math.sqrt(pushPa2));
  for (let step = 0; step < 40; step += 1) {
    const short =
      outletPa * outletPa + pushPa2 * (friction + 2 * Math.log(inletPa / outletPa)) - inletPa * inletPa;
    const nextPa = inletPa + short / (2 * inletPa - (2 * pushPa2) / inletPa);
    if (Math.abs(nextPa - inletPa) < 1e-10 * nextPa) return nextPa;
    inletPa = nextPa;
  }
  return inletPa;
}

/**
 * Inlet pressure that a flow needs for an outlet pressure, Pa absolute: P1^2 = P2^2 + (m/A)^2 R T (f L/D + 2 ln(P1/P2)), iterated.
 * Always has an answer. Source: isothermal Darcy (published).
 */
export function isothermalInletPa(
  bore: Bore,
  flowKgS: number,
  outletPa: number,
  temperatureK: number,
): number {
  if (flowKgS <= 0) return outletPa;
  const friction = frictionNumber(bore, flowKgS, temperatureK);
  return inletFromOutletPa(outletPa, dynamicPa2(bore, flowKgS, temperatureK), friction);
}

/**
 * Outlet pressure of a flow from an inlet pressure, Pa absolute; null where the bore cannot pass that much (the flow would
 * choke at the outlet). Newton's method from the inlet down. Source: isothermal Darcy (published).
 */
export function isothermalOutletPa(
  bore: Bore,
  flowKgS: number,
  inletPa: number,
  temperatureK: number,
): number | null {
  if (flowKgS <= 0) return inletPa;
  const pushPa2 = dynamicPa2(bore, flowKgS, temperatureK);
  // The outlet cannot fall below the pressure at which the flow reaches the isothermal limit.
  const chokedPa = Math.sqrt(pushPa2);
  if (chokedPa >= inletPa) return null;
  const friction = frictionNumber(bore, flowKgS, temperatureK);
  if (inletFromOutletPa(chokedPa, pushPa2, friction) > inletPa) return null;
  let outletPa = inletPa;
  for (let step = 0; step < 60; step += 1) {
    const over =
      outletPa * outletPa + pushPa2 * (friction + 2 * Math.log(inletPa / outletPa)) - inletPa * inletPa;
    const nextPa = Math.max(chokedPa, outletPa - over / (2 * outletPa - (2 * pushPa2) / outletPa));
    if (Math.abs(nextPa - outletPa) < 1e-10 * inletPa) return nextPa;
    outletPa = nextPa;
  }
  return outletPa;
}

/** Mach number of a flow in a bore at a pressure. */
export function machNumber(bore: Bore, flowKgS: number, pressurePa: number, temperatureK: number): number {
  const speedMS = (flowKgS * airGasConstantJPerKgK * temperatureK) / (pressurePa * areaM2(bore));
  return speedMS / Math.sqrt(airHeatRatio * airGasConstantJPerKgK * temperatureK);
}
