import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface CharacteristicRow {
  readonly id: number;
  readonly position: number;
  readonly name: string;
  readonly kind: string;
  readonly unit: string | null;
  readonly lower: string | null;
  readonly upper: string | null;
  readonly digits: number | null;
}

export interface RunRow {
  readonly id: number;
  readonly sequence: number;
  readonly revisionId: number;
  readonly startedAt: Date;
  readonly measuredAt: Date | null;
  readonly verdict: 'pass' | 'fail' | null;
  readonly voidedAt: Date | null;
  readonly voidReason: string | null;
}

export interface ReadingRow {
  readonly runId: number;
  readonly characteristicId: number;
  readonly position: number;
  readonly name: string;
  readonly kind: 'numeric' | 'yes_no';
  readonly typed: string | null;
  readonly answer: boolean | null;
  readonly unit: string | null;
  readonly lower: string | null;
  readonly upper: string | null;
  readonly verdict: 'within' | 'outside';
  readonly measuredAt: Date;
  readonly recordedBy: string;
}

export interface NewReadingRow {
  readonly runId: number;
  readonly characteristicId: number;
  readonly value: string | null;
  readonly typed: string | null;
  readonly answer: boolean | null;
  readonly unit: string | null;
  readonly lower: string | null;
  readonly upper: string | null;
  readonly verdict: 'within' | 'outside';
  readonly measuredAt: Date;
  readonly receivedAt: Date;
  readonly recordedBy: number;
  readonly clientKey: string;
}

@Injectable()
export class TestRunsRepository {
  async plan(handle: Kysely<DB>, revisionId: number): Promise<CharacteristicRow[]> {
    return handle
      .selectFrom('characteristic')
      .select(['id', 'position', 'name', 'kind', 'unit', 'lower_limit as lower', 'upper_limit as upper', 'digits'])
      .where('revision_id', '=', revisionId)
      .orderBy('position')
      .execute();
  }

  async runs(handle: Kysely<DB>, unitId: number): Promise<RunRow[]> {
    return handle
      .selectFrom('test_run')
      .select([
        'id',
        'sequence',
        'revision_id as revisionId',
        'started_at as startedAt',
        'measured_at as measuredAt',
        sql<'pass' | 'fail' | null>`verdict`.as('verdict'),
        'voided_at as voidedAt',
        'void_reason as voidReason',
      ])
      .where('unit_id', '=', unitId)
      .orderBy('sequence')
      .execute();
  }

  async insertRun(
    trx: Transaction<DB>,
    run: { unitId: number; revisionId: number; sequence: number; startedAt: Date; startedBy: number },
  ): Promise<number> {
    const { id } = await trx
      .insertInto('test_run')
      .values({
        unit_id: run.unitId,
        revision_id: run.revisionId,
        sequence: run.sequence,
        started_at: run.startedAt,
        started_by: run.startedBy,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async setVerdict(trx: Transaction<DB>, runId: number, verdict: 'pass' | 'fail', measuredAt: Date): Promise<void> {
    await trx.updateTable('test_run').set({ verdict, measured_at: measuredAt }).where('id', '=', runId).execute();
  }

  /** Passes and runs under way say nothing about a unit that was changed since. */
  async voidPasses(trx: Transaction<DB>, unitId: number, reason: string, at: Date): Promise<void> {
    await trx
      .updateTable('test_run')
      .set({ voided_at: at, void_reason: reason })
      .where('unit_id', '=', unitId)
      .where('voided_at', 'is', null)
      .where((where) => where.or([where('verdict', 'is', null), where('verdict', '=', 'pass')]))
      .execute();
  }

  async insertReading(trx: Transaction<DB>, row: NewReadingRow): Promise<void> {
    await trx
      .insertInto('reading')
      .values({
        run_id: row.runId,
        characteristic_id: row.characteristicId,
        value: row.value,
        typed: row.typed,
        answer: row.answer,
        unit: row.unit,
        lower_limit: row.lower,
        upper_limit: row.upper,
        verdict: row.verdict,
        measured_at: row.measuredAt,
        received_at: row.receivedAt,
        recorded_by: row.recordedBy,
        client_key: row.clientKey,
      })
      .execute();
  }

  async findByKey(
    handle: Kysely<DB>,
    clientKey: string,
  ): Promise<{ runId: number; sequence: number; unitId: number; verdict: 'within' | 'outside' } | undefined> {
    return handle
      .selectFrom('reading')
      .innerJoin('test_run', 'test_run.id', 'reading.run_id')
      .where('client_key', '=', clientKey)
      .select([
        'reading.run_id as runId',
        'test_run.sequence',
        'test_run.unit_id as unitId',
        sql<'within' | 'outside'>`reading.verdict`.as('verdict'),
      ])
      .executeTakeFirst();
  }

  /** All readings of runs, the one that counts of each characteristic first. */
  async readings(handle: Kysely<DB>, runIds: readonly number[]): Promise<ReadingRow[]> {
    if (runIds.length === 0) return [];
    return handle
      .selectFrom('reading as g')
      .innerJoin('characteristic as c', 'c.id', 'g.characteristic_id')
      .innerJoin('app_user as u', 'u.id', 'g.recorded_by')
      .where('g.run_id', 'in', [...runIds])
      .select([
        'g.run_id as runId',
        'g.characteristic_id as characteristicId',
        'c.position',
        'c.name',
        sql<'numeric' | 'yes_no'>`c.kind`.as('kind'),
        'g.typed',
        'g.answer',
        'g.unit',
        sql<string | null>`trim_scale(g.lower_limit)::text`.as('lower'),
        sql<string | null>`trim_scale(g.upper_limit)::text`.as('upper'),
        sql<'within' | 'outside'>`g.verdict`.as('verdict'),
        'g.measured_at as measuredAt',
        'u.name as recordedBy',
      ])
      .orderBy('g.run_id')
      .orderBy('c.position')
      .orderBy('g.measured_at', 'desc')
      .orderBy('g.id', 'desc')
      .execute();
  }
}
