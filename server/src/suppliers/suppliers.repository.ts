import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { SupplierDeliveryDto, SupplierItemDto, SuppliedPartDto, SuppliersQuery } from './supplier.dto.js';

export interface SupplierRow {
  readonly code: string;
  readonly name: string;
  readonly email: string | null;
  readonly phone: string | null;
  readonly countryCode: string | null;
  readonly currency: string;
  readonly leadTimeDays: number | null;
  readonly note: string | null;
}

export interface KnownSupplierRow extends SupplierRow {
  readonly id: number;
  readonly version: number;
}

const sortColumns = {
  code: 's.code',
  name: 's.name',
  lastReceivedOn: sql`last_received_on`,
  partCount: sql`part_count`,
};

@Injectable()
export class SuppliersRepository {
  async findPage(handle: Kysely<DB>, query: SuppliersQuery): Promise<Page<SupplierItemDto>> {
    let found = handle.selectFrom('supplier as s');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) => where.or([where('s.code', 'ilike', pattern), where('s.name', 'ilike', pattern)]));
    }
    const columns = found.select((select) => [
      's.id',
      's.code',
      's.name',
      's.country_code as countryCode',
      's.lead_time_days as leadTimeDays',
      select
        .selectFrom('part_supplier as ps')
        .whereRef('ps.supplier_id', '=', 's.id')
        .select(sql<number>`count(*)`.as('n'))
        .as('part_count'),
      select
        .selectFrom('receipt as r')
        .whereRef('r.supplier_id', '=', 's.id')
        .select(sql<string | null>`max(r.received_on)`.as('d'))
        .as('last_received_on'),
    ]);
    const rows = await paged(sorted(columns, query.sort, sortColumns, 'code', 's.id'), query).execute();
    const items = rows.map(({ part_count, last_received_on, ...row }) => ({
      ...row,
      partCount: part_count ?? 0,
      lastReceivedOn: last_received_on,
    }));
    return { items, total: await countOf(found) };
  }

  async findByCode(handle: Kysely<DB>, code: string): Promise<KnownSupplierRow | undefined> {
    return handle
      .selectFrom('supplier')
      .select([
        'id',
        'code',
        'name',
        'email',
        'phone',
        'country_code as countryCode',
        'currency',
        'lead_time_days as leadTimeDays',
        'note',
        'version',
      ])
      .where('code', '=', code)
      .executeTakeFirst();
  }

  async partsOf(handle: Kysely<DB>, supplierId: number): Promise<SuppliedPartDto[]> {
    return handle
      .selectFrom('part_supplier as ps')
      .innerJoin('part as p', 'p.id', 'ps.part_id')
      .select([
        'p.code',
        'p.name',
        'ps.supplier_part_code as supplierPartCode',
        'ps.lead_time_days as leadTimeDays',
        'ps.preferred',
      ])
      .where('ps.supplier_id', '=', supplierId)
      .orderBy('p.code')
      .limit(500)
      .execute();
  }

  async deliveriesOf(handle: Kysely<DB>, supplierId: number): Promise<SupplierDeliveryDto[]> {
    return handle
      .selectFrom('receipt as r')
      .innerJoin('document as d', 'd.id', 'r.document_id')
      .select([
        'd.number',
        'r.received_on as receivedOn',
        'r.delivery_note as deliveryNote',
        sql<number>`(select count(distinct m.lot_id) from stock_move m where m.document_id = d.id)`.as('lotCount'),
      ])
      .where('r.supplier_id', '=', supplierId)
      .orderBy('r.received_on', 'desc')
      .orderBy('d.id', 'desc')
      .limit(50)
      .execute();
  }

  async insert(trx: Transaction<DB>, row: SupplierRow, createdAt: Date): Promise<number> {
    const { id } = await trx
      .insertInto('supplier')
      .values({ ...columnsOf(row), created_at: createdAt })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async idsByCode(handle: Kysely<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, number>> {
    const rows = await handle
      .selectFrom('supplier')
      .select(['id', 'code'])
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .execute();
    return new Map(rows.map(({ code, id }) => [code, id]));
  }

  async insertMany(
    trx: Transaction<DB>,
    codes: readonly string[],
    currency: string,
    createdAt: Date,
  ): Promise<ReadonlyMap<string, number>> {
    const { rows } = await sql<{ id: number; code: string }>`
      insert into supplier (code, name, currency, created_at)
      select code, code, ${currency}, ${createdAt} from unnest(${[...codes]}::text[]) as added (code)
      returning id, code`.execute(trx);
    return new Map(rows.map(({ code, id }) => [code, id]));
  }

  /** @returns false when somebody else saved a newer version */
  async update(trx: Transaction<DB>, id: number, version: number, row: SupplierRow): Promise<boolean> {
    const result = await trx
      .updateTable('supplier')
      .set({ ...columnsOf(row), version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }
}

function columnsOf(row: SupplierRow) {
  return {
    code: row.code,
    name: row.name,
    email: row.email,
    phone: row.phone,
    country_code: row.countryCode,
    currency: row.currency,
    lead_time_days: row.leadTimeDays,
    note: row.note,
  };
}
