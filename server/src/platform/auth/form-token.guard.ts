import { type CanActivate, type ExecutionContext, Injectable, Logger } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { Config } from '../config/config.js';
import { AppError } from '../errors/app-error.js';
import { noFormTokenKey } from './access.js';
import { isFormTokenValid } from './form-token.js';
import { isOwnOrigin } from './own-origin.js';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses a change that another site's page made the browser send: first by the form token, then by where it came from. */
@Injectable()
export class FormTokenGuard implements CanActivate {
  readonly #logger = new Logger('FormToken');

  constructor(
    private readonly reflector: Reflector,
    private readonly config: Config,
  ) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (safeMethods.has(request.method)) return true;
    if (this.reflector.get<boolean | undefined>(noFormTokenKey, context.getHandler())) return true;
    const site = request.get('sec-fetch-site');
    const foreign = site !== undefined && site !== 'same-origin' && site !== 'none';
    if (foreign || !isOwnOrigin(request.get('origin'), this.config.baseUrl) || !isFormTokenValid(request)) {
      this.#logger.warn({ event: 'form_refused', requestId: request.id, path: request.path, foreign });
      throw new AppError('stale_form', 'This page is out of date. Load it again; nothing was changed.');
    }
    return true;
  }
}
