import type { NextFunction, Request, RequestHandler, Response } from 'express';
import { AppError } from '../errors/app-error.js';

/** Deeper nesting than any request of ours has. */
const deepestBody = 16;

/** Keys that mean something to JavaScript itself. */
const forbiddenKeys = new Set(['__proto__', 'constructor', 'prototype']);

/** NUL, and halves of surrogate pairs: PostgreSQL's text holds neither. */
const unkeepable = /[\0\uD800-\uDFFF]/u;

const unsafeMethods = new Set(['POST', 'PUT', 'PATCH', 'DELETE']);

/**
 * Changes are taken as JSON, or as a form with files where a route asks for one; a page of another site can send
 * neither without asking the browser's leave first.
 */
export function requireJsonOrFiles(): RequestHandler {
  return (request: Request, _response: Response, next: NextFunction) => {
    if (!unsafeMethods.has(request.method)) return next();
    const empty =
      request.get('content-length') === '0' || (!request.get('content-length') && !request.get('transfer-encoding'));
    const type = request.get('content-type');
    if (empty && type === undefined) return next();
    if (request.is(['application/json', 'multipart/form-data'])) return next();
    next(new AppError('unsupported_media', 'Only JSON is taken here, and files where a form asks for one.'));
  };
}

/** Refuses bodies and queries that no form of ours sends: before any DTO, whatever the route. */
export function refuseOddShapes(): RequestHandler {
  return (request: Request, _response: Response, next: NextFunction) => {
    const values: readonly unknown[] = Object.values(request.query);
    if (values.some((value) => typeof value !== 'string')) {
      return next(new AppError('invalid_input', 'Each part of the address may be given once.'));
    }
    if (values.some((value) => isOdd(value, 0))) {
      return next(new AppError('invalid_input', 'There is a character in the address that cannot be read.'));
    }
    if (isOdd(request.body, 0)) {
      return next(new AppError('invalid_input', 'The request has a form that is not known here.'));
    }
    next();
  };
}

function isOdd(value: unknown, depth: number): boolean {
  if (typeof value === 'string') return unkeepable.test(value);
  if (typeof value !== 'object' || value === null) return false;
  if (depth >= deepestBody) return true;
  if (Array.isArray(value)) return value.some((item) => isOdd(item, depth + 1));
  return Object.entries(value).some(([key, item]) => forbiddenKeys.has(key) || isOdd(item, depth + 1));
}
