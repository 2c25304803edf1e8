import { kelvinFromF, m3PerFt3, mPerIn, paPerPsi, success, toAbsolute, within } from '@rimeward/units';
import type { AbsolutePsi, GaugePsi, Result } from '@rimeward/units';
import { airDensityKgM3 } from '../atmosphere/air';
import { explain, type Explained } from '../explain/explanation';
import { criticalPressureRatio, orificeAreaM2, orificeFlowKgS } from './orifice';

/** Air that a zone's open heads pass once no water is left. */
export interface OpenHeads extends Explained {
  /** Discharge coefficient times area of all heads together, in2. */
  equivalentAreaIn2: number;
  /** Free air at site conditions, ft3/min. */
  freeAirCfm: number;
  /** Whether the air leaves at the speed of sound. */
  choked: boolean;
}

/** Where the air is: around the system, and how warm. */
export interface AirAround {
  atmospherePsia: AbsolutePsi;
  airTemperatureF: number;
}

/**
 * Free air through the dry heads of a zone at a pressure, from the flow and pressure of its water. Flow above 0 to 2000 gpm, design
 * pressure 1 to 300 psi, pressure 0 to 150 psi gauge. Heads with pressure regulation pass less. Sources: orifice equation (derived),
 * compressible flow against the printed orifice table (published).
 */
export function openHeadsAir(
  flowGpm: number,
  designPressurePsi: number,
  headPsi: GaugePsi,
  around: AirAround,
): Result<OpenHeads> {
  const { atmospherePsia, airTemperatureF } = around;
  const impossible =
    within('flowGpm', flowGpm, 0.01, 2_000) ??
    within('designPressurePsi', designPressurePsi, 1, 300) ??
    within('headPsi', headPsi, 0, 150) ??
    within('atmospherePsia', atmospherePsia, 8, 15.6) ??
    within('airTemperatureF', airTemperatureF, -60, 600);
  if (impossible) return impossible;
  const areaM2 = orificeAreaM2(flowGpm, designPressurePsi);
  const upstreamPa = toAbsolute(headPsi, atmospherePsia) * paPerPsi;
  const downstreamPa = atmospherePsia * paPerPsi;
  const temperatureK = kelvinFromF(airTemperatureF);
  const flowKgS = orificeFlowKgS(areaM2, upstreamPa, downstreamPa, temperatureK);
  return success({
    equivalentAreaIn2: areaM2 / (mPerIn * mPerIn),
    freeAirCfm: cfmFromKgS(flowKgS, downstreamPa, temperatureK),
    choked: downstreamPa / upstreamPa <= criticalPressureRatio,
    why: explain('open-heads', { flowGpm, designPressurePsi, headPsi, atmospherePsia, airTemperatureF }),
  });
}

/** A mass flow of air as volume at a pressure and temperature, ft3/min. */
export const cfmFromKgS = (flowKgS: number, pressurePa: number, temperatureK: number): number =>
  (flowKgS / airDensityKgM3(pressurePa, temperatureK) / m3PerFt3) * 60;

/** A volume flow of air at a pressure and temperature as mass, kg/s. */
export const kgSFromCfm = (flowCfm: number, pressurePa: number, temperatureK: number): number =>
  ((flowCfm * m3PerFt3) / 60) * airDensityKgM3(pressurePa, temperatureK);
