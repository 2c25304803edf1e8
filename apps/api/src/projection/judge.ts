import type { VisitDocument } from '@rimeward/contracts';
import type { VisitState } from '@rimeward/field-log';
import { findings, RULES_VERSION } from '@rimeward/rules';
import type { EntityManager } from 'typeorm';
import { readContext } from './judge-context';
import type { Finding } from './summary';

/** Hours after the end of a day from which what is missing counts as missing, although nobody has left. */
const graceHours = 12;

export interface Judgement {
  findings: Finding[];
  rulesVersion: string;
  /** Whether missing things were judged too. */
  atTheEnd: boolean;
}

/** What the rules say of a visit, with all that the office knows beside its log. */
export async function judge(
  manager: EntityManager,
  document: VisitDocument,
  state: VisitState,
): Promise<Judgement> {
  const { settings, ...context } = await readContext(manager, document, state);
  const atTheEnd = state.left !== null || isOver(document.date, new Date());
  const found =
    state.entries.length === 0
      ? []
      : findings({ state, system: document.system, settings, context, atTheEnd });
  return {
    findings: found.map(({ ruleId, severity, entryIds, params }) => ({
      ruleId,
      severity,
      entryIds,
      params: { ...params },
    })),
    rulesVersion: RULES_VERSION,
    atTheEnd,
  };
}

/** Whether the night has passed since a day's work: by the next morning in the Americas. */
function isOver(date: string, now: Date): boolean {
  return date < new Date(now.getTime() - graceHours * 3_600_000).toISOString().slice(0, 10);
}
