import { fFromKelvin, kelvinFromF, needs, success, toAbsolute, within } from '@rimeward/units';
import type { AbsolutePsi, GaugePsi, Result } from '@rimeward/units';
import { checkCompressor, type Compressor } from '../air-demand/compressor';
import { explain, type Assumption, type Explained } from '../explain/explanation';

/** Where the leaving temperature comes from. */
export type DischargeBasis = 'measured' | 'aftercooler' | 'oil-flooded' | 'dry';

/** Air as it leaves a compressor. */
export interface Discharge extends Explained {
  /** Of dry compression without any cooler, F: the upper bound. */
  dryF: number;
  /** Of this machine, F. */
  leavingF: number;
  basis: DischargeBasis;
}

/** Exponent of dry compression: adiabatic, the hottest. */
export const adiabaticExponent = 1.4;
/** Upper end of what oil-flooded screws leave at, F (from memory). */
const oilFloodedF = 220;
/** Upper end of what an aftercooler leaves over ambient, degrees F (from memory). */
const approachF = 20;
/** Machines from here up are towed ones, and towed ones are oil-flooded screws, ft3/min. */
const towedFromCfm = 60;

/**
 * Temperature of polytropic compression, F: T2 = T1 (P2/P1)^((n-1)/n), halved exponent with two equal stages and perfect intercooling.
 * Source: textbooks of thermodynamics (published).
 */
export function compressedF(
  intakeF: number,
  dischargePsi: GaugePsi,
  atmospherePsia: AbsolutePsi,
  polytropicExponent: number = adiabaticExponent,
  stages: 1 | 2 = 1,
): number {
  const ratio = toAbsolute(dischargePsi, atmospherePsia) / atmospherePsia;
  const power = (polytropicExponent - 1) / polytropicExponent / stages;
  return fFromKelvin(kelvinFromF(intakeF) * ratio ** power);
}

/**
 * Temperature at a compressor's outlet. A reading comes first; then an aftercooler (20 F over ambient, from memory); then an
 * oil-flooded screw (220 F, from memory); dry compression otherwise. Needs the air temperature.
 */
export function dischargeTemperature(
  compressor: Compressor,
  airTemperatureF: number | null,
  dischargePsi: GaugePsi,
  atmospherePsia: AbsolutePsi,
): Result<Discharge> {
  if (airTemperatureF === null) return needs('airTemperatureF');
  const measuredF = compressor.measuredDischargeF ?? null;
  const impossible =
    checkCompressor(compressor) ??
    within('airTemperatureF', airTemperatureF, -60, 130) ??
    within('dischargePsi', dischargePsi, 0, 500) ??
    (measuredF === null ? null : within('compressor.measuredDischargeF', measuredF, -60, 700));
  if (impossible) return impossible;
  const dryF = compressedF(
    airTemperatureF,
    dischargePsi,
    atmospherePsia,
    adiabaticExponent,
    compressor.stages,
  );
  const [basis, leavingF, assumed] = leaving(compressor, airTemperatureF, dryF);
  return success({
    dryF,
    leavingF,
    basis,
    why: explain(
      'discharge-temperature',
      {
        airTemperatureF,
        dischargePsi,
        atmospherePsia,
        stages: compressor.stages,
        aftercooler: compressor.aftercooler,
      },
      assumed,
    ),
  });
}

function leaving(compressor: Compressor, airF: number, dryF: number): [DischargeBasis, number, Assumption[]] {
  const measuredF = compressor.measuredDischargeF ?? null;
  if (measuredF !== null) return ['measured', measuredF, []];
  if (compressor.aftercooler) {
    const leavingF = Math.min(dryF, airF + approachF);
    return ['aftercooler', leavingF, [{ field: 'dischargeF', value: leavingF, why: 'aftercooler-approach' }]];
  }
  const cooling = compressor.cooling ?? (compressor.freeAirCfm >= towedFromCfm ? 'oil-flooded' : 'dry');
  if (cooling === 'oil-flooded') {
    const leavingF = Math.min(dryF, Math.max(airF, oilFloodedF));
    return ['oil-flooded', leavingF, [{ field: 'dischargeF', value: leavingF, why: 'oil-flooded-screw' }]];
  }
  return ['dry', dryF, [{ field: 'polytropicExponent', value: adiabaticExponent, why: 'dry-compression' }]];
}
