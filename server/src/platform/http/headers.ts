import { randomBytes } from 'node:crypto';
import type { NextFunction, Request, RequestHandler, Response } from 'express';
import helmet from 'helmet';
import type { Config } from '../config/config.js';

const year = 365 * 24 * 60 * 60;

/** The value that each style element of this answer must carry. */
export function nonceOf(response: Response): string {
  return String(response.locals['cspNonce']);
}

/** Headers of every answer, refusals and files included. */
export function securityHeaders(config: Config): RequestHandler[] {
  return [
    (_request: Request, response: Response, next: NextFunction) => {
      response.locals['cspNonce'] = randomBytes(18).toString('base64');
      response.setHeader(
        'Permissions-Policy',
        'camera=(self), microphone=(), geolocation=(), payment=(), usb=(), interest-cohort=()',
      );
      next();
    },
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          baseUri: ["'none'"],
          connectSrc: ["'self'"],
          fontSrc: ["'self'"],
          formAction: ["'self'"],
          frameAncestors: ["'none'"],
          frameSrc: ["'none'"],
          imgSrc: ["'self'", 'data:', 'blob:'],
          manifestSrc: ["'self'"],
          objectSrc: ["'none'"],
          scriptSrc: ["'self'"],
          scriptSrcAttr: ["'none'"],
          styleSrc: ["'self'", (_request, response) => `'nonce-${nonceOf(response as Response)}'`],
          // React sets single style properties through the DOM, which no policy forbids; attributes in HTML stay shut.
          styleSrcAttr: ["'none'"],
          workerSrc: ["'self'"],
          ...(config.secure ? { upgradeInsecureRequests: [] } : {}),
        },
      },
      crossOriginEmbedderPolicy: false,
      frameguard: { action: 'deny' },
      referrerPolicy: { policy: 'no-referrer' },
      strictTransportSecurity: { maxAge: year, includeSubDomains: true },
    }),
  ];
}

/** Answers of the API are nobody else's: no cache on the way keeps them. A handler may say otherwise for public ones. */
export function privateAnswers(): RequestHandler {
  return (_request: Request, response: Response, next: NextFunction) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  };
}
