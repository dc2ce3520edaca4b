import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import type { CheckedContent, CheckedLine } from './bill-content.js';

/** One component of a bill in force or in draft: its part, and what it may contain. */
export interface BillEdge {
  readonly parent: string;
  readonly component: string;
}

/** Writes revisions: drafts whole, statuses forward. */
@Injectable()
export class BillContentRepository {
  /** Bills are edited one at a time, so that two edits cannot close a loop between them; triggers take the same lock. */
  async lockAll(trx: Transaction<DB>): Promise<void> {
    await sql`select pg_advisory_xact_lock(hashtext('bill graph'))`.execute(trx);
  }

  /** What the parts contain, at any depth, over drafts and released revisions, lines and alternates alike. */
  async edgesBelow(trx: Transaction<DB>, partIds: readonly number[], exceptRevisionId: number): Promise<BillEdge[]> {
    const { rows } = await sql<BillEdge>`
      with recursive edge (parent_id, component_id) as (
        select r.part_id, component.part_id
        from bill_revision r
        join bill_line l on l.revision_id = r.id
        cross join lateral (
          select l.part_id union all select a.part_id from bill_line_alternate a where a.line_id = l.id
        ) component
        where r.status <> 'superseded' and r.id <> ${exceptRevisionId}
      ), below (part_id) as (
        select unnest(${sql.val([...partIds])}::bigint[])
        union
        select edge.component_id from below join edge on edge.parent_id = below.part_id
      )
      select distinct parent.code as parent, component.code as component
      from below
      join edge on edge.parent_id = below.part_id
      join part parent on parent.id = edge.parent_id
      join part component on component.id = edge.component_id
    `.execute(trx);
    return rows;
  }

  /** What contains what, leaving out the drafts of these parts, which are to hold something else. */
  async edgesOutside(handle: Kysely<DB>, codes: readonly string[]): Promise<BillEdge[]> {
    const { rows } = await sql<BillEdge>`
      select distinct parent.code as parent, component.code as component
      from bill_revision r
      join part parent on parent.id = r.part_id
      join bill_line l on l.revision_id = r.id
      cross join lateral (
        select l.part_id union all select a.part_id from bill_line_alternate a where a.line_id = l.id
      ) inside
      join part component on component.id = inside.part_id
      where r.status = 'released' or (r.status = 'draft' and parent.code <> all(${sql.val([...codes])}::text[]))
    `.execute(handle);
    return rows;
  }

  async insertDraft(
    trx: Transaction<DB>,
    draft: { readonly partId: number; readonly note: string | null; readonly by: number; readonly at: Date },
  ): Promise<{ id: number; number: number }> {
    return trx
      .insertInto('bill_revision')
      .values((build) => ({
        part_id: draft.partId,
        number: build
          .selectFrom('bill_revision')
          .where('part_id', '=', draft.partId)
          .select(sql<number>`coalesce(max(number), 0) + 1`.as('number')),
        note: draft.note,
        created_at: draft.at,
        created_by: draft.by,
      }))
      .returning(['id', 'number'])
      .executeTakeFirstOrThrow();
  }

  /** @returns false when somebody else saved a newer version, or the revision is no draft any more */
  async takeDraft(trx: Transaction<DB>, id: number, version: number, note: string | null): Promise<boolean> {
    const result = await trx
      .updateTable('bill_revision')
      .set({ version: version + 1, note })
      .where('id', '=', id)
      .where('version', '=', version)
      .where('status', '=', 'draft')
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  /** @returns false when it changed meanwhile */
  async deleteDraft(trx: Transaction<DB>, id: number, version: number): Promise<boolean> {
    const result = await trx
      .deleteFrom('bill_revision')
      .where('id', '=', id)
      .where('version', '=', version)
      .where('status', '=', 'draft')
      .executeTakeFirst();
    return result.numDeletedRows === 1n;
  }

  /** Empties drafts of their lines, before the lines of all of them are written anew. */
  async clearLines(trx: Transaction<DB>, revisionIds: readonly number[]): Promise<void> {
    if (revisionIds.length === 0) return;
    await trx
      .deleteFrom('bill_line')
      .where('revision_id', 'in', [...revisionIds])
      .execute();
  }

  async supersede(trx: Transaction<DB>, partId: number, at: Date): Promise<void> {
    await trx
      .updateTable('bill_revision')
      .set(({ eb }) => ({ status: 'superseded', superseded_at: at, version: eb('version', '+', 1) }))
      .where('part_id', '=', partId)
      .where('status', '=', 'released')
      .execute();
  }

  /** @returns false when it changed meanwhile */
  async release(
    trx: Transaction<DB>,
    id: number,
    version: number,
    by: { readonly id: number; readonly at: Date },
  ): Promise<boolean> {
    const result = await trx
      .updateTable('bill_revision')
      .set({ status: 'released', released_at: by.at, released_by: by.id, version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .where('status', '=', 'draft')
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  /** Puts the content in the place of what the draft held. */
  async replace(trx: Transaction<DB>, revisionId: number, content: CheckedContent): Promise<void> {
    await trx.deleteFrom('bill_line').where('revision_id', '=', revisionId).execute();
    await trx.deleteFrom('build_step').where('revision_id', '=', revisionId).execute();
    await trx.deleteFrom('characteristic').where('revision_id', '=', revisionId).execute();
    await this.#insertLines(trx, revisionId, content.lines);
    const position = (index: number) => ({ revision_id: revisionId, position: index + 1 });
    if (content.steps.length > 0) {
      await trx
        .insertInto('build_step')
        .values(content.steps.map((step, index) => ({ ...position(index), ...step })))
        .execute();
    }
    if (content.testPlan.length > 0) {
      await trx
        .insertInto('characteristic')
        .values(
          content.testPlan.map(({ lowerLimit, upperLimit, ...rest }, index) => ({
            ...position(index),
            ...rest,
            lower_limit: lowerLimit,
            upper_limit: upperLimit,
          })),
        )
        .execute();
    }
  }

  async #insertLines(trx: Transaction<DB>, revisionId: number, lines: readonly CheckedLine[]): Promise<void> {
    if (lines.length === 0) return;
    const inserted = await trx
      .insertInto('bill_line')
      .values(
        lines.map((line) => ({
          revision_id: revisionId,
          position: line.position,
          part_id: line.part.id,
          quantity_per: line.quantityPer,
          scrap_percent: line.scrapPercent,
          marks: line.marks,
          note: line.note,
        })),
      )
      .returning(['id', 'position'])
      .execute();
    const idAt = new Map(inserted.map(({ id, position }) => [position, id]));
    const alternates = lines.flatMap((line) =>
      line.alternates.map((part, index) => ({
        line_id: idAt.get(line.position) ?? 0,
        part_id: part.id,
        priority: index + 1,
      })),
    );
    if (alternates.length > 0) await trx.insertInto('bill_line_alternate').values(alternates).execute();
  }
}
