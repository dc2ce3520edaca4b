import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { KitListItemDto, KitListQuery } from './contents.dto.js';

export interface ContentsRow {
  readonly position: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly retired: boolean;
  readonly quantity: string;
  readonly bag: string;
  readonly unitWeightG: string | null;
  readonly made: boolean;
}

export interface NewContentsRow {
  readonly partId: number;
  readonly quantity: string;
  readonly bag: string;
}

/** The contents lists of kits. */
@Injectable()
export class ContentsRepository {
  /** How often the list was saved; 0 for none. */
  async version(handle: Kysely<DB>, kitPartId: number): Promise<number> {
    const row = await handle
      .selectFrom('contents_list')
      .select('version')
      .where('kit_part_id', '=', kitPartId)
      .executeTakeFirst();
    return row?.version ?? 0;
  }

  async lines(handle: Kysely<DB>, kitPartId: number): Promise<ContentsRow[]> {
    return handle
      .selectFrom('contents_line as c')
      .innerJoin('part', 'part.id', 'c.part_id')
      .select(['c.position', 'part.code', 'part.name', 'part.measure', 'part.traced', 'c.bag'])
      .select(sql<boolean>`part.retired_on is not null`.as('retired'))
      .select(sql<string>`trim_scale(c.quantity)::text`.as('quantity'))
      .select(sql<string | null>`trim_scale(part.unit_weight_g)::text`.as('unitWeightG'))
      .select(
        sql<boolean>`exists (select 1 from bill_revision r where r.part_id = part.id and r.status = 'released')`.as(
          'made',
        ),
      )
      .where('c.kit_part_id', '=', kitPartId)
      .orderBy('c.position')
      .execute();
  }

  /** Which of the parts are packed as kits themselves. */
  async kitsAmong(handle: Kysely<DB>, partIds: readonly number[]): Promise<ReadonlySet<number>> {
    if (partIds.length === 0) return new Set();
    const rows = await handle
      .selectFrom('contents_line')
      .select('kit_part_id')
      .distinct()
      .where('kit_part_id', 'in', [...partIds])
      .execute();
    return new Set(rows.map((row) => row.kit_part_id));
  }

  /** The code of a kit that the part lies in, if it does. */
  async findKitWith(handle: Kysely<DB>, partId: number): Promise<string | undefined> {
    const row = await handle
      .selectFrom('contents_line as c')
      .innerJoin('part', 'part.id', 'c.kit_part_id')
      .select('part.code')
      .where('c.part_id', '=', partId)
      .orderBy('part.code')
      .executeTakeFirst();
    return row?.code;
  }

  async replace(
    trx: Transaction<DB>,
    kitPartId: number,
    lines: readonly NewContentsRow[],
    saved: { readonly at: Date; readonly by: number },
  ): Promise<void> {
    await trx
      .insertInto('contents_list')
      .values({ kit_part_id: kitPartId, saved_at: saved.at, saved_by: saved.by })
      .onConflict((conflict) =>
        conflict.column('kit_part_id').doUpdateSet((build) => ({
          version: build('contents_list.version', '+', 1),
          saved_at: saved.at,
          saved_by: saved.by,
        })),
      )
      .execute();
    await trx.deleteFrom('contents_line').where('kit_part_id', '=', kitPartId).execute();
    if (lines.length === 0) return;
    await trx
      .insertInto('contents_line')
      .values(
        lines.map(({ partId, quantity, bag }, index) => ({
          kit_part_id: kitPartId,
          position: index + 1,
          part_id: partId,
          quantity,
          bag,
        })),
      )
      .execute();
  }

  async page(handle: Kysely<DB>, query: KitListQuery): Promise<Page<KitListItemDto>> {
    let rows = handle.selectFrom('part').innerJoinLateral(
      (from) =>
        from
          .selectFrom('contents_line as c')
          .innerJoin('part as inside', 'inside.id', 'c.part_id')
          .whereRef('c.kit_part_id', '=', 'part.id')
          .select([
            sql<number>`count(*)`.as('lines'),
            sql<number>`count(distinct c.bag)`.as('bags'),
            sql<string>`trim_scale(coalesce(sum(c.quantity * inside.unit_weight_g), 0))::text`.as('weightG'),
            sql<number>`count(*) filter (where inside.unit_weight_g is null)`.as('unweighed'),
          ])
          .as('contents'),
      (join) => join.on(sql<boolean>`contents.lines > 0`),
    );
    if (query.q) rows = rows.where(sql<boolean>`part.code || ' ' || part.name ilike ${containing(query.q)}`);
    const columns = { code: 'part.code', name: 'part.name', lines: 'contents.lines', bags: 'contents.bags' } as const;
    const items = rows
      .select(['part.code', 'part.name', 'contents.lines', 'contents.bags', 'contents.weightG', 'contents.unweighed'])
      .select(sql<boolean>`part.retired_on is not null`.as('retired'));
    const found = await paged(sorted(items, query.sort, columns, 'code', 'part.id'), query).execute();
    return { items: found, total: await countOf(rows) };
  }
}
