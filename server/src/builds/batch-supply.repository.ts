import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

export interface BatchSupplyRow {
  readonly batchId: number;
  readonly number: string;
  readonly partId: number;
  readonly dueOn: string;
  /** Pieces still to come that nobody has claimed. */
  readonly free: number;
}

/** What batches under way will still bring. */
@Injectable()
export class BatchSupplyRepository {
  /** Batches with something unclaimed to come, soonest first. */
  async read(handle: Kysely<DB>, partIds: readonly number[], at: Date): Promise<BatchSupplyRow[]> {
    if (partIds.length === 0) return [];
    const settled = sql<number>`(
      select count(*) from unit u
      where u.batch_id = batch.id and (u.completed_at is not null or u.scrapped_at is not null)
    )`;
    const claimed = sql<number>`(
      select coalesce(sum(r.quantity), 0) from reservation r
      where r.batch_id = batch.id and r.ended_at is null and (r.expires_at is null or r.expires_at > ${at})
    )`;
    const free = sql<number>`floor(batch.quantity - batch.made_quantity - ${settled} - ${claimed})::int8`;
    return handle
      .selectFrom('batch')
      .select([
        'batch.id as batchId',
        'batch.number',
        'batch.part_id as partId',
        'batch.due_on as dueOn',
        free.as('free'),
      ])
      .where('batch.part_id', 'in', [...partIds])
      .where('batch.status', 'in', ['planned', 'picking', 'in_build'])
      .where(free, '>', 0)
      .orderBy('batch.due_on')
      .orderBy('batch.id')
      .execute();
  }

  /** Holds the batches while their pieces are claimed, so that none is promised twice. */
  async lock(handle: Kysely<DB>, batchIds: readonly number[]): Promise<void> {
    if (batchIds.length === 0) return;
    await handle
      .selectFrom('batch')
      .select('id')
      .where('id', 'in', [...batchIds])
      .orderBy('id')
      .forNoKeyUpdate()
      .execute();
  }
}
