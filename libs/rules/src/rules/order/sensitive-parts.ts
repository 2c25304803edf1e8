import type { PartState } from '@rimeward/field-log';
import type { VisitFacts } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** Each part of the record or found on site, with what the log says of it. */
function* partsOf({ system, state }: VisitFacts): Generator<{ kind: string; part: PartState | null }> {
  for (const known of system.sensitiveParts) {
    yield { kind: known.kind, part: state.parts[known.id] ?? null };
  }
  const ids = new Set(system.sensitiveParts.map((part) => part.id));
  for (const part of Object.values(state.parts)) {
    if (!ids.has(part.partId)) yield { kind: part.kind, part };
  }
}

const isSafe = (part: PartState): boolean =>
  part.protection ? part.protection.how !== 'left' : part.outcome === 'none';

/** A part was taken out or bypassed only after air had been on. */
export const airBeforeSensitivePart: Rule<'air-before-sensitive-part'> = {
  id: 'air-before-sensitive-part',
  severity: 'fault',
  basis: commonPractice,
  find(facts, report) {
    const { firstAir } = facts;
    if (!firstAir) return;
    for (const { kind, part } of partsOf(facts)) {
      if (!part || !isSafe(part)) continue;
      const safeSince = part.protection?.entryId ?? part.entryId;
      const said = facts.standing[facts.placeOf(safeSince)];
      if (said && facts.surelyBefore(firstAir, said)) {
        report([firstAir.entry.id, safeSince], { part: kind });
      }
    }
  },
};

/** A part stayed in the way of the air, with the technician's reason. A pump that air goes through is a danger. */
export const sensitivePartLeft: Rule<'sensitive-part-left'> = {
  id: 'sensitive-part-left',
  severity: 'fault',
  basis: commonPractice,
  find(facts, report) {
    if (!facts.firstAir) return;
    for (const { kind, part } of partsOf(facts)) {
      if (part?.protection?.how !== 'left') continue;
      const params = { part: kind, reason: part.protection.reason ?? '' };
      report(
        [part.protection.entryId, facts.firstAir.entry.id],
        params,
        kind === 'pump' ? 'danger' : 'fault',
      );
    }
  },
};

/** Air was on and nobody can tell whether it reached the part. */
export const sensitivePartUnknown: Rule<'sensitive-part-unknown'> = {
  id: 'sensitive-part-unknown',
  severity: 'gap',
  basis: commonPractice,
  find(facts, report) {
    if (!facts.firstAir) return;
    for (const { kind, part } of partsOf(facts)) {
      if (!part) report([facts.firstAir.entry.id], { part: kind, how: 'not-looked-for' });
      else if (part.protection || part.outcome === 'none') continue;
      else {
        const how = part.outcome === 'found' ? 'not-protected' : 'not-found';
        report(
          [part.entryId, facts.firstAir.entry.id],
          { part: kind, how },
          how === 'not-found' ? 'gap' : 'fault',
        );
      }
    }
  },
};
