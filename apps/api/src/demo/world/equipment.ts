import type { Compressor, Hose } from '@rimeward/contracts';
import { idOf } from '../chance';

/** One towed compressor a crew, and a small one in the yard that is too weak for most systems. */
export const demoCompressors: Compressor[] = [
  { name: 'Tow-behind 1', freeAirCfm: 185, maxPressurePsi: 125, stages: 1, aftercooler: true },
  { name: 'Tow-behind 2', freeAirCfm: 185, maxPressurePsi: 125, stages: 1, aftercooler: false },
  { name: 'Tow-behind 3', freeAirCfm: 110, maxPressurePsi: 100, stages: 1, aftercooler: false },
  { name: 'Yard compressor', freeAirCfm: 18, maxPressurePsi: 150, stages: 2 as const, aftercooler: false },
].map((one) => ({ id: idOf('compressor', one.name), ...one, stages: one.stages as 1 | 2 }));

export const demoHoses: Hose[] = [
  { name: 'Red 3/4 in, 50 ft', insideDiameterIn: 0.75, lengthFt: 50, couplings: 2 },
  { name: 'Red 3/4 in, 100 ft', insideDiameterIn: 0.75, lengthFt: 100, couplings: 3 },
  { name: 'Yellow 1 in, 100 ft', insideDiameterIn: 1, lengthFt: 100, couplings: 3 },
  { name: 'Black 3/8 in, 50 ft', insideDiameterIn: 0.375, lengthFt: 50, couplings: 2 },
].map((one) => ({ id: idOf('hose', one.name), ...one }));
