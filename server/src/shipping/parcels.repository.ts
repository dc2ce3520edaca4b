import { Injectable } from '@nestjs/common';
import type { DB, JsonValue, Shipment } from '@emberlot/db/database.types';
import { sql, type Kysely, type Selectable, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted } from '../platform/paging/page.js';
import type { ParcelsQuery } from './parcel.dto.js';

export type ParcelRow = Selectable<Shipment>;

export interface ParcelNeedRow {
  readonly id: number;
  readonly demandId: number;
  readonly title: string;
  readonly form: string;
  readonly bag: string | null;
  readonly partId: number;
  readonly part: string;
  readonly partName: string;
  readonly measure: string;
  readonly traced: string;
  readonly quantity: string;
  readonly packed: string;
}

export interface PackedItemRow {
  readonly id: number;
  readonly needId: number;
  readonly partId: number;
  readonly part: string;
  readonly lotId: number;
  readonly lot: string;
  readonly binId: number;
  readonly bin: string;
  readonly unitId: number | null;
  readonly serial: string | null;
  readonly quantity: string;
  readonly packedAt: Date;
}

const sortColumns = {
  openedAt: 's.opened_at',
  shippedAt: 's.shipped_at',
  promisedOn: 'o.promised_on',
  number: 's.number',
  order: 'o.number',
};

@Injectable()
export class ParcelsRepository {
  async insert(
    trx: Transaction<DB>,
    parcel: { number: string; orderId: number; openedAt: Date; openedBy: number },
  ): Promise<number> {
    const { id } = await trx
      .insertInto('shipment')
      .values({
        number: parcel.number,
        order_id: parcel.orderId,
        opened_at: parcel.openedAt,
        opened_by: parcel.openedBy,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async find(handle: Kysely<DB>, number: string): Promise<ParcelRow | undefined> {
    return handle.selectFrom('shipment').selectAll().where('number', '=', number).executeTakeFirst();
  }

  /** After the order's lock. */
  async lock(trx: Transaction<DB>, id: number): Promise<ParcelRow> {
    return trx.selectFrom('shipment').selectAll().where('id', '=', id).forUpdate().executeTakeFirstOrThrow();
  }

  async openOf(handle: Kysely<DB>, orderId: number): Promise<ParcelRow | undefined> {
    return handle
      .selectFrom('shipment')
      .selectAll()
      .where('order_id', '=', orderId)
      .where('status', 'in', ['packing', 'packed'])
      .executeTakeFirst();
  }

  /** @returns whether the state was still the expected one */
  async advance(
    trx: Transaction<DB>,
    id: number,
    expected: string,
    change: {
      readonly status?: string;
      readonly packed_at?: Date | null;
      readonly shipped_at?: Date;
      readonly shipped_by?: number;
      readonly carrier?: string;
      readonly tracking_code?: string | null;
      readonly weight_g?: number;
      readonly lithium?: JsonValue;
      readonly document_id?: number;
    },
  ): Promise<boolean> {
    const { lithium, ...columns } = change;
    const result = await trx
      .updateTable('shipment')
      .set((set) => ({
        ...columns,
        ...(lithium === undefined ? {} : { lithium: JSON.stringify(lithium) }),
        version: set('version', '+', 1),
      }))
      .where('id', '=', id)
      .where('status', '=', expected)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  async needs(handle: Kysely<DB>, orderId: number, parcelId: number): Promise<ParcelNeedRow[]> {
    return handle
      .selectFrom('order_line_need as n')
      .innerJoin('order_line as l', 'l.id', 'n.order_line_id')
      .innerJoin('part as p', 'p.id', 'n.part_id')
      .select([
        'n.id',
        'n.demand_id as demandId',
        'l.title',
        'l.form',
        'n.bag',
        'n.part_id as partId',
        'p.code as part',
        'p.name as partName',
        'p.measure',
        'p.traced',
        'n.quantity',
        sql<string>`(select coalesce(sum(i.quantity), 0) from packed_item i
                     where i.order_line_need_id = n.id and i.shipment_id = ${parcelId} and i.taken_out_at is null)`.as(
          'packed',
        ),
      ])
      .where('l.order_id', '=', orderId)
      .orderBy('l.position')
      .orderBy('n.bag')
      .orderBy('n.id')
      .execute();
  }

  async items(handle: Kysely<DB>, parcelId: number): Promise<PackedItemRow[]> {
    return handle
      .selectFrom('packed_item as i')
      .innerJoin('part as p', 'p.id', 'i.part_id')
      .innerJoin('lot', 'lot.id', 'i.lot_id')
      .innerJoin('bin', 'bin.id', 'i.bin_id')
      .leftJoin('unit', 'unit.id', 'i.unit_id')
      .select([
        'i.id',
        'i.order_line_need_id as needId',
        'i.part_id as partId',
        'p.code as part',
        'i.lot_id as lotId',
        'lot.code as lot',
        'i.bin_id as binId',
        'bin.code as bin',
        'i.unit_id as unitId',
        'unit.serial',
        'i.quantity',
        'i.packed_at as packedAt',
      ])
      .where('i.shipment_id', '=', parcelId)
      .where('i.taken_out_at', 'is', null)
      .orderBy('i.id')
      .execute();
  }

  async insertItem(
    trx: Transaction<DB>,
    item: {
      parcelId: number;
      needId: number;
      partId: number;
      lotId: number;
      binId: number;
      unitId: number | null;
      quantity: string;
      packedAt: Date;
      packedBy: number;
    },
  ): Promise<void> {
    await trx
      .insertInto('packed_item')
      .values({
        shipment_id: item.parcelId,
        order_line_need_id: item.needId,
        part_id: item.partId,
        lot_id: item.lotId,
        bin_id: item.binId,
        unit_id: item.unitId,
        quantity: item.quantity,
        packed_at: item.packedAt,
        packed_by: item.packedBy,
      })
      .execute();
  }

  async takeOut(trx: Transaction<DB>, itemIds: readonly number[], at: Date): Promise<void> {
    if (itemIds.length === 0) return;
    await trx
      .updateTable('packed_item')
      .set({ taken_out_at: at })
      .where('id', 'in', [...itemIds])
      .where('taken_out_at', 'is', null)
      .execute();
  }

  /** Why an order may not be packed: read under its lock. */
  async standing(handle: Kysely<DB>, orderId: number) {
    const { rows } = await sql<{ paid: boolean; cancelled: boolean; shipped: boolean; review: string | null }>`
      select exists (select 1 from payment where order_id = ${orderId}) as paid,
             exists (select 1 from order_cancellation where order_id = ${orderId}) as cancelled,
             exists (select 1 from shipment where order_id = ${orderId} and status = 'shipped') as shipped,
             (select what from payment_review where order_id = ${orderId} and settled_at is null limit 1) as review
    `.execute(handle);
    const [row] = rows;
    if (!row) throw new Error('the standing of an order could not be read');
    return row;
  }

  async findPage(handle: Kysely<DB>, query: ParcelsQuery) {
    let found = handle.selectFrom('shipment as s').innerJoin('sales_order as o', 'o.id', 's.order_id');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where((where) =>
        where.or([
          where('s.number', 'ilike', pattern),
          where('o.number', 'ilike', pattern),
          where('o.recipient', 'ilike', pattern),
          where('s.tracking_code', 'ilike', pattern),
        ]),
      );
    }
    if (query.state) found = found.where('s.status', '=', query.state);
    const rows = found.select([
      's.id',
      's.number',
      'o.number as order',
      's.status as state',
      'o.recipient',
      'o.country_code as country',
      'o.promised_on as promisedOn',
      's.opened_at as openedAt',
      's.shipped_at as shippedAt',
      's.carrier',
      's.tracking_code as trackingCode',
    ]);
    const items = await paged(sorted(rows, query.sort, sortColumns, '-openedAt', 's.id'), query).execute();
    return { items, total: await countOf(found) };
  }
}
