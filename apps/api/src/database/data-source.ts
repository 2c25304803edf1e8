import { join } from 'node:path';
import type { PostgresDataSourceOptions } from 'typeorm/driver/postgres/PostgresDataSourceOptions.js';
import { Company } from '../companies/entities/company.entity';
import { Customer } from '../customers/entities/customer.entity';
import { Device } from '../devices/entities/device.entity';
import { Compressor } from '../equipment/entities/compressor.entity';
import { Hose } from '../equipment/entities/hose.entity';
import { Site } from '../sites/entities/site.entity';
import { System } from '../sites/entities/system.entity';
import { Session } from '../auth/entities/session.entity';
import { Crew } from '../users/entities/crew.entity';
import { User } from '../users/entities/user.entity';
import { VisitAssignment } from '../visits/entities/visit-assignment.entity';
import { VisitSummary } from '../visits/entities/visit-summary.entity';
import { Visit } from '../visits/entities/visit.entity';

export const entities = [
  Company,
  Crew,
  User,
  Session,
  Device,
  Customer,
  Site,
  System,
  Compressor,
  Hose,
  Visit,
  VisitAssignment,
  VisitSummary,
];

/** One description of the database for the API, the migrations and the tests. The schema comes from migrations alone. */
export function dataSourceOptions(url: string): PostgresDataSourceOptions {
  return {
    type: 'postgres',
    url,
    entities,
    migrations: [join(__dirname, 'migrations', '*.{js,ts}')],
    migrationsTransactionMode: 'each',
    synchronize: false,
    logging: false,
  };
}
