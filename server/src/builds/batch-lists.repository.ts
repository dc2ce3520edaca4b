import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { BatchesQuery, UnitVerdict } from './batch.dto.js';
import type { BatchStatus } from './batches.repository.js';

export interface BatchItemRow {
  readonly id: number;
  readonly number: string;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly revision: number;
  readonly quantity: number;
  readonly status: BatchStatus;
  readonly startOn: string | null;
  readonly dueOn: string;
  readonly madeQuantity: number;
  readonly lineCount: number;
  readonly linesShort: number;
  readonly linesToPick: number;
}

export interface StripRow {
  readonly batchId: number;
  readonly serial: string;
  readonly stepsDone: number;
  readonly stepsTotal: number;
  readonly verdict: UnitVerdict;
  readonly finished: boolean;
}

const sortColumns = { number: 'b.id', dueOn: 'b.due_on', quantity: 'b.quantity', part: 'p.code' };

const claimed = sql`coalesce((select sum(r.quantity) from reservation r
  where r.demand_id = l.demand_id and r.ended_at is null and r.supply = 'shelf'), 0)`;

/** Batches as lists show them. */
@Injectable()
export class BatchListsRepository {
  async page(handle: Kysely<DB>, query: BatchesQuery): Promise<Page<BatchItemRow>> {
    let rows = this.items(handle);
    if (query.status) rows = rows.where('b.status', '=', query.status);
    if (query.open === true) rows = rows.where('b.status', 'in', ['planned', 'picking', 'in_build']);
    if (query.open === false) rows = rows.where('b.status', 'in', ['done', 'withdrawn']);
    if (query.part) rows = rows.where('p.code', '=', query.part);
    if (query.q) {
      rows = rows.where(sql<boolean>`b.number || ' ' || p.code || ' ' || p.name ilike ${containing(query.q)}`);
    }
    const items = await paged(sorted(rows, query.sort, sortColumns, 'dueOn', 'b.id'), query).execute();
    return { items, total: await countOf(rows) };
  }

  async find(handle: Kysely<DB>, number: string): Promise<BatchItemRow | undefined> {
    return this.items(handle).where('b.number', '=', number).executeTakeFirst();
  }

  /** Every unit of the batches and how far it is, in the order of their places. */
  async strips(handle: Kysely<DB>, batchIds: readonly number[]): Promise<StripRow[]> {
    if (batchIds.length === 0) return [];
    return handle
      .selectFrom('unit as u')
      .where('u.batch_id', 'in', [...batchIds])
      .select([
        'u.batch_id as batchId',
        'u.serial',
        sql<number>`(select count(*) from unit_step s where s.unit_id = u.id)`.as('stepsDone'),
        sql<number>`(select count(*) from batch_step s where s.batch_id = u.batch_id)`.as('stepsTotal'),
        sql<boolean>`u.completed_at is not null`.as('finished'),
        sql<UnitVerdict>`case
          when u.scrapped_at is not null then 'scrapped'
          when unit_is_sound(u.id) then 'passed'
          when exists (select 1 from nonconformity n where n.unit_id = u.id and n.closed_at is null) then 'failed'
          when exists (select 1 from test_run r where r.unit_id = u.id and r.verdict is not null)
            or exists (select 1 from rework w where w.unit_id = u.id) then 'rework'
          else 'open' end`.as('verdict'),
      ])
      .orderBy('u.batch_id')
      .orderBy('u.place')
      .execute();
  }

  /** Which steps are done on which units of a batch. */
  async stepsDone(handle: Kysely<DB>, batchId: number): Promise<{ stepId: number; serial: string }[]> {
    return handle
      .selectFrom('unit_step as s')
      .innerJoin('unit as u', 'u.id', 's.unit_id')
      .where('u.batch_id', '=', batchId)
      .select(['s.batch_step_id as stepId', 'u.serial'])
      .orderBy('u.place')
      .execute();
  }

  private items(handle: Kysely<DB>) {
    const linesWhere = (condition: ReturnType<typeof sql>) =>
      sql<number>`(select count(*) from batch_line l where l.batch_id = b.id and ${condition})`;
    return handle
      .selectFrom('batch as b')
      .innerJoin('part as p', 'p.id', 'b.part_id')
      .innerJoin('bill_revision as r', 'r.id', 'b.revision_id')
      .select([
        'b.id',
        'b.number',
        'p.code',
        'p.name',
        'p.measure',
        'p.traced',
        'r.number as revision',
        'b.quantity',
        sql<BatchStatus>`b.status`.as('status'),
        'b.start_on as startOn',
        'b.due_on as dueOn',
        'b.made_quantity as madeQuantity',
        linesWhere(sql`true`).as('lineCount'),
        linesWhere(sql`l.issued + ${claimed} < l.required`).as('linesShort'),
        linesWhere(sql`l.issued < l.required`).as('linesToPick'),
      ]);
  }
}
