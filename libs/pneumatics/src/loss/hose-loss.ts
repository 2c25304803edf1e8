import { absolutePsi, kelvinFromF, outOfRange, paPerPsi, success, toAbsolute, within } from '@rimeward/units';
import type { GaugePsi, Result } from '@rimeward/units';
import { cfmFromKgS, kgSFromCfm, type AirAround } from '../air-demand/open-heads';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import { hoseBore } from './air-path';
import { harrisLossPsi } from './harris';
import { checkHose, usualCouplingFactor, type Hose } from './hose';
import { isothermalOutletPa, machNumber } from './isothermal';

/** What is doubtful about a loss, as codes that a screen translates. */
export type LossWarning = 'large-drop' | 'beyond-formula' | 'harris-leaves-nothing';

/** Loss of pressure along a hose. */
export interface HoseLoss extends Explained {
  /** Couplings included, psi. */
  lossPsi: number;
  /** Of the smooth bore alone, psi. */
  smoothLossPsi: number;
  /** The second opinion, psi: Harris with the inlet pressure, couplings included. */
  harrisLossPsi: number;
  /** Pressure at the end of the hose, psi gauge. */
  outletPsi: number;
  /** Speed at the end of the hose over that of sound. */
  outletMach: number;
  warnings: readonly LossWarning[];
}

/** Temperature and pressure that a standard cubic foot is counted at in the published tables: 70 F, 14.696 psi. */
const standardK = kelvinFromF(70);
const standardPa = 101_325;

/**
 * Loss of pressure of a flow of free air (site conditions) along a hose. Inlet 1 to 150 psi gauge. Refuses a flow that the hose
 * cannot pass from that pressure. Sources: isothermal Darcy with Colebrook, Harris (published), coupling factor (common practice).
 */
export function hoseLoss(
  hose: Hose,
  freeAirCfm: number,
  inletPsi: GaugePsi,
  around: AirAround,
  couplingFactor = usualCouplingFactor,
): Result<HoseLoss> {
  const impossible =
    checkHose(hose) ??
    within('freeAirCfm', freeAirCfm, 0, 5_000) ??
    within('inletPsi', inletPsi, 1, 150) ??
    within('couplingFactor', couplingFactor, 1, 4);
  if (impossible) return impossible;
  const temperatureK = kelvinFromF(around.airTemperatureF);
  const flowKgS = kgSFromCfm(freeAirCfm, around.atmospherePsia * paPerPsi, temperatureK);
  const inletPa = toAbsolute(inletPsi, around.atmospherePsia) * paPerPsi;
  const bore = hoseBore(hose, couplingFactor);
  const outletPa = isothermalOutletPa(bore, flowKgS, inletPa, temperatureK);
  const smoothPa = isothermalOutletPa(hoseBore(hose, 1), flowKgS, inletPa, temperatureK);
  if (outletPa === null || smoothPa === null) {
    return outOfRange('freeAirCfm', 'less than the hose passes from this pressure');
  }
  const lossPsi = (inletPa - outletPa) / paPerPsi;
  const standardCfm = cfmFromKgS(flowKgS, standardPa, standardK);
  const harris =
    harrisLossPsi(standardCfm, hose.insideDiameterIn, hose.lengthFt, absolutePsi(inletPa / paPerPsi)) *
    bore.frictionMultiple;
  const { atmospherePsia, airTemperatureF } = around;
  return success({
    lossPsi,
    smoothLossPsi: (inletPa - smoothPa) / paPerPsi,
    harrisLossPsi: harris,
    outletPsi: inletPsi - lossPsi,
    outletMach: machNumber(bore, flowKgS, outletPa, temperatureK),
    warnings: warningsOf((inletPa - outletPa) / inletPa, harris >= inletPsi),
    why: explain(
      'hose-loss',
      {
        insideDiameterIn: hose.insideDiameterIn,
        lengthFt: hose.lengthFt,
        couplings: hose.couplings,
        freeAirCfm,
        inletPsi,
        atmospherePsia,
        airTemperatureF,
      },
      hose.couplings > 0
        ? [smoothHose, { field: 'couplingFactor', value: couplingFactor, why: 'coupling-factor' }]
        : [smoothHose],
    ),
  });
}

const smoothHose: Assumption = { field: 'roughness', value: 'smooth', why: 'smooth-hose' };

function warningsOf(dropOverInlet: number, harrisLeavesNothing: boolean): LossWarning[] {
  const warnings: LossWarning[] = [];
  if (dropOverInlet > 0.4) warnings.push('beyond-formula');
  else if (dropOverInlet > 0.1) warnings.push('large-drop');
  if (harrisLeavesNothing) warnings.push('harris-leaves-nothing');
  return warnings;
}
