import { sizeTable } from './pipe-size';

/** ASME B36.10 steel pipe, Schedule 40, as used galvanized. No rating: threads and age decide, and the policy rules. */
export const steelSchedule40 = sizeTable([
  [0.5, 0.84, 0.109, null, null],
  [0.75, 1.05, 0.113, null, null],
  [1, 1.315, 0.133, null, null],
  [1.25, 1.66, 0.14, null, null],
  [1.5, 1.9, 0.145, null, null],
  [2, 2.375, 0.154, null, null],
  [2.5, 2.875, 0.203, null, null],
  [3, 3.5, 0.216, null, null],
  [4, 4.5, 0.237, null, null],
]);
