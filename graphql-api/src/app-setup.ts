import type { NestExpressApplication } from '@nestjs/platform-express';
import { ENV, type Env } from './config/env.js';
import { inputValidation } from './common/input-validation.js';
import { requestContext } from './tenancy/request-context.middleware.js';
import { pageNonce, securityHeaders } from './web-host/security-headers.js';
import { webFiles, webPage } from './web-host/web-pages.js';

const LARGEST_BODY = '1mb';

/** Everything between the socket and the resolvers; the tests boot the application through it too. */
export function setUpApp(app: NestExpressApplication): void {
  const env = app.get<Env>(ENV);
  app.disable('x-powered-by');
  app.set('trust proxy', 'loopback');
  app.use(pageNonce, securityHeaders(new URL(env.s3.endpoint).origin, env.production));
  app.useBodyParser('json', { limit: LARGEST_BODY });
  app.use(requestContext);
  app.useGlobalPipes(inputValidation());
  if (env.webDist) {
    app.use(webFiles(env.webDist), webPage(env.webDist));
  }
  app.enableShutdownHooks();
}
