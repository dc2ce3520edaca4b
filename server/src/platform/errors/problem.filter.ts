import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import type { Request, Response } from 'express';
import { ArithmeticError } from '@emberlot/shared/errors/arithmetic-error';
import type { ErrorCode } from '@emberlot/shared/errors/codes';
import { AppError } from './app-error.js';
import type { ConstraintSentences } from './constraints.js';
import { translateDatabaseFault } from './database-fault.js';
import { toProblem } from './problem.dto.js';

/** Statuses that the framework and its parsers answer by themselves, in our codes and sentences. */
const sentencesByStatus: ReadonlyMap<number, readonly [ErrorCode, string]> = new Map([
  [400, ['invalid_input', 'The request cannot be read. Its body must be whole and in JSON.']],
  [401, ['not_signed_in', 'Sign in first.']],
  [403, ['not_allowed', 'Your role does not allow this.']],
  [404, ['not_found', 'There is nothing at this address.']],
  [405, ['not_found', 'There is nothing at this address.']],
  [408, ['service_unavailable', 'The request took too long to arrive. Try again.']],
  [413, ['too_large', 'This is larger than can be taken.']],
  [415, ['unsupported_media', 'Only JSON is taken here, and files where a form asks for one.']],
  [429, ['too_many_tries', 'Too many tries. Wait a little.']],
  [503, ['service_unavailable', 'This does not work just now. Try again in a moment.']],
]);

/** The one place where a fault becomes an answer: RFC 9457, `application/problem+json`. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  readonly #logger = new Logger('Problem');

  constructor(private readonly constraints: ConstraintSentences) {}

  catch(error: unknown, host: ArgumentsHost): void {
    this.answer(error, host.switchToHttp().getRequest<Request>(), host.switchToHttp().getResponse<Response>());
  }

  answer(error: unknown, request: Request, response: Response): void {
    const refusal = this.refusalOf(error);
    if (refusal.status >= 500) this.#logger.error({ requestId: request.id, err: error });
    // Once the first bytes of a file are out, all that is left is to break the connection, so that nobody takes the
    // part for the whole.
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const retryAfter = refusal.extra['retryAfterSeconds'];
    if (typeof retryAfter === 'number') response.setHeader('Retry-After', String(retryAfter));
    response.removeHeader('Content-Disposition');
    response.setHeader('Cache-Control', 'no-store');
    response.status(refusal.status).type('application/problem+json');
    response.send(JSON.stringify(toProblem(refusal, request.id)));
  }

  /** The refusal behind any thrown thing; unknown ones say only that something of ours went wrong. */
  refusalOf(error: unknown): AppError {
    if (error instanceof AppError) return error;
    if (error instanceof ArithmeticError) return new AppError('rule_broken', error.message, { cause: error });
    const translated = translateDatabaseFault(error, this.constraints);
    if (translated) return translated;
    const byStatus = sentencesByStatus.get(statusOf(error) ?? 500);
    if (byStatus) return new AppError(byStatus[0], byStatus[1], { cause: error });
    return new AppError(
      'unexpected',
      'Something of ours went wrong. It is on record; try again, or tell us the number.',
      {
        cause: error,
      },
    );
  }
}

/** Nest's exceptions, and those of Express's parsers (`http-errors`) that say they may be shown. */
function statusOf(error: unknown): number | undefined {
  if (error instanceof HttpException) return error.getStatus();
  if (error instanceof URIError) return 400;
  if (!(error instanceof Error)) return undefined;
  if ('code' in error && typeof error.code === 'string' && error.code.startsWith('LIMIT_')) return 413;
  if ('expose' in error && error.expose === true && 'status' in error && typeof error.status === 'number') {
    return error.status;
  }
  return undefined;
}
