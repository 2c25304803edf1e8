import { database } from '../../../../apps/web/src/phone/database/database';
import { ownerOf, setActive } from '../../../../apps/web/src/phone/device/enrolment';
import { saveEntry } from '../../../../apps/web/src/phone/save/save-entry';

const company = '018f6b2a-0000-7000-8000-00000000c001';
const actor = '018f6b2a-0000-7000-8000-00000000b001';
const deviceId = '018f6b2a-0000-7000-8000-00000000d001';

/** Milliseconds of each save, and of each bare put made right after it. */
export interface Samples {
  save: number[];
  bare: number[];
}

async function enrol(): Promise<void> {
  const owner = ownerOf(company, actor);
  const session = { user: { id: actor }, company: { id: company } } as never as {
    user: never;
    company: never;
  };
  const enrolment = {
    deviceId,
    owner,
    ingestSecret: '',
    verifyKey: {},
    lease: null,
    enrolledMs: 0,
    ...session,
  };
  await database().devices.put(enrolment);
  await setActive(database(), enrolment);
}

async function saveOne(n: number): Promise<void> {
  const visit = `018f6b2a-0000-7000-8000-${String(n % 400).padStart(12, '0')}`;
  const zoneId = '018f6b2a-0000-7000-8000-00000000f001';
  const result = await saveEntry({
    visit,
    type: 'heads-seen',
    body: { zoneId, what: 'two heads spit, the rest mist' },
    actor,
    company,
  });
  if (!result.ok) throw new Error(result.fault);
}

function openBare(): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('bare', 1);
    request.onupgradeneeded = () => request.result.createObjectStore('rows', { autoIncrement: true });
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(new Error('bare database'));
  });
}

/** The least that a durable save can be: one row of an entry's size, one strict transaction. */
function putBare(db: IDBDatabase, row: unknown): Promise<void> {
  return new Promise((resolve, reject) => {
    const transaction = db.transaction('rows', 'readwrite', { durability: 'strict' });
    transaction.objectStore('rows').put(row);
    transaction.oncomplete = () => resolve();
    transaction.onabort = () => reject(new Error('bare put'));
  });
}

async function timed(work: () => Promise<void>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

let saved = 0;
const ready = Promise.all([enrol(), openBare()]);

/** Saves and bare puts in turn, so that both meet the same machine. */
async function measure(count: number): Promise<Samples> {
  const [, bare] = await ready;
  const samples: Samples = { save: [], bare: [] };
  for (let index = 0; index < count; index += 1) {
    samples.save.push(await timed(() => saveOne(saved++)));
    const row = await database().entries.get([deviceId, saved]);
    samples.bare.push(await timed(() => putBare(bare, row)));
  }
  return samples;
}

/** Saves until there are so many entries. */
async function fillTo(total: number): Promise<void> {
  await ready;
  while (saved < total) await saveOne(saved++);
}

Object.assign(globalThis, { bench: { measure, fillTo } });
