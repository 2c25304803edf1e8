import { createHash } from 'node:crypto';
import { emptyChain, sealEntry, type ChainHead } from '@rimeward/delivery';
import fc from 'fast-check';
import { placeEntries, type KnownEntry, type Surroundings } from './place-entries';
import { readEntry, type ReadEntry } from './read-entry';

const device = '018f5b3e-0000-7000-8000-000000000001';
const otherDevice = '018f5b3e-0000-7000-8000-000000000002';
const company = '018f5b3e-0000-7000-8000-0000000000c0';
const actor = '018f5b3e-0000-7000-8000-0000000000a0';
const visit = '018f5b3e-0000-7000-8000-0000000000f0';

const codec = {
  utf8: (text: string) => new TextEncoder().encode(text),
  sha256: (bytes: Uint8Array) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};

function envelope(over: Record<string, unknown> = {}): object {
  return {
    v: 1,
    id: '018f5b3e-0000-7000-8000-0000000000e0',
    device,
    company,
    actor,
    visit,
    type: 'note-written',
    typeVersion: 1,
    body: { text: 'dry' },
    photos: [],
    time: { wall: '1970-01-01T00:00:00.000Z', zone: 'UTC', offsetMs: null, offsetAgeMs: null },
    app: 'test',
    ...over,
  };
}

/** Texts of a chain, one for each set of changed fields. */
function chain(overs: Record<string, unknown>[]): string[] {
  let head: ChainHead = emptyChain;
  return overs.map((over) => {
    const sealed = sealEntry(envelope(over), head, codec);
    head = sealed;
    return sealed.text;
  });
}

function around(over: Partial<Surroundings> = {}): Surroundings {
  return {
    company,
    device,
    deviceRevoked: false,
    head: emptyChain,
    firstPending: 1,
    known: new Map(),
    visits: new Set([visit]),
    person: actor,
    ...over,
  };
}

/** The office after it has taken these entries. */
function after(taken: ReadEntry[]): Pick<Surroundings, 'head' | 'known'> {
  const { append, head } = placeEntries(taken, around());
  const known = new Map<number, KnownEntry>(
    append.map(({ seq, entry, heldReason }) => [seq, { hash: entry.hash, heldReason }]),
  );
  return { head, known };
}

const read = (texts: string[]): ReadEntry[] => texts.map(readEntry);
const outcomes = (texts: string[], office: Surroundings): unknown[] =>
  placeEntries(read(texts), office).results.map(({ seq, result, heldReason }) => [seq, result, heldReason]);

describe('placing pushed entries', () => {
  it('appends what continues the chain, a date in 1970 included', () => {
    expect(outcomes(chain([{}, {}]), around())).toEqual([
      [1, 'stored', undefined],
      [2, 'stored', undefined],
    ]);
  });

  it('takes a batch that was taken before for duplicates, and appends nothing', () => {
    const texts = chain([{}, { type: 'of-the-future' }]);
    const again = placeEntries(read(texts), around(after(read(texts))));
    expect(again.append).toEqual([]);
    expect(again.results).toEqual([
      { seq: 1, result: 'duplicate' },
      { seq: 2, result: 'duplicate', heldReason: 'unknown-type' },
    ]);
  });

  it.each([
    ['unknown-type', { type: 'of-the-future' }],
    ['newer-version', { typeVersion: 99 }],
    ['newer-version', { v: 2, more: true }],
    ['invalid-body', { body: { text: 7 } }],
    ['invalid-body', { surplus: true }],
    ['foreign-visit', { visit: '018f5b3e-0000-7000-8000-0000000000f9' }],
    ['foreign-visit', { company: '018f5b3e-0000-7000-8000-0000000000c9' }],
    ['foreign-actor', { actor: '018f5b3e-0000-7000-8000-0000000000a9' }],
  ])('holds an entry as %s and goes on behind it', (reason, over) => {
    expect(outcomes(chain([{}, over, {}]), around())).toEqual([
      [1, 'stored', undefined],
      [2, 'held', reason],
      [3, 'stored', undefined],
    ]);
  });

  it('holds everything of a revoked device, in its chain', () => {
    const { head, results } = placeEntries(read(chain([{}, {}])), around({ deviceRevoked: true }));
    expect(head.seq).toBe(2);
    expect(results.every(({ heldReason }) => heldReason === 'device-revoked')).toBe(true);
  });

  it('keeps another entry under a known number beside the chain', () => {
    const mine = chain([{}]);
    const rival = chain([{ body: { text: 'another story' } }]);
    const placement = placeEntries(read(rival), around(after(read(mine))));
    expect(placement.append).toEqual([]);
    expect(placement.strays.map(({ seq, heldReason }) => [seq, heldReason])).toEqual([[1, 'fork']]);
  });

  it('stores nothing beyond a gap and says where the chain ends', () => {
    const texts = chain([{}, {}, {}]);
    const placement = placeEntries(read([texts[0]!, texts[2]!]), around());
    expect(placement.head.seq).toBe(1);
    expect(placement.results.map(({ result }) => result)).toEqual(['stored', 'gap']);
  });

  it('holds the entry whose previous hash is wrong, and takes the next one that follows it', () => {
    const [first] = chain([{}]);
    const [, second, third] = chain([{ body: { text: 'edited since' } }, {}, {}]);
    expect(outcomes([first!, second!, third!], around())).toEqual([
      [1, 'stored', undefined],
      [2, 'held', 'chain-broken'],
      [3, 'stored', undefined],
    ]);
  });

  it('keeps entries of another device beside the chain', () => {
    const placement = placeEntries(read(chain([{ device: otherDevice }])), around());
    expect(placement.strays.map(({ heldReason }) => heldReason)).toEqual(['chain-broken']);
    expect(placement.head).toEqual(emptyChain);
  });

  it.each([
    ['between readable ones', (texts: string[]) => [texts[0]!, '{"cut', texts[2]!], 1],
    ['at the beginning', (texts: string[]) => ['{"cut', texts[1]!, texts[2]!], 1],
    ['at the end', (texts: string[]) => [texts[0]!, texts[1]!, '{"cut'], 1],
    ['alone, by the account of the phone', () => ['{"cut'], 1],
  ])('gives an unreadable entry its number: %s', (_where, damage, firstPending) => {
    const texts = damage(chain([{}, {}, {}]));
    const placement = placeEntries(read(texts), around({ firstPending }));
    expect(placement.head.seq).toBe(texts.length);
    expect(placement.append.filter(({ heldReason }) => heldReason === 'unreadable')).toHaveLength(1);
    expect(placement.strays).toEqual([]);
  });

  it('keeps an unreadable entry without any number beside the chain', () => {
    const placement = placeEntries(read(['not json']), around({ firstPending: 0 }));
    expect(placement.results).toEqual([{ seq: 0, result: 'held', heldReason: 'unreadable' }]);
    expect(placement.strays).toHaveLength(1);
  });

  it('comes to one chain whatever batches arrive, in whatever order and however often', () => {
    const texts = chain(Array.from({ length: 12 }, (_, n) => ({ body: { text: `note ${n}` } })));
    const entries = read(texts);
    const batch = fc.tuple(fc.nat(11), fc.integer({ min: 1, max: 12 }));
    fc.assert(
      fc.property(fc.array(batch, { maxLength: 30 }), (batches) => {
        let office = around();
        const stored: string[] = [];
        for (const [from, length] of [...batches, ...Array.from({ length: 12 }, (_, n) => [n, 1] as const)]) {
          const placement = placeEntries(entries.slice(from, from + length), office);
          const known = new Map(office.known);
          for (const { seq, entry, heldReason } of placement.append) {
            known.set(seq, { hash: entry.hash, heldReason });
            stored.push(entry.hash);
          }
          expect(placement.strays).toEqual([]);
          office = around({ head: placement.head, known });
        }
        expect(stored).toEqual(entries.map(({ hash }) => hash));
      }),
    );
  });

  it('never throws and answers each entry, whatever the texts are', () => {
    fc.assert(
      fc.property(fc.array(fc.oneof(fc.string({ unit: 'binary' }), fc.json()), { maxLength: 8 }), (texts) => {
        expect(placeEntries(read(texts), around()).results).toHaveLength(texts.length);
      }),
    );
  });
});
