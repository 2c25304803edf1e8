import type { MigrationInterface, QueryRunner } from 'typeorm';
import { protectTable } from '../protect-table';

/** Photographs by the SHA-256 of their bytes, one a company, and which entries name them. */
export class CreatePhotos1760000102000 implements MigrationInterface {
  name = 'CreatePhotos1760000102000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
      create table photos (
        company_id uuid not null references companies (id),
        sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$'),
        bytes integer not null check (bytes > 0),
        type text not null,
        state text not null check (state in ('partial', 'complete', 'refused')),
        refused_because text,
        has_preview boolean not null default false,
        exif jsonb,
        announced_at timestamptz not null default now(),
        completed_at timestamptz,
        primary key (company_id, sha256)
      )`);
    await protectTable(queryRunner, 'photos');
    await queryRunner.query(`
      create table photo_references (
        company_id uuid not null,
        sha256 text not null,
        position bigint not null,
        device_id uuid not null,
        visit_id uuid,
        bytes bigint not null,
        type text not null,
        primary key (company_id, sha256, position)
      )`);
    await queryRunner.query(
      'create index photo_references_by_device on photo_references (company_id, device_id, sha256)',
    );
    await queryRunner.query(
      'create index photo_references_by_visit on photo_references (company_id, visit_id, sha256)',
    );
    await protectTable(queryRunner, 'photo_references', { appendOnly: true });
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('drop table photo_references');
    await queryRunner.query('drop table photos');
  }
}
