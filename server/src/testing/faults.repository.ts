import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { FaultDto, FaultsQuery, FirstPassDto } from './test-run.dto.js';

export type FaultRow = Omit<FaultDto, 'foundAt' | 'closedAt'> & {
  readonly unitId: number;
  readonly foundAt: Date;
  readonly closedAt: Date | null;
};

export type FaultOutcome = 'reworked' | 'scrapped' | 'no_fault';

const sortColumns = { number: 'n.id', foundAt: 'n.found_at', serial: 'u.serial' };

@Injectable()
export class FaultsRepository {
  async page(handle: Kysely<DB>, query: FaultsQuery): Promise<Page<FaultRow>> {
    let rows = this.columns(handle);
    if (query.open !== undefined) rows = rows.where('n.closed_at', query.open ? 'is' : 'is not', null);
    if (query.q) {
      rows = rows.where(sql<boolean>`n.number || ' ' || u.serial || ' ' || n.what ilike ${containing(query.q)}`);
    }
    const items = await paged(sorted(rows, query.sort, sortColumns, '-foundAt', 'n.id'), query).execute();
    return { items, total: await countOf(rows) };
  }

  async find(handle: Kysely<DB>, number: string): Promise<FaultRow | undefined> {
    return this.columns(handle).where('n.number', '=', number).executeTakeFirst();
  }

  async ofUnit(handle: Kysely<DB>, unitId: number): Promise<FaultRow[]> {
    return this.columns(handle).where('n.unit_id', '=', unitId).orderBy('n.id').execute();
  }

  async insert(
    trx: Transaction<DB>,
    row: {
      number: string;
      unitId: number;
      runId: number | null;
      stepId: number | null;
      what: string;
      at: Date;
      by: number;
    },
  ): Promise<void> {
    await trx
      .insertInto('nonconformity')
      .values({
        number: row.number,
        unit_id: row.unitId,
        run_id: row.runId,
        batch_step_id: row.stepId,
        what: row.what,
        found_at: row.at,
        found_by: row.by,
      })
      .execute();
  }

  /** @returns false when somebody else closed or changed it */
  async close(
    trx: Transaction<DB>,
    fault: { id: number; version: number },
    closing: { cause: string | null; action: string; outcome: FaultOutcome; at: Date; by: number },
  ): Promise<boolean> {
    const result = await trx
      .updateTable('nonconformity')
      .set({
        cause: closing.cause,
        action: closing.action,
        outcome: closing.outcome,
        closed_at: closing.at,
        closed_by: closing.by,
        version: fault.version + 1,
      })
      .where('id', '=', fault.id)
      .where('version', '=', fault.version)
      .where('closed_at', 'is', null)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  async insertRework(
    trx: Transaction<DB>,
    row: { unitId: number; faultId: number; what: string; minutes: string; at: Date; by: number },
  ): Promise<void> {
    await trx
      .insertInto('rework')
      .values({
        unit_id: row.unitId,
        nonconformity_id: row.faultId,
        what: row.what,
        minutes: row.minutes,
        done_at: row.at,
        done_by: row.by,
      })
      .execute();
  }

  /** By the first complete run of each unit, in the order of measuring, whatever became of it later. */
  async firstPasses(handle: Kysely<DB>): Promise<FirstPassDto[]> {
    const { rows } = await sql<FirstPassDto>`
      select p.code as part, p.name, count(*)::int8 as measured,
             (count(*) filter (where first.verdict = 'pass'))::int8 as passed
      from unit u
      join part p on p.id = u.part_id
      cross join lateral (
        select r.verdict from test_run r where r.unit_id = u.id and r.verdict is not null
        order by r.measured_at, r.sequence limit 1
      ) first
      group by p.code, p.name order by p.code`.execute(handle);
    return rows;
  }

  async stepId(handle: Kysely<DB>, batchId: number, position: number): Promise<number | undefined> {
    const row = await handle
      .selectFrom('batch_step')
      .select('id')
      .where('batch_id', '=', batchId)
      .where('position', '=', position)
      .executeTakeFirst();
    return row?.id;
  }

  private columns(handle: Kysely<DB>) {
    return handle
      .selectFrom('nonconformity as n')
      .innerJoin('unit as u', 'u.id', 'n.unit_id')
      .innerJoin('part as p', 'p.id', 'u.part_id')
      .innerJoin('batch as b', 'b.id', 'u.batch_id')
      .leftJoin('test_run as r', 'r.id', 'n.run_id')
      .leftJoin('batch_step as s', 's.id', 'n.batch_step_id')
      .leftJoin('build_step as t', 't.id', 's.build_step_id')
      .leftJoin('app_user as f', 'f.id', 'n.found_by')
      .select([
        'n.id',
        'n.unit_id as unitId',
        'n.number',
        'n.version',
        'u.serial',
        'p.code as part',
        'p.name as partName',
        'b.number as batch',
        'r.sequence as run',
        't.title as step',
        'n.what',
        'n.cause',
        'n.action',
        sql<FaultOutcome | null>`n.outcome`.as('outcome'),
        'n.found_at as foundAt',
        'f.name as foundBy',
        'n.closed_at as closedAt',
      ]);
  }
}
