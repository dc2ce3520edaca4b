import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import type { Plain } from '../platform/api/plain.js';
import type { PartPlaceDto, PartUseDto } from './part-story.dto.js';

export interface ClaimRow {
  readonly reference: string;
  readonly kind: string;
  readonly neededOn: string | null;
  readonly needed: string;
  readonly claimed: string;
  readonly awaited: string;
}

@Injectable()
export class PartStoryRepository {
  async placesOf(handle: Kysely<DB>, partId: number): Promise<Omit<Plain<PartPlaceDto>, 'expired'>[]> {
    return handle
      .selectFrom('stock_balance as s')
      .innerJoin('lot as l', 'l.id', 's.lot_id')
      .innerJoin('bin as b', 'b.id', 's.bin_id')
      .leftJoin('supplier as v', 'v.id', 'l.supplier_id')
      .where('s.part_id', '=', partId)
      .where('s.quantity', '>', '0')
      .where('s.owner_customer_id', 'is', null)
      .select([
        'b.code as bin',
        'b.quarantine',
        'l.code as lot',
        'l.kind',
        'l.status',
        'v.code as supplier',
        'l.supplier_lot_code as supplierLot',
        'l.received_on as receivedOn',
        'l.expires_on as expiresOn',
        's.quantity',
      ])
      .orderBy('l.id')
      .orderBy('b.code')
      .limit(500)
      .execute();
  }

  /** Needs that are not met, with what they hold. */
  async claimsOf(handle: Kysely<DB>, partId: number, at: Date): Promise<ClaimRow[]> {
    const live = sql`r.ended_at is null and (r.expires_at is null or r.expires_at > ${at})`;
    return handle
      .selectFrom('demand as d')
      .where('d.part_id', '=', partId)
      .where('d.closed_at', 'is', null)
      .leftJoinLateral(
        (from) =>
          from
            .selectFrom('reservation as r')
            .whereRef('r.demand_id', '=', 'd.id')
            .select([
              sql<string>`coalesce(sum(r.quantity) filter (where r.supply = 'shelf' and ${live}), 0)`.as('claimed'),
              sql<string>`coalesce(sum(r.quantity) filter (where r.supply = 'batch' and ${live}), 0)`.as('awaited'),
            ])
            .as('holds'),
        (join) => join.onTrue(),
      )
      .select([
        'd.reference',
        'd.kind',
        'd.needed_on as neededOn',
        sql<string>`greatest(d.quantity - d.taken, 0)`.as('needed'),
      ])
      .select((select) => [
        select.ref('holds.claimed').$notNull().as('claimed'),
        select.ref('holds.awaited').$notNull().as('awaited'),
      ])
      .orderBy('d.needed_on')
      .orderBy('d.id')
      .limit(200)
      .execute();
  }

  async usesOf(handle: Kysely<DB>, partId: number): Promise<Plain<PartUseDto>[]> {
    const { rows } = await sql<Plain<PartUseDto>>`
      select p.code as part, p.name, r.number as revision, r.status, l.quantity_per::text as quantity,
        'component' as role
      from bill_line l join bill_revision r on r.id = l.revision_id and r.status <> 'superseded'
      join part p on p.id = r.part_id
      where l.part_id = ${partId}
      union all
      select p.code, p.name, r.number, r.status, l.quantity_per::text, 'alternate'
      from bill_line_alternate a join bill_line l on l.id = a.line_id
      join bill_revision r on r.id = l.revision_id and r.status <> 'superseded'
      join part p on p.id = r.part_id
      where a.part_id = ${partId}
      union all
      select p.code, p.name, null, null, c.quantity::text, 'contents'
      from contents_line c join part p on p.id = c.kit_part_id
      where c.part_id = ${partId}
      order by 1, 3`.execute(handle);
    return rows;
  }
}
