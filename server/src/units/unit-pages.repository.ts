import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { UnitsQuery, UnitState } from './unit.dto.js';

export interface UnitItemRow {
  readonly id: number;
  readonly serial: string;
  readonly part: string;
  readonly partName: string;
  readonly revision: number;
  readonly batch: string;
  readonly batchSize: number;
  readonly place: number;
  readonly pageToken: string;
  readonly state: UnitState;
  readonly bin: string | null;
  readonly sound: boolean;
  readonly issuedAt: Date;
  readonly completedAt: Date | null;
  readonly scrappedAt: Date | null;
  readonly scrapReason: string | null;
}

const bin = sql<string | null>`(select bin.code from stock_balance s join bin on bin.id = s.bin_id
  where s.lot_id = u.lot_id and s.quantity > 0 limit 1)`;

const state = sql<UnitState>`case
  when u.scrapped_at is not null then 'scrapped'
  when u.completed_at is null then 'under_way'
  when exists (select 1 from stock_balance s where s.lot_id = u.lot_id and s.quantity > 0) then 'on_shelf'
  else 'gone' end`;

const sortColumns = {
  serial: 'u.serial',
  issuedAt: 'u.serial_issued_at',
  completedAt: 'u.completed_at',
  part: 'p.code',
};

/** Units as pages and lists show them. */
@Injectable()
export class UnitPagesRepository {
  async page(handle: Kysely<DB>, query: UnitsQuery): Promise<Page<UnitItemRow>> {
    let rows = this.items(handle);
    if (query.q) rows = rows.where(sql<boolean>`u.serial || ' ' || p.name ilike ${containing(query.q)}`);
    if (query.part) rows = rows.where('p.code', '=', query.part);
    if (query.batch) rows = rows.where('b.number', '=', query.batch);
    if (query.state) rows = rows.where(state, '=', query.state);
    const items = await paged(sorted(rows, query.sort, sortColumns, '-issuedAt', 'u.id'), query).execute();
    return { items, total: await countOf(rows) };
  }

  async find(handle: Kysely<DB>, serial: string): Promise<UnitItemRow | undefined> {
    return this.items(handle).where('u.serial', '=', serial).executeTakeFirst();
  }

  async findByToken(handle: Kysely<DB>, token: string): Promise<UnitItemRow | undefined> {
    return this.items(handle).where('u.page_token', '=', token).executeTakeFirst();
  }

  /** In the order of their places. */
  async ofBatch(handle: Kysely<DB>, batch: string): Promise<UnitItemRow[]> {
    return this.items(handle).where('b.number', '=', batch).orderBy('u.place').execute();
  }

  async steps(handle: Kysely<DB>, unitId: number) {
    return handle
      .selectFrom('unit as u')
      .innerJoin('batch_step as s', 's.batch_id', 'u.batch_id')
      .innerJoin('build_step as b', 'b.id', 's.build_step_id')
      .leftJoin('unit_step as d', (join) => join.onRef('d.unit_id', '=', 'u.id').onRef('d.batch_step_id', '=', 's.id'))
      .leftJoin('app_user as a', 'a.id', 'd.done_by')
      .where('u.id', '=', unitId)
      .select(['s.position', 'b.title', 'b.caution', 'd.done_at as doneAt', 'a.name as doneBy'])
      .orderBy('s.position')
      .execute();
  }

  async asBuilt(handle: Kysely<DB>, unitId: number) {
    return handle
      .selectFrom('as_built as a')
      .innerJoin('batch_line as l', 'l.id', 'a.batch_line_id')
      .innerJoin('part as p', 'p.id', 'a.part_id')
      .innerJoin('lot', 'lot.id', 'a.lot_id')
      .leftJoin('supplier as v', 'v.id', 'lot.supplier_id')
      .where('a.unit_id', '=', unitId)
      .where('a.removed_at', 'is', null)
      .select([
        'l.path',
        'p.code as part',
        'p.name as partName',
        'p.measure',
        sql<string | null>`case when lot.kind <> 'standing' then lot.code end`.as('lot'),
        sql<string>`trim_scale(a.quantity)::text`.as('quantity'),
        'a.exact',
        'v.name as supplier',
        'a.fitted_at as fittedAt',
      ])
      .orderBy('l.id')
      .orderBy('a.id')
      .execute();
  }

  async rework(handle: Kysely<DB>, unitId: number) {
    return handle
      .selectFrom('rework as w')
      .leftJoin('app_user as a', 'a.id', 'w.done_by')
      .where('w.unit_id', '=', unitId)
      .select([
        'w.what',
        sql<string>`trim_scale(w.minutes)::text`.as('minutes'),
        'w.done_at as doneAt',
        'a.name as doneBy',
      ])
      .orderBy('w.id')
      .execute();
  }

  /** When it last left the shop in a parcel. */
  async leftAt(handle: Kysely<DB>, unitId: number): Promise<Date | undefined> {
    const row = await handle
      .selectFrom('packed_item as i')
      .innerJoin('shipment as s', 's.id', 'i.shipment_id')
      .where('i.unit_id', '=', unitId)
      .where('i.taken_out_at', 'is', null)
      .where('s.shipped_at', 'is not', null)
      .select('s.shipped_at as shippedAt')
      .orderBy('s.shipped_at', 'desc')
      .limit(1)
      .executeTakeFirst();
    return row?.shippedAt ?? undefined;
  }

  /** What the storefront warns of for a part. */
  async cautions(handle: Kysely<DB>, part: string): Promise<string[]> {
    const row = await handle
      .selectFrom('listing as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .where('p.code', '=', part)
      .select('l.cautions')
      .executeTakeFirst();
    return row?.cautions ?? [];
  }

  private items(handle: Kysely<DB>) {
    return handle
      .selectFrom('unit as u')
      .innerJoin('part as p', 'p.id', 'u.part_id')
      .innerJoin('bill_revision as r', 'r.id', 'u.revision_id')
      .innerJoin('batch as b', 'b.id', 'u.batch_id')
      .select([
        'u.id',
        'u.serial',
        'p.code as part',
        'p.name as partName',
        'r.number as revision',
        'b.number as batch',
        'b.quantity as batchSize',
        'u.place',
        'u.page_token as pageToken',
        state.as('state'),
        bin.as('bin'),
        sql<boolean>`unit_is_sound(u.id)`.as('sound'),
        'u.serial_issued_at as issuedAt',
        'u.completed_at as completedAt',
        'u.scrapped_at as scrappedAt',
        'u.scrap_reason as scrapReason',
      ]);
  }
}
