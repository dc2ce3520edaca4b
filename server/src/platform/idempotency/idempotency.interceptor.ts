import { createHash } from 'node:crypto';
import { setTimeout as wait } from 'node:timers/promises';
import { type CallHandler, type ExecutionContext, Injectable, type NestInterceptor } from '@nestjs/common';
import type { Request, Response } from 'express';
import { type Observable, from, lastValueFrom } from 'rxjs';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import { Transactions } from '../database/transactions.js';
import { AppError, fieldFault } from '../errors/app-error.js';
import { toProblem, type ProblemDto } from '../errors/problem.dto.js';
import { IdempotencyRepository, type KeptAnswer, type KeyedRequest } from './idempotency.repository.js';

/** The same key was claimed by a request that ran beside this one. */
class ClaimedElsewhere extends Error {
  override readonly name = 'ClaimedElsewhere';
}

/** Between the commit that claims a key and its answer there are milliseconds; longer means its server died. */
const answerPatience = { tries: 40, milliseconds: 50 } as const;

@Injectable()
export class IdempotencyInterceptor implements NestInterceptor {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly keys: IdempotencyRepository,
    private readonly clock: Clock,
  ) {}

  intercept(context: ExecutionContext, next: CallHandler): Observable<unknown> {
    const request = context.switchToHttp().getRequest<Request>();
    const response = context.switchToHttp().getResponse<Response>();
    return from(this.#answer(keyedRequestOf(request), response, next));
  }

  async #answer(keyed: KeyedRequest, response: Response, next: CallHandler): Promise<unknown> {
    const kept = await this.keys.find(this.database.handle, keyed);
    if (kept) return this.#replay(keyed, kept, response);
    let claimed = false;
    const claim = async (trx: Parameters<IdempotencyRepository['claim']>[0]) => {
      if (!(await this.keys.claim(trx, keyed, this.clock.now()))) throw new ClaimedElsewhere();
      claimed = true;
    };
    try {
      const body: unknown = await this.transactions.withOpening(claim, () => lastValueFrom(next.handle()));
      if (claimed) await this.#keep(keyed, { status: response.statusCode, body });
      return body;
    } catch (error) {
      if (error instanceof ClaimedElsewhere) return this.#replayOther(keyed, response);
      // Refused after something was committed: to be sent again it needs a new key, and this one tells why.
      // Where the claim rolled back with its transaction, nothing is there to be marked.
      if (claimed && error instanceof AppError) {
        await this.#keep(keyed, { status: error.status, body: toProblem(error, '') });
      }
      throw error;
    }
  }

  async #keep(keyed: KeyedRequest, answer: { status: number; body: unknown }): Promise<void> {
    await this.keys.keepAnswer(this.database.handle, keyed, answer, this.clock.now());
  }

  async #replayOther(keyed: KeyedRequest, response: Response): Promise<unknown> {
    const kept = await this.keys.find(this.database.handle, keyed);
    // The other one rolled back after all; the client may simply send this again.
    if (!kept) throw new AppError('changed_meanwhile', 'The same request was refused a moment ago. Send it again.');
    return this.#replay(keyed, kept, response);
  }

  async #replay(keyed: KeyedRequest, first: KeptAnswer, response: Response): Promise<unknown> {
    if (!first.request_hash.equals(keyed.hash)) {
      throw new AppError(
        'key_reused',
        'This key was used for another request. Use a new one for each thing to create.',
      );
    }
    const kept = await this.#awaitAnswer(keyed, first);
    response.setHeader('Idempotency-Replayed', 'true');
    if (kept.status >= 400) throw refusalFrom(kept.answer as unknown as ProblemDto);
    response.status(kept.status);
    return kept.answer ?? undefined;
  }

  async #awaitAnswer(keyed: KeyedRequest, first: KeptAnswer): Promise<KeptAnswer & { status: number }> {
    let kept: KeptAnswer | undefined = first;
    for (let tries = 0; tries < answerPatience.tries; tries += 1) {
      if (kept && kept.status !== null) return { ...kept, status: kept.status };
      await wait(answerPatience.milliseconds);
      kept = await this.keys.find(this.database.handle, keyed);
    }
    throw new AppError(
      'already_exists',
      'This was received and took effect, but its answer was lost. Look at the list before you send it again.',
    );
  }
}

function refusalFrom(problem: ProblemDto): AppError {
  return new AppError(problem.code, problem.detail, { faults: problem.errors });
}

function keyedRequestOf(request: Request): KeyedRequest {
  const key = request.get('idempotency-key');
  if (key === undefined || !/^[\w-]{8,200}$/.test(key)) {
    throw fieldFault(
      '/Idempotency-Key',
      'idempotency_key',
      'This needs a key of 8 to 200 letters, digits and hyphens.',
    );
  }
  const hash = createHash('sha256');
  hash.update(`${request.method} ${request.originalUrl}\n${JSON.stringify(request.body ?? null)}`);
  const scope = request.user ? `user ${request.user.id}` : `visitor ${digest(request.sessionID)}`;
  return { scope, key, hash: hash.digest() };
}

function digest(text: string): string {
  return createHash('sha256').update(text).digest('base64url');
}
