import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';

@Injectable()
export class ListingDetailsRepository {
  /** What a kit's bags hold. */
  async contents(
    handle: Kysely<DB>,
    kitPartId: number,
  ): Promise<{ bag: string; name: string; quantity: string; measure: string }[]> {
    return handle
      .selectFrom('contents_line as c')
      .innerJoin('part as p', 'p.id', 'c.part_id')
      .select(['c.bag', 'p.name', sql<string>`trim_scale(c.quantity)::text`.as('quantity'), 'p.measure'])
      .where('c.kit_part_id', '=', kitPartId)
      .orderBy('c.position')
      .execute();
  }

  /** The numbered positions of a drawing: the marks on the released bill of the tool. */
  async positions(handle: Kysely<DB>, partIds: readonly number[]): Promise<{ mark: string; name: string }[]> {
    const rows = await handle
      .selectFrom('bill_revision as r')
      .innerJoin('bill_line as l', 'l.revision_id', 'r.id')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .select(['l.marks', 'p.name'])
      .where('r.part_id', 'in', [...partIds])
      .where('r.status', '=', 'released')
      .where('l.marks', 'is not', null)
      .orderBy('l.position')
      .execute();
    return rows
      .flatMap(({ marks, name }) => (marks ?? '').split(/[\s,]+/).map((mark) => ({ mark, name })))
      .filter(({ mark }) => /^\d{1,2}$/.test(mark))
      .sort((a, b) => Number(a.mark) - Number(b.mark));
  }
}
