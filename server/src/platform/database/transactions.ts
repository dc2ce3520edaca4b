import { AsyncLocalStorage } from 'node:async_hooks';
import { setTimeout as wait } from 'node:timers/promises';
import { Injectable } from '@nestjs/common';
import type { IsolationLevel, Transaction } from 'kysely';
import pg from 'pg';
import type { DB } from '@emberlot/db/database.types';
import { Database } from './database.js';

export interface TransactionOptions {
  /** `read committed` when nothing is said. */
  readonly isolation?: IsolationLevel;
  /** How often the work is tried in all when it collides with another transaction. */
  readonly attempts?: number;
}

/** Run first in the next transaction of this request; used for the key of a request that creates something. */
export type TransactionOpening = (trx: Transaction<DB>) => Promise<void>;

/** Serialization failure and deadlock: the other transaction won, the same work may succeed when repeated. */
const collisions = new Set(['40001', '40P01']);

@Injectable()
export class Transactions {
  readonly #running = new AsyncLocalStorage<true>();
  readonly #openings = new AsyncLocalStorage<{ opening: TransactionOpening | undefined }>();

  constructor(private readonly database: Database) {}

  /**
   * Runs the work in one transaction and commits it. The work must bear being repeated: it changes nothing outside the
   * database, and calls nothing outside it (payments, mail, PDF).
   *
   * @throws whatever the work throws, after rolling back; the last collision when the attempts are used up
   * @throws Error when called inside another transaction: pass that one on instead
   */
  async run<Result>(
    work: (trx: Transaction<DB>) => Promise<Result>,
    options: TransactionOptions = {},
  ): Promise<Result> {
    if (this.#running.getStore()) throw new Error('A transaction is open already: pass it on instead of a second one.');
    const attempts = options.attempts ?? 5;
    for (let attempt = 1; ; attempt += 1) {
      try {
        return await this.#once(work, options.isolation ?? 'read committed');
      } catch (error) {
        if (attempt >= attempts || !isCollision(error)) throw error;
        // Full jitter, so that two that collided do not meet again.
        await wait(Math.random() * 20 * 2 ** attempt);
      }
    }
  }

  /** Runs a request so that its first transaction that commits also holds what `opening` writes. */
  withOpening<Result>(opening: TransactionOpening, request: () => Promise<Result>): Promise<Result> {
    return this.#openings.run({ opening }, request);
  }

  async #once<Result>(work: (trx: Transaction<DB>) => Promise<Result>, isolation: IsolationLevel): Promise<Result> {
    const pending = this.#openings.getStore();
    const opening = pending?.opening;
    const result = await this.#running.run(true, () =>
      this.database.handle
        .transaction()
        .setIsolationLevel(isolation)
        .execute(async (trx) => {
          if (opening) await opening(trx);
          return work(trx);
        }),
    );
    if (pending) pending.opening = undefined;
    return result;
  }
}

function isCollision(error: unknown): boolean {
  return error instanceof pg.DatabaseError && collisions.has(error.code ?? '');
}
