import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { BatchSupplyRepository, type BatchSupplyRow } from './batch-supply.repository.js';

export type BatchSupply = BatchSupplyRow;

/** What batches under way will still bring, for promises and claims. */
@Injectable()
export class BatchSupplyService {
  constructor(
    private readonly clock: Clock,
    private readonly repository: BatchSupplyRepository,
  ) {}

  /** Unclaimed pieces to come of these parts, soonest batch first. */
  async toCome(handle: Kysely<DB>, partIds: readonly number[]): Promise<readonly BatchSupply[]> {
    return this.repository.read(handle, partIds, this.clock.now());
  }

  /** As `toCome`, with the batches held until the transaction ends. */
  async hold(trx: Transaction<DB>, partIds: readonly number[]): Promise<readonly BatchSupply[]> {
    const seen = await this.toCome(trx, partIds);
    await this.repository.lock(
      trx,
      seen.map(({ batchId }) => batchId),
    );
    return this.toCome(trx, partIds);
  }
}
