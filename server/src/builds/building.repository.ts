import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface MadePart {
  readonly id: number;
  readonly code: string;
  readonly traced: string;
  readonly serialLetters: string | null;
}

/** What is done to units at the bench. */
@Injectable()
export class BuildingRepository {
  async part(handle: Kysely<DB>, partId: number): Promise<MadePart> {
    return handle
      .selectFrom('part')
      .select(['id', 'code', 'traced', 'serial_letters as serialLetters'])
      .where('id', '=', partId)
      .executeTakeFirstOrThrow();
  }

  /** Ticked twice is ticked once. */
  async tick(trx: Transaction<DB>, unitIds: readonly number[], stepId: number, at: Date, by: number): Promise<void> {
    await trx
      .insertInto('unit_step')
      .values(unitIds.map((unitId) => ({ unit_id: unitId, batch_step_id: stepId, done_at: at, done_by: by })))
      .onConflict((conflict) => conflict.doNothing())
      .execute();
  }

  async untick(trx: Transaction<DB>, unitIds: readonly number[], stepId: number): Promise<void> {
    await trx
      .deleteFrom('unit_step')
      .where('unit_id', 'in', [...unitIds])
      .where('batch_step_id', '=', stepId)
      .execute();
  }

  /** Titles of the steps of its batch that are not done on a unit. */
  async stepsLeft(handle: Kysely<DB>, unitId: number): Promise<string[]> {
    const rows = await handle
      .selectFrom('batch_step as s')
      .innerJoin('unit as u', 'u.batch_id', 's.batch_id')
      .innerJoin('build_step as b', 'b.id', 's.build_step_id')
      .where('u.id', '=', unitId)
      .where((where) =>
        where.not(
          where.exists(
            where
              .selectFrom('unit_step as d')
              .select('d.unit_id')
              .whereRef('d.unit_id', '=', 'u.id')
              .whereRef('d.batch_step_id', '=', 's.id'),
          ),
        ),
      )
      .select('b.title')
      .orderBy('s.position')
      .execute();
    return rows.map(({ title }) => title);
  }

  /** Planned minutes of all steps for one unit. */
  async plannedMinutes(handle: Kysely<DB>, batchId: number): Promise<string> {
    const row = await handle
      .selectFrom('batch_step as s')
      .innerJoin('build_step as b', 'b.id', 's.build_step_id')
      .where('s.batch_id', '=', batchId)
      .select(sql<string>`coalesce(sum(b.minutes * s.per_unit), 0)`.as('minutes'))
      .executeTakeFirstOrThrow();
    return row.minutes;
  }

  async reworkMinutes(handle: Kysely<DB>, unitId: number): Promise<string> {
    const row = await handle
      .selectFrom('rework')
      .where('unit_id', '=', unitId)
      .select(sql<string>`coalesce(sum(minutes), 0)`.as('minutes'))
      .executeTakeFirstOrThrow();
    return row.minutes;
  }
}
