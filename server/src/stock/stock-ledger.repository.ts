import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface LockedPart {
  readonly id: number;
  readonly code: string;
  readonly traced: string;
}

export interface PoolRow {
  readonly partId: number;
  readonly lotId: number | null;
  readonly quantity: string;
  readonly value: number;
}

export interface MoveRow {
  readonly documentId: number;
  readonly partId: number;
  readonly lotId: number;
  readonly binId: number;
  readonly quantity: string;
  readonly unitCost: string;
  readonly value: number;
  readonly reason: string;
  readonly occurredAt: Date;
  readonly recordedBy: number | null;
  readonly reverses: number | null;
}

/** PostgreSQL takes 65,535 parameters in a statement, and a move has twelve. */
const movesPerStatement = 5_000;

@Injectable()
export class StockLedgerRepository {
  /**
   * Locks parts in the order of their ids; whoever changes what lies of a part, or claims it, holds this lock.
   * It does not block rows that merely refer to the part.
   */
  async lockParts(trx: Transaction<DB>, partIds: readonly number[]): Promise<LockedPart[]> {
    if (partIds.length === 0) return [];
    return trx
      .selectFrom('part')
      .select(['id', 'code', 'traced'])
      .where('id', '=', anyOf(partIds))
      .orderBy('id')
      .forNoKeyUpdate()
      .execute();
  }

  async poolsOf(handle: Kysely<DB>, partIds: readonly number[], lotIds: readonly number[]): Promise<PoolRow[]> {
    return handle
      .selectFrom('cost_pool')
      .select(['part_id as partId', 'lot_id as lotId', 'quantity', 'value_minor as value'])
      .where('part_id', '=', anyOf(partIds))
      .where((where) => where.or([where('lot_id', 'is', null), where('lot_id', '=', anyOf(lotIds))]))
      .execute();
  }

  async insertMoves(trx: Transaction<DB>, moves: readonly MoveRow[]): Promise<void> {
    for (let start = 0; start < moves.length; start += movesPerStatement) {
      await this.insertSome(trx, moves.slice(start, start + movesPerStatement));
    }
  }

  private async insertSome(trx: Transaction<DB>, moves: readonly MoveRow[]): Promise<void> {
    await trx
      .insertInto('stock_move')
      .values(
        moves.map((move) => ({
          document_id: move.documentId,
          part_id: move.partId,
          lot_id: move.lotId,
          bin_id: move.binId,
          quantity: move.quantity,
          unit_cost: move.unitCost,
          value_minor: move.value,
          reason: move.reason,
          occurred_at: move.occurredAt,
          recorded_by: move.recordedBy,
          reverses_move_id: move.reverses,
        })),
      )
      .execute();
  }
}

function anyOf(ids: readonly number[]) {
  return sql<number>`any(${[...new Set(ids)]}::bigint[])`;
}
