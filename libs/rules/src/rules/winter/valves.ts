import type { HandValve, ValveState } from '@rimeward/field-log';
import type { VisitFacts } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';
import { greeley } from '../sources';

/** Each valve of the record, and each that only the log knows, with the name for its sentence. */
function* valvesOf({ system, state }: VisitFacts): Generator<{ valve: string; state: ValveState | null }> {
  const nameOf = (valve: HandValve): string => `${valve.role}-${valve.number}`;
  for (const valve of system.backflow.valves) {
    yield { valve: nameOf(valve), state: state.valves[valve.id] ?? null };
  }
  const ids = new Set(system.backflow.valves.map((valve) => valve.id));
  for (const found of Object.values(state.valves)) {
    if (!ids.has(found.valveId)) yield { valve: found.valveId, state: found };
  }
}

/** A ball valve fully open or closed keeps water round its ball; half open lets it out. */
export const valveNotHalfOpen: Rule<'valve-not-half-open'> = {
  id: 'valve-not-half-open',
  severity: 'fault',
  basis: greeley,
  find(facts, report) {
    for (const { valve, state } of valvesOf(facts)) {
      const winter = state?.winter;
      if (!winter || winter.position === 'half-open') continue;
      report([winter.entryId], { valve, position: winter.position });
    }
  },
};

/** Nobody wrote down how a valve of the assembly stays for the winter. */
export const valveNotRecorded: Rule<'valve-not-recorded'> = {
  id: 'valve-not-recorded',
  severity: 'gap',
  basis: greeley,
  find(facts, report) {
    if (!facts.atTheEnd) return;
    for (const { valve, state } of valvesOf(facts)) {
      if (!state?.winter) report([state?.beforeAir?.entryId], { valve });
    }
  },
};

/** The valve was left half open without having been worked back and forth first. */
export const valveNotWorked: Rule<'valve-not-worked'> = {
  id: 'valve-not-worked',
  severity: 'note',
  basis: commonPractice,
  find(facts, report) {
    for (const { valve, state } of valvesOf(facts)) {
      const winter = state?.winter;
      if (winter && winter.position === 'half-open' && !winter.workedThrough)
        report([winter.entryId], { valve });
    }
  },
};
