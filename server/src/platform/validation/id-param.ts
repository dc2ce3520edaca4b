import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import { ApiParam } from '@nestjs/swagger';
import type { Request } from 'express';
import { largestId } from '@emberlot/shared/limits/numbers';
import { inputRefused } from './validation-pipe.js';

/**
 * The identifier in a route's path, as a number; anything else is refused before the handler runs.
 * Read from the request itself, since the pipe over Nest's own `@Param` would take `0x10` and `1e3` for numbers.
 */
export function IdParam(name = 'id'): ParameterDecorator {
  const read = createParamDecorator((_data: unknown, context: ExecutionContext) =>
    parseId(context.switchToHttp().getRequest<Request>().params[name], name),
  )();
  return (target, method, index) => {
    read(target, method, index);
    const descriptor = method === undefined ? undefined : Object.getOwnPropertyDescriptor(target, method);
    if (method !== undefined && descriptor) {
      ApiParam({ name, schema: { type: 'integer', minimum: 1, maximum: largestId } })(target, method, descriptor);
    }
  };
}

/** @throws AppError `invalid_input` for anything but a plain positive whole number */
export function parseId(value: unknown, name: string): number {
  const id = typeof value === 'string' && /^[1-9]\d{0,15}$/.test(value) ? Number(value) : Number.NaN;
  if (id <= largestId) return id;
  throw inputRefused([{ pointer: `/${name}`, code: 'id', detail: 'This is not the number of anything.' }]);
}
