import { Global, Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { DevicesModule } from '../devices/devices.module';
import { AccessStrategy } from './access.strategy';
import { SignInAttempts } from './attempts';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { SessionCookies } from './cookies';
import { DeviceGuard } from './device.guard';
import { OwnRequestsGuard } from './own-requests.guard';
import { PasswordService } from './password.service';
import { SessionGuard } from './session.guard';
import { SessionsService } from './sessions.service';

/** Who asks, and whether he may. */
@Global()
@Module({
  imports: [
    PassportModule,
    DevicesModule,
    JwtModule.registerAsync({
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => ({ secret: environment.SESSION_JWT_SECRET }),
    }),
  ],
  controllers: [AuthController],
  providers: [
    AccessStrategy,
    AuthService,
    DeviceGuard,
    PasswordService,
    SessionCookies,
    SessionsService,
    SignInAttempts,
    { provide: APP_GUARD, useClass: OwnRequestsGuard },
    { provide: APP_GUARD, useClass: SessionGuard },
  ],
  exports: [DeviceGuard, PasswordService, DevicesModule],
})
export class AuthModule {}
