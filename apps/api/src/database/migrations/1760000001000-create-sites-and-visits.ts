import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

const tables = [
  'customers',
  'sites',
  'systems',
  'compressors',
  'hoses',
  'visits',
  'visit_assignments',
  'visit_summaries',
];

/** What the company knows and plans: customers, sites, systems, equipment, visits and who goes. */
export class CreateSitesAndVisits1760000001000 implements MigrationInterface {
  name = 'CreateSitesAndVisits1760000001000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table customers (
        company_id uuid not null references companies (id),
        id uuid not null,
        name text not null,
        phone text,
        email text,
        primary key (company_id, id)
      )`);
    await queryRunner.query(`
      create table sites (
        company_id uuid not null,
        id uuid not null,
        customer_id uuid not null,
        name text not null,
        address text not null,
        town text not null,
        latitude double precision,
        longitude double precision,
        elevation_ft double precision,
        access_notes text,
        gate_code text,
        primary key (company_id, id),
        foreign key (company_id, customer_id) references customers (company_id, id)
      )`);
    await queryRunner.query(`
      create table systems (
        company_id uuid not null,
        id uuid not null,
        site_id uuid not null,
        description jsonb not null,
        primary key (company_id, id),
        foreign key (company_id, site_id) references sites (company_id, id)
      )`);
    await queryRunner.query('create index systems_by_site on systems (company_id, site_id)');
    await queryRunner.query(`
      create table compressors (
        company_id uuid not null references companies (id),
        id uuid not null,
        name text not null,
        free_air_cfm double precision not null,
        max_pressure_psi double precision not null,
        stages integer not null,
        aftercooler boolean not null,
        primary key (company_id, id)
      )`);
    await queryRunner.query(`
      create table hoses (
        company_id uuid not null references companies (id),
        id uuid not null,
        name text not null,
        inside_diameter_in double precision not null,
        length_ft double precision not null,
        couplings integer not null,
        primary key (company_id, id)
      )`);
    await queryRunner.query(`
      create table visits (
        company_id uuid not null,
        id uuid not null,
        site_id uuid not null,
        system_id uuid not null,
        date date not null,
        sequence integer not null,
        purpose text not null,
        note text,
        crew_id uuid,
        primary key (company_id, id),
        foreign key (company_id, site_id) references sites (company_id, id),
        foreign key (company_id, system_id) references systems (company_id, id),
        foreign key (company_id, crew_id) references crews (company_id, id)
      )`);
    await queryRunner.query('create index visits_by_date on visits (company_id, date)');
    await queryRunner.query(`
      create table visit_assignments (
        company_id uuid not null,
        visit_id uuid not null,
        user_id uuid not null,
        primary key (company_id, visit_id, user_id),
        foreign key (company_id, visit_id) references visits (company_id, id),
        foreign key (company_id, user_id) references users (company_id, id)
      )`);
    await queryRunner.query(
      'create index visit_assignments_by_user on visit_assignments (company_id, user_id)',
    );
    await queryRunner.query(`
      create table visit_summaries (
        company_id uuid not null,
        id uuid not null,
        system_id uuid not null,
        date date not null,
        technicians jsonb not null,
        notes jsonb not null,
        parts_taken_out jsonb not null,
        primary key (company_id, id),
        foreign key (company_id, system_id) references systems (company_id, id)
      )`);
    await queryRunner.query(
      'create index visit_summaries_by_system on visit_summaries (company_id, system_id, date)',
    );
    for (const table of tables) await protectTable(queryRunner, table);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of [...tables].reverse()) await queryRunner.query(`drop table ${table}`);
  }
}
