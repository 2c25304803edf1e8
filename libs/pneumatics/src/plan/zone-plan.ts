import type { Result } from '@rimeward/units';
import type { CompressorFit } from '../air-demand/compressor-fit';
import type { Delivery } from '../air-demand/delivery';
import type { DisplacementAir } from '../air-demand/displacement';
import type { OpenHeads } from '../air-demand/open-heads';
import type { WaterPushed } from '../air-demand/water-pushed';
import type { PressureCeiling } from '../ceiling/pressure-ceiling';
import type { AirCycles } from '../cycles/air-cycles';
import type { StoredEnergy } from '../energy/stored-energy';
import type { HeldPressure } from '../loss/held-pressure';
import type { HoseLoss } from '../loss/hose-loss';
import type { ZoneOrder } from '../order/zone-order';
import type { WaterHeld } from '../pipe/water-held';
import type { Discharge } from '../temperature/discharge';
import type { HoseCooling } from '../temperature/hose-cooling';

/** Everything computed for one zone. Each figure stands alone: one that lacks an input says which, the others are there. */
export interface ZonePlan {
  zoneId: string;
  /** True for the zone that is blown first: its air clears the main line too. */
  clearsMain: boolean;
  ceiling: Result<PressureCeiling>;
  /** Air that replaces the design flow: rule, exact, free air. */
  displacement: Result<DisplacementAir>;
  /** Air through the dry heads at the plan's pressure. */
  openHeads: Result<OpenHeads>;
  /** What the compressor holds through hose, pipe and dry heads. */
  held: Result<HeldPressure>;
  hoseLoss: Result<HoseLoss>;
  discharge: Result<Discharge>;
  cooling: Result<HoseCooling>;
  pushed: Result<WaterPushed>;
  water: Result<WaterHeld>;
  cycles: Result<AirCycles>;
  fit: Result<CompressorFit>;
  energy: Result<StoredEnergy>;
}

/** What a screen must say wherever air figures stand, as codes. */
export const planCautions = [
  'local-codes-and-makers-first',
  'pvc-is-no-air-line',
  'never-close-the-last-outlet',
  'gauge-shows-a-closed-end',
  'stop-at-mist',
  'hearing-and-eyes',
] as const;

/** Everything computed for one system. */
export interface SystemPlan {
  delivery: Result<Delivery>;
  order: Result<ZoneOrder>;
  /** In the proposed order where there is one, otherwise as given. */
  zones: readonly ZonePlan[];
  cautions: typeof planCautions;
}
