import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { formulas, type FormulaId } from './explain/formulas';
import { sources, type SourceId } from './explain/sources';
import { computeExample, ExampleInputs } from './testing/doc-examples';

const page = readFileSync(join(__dirname, '../../../docs/physics.md'), 'utf8');

interface Example {
  formulaId: string;
  given: Record<string, string>;
  expected: [name: string, printed: string][];
}

const examples: Example[] = [...page.matchAll(/```example (\S+)\n([\s\S]*?)```/g)].map(
  ([, formulaId = '', body = '']) => {
    const given: Record<string, string> = {};
    const expected: [string, string][] = [];
    for (const line of body.trim().split('\n')) {
      const [, arrow, name = '', printed = ''] = /^(=> )?(\w+) = (.+)$/.exec(line) ?? [];
      if (name === '') throw new Error(`not a line of an example: ${line}`);
      if (arrow) expected.push([name, printed]);
      else given[name] = printed;
    }
    return { formulaId, given, expected };
  },
);

/** Whether a value reads as printed, to the last printed digit. */
function readsAs(value: unknown, printed: string): boolean {
  if (typeof value !== 'number') return value === printed;
  const decimals = printed.split('.')[1]?.length ?? 0;
  return Math.abs(value - Number(printed)) <= 0.5001 * 10 ** -decimals;
}

describe('docs/physics.md', () => {
  for (const { formulaId, given, expected } of examples) {
    it(`${formulaId} with ${Object.values(given).join(', ')}: every figure is what the library computes`, () => {
      const computed = computeExample[formulaId as FormulaId](new ExampleInputs(given)) as Record<
        string,
        unknown
      >;
      expect(expected.length).toBeGreaterThan(0);
      for (const [name, printed] of expected) {
        expect(
          readsAs(computed[name], printed),
          `${name} = ${String(computed[name])}, printed ${printed}`,
        ).toBe(true);
      }
    });
  }
  it('has a section with an example for every formula, and no other', () => {
    const ids = Object.keys(formulas).sort();
    expect([...new Set(examples.map(({ formulaId }) => formulaId))].sort()).toEqual(ids);
    const sections = [...page.matchAll(/^## .* \{#(.+)\}$/gm)].map(([, id]) => id);
    expect(sections.filter((id) => id !== 'sources').sort()).toEqual(ids);
  });
  it('names, in each section, the sources that the figures carry', () => {
    for (const [id, { sourceIds }] of Object.entries(formulas)) {
      const section = page.split(`{#${id}}`)[1]?.split('\n## ')[0] ?? '';
      const line = /^Sources: (.*?)(\n\n|$)/ms.exec(section)?.[1] ?? '';
      for (const sourceId of sourceIds) expect(line, `${id} rests on ${sourceId}`).toContain(sourceId);
    }
  });
  it('lists every source with author, place and how far it can be leaned on, and no other', () => {
    const listed = [...page.matchAll(/^- `([\w.-]+)`: (.+) \*\*([\w-]+)\*\*$/gm)].map(
      ([, ...parts]) => parts,
    );
    expect(listed).toEqual(
      (Object.keys(sources) as SourceId[]).map((id) => {
        const { title, author, year, place, status } = sources[id];
        return [id, `${[title, author, year, place].filter((part) => part !== null).join('; ')}.`, status];
      }),
    );
  });
  it('is used: every source stands behind a formula, a policy or a check', () => {
    const cited = new Set<string>(Object.values(formulas).flatMap((formula) => [...formula.sourceIds]));
    const idle = Object.keys(sources).filter((id) => !cited.has(id));
    // These two carry a table behind a formula, not the formula.
    expect(idle).toEqual(['pvc-average-diameters', 'steel-air-loss-table']);
  });
  it('never promises safety or compliance', () => {
    expect(page).not.toMatch(/\bis safe\b|\bcompliant\b|safe to /);
    expect(page).toMatch(/never a safe distance/);
  });
});
