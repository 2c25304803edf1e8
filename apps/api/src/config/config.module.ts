import { Global, Module } from '@nestjs/common';
import { readEnvironment } from './environment';

export const ENVIRONMENT = Symbol('environment');

/** Hands the checked environment to whoever asks for `ENVIRONMENT`. */
@Global()
@Module({
  providers: [{ provide: ENVIRONMENT, useFactory: () => readEnvironment() }],
  exports: [ENVIRONMENT],
})
export class EnvironmentModule {}
