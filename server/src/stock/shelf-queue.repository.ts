import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { runsShort, type ShelfMoment } from './part-list.repository.js';

interface QueuedLotRow {
  readonly lot: string;
  readonly part: string;
  readonly name: string;
  readonly measure: string;
  readonly quantity: string;
}

export interface HeldLotRow extends QueuedLotRow {
  readonly bins: string[];
  readonly receivedOn: string | null;
  readonly supplier: string | null;
}

export interface ExpiringLotRow extends QueuedLotRow {
  readonly expiresOn: string;
}

export interface ShortPartRow {
  readonly id: number;
  readonly part: string;
  readonly name: string;
  readonly measure: string;
  readonly reorderPoint: string | null;
  readonly supplier: string | null;
}

interface Counted<Row> {
  readonly rows: Row[];
  readonly count: number;
}

/** As many as a person looks through; the lists behind show all. */
const mostShown = 50;

@Injectable()
export class ShelfQueueRepository {
  /** Held lots of which something lies on the shelf, the longest waiting first. */
  async heldLots(handle: Kysely<DB>): Promise<Counted<HeldLotRow>> {
    const { rows } = await sql<HeldLotRow & { total: number }>`
      select l.code as lot, p.code as part, p.name, p.measure, sum(b.quantity)::text as quantity,
        array_agg(bin.code order by bin.code) as bins, l.received_on as "receivedOn", s.code as supplier,
        count(*) over () as total
      from lot l join part p on p.id = l.part_id
      join stock_balance b on b.lot_id = l.id and b.quantity > 0 and b.owner_customer_id is null
      join bin on bin.id = b.bin_id
      left join supplier s on s.id = l.supplier_id
      where l.status = 'held'
      group by l.id, p.id, s.id
      order by l.received_on nulls last, l.id
      limit ${mostShown}`.execute(handle);
    return counted(rows);
  }

  async expiringLots(handle: Kysely<DB>, until: string): Promise<Counted<ExpiringLotRow>> {
    const { rows } = await sql<ExpiringLotRow & { total: number }>`
      select l.code as lot, p.code as part, p.name, p.measure, sum(b.quantity)::text as quantity,
        l.expires_on as "expiresOn", count(*) over () as total
      from lot l join part p on p.id = l.part_id
      join stock_balance b on b.lot_id = l.id and b.quantity > 0 and b.owner_customer_id is null
      where l.expires_on <= ${until} and l.status <> 'rejected'
      group by l.id, p.id
      order by l.expires_on, l.id
      limit ${mostShown}`.execute(handle);
    return counted(rows);
  }

  async shortParts(handle: Kysely<DB>, moment: ShelfMoment): Promise<ShortPartRow[]> {
    return handle
      .selectFrom('part as p')
      .leftJoin('part_supplier as ps', (join) => join.onRef('ps.part_id', '=', 'p.id').on('ps.preferred', '=', true))
      .leftJoin('supplier as s', 's.id', 'ps.supplier_id')
      .where('p.retired_on', 'is', null)
      .where(runsShort(moment))
      .select([
        'p.id',
        'p.code as part',
        'p.name',
        'p.measure',
        'p.reorder_point as reorderPoint',
        's.code as supplier',
      ])
      .orderBy('p.code')
      .limit(200)
      .execute();
  }
}

function counted<Row>(rows: readonly (Row & { readonly total: number })[]): Counted<Row> {
  return { rows: rows.map(({ total: _total, ...row }) => row as Row), count: rows[0]?.total ?? 0 };
}
