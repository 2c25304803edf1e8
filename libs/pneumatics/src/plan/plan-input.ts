import type { Compressor } from '../air-demand/compressor';
import type { FitThresholds } from '../air-demand/compressor-fit';
import type { RatedPart } from '../ceiling/candidate';
import type { CeilingPolicyId } from '../ceiling/policies';
import type { HeadKind } from '../cycles/head-kind';
import type { Hose } from '../loss/hose';
import type { OrderedZoneInput } from '../order/ordered-zone';
import type { OrderWeights } from '../order/zone-order';
import type { PipeRun } from '../pipe/pipe-run';

/** A zone as the system record has it. Null where nobody knows. */
export interface ZoneInput extends OrderedZoneInput {
  headKind: HeadKind;
  /** Design water flow, gpm. */
  flowGpm: number | null;
  /** Water pressure at the heads at design flow, psi gauge. */
  designPressurePsi: number | null;
  laterals: readonly PipeRun[];
  lowestRatedPart: RatedPart | null;
}

/** A system as far as air is concerned. */
export interface SystemInput {
  mainLine: readonly PipeRun[];
  /** Parts on the way of the air whose rating somebody has read. */
  parts: readonly RatedPart[];
  zones: readonly ZoneInput[];
}

/** What the crew brings. Null where nothing has been chosen. */
export interface EquipmentInput {
  compressor: Compressor | null;
  hose: Hose | null;
}

/** Where and in which weather. */
export interface ConditionsInput {
  altitudeFt: number | null;
  airTemperatureF: number | null;
  /** Temperature read at the air connection, F; comes before the estimate. */
  connectionTemperatureF?: number | null;
}

/** What a company has chosen or learned. */
export interface CompanyInput {
  policyId?: CeilingPolicyId;
  pressureCapPsi: number | null;
  timeFactor?: number;
  capSeconds?: Partial<Record<HeadKind, number>>;
  restSeconds?: number;
  couplingFactor?: number;
  heatTransferWM2K?: number;
  fit?: FitThresholds;
  orderWeights?: OrderWeights;
}

/** Everything a plan is made from: plain data. */
export interface PlanInput {
  system: SystemInput;
  equipment: EquipmentInput;
  conditions: ConditionsInput;
  company: CompanyInput;
}
