import { m3PerGal, mPerIn, paPerPsi } from '@rimeward/units';
import { airGasConstantJPerKgK, airHeatRatio, waterDensityKgM3 } from '../atmosphere/air';

const k = airHeatRatio;
/** Outlet over inlet pressure below which the flow chokes: 0.5283. */
export const criticalPressureRatio = (2 / (k + 1)) ** (k / (k - 1));
const chokedFactor = Math.sqrt(k / airGasConstantJPerKgK) * (2 / (k + 1)) ** ((k + 1) / (2 * (k - 1)));

/**
 * Discharge coefficient times area that passes a water flow under a pressure, m2: Cd A = q / sqrt(2 dp / rho). Source: orifice
 * equation (derived).
 */
export function orificeAreaM2(flowGpm: number, pressurePsi: number): number {
  const flowM3S = (flowGpm * m3PerGal) / 60;
  return flowM3S / Math.sqrt((2 * pressurePsi * paPerPsi) / waterDensityKgM3);
}

/** Area of a round hole, m2. */
export const holeAreaM2 = (diameterIn: number): number => (Math.PI / 4) * (diameterIn * mPerIn) ** 2;

/**
 * Air through an orifice from rest, kg/s; isentropic, choked below the critical ratio. `areaM2` is the discharge coefficient times
 * the area; pressures absolute. Checked against the printed table of discharge of air (published).
 */
export function orificeFlowKgS(
  areaM2: number,
  upstreamPa: number,
  downstreamPa: number,
  upstreamK: number,
): number {
  const ratio = downstreamPa / upstreamPa;
  if (ratio >= 1) return 0;
  if (ratio <= criticalPressureRatio) return (areaM2 * upstreamPa * chokedFactor) / Math.sqrt(upstreamK);
  const flux = (2 * k) / ((k - 1) * airGasConstantJPerKgK * upstreamK);
  return areaM2 * upstreamPa * Math.sqrt(flux * (ratio ** (2 / k) - ratio ** ((k + 1) / k)));
}

/**
 * Upstream pressure at which an orifice passes a flow, Pa absolute: the inverse of `orificeFlowKgS`. Direct where choked, by
 * bisection to one part in a million otherwise.
 */
export function orificeUpstreamPa(
  areaM2: number,
  flowKgS: number,
  downstreamPa: number,
  upstreamK: number,
): number {
  if (flowKgS <= 0) return downstreamPa;
  const chokedPa = (flowKgS * Math.sqrt(upstreamK)) / (areaM2 * chokedFactor);
  const edgePa = downstreamPa / criticalPressureRatio;
  if (chokedPa >= edgePa) return chokedPa;
  let lowPa = downstreamPa;
  let highPa = edgePa;
  // Two hundred halvings are far more than the tolerance needs; past them the figures are not finite.
  for (let step = 0; step < 200 && highPa - lowPa > 1e-6 * downstreamPa; step += 1) {
    const middlePa = (lowPa + highPa) / 2;
    if (orificeFlowKgS(areaM2, middlePa, downstreamPa, upstreamK) < flowKgS) lowPa = middlePa;
    else highPa = middlePa;
  }
  return (lowPa + highPa) / 2;
}
