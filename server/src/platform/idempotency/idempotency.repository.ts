import { Injectable } from '@nestjs/common';
import type { Kysely, Transaction } from 'kysely';
import type { DB, JsonValue } from '@emberlot/db/database.types';

export interface KeyedRequest {
  /** Who sent it, so that one person's keys never meet another's. */
  readonly scope: string;
  readonly key: string;
  readonly hash: Buffer;
}

export interface KeptAnswer {
  readonly request_hash: Buffer;
  readonly status: number | null;
  readonly answer: JsonValue | null;
}

@Injectable()
export class IdempotencyRepository {
  async find(handle: Kysely<DB>, request: KeyedRequest): Promise<KeptAnswer | undefined> {
    return handle
      .selectFrom('idempotency_key')
      .select(['request_hash', 'status', 'answer'])
      .where('scope', '=', request.scope)
      .where('key', '=', request.key)
      .executeTakeFirst();
  }

  /** Waits for another transaction that is just claiming the same key; false when that one committed. */
  async claim(trx: Transaction<DB>, request: KeyedRequest, now: Date): Promise<boolean> {
    const row = await trx
      .insertInto('idempotency_key')
      .values({ scope: request.scope, key: request.key, request_hash: request.hash, claimed_at: now })
      .onConflict((conflict) => conflict.columns(['scope', 'key']).doNothing())
      .returning('key')
      .executeTakeFirst();
    return row !== undefined;
  }

  async keepAnswer(
    handle: Kysely<DB>,
    request: KeyedRequest,
    answer: { readonly status: number; readonly body: unknown },
    now: Date,
  ): Promise<void> {
    await handle
      .updateTable('idempotency_key')
      .set({ status: answer.status, answer: JSON.stringify(answer.body ?? null), answered_at: now })
      .where('scope', '=', request.scope)
      .where('key', '=', request.key)
      .execute();
  }

  async prune(handle: Kysely<DB>, before: Date): Promise<void> {
    await handle.deleteFrom('idempotency_key').where('claimed_at', '<', before).execute();
  }
}
