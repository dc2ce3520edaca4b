import {
  type CanActivate,
  type ExecutionContext,
  Injectable,
  SetMetadata,
  applyDecorators,
  type CustomDecorator,
} from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { type AttemptLimit, AttemptLimits } from './attempt-limits.js';

const limitedKey = 'emberlot:limited';

/**
 * Bounds how often one network address may call a route (signed-in people: one person, from wherever they are).
 * For what is costly or can be guessed at.
 */
export function Limited(limit: AttemptLimit): MethodDecorator {
  return applyDecorators(SetMetadata(limitedKey, limit) as CustomDecorator & MethodDecorator);
}

@Injectable()
export class LimitGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly limits: AttemptLimits,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const limit = this.reflector.get<AttemptLimit | undefined>(limitedKey, context.getHandler());
    if (!limit) return true;
    const request = context.switchToHttp().getRequest<Request>();
    await this.limits.take(limit, request.user ? `user ${request.user.id}` : `address ${request.ip ?? ''}`);
    return true;
  }
}
