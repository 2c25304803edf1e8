import { needs, outOfRange, success, type Result } from '@rimeward/units';
import { copperK, copperL, copperM } from './dimensions/copper';
import type { PipeSize, SizeTable } from './dimensions/pipe-size';
import {
  polyethyleneSidr11,
  polyethyleneSidr15,
  polyethyleneSidr19,
  polyethyleneSidr7,
  polyethyleneSidr9,
} from './dimensions/polyethylene';
import { pvcSchedule40, pvcSchedule80, pvcSdr13, pvcSdr21, pvcSdr26, pvcSdr32 } from './dimensions/pvc';
import { steelSchedule40 } from './dimensions/steel';
import type { Material } from './material';

const tables: Readonly<Record<Exclude<Material, 'unknown'>, SizeTable>> = {
  'pvc-sch40': pvcSchedule40,
  'pvc-sch80': pvcSchedule80,
  'pvc-sdr13.5': pvcSdr13,
  'pvc-sdr21': pvcSdr21,
  'pvc-sdr26': pvcSdr26,
  'pvc-sdr32.5': pvcSdr32,
  'pe-sidr7': polyethyleneSidr7,
  'pe-sidr9': polyethyleneSidr9,
  'pe-sidr11.5': polyethyleneSidr11,
  'pe-sidr15': polyethyleneSidr15,
  'pe-sidr19': polyethyleneSidr19,
  'copper-k': copperK,
  'copper-l': copperL,
  'copper-m': copperM,
  galvanized: steelSchedule40,
};

/** Nominal sizes that a material is made in, in, as the tables have them. Empty for an unknown material. */
export const nominalSizesIn = (material: Material): readonly number[] =>
  material === 'unknown' ? [] : [...tables[material].keys()];

/**
 * Dimensions and rating of a material in a nominal size. Needs the material; refuses a size that the material is not made in
 * and names those it is. Sources: ASTM D1785, D2241, D2239 (bores from memory), B88, ASME B36.10.
 */
export function sizeOf(material: Material, nominalIn: number, field = 'nominalIn'): Result<PipeSize> {
  if (material === 'unknown') return needs(field.replace('nominalIn', 'material'));
  const size = tables[material].get(nominalIn);
  return size ? success(size) : outOfRange(field, nominalSizesIn(material).join(', '));
}
