import { Global, Module } from '@nestjs/common';
import { Signer } from './signer';

@Global()
@Module({ providers: [Signer], exports: [Signer] })
export class SigningModule {}
