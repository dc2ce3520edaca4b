import { callbackify } from 'node:util';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import session from 'express-session';
import passport from 'passport';
import type { Clock } from '../clock/clock.js';
import type { Config } from '../config/config.js';
import type { SessionStore } from './session.store.js';
import { isSessionOver, sessionTimes } from './session-times.js';
import type { UsersReader } from './users.reader.js';

/** The prefix makes browsers refuse the cookie from any other host or path; they honour it only over TLS. */
export function sessionCookieName(config: Config): string {
  return config.secure ? '__Host-emberlot' : 'emberlot';
}

export interface SessionParts {
  readonly config: Config;
  readonly clock: Clock;
  readonly store: SessionStore;
  readonly users: UsersReader;
}

/** The session, its timeouts, and the person it belongs to, in this order. */
export function sessionMiddleware(parts: SessionParts): RequestHandler[] {
  const authenticator = new passport.Passport();
  const findUser = callbackify(async (id: unknown) => (await parts.users.findActive(Number(id))) ?? false);
  authenticator.serializeUser((user, done) => done(null, user.id));
  authenticator.deserializeUser((id, done) => {
    findUser(id, done);
  });
  return [
    session({
      name: sessionCookieName(parts.config),
      secret: [...parts.config.sessionSecrets],
      store: parts.store,
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie: {
        httpOnly: true,
        secure: parts.config.secure,
        sameSite: 'lax',
        path: '/',
        maxAge: sessionTimes.idleMilliseconds,
      },
    }),
    endWhenOver(parts.clock),
    authenticator.session(),
  ];
}

/** Timeouts go by the product's clock, kept in the session, so that a rolling cookie cannot outlive them. */
function endWhenOver(clock: Clock): RequestHandler {
  return (request: Request, _response: Response, next: NextFunction) => {
    const now = clock.now().getTime();
    const { createdAt, passport: person } = request.session;
    const undated = person !== undefined && createdAt === undefined;
    if (undated || isSessionOver(request.session, now)) {
      request.session.regenerate((error: unknown) => next(error));
      return;
    }
    const signedIn = createdAt !== undefined;
    if (signedIn && now - (request.session.lastSeenAt ?? 0) >= sessionTimes.grainMilliseconds) {
      request.session.lastSeenAt = now;
    }
    if (!signedIn) request.session.cookie.maxAge = sessionTimes.visitorMilliseconds;
    next();
  };
}
