import { createHash, randomBytes } from 'node:crypto';
import { readdir, readFile, rm } from 'node:fs/promises';
import { join } from 'node:path';
import {
  photoLimits,
  type AnnounceResponse,
  type PhotoState,
  type ProblemDetails,
} from '@rimeward/contracts';
import type { PhotoReference } from '@rimeward/field-log';
import sharp from 'sharp';
import { PhotoStorage, StorageFullError } from '../../src/photos/storage/photo-storage';
import { crewOfOne, Office } from './office';
import type { Answer, TestPhone } from './test-phone';

let office: Office;
let picture: Buffer;
beforeAll(async () => {
  office = await Office.open();
  // Noise does not compress: the file is as large as one of a camera, in several parts.
  picture = await jpeg(1_000, 700, 'Test camera');
});
afterAll(() => office.close());

async function jpeg(width: number, height: number, make: string): Promise<Buffer> {
  return sharp(randomBytes(width * height * 3), { raw: { width, height, channels: 3 } })
    .withExif({
      IFD0: { Make: make },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '39/1 44/1 0/1',
        GPSLongitudeRef: 'W',
        GPSLongitude: '104/1 59/1 0/1',
      },
    })
    .jpeg({ quality: 90 })
    .toBuffer();
}

const hashOf = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');

function parts(bytes: Buffer): Buffer[] {
  const count = Math.ceil(bytes.length / photoLimits.partBytes);
  return Array.from({ length: count }, (_, n) =>
    bytes.subarray(n * photoLimits.partBytes, (n + 1) * photoLimits.partBytes),
  );
}

async function announce(
  phone: TestPhone,
  bytes: Buffer,
  over: object = {},
): Promise<Answer<AnnounceResponse & ProblemDetails>> {
  const photo = { sha256: hashOf(bytes), bytes: bytes.length, type: 'image/jpeg', ...over };
  return phone.send('/photos/announce', JSON.stringify({ photos: [photo] }), 'application/json');
}

function file(field: string, bytes: Buffer): FormData {
  const form = new FormData();
  form.append(field, new Blob([new Uint8Array(bytes)]), 'x');
  return form;
}

const sendPart = (
  phone: TestPhone,
  sha256: string,
  n: number,
  bytes: Buffer,
): Promise<Answer<PhotoState & ProblemDetails>> =>
  phone.send(`/photos/${sha256}/parts/${n}`, file('part', bytes));
const complete = (phone: TestPhone, sha256: string): Promise<Answer<PhotoState & ProblemDetails>> =>
  phone.send(`/photos/${sha256}/complete`);

async function deliver(phone: TestPhone, bytes: Buffer): Promise<Answer<PhotoState & ProblemDetails>> {
  const sha256 = hashOf(bytes);
  await announce(phone, bytes);
  for (const [n, part] of parts(bytes).entries()) await sendPart(phone, sha256, n, part);
  return complete(phone, sha256);
}

function reference(bytes: Buffer): PhotoReference {
  return {
    sha256: hashOf(bytes),
    bytes: bytes.length,
    type: 'image/jpeg',
    role: 'site',
    takenAt: null,
    source: 'camera',
  };
}

const codeOf = (answer: Answer<ProblemDetails>): [number, string] => [answer.status, answer.body.code];

describe('bringing a photograph', () => {
  it('says which parts are missing, takes them in any order and twice, and has it byte for byte', async () => {
    const { phone, company } = await crewOfOne(office);
    const sha256 = hashOf(picture);
    const all = parts(picture);
    expect(all.length).toBeGreaterThan(2);
    const first = await announce(phone, picture);
    expect(first.body.photos).toEqual([
      { sha256, state: 'partial', missingParts: [...all.keys()], hasPreview: false },
    ]);
    await Promise.all([2, 0, 2].map((n) => sendPart(phone, sha256, n, all[n]!)));
    expect((await announce(phone, picture)).body.photos[0]?.missingParts).not.toContain(0);
    expect((await complete(phone, sha256)).body).toMatchObject({ state: 'partial' });
    for (const [n, part] of all.entries()) await sendPart(phone, sha256, n, part);
    // Each answer is lost once.
    await complete(phone, sha256);
    expect((await complete(phone, sha256)).body).toMatchObject({ state: 'complete', missingParts: [] });
    const kept = await readFile(join(office.test.photoDir, company.id, sha256.slice(0, 2), sha256));
    expect(kept.equals(picture)).toBe(true);
    const rows = await office.rows<{ state: string; exif: Record<string, unknown> }>(
      'select state, exif from photos where company_id = $1',
      [company.id],
    );
    expect(rows).toHaveLength(1);
    expect(rows[0]?.exif).toMatchObject({ Make: 'Test camera' });
  });

  it('starts again when a bit was flipped on the way', async () => {
    const { phone } = await crewOfOne(office);
    const sha256 = hashOf(picture);
    await announce(phone, picture);
    for (const [n, part] of parts(picture).entries()) {
      const sent = Buffer.from(part);
      if (n === 1) sent[777] = sent[777]! ^ 0b100;
      await sendPart(phone, sha256, n, sent);
    }
    expect(codeOf(await complete(phone, sha256))).toEqual([422, 'photo-hash-mismatch']);
    expect((await announce(phone, picture)).body.photos[0]?.missingParts).toHaveLength(parts(picture).length);
    expect((await deliver(phone, picture)).body.state).toBe('complete');
  });

  it('takes no part that was cut, and none that does not exist', async () => {
    const { phone } = await crewOfOne(office);
    const sha256 = hashOf(picture);
    await announce(phone, picture);
    expect(codeOf(await sendPart(phone, sha256, 0, parts(picture)[0]!.subarray(0, 99)))).toEqual([
      400,
      'bad-request',
    ]);
    expect(codeOf(await sendPart(phone, sha256, 99, Buffer.from('x')))).toEqual([400, 'bad-request']);
    expect(codeOf(await sendPart(phone, sha256, 0, randomBytes(photoLimits.partBytes + 1)))).toEqual([
      413,
      'payload-too-large',
    ]);
    expect(codeOf(await sendPart(phone, hashOf(Buffer.from('unannounced')), 0, Buffer.from('x')))).toEqual([
      404,
      'not-found',
    ]);
  });

  it('begins anew after the temporary parts have been wiped', async () => {
    const { phone, company } = await crewOfOne(office);
    const sha256 = hashOf(picture);
    await announce(phone, picture);
    for (const [n, part] of parts(picture).entries()) await sendPart(phone, sha256, n, part);
    await rm(join(office.test.photoDir, company.id, 'parts'), { recursive: true });
    expect((await complete(phone, sha256)).body).toMatchObject({ state: 'partial' });
    expect((await deliver(phone, picture)).body.state).toBe('complete');
  });

  it.each([
    ['a page', '<html><script>alert(1)</script></html>'],
    ['a drawing with script', '<svg xmlns="http://www.w3.org/2000/svg" onload="alert(1)"/>'],
    ['a document', '%PDF-1.7 and so on and on'],
    ['a program', 'MZ\x90\0\x03 this program cannot be run'],
  ])('refuses %s that says it is a photograph, and keeps it out of reach', async (_what, text) => {
    const { phone, company } = await crewOfOne(office);
    const bytes = Buffer.from(text, 'latin1');
    expect(codeOf(await deliver(phone, bytes))).toEqual([415, 'photo-type-refused']);
    expect((await announce(phone, bytes)).body.photos[0]).toMatchObject({
      state: 'refused',
      refusedBecause: 'photo-type-refused',
    });
    expect(await readdir(join(office.test.photoDir, company.id, 'refused'))).toEqual([hashOf(bytes)]);
  });

  it('names what is wrong with an announcement: nothing in it, of another type, too large', async () => {
    const { phone } = await crewOfOne(office);
    expect(codeOf(await announce(phone, Buffer.alloc(0)))).toEqual([422, 'photo-empty']);
    expect(codeOf(await announce(phone, picture, { type: 'text/plain' }))).toEqual([
      415,
      'photo-type-refused',
    ]);
    const large = await announce(phone, picture, { bytes: 60 * 1024 * 1024 });
    expect(large.body.photos[0]).toMatchObject({ state: 'refused', refusedBecause: 'photo-too-large' });
    expect((await announce(phone, picture)).body.photos[0]?.state).toBe('partial');
  });

  it('takes a preview from the phone, drawn anew without the place it was taken', async () => {
    const { phone, company } = await crewOfOne(office);
    const sha256 = hashOf(picture);
    await announce(phone, picture);
    const small = await jpeg(300, 200, 'Secret maker');
    const answer = await phone.send<PhotoState>(`/photos/${sha256}/preview`, file('preview', small));
    expect(answer.body).toMatchObject({ hasPreview: true, state: 'partial' });
    const kept = await readFile(
      join(office.test.photoDir, company.id, sha256.slice(0, 2), `${sha256}.preview.jpg`),
    );
    expect((await sharp(kept).metadata()).exif).toBeUndefined();
    const page = await phone.send<ProblemDetails>(`/photos/${hashOf(small)}/preview`, file('preview', small));
    expect(page.status).toBe(404);
  });

  it('says that the storage is full, loses nothing, and takes the part when there is room again', async () => {
    const { phone } = await crewOfOne(office);
    const storage = office.test.app.get(PhotoStorage, { strict: false });
    await announce(phone, picture);
    const [first] = parts(picture);
    const full = jest.spyOn(storage, 'writePart').mockRejectedValueOnce(new StorageFullError('no room'));
    expect(codeOf(await sendPart(phone, hashOf(picture), 0, first!))).toEqual([507, 'storage-full']);
    full.mockRestore();
    const again = await sendPart(phone, hashOf(picture), 0, first!);
    expect(again.body.missingParts).not.toContain(0);
  });

  it('takes nothing with a forged credential', async () => {
    const { phone } = await crewOfOne(office);
    phone.owner.ingestSecret = 'x'.repeat(43);
    expect((await announce(phone, picture)).status).toBe(401);
  });
});

describe('looking at a photograph', () => {
  it('is for the desk, and for the technicians of the visit; for nobody else', async () => {
    const { phone, company, visit, technician } = await crewOfOne(office);
    phone.write(visit, 'photographs-added', { subject: null }, { photos: [reference(picture)] });
    expect((await phone.push()).body.missingPhotos).toEqual([hashOf(picture)]);
    await deliver(phone, picture);
    expect((await phone.push([])).body.missingPhotos).toEqual([]);
    const other = await crewOfOne(office);
    const look = async (userId: string, kind: string): Promise<number> =>
      (await (await office.desk(userId)).raw(`/photos/${hashOf(picture)}/${kind}`)).status;
    for (const kind of ['original', 'preview']) {
      expect(await look(technician, kind)).toBe(200);
      for (const role of ['supervisor', 'office', 'owner'] as const)
        expect(await look(await office.person(company, role), kind)).toBe(200);
      expect(await look(await office.person(company, 'technician'), kind)).toBe(404);
      expect(await look(await office.person(other.company, 'owner'), kind)).toBe(404);
    }
  });

  it('gets the bytes as they are, in headers that let nothing in them act', async () => {
    const { phone, company } = await crewOfOne(office);
    await deliver(phone, picture);
    const desk = await office.desk(await office.person(company, 'supervisor'));
    const answer = await desk.raw(`/photos/${hashOf(picture)}/original`);
    expect(Buffer.from(await answer.arrayBuffer()).equals(picture)).toBe(true);
    expect(answer.headers.get('content-type')).toBe('image/jpeg');
    expect(answer.headers.get('x-content-type-options')).toBe('nosniff');
    expect(answer.headers.get('content-security-policy')).toContain('sandbox');
    expect(answer.headers.get('cache-control')).toContain('private');
    const preview = await desk.raw(`/photos/${hashOf(picture)}/preview`);
    const facts = await sharp(Buffer.from(await preview.arrayBuffer())).metadata();
    expect([facts.format, facts.exif]).toEqual(['jpeg', undefined]);
  });

  it('finds nothing under what is no hash', async () => {
    const { company } = await crewOfOne(office);
    const desk = await office.desk(await office.person(company, 'owner'));
    for (const path of [
      '/photos/..%2f..%2fetc/original',
      '/photos/abc/original',
      `/photos/${'0'.repeat(64)}/original`,
    ])
      expect((await desk.raw(path)).status).toBe(404);
  });

  it('shares content within a company only: another one has to bring it itself', async () => {
    const one = await crewOfOne(office);
    const colleague = await office.phone(one.company, await office.person(one.company, 'technician'));
    const stranger = await crewOfOne(office);
    await deliver(one.phone, picture);
    expect((await announce(colleague, picture)).body.photos[0]?.state).toBe('complete');
    expect((await announce(stranger.phone, picture)).body.photos[0]?.state).toBe('partial');
  });
});
