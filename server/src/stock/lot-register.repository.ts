import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Transaction } from 'kysely';

export interface LotRow {
  readonly code: string;
  readonly partId: number;
  readonly kind: 'standing' | 'delivery' | 'made' | 'unit';
  readonly status: 'held' | 'released';
  readonly supplierId: number | null;
  readonly supplierLotCode: string | null;
  readonly receivedOn: string | null;
  readonly expiresOn: string | null;
  readonly unitCost: string | null;
  readonly documentId: number | null;
  readonly note: string | null;
}

@Injectable()
export class LotRegisterRepository {
  async standingLots(trx: Transaction<DB>, partIds: readonly number[]): Promise<{ partId: number; lotId: number }[]> {
    return trx
      .selectFrom('lot')
      .select(['part_id as partId', 'id as lotId'])
      .where('kind', '=', 'standing')
      .where('part_id', '=', sql<number>`any(${[...partIds]}::bigint[])`)
      .execute();
  }

  /** One statement however many lots: opening stock brings thousands. */
  async insert(trx: Transaction<DB>, rows: readonly LotRow[], createdAt: Date): Promise<ReadonlyMap<string, number>> {
    const { rows: inserted } = await sql<{ id: number; code: string }>`
      insert into lot (code, part_id, kind, status, supplier_id, supplier_lot_code, received_on, expires_on, unit_cost,
        document_id, note, created_at)
      select code, "partId", kind, status, "supplierId", "supplierLotCode", "receivedOn", "expiresOn", "unitCost",
        "documentId", note, ${createdAt}
      from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as added (
        code text, "partId" bigint, kind text, status text, "supplierId" bigint, "supplierLotCode" text,
        "receivedOn" date, "expiresOn" date, "unitCost" numeric, "documentId" bigint, note text
      )
      returning id, code`.execute(trx);
    return new Map(inserted.map(({ id, code }) => [code, id]));
  }
}
