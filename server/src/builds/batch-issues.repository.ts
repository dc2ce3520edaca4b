import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface NewIssueRow {
  readonly lineId: number;
  readonly documentId: number;
  readonly partId: number;
  readonly lotId: number;
  readonly binId: number;
  /** Below zero for what is given back. */
  readonly quantity: string;
  readonly value: number;
  readonly at: Date;
  readonly by: number | null;
}

/** What of a lot is in a batch for one of its lines. */
export interface IssuedLotRow {
  readonly lineId: number;
  readonly path: string;
  readonly partId: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly lotId: number;
  readonly lot: string;
  readonly standing: boolean;
  /** Where it was taken from last. */
  readonly bin: string;
  readonly quantity: string;
  readonly value: number;
}

/** What of a lot lies in a bin and may be used. */
export interface UsableLotRow {
  readonly partId: number;
  readonly lot: string;
  readonly standing: boolean;
  readonly bin: string;
  readonly quantity: string;
}

/** What was picked for batches, and what could be. */
@Injectable()
export class BatchIssuesRepository {
  async insert(trx: Transaction<DB>, rows: readonly NewIssueRow[]): Promise<void> {
    await trx
      .insertInto('batch_issue')
      .values(
        rows.map((row) => ({
          batch_line_id: row.lineId,
          document_id: row.documentId,
          part_id: row.partId,
          lot_id: row.lotId,
          bin_id: row.binId,
          quantity: row.quantity,
          value_minor: row.value,
          issued_at: row.at,
          issued_by: row.by,
        })),
      )
      .execute();
  }

  /** What is in the batch, less what was given back, by line and lot. */
  async inBatch(handle: Kysely<DB>, batchId: number): Promise<IssuedLotRow[]> {
    return handle
      .selectFrom('batch_issue as i')
      .innerJoin('batch_line as l', 'l.id', 'i.batch_line_id')
      .innerJoin('part as p', 'p.id', 'i.part_id')
      .innerJoin('lot', 'lot.id', 'i.lot_id')
      .where('l.batch_id', '=', batchId)
      .groupBy(['l.id', 'p.id', 'lot.id'])
      .having(sql<boolean>`sum(i.quantity) > 0`)
      .select([
        'l.id as lineId',
        'l.path',
        'p.id as partId',
        'p.code',
        'p.name',
        'p.measure',
        'p.traced',
        'lot.id as lotId',
        'lot.code as lot',
        sql<boolean>`lot.kind = 'standing'`.as('standing'),
        sql<string>`(array_agg((select bin.code from bin where bin.id = i.bin_id) order by i.id desc))[1]`.as('bin'),
        sql<string>`sum(i.quantity)`.as('quantity'),
        sql<number>`sum(i.value_minor)::int8`.as('value'),
      ])
      .orderBy('l.id')
      .orderBy('lot.id')
      .execute();
  }

  /** What may be issued of parts, the oldest first: released, not expired, in no quarantine bin. */
  async usable(handle: Kysely<DB>, partIds: readonly number[], today: string): Promise<UsableLotRow[]> {
    if (partIds.length === 0) return [];
    return handle
      .selectFrom('stock_balance as s')
      .innerJoin('lot', 'lot.id', 's.lot_id')
      .innerJoin('bin', 'bin.id', 's.bin_id')
      .where('s.part_id', 'in', [...partIds])
      .where('s.quantity', '>', '0')
      .where('s.owner_customer_id', 'is', null)
      .where('lot.status', '=', 'released')
      .where('bin.quarantine', '=', false)
      .where((where) => where.or([where('lot.expires_on', 'is', null), where('lot.expires_on', '>=', today)]))
      .select([
        's.part_id as partId',
        'lot.code as lot',
        sql<boolean>`lot.kind = 'standing'`.as('standing'),
        'bin.code as bin',
        's.quantity',
      ])
      .orderBy(sql`lot.received_on nulls first`)
      .orderBy('lot.id')
      .orderBy('bin.code')
      .execute();
  }

  /** What units have had scanned to them of the batch's lots, by line and lot. */
  async fittedExactly(
    handle: Kysely<DB>,
    batchId: number,
  ): Promise<{ unitId: number; lineId: number; lotId: number; quantity: string }[]> {
    return handle
      .selectFrom('as_built as a')
      .innerJoin('batch_line as l', 'l.id', 'a.batch_line_id')
      .where('l.batch_id', '=', batchId)
      .where('a.exact', '=', true)
      .where('a.removed_at', 'is', null)
      .select(['a.unit_id as unitId', 'a.batch_line_id as lineId', 'a.lot_id as lotId', 'a.quantity'])
      .execute();
  }

  async insertAsBuilt(
    trx: Transaction<DB>,
    rows: readonly {
      readonly unitId: number;
      readonly lineId: number;
      readonly partId: number;
      readonly lotId: number;
      readonly quantity: string;
      readonly exact: boolean;
    }[],
    at: Date,
    by: number,
  ): Promise<void> {
    if (rows.length === 0) return;
    await trx
      .insertInto('as_built')
      .values(
        rows.map((row) => ({
          unit_id: row.unitId,
          batch_line_id: row.lineId,
          part_id: row.partId,
          lot_id: row.lotId,
          quantity: row.quantity,
          exact: row.exact,
          fitted_at: at,
          fitted_by: by,
        })),
      )
      .execute();
  }
}
