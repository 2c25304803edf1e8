import { mPerFt, mPerIn, type Result } from '@rimeward/units';
import { airGasConstantJPerKgK } from '../atmosphere/air';
import type { PipeRun } from '../pipe/pipe-run';
import { sizeOf } from '../pipe/size-of';
import type { Hose } from './hose';
import { isothermalInletPa, type Bore } from './isothermal';

/** Roughness of plastic pipe, copper and hose, m (smooth); of galvanized steel, m. Handbook values, from memory. */
const smoothM = 1.5e-6;
const galvanizedM = 1.5e-4;

/** A hose as a bore; couplings multiply its friction. */
export const hoseBore = (hose: Hose, couplingFactor: number): Bore => ({
  diameterM: hose.insideDiameterIn * mPerIn,
  lengthM: hose.lengthFt * mPerFt,
  roughnessM: smoothM,
  frictionMultiple: hose.couplings > 0 ? couplingFactor : 1,
});

/** Runs of pipe as bores (average inside diameter). Needs materials; refuses sizes that are not made. */
export function pipeBores(runs: readonly PipeRun[]): Result<Bore[]> {
  const bores: Bore[] = [];
  for (const run of runs) {
    const size = sizeOf(run.material, run.nominalIn, `${run.id}.nominalIn`);
    if (!size.ok) return size;
    bores.push({
      diameterM: size.value.averageInsideDiameterIn * mPerIn,
      lengthM: run.lengthFt * mPerFt,
      roughnessM: run.material === 'galvanized' ? galvanizedM : smoothM,
      frictionMultiple: 1,
    });
  }
  return { ok: true, value: bores };
}

/**
 * Pressure at the beginning of a path that a flow needs for a pressure at its end, Pa absolute. Bores in the direction of flow. Where a
 * bore would pass the isothermal limit, its outlet stays at that limit.
 */
export function pathInletPa(
  bores: readonly Bore[],
  flowKgS: number,
  endPa: number,
  temperatureK: number,
): number {
  let pressurePa = endPa;
  for (let at = bores.length - 1; at >= 0; at -= 1) {
    const bore = bores[at];
    if (!bore) continue;
    const areaM2 = (Math.PI / 4) * bore.diameterM * bore.diameterM;
    const limitPa = (flowKgS / areaM2) * Math.sqrt(airGasConstantJPerKgK * temperatureK);
    pressurePa = isothermalInletPa(bore, flowKgS, Math.max(pressurePa, limitPa), temperatureK);
  }
  return pressurePa;
}
