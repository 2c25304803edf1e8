/** Pipe materials and wall classes, by the words of the system record. */
export const materials = [
  'pvc-sch40',
  'pvc-sch80',
  'pvc-sdr13.5',
  'pvc-sdr21',
  'pvc-sdr26',
  'pvc-sdr32.5',
  'pe-sidr7',
  'pe-sidr9',
  'pe-sidr11.5',
  'pe-sidr15',
  'pe-sidr19',
  'copper-k',
  'copper-l',
  'copper-m',
  'galvanized',
  'unknown',
] as const;

/** Material and wall class of a run of pipe. */
export type Material = (typeof materials)[number];

/** What a material is, as far as ceilings and derating care. */
export type MaterialFamily = 'pvc' | 'polyethylene' | 'copper' | 'steel' | 'unknown';

const families: Readonly<Record<Material, MaterialFamily>> = {
  'pvc-sch40': 'pvc',
  'pvc-sch80': 'pvc',
  'pvc-sdr13.5': 'pvc',
  'pvc-sdr21': 'pvc',
  'pvc-sdr26': 'pvc',
  'pvc-sdr32.5': 'pvc',
  'pe-sidr7': 'polyethylene',
  'pe-sidr9': 'polyethylene',
  'pe-sidr11.5': 'polyethylene',
  'pe-sidr15': 'polyethylene',
  'pe-sidr19': 'polyethylene',
  'copper-k': 'copper',
  'copper-l': 'copper',
  'copper-m': 'copper',
  galvanized: 'steel',
  unknown: 'unknown',
};

/** The family of a material. */
export const familyOf = (material: Material): MaterialFamily => families[material];
