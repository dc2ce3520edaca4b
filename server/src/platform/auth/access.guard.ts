import { type CanActivate, type ExecutionContext, Injectable, Logger } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { AppError } from '../errors/app-error.js';
import { type Access, accessKey } from './access.js';

/** Denies what says nothing: every route names the roles it is for, or that it is public. */
@Injectable()
export class AccessGuard implements CanActivate {
  readonly #logger = new Logger('Access');

  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const access = this.reflector.getAllAndOverride<Access | undefined>(accessKey, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (access === 'public') return true;
    const request = context.switchToHttp().getRequest<Request>();
    const user = request.user;
    if (!user) throw new AppError('not_signed_in', 'Sign in first.');
    if (access?.includes(user.role)) return true;
    this.#logger.warn({
      event: 'refused',
      requestId: request.id,
      userId: user.id,
      role: user.role,
      path: request.path,
    });
    throw new AppError('not_allowed', 'Your role does not allow this.');
  }
}
