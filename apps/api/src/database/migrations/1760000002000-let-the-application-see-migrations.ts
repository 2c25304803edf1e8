import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The application tells by it whether the database is as new as itself. It holds names of migrations and nothing else. */
export class LetTheApplicationSeeMigrations1760000002000 implements MigrationInterface {
  name = 'LetTheApplicationSeeMigrations1760000002000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('grant select on migrations to rimeward_app');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('revoke select on migrations from rimeward_app');
  }
}
