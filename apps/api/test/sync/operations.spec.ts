import { DataSource } from 'typeorm';
import type { PullResponse } from '@rimeward/contracts';
import { dataSourceOptions } from '../../src/database/data-source';
import { dropProjections } from '../../src/projection/drop-projections';
import { renewEpoch } from '../../src/sync/feed/renew-epoch';
import { crewOfOne, Office } from './office';
import { queueItem, reviewed, work } from './reviewed';

let office: Office;
let owner: DataSource;
beforeAll(async () => {
  office = await Office.open();
  owner = await new DataSource(dataSourceOptions(office.test.database.migratorUrl)).initialize();
});
afterAll(async () => {
  await owner.destroy();
  await office.close();
});

describe('operations by the owner of the tables', () => {
  it('makes the same copies anew from the log after they were dropped', async () => {
    const setting = await reviewed(office);
    await work(setting);
    const before = await queueItem(setting.desk, setting.visit);
    await dropProjections(owner);
    expect(await office.rows('select from visit_projections')).toEqual([]);
    expect(await queueItem(setting.desk, setting.visit)).toEqual(before);
  });

  it('sends every phone back to the beginning of the feed after a restore', async () => {
    const { technician } = await crewOfOne(office);
    const desk = await office.desk(technician);
    const { body: before } = await desk.get<PullResponse>('/sync/pull');
    await renewEpoch(owner);
    const { body: after } = await desk.get<PullResponse>(
      `/sync/pull?epoch=${before.epoch}&cursor=${before.cursor}`,
    );
    expect(after.epoch).not.toBe(before.epoch);
    expect(after.items.map(({ kind }) => kind)).toEqual(['company', 'visit']);
  });
});

describe('two processes of the API', () => {
  it('take one device’s chain between them, each entry once, in order', async () => {
    const second = await Office.open({ DATABASE_URL: office.test.database.appUrl });
    try {
      const { phone, visit } = await crewOfOne(office);
      const twin = Object.assign(Object.create(phone) as typeof phone, {
        owner: { ...phone.owner, url: second.test.url },
      });
      for (let round = 0; round < 15; round += 1) {
        phone.note(visit);
        phone.note(visit);
        const answers = await Promise.all([phone.push(), twin.push(phone.entries.map(({ text }) => text))]);
        expect(answers.map(({ body }) => body.acknowledgedThrough)).toEqual([phone.head.seq, phone.head.seq]);
      }
      expect((await office.chainOf(phone)).map(({ text }) => text)).toEqual(
        phone.entries.map(({ text }) => text),
      );
    } finally {
      await second.close();
    }
  });
});
