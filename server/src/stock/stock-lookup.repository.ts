import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';

export interface StockPart {
  readonly id: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly shelfLifeDays: number | null;
  readonly retiredOn: string | null;
}

export interface StockLot {
  readonly id: number;
  readonly code: string;
  readonly partId: number;
  readonly kind: string;
  readonly status: string;
  readonly unitCost: string | null;
  readonly expiresOn: string | null;
}

export interface StockBin {
  readonly id: number;
  readonly code: string;
  readonly quarantine: boolean;
  readonly retiredAt: Date | null;
}

export interface Place {
  readonly lotId: number;
  readonly binId: number;
}

/** What the lines of a stock document name by their codes, and what lies where. */
@Injectable()
export class StockLookupRepository {
  async parts(handle: Kysely<DB>, codes: readonly string[]): Promise<StockPart[]> {
    return handle
      .selectFrom('part')
      .select([
        'id',
        'code',
        'name',
        'measure',
        'traced',
        'shelf_life_days as shelfLifeDays',
        'retired_on as retiredOn',
      ])
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .execute();
  }

  async lots(handle: Kysely<DB>, codes: readonly string[]): Promise<StockLot[]> {
    return this.lotColumns(handle)
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .execute();
  }

  async lotsById(handle: Kysely<DB>, ids: readonly number[]): Promise<StockLot[]> {
    return this.lotColumns(handle)
      .where('id', '=', sql<number>`any(${[...ids]}::bigint[])`)
      .execute();
  }

  async bins(handle: Kysely<DB>, codes: readonly string[]): Promise<StockBin[]> {
    return handle
      .selectFrom('bin')
      .select(['id', 'code', 'quarantine', 'retired_at as retiredAt'])
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .execute();
  }

  /** Shared, so that a bin is not retired while something is put into it. */
  async lockBins(trx: Transaction<DB>, codes: readonly string[]): Promise<StockBin[]> {
    return trx
      .selectFrom('bin')
      .select(['id', 'code', 'quarantine', 'retired_at as retiredAt'])
      .where('code', '=', sql<string>`any(${[...codes]}::text[])`)
      .orderBy('id')
      .forShare()
      .execute();
  }

  async supplierId(handle: Kysely<DB>, code: string): Promise<number | undefined> {
    const row = await handle.selectFrom('supplier').select('id').where('code', '=', code).executeTakeFirst();
    return row?.id;
  }

  /** The shop's own balances of lots in bins; a place where nothing ever lay is left out. */
  async balances(handle: Kysely<DB>, places: readonly Place[]): Promise<(Place & { readonly quantity: string })[]> {
    return handle
      .selectFrom('stock_balance')
      .select(['lot_id as lotId', 'bin_id as binId', 'quantity'])
      .where('lot_id', '=', sql<number>`any(${places.map(({ lotId }) => lotId)}::bigint[])`)
      .where('bin_id', '=', sql<number>`any(${places.map(({ binId }) => binId)}::bigint[])`)
      .where('owner_customer_id', 'is', null)
      .execute();
  }

  private lotColumns(handle: Kysely<DB>) {
    return handle
      .selectFrom('lot')
      .select([
        'id',
        'code',
        'part_id as partId',
        'kind',
        'status',
        'unit_cost as unitCost',
        'expires_on as expiresOn',
      ]);
  }
}
