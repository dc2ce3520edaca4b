import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { type NextFunction, type Request, type RequestHandler, type Response } from 'express';
import { notFound } from '../errors/app-error.js';
import { nonceOf } from './headers.js';

/** What Vite writes where the page's nonce belongs (`html.cspNonce` in its configuration). */
const noncePlaceholder = /__CSP_NONCE__/g;

/** Paths that no page of ours has: an extension says a file was meant, and it is not there. */
const looksLikeFile = /\.[a-zA-Z0-9]{1,8}$/;

/** Serves the built client: hashed files for a year, and for every other address outside `/api` its one page, afresh. */
export function clientPages(folder: string): RequestHandler[] {
  const indexFile = join(folder, 'index.html');
  if (!existsSync(indexFile)) return [];
  const page = readFileSync(indexFile, 'utf8');
  return [
    express.static(folder, {
      index: false,
      dotfiles: 'ignore',
      redirect: false,
      setHeaders: (response, path) => {
        const hashed = path.startsWith(join(folder, 'assets'));
        response.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'public, max-age=3600');
      },
    }),
    (request: Request, response: Response, next: NextFunction) => {
      const isPage = request.method === 'GET' || request.method === 'HEAD';
      if (!isPage || looksLikeFile.test(request.path)) return next();
      response.setHeader('Cache-Control', 'no-store');
      response.type('html').send(page.replaceAll(noncePlaceholder, nonceOf(response)));
    },
  ];
}

/** What is neither a file nor a page of ours. */
export function noSuchPage(): RequestHandler {
  return (_request, _response, next) => next(notFound('page'));
}

/** Leaves the API's own addresses to Nest, whatever their spelling. */
export function outsideApi(handlers: readonly RequestHandler[]): RequestHandler[] {
  return handlers.map((handler) => (request, response, next) => {
    if (/^\/api(\/|$)/i.test(request.path)) return next();
    return handler(request, response, next);
  });
}
