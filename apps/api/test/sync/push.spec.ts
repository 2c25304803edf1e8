import { createPublicKey, randomUUID, verify } from 'node:crypto';
import type { ProblemDetails } from '@rimeward/contracts';
import { sealEntry } from '@rimeward/delivery';
import { Signer } from '../../src/signing/signer';
import { anyId, crewOfOne, Office } from './office';
import { codec, TestPhone } from './test-phone';

let office: Office;
beforeAll(async () => {
  office = await Office.open();
});
afterAll(() => office.close());

const results = (answer: {
  body: { results: { seq: number; result: string; heldReason?: string }[] };
}): string[] =>
  answer.body.results.map(({ seq, result, heldReason }) =>
    [seq, result, heldReason].filter(Boolean).join(' '),
  );

describe('pushing', () => {
  it('stores the exact bytes, in the chain, and answers a receipt that the phone can check', async () => {
    const { phone, visit } = await crewOfOne(office);
    for (const text of ['first', 'with ñ and 雪 and a "quote"', 'third']) phone.note(visit, text);
    const { status, body } = await phone.push();
    expect(status).toBe(200);
    expect(body).toMatchObject({
      acknowledgedThrough: 3,
      acknowledgedHash: phone.head.hash,
      missingPhotos: [],
    });
    expect(await office.chainOf(phone)).toEqual(
      phone.entries.map(({ seq, text, hash }) => ({ seq, text, hash, held: null })),
    );
    const [head, payload, signature] = (body.receipt ?? '').split('.');
    const key = createPublicKey({ key: office.test.app.get(Signer).publicJwk(), format: 'jwk' });
    const signed = Buffer.from(`${head}.${payload}`);
    const ieee = { key, dsaEncoding: 'ieee-p1363' } as const;
    expect(verify('sha256', signed, ieee, Buffer.from(signature!, 'base64url'))).toBe(true);
    expect(JSON.parse(Buffer.from(payload!, 'base64url').toString())).toMatchObject({
      typ: 'receipt',
      device: phone.owner.device,
      acknowledgedThrough: 3,
      hash: phone.head.hash,
    });
  });

  it('stores nothing twice when every answer is lost once', async () => {
    const { phone, visit } = await crewOfOne(office);
    for (let batch = 0; batch < 6; batch += 1) {
      const texts = [phone.note(visit), phone.note(visit), phone.note(visit)].map(({ text }) => text);
      // The first answer is thrown away: the office has committed, the phone does not know.
      await phone.push(texts);
      const again = await phone.push(texts);
      expect(again.body.results.map(({ result }) => result)).toEqual(['duplicate', 'duplicate', 'duplicate']);
      expect(again.body.acknowledgedThrough).toBe(phone.head.seq);
    }
    expect(await office.chainOf(phone)).toHaveLength(18);
  });

  it('stores nothing twice when one batch arrives many times at once', async () => {
    const { phone, visit } = await crewOfOne(office);
    for (let n = 0; n < 40; n += 1) phone.note(visit);
    const answers = await Promise.all(Array.from({ length: 8 }, () => phone.push()));
    expect(answers.map(({ status, body }) => [status, body.acknowledgedThrough])).toEqual(
      Array.from({ length: 8 }, () => [200, 40]),
    );
    expect(answers.filter(({ body }) => body.results[0]?.result === 'stored')).toHaveLength(1);
    expect((await office.chainOf(phone)).map(({ seq }) => seq)).toEqual(
      Array.from({ length: 40 }, (_, n) => n + 1),
    );
  });

  it('takes an old batch after a newer one for duplicates', async () => {
    const { phone, visit } = await crewOfOne(office);
    const texts = Array.from({ length: 4 }, () => phone.note(visit).text);
    await phone.push(texts);
    expect(results(await phone.push(texts.slice(0, 2)))).toEqual(['1 duplicate', '2 duplicate']);
    expect(results(await phone.push(texts.slice(1)))).toHaveLength(3);
  });

  it('answers a gap with the end of what it has, and stores nothing beyond it', async () => {
    const { phone, visit } = await crewOfOne(office);
    const texts = Array.from({ length: 4 }, () => phone.note(visit).text);
    const answer = await phone.push([texts[0]!, texts[2]!, texts[3]!]);
    expect(results(answer)).toEqual(['1 stored', '3 gap', '4 gap']);
    expect(answer.body.acknowledgedThrough).toBe(1);
    expect((await phone.push(texts)).body.acknowledgedThrough).toBe(4);
  });

  it('keeps a fork beside the chain, once, however often it is sent', async () => {
    const { phone, visit } = await crewOfOne(office);
    const clone = new TestPhone(phone.owner);
    phone.note(visit, 'as it was');
    clone.note(visit, 'as somebody else has it');
    await phone.push();
    for (let n = 0; n < 3; n += 1) expect(results(await clone.push())).toEqual(['1 held fork']);
    const kept = await office.rows(
      "select convert_from(bytes, 'UTF8') as text, held_reason from stray_entries where device_id = $1",
      [phone.owner.device],
    );
    expect(kept).toEqual([{ text: clone.entries[0]!.text, held_reason: 'fork' }]);
    expect(await office.chainOf(phone)).toHaveLength(1);
  });

  it('stores and holds what it cannot take, and the chain goes on', async () => {
    const { phone, visit, technician } = await crewOfOne(office);
    const other = await crewOfOne(office);
    const note = { visit, type: 'note-written', body: { text: 'x' } };
    phone.seal({ ...note, type: 'of-the-future' });
    phone.seal({ ...note, typeVersion: 9 });
    phone.seal({ ...note, body: { text: 1 } });
    phone.seal({ ...note, visit: other.visit });
    phone.seal({ ...note, actor: other.technician });
    phone.seal({ ...note, company: other.company.id });
    phone.seal({ ...note, v: 2 });
    phone.seal({ ...note, body: { text: 'with \0 in it' } });
    phone.seal({
      ...note,
      time: { wall: '1970-01-01T00:00:00.000Z', zone: 'UTC', offsetMs: null, offsetAgeMs: null },
    });
    expect(results(await phone.push())).toEqual([
      '1 held unknown-type',
      '2 held newer-version',
      '3 held invalid-body',
      '4 held foreign-visit',
      '5 held foreign-actor',
      '6 held foreign-visit',
      '7 held newer-version',
      '8 stored',
      '9 stored',
    ]);
    expect((await office.chainOf(phone)).map(({ text }) => text)).toEqual(
      phone.entries.map(({ text }) => text),
    );
    expect(technician).not.toBe(other.technician);
  });

  it('holds the entry behind an edited one, and goes on', async () => {
    const { phone, visit } = await crewOfOne(office);
    for (const text of ['one', 'two', 'three']) phone.note(visit, text);
    const texts = phone.entries.map(({ text }) => text);
    texts[0] = texts[0]!.replace('one', 'two');
    expect(results(await phone.push(texts))).toEqual(['1 stored', '2 held chain-broken', '3 stored']);
  });

  it('gives a damaged entry the number that its neighbours leave for it', async () => {
    const { phone, visit } = await crewOfOne(office);
    for (let n = 0; n < 3; n += 1) phone.note(visit);
    const texts = phone.entries.map(({ text }) => text);
    texts[1] = texts[1]!.slice(0, 70);
    const expected = ['1 stored', '2 held unreadable', '3 held chain-broken'];
    expect(results(await phone.push(texts))).toEqual(expected);
    expect((await phone.push(texts)).body.results.map(({ result }) => result)).toEqual(
      Array.from({ length: 3 }, () => 'duplicate'),
    );
    expect((await office.chainOf(phone))[1]).toMatchObject({ text: texts[1], held: 'unreadable' });
  });

  it('stores and holds everything of a revoked device', async () => {
    const { phone, visit } = await crewOfOne(office);
    await office.rows('update devices set revoked_at = now() where id = $1', [phone.owner.device]);
    phone.note(visit);
    const answer = await phone.push();
    expect(results(answer)).toEqual(['1 held device-revoked']);
    expect(answer.body.acknowledgedThrough).toBe(1);
  });

  it('takes nothing with the credential of another device, nor without one', async () => {
    const { phone, visit } = await crewOfOne(office);
    const other = await crewOfOne(office);
    phone.note(visit);
    const body = {
      device: phone.owner.device,
      manifest: phone.manifest(1),
      entries: [phone.entries[0]!.text],
    };
    const crossed = await other.phone.pushBody(body);
    expect([crossed.status, (crossed.body as unknown as ProblemDetails).code]).toEqual([
      401,
      'device-unknown',
    ]);
    const forged = new TestPhone({ ...phone.owner, ingestSecret: other.phone.owner.ingestSecret });
    expect((await forged.pushBody(body)).status).toBe(401);
    expect(await office.chainOf(phone)).toEqual([]);
  });

  it('keeps an entry that was written on another device beside the chain', async () => {
    const { phone, visit } = await crewOfOne(office);
    phone.seal({ device: randomUUID(), visit, type: 'note-written', body: { text: 'copied storage' } });
    const answer = await phone.push();
    expect(results(answer)).toEqual(['1 held chain-broken']);
    expect(answer.body.acknowledgedThrough).toBe(0);
  });

  it.each([
    ['over the limit of a batch', (texts: string[]) => ({ entries: texts }), 413, 'payload-too-large'],
    ['over the limit of any body', () => ({ entries: ['x'.repeat(2_000_000)] }), 413, 'payload-too-large'],
    ['of another form', () => ({ entries: 'all of them' }), 422, 'validation-failed'],
  ])('refuses a body %s with a clear word, and stores nothing', async (_what, change, status, code) => {
    const { phone, visit } = await crewOfOne(office);
    const texts = Array.from({ length: 90 }, () => phone.note(visit, 'x'.repeat(3_500)).text);
    const body = { device: phone.owner.device, manifest: phone.manifest(90), ...change(texts) };
    const answer = await phone.pushBody(body);
    expect([answer.status, (answer.body as unknown as ProblemDetails).code]).toEqual([status, code]);
    expect(await office.chainOf(phone)).toEqual([]);
  });

  it('answers half a message with a problem, and stores nothing', async () => {
    const { phone, visit } = await crewOfOne(office);
    phone.note(visit);
    const whole = JSON.stringify({
      device: phone.owner.device,
      manifest: phone.manifest(1),
      entries: ['{}'],
    });
    expect((await phone.pushBody(whole.slice(0, 80))).status).toBe(400);
    expect(await office.chainOf(phone)).toEqual([]);
  });

  it('knows from the manifest alone what is still on a phone', async () => {
    const { phone, visit, company } = await crewOfOne(office);
    phone.note(visit);
    const answer = await phone.push([]);
    expect(answer.body).toMatchObject({ acknowledgedThrough: 0, acknowledgedHash: null, receipt: null });
    const kept = await office.rows<{ manifest: { head: number } }>(
      'select manifest from device_chains where company_id = $1 and device_id = $2',
      [company.id, phone.owner.device],
    );
    expect(kept[0]?.manifest.head).toBe(1);
  });

  it('names each photograph that a stored entry names and the office lacks', async () => {
    const { phone, visit } = await crewOfOne(office);
    const photo = {
      sha256: 'ab'.repeat(32),
      bytes: 300_000,
      type: 'image/jpeg',
      role: 'site' as const,
      takenAt: null,
      source: 'camera' as const,
    };
    phone.write(visit, 'photographs-added', { subject: null }, { photos: [photo, photo] });
    expect((await phone.push()).body.missingPhotos).toEqual([photo.sha256]);
    expect((await phone.push([])).body.missingPhotos).toEqual([photo.sha256]);
  });

  it('gives each company positions of its own, dense from 1', async () => {
    const { phone, visit, company } = await crewOfOne(office);
    const clone = new TestPhone(phone.owner);
    for (let n = 0; n < 5; n += 1) phone.note(visit);
    clone.note(visit, 'fork');
    await phone.push();
    await clone.push();
    const positions = await office.rows<{ position: string }>(
      `select position from log_entries where company_id = $1
       union all select position from stray_entries where company_id = $1
       union all select position from feed where company_id = $1 order by 1`,
      [company.id],
    );
    expect(positions.map(({ position }) => Number(position))).toEqual([1, 2, 3, 4, 5, 6]);
  });

  it('refuses no chain for its content: any sealed envelope is stored', async () => {
    const { phone } = await crewOfOne(office);
    const head = { seq: 0, hash: '0'.repeat(64) };
    const odd = sealEntry(
      { id: anyId(), device: phone.owner.device, ['__proto__']: 1, deep: [[[[{}]]]] },
      head,
      codec,
    );
    expect(results(await phone.push([odd.text]))).toEqual(['1 held invalid-body']);
  });
});
