import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export const batchStatuses = ['planned', 'picking', 'in_build', 'done', 'withdrawn'] as const;

export type BatchStatus = (typeof batchStatuses)[number];

export interface BatchRow {
  readonly id: number;
  readonly number: string;
  readonly partId: number;
  readonly revisionId: number;
  readonly quantity: number;
  readonly status: BatchStatus;
  readonly startOn: string | null;
  readonly dueOn: string;
  readonly madeQuantity: number;
  readonly note: string | null;
  readonly createdAt: Date;
  readonly buildStartedAt: Date | null;
  readonly finishedAt: Date | null;
  readonly version: number;
}

export interface NewBatchRow {
  readonly number: string;
  readonly partId: number;
  readonly revisionId: number;
  readonly quantity: number;
  readonly startOn: string | null;
  readonly dueOn: string;
  readonly note: string | null;
  readonly createdAt: Date;
  readonly createdBy: number;
}

export type CostComponent = 'materials_in' | 'materials_out' | 'labour' | 'loss';

@Injectable()
export class BatchesRepository {
  async insert(trx: Transaction<DB>, row: NewBatchRow): Promise<number> {
    const { id } = await trx
      .insertInto('batch')
      .values({
        number: row.number,
        part_id: row.partId,
        revision_id: row.revisionId,
        quantity: row.quantity,
        start_on: row.startOn,
        due_on: row.dueOn,
        note: row.note,
        created_at: row.createdAt,
        created_by: row.createdBy,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async find(handle: Kysely<DB>, number: string): Promise<BatchRow | undefined> {
    return this.columns(handle).where('number', '=', number).executeTakeFirst();
  }

  async findById(handle: Kysely<DB>, id: number): Promise<BatchRow | undefined> {
    return this.columns(handle).where('id', '=', id).executeTakeFirst();
  }

  async lock(trx: Transaction<DB>, number: string): Promise<BatchRow | undefined> {
    return this.columns(trx).where('number', '=', number).forNoKeyUpdate().executeTakeFirst();
  }

  async lockById(trx: Transaction<DB>, id: number): Promise<BatchRow | undefined> {
    return this.columns(trx).where('id', '=', id).forNoKeyUpdate().executeTakeFirst();
  }

  /** @returns false when the batch was not in that status any more */
  async setStatus(
    trx: Transaction<DB>,
    id: number,
    expected: BatchStatus,
    to: BatchStatus,
    at: { readonly buildStartedAt?: Date; readonly finishedAt?: Date } = {},
  ): Promise<boolean> {
    const result = await trx
      .updateTable('batch')
      .set({
        status: to,
        version: sql`version + 1`,
        ...(at.buildStartedAt && { build_started_at: at.buildStartedAt }),
        ...(at.finishedAt && { finished_at: at.finishedAt }),
      })
      .where('id', '=', id)
      .where('status', '=', expected)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  async addMade(trx: Transaction<DB>, id: number, quantity: number): Promise<void> {
    await trx
      .updateTable('batch')
      .set({ made_quantity: sql`made_quantity + ${quantity}`, version: sql`version + 1` })
      .where('id', '=', id)
      .execute();
  }

  async touch(trx: Transaction<DB>, id: number): Promise<void> {
    await trx
      .updateTable('batch')
      .set({ version: sql`version + 1` })
      .where('id', '=', id)
      .execute();
  }

  async addCosts(
    trx: Transaction<DB>,
    batchId: number,
    documentId: number,
    at: Date,
    costs: readonly { readonly component: CostComponent; readonly value: number }[],
  ): Promise<void> {
    const rows = costs.filter(({ value }) => value !== 0);
    if (rows.length === 0) return;
    await trx
      .insertInto('batch_cost')
      .values(
        rows.map(({ component, value }) => ({
          batch_id: batchId,
          document_id: documentId,
          component,
          value_minor: value,
          occurred_at: at,
        })),
      )
      .execute();
  }

  /** What the batch holds of work in progress, and the labour that went past it, in minor units. */
  async costs(handle: Kysely<DB>, batchId: number): Promise<Readonly<Record<CostComponent, number>>> {
    const rows = await handle
      .selectFrom('batch_cost')
      .select(['component', sql<number>`sum(value_minor)::int8`.as('value')])
      .where('batch_id', '=', batchId)
      .groupBy('component')
      .execute();
    const known = new Map(rows.map(({ component, value }) => [component, value]));
    const of = (component: CostComponent) => known.get(component) ?? 0;
    return {
      materials_in: of('materials_in'),
      materials_out: of('materials_out'),
      labour: of('labour'),
      loss: of('loss'),
    };
  }

  private columns(handle: Kysely<DB>) {
    return handle
      .selectFrom('batch')
      .select([
        'id',
        'number',
        'part_id as partId',
        'revision_id as revisionId',
        'quantity',
        sql<BatchStatus>`status`.as('status'),
        'start_on as startOn',
        'due_on as dueOn',
        'made_quantity as madeQuantity',
        'note',
        'created_at as createdAt',
        'build_started_at as buildStartedAt',
        'finished_at as finishedAt',
        'version',
      ]);
  }
}
