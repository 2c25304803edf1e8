import type { EntityManager } from 'typeorm';
import type { PasswordService } from '../auth/password.service';
import { Company } from '../companies/entities/company.entity';
import { Customer } from '../customers/entities/customer.entity';
import { Compressor } from '../equipment/entities/compressor.entity';
import { Hose } from '../equipment/entities/hose.entity';
import { Site } from '../sites/entities/site.entity';
import { System } from '../sites/entities/system.entity';
import { Crew } from '../users/entities/crew.entity';
import { User } from '../users/entities/user.entity';
import { VisitAssignment } from '../visits/entities/visit-assignment.entity';
import { VisitSummary } from '../visits/entities/visit-summary.entity';
import { Visit } from '../visits/entities/visit.entity';
import { lastYearOf } from './last-year';
import type { Day } from './local-time';
import type { PlannedStop } from './plan';
import { demoCompany, town } from './world/company';
import { demoCompressors, demoHoses } from './world/equipment';
import { demoCrews, demoPeople, peopleOfCrew, type DemoPerson } from './world/people';
import type { DemoSite } from './world/sites';

const companyId = demoCompany.id;

/** Hashes take a while: they are made before the transaction opens. */
export async function hashPasswords(passwords: PasswordService): Promise<Map<string, string>> {
  const pairs = demoPeople.map(async ({ id, password }) => [id, await passwords.hash(password)] as const);
  return new Map(await Promise.all(pairs));
}

/** The company, its people and its equipment. */
export async function writeCompany(
  manager: EntityManager,
  hashes: ReadonlyMap<string, string>,
): Promise<void> {
  await manager.insert(Company, demoCompany);
  await manager.insert(
    Crew,
    demoCrews.map((crew) => ({ companyId, ...crew })),
  );
  await manager.insert(
    User,
    demoPeople.map((person) => userOf(person, hashes)),
  );
  await manager.insert(
    Compressor,
    demoCompressors.map((one) => ({ companyId, ...one })),
  );
  await manager.insert(
    Hose,
    demoHoses.map((one) => ({ companyId, ...one })),
  );
}

/** Customers, sites, systems, and what is known from last year. */
export async function writeSites(
  manager: EntityManager,
  sites: readonly DemoSite[],
  today: Day,
): Promise<void> {
  const customers = new Map(sites.map(({ customer }) => [customer.id, { companyId, ...customer }]));
  await manager.insert(Customer, [...customers.values()]);
  await manager.insert(Site, sites.map(siteRow));
  await manager.insert(
    System,
    sites.map(({ id, system }) => ({ companyId, id: system.id, siteId: id, description: system })),
  );
  const summaries = sites.flatMap((site) => lastYearOf(site, today) ?? []);
  await manager.insert(
    VisitSummary,
    summaries.map((summary) => ({ companyId, ...summary })),
  );
}

/** Stops with the people of their crew. Returns the ids of the visits. */
export async function writeStops(manager: EntityManager, stops: readonly PlannedStop[]): Promise<string[]> {
  const visits = stops.map(({ id, site, date, sequence, crew, note }) => ({
    companyId,
    id,
    siteId: site.id,
    systemId: site.system.id,
    date,
    sequence,
    purpose: 'winterize' as const,
    note,
    crewId: demoCrews[crew]?.id ?? null,
  }));
  await manager.insert(Visit, visits);
  const assignments = stops.flatMap(({ id, crew }) =>
    peopleOfCrew(crew).map((person) => ({ companyId, visitId: id, userId: person.id })),
  );
  await manager.insert(VisitAssignment, assignments);
  return visits.map(({ id }) => id);
}

function userOf(person: DemoPerson, hashes: ReadonlyMap<string, string>): Omit<User, 'disabledAt'> {
  const { id, name, email, role, language, blowOutSignedOff, crew } = person;
  const passwordHash = hashes.get(id);
  if (passwordHash === undefined) throw new Error(`no password hash for ${name}`);
  const crewId = crew === null ? null : (demoCrews[crew]?.id ?? null);
  return { companyId, id, name, email, role, language, blowOutSignedOff, crewId, passwordHash };
}

function siteRow(site: DemoSite): Site {
  const { id, customer, name, address, latitude, longitude, elevationFt, accessNotes, gateCode } = site;
  return {
    companyId,
    id,
    customerId: customer.id,
    name,
    address,
    town: town.name,
    latitude,
    longitude,
    elevationFt,
    accessNotes,
    gateCode,
  };
}
