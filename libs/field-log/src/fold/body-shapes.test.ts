import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { entryTypes, type EntryType } from '../entry-types/registry';
import { bodies } from '../testing/arbitraries';
import { bodyFits } from './body-shapes';

const types = Object.keys(entryTypes) as EntryType[];
const bySchema = (type: EntryType, body: Record<string, unknown>) =>
  entryTypes[type].body.safeParse(body).success;

const oddValues = fc.oneof(
  fc.constantFrom<unknown>(
    null,
    undefined,
    '',
    'x'.repeat(30_000),
    -1,
    1.5,
    1e9,
    Number.NaN,
    Number.POSITIVE_INFINITY,
  ),
  fc.constantFrom<unknown>(
    true,
    [],
    {},
    '00000000-0000-0000-0000-000000000000',
    'FFFFFFFF-ffff-ffff-ffff-ffffffffffff',
  ),
  fc.uuid(),
  fc.string(),
  fc.double(),
);

describe.each(types)('shape of %s', (type) => {
  const fitting = bodies[type] as fc.Arbitrary<Record<string, unknown>>;

  it('accepts what the schema accepts', () => {
    fc.assert(
      fc.property(fitting, (body) => {
        expect([bodyFits(type, body), bySchema(type, body)]).toEqual([true, true]);
      }),
    );
  });

  it('agrees with the schema when a member is odd, gone or too many', () => {
    fc.assert(
      fc.property(
        fitting,
        fc.nat(),
        oddValues,
        fc.constantFrom('set', 'drop', 'add'),
        (body, at, value, how) => {
          const names = Object.keys(body);
          const name = names[at % names.length] ?? 'extra';
          const odd: Record<string, unknown> = { ...body };
          if (how === 'set') odd[name] = value;
          else if (how === 'drop') delete odd[name];
          else odd['extra'] = value;
          expect(bodyFits(type, odd)).toBe(bySchema(type, odd));
        },
      ),
      { numRuns: 300 },
    );
  });
});

it('knows no body of a type that does not exist', () => {
  expect(bodyFits('constructor', {})).toBe(false);
});
