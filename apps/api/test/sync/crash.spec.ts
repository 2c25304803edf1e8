import { Client } from 'pg';
import { crewOfOne, Office } from './office';
import type { TestPhone } from './test-phone';

let office: Office;
beforeAll(async () => {
  office = await Office.open();
});
afterAll(() => office.close());

const soon = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms));

/** Pushes while something holds the push up, ends its database connection there, lets go, and returns the answer. */
async function killed(
  phone: TestPhone,
  hold: string,
  parameters: unknown[],
  waiting: string,
): Promise<number> {
  const holder = new Client({ connectionString: office.test.database.adminUrl });
  await holder.connect();
  await holder.query('begin');
  await holder.query(hold, parameters);
  const answer = phone.push();
  for (;;) {
    const ended = await office.rows(
      `select pg_terminate_backend(pid) from pg_stat_activity
       where datname = current_database() and usename = 'rimeward_app' and wait_event_type = 'Lock' and query ilike $1`,
      [waiting],
    );
    if (ended.length > 0) break;
    await soon(10);
  }
  await holder.query('rollback');
  await holder.end();
  return (await answer).status;
}

describe('a database connection that ends in the middle of a push', () => {
  it('before the rows are written: nothing is acknowledged, the next push stores all once', async () => {
    const { phone, visit, company } = await crewOfOne(office);
    phone.note(visit);
    await phone.push();
    phone.note(visit);
    const hold = 'select from company_positions where company_id = $1 for update';
    expect(await killed(phone, hold, [company.id], '%log_entries%')).toBeGreaterThanOrEqual(500);
    expect(await office.chainOf(phone)).toHaveLength(1);
    expect((await phone.push()).body.acknowledgedThrough).toBe(2);
    expect((await office.chainOf(phone)).map(({ text }) => text)).toEqual(
      phone.entries.map(({ text }) => text),
    );
  });

  it('while it commits: either way the next push ends with all stored once', async () => {
    // A deferred check runs within COMMIT; it waits for a lock that somebody else holds.
    await office.rows(`
      create function wait_in_commit() returns trigger language plpgsql as $$
        begin perform pg_advisory_xact_lock(4711); return null; end $$;
      create constraint trigger slow_commit after insert on log_entries deferrable initially deferred
        for each row execute function wait_in_commit()`);
    const { phone, visit } = await crewOfOne(office);
    phone.note(visit);
    phone.note(visit);
    const status = await killed(phone, 'select pg_advisory_xact_lock(4711)', [], 'commit%');
    expect(status).toBeGreaterThanOrEqual(500);
    await office.rows('drop trigger slow_commit on log_entries');
    expect((await phone.push()).body.acknowledgedThrough).toBe(2);
    expect((await office.chainOf(phone)).map(({ seq }) => seq)).toEqual([1, 2]);
  });

  it('leaves no position behind: the next company row follows the last one', async () => {
    const { phone, visit, company } = await crewOfOne(office);
    phone.note(visit);
    await phone.push();
    phone.note(visit);
    const hold = 'select from company_positions where company_id = $1 for update';
    await killed(phone, hold, [company.id], '%log_entries%');
    await phone.push();
    const positions = await office.rows<{ position: string }>(
      'select position from log_entries where company_id = $1 order by position',
      [company.id],
    );
    expect(positions.map(({ position }) => Number(position))).toEqual([1, 2]);
  });

  it('makes the upsert write nothing: the answer is an error, the phone keeps its entries', async () => {
    const { phone, visit } = await crewOfOne(office);
    await office.rows(`
      create function write_nothing() returns trigger language plpgsql as $$ begin return null; end $$;
      create trigger nothing_written before insert on log_entries for each row execute function write_nothing()`);
    phone.note(visit);
    try {
      expect((await phone.push()).status).toBe(500);
    } finally {
      await office.rows('drop trigger nothing_written on log_entries');
    }
    expect((await phone.push()).body.results).toEqual([{ seq: 1, result: 'stored' }]);
  });
});
