import { STATUS_CODES } from 'node:http';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { errorStatus, type ErrorCode } from '@emberlot/shared/errors/codes';
import type { AppError } from './app-error.js';

export class FieldFaultDto {
  /** JSON pointer to the field, such as `/lines/0/quantity`. */
  pointer: string;
  code: string;
  detail: string;
}

/** How every refusal is answered (RFC 9457), as `application/problem+json`. */
export class ProblemDto {
  type: string;
  title: string;
  status: number;
  /** A sentence for a person. */
  detail: string;
  /** What the client decides by. */
  @ApiProperty({ enum: Object.keys(errorStatus), enumName: 'ErrorCode' })
  code: ErrorCode;
  errors: FieldFaultDto[];
  /** Names the request in the log. */
  requestId: string;
  /** The newer state that an edit collided with. */
  @ApiPropertyOptional({ type: 'object', additionalProperties: true })
  current?: Record<string, unknown>;
  /** When it makes sense to try again. */
  retryAfterSeconds?: number;
}

export function toProblem(error: AppError, requestId: unknown): ProblemDto {
  return {
    ...error.extra,
    type: `urn:emberlot:problem:${error.code}`,
    title: STATUS_CODES[error.status] ?? 'Error',
    status: error.status,
    detail: error.message,
    code: error.code,
    errors: [...error.faults],
    requestId: typeof requestId === 'string' ? requestId : '',
  };
}
