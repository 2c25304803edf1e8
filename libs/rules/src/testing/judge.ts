import { foldVisit, type LogEntry, type System } from '@rimeward/field-log';
import { cleanVisit, written, type Line } from '@rimeward/field-log/testing/clean-visit';
import { testSystem } from '@rimeward/field-log/testing/systems';
import type { Finding } from '../finding/finding';
import type { RuleId } from '../finding/rule-params';
import { findings } from '../findings';
import type { RulesInput } from '../input';

export const system: System = testSystem();
export const clean: readonly Line[] = cleanVisit(system);

type Change = Partial<Omit<RulesInput, 'state'>>;

/** Judges a log as the office would. */
export function judgeLog(log: readonly LogEntry[], change: Change = {}): Finding[] {
  const settings = { pressureCapPsi: null, forbidsWorkingAlone: false };
  return findings({ state: foldVisit(log), system, settings, ...change });
}

export const judge = (lines: readonly Line[], change: Change = {}): Finding[] =>
  judgeLog(written(lines), change);

export const idsOf = (found: readonly Finding[]): RuleId[] => found.map((finding) => finding.ruleId);

/** The ids of what the rules find in a log. */
export const idsIn = (lines: readonly Line[], change: Change = {}): RuleId[] => idsOf(judge(lines, change));

type Matching = Partial<Line> | ((line: Line, index: number) => boolean);

function matches(line: Line, index: number, wanted: Matching): boolean {
  if (typeof wanted === 'function') return wanted(line, index);
  return Object.entries(wanted).every(([key, value]) => line[key as keyof Line] === value);
}

/** A clean visit without the lines that match. */
export const without = (wanted: Matching, lines: readonly Line[] = clean): Line[] =>
  lines.filter((line, index) => !matches(line, index, wanted));

/** A clean visit with further lines before the first line of a type. */
export function before(type: Line['type'], added: readonly Line[], lines: readonly Line[] = clean): Line[] {
  const at = lines.findIndex((line) => line.type === type);
  return [...lines.slice(0, at), ...added, ...lines.slice(at)];
}

/** A clean visit in which the bodies of a type are changed. */
export function changed(type: Line['type'], body: object, lines: readonly Line[] = clean): Line[] {
  return lines.map((line) => (line.type === type ? { ...line, body: { ...line.body, ...body } } : line));
}

/** A clean visit in which the lines of a type come last before leaving. */
export function late(type: Line['type'], lines: readonly Line[] = clean): Line[] {
  const moved = lines.filter((line) => line.type === type);
  return before(
    'left',
    moved,
    lines.filter((line) => line.type !== type),
  );
}
