import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { ENVIRONMENT } from './config/config.module';
import { EnvironmentFault, readEnvironment, type Environment } from './config/environment';
import { configureApp } from './configure-app';

async function start(): Promise<void> {
  readEnvironment();
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    bufferLogs: true,
    abortOnError: false,
    bodyParser: false,
  });
  app.useLogger(app.get(Logger));
  configureApp(app);
  const { HOST, PORT } = app.get<Environment>(ENVIRONMENT);
  await app.listen(PORT, HOST);
}

start().catch((error: unknown) => {
  console.error(error instanceof EnvironmentFault ? error.message : error);
  process.exit(1);
});
