import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Result } from '@rimeward/units';

/** Text of a fixture of this library. */
export const readFixture = (name: string): string =>
  readFileSync(join(__dirname, '../../fixtures', name), 'utf8');

/** Rows of a CSV fixture by column name. Double quotes are dropped; no fixture has a comma inside them. */
export function readCsv(name: string): Record<string, string>[] {
  const [head = '', ...lines] = readFixture(name).trim().split(/\r?\n/);
  const columns = head.split(',');
  return lines.map((line) => {
    const cells = line.split(',');
    return Object.fromEntries(columns.map((column, at) => [column, cells[at] ?? '']));
  });
}

/** A nominal size such as `1-1/4` or `3/4` as a number. */
export function sizeFromText(text: string): number {
  return text
    .split('-')
    .map((part) => {
      const [over = '', under] = part.split('/');
      return under === undefined ? Number(over) : Number(over) / Number(under);
    })
    .reduce((sum, part) => sum + part, 0);
}

/** The value of a result; a test fails with the error where there is none. */
export function valueOf<T>(result: Result<T>): T {
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
}

/** Relative difference. */
export const off = (value: number, reference: number): number => Math.abs(value / reference - 1);
