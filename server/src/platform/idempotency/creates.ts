import { UseInterceptors, applyDecorators } from '@nestjs/common';
import { ApiHeader } from '@nestjs/swagger';
import { IdempotencyInterceptor } from './idempotency.interceptor.js';

/**
 * For a POST that makes a document: sent again with the same `Idempotency-Key` it makes nothing and gets the same
 * answer. The key is kept in the first transaction of the request that commits, so what cannot be repeated belongs in it.
 */
export function Creates(): MethodDecorator {
  return applyDecorators(
    UseInterceptors(IdempotencyInterceptor),
    ApiHeader({
      name: 'Idempotency-Key',
      required: true,
      description: 'Made afresh for each thing to create, and kept when the same request is sent again.',
    }),
  );
}
