import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type {
  BillListItemDto,
  BillListQuery,
  ComponentDto,
  ComponentQuery,
  RevisionSummaryDto,
} from './bill-views.dto.js';
import type { RevisionStatus } from './bill-revision.js';
import { without } from './without.js';

/** Lists of bills and of parts, and the revisions of one bill. */
@Injectable()
export class BillListsRepository {
  async page(handle: Kysely<DB>, query: BillListQuery): Promise<Page<BillListItemDto>> {
    let rows = handle
      .selectFrom('part')
      .leftJoin('bill_revision as released', (join) =>
        join.onRef('released.part_id', '=', 'part.id').on('released.status', '=', 'released'),
      )
      .leftJoin('bill_revision as draft', (join) =>
        join.onRef('draft.part_id', '=', 'part.id').on('draft.status', '=', 'draft'),
      )
      .where((where) => where.or([where('released.id', 'is not', null), where('draft.id', 'is not', null)]));
    if (query.q) {
      rows = rows.where(sql<boolean>`part.code || ' ' || part.name ilike ${containing(query.q)}`);
    }
    if (query.state === 'draft' || query.state === 'unreleased') rows = rows.where('draft.id', 'is not', null);
    if (query.state === 'unreleased') rows = rows.where('released.id', 'is', null);
    if (query.state === 'released') rows = rows.where('released.id', 'is not', null);
    const shown = sql`coalesce(released.id, draft.id)`;
    const items = rows.select([
      'part.id',
      'part.code',
      'part.name',
      'part.traced',
      'part.measure',
      sql<boolean>`part.retired_on is not null`.as('retired'),
      'released.number as released',
      'released.released_at as releasedAt',
      'draft.number as draft',
      'draft.version as draftVersion',
      'draft.created_at as draftedAt',
      sql<number>`(select count(*) from bill_line l where l.revision_id = ${shown})`.as('lines'),
      sql<string>`(select trim_scale(coalesce(sum(s.minutes), 0))::text from build_step s where s.revision_id = ${shown})`.as(
        'minutes',
      ),
      sql<number>`(
        select count(distinct r.id) from bill_line l join bill_revision r on r.id = l.revision_id
        where l.part_id = part.id and r.status = 'released'
      )`.as('usedIn'),
    ]);
    const sortable = {
      code: 'part.code',
      name: 'part.name',
      traced: 'part.traced',
      released: 'released.number',
      releasedAt: 'released.released_at',
      draft: 'draft.number',
      lines: sql.ref('lines'),
      minutes: sql`(select coalesce(sum(s.minutes), 0) from build_step s where s.revision_id = ${shown})`,
      usedIn: sql.ref('usedIn'),
    };
    const page = paged(sorted(items, query.sort, sortable, 'code', 'part.id'), query);
    const found = await page.execute();
    return { items: found.map((item) => without(item, 'id')), total: await countOf(rows) };
  }

  async revisions(handle: Kysely<DB>, partId: number): Promise<RevisionSummaryDto[]> {
    const rows = await handle
      .selectFrom('bill_revision as r')
      .leftJoin('app_user as maker', 'maker.id', 'r.created_by')
      .leftJoin('app_user as releaser', 'releaser.id', 'r.released_by')
      .select([
        'r.number',
        'r.status',
        'r.version',
        'r.note',
        'r.created_at as createdAt',
        'maker.name as createdBy',
        'r.released_at as releasedAt',
        'releaser.name as releasedBy',
        'r.superseded_at as supersededAt',
        sql<number>`(select count(*) from bill_line l where l.revision_id = r.id)`.as('lines'),
      ])
      .where('r.part_id', '=', partId)
      .orderBy('r.number', 'desc')
      .execute();
    return rows.map((row) => ({ ...row, status: row.status as RevisionStatus }));
  }

  async usedIn(handle: Kysely<DB>, partId: number): Promise<number> {
    const row = await handle
      .selectFrom('bill_line as l')
      .innerJoin('bill_revision as r', 'r.id', 'l.revision_id')
      .select(sql<number>`count(distinct r.id)`.as('bills'))
      .where('l.part_id', '=', partId)
      .where('r.status', '=', 'released')
      .executeTakeFirstOrThrow();
    return row.bills;
  }

  /** Parts to choose from: an exact code first, then codes that begin with the words. */
  async components(handle: Kysely<DB>, query: ComponentQuery): Promise<Page<ComponentDto>> {
    const words = query.q ?? '';
    const rows = handle
      .selectFrom('part')
      .where(sql<boolean>`part.code || ' ' || part.name ilike ${containing(words)}`)
      .where('retired_on', 'is', null);
    const items = await paged(
      rows
        .select(['code', 'name', 'measure', 'traced', sql<boolean>`false`.as('retired')])
        .select(sql<string | null>`trim_scale(unit_weight_g)::text`.as('unitWeightG'))
        .select(
          sql<boolean>`exists (select 1 from bill_revision r where r.part_id = part.id and r.status = 'released')`.as(
            'made',
          ),
        )
        .orderBy(sql`part.code = upper(${words})`, 'desc')
        .orderBy(sql`starts_with(part.code, upper(${words}))`, 'desc')
        .orderBy('code'),
      query,
    ).execute();
    return { items, total: await countOf(rows) };
  }
}
