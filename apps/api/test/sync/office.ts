import { randomUUID } from 'node:crypto';
import type { Role } from '@rimeward/contracts';
import { Client } from 'pg';
import { createTestApp, type TestApp } from '../support/test-app';
import { Desk } from './desk';
import { enrolledPhone, insertCompany, insertPerson, insertVisit, type TestCompany } from './seed';
import type { TestPhone } from './test-phone';

/** The running office, with a superuser's look at what is really stored. */
export class Office {
  private constructor(
    readonly test: TestApp,
    readonly admin: Client,
  ) {}

  static async open(environment: Record<string, string> = {}): Promise<Office> {
    const test = await createTestApp(environment);
    const admin = new Client({ connectionString: test.database.adminUrl });
    await admin.connect();
    return new Office(test, admin);
  }

  async close(): Promise<void> {
    await this.admin.end();
    await this.test.close();
  }

  company(): Promise<TestCompany> {
    return insertCompany(this.admin);
  }

  person(company: TestCompany, role: Role): Promise<string> {
    return insertPerson(this.admin, company.id, role);
  }

  /** A visit on a day, by default today, that these people are assigned to. */
  visit(company: TestCompany, assigned: string[], inDays = 0): Promise<string> {
    return insertVisit(this.admin, company, assigned, inDays);
  }

  phone(company: TestCompany, userId: string): Promise<TestPhone> {
    return enrolledPhone(this.admin, this.test.url, company.id, userId);
  }

  desk(userId: string): Promise<Desk> {
    return Desk.signIn(this.test.url, `${userId}@example.test`);
  }

  async rows<T>(sql: string, parameters: unknown[] = []): Promise<T[]> {
    return (await this.admin.query(sql, parameters)).rows as T[];
  }

  /** What the office holds of a device: dense numbers, equal bytes, a chain whose links hold. */
  async chainOf(
    phone: TestPhone,
  ): Promise<{ seq: number; text: string; hash: string; held: string | null }[]> {
    return this.rows(
      `select seq, convert_from(bytes, 'UTF8') as text, encode(hash, 'hex') as hash, held_reason as held
       from log_entries where device_id = $1 order by seq`,
      [phone.owner.device],
    );
  }
}

/** A technician with a phone and a visit, in a company of his own: what most tests begin with. */
export async function crewOfOne(office: Office): Promise<{
  company: TestCompany;
  technician: string;
  phone: TestPhone;
  visit: string;
}> {
  const company = await office.company();
  const technician = await office.person(company, 'technician');
  const phone = await office.phone(company, technician);
  return { company, technician, phone, visit: await office.visit(company, [technician]) };
}

export const anyId = (): string => randomUUID();
