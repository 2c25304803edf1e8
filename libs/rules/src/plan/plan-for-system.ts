import type { System } from '@rimeward/field-log';
import {
  planSystem,
  type CompanyInput,
  type ConditionsInput,
  type EquipmentInput,
  type PlanInput,
  type SystemPlan,
} from '@rimeward/pneumatics';

/** The record of a system as the physics reads it. Air enters downstream of the backflow assembly, so its parts are not on the way. */
export function planInputOf(
  system: System,
  equipment: EquipmentInput,
  conditions: ConditionsInput,
  company: CompanyInput,
): PlanInput {
  const { mainLine, zones } = system;
  return { system: { mainLine, parts: [], zones }, equipment, conditions, company };
}

/**
 * Everything that is worked out for a system before the air goes on: ceilings, order, cycles, compressor fit, each with its inputs and
 * sources, or with what it still needs. Runs on the phone without signal.
 */
export function planForSystem(
  system: System,
  equipment: EquipmentInput,
  conditions: ConditionsInput,
  company: CompanyInput,
): SystemPlan {
  return planSystem(planInputOf(system, equipment, conditions, company));
}
