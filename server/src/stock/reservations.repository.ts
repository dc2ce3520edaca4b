import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';

export interface NewDemandRow {
  readonly kind: 'order_line' | 'batch_line';
  readonly partId: number;
  readonly quantity: string;
  readonly neededOn: string | null;
  readonly reference: string;
  readonly createdAt: Date;
}

export interface NewReservationRow {
  readonly demandId: number;
  readonly partId: number;
  readonly quantity: string;
  readonly supply: 'shelf' | 'batch';
  readonly batchId: number | null;
  readonly expiresAt: Date | null;
  readonly createdAt: Date;
}

export interface DemandRow {
  readonly id: number;
  readonly partId: number;
  readonly quantity: string;
  readonly taken: string;
}

export interface LiveReservationRow {
  readonly id: number;
  readonly demandId: number;
  readonly quantity: string;
  readonly supply: string;
  readonly lotId: number | null;
  readonly expiresAt: Date | null;
}

export type EndReason = 'taken' | 'expired' | 'cancelled' | 'moved';

@Injectable()
export class ReservationsRepository {
  /** Ids come back in the order of the rows. */
  async insertDemands(trx: Transaction<DB>, rows: readonly NewDemandRow[]): Promise<number[]> {
    const inserted = await trx
      .insertInto('demand')
      .values(
        rows.map((row) => ({
          kind: row.kind,
          part_id: row.partId,
          quantity: row.quantity,
          needed_on: row.neededOn,
          reference: row.reference,
          created_at: row.createdAt,
        })),
      )
      .returning('id')
      .execute();
    return inserted.map(({ id }) => id);
  }

  /** Ids come back in the order of the rows. */
  async insertReservations(trx: Transaction<DB>, rows: readonly NewReservationRow[]): Promise<number[]> {
    const inserted = await trx
      .insertInto('reservation')
      .values(
        rows.map((row) => ({
          demand_id: row.demandId,
          part_id: row.partId,
          quantity: row.quantity,
          supply: row.supply,
          batch_id: row.batchId,
          expires_at: row.expiresAt,
          created_at: row.createdAt,
        })),
      )
      .returning('id')
      .execute();
    return inserted.map(({ id }) => id);
  }

  async lockDemand(trx: Transaction<DB>, demandId: number): Promise<DemandRow | undefined> {
    return trx
      .selectFrom('demand')
      .select(['id', 'part_id as partId', 'quantity', 'taken'])
      .where('id', '=', demandId)
      .forUpdate()
      .executeTakeFirst();
  }

  async liveOf(trx: Transaction<DB>, demandIds: readonly number[]): Promise<LiveReservationRow[]> {
    if (demandIds.length === 0) return [];
    return trx
      .selectFrom('reservation')
      .select(['id', 'demand_id as demandId', 'quantity', 'supply', 'lot_id as lotId', 'expires_at as expiresAt'])
      .where('demand_id', 'in', [...demandIds])
      .where('ended_at', 'is', null)
      .orderBy('id')
      .forUpdate()
      .execute();
  }

  async end(trx: Transaction<DB>, ids: readonly number[], reason: EndReason, at: Date): Promise<void> {
    if (ids.length === 0) return;
    await trx
      .updateTable('reservation')
      .set({ ended_at: at, end_reason: reason })
      .where('id', 'in', [...ids])
      .where('ended_at', 'is', null)
      .execute();
  }

  async setQuantity(trx: Transaction<DB>, id: number, quantity: string): Promise<void> {
    await trx.updateTable('reservation').set({ quantity }).where('id', '=', id).execute();
  }

  async bind(trx: Transaction<DB>, id: number, lotId: number): Promise<void> {
    await trx.updateTable('reservation').set({ lot_id: lotId, of_unit: true }).where('id', '=', id).execute();
  }

  async unbind(trx: Transaction<DB>, id: number): Promise<void> {
    await trx.updateTable('reservation').set({ lot_id: null, of_unit: false }).where('id', '=', id).execute();
  }

  async setTaken(trx: Transaction<DB>, demandId: number, taken: string, closedAt: Date | null): Promise<void> {
    await trx.updateTable('demand').set({ taken, closed_at: closedAt }).where('id', '=', demandId).execute();
  }

  async closeDemands(trx: Transaction<DB>, demandIds: readonly number[], at: Date): Promise<void> {
    if (demandIds.length === 0) return;
    await trx
      .updateTable('demand')
      .set({ closed_at: at })
      .where('id', 'in', [...demandIds])
      .where('closed_at', 'is', null)
      .execute();
  }

  async setExpiry(trx: Transaction<DB>, demandIds: readonly number[], expiresAt: Date | null): Promise<void> {
    if (demandIds.length === 0) return;
    await trx
      .updateTable('reservation')
      .set({ expires_at: expiresAt })
      .where('demand_id', 'in', [...demandIds])
      .where('ended_at', 'is', null)
      .execute();
  }

  async liveOnBatch(handle: Kysely<DB>, batchId: number, at: Date): Promise<LiveReservationRow[]> {
    return handle
      .selectFrom('reservation')
      .select(['id', 'demand_id as demandId', 'quantity', 'supply', 'lot_id as lotId', 'expires_at as expiresAt'])
      .where('batch_id', '=', batchId)
      .where('ended_at', 'is', null)
      .where((where) => where.or([where('expires_at', 'is', null), where('expires_at', '>', at)]))
      .orderBy('id')
      .execute();
  }
}
