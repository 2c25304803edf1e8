import { Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { CompanyContext } from './company-context';
import { dataSourceOptions } from './data-source';
import { DatabaseReadiness } from './readiness';

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
      }),
    }),
  ],
  providers: [CompanyContext, DatabaseReadiness],
  exports: [CompanyContext, DatabaseReadiness],
})
export class DatabaseModule {}
