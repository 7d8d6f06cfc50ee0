import type { NestExpressApplication } from '@nestjs/platform-express';
import { Logger } from 'nestjs-pino';
import { DataSource } from 'typeorm';

import { sessions } from './auth/session.middleware.js';
import { Metrics } from './common/metrics/metrics.js';
import { securityHeaders } from './common/web/security-headers.js';
import { webApp } from './common/web/web-app.js';
import { CONFIG, type Config } from './config/config.js';

/** Everything between the socket and the routes, in the order in which a request meets it. */
export function configureApp(app: NestExpressApplication): void {
  const config = app.get<Config>(CONFIG);
  app.useLogger(app.get(Logger));
  app.disable('x-powered-by');
  app.set('trust proxy', config.TRUST_PROXY);
  // Entity tags are versions of ours (If-Match), not hashes of bodies.
  app.set('etag', false);
  app.set('query parser', 'simple');
  app.setGlobalPrefix('api', { exclude: ['health/{*path}', 'metrics'] });
  app.use(app.get(Metrics).observe, ...securityHeaders(config));
  if (config.WEB_DIST) app.use(...webApp(config.WEB_DIST));
  app.use('/api', ...sessions(config, app.get(DataSource)));
  app.useBodyParser('json', { limit: '200kb' });
  app.enableShutdownHooks();
}
