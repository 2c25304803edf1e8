import { randomUUID } from 'node:crypto';
import type {
  DevicesResponse,
  HeldResponse,
  ProblemDetails,
  QueueResponse,
  VisitRecord,
} from '@rimeward/contracts';
import { Office } from './office';
import { codeOf, decide, queueItem, reviewed, work } from './reviewed';

let office: Office;
beforeAll(async () => {
  office = await Office.open();
});
afterAll(() => office.close());

describe('the queue of the review', () => {
  it('shows a visit from plan to review, with its figures', async () => {
    const setting = await reviewed(office);
    const { desk, visit, phone } = setting;
    expect(await queueItem(desk, visit)).toMatchObject({ standing: 'planned', zonesTotal: 2, cycles: 0 });
    phone.note(visit);
    await phone.push();
    expect((await queueItem(desk, visit)).standing).toBe('under-way');
    await work(setting);
    expect(await queueItem(desk, visit)).toMatchObject({
      standing: 'to-review',
      siteName: 'Cottonwood Lane 12',
      technicians: ['A technician'],
      cycles: 1,
      zonesDone: 1,
      zonesTotal: 2,
      leftAt: '2026-10-12T14:03:05.123Z',
    });
  });

  it('judges a visit by the rules, worst first, the same in the queue and in the record', async () => {
    const setting = await reviewed(office);
    const { desk, visit, phone, company } = setting;
    const cycleId = randomUUID();
    phone.write(visit, 'air-started', { cycleId, zoneId: company.zones[0]!, gaugePsi: 90 });
    await work(setting);
    const item = await queueItem(desk, visit);
    const { body } = await desk.get<VisitRecord>(`/review/visits/${visit}`);
    expect(item.worst).toEqual(body.findings.slice(0, 3));
    expect(item.worst[0]?.severity).toBe('danger');
    const rules = body.findings.map(({ ruleId }) => ruleId);
    expect(rules).toEqual(
      expect.arrayContaining(['air-before-water-off', 'over-ceiling', 'zone-without-air']),
    );
    expect(item.counts.danger).toBe(body.findings.filter(({ severity }) => severity === 'danger').length);
  });

  it('filters, counts and pages without losing or repeating a visit', async () => {
    const setting = await reviewed(office);
    const { desk, company, technician } = setting;
    for (let n = 0; n < 11; n += 1) await office.visit(company, [technician], n % 3);
    await work(setting);
    const all: string[] = [];
    let after = '';
    do {
      const { body } = await desk.get<QueueResponse>(`/review/visits?limit=4${after && `&after=${after}`}`);
      expect(body.total).toBe(12);
      all.push(...body.items.map(({ visitId }) => visitId));
      after = body.next ?? '';
    } while (after !== '');
    expect(new Set(all).size).toBe(12);
    expect(all[0]).toBe(setting.visit);
    const count = async (query: string): Promise<number> =>
      (await desk.get<QueueResponse>(`/review/visits?${query}`)).body.total;
    expect(await count('standing=to-review,answered')).toBe(1);
    expect(await count('standing=planned')).toBe(11);
    expect(await count('q=cottonWOOD')).toBe(12);
    expect(await count('q=nowhere')).toBe(0);
    expect(await count(`technician=${technician}`)).toBe(12);
    expect(await count(`technician=${randomUUID()}`)).toBe(0);
    expect((await desk.get('/review/visits?after=nonsense')).status).toBe(400);
    expect((await desk.get('/review/visits?standing=lost')).status).toBe(422);
  });

  it('still shows a visit whose entries cannot be folded, and repairs it when they can', async () => {
    const setting = await reviewed(office);
    const { desk, visit, phone, company } = setting;
    phone.note(visit);
    await phone.push();
    const damaged = [company.id, phone.owner.device];
    await office.rows(
      `update log_entries set bytes = '{"v"' where company_id = $1 and device_id = $2`,
      damaged,
    );
    expect(await queueItem(desk, visit)).toMatchObject({ standing: 'under-way', cycles: 0 });
    const other = await office.visit(company, [setting.technician]);
    expect((await queueItem(desk, other)).standing).toBe('planned');
    await office.rows('update log_entries set bytes = $3 where company_id = $1 and device_id = $2', [
      ...damaged,
      Buffer.from(phone.entries[0]!.text),
    ]);
    await work(setting);
    expect((await queueItem(desk, visit)).standing).toBe('to-review');
  });

  it('counts photographs that are named and those that are here', async () => {
    const { desk, visit, phone } = await reviewed(office);
    const photo = {
      sha256: 'cd'.repeat(32),
      bytes: 1_000,
      type: 'image/jpeg',
      role: 'site' as const,
      takenAt: null,
      source: 'camera' as const,
    };
    phone.write(visit, 'photographs-added', { subject: null }, { photos: [photo] });
    await phone.push();
    expect(await queueItem(desk, visit)).toMatchObject({ photos: 1, photosMissing: 1 });
  });
});

describe('the record of a visit', () => {
  it('has every entry byte for byte, held ones with their reason, and where a photograph was used before', async () => {
    const { desk, visit, phone, company, technician } = await reviewed(office);
    const before = await office.visit(company, [technician]);
    const photo = {
      sha256: 'ef'.repeat(32),
      bytes: 1_000,
      type: 'image/jpeg',
      role: 'site' as const,
      takenAt: null,
      source: 'gallery' as const,
    };
    phone.write(before, 'photographs-added', { subject: null }, { photos: [photo] });
    phone.write(visit, 'photographs-added', { subject: null }, { photos: [photo] });
    phone.seal({ visit, type: 'of-the-future', body: {} });
    await phone.push();
    const { body } = await desk.get<VisitRecord>(`/review/visits/${visit}`);
    expect(body.entries.map(({ text, hash, heldReason }) => [text, hash, heldReason])).toEqual([
      [phone.entries[1]!.text, phone.entries[1]!.hash, null],
      [phone.entries[2]!.text, phone.entries[2]!.hash, 'unknown-type'],
    ]);
    expect(body.photos).toEqual([
      {
        sha256: photo.sha256,
        bytes: 1_000,
        type: 'image/jpeg',
        complete: false,
        hasPreview: false,
        exif: null,
        alsoOnVisits: [before],
      },
    ]);
    expect(body.people).toContainEqual({ id: technician, name: 'A technician' });
    expect(body.position).toBe(body.entries.at(-1)?.position);
  });

  it('does not exist for another company, nor for a technician', async () => {
    const { visit, technician } = await reviewed(office);
    const other = await reviewed(office);
    expect((await other.desk.get(`/review/visits/${visit}`)).status).toBe(404);
    expect(
      (await decide(await office.desk(technician), other.visit, {}).catch(() => null))?.status ?? 403,
    ).toBe(403);
    const technicianDesk = await office.desk(technician);
    for (const path of ['visits', `visits/${visit}`, 'devices', 'held'])
      expect((await technicianDesk.get(`/review/${path}`)).status).toBe(403);
  });
});

describe('what needs a person', () => {
  it('lists held entries until somebody settles them, once', async () => {
    const { desk, visit, phone } = await reviewed(office);
    phone.seal({ visit, type: 'of-the-future', body: {} });
    await phone.push();
    const [held] = (await desk.get<HeldResponse>('/review/held')).body.entries;
    expect(held).toMatchObject({ heldReason: 'unknown-type', text: phone.entries[0]!.text, settled: null });
    expect((await queueItem(desk, visit)).heldEntries).toBe(1);
    const settle = () =>
      desk.post<ProblemDetails>(`/review/held/${held!.id}/settle`, { note: 'Phone updated' });
    expect((await settle()).status).toBe(204);
    expect(codeOf(await settle())).toEqual([409, 'changed-since-opened']);
    const [after] = (await desk.get<HeldResponse>('/review/held')).body.entries;
    expect(after?.settled).toMatchObject({ note: 'Phone updated', by: 'A supervisor' });
    expect((await queueItem(desk, visit)).heldEntries).toBe(0);
    expect((await desk.post('/review/held/424242/settle', { note: 'x' })).status).toBe(404);
  });

  it('shows what is still on a phone and since when', async () => {
    const { desk, visit, phone } = await reviewed(office);
    phone.note(visit);
    phone.note(visit);
    await phone.push([phone.entries[0]!.text]);
    const { devices } = (await desk.get<DevicesResponse>('/review/devices')).body;
    expect(devices).toMatchObject([
      {
        id: phone.owner.device,
        userName: 'A technician',
        revoked: false,
        acknowledgedThrough: 1,
        manifest: { head: 2 },
      },
    ]);
    expect(Date.parse(devices[0]?.lastContactAt ?? '')).toBeGreaterThan(Date.now() - 60_000);
  });
});
