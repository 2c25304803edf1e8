import { Module, RequestMethod } from '@nestjs/common';
import { APP_FILTER } from '@nestjs/core';
import { LoggerModule } from 'nestjs-pino';
import { AuthModule } from './auth/auth.module';
import { ProblemFilter } from './common/problem.filter';
import { RequestLimitModule } from './common/request-limit.module';
import { CompaniesModule } from './companies/companies.module';
import { ENVIRONMENT, EnvironmentModule } from './config/config.module';
import type { Environment } from './config/environment';
import { DatabaseModule } from './database/database.module';
import { HealthModule } from './health/health.module';
import { PhotosModule } from './photos/photos.module';
import { ProjectionModule } from './projection/projection.module';
import { ReviewModule } from './review/review.module';
import { SigningModule } from './signing/signing.module';
import { SitesModule } from './sites/sites.module';
import { SyncModule } from './sync/sync.module';
import { UsersModule } from './users/users.module';
import { VisitsModule } from './visits/visits.module';

@Module({
  imports: [
    EnvironmentModule,
    LoggerModule.forRootAsync({
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => ({
        forRoutes: [{ path: '{*path}', method: RequestMethod.ALL }],
        pinoHttp: {
          level: environment.LOG_LEVEL,
          redact: ['req.headers.authorization', 'req.headers.cookie', 'res.headers["set-cookie"]'],
          autoLogging: environment.LOG_LEVEL === 'debug' || environment.LOG_LEVEL === 'trace',
        },
      }),
    }),
    DatabaseModule,
    SigningModule,
    RequestLimitModule,
    AuthModule,
    CompaniesModule,
    UsersModule,
    SitesModule,
    VisitsModule,
    SyncModule,
    PhotosModule,
    ProjectionModule,
    ReviewModule,
    HealthModule,
  ],
  providers: [{ provide: APP_FILTER, useClass: ProblemFilter }],
})
export class AppModule {}
