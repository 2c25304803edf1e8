import { Client } from 'pg';
import { FeedService } from '../../src/sync/feed/feed.service';
import { CompanyContext } from '../../src/database/company-context';
import { Office } from './office';
import type { TestCompany } from './seed';
import type { TestPhone } from './test-phone';

let office: Office;
beforeAll(async () => {
  office = await Office.open({ DATABASE_POOL: '20' });
});
afterAll(() => office.close());

const writers = 16;
const rowsEach = 12;
const all = writers * rowsEach;

const soon = (ms: number): Promise<void> => new Promise((resolve) => setTimeout(resolve, ms));

/**
 * A reader that asks for everything beyond his cursor as fast as he can while 16 writers commit slowly. Returns the numbers
 * that he has seen, in the order in which he saw them.
 */
async function readWhileWriting(
  write: (writer: number, row: number) => Promise<void>,
  read: (cursor: number) => Promise<number[]>,
): Promise<number[]> {
  let writing = true;
  const done = Promise.all(
    Array.from({ length: writers }, async (_, writer) => {
      for (let row = 0; row < rowsEach; row += 1) await write(writer, row);
    }),
  ).finally(() => (writing = false));
  const seen: number[] = [];
  const readOnce = async (): Promise<void> => {
    seen.push(...(await read(seen.at(-1) ?? 0)));
  };
  while (writing) await readOnce();
  await done;
  await readOnce();
  return seen;
}

describe('a fast reader of the feed beside 16 slow writers', () => {
  let reader: Client;
  beforeAll(async () => {
    reader = new Client({ connectionString: office.test.database.adminUrl });
    await reader.connect();
  });
  afterAll(() => reader.end());

  const beyond = async (sql: string, company: TestCompany, cursor: number): Promise<number[]> => {
    const { rows } = await reader.query<{ at: string }>(sql, [company.id, cursor]);
    return rows.map(({ at }) => Number(at));
  };

  it('sees every position once, ascending, without a gap', async () => {
    const company = await office.company();
    const context = office.test.app.get(CompanyContext);
    const feed = office.test.app.get(FeedService, { strict: false });
    const seen = await readWhileWriting(
      async (writer, row) => {
        await context.run(company.id, async (manager) => {
          await feed.touch(manager, { kind: 'company' });
          // The commit is slow: others take their numbers meanwhile, if they can.
          await soon((writer * 7 + row * 3) % 5);
        });
      },
      (cursor) =>
        beyond(
          'select position as at from feed where company_id = $1 and position > $2 order by 1',
          company,
          cursor,
        ),
    );
    expect(seen).toEqual(Array.from({ length: all }, (_, n) => n + 1));
  });

  it('would lose rows with numbers from a sequence: the test can fail', async () => {
    const company = await office.company();
    await office.rows('create table naive_feed (company_id uuid, id bigint generated always as identity)');
    const clients = await Promise.all(
      Array.from({ length: writers }, async () => {
        const client = new Client({ connectionString: office.test.database.adminUrl });
        await client.connect();
        return client;
      }),
    );
    try {
      const seen = await readWhileWriting(
        async (writer, row) => {
          const client = clients[writer]!;
          await client.query('begin');
          await client.query('insert into naive_feed (company_id) values ($1)', [company.id]);
          await soon((writer * 7 + row * 3) % 5);
          await client.query('commit');
        },
        (cursor) =>
          beyond(
            'select id as at from naive_feed where company_id = $1 and id > $2 order by 1',
            company,
            cursor,
          ),
      );
      const [stored] = await office.rows<{ count: number }>('select count(*)::int as count from naive_feed');
      expect(stored?.count).toBe(all);
      expect(seen.length).toBeLessThan(all);
    } finally {
      await Promise.all(clients.map((client) => client.end()));
    }
  });

  it('sees the pushes of 16 phones whole, in each phone’s order', async () => {
    const company = await office.company();
    const technician = await office.person(company, 'technician');
    const visit = await office.visit(company, [technician]);
    const phones: TestPhone[] = [];
    while (phones.length < writers) phones.push(await office.phone(company, technician));
    const seen = await readWhileWriting(
      async (writer) => {
        const phone = phones[writer]!;
        const answer = await phone.push([phone.note(visit).text, phone.note(visit).text]);
        expect(answer.status).toBe(200);
      },
      (cursor) =>
        beyond(
          'select position as at from log_entries where company_id = $1 and position > $2 order by 1',
          company,
          cursor,
        ),
    );
    expect(seen).toEqual(Array.from({ length: all * 2 }, (_, n) => n + 1));
    const stored = await office.rows<{ dense: boolean }>(
      `select array_agg(seq order by position) = array_agg(seq order by seq) as dense
       from log_entries where company_id = $1 group by device_id`,
      [company.id],
    );
    expect(stored).toEqual(Array.from({ length: writers }, () => ({ dense: true })));
  });
});
