import type { System, VisitState } from '@rimeward/field-log';
import {
  planSystem,
  planZone,
  type CompanyInput,
  type ConditionsInput,
  type EquipmentInput,
  type FitVerdict,
  type PlanInput,
  type SystemPlan,
  type ZonePlan,
} from '@rimeward/pneumatics';
import type { ZoneCeiling } from '../facts/ceilings';
import type { RulePlan } from '../input';
import { planInputOf } from './plan-for-system';

/** What a visit is judged against: the plan of that day and the ceilings that go with it. */
export interface JudgedPlan {
  plan: RulePlan;
  ceilingByZone: Record<string, ZoneCeiling>;
}

/** The circumstances of a visit as they were. */
export interface PlanCircumstances {
  equipment: EquipmentInput;
  /** For the sentence on a compressor that is too small. */
  compressorName: string;
  conditions: ConditionsInput;
  company: CompanyInput;
}

/**
 * The plan by which the rules judge a visit. Two things differ from the plan that the crew saw. The main line's water is counted in the
 * zone that was in fact blown first. And a ceiling is lowered for hot air only where its temperature was read at the connection: an
 * estimate warns a crew beforehand, but accuses nobody afterwards.
 */
export function judgedPlan(state: VisitState, system: System, circumstances: PlanCircumstances): JudgedPlan {
  const { equipment, conditions, company } = circumstances;
  const input = planInputOf(system, equipment, conditions, company);
  const planned = planSystem(input);
  const zones = withMainCleared(planned, input, firstBlown(state));
  const measured = typeof conditions.connectionTemperatureF === 'number';
  const verdict = worstFit(zones);
  return {
    plan: {
      order: planned.order.ok ? planned.order.value.places.map(({ zoneId }) => zoneId) : [],
      airSecondsByZone: Object.fromEntries(
        zones.map(({ zoneId, cycles }) => [zoneId, cycles.ok ? cycles.value.expectedSeconds : null]),
      ),
      ...(verdict && { compressor: { name: circumstances.compressorName, verdict } }),
    },
    ceilingByZone: Object.fromEntries(
      zones.flatMap((zone) => {
        const ceiling = judgedCeiling(zone, measured);
        return ceiling ? [[zone.zoneId, ceiling]] : [];
      }),
    ),
  };
}

function firstBlown(state: VisitState): string | null {
  for (const { entry, standing } of state.entries) {
    if (entry.type === 'air-started' && standing !== 'withdrawn') return entry.body.zoneId;
  }
  return null;
}

/** The zones with the main line's water moved to the one that was blown first. */
function withMainCleared(
  planned: SystemPlan,
  input: PlanInput,
  firstZoneId: string | null,
): readonly ZonePlan[] {
  const clearing = input.system.zones.find((zone) => zone.id === firstZoneId);
  if (!clearing || planned.zones[0]?.zoneId === firstZoneId) return planned.zones;
  return planned.zones.map((zone) => {
    const clearsMain = zone.zoneId === firstZoneId;
    const record = input.system.zones.find((one) => one.id === zone.zoneId);
    return record && clearsMain !== zone.clearsMain ? planZone(input, record, clearsMain) : zone;
  });
}

function judgedCeiling({ ceiling }: ZonePlan, measured: boolean): ZoneCeiling | null {
  if (!ceiling.ok) return null;
  const { pressurePsi, setBy, coldPressurePsi, candidates } = ceiling.value;
  if (measured) return { pressurePsi, setBy };
  const cold = candidates.find((one) => one.coldLimitPsi === coldPressurePsi);
  return { pressurePsi: coldPressurePsi, setBy: cold?.kind ?? setBy };
}

const worse: readonly FitVerdict[] = ['too-small', 'slow', 'suitable'];

/** The verdict on the compressor over all zones that could be judged; null where none could. */
function worstFit(zones: readonly ZonePlan[]): FitVerdict | null {
  const verdicts = new Set(zones.flatMap(({ fit }) => (fit.ok ? [fit.value.verdict] : [])));
  return worse.find((verdict) => verdicts.has(verdict)) ?? null;
}
