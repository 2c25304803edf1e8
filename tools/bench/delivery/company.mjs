import { createHash, randomUUID } from 'node:crypto';

/** A company with one technician and empty visits, written straight into the tables. */
export async function makeCompany(admin, visitCount) {
  const [company, actor, customer, site, system] = Array.from({ length: 5 }, () => randomUUID());
  const settings = {
    units: 'us',
    metricPressure: 'kPa',
    language: 'en',
    timeZone: 'UTC',
    pressureCapPsi: null,
    forbidsWorkingAlone: false,
  };
  const unknown = {
    id: system,
    name: 'Bench',
    removalMethod: 'blow-out',
    pointOfConnection: { kind: 'unknown', place: '' },
    waterShutoff: { place: '', kind: 'unknown' },
    backflow: { kind: 'unknown', place: '', sizeIn: null, ratedPsi: null, valves: [] },
    airConnection: { kind: 'unknown', place: '', downstreamOfBackflow: null },
    mainLine: [],
    sensitiveParts: [],
    controller: { place: '', zoneCount: null },
    drains: [],
    pump: null,
    zones: [],
  };
  const insert = (sql, values) => admin.query(sql, values);
  await insert('insert into companies (id, name, settings) values ($1, $2, $3)', [
    company,
    'Bench',
    settings,
  ]);
  await insert(
    `insert into users (company_id, id, email, name, role, language, password_hash) values ($1, $2, $3, 'Bench', 'technician', 'en', '')`,
    [company, actor, `${actor}@example.test`],
  );
  await insert(`insert into customers (company_id, id, name) values ($1, $2, 'Bench')`, [company, customer]);
  await insert(
    `insert into sites (company_id, id, customer_id, name, address, town) values ($1, $2, $3, 'Bench', '', '')`,
    [company, site, customer],
  );
  await insert('insert into systems (company_id, id, site_id, description) values ($1, $2, $3, $4)', [
    company,
    system,
    site,
    unknown,
  ]);
  const { rows } = await insert(
    `insert into visits (company_id, id, site_id, system_id, date, sequence, purpose)
     select $1, gen_random_uuid(), $2, $3, current_date, 1, 'winterize' from generate_series(1, $4) returning id`,
    [company, site, system, visitCount],
  );
  return { company, actor, visits: rows.map(({ id }) => id) };
}

export async function enrol(admin, { company, actor }, phones) {
  for (const { device, secret } of phones) {
    await admin.query(
      `insert into devices (company_id, id, user_id, name, platform, secret_hash, enrolled_at) values ($1, $2, $3, 'Bench', '', $4, now())`,
      [company, device, actor, createHash('sha256').update(secret).digest()],
    );
  }
}
