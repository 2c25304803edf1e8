import type { SourceId } from '../explain/sources';

/** What a candidate for the ceiling comes from. `rigid-pvc` stands for all rigid pipe: PVC, copper, steel. */
export type CeilingKind =
  'rigid-pvc' | 'polyethylene' | 'unknown' | 'lowest-part' | 'pipe-rating' | 'company-cap';

/** One limit on the way of the air. */
export interface CeilingCandidate {
  kind: CeilingKind;
  /** psi gauge. */
  limitPsi: number;
  /** The run, the part or the policy that it comes from. */
  subject: string;
  /** The same limit with air at 73 F, psi gauge: higher only where heat derates it. */
  coldLimitPsi: number;
  sourceId: SourceId;
}

/** A part whose rating somebody has read: valve, filter, regulator, head, hose. */
export interface RatedPart {
  name: string;
  ratedPsi: number;
}
