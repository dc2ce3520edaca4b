import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import type { ErrorRequestHandler, NextFunction, Request, RequestHandler, Response } from 'express';
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
import { clientPages, noSuchPage, outsideApi } from './client-pages.js';
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
  const filter = new ProblemFilter(app.get(ConstraintSentences));
  app.useGlobalFilters(filter);
  app.useGlobalPipes(createValidationPipe());
  app.use(requestLog(app.get<Logger>(appLogger)));
  app.use(...securityHeaders(config));
  app.use(compression());
  app.use(...outsideApi([...clientPages(config.clientFolder), noSuchPage()]));
  app.use(privateAnswers(), requireJsonOrFiles());
  const session = sessionMiddleware({
    config,
    clock: app.get(Clock),
    store: app.get(SessionStore),
    users: app.get(UsersReader),
  });
  app.use(...exceptHealth(session));
  app.useBodyParser('json', { limit: largestJsonBody });
  app.use(refuseOddShapes());
  app.use(answerFaults(filter));
}

/** Health is asked after when sessions cannot be read, too. */
function exceptHealth(handlers: readonly RequestHandler[]): RequestHandler[] {
  return handlers.map((handler) => (request, response, next) => {
    if (/^\/api\/health(\/|$)/i.test(request.path)) return next();
    return handler(request, response, next);
  });
}

/** Faults of the handlers above, which come before Nest, are answered as its own are. */
function answerFaults(filter: ProblemFilter): ErrorRequestHandler {
  return (error: unknown, request: Request, response: Response, _next: NextFunction) => {
    filter.answer(error, request, response);
  };
}
