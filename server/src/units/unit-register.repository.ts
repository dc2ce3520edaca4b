import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface UnitRow {
  readonly id: number;
  readonly serial: string;
  readonly partId: number;
  readonly revisionId: number;
  readonly batchId: number;
  readonly place: number;
  readonly pageToken: string;
  readonly issuedAt: Date;
  readonly completedAt: Date | null;
  readonly lotId: number | null;
  readonly scrappedAt: Date | null;
  readonly scrapReason: string | null;
}

export interface NewUnitRow {
  readonly serial: string;
  readonly partId: number;
  readonly revisionId: number;
  readonly batchId: number;
  readonly place: number;
  readonly pageToken: string;
}

@Injectable()
export class UnitRegisterRepository {
  async insert(trx: Transaction<DB>, rows: readonly NewUnitRow[], issuedAt: Date): Promise<void> {
    await trx
      .insertInto('unit')
      .values(
        rows.map((row) => ({
          serial: row.serial,
          part_id: row.partId,
          revision_id: row.revisionId,
          batch_id: row.batchId,
          place: row.place,
          page_token: row.pageToken,
          serial_issued_at: issuedAt,
        })),
      )
      .execute();
  }

  async findBySerial(handle: Kysely<DB>, serial: string): Promise<UnitRow | undefined> {
    return this.columns(handle).where('serial', '=', serial).executeTakeFirst();
  }

  async lock(trx: Transaction<DB>, serial: string): Promise<UnitRow | undefined> {
    return this.columns(trx).where('serial', '=', serial).forUpdate().executeTakeFirst();
  }

  async ofBatch(handle: Kysely<DB>, batchId: number): Promise<UnitRow[]> {
    return this.columns(handle).where('batch_id', '=', batchId).orderBy('place').execute();
  }

  async setCompleted(trx: Transaction<DB>, unitId: number, lotId: number, at: Date): Promise<void> {
    await trx
      .updateTable('unit')
      .set({ completed_at: at, lot_id: lotId, version: sql`version + 1` })
      .where('id', '=', unitId)
      .execute();
  }

  async setScrapped(trx: Transaction<DB>, unitId: number, reason: string, at: Date): Promise<void> {
    await trx
      .updateTable('unit')
      .set({ scrapped_at: at, scrap_reason: reason, version: sql`version + 1` })
      .where('id', '=', unitId)
      .execute();
  }

  async isSound(handle: Kysely<DB>, unitId: number): Promise<boolean> {
    const { rows } = await sql<{ sound: boolean }>`select unit_is_sound(${unitId}) as sound`.execute(handle);
    return rows[0]?.sound ?? false;
  }

  private columns(handle: Kysely<DB>) {
    return handle
      .selectFrom('unit')
      .select([
        'id',
        'serial',
        'part_id as partId',
        'revision_id as revisionId',
        'batch_id as batchId',
        'place',
        'page_token as pageToken',
        'serial_issued_at as issuedAt',
        'completed_at as completedAt',
        'lot_id as lotId',
        'scrapped_at as scrappedAt',
        'scrap_reason as scrapReason',
      ]);
  }
}
