import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

/** Where something lies that may be packed, less what other open parcels hold of it. */
export interface PackableRow {
  readonly partId: number;
  readonly lotId: number;
  readonly lot: string;
  readonly binId: number;
  readonly bin: string;
  readonly quantity: string;
  readonly status: string;
  readonly quarantine: boolean;
  readonly expired: boolean;
  readonly lotKind: string;
}

export interface ScannedUnit {
  readonly id: number;
  readonly serial: string;
  readonly partId: number;
  readonly part: string;
  readonly lotId: number | null;
  readonly scrapped: boolean;
  readonly sound: boolean;
  /** The open parcel that it lies in. */
  readonly parcel: string | null;
}

/** What a scan means, and what lies where. */
@Injectable()
export class PackingLookupRepository {
  async unit(handle: Kysely<DB>, code: string, pageToken: string | null): Promise<ScannedUnit | undefined> {
    return handle
      .selectFrom('unit as u')
      .innerJoin('part as p', 'p.id', 'u.part_id')
      .select([
        'u.id',
        'u.serial',
        'u.part_id as partId',
        'p.code as part',
        'u.lot_id as lotId',
        sql<boolean>`u.scrapped_at is not null`.as('scrapped'),
        sql<boolean>`unit_is_sound(u.id)`.as('sound'),
        sql<string | null>`(select s.number from packed_item i join shipment s on s.id = i.shipment_id
                            where i.unit_id = u.id and i.taken_out_at is null and i.returned_at is null limit 1)`.as(
          'parcel',
        ),
      ])
      .where((where) => (pageToken === null ? where('u.serial', '=', code) : where('u.page_token', '=', pageToken)))
      .executeTakeFirst();
  }

  async lot(handle: Kysely<DB>, code: string) {
    return handle
      .selectFrom('lot as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .select(['l.id', 'l.code', 'l.part_id as partId', 'p.code as part', 'l.status'])
      .where('l.code', '=', code)
      .executeTakeFirst();
  }

  async part(handle: Kysely<DB>, code: string) {
    return handle.selectFrom('part').select(['id', 'code']).where('code', '=', code).executeTakeFirst();
  }

  async bin(handle: Kysely<DB>, code: string) {
    return handle.selectFrom('bin').select(['id', 'code', 'quarantine']).where('code', '=', code).executeTakeFirst();
  }

  /**
   * Everything that lies of some parts, oldest lots first. Where it may not be packed the row says why.
   *
   * @param today for lots that expire, in the shop's zone
   */
  async lying(handle: Kysely<DB>, partIds: readonly number[], today: string): Promise<PackableRow[]> {
    if (partIds.length === 0) return [];
    const { rows } = await sql<PackableRow>`
      select b.part_id as "partId", b.lot_id as "lotId", l.code as lot, b.bin_id as "binId", bin.code as bin,
             (b.quantity - coalesce(held.quantity, 0))::text as quantity, l.status, bin.quarantine,
             coalesce(l.expires_on < ${today}, false) as expired, l.kind as "lotKind"
      from stock_balance b
      join lot l on l.id = b.lot_id
      join bin on bin.id = b.bin_id
      left join lateral (
        select sum(i.quantity) as quantity
        from packed_item i join shipment s on s.id = i.shipment_id and s.status in ('packing', 'packed')
        where i.lot_id = b.lot_id and i.bin_id = b.bin_id and i.taken_out_at is null
      ) held on true
      where b.part_id = any(${[...partIds]}::bigint[]) and b.owner_customer_id is null and b.quantity > 0
      order by l.expires_on nulls last, l.received_on nulls last, l.id, bin.code
    `.execute(handle);
    return rows;
  }

  /** Held by claims on the shelf that have not ended. */
  async claimed(handle: Kysely<DB>, demandId: number): Promise<string> {
    const row = await handle
      .selectFrom('reservation')
      .select(sql<string>`coalesce(sum(quantity), 0)`.as('claimed'))
      .where('demand_id', '=', demandId)
      .where('supply', '=', 'shelf')
      .where('ended_at', 'is', null)
      .executeTakeFirstOrThrow();
    return row.claimed;
  }
}
