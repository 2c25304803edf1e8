import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import { securityHeaders } from './common/security-headers';
import { ENVIRONMENT } from './config/config.module';
import type { Environment } from './config/environment';
import { webFiles } from './static/web-files';

/** Largest JSON body: a push of 256 KB of entries, escaped. */
const bodyLimit = '1mb';

/** Everything around the modules that tests and the real start share. */
export function configureApp(app: NestExpressApplication): NestExpressApplication {
  const environment = app.get<Environment>(ENVIRONMENT);
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', 'loopback');
  app.setGlobalPrefix('api');
  app.use(...securityHeaders());
  app.use(compression());
  if (environment.WEB_DIST_DIR) app.use(webFiles(environment.WEB_DIST_DIR));
  app.use(cookieParser());
  app.useBodyParser('json', { limit: bodyLimit, inflate: true });
  app.enableShutdownHooks();
  return app;
}
