import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { entryTypes } from '../entry-types/registry';
import { parseEntry } from './parse-entry';

const folder = join(__dirname, '../../fixtures');
const samples = readdirSync(folder).sort();

describe('samples of released entries', () => {
  it.each(samples)('reads %s for ever', (name) => {
    const text = readFileSync(join(folder, name), 'utf8');
    const parsed = parseEntry(text);
    expect(parsed.ok ? null : parsed).toBeNull();
    const [, type, version] = /^(.+)\.v(\d+)\.json$/.exec(name) ?? [];
    expect(JSON.parse(text)).toMatchObject({ type, typeVersion: Number(version) });
  });

  it('hold one of every version of every type', () => {
    const wanted = Object.entries(entryTypes).flatMap(([type, { version }]) =>
      Array.from({ length: version }, (_, index) => `${type}.v${index + 1}.json`),
    );
    expect(samples).toEqual(wanted.sort());
  });

  it('are kept as written where the version is still the newest', () => {
    for (const name of samples) {
      const text = readFileSync(join(folder, name), 'utf8');
      const parsed = parseEntry(text);
      const written = JSON.parse(text) as { typeVersion: number };
      if (parsed.ok && parsed.entry.typeVersion === written.typeVersion)
        expect(parsed.entry).toEqual(written);
    }
  });
});
