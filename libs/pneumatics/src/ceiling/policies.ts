import type { MaterialFamily } from '../pipe/material';
import type { SourceId } from '../explain/sources';

/** Highest gauge pressure by kind of pipe, under a name, psi. */
export interface CeilingPolicy {
  /** PVC, copper and steel. */
  rigidPsi: number;
  polyethylenePsi: number;
  /** Where nobody knows the pipe: the lowest of the policy. */
  unknownPsi: number;
  sourceId: SourceId;
}

/**
 * Named policies. `extension` is the default (80 rigid, 50 polyethylene; second-hand). The others are lower and published; where a
 * publication allows polyethylene more than the default does, the default's 50 stands.
 */
export const ceilingPolicies = {
  extension: { rigidPsi: 80, polyethylenePsi: 50, unknownPsi: 50, sourceId: 'csu-80-50' },
  'municipal-70': { rigidPsi: 70, polyethylenePsi: 50, unknownPsi: 50, sourceId: 'greeley-blowout' },
  'extension-50': { rigidPsi: 50, polyethylenePsi: 50, unknownPsi: 50, sourceId: 'iowa-state-50' },
} as const satisfies Record<string, CeilingPolicy>;

/** Name of a policy. */
export type CeilingPolicyId = keyof typeof ceilingPolicies;

/** What a policy allows in pipe of a family, psi gauge. */
export function policyPsi(policy: CeilingPolicy, family: MaterialFamily): number {
  if (family === 'polyethylene') return policy.polyethylenePsi;
  return family === 'unknown' ? policy.unknownPsi : policy.rigidPsi;
}
