import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { sql } from 'kysely';
import { Clock } from '../clock/clock.js';
import { Database } from '../database/database.js';
import { AppError } from '../errors/app-error.js';

export interface AttemptLimit {
  /** What is tried: `sign_in.account`. */
  readonly name: string;
  readonly attempts: number;
  readonly minutes: number;
}

/**
 * How often something may be tried, counted in the database, so that it holds over several servers and restarts.
 * An attempt counts before it is judged: guesses sent side by side cannot slip past.
 */
@Injectable()
export class AttemptLimits {
  constructor(
    private readonly database: Database,
    private readonly clock: Clock,
  ) {}

  /**
   * Counts one attempt.
   *
   * @param whom an account's address, a network address: only its digest is kept
   * @throws AppError `too_many_tries`, with the seconds to wait, when the limit is used up
   */
  async take(limit: AttemptLimit, whom: string): Promise<void> {
    const now = this.clock.now();
    const windowEnd = new Date(now.getTime() + limit.minutes * 60_000);
    const over = sql<boolean>`attempt_count.window_ends_at <= ${now}`;
    const row = await this.database.handle
      .insertInto('attempt_count')
      .values({ bucket: bucketOf(limit, whom), window_ends_at: windowEnd, attempts: 1 })
      .onConflict((conflict) =>
        conflict.column('bucket').doUpdateSet({
          attempts: sql<number>`case when ${over} then 1 else least(attempt_count.attempts, 1000000) + 1 end`,
          window_ends_at: sql<Date>`case when ${over} then excluded.window_ends_at else attempt_count.window_ends_at end`,
        }),
      )
      .returning(['attempts', 'window_ends_at'])
      .executeTakeFirstOrThrow();
    if (row.attempts > limit.attempts) throw tooMany(row.window_ends_at.getTime() - now.getTime());
  }

  /** Forgets the attempts, after one that succeeded or a proof that it is the right person. */
  async forget(limit: AttemptLimit, whom: string): Promise<void> {
    await this.database.handle.deleteFrom('attempt_count').where('bucket', '=', bucketOf(limit, whom)).execute();
  }

  /** Removes counts whose window is over. */
  async prune(): Promise<void> {
    await this.database.handle.deleteFrom('attempt_count').where('window_ends_at', '<=', this.clock.now()).execute();
  }
}

function bucketOf(limit: AttemptLimit, whom: string): string {
  return `${limit.name}:${createHash('sha256').update(whom).digest('base64url')}`;
}

function tooMany(milliseconds: number): AppError {
  const retryAfterSeconds = Math.max(1, Math.ceil(milliseconds / 1_000));
  const minutes = Math.ceil(retryAfterSeconds / 60);
  const wait = minutes === 1 ? 'a minute' : `${minutes} minutes`;
  return new AppError('too_many_tries', `Too many tries. Wait ${wait}, then try again.`, {
    extra: { retryAfterSeconds },
  });
}
