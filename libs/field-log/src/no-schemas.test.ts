import { readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { expect, it } from 'vitest';

/** Modules that a phone loads for the fold, the interlocks and the steps; type imports leave nothing behind. */
function loadedBy(file: string, seen = new Set<string>()): Set<string> {
  if (seen.has(file)) return seen;
  seen.add(file);
  const source = readFileSync(file, 'utf8');
  for (const [, types, from = ''] of source.matchAll(/^(?:import|export) (type )?[^;]*?from '([^']+)';/gms)) {
    if (types) continue;
    if (from.startsWith('.')) loadedBy(join(dirname(file), `${from}.ts`), seen);
    else seen.add(from);
  }
  return seen;
}

it.each([
  'fold/fold-visit',
  'interlocks/interlocks',
  'interlocks/alarms',
  'steps/visit-steps',
  'system/hand-valves',
])('%s loads no schema library', (name) => {
  const loaded = loadedBy(join(__dirname, `${name}.ts`));
  expect([...loaded].filter((one) => !one.startsWith('/'))).toEqual([]);
});

it('would notice the schema library', () => {
  expect(loadedBy(join(__dirname, 'parse/parse-entry.ts'))).toContain('zod');
});
