import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { rulesById } from '../registry';

it('checks every rule with a log that it finds and one that it leaves', () => {
  const checked = readdirSync(__dirname, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.test.ts'))
    .flatMap((name) => [...readFileSync(join(__dirname, name), 'utf8').matchAll(/checkRule\('([a-z-]+)'/g)])
    .map(([, ruleId]) => ruleId);
  expect([...new Set(checked)].sort()).toEqual(Object.keys(rulesById).sort());
});
