import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { DeliveriesQuery } from './delivery.dto.js';

export interface ReceiptRow {
  readonly documentId: number;
  readonly supplierId: number;
  readonly deliveryNote: string | null;
  readonly receivedOn: string;
}

export interface DeliveryRow {
  readonly documentId: number;
  readonly number: string;
  readonly receivedOn: string;
  readonly supplier: string;
  readonly supplierName: string;
  readonly deliveryNote: string | null;
  readonly lineCount: number;
  readonly valueMinor: number;
  readonly recordedBy: string | null;
  readonly reversedBy: string | null;
  readonly note: string | null;
  readonly occurredAt: Date;
}

export interface DeliveryLineRow {
  readonly part: string;
  readonly name: string;
  readonly measure: string;
  readonly lot: string;
  readonly lotStatus: string;
  readonly supplierLot: string | null;
  readonly expiresOn: string | null;
  readonly bin: string;
  readonly quantity: string;
  readonly unitCost: string;
  readonly valueMinor: number;
}

const sortColumns = {
  number: 'd.id',
  receivedOn: 'r.received_on',
  supplier: 's.code',
  value: sql`"valueMinor"`,
  lineCount: sql`"lineCount"`,
};

@Injectable()
export class DeliveriesRepository {
  async insert(trx: Transaction<DB>, row: ReceiptRow): Promise<void> {
    await trx
      .insertInto('receipt')
      .values({
        document_id: row.documentId,
        supplier_id: row.supplierId,
        delivery_note: row.deliveryNote,
        received_on: row.receivedOn,
      })
      .execute();
  }

  async findPage(handle: Kysely<DB>, query: DeliveriesQuery): Promise<Page<DeliveryRow>> {
    const found = this.filtered(handle, query);
    const rows = await paged(
      sorted(this.withColumns(found), query.sort, sortColumns, '-receivedOn', 'd.id'),
      query,
    ).execute();
    return { items: rows, total: await countOf(found) };
  }

  async findByNumber(handle: Kysely<DB>, number: string): Promise<DeliveryRow | undefined> {
    return this.withColumns(this.filtered(handle, {}).where('d.number', '=', number)).executeTakeFirst();
  }

  async linesOf(handle: Kysely<DB>, documentId: number): Promise<DeliveryLineRow[]> {
    return handle
      .selectFrom('stock_move as m')
      .innerJoin('part as p', 'p.id', 'm.part_id')
      .innerJoin('lot as l', 'l.id', 'm.lot_id')
      .innerJoin('bin as b', 'b.id', 'm.bin_id')
      .where('m.document_id', '=', documentId)
      .select([
        'p.code as part',
        'p.name',
        'p.measure',
        'l.code as lot',
        'l.status as lotStatus',
        'l.supplier_lot_code as supplierLot',
        'l.expires_on as expiresOn',
        'b.code as bin',
        'm.quantity',
        'm.unit_cost as unitCost',
        'm.value_minor as valueMinor',
      ])
      .orderBy('m.id')
      .execute();
  }

  private filtered(handle: Kysely<DB>, query: Partial<DeliveriesQuery>) {
    let found = handle
      .selectFrom('receipt as r')
      .innerJoin('document as d', 'd.id', 'r.document_id')
      .innerJoin('supplier as s', 's.id', 'r.supplier_id');
    if (query.supplier) found = found.where('s.code', '=', query.supplier);
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) =>
        where.or([
          where('d.number', 'ilike', pattern),
          where('r.delivery_note', 'ilike', pattern),
          where('s.code', 'ilike', pattern),
          where('s.name', 'ilike', pattern),
        ]),
      );
    }
    return found;
  }

  private withColumns(found: ReturnType<DeliveriesRepository['filtered']>) {
    return found
      .leftJoin('app_user as u', 'u.id', 'd.recorded_by')
      .leftJoin('document as rev', 'rev.reverses_document_id', 'd.id')
      .innerJoinLateral(
        (from) =>
          from
            .selectFrom('stock_move as m')
            .whereRef('m.document_id', '=', 'd.id')
            .select([
              sql<number>`count(*)`.as('lineCount'),
              sql<number>`coalesce(sum(m.value_minor), 0)::bigint`.as('valueMinor'),
            ])
            .as('moved'),
        (join) => join.onTrue(),
      )
      .select([
        'd.id as documentId',
        'd.number',
        'r.received_on as receivedOn',
        's.code as supplier',
        's.name as supplierName',
        'r.delivery_note as deliveryNote',
        'moved.lineCount',
        'moved.valueMinor',
        'u.name as recordedBy',
        'rev.number as reversedBy',
        'd.note',
        'd.occurred_at as occurredAt',
      ]);
  }
}
