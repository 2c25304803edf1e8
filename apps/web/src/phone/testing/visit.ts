import type { StoredEntry, VisitDocument } from '@rimeward/contracts';

/** A planned visit with secrets in it. */
export function visitOf(id: string, date: string, sequence = 1): VisitDocument {
  return {
    id,
    date,
    sequence,
    purpose: 'winterize',
    note: 'Gate sticks',
    crew: null,
    assigned: [],
    customer: { name: 'Test Customer', phone: '555 0100' },
    site: {
      id,
      name: 'North lawn',
      address: '1 Test Street',
      town: 'Testville',
      latitude: 40,
      longitude: -105,
      elevationFt: 5_280,
      accessNotes: 'Dog in the yard',
      gateCode: '4711',
    },
    system: {} as VisitDocument['system'],
    lastYear: null,
    reviews: [],
  };
}

/** An entry of another phone as the feed brings it. */
export function storedEntryOf(
  seq: number,
  visit: string,
  overrides: Record<string, unknown> = {},
): StoredEntry {
  const device = '018f6b2a-0000-7000-8000-0000000000ff';
  const id = `018f6b2a-0000-7000-8000-${String(seq).padStart(12, '0')}`;
  const entry = {
    v: 1,
    id,
    device,
    seq,
    visit,
    type: 'note-written',
    typeVersion: 1,
    body: { text: 'x' },
    photos: [],
    ...overrides,
  };
  return {
    position: seq,
    device,
    seq,
    visitId: visit,
    text: JSON.stringify(entry),
    hash: 'c'.repeat(64),
    receivedAt: '2026-10-15T06:00:00.000Z',
    heldReason: null,
  };
}
