import { hash } from '@node-rs/argon2';
import { roles, type CompanySettings, type Role } from '@rimeward/contracts';
import { randomUUID } from 'node:crypto';
import type { Client } from 'pg';
import { withClient } from './admin';
import type { TestDatabase } from './database';
import { testSystem } from './system';

export interface TestPerson {
  id: string;
  companyId: string;
  name: string;
  email: string;
  role: Role;
  password: string;
}

/** A company with one person of each role, a second technician, a crew and equipment. */
export interface TestCompany {
  id: string;
  name: string;
  crewId: string;
  people: Record<Role, TestPerson> & { secondTechnician: TestPerson };
}

export interface TestVisit {
  id: string;
  siteId: string;
  systemId: string;
}

export const testPassword = 'a quiet pond in the north';

/** Cheap on purpose, and made once: what a hash costs is the password service's own test. */
const passwordHash = hash(testPassword, { memoryCost: 1_024, timeCost: 1, parallelism: 1 });

export const testSettings: CompanySettings = {
  units: 'us',
  metricPressure: 'kPa',
  language: 'en',
  timeZone: 'America/Denver',
  pressureCapPsi: null,
  forbidsWorkingAlone: false,
};

export async function addCompany(database: TestDatabase, name: string): Promise<TestCompany> {
  return withClient(database.adminUrl, async (client) => {
    const company = { id: randomUUID(), name, crewId: randomUUID() };
    await insert(client, 'companies', { id: company.id, name, settings: JSON.stringify(testSettings) });
    await insert(client, 'crews', { company_id: company.id, id: company.crewId, name: 'Crew one' });
    const add = (role: Role, suffix = ''): Promise<TestPerson> => addPerson(client, company, role, suffix);
    const people = {} as TestCompany['people'];
    for (const role of roles) people[role] = await add(role);
    people.secondTechnician = await add('technician', '-2');
    return { ...company, people };
  });
}

/** A customer, a site, its system and one visit to it. */
export async function addVisit(
  database: TestDatabase,
  company: TestCompany,
  {
    assigned,
    date = '2026-10-12',
    sequence = 1,
  }: { assigned: TestPerson[]; date?: string; sequence?: number },
): Promise<TestVisit> {
  return withClient(database.adminUrl, async (client) => {
    const companyId = company.id;
    const [customerId, siteId, id] = [randomUUID(), randomUUID(), randomUUID()];
    const system = testSystem();
    await insert(client, 'customers', { company_id: companyId, id: customerId, name: 'Mallow Lane 3' });
    await insert(client, 'sites', {
      company_id: companyId,
      id: siteId,
      customer_id: customerId,
      name: `Mallow Lane of ${company.name}`,
      address: '3 Mallow Lane',
      town: 'Fernhollow',
      gate_code: `gate of ${company.name}`,
    });
    await insert(client, 'systems', {
      company_id: companyId,
      id: system.id,
      site_id: siteId,
      description: JSON.stringify(system),
    });
    await insert(client, 'visits', {
      company_id: companyId,
      id,
      site_id: siteId,
      system_id: system.id,
      date,
      sequence,
      purpose: 'winterize',
      note: `note of ${company.name}`,
      crew_id: company.crewId,
    });
    for (const person of assigned) {
      await insert(client, 'visit_assignments', { company_id: companyId, visit_id: id, user_id: person.id });
    }
    return { id, siteId, systemId: system.id };
  });
}

async function addPerson(
  client: Client,
  company: Pick<TestCompany, 'id' | 'name' | 'crewId'>,
  role: Role,
  suffix: string,
): Promise<TestPerson> {
  const email = `${role}${suffix}@${company.name.toLowerCase().replaceAll(/[^a-z]+/g, '-')}.example`;
  const person = {
    id: randomUUID(),
    companyId: company.id,
    name: `${company.name} ${role}${suffix}`,
    email,
    role,
  };
  await insert(client, 'users', {
    company_id: company.id,
    id: person.id,
    email,
    name: person.name,
    role,
    language: 'en',
    password_hash: await passwordHash,
    blow_out_signed_off: true,
    crew_id: role === 'technician' ? company.crewId : null,
  });
  return { ...person, password: testPassword };
}

async function insert(client: Client, table: string, row: Record<string, unknown>): Promise<void> {
  const columns = Object.keys(row);
  const places = columns.map((_, index) => `$${index + 1}`);
  await client.query(
    `insert into ${table} (${columns.join(', ')}) values (${places.join(', ')})`,
    Object.values(row),
  );
}
