import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import type { RevisionStatus } from './bill-revision.js';

export interface UseRow {
  readonly level: number;
  readonly path: string[];
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly retired: boolean;
  readonly revision: number;
  readonly status: RevisionStatus;
  readonly position: number;
  readonly quantityPer: string;
  readonly alternate: boolean;
  readonly top: boolean;
}

export interface KitUseRow {
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly retired: boolean;
  readonly through: string;
  readonly quantity: string;
  readonly bag: string;
}

/** Shared sub-assemblies multiply the ways up; more than this are not written out. */
const mostWays = 2_000;

/** Looks upward: what contains a part, at every level. */
@Injectable()
export class WhereUsedRepository {
  /** Every way up over released revisions and drafts, in the order of the ways. */
  async uses(handle: Kysely<DB>, partId: number): Promise<UseRow[]> {
    const { rows } = await sql<UseRow>`
      with recursive edge as (
        select r.id as revision_id, r.part_id as parent_id, l.position, l.quantity_per, l.part_id as component_id,
          false as alternate
        from bill_revision r join bill_line l on l.revision_id = r.id
        where r.status <> 'superseded'
        union all
        select r.id, r.part_id, l.position, l.quantity_per, a.part_id, true
        from bill_revision r
        join bill_line l on l.revision_id = r.id
        join bill_line_alternate a on a.line_id = l.id
        where r.status <> 'superseded'
      ), up as (
        select edge.*, 1 as level, array[component.code, parent.code] as path
        from edge
        join part component on component.id = edge.component_id
        join part parent on parent.id = edge.parent_id
        where edge.component_id = ${partId}
        union all
        select edge.*, up.level + 1, up.path || parent.code
        from up
        join edge on edge.component_id = up.parent_id
        join part parent on parent.id = edge.parent_id
      )
      select up.level, up.path, part.code, part.name, part.measure, part.traced,
        part.retired_on is not null as retired, r.number as revision, r.status, up.position,
        trim_scale(up.quantity_per)::text as "quantityPer", up.alternate,
        not exists (select 1 from edge above where above.component_id = up.parent_id) as top
      from (select * from up limit ${mostWays}) up
      join part on part.id = up.parent_id
      join bill_revision r on r.id = up.revision_id
      order by up.path, r.number desc, up.position
    `.execute(handle);
    return rows;
  }

  /** Kits in whose contents one of the parts lies. */
  async kits(handle: Kysely<DB>, codes: readonly string[]): Promise<KitUseRow[]> {
    return handle
      .selectFrom('contents_line as c')
      .innerJoin('part as kit', 'kit.id', 'c.kit_part_id')
      .innerJoin('part as inside', 'inside.id', 'c.part_id')
      .select(['kit.code', 'kit.name', 'kit.measure', 'kit.traced', 'inside.code as through', 'c.bag'])
      .select(sql<boolean>`kit.retired_on is not null`.as('retired'))
      .select(sql<string>`trim_scale(c.quantity)::text`.as('quantity'))
      .where('inside.code', 'in', [...codes])
      .orderBy('kit.code')
      .orderBy('c.bag')
      .orderBy('c.position')
      .execute();
  }
}
