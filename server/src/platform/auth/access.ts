import { applyDecorators, createParamDecorator, type ExecutionContext, SetMetadata } from '@nestjs/common';
import { ApiExtension } from '@nestjs/swagger';
import type { Request } from 'express';
import { AppError } from '../errors/app-error.js';
import type { Role, SignedInUser } from './signed-in-user.js';

export const accessKey = 'emberlot:access';
export const noFormTokenKey = 'emberlot:no-form-token';

export type Access = 'public' | readonly Role[];

/** Anybody may call this route. The only way round signing in; each one stands in the list of a test. */
export function Public(): MethodDecorator & ClassDecorator {
  return applyDecorators(SetMetadata<string, Access>(accessKey, 'public'), ApiExtension('x-access', ['public']));
}

/** Only these roles may call this route; on a method it replaces what its controller says. */
export function Roles(...allowed: [Role, ...Role[]]): MethodDecorator & ClassDecorator {
  return applyDecorators(SetMetadata<string, Access>(accessKey, allowed), ApiExtension('x-access', allowed));
}

/** Called by another program, which proves itself by a signature: no session, no form token. */
export function Webhook(): MethodDecorator {
  return applyDecorators(Public(), SetMetadata(noFormTokenKey, true));
}

/** The person who sent the request. On a public route use `MaybeUser`. */
export const CurrentUser = createParamDecorator((_data: unknown, context: ExecutionContext): SignedInUser => {
  const user = context.switchToHttp().getRequest<Request>().user;
  if (!user) throw new AppError('not_signed_in', 'Sign in first.');
  return user;
});

/** The person who sent the request to a public route, if signed in. */
export const MaybeUser = createParamDecorator(
  (_data: unknown, context: ExecutionContext): SignedInUser | null =>
    context.switchToHttp().getRequest<Request>().user ?? null,
);
