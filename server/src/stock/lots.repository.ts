import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { LotBatchDto, LotPlaceDto, LotsQuery } from './lot.dto.js';

export interface LotRecord {
  readonly id: number;
  readonly code: string;
  readonly part: string;
  readonly name: string;
  readonly measure: string;
  readonly kind: string;
  readonly status: string;
  readonly supplier: string | null;
  readonly supplierLot: string | null;
  readonly receivedOn: string | null;
  readonly expiresOn: string | null;
  readonly quantity: string;
  readonly bins: string[];
}

export interface LotFullRecord extends LotRecord {
  readonly version: number;
  readonly origin: string | null;
  readonly originKind: string | null;
  readonly note: string | null;
  readonly unitCost: string | null;
}

export interface StatusChangeRecord {
  readonly document: string;
  readonly occurredAt: Date;
  readonly person: string | null;
  readonly from: string;
  readonly to: string;
  readonly reason: string;
}

const sortColumns = {
  code: 'l.id',
  part: 'p.code',
  receivedOn: 'l.received_on',
  expiresOn: 'l.expires_on',
  quantity: sql`lying.quantity`,
};

@Injectable()
export class LotsRepository {
  /** @param expiresBefore the day up to which a lot counts as expiring */
  async findPage(handle: Kysely<DB>, query: LotsQuery, expiresBefore: string): Promise<Page<LotRecord>> {
    const found = this.filtered(handle, query, expiresBefore);
    const rows = await paged(
      sorted(this.withColumns(found), query.sort, sortColumns, '-code', 'l.id'),
      query,
    ).execute();
    return { items: rows, total: await countOf(found) };
  }

  async findByCode(handle: Kysely<DB>, code: string): Promise<LotFullRecord | undefined> {
    return this.withColumns(this.base(handle).where('l.code', '=', code))
      .leftJoin('document as d', 'd.id', 'l.document_id')
      .select(['l.version', 'l.note', 'l.unit_cost as unitCost', 'd.number as origin', 'd.kind as originKind'])
      .executeTakeFirst();
  }

  async placesOf(handle: Kysely<DB>, lotId: number): Promise<LotPlaceDto[]> {
    return handle
      .selectFrom('stock_balance as s')
      .innerJoin('bin as b', 'b.id', 's.bin_id')
      .where('s.lot_id', '=', lotId)
      .where('s.quantity', '>', '0')
      .where('s.owner_customer_id', 'is', null)
      .select(['b.code as bin', 'b.quarantine', 's.quantity'])
      .orderBy('b.code')
      .execute();
  }

  async statusChangesOf(handle: Kysely<DB>, lotId: number): Promise<StatusChangeRecord[]> {
    return handle
      .selectFrom('lot_status_change as c')
      .innerJoin('document as d', 'd.id', 'c.document_id')
      .leftJoin('app_user as u', 'u.id', 'd.recorded_by')
      .where('c.lot_id', '=', lotId)
      .select([
        'd.number as document',
        'd.occurred_at as occurredAt',
        'u.name as person',
        'c.from_status as from',
        'c.to_status as to',
        'c.reason',
      ])
      .orderBy('c.document_id', 'desc')
      .execute();
  }

  async batchesOf(handle: Kysely<DB>, lotId: number): Promise<LotBatchDto[]> {
    return handle
      .selectFrom('batch_issue as i')
      .innerJoin('batch_line as bl', 'bl.id', 'i.batch_line_id')
      .innerJoin('batch as b', 'b.id', 'bl.batch_id')
      .innerJoin('part as p', 'p.id', 'b.part_id')
      .where('i.lot_id', '=', lotId)
      .groupBy(['b.id', 'b.number', 'p.code'])
      .having(sql<string>`sum(i.quantity)`, '>', '0')
      .select(['b.number', 'p.code as part', sql<string>`sum(i.quantity)`.as('quantity')])
      .orderBy('b.id', 'desc')
      .execute();
  }

  private base(handle: Kysely<DB>) {
    return handle
      .selectFrom('lot as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .leftJoin('supplier as s', 's.id', 'l.supplier_id')
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('stock_balance as b')
            .innerJoin('bin', 'bin.id', 'b.bin_id')
            .whereRef('b.lot_id', '=', 'l.id')
            .where('b.quantity', '>', '0')
            .where('b.owner_customer_id', 'is', null)
            .select([
              sql<string>`coalesce(sum(b.quantity), 0)`.as('quantity'),
              sql<string[]>`coalesce(array_agg(bin.code order by bin.code), '{}')`.as('bins'),
            ])
            .as('lying'),
        (join) => join.onTrue(),
      );
  }

  private filtered(handle: Kysely<DB>, query: LotsQuery, expiresBefore: string) {
    let found = this.base(handle);
    if (query.status) found = found.where('l.status', '=', query.status);
    if (query.part) found = found.where('p.code', '=', query.part);
    if (query.supplier) found = found.where('s.code', '=', query.supplier);
    if (query.bin) found = found.where(sql<boolean>`${query.bin} = any(lying.bins)`);
    if (query.expiring) found = found.where('l.expires_on', '<=', expiresBefore);
    if (!query.used) found = found.where('lying.quantity', '>', '0');
    if (!query.q) return found;
    const pattern = containing(query.q);
    return found.where((where) =>
      where.or([
        sql<boolean>`(l.code || ' ' || coalesce(l.supplier_lot_code, '')) ilike ${pattern}`,
        where('p.code', 'ilike', pattern),
        where('p.name', 'ilike', pattern),
      ]),
    );
  }

  private withColumns(found: ReturnType<LotsRepository['base']>) {
    return found
      .select([
        'l.id',
        'l.code',
        'p.code as part',
        'p.name',
        'p.measure',
        'l.kind',
        'l.status',
        's.code as supplier',
        'l.supplier_lot_code as supplierLot',
        'l.received_on as receivedOn',
        'l.expires_on as expiresOn',
      ])
      .select((select) => [
        select.ref('lying.quantity').$notNull().as('quantity'),
        select.ref('lying.bins').$notNull().as('bins'),
      ]);
  }
}
