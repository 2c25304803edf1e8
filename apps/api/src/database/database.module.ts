import { Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { CompanyContext } from './company-context';
import { dataSourceOptions } from './data-source';
import { DatabaseReadiness } from './readiness';

/** Nothing waits for ever: a lost database or a lock that nobody lets go becomes an answer, ms. */
const waits = {
  connectionTimeoutMillis: 10_000,
  statement_timeout: 30_000,
  idle_in_transaction_session_timeout: 30_000,
};

@Global()
@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => ({
        ...dataSourceOptions(environment.DATABASE_URL),
        poolSize: environment.DATABASE_POOL,
        retryAttempts: 3,
        retryDelay: 500,
        extra: waits,
      }),
    }),
  ],
  providers: [CompanyContext, DatabaseReadiness],
  exports: [CompanyContext, DatabaseReadiness],
})
export class DatabaseModule {}
