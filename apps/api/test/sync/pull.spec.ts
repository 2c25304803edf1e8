import type { FeedItem, PullResponse } from '@rimeward/contracts';
import { CompanyContext } from '../../src/database/company-context';
import { FeedService, type FeedChange } from '../../src/sync/feed/feed.service';
import type { Desk } from './desk';
import { crewOfOne, Office } from './office';

let office: Office;
beforeAll(async () => {
  office = await Office.open();
});
afterAll(() => office.close());

interface Place {
  epoch: string;
  cursor: number;
}

/** Reads the feed to its end, as a phone does. */
async function pullAll(
  desk: Desk,
  from?: Place,
  limit = 200,
): Promise<Place & { items: FeedItem[]; pages: number }> {
  let place = from ?? { epoch: '', cursor: 0 };
  const items: FeedItem[] = [];
  for (let pages = 1; ; pages += 1) {
    const answer = await desk.get<PullResponse>(
      `/sync/pull?epoch=${place.epoch}&cursor=${place.cursor}&limit=${limit}`,
    );
    expect(answer.status).toBe(200);
    items.push(...answer.body.items);
    place = answer.body;
    if (!answer.body.more) return { epoch: place.epoch, cursor: place.cursor, items, pages };
  }
}

async function touch(companyId: string, ...changes: FeedChange[]): Promise<void> {
  const feed = office.test.app.get(FeedService, { strict: false });
  await office.test.app.get(CompanyContext).run(companyId, (manager) => feed.touch(manager, ...changes));
}

const kinds = (items: FeedItem[]): string[] => items.map(({ kind }) => kind);
const texts = (items: FeedItem[]): string[] =>
  items.flatMap((item) => (item.kind === 'entry' ? [item.entry.text] : []));
const visitIds = (items: FeedItem[]): string[] =>
  items.flatMap((item) => (item.kind === 'visit' ? [item.id] : []));

describe('pulling', () => {
  it('brings the company and every own visit of the next two weeks at first, whether the feed has named them or not', async () => {
    const { company, technician, visit } = await crewOfOne(office);
    const later = await office.visit(company, [technician], 13);
    await office.visit(company, [technician], 40);
    await office.visit(company, [technician], -40);
    await office.visit(company, [await office.person(company, 'technician')]);
    const { items } = await pullAll(await office.desk(technician));
    expect(kinds(items)).toEqual(['company', 'visit', 'visit']);
    expect(visitIds(items)).toEqual([visit, later]);
    const document = items.find((item) => item.kind === 'visit')?.document;
    expect(document).toMatchObject({
      site: { gateCode: '4711' },
      system: { id: company.systemId },
      reviews: [],
    });
  });

  it('brings nothing twice: from the end there is nothing until something changes', async () => {
    const { company, technician, visit, phone } = await crewOfOne(office);
    const desk = await office.desk(technician);
    const first = await pullAll(desk);
    expect((await pullAll(desk, first)).items).toEqual([]);
    phone.note(visit);
    await phone.push();
    const second = await pullAll(desk, first);
    expect(texts(second.items)).toEqual(phone.entries.map(({ text }) => text));
    await touch(company.id, { kind: 'company' });
    const third = await pullAll(desk, second);
    expect(kinds(third.items)).toEqual(['company']);
    expect((await pullAll(desk, third)).items).toEqual([]);
  });

  it('brings a document that changed often once a page', async () => {
    const { company, technician, visit } = await crewOfOne(office);
    const desk = await office.desk(technician);
    const first = await pullAll(desk);
    for (let n = 0; n < 5; n += 1) await touch(company.id, { kind: 'visit', id: visit }, { kind: 'company' });
    expect(kinds((await pullAll(desk, first)).items)).toEqual(['company', 'visit']);
  });

  it('goes through pages of any size to the same end', async () => {
    const { technician, visit, phone } = await crewOfOne(office);
    for (let n = 0; n < 23; n += 1) phone.note(visit);
    await phone.push();
    const desk = await office.desk(technician);
    for (const limit of [1, 7, 500]) {
      const { items, pages } = await pullAll(desk, undefined, limit);
      expect(texts(items)).toEqual(phone.entries.map(({ text }) => text));
      expect(pages).toBe(Math.ceil(23 / limit));
    }
  });

  it('never tells a technician of visits that are not his, though his cursor passes them', async () => {
    const { company, technician } = await crewOfOne(office);
    const colleague = await office.person(company, 'technician');
    const theirs = await office.visit(company, [colleague]);
    const phone = await office.phone(company, colleague);
    const desk = await office.desk(technician);
    const before = await pullAll(desk);
    phone.note(theirs, 'the gate code is 4711');
    await phone.push();
    await touch(company.id, { kind: 'visit', id: theirs });
    const after = await pullAll(desk, before);
    expect(after.items).toEqual([]);
    expect(after.cursor).toBeGreaterThan(before.cursor);
    expect((await desk.get(`/review/visits/${theirs}`)).status).toBe(403);
    expect((await desk.get(`/visits/${theirs}`)).status).toBe(404);
  });

  it('brings a visit that is assigned later whole, with what others have written there before', async () => {
    const { company, technician } = await crewOfOne(office);
    const colleague = await office.person(company, 'technician');
    const shared = await office.visit(company, [colleague]);
    const phone = await office.phone(company, colleague);
    phone.note(shared, 'water is off');
    await phone.push();
    const desk = await office.desk(technician);
    const before = await pullAll(desk);
    await office.rows('insert into visit_assignments (company_id, visit_id, user_id) values ($1, $2, $3)', [
      company.id,
      shared,
      technician,
    ]);
    await touch(company.id, { kind: 'visit', id: shared });
    const after = await pullAll(desk, before);
    expect(visitIds(after.items)).toEqual([shared]);
    expect(texts(after.items)).toEqual(phone.entries.map(({ text }) => text));
  });

  it('takes a visit away from whom it was taken, and says so to nobody else', async () => {
    const { company, technician, visit } = await crewOfOne(office);
    const colleague = await office.person(company, 'technician');
    const mine = await pullAll(await office.desk(technician));
    const theirs = await pullAll(await office.desk(colleague));
    await office.rows('delete from visit_assignments where visit_id = $1', [visit]);
    await touch(
      company.id,
      { kind: 'visit-removed', id: visit, userId: technician },
      { kind: 'visit', id: visit },
    );
    expect((await pullAll(await office.desk(technician), mine)).items).toEqual([
      { kind: 'visit-removed', id: visit },
    ]);
    expect((await pullAll(await office.desk(colleague), theirs)).items).toEqual([]);
  });

  it('brings a visit into the two weeks by the passing of days', async () => {
    const { company, technician } = await crewOfOne(office);
    const planned = await office.visit(company, [technician], 14);
    await touch(company.id, { kind: 'visit', id: planned });
    // Planned three weeks ago: the phone read past it when it was out of reach.
    await office.rows("update feed set at = at - interval '21 days' where ref_id = $1", [planned]);
    const [head] = await office.rows<{ position: string }>(
      'select position from company_positions where company_id = $1',
      [company.id],
    );
    const desk = await office.desk(technician);
    const { epoch } = await pullAll(desk);
    const told = await pullAll(desk, { epoch, cursor: Number(head?.position) });
    expect(visitIds(told.items)).toContain(planned);
  });

  it('begins anew under another epoch, and after a restore that knew fewer positions', async () => {
    const { technician, visit } = await crewOfOne(office);
    const desk = await office.desk(technician);
    const first = await pullAll(desk);
    expect(
      visitIds((await pullAll(desk, { epoch: 'of another database', cursor: first.cursor })).items),
    ).toEqual([visit]);
    expect(visitIds((await pullAll(desk, { epoch: first.epoch, cursor: first.cursor + 500 })).items)).toEqual(
      [visit],
    );
    await office.rows('update feed_epoch set epoch = gen_random_uuid()');
    const after = await pullAll(desk, first);
    expect(after.epoch).not.toBe(first.epoch);
    expect(visitIds(after.items)).toEqual([visit]);
  });

  it('is closed without a session, and to the credential of a device', async () => {
    const { phone } = await crewOfOne(office);
    const answer = await fetch(`${office.test.url}/api/sync/pull`, {
      headers: { authorization: phone.authorization },
    });
    expect(answer.status).toBe(401);
  });
});
