import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import type { PlannedLine, PlannedStep, SubAssembly } from './batch-plan.js';

export interface LinePart {
  readonly id: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
}

export interface BatchLineRow {
  readonly id: number;
  readonly path: string;
  readonly billLineId: number;
  readonly partId: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly marks: string | null;
  readonly quantityPer: string;
  readonly required: string;
  readonly issued: string;
  readonly demandId: number | null;
  /** What the line's demand holds of the shelf. */
  readonly claimed: string;
}

export interface BatchStepRow {
  readonly id: number;
  readonly position: number;
  readonly path: string;
  readonly part: string;
  readonly title: string;
  readonly instruction: string;
  /** For one unit. */
  readonly minutes: string;
  readonly caution: string | null;
}

export interface SubAssemblyRow {
  readonly path: string;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly required: string;
  readonly fromShelf: boolean;
}

/** What a batch needs and what is done in it. */
@Injectable()
export class BatchLinesRepository {
  async insertLines(
    trx: Transaction<DB>,
    batchId: number,
    lines: readonly PlannedLine[],
    demandIds: readonly number[],
  ): Promise<void> {
    if (lines.length === 0) return;
    await trx
      .insertInto('batch_line')
      .values(
        lines.map((line, index) => ({
          batch_id: batchId,
          bill_line_id: line.billLineId,
          path: line.path,
          part_id: line.partId,
          quantity_per: line.quantityPer.toFixed(),
          required: line.required.toFixed(),
          demand_id: demandIds[index] ?? null,
        })),
      )
      .execute();
  }

  async insertSteps(trx: Transaction<DB>, batchId: number, steps: readonly PlannedStep[]): Promise<void> {
    if (steps.length === 0) return;
    await trx
      .insertInto('batch_step')
      .values(
        steps.map((step, index) => ({
          batch_id: batchId,
          position: index + 1,
          build_step_id: step.buildStepId,
          path: step.path,
          per_unit: step.perUnit.toFixed(),
        })),
      )
      .execute();
  }

  async insertSubAssemblies(trx: Transaction<DB>, batchId: number, rows: readonly SubAssembly[]): Promise<void> {
    if (rows.length === 0) return;
    await trx
      .insertInto('batch_sub_assembly')
      .values(
        rows.map((row) => ({
          batch_id: batchId,
          path: row.path,
          part_id: row.partId,
          revision_id: row.revisionId,
          required: row.required.toFixed(),
          from_shelf: row.fromShelf,
        })),
      )
      .execute();
  }

  /** A batch that is only planned is planned anew. */
  async clear(trx: Transaction<DB>, batchId: number): Promise<void> {
    await trx.deleteFrom('batch_line').where('batch_id', '=', batchId).execute();
    await trx.deleteFrom('batch_step').where('batch_id', '=', batchId).execute();
    await trx.deleteFrom('batch_sub_assembly').where('batch_id', '=', batchId).execute();
  }

  async lines(handle: Kysely<DB>, batchId: number): Promise<BatchLineRow[]> {
    return handle
      .selectFrom('batch_line as l')
      .innerJoin('part as p', 'p.id', 'l.part_id')
      .innerJoin('bill_line as b', 'b.id', 'l.bill_line_id')
      .where('l.batch_id', '=', batchId)
      .select([
        'l.id',
        'l.path',
        'l.bill_line_id as billLineId',
        'l.part_id as partId',
        'p.code',
        'p.name',
        'p.measure',
        'p.traced',
        'b.marks',
        'l.quantity_per as quantityPer',
        'l.required',
        'l.issued',
        'l.demand_id as demandId',
        sql<string>`coalesce((select sum(r.quantity) from reservation r
          where r.demand_id = l.demand_id and r.ended_at is null and r.supply = 'shelf'), 0)`.as('claimed'),
      ])
      .orderBy('l.id')
      .execute();
  }

  async steps(handle: Kysely<DB>, batchId: number): Promise<BatchStepRow[]> {
    return handle
      .selectFrom('batch_step as s')
      .innerJoin('build_step as b', 'b.id', 's.build_step_id')
      .innerJoin('bill_revision as r', 'r.id', 'b.revision_id')
      .innerJoin('part as p', 'p.id', 'r.part_id')
      .where('s.batch_id', '=', batchId)
      .select([
        's.id',
        's.position',
        's.path',
        'p.code as part',
        'b.title',
        'b.instruction',
        sql<string>`trim_scale(round(b.minutes * s.per_unit, 6))::text`.as('minutes'),
        'b.caution',
      ])
      .orderBy('s.position')
      .execute();
  }

  async subAssemblies(handle: Kysely<DB>, batchId: number): Promise<SubAssemblyRow[]> {
    return handle
      .selectFrom('batch_sub_assembly as s')
      .innerJoin('part as p', 'p.id', 's.part_id')
      .where('s.batch_id', '=', batchId)
      .select(['s.path', 'p.code', 'p.name', 'p.measure', 'p.traced', 's.required', 's.from_shelf as fromShelf'])
      .orderBy('s.path')
      .execute();
  }

  /** Approved to stand in, the preferred one first, by bill line. */
  async alternates(handle: Kysely<DB>, billLineIds: readonly number[]): Promise<(LinePart & { lineId: number })[]> {
    if (billLineIds.length === 0) return [];
    return handle
      .selectFrom('bill_line_alternate as a')
      .innerJoin('part as p', 'p.id', 'a.part_id')
      .where('a.line_id', 'in', [...billLineIds])
      .select(['a.line_id as lineId', 'p.id', 'p.code', 'p.name', 'p.measure', 'p.traced'])
      .orderBy('a.line_id')
      .orderBy('a.priority')
      .execute();
  }

  async addIssued(trx: Transaction<DB>, lineId: number, quantity: string): Promise<void> {
    await trx
      .updateTable('batch_line')
      .set({ issued: sql`issued + ${quantity}::numeric` })
      .where('id', '=', lineId)
      .execute();
  }

  /** What was allowed for scrap and is left over is not needed again. */
  async needNoMore(trx: Transaction<DB>, lineId: number): Promise<void> {
    await trx
      .updateTable('batch_line')
      .set({ required: sql`issued` })
      .where('id', '=', lineId)
      .where('required', '>', sql<string>`issued`)
      .execute();
  }

  async setDemand(trx: Transaction<DB>, lineId: number, demandId: number): Promise<void> {
    await trx.updateTable('batch_line').set({ demand_id: demandId }).where('id', '=', lineId).execute();
  }
}
