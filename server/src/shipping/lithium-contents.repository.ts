import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

/** One kind of cell or battery in a parcel, and how it lies in it. */
export interface LithiumContentRow {
  readonly part: string;
  readonly kind: 'cell' | 'battery';
  readonly chemistry: 'lithium_ion' | 'lithium_metal';
  readonly wattHours: string | null;
  readonly lithiumGrams: string | null;
  readonly tested: boolean;
  readonly weightG: string | null;
  /** `contained`: in a tool or sub-assembly; `kit`: a part of a kit; `alone`: a spare. */
  readonly lies: 'contained' | 'kit' | 'alone';
  readonly count: string;
}

/**
 * Finds everything with lithium in a parcel: what was packed as it is, what is built into its units (by their record),
 * and what the bills of other made parts say. A battery ends the search: its cells travel as the battery.
 */
@Injectable()
export class LithiumContentsRepository {
  async ofParcel(handle: Kysely<DB>, parcelId: number): Promise<LithiumContentRow[]> {
    const { rows } = await sql<LithiumContentRow>`
      with recursive packed as (
        select i.part_id, i.unit_id, i.quantity, l.form
        from packed_item i
        join order_line_need n on n.id = i.order_line_need_id
        join order_line l on l.id = n.order_line_id
        where i.shipment_id = ${parcelId} and i.taken_out_at is null
      ),
      inside (part_id, quantity, lies, depth) as (
        select part_id, quantity, case when form = 'kit' then 'kit' else 'alone' end, 0
        from packed where unit_id is null
        union all
        select p.part_id, 1, case when p.form = 'kit' then 'kit' else 'alone' end, 0
        from packed p where p.unit_id is not null
          and exists (select 1 from part_battery b where b.part_id = p.part_id)
        union all
        select built.part_id, built.quantity, 'contained', 1
        from packed p
        cross join lateral (
          select a.part_id, max(a.quantity) as quantity from as_built a
          where a.unit_id = p.unit_id and a.removed_at is null group by a.batch_line_id, a.part_id
        ) built
        where p.unit_id is not null and not exists (select 1 from part_battery b where b.part_id = p.part_id)
        union all
        select line.part_id, inside.quantity * line.quantity_per, 'contained', inside.depth + 1
        from inside
        join bill_revision r on r.part_id = inside.part_id and r.status = 'released'
        join bill_line line on line.revision_id = r.id
        where inside.depth < 20 and not exists (select 1 from part_battery b where b.part_id = inside.part_id)
      )
      select p.code as part, b.kind, b.chemistry, b.watt_hours::text as "wattHours", b.lithium_grams::text as "lithiumGrams",
             b.transport_test_reference is not null and b.transport_test_passed_on is not null as tested,
             p.unit_weight_g::text as "weightG", inside.lies, sum(inside.quantity)::text as count
      from inside
      join part_battery b on b.part_id = inside.part_id
      join part p on p.id = inside.part_id
      group by p.code, b.part_id, p.unit_weight_g, inside.lies
      order by p.code, inside.lies
    `.execute(handle);
    return rows;
  }

  /** Parts that the parcel's tools and kits run with, to tell how many batteries they need. */
  async equipmentCount(handle: Kysely<DB>, parcelId: number): Promise<number> {
    const row = await handle
      .selectFrom('shipment as s')
      .innerJoin('order_line as l', 'l.order_id', 's.order_id')
      .select(sql<number>`coalesce(sum(l.quantity), 0)::int`.as('count'))
      .where('s.id', '=', parcelId)
      .where('l.form', 'in', ['tool', 'kit'])
      .executeTakeFirstOrThrow();
    return row.count;
  }
}
