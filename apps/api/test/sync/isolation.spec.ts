import { Client } from 'pg';
import { crewOfOne, Office } from './office';

const tables = [
  'company_positions',
  'device_chains',
  'log_entries',
  'stray_entries',
  'held_settlements',
  'feed',
  'photos',
  'photo_references',
  'visit_projections',
  'stale_projections',
  'visit_reviews',
];
const appendOnly = [
  'log_entries',
  'stray_entries',
  'held_settlements',
  'feed',
  'photo_references',
  'visit_reviews',
];

let office: Office;
let app: Client;
beforeAll(async () => {
  office = await Office.open();
  app = new Client({ connectionString: office.test.database.appUrl });
  await app.connect();
});
afterAll(async () => {
  await app.end();
  await office.close();
});

/** Runs one statement as the application's role for a company, or for none. */
async function asApp(company: string | null, sql: string, parameters: unknown[] = []): Promise<unknown[]> {
  await app.query('begin');
  try {
    if (company !== null) await app.query("select set_config('app.company', $1, true)", [company]);
    return (await app.query(sql, parameters)).rows as unknown[];
  } finally {
    await app.query('rollback');
  }
}

describe('what the application’s role can do in the database', () => {
  it('sees nothing of the log without a company, and nothing of another company', async () => {
    const mine = await crewOfOne(office);
    const other = await crewOfOne(office);
    mine.phone.write(mine.visit, 'note-written', { text: 'ours' });
    await mine.phone.push();
    expect(await asApp(mine.company.id, 'select 1 from log_entries')).toHaveLength(1);
    for (const table of tables) {
      expect([table, await asApp(null, `select 1 from ${table}`)]).toEqual([table, []]);
      expect([
        table,
        await asApp(other.company.id, `select 1 from ${table} where company_id = $1`, [mine.company.id]),
      ]).toEqual([table, []]);
    }
  });

  it('cannot write a row for another company', async () => {
    const mine = await crewOfOne(office);
    const other = await crewOfOne(office);
    await expect(
      asApp(mine.company.id, 'insert into feed (company_id, position, kind, at) values ($1, 1, $2, now())', [
        other.company.id,
        'company',
      ]),
    ).rejects.toThrow(/row-level security/);
  });

  it.each(appendOnly)('can neither change nor remove a row of %s', async (table) => {
    const { company } = await crewOfOne(office);
    await expect(asApp(company.id, `update ${table} set company_id = company_id`)).rejects.toThrow(
      /permission denied/,
    );
    await expect(asApp(company.id, `delete from ${table}`)).rejects.toThrow(/permission denied/);
    await expect(asApp(company.id, `truncate ${table}`)).rejects.toThrow(/permission denied/);
  });

  it('cannot change the epoch of the feed', async () => {
    const { company } = await crewOfOne(office);
    expect(await asApp(company.id, 'select epoch from feed_epoch')).toHaveLength(1);
    await expect(asApp(company.id, 'update feed_epoch set epoch = gen_random_uuid()')).rejects.toThrow(
      /permission denied/,
    );
  });
});
