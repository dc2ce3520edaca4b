import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Transaction } from 'kysely';

export interface LotState {
  readonly id: number;
  readonly code: string;
  readonly partId: number;
  readonly kind: string;
  readonly status: string;
  readonly version: number;
}

export interface LotStatusChangeRow {
  readonly documentId: number;
  readonly lotId: number;
  readonly from: string;
  readonly to: string;
  readonly reason: string;
}

@Injectable()
export class LotStatusRepository {
  async find(trx: Transaction<DB>, code: string): Promise<LotState | undefined> {
    return trx
      .selectFrom('lot')
      .select(['id', 'code', 'part_id as partId', 'kind', 'status', 'version'])
      .where('code', '=', code)
      .executeTakeFirst();
  }

  async change(trx: Transaction<DB>, lot: LotState, status: string): Promise<void> {
    await trx
      .updateTable('lot')
      .set({ status, version: lot.version + 1 })
      .where('id', '=', lot.id)
      .where('status', '=', lot.status)
      .execute();
  }

  async recordChange(trx: Transaction<DB>, row: LotStatusChangeRow): Promise<void> {
    await trx
      .insertInto('lot_status_change')
      .values({
        document_id: row.documentId,
        lot_id: row.lotId,
        from_status: row.from,
        to_status: row.to,
        reason: row.reason,
      })
      .execute();
  }
}
