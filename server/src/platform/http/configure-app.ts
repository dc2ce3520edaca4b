import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import type { Logger } from 'pino';
import { sessionMiddleware } from '../auth/session.middleware.js';
import { SessionStore } from '../auth/session.store.js';
import { UsersReader } from '../auth/users.reader.js';
import { Clock } from '../clock/clock.js';
import { Config } from '../config/config.js';
import { ConstraintSentences } from '../errors/constraints.js';
import { ProblemFilter } from '../errors/problem.filter.js';
import { appLogger, requestLog } from '../logging/logger.js';
import { createValidationPipe } from '../validation/validation-pipe.js';
import { refuseOddShapes, requireJsonOrFiles } from './body-shape.js';
import { clientPages, outsideApi } from './client-pages.js';
import { privateAnswers, securityHeaders } from './headers.js';

/** The largest body of a request without files. */
const largestJsonBody = '512kb';

/**
 * Everything between the socket and the controllers, in its order. Used by the server and by the specs alike, so that
 * what is tested is what runs. The application must have been created with `bodyParser: false, rawBody: true`.
 */
export function configureApp(app: NestExpressApplication): void {
  const config = app.get(Config);
  app.setGlobalPrefix('api');
  app.set('trust proxy', Array.isArray(config.trustProxy) ? [...config.trustProxy] : config.trustProxy);
  app.set('query parser', 'simple');
  app.set('etag', false);
  app.disable('x-powered-by');
  app.useGlobalFilters(new ProblemFilter(app.get(ConstraintSentences)));
  app.useGlobalPipes(createValidationPipe());
  app.use(requestLog(app.get<Logger>(appLogger)));
  app.use(...securityHeaders(config));
  app.use(compression());
  for (const handler of outsideApi(clientPages(config.clientFolder))) app.use(handler);
  app.use(privateAnswers(), requireJsonOrFiles());
  app.use(
    '/api',
    ...sessionMiddleware({
      config,
      clock: app.get(Clock),
      store: app.get(SessionStore),
      users: app.get(UsersReader),
    }),
  );
  app.useBodyParser('json', { limit: largestJsonBody });
  app.use(refuseOddShapes());
}
