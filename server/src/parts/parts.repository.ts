import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';

/** A part's own record, as it is written. */
export interface PartRow {
  readonly code: string;
  readonly name: string;
  readonly description: string | null;
  readonly measure: string;
  readonly traced: string;
  readonly serialLetters: string | null;
  readonly reorderPoint: string | null;
  readonly unitWeightG: string | null;
  readonly shelfLifeDays: number | null;
  readonly originCountryCode: string | null;
  readonly commodityCode: string | null;
}

export interface KnownPartRow extends PartRow {
  readonly id: number;
  readonly retiredOn: string | null;
  readonly version: number;
}

const knownColumns = [
  'id',
  'code',
  'name',
  'description',
  'measure',
  'traced',
  'serial_letters as serialLetters',
  'reorder_point as reorderPoint',
  'unit_weight_g as unitWeightG',
  'shelf_life_days as shelfLifeDays',
  'origin_country_code as originCountryCode',
  'commodity_code as commodityCode',
  'retired_on as retiredOn',
  'version',
] as const;

@Injectable()
export class PartsRepository {
  async findByCode(handle: Kysely<DB>, code: string): Promise<KnownPartRow | undefined> {
    return handle.selectFrom('part').select(knownColumns).where('code', '=', code).executeTakeFirst();
  }

  async hasMoved(handle: Kysely<DB>, partId: number): Promise<boolean> {
    const row = await handle
      .selectFrom('stock_move')
      .select('id')
      .where('part_id', '=', partId)
      .limit(1)
      .executeTakeFirst();
    return row !== undefined;
  }

  async insert(trx: Transaction<DB>, row: PartRow, by: { readonly id: number; readonly at: Date }): Promise<number> {
    const { id } = await trx
      .insertInto('part')
      .values({ ...columnsOf(row), created_at: by.at, created_by: by.id })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  /** @returns false when somebody else saved a newer version */
  async update(trx: Transaction<DB>, id: number, version: number, row: PartRow): Promise<boolean> {
    const result = await trx
      .updateTable('part')
      .set({ ...columnsOf(row), version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  /** @returns false when somebody else saved a newer version */
  async setRetired(trx: Transaction<DB>, id: number, version: number, on: string | null): Promise<boolean> {
    const result = await trx
      .updateTable('part')
      .set({ retired_on: on, version: version + 1 })
      .where('id', '=', id)
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }
}

function columnsOf(row: PartRow) {
  return {
    code: row.code,
    name: row.name,
    description: row.description,
    measure: row.measure,
    traced: row.traced,
    serial_letters: row.serialLetters,
    reorder_point: row.reorderPoint,
    unit_weight_g: row.unitWeightG,
    shelf_life_days: row.shelfLifeDays,
    origin_country_code: row.originCountryCode,
    commodity_code: row.commodityCode,
  };
}
