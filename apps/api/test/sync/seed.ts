import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { CompanySettings, Role } from '@rimeward/contracts';
import { handValvesOf, type System } from '@rimeward/field-log';
import { hash } from '@node-rs/argon2';
import type { Client } from 'pg';
import { TestPhone } from './test-phone';

export const password = 'blow it out before the frost';

export interface TestCompany {
  id: string;
  siteId: string;
  systemId: string;
  zones: string[];
}

const settings: CompanySettings = {
  units: 'us',
  metricPressure: 'kPa',
  language: 'en',
  timeZone: 'America/Denver',
  pressureCapPsi: null,
  forbidsWorkingAlone: false,
};

function twoZones(zones: string[]): System {
  return {
    id: randomUUID(),
    name: 'Front',
    removalMethod: 'blow-out',
    pointOfConnection: { kind: 'building', place: 'basement' },
    waterShutoff: { place: 'basement', kind: 'ball' },
    backflow: { kind: 'PVB', place: 'north wall', sizeIn: 1, ratedPsi: 150, valves: handValvesOf('PVB') },
    airConnection: { kind: 'blow-out-fitting', place: 'north wall', downstreamOfBackflow: true },
    mainLine: [],
    sensitiveParts: [],
    controller: { place: 'garage', zoneCount: 2 },
    drains: [],
    pump: null,
    zones: zones.map((id, index) => ({
      id,
      number: index + 1,
      name: `Zone ${index + 1}`,
      headKind: 'spray',
      headCount: 6,
      flowGpm: 9,
      designPressurePsi: 30,
      elevationFt: 0,
      distanceFt: 80,
      laterals: [],
      lowestRatedPart: null,
    })),
  };
}

export async function insertCompany(admin: Client): Promise<TestCompany> {
  const company = {
    id: randomUUID(),
    siteId: randomUUID(),
    systemId: randomUUID(),
    zones: [randomUUID(), randomUUID()],
  };
  const customerId = randomUUID();
  await admin.query('insert into companies (id, name, settings) values ($1, $2, $3)', [
    company.id,
    'Test company',
    JSON.stringify(settings),
  ]);
  await admin.query('insert into customers (company_id, id, name) values ($1, $2, $3)', [
    company.id,
    customerId,
    'A customer',
  ]);
  await admin.query(
    `insert into sites (company_id, id, customer_id, name, address, town, gate_code) values ($1, $2, $3, $4, $5, $6, $7)`,
    [company.id, company.siteId, customerId, 'Cottonwood Lane 12', 'Cottonwood Lane 12', 'Testville', '4711'],
  );
  await admin.query('insert into systems (company_id, id, site_id, description) values ($1, $2, $3, $4)', [
    company.id,
    company.systemId,
    company.siteId,
    JSON.stringify({ ...twoZones(company.zones), id: company.systemId }),
  ]);
  return company;
}

// The cheapest parameters that there are: these tests are not about passwords.
const passwordHash = hash(password, { memoryCost: 8, timeCost: 1, parallelism: 1 });

export async function insertPerson(admin: Client, companyId: string, role: Role): Promise<string> {
  const id = randomUUID();
  await admin.query(
    `insert into users (company_id, id, email, name, role, language, password_hash) values ($1, $2, $3, $4, $5, 'en', $6)`,
    [companyId, id, `${id}@example.test`, `A ${role}`, role, await passwordHash],
  );
  return id;
}

export async function insertVisit(
  admin: Client,
  company: TestCompany,
  assigned: string[],
  inDays: number,
): Promise<string> {
  const id = randomUUID();
  await admin.query(
    `insert into visits (company_id, id, site_id, system_id, date, sequence, purpose)
     values ($1, $2, $3, $4, (now() at time zone $5)::date + $6::int, 1, 'winterize')`,
    [company.id, id, company.siteId, company.systemId, settings.timeZone, inDays],
  );
  for (const userId of assigned) {
    await admin.query('insert into visit_assignments (company_id, visit_id, user_id) values ($1, $2, $3)', [
      company.id,
      id,
      userId,
    ]);
  }
  return id;
}

export async function enrolledPhone(
  admin: Client,
  url: string,
  companyId: string,
  userId: string,
): Promise<TestPhone> {
  const device = randomUUID();
  const ingestSecret = randomBytes(32).toString('base64url');
  await admin.query(
    `insert into devices (company_id, id, user_id, name, platform, secret_hash, enrolled_at) values ($1, $2, $3, $4, $5, $6, now())`,
    [
      companyId,
      device,
      userId,
      'Phone in a test',
      'test',
      createHash('sha256').update(ingestSecret).digest(),
    ],
  );
  return new TestPhone({ url, company: companyId, device, ingestSecret, user: userId });
}
