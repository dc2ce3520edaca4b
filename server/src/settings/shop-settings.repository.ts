import { Injectable } from '@nestjs/common';
import type { DB, Shop } from '@emberlot/db/database.types';
import type { Insertable, Kysely, Transaction } from 'kysely';
import type { ClosedDayDto, ClosedDayInputDto, CountryDto } from './shop.dto.js';

export type ShopValues = Omit<Insertable<Shop>, 'id' | 'zone' | 'version'>;

@Injectable()
export class ShopSettingsRepository {
  /** @returns false when there is a shop already */
  async insert(trx: Transaction<DB>, values: ShopValues, zone: string): Promise<boolean> {
    const row = await trx
      .insertInto('shop')
      .values({ ...values, zone })
      .onConflict((conflict) => conflict.column('id').doNothing())
      .returning('id')
      .executeTakeFirst();
    return row !== undefined;
  }

  /** @returns false when somebody else saved a newer version */
  async update(trx: Transaction<DB>, version: number, values: ShopValues): Promise<boolean> {
    const result = await trx
      .updateTable('shop')
      .set({ ...values, version: version + 1 })
      .where('version', '=', version)
      .executeTakeFirst();
    return result.numUpdatedRows === 1n;
  }

  async hasPosted(handle: Kysely<DB>): Promise<boolean> {
    return (await handle.selectFrom('journal_entry').select('id').limit(1).executeTakeFirst()) !== undefined;
  }

  async countries(handle: Kysely<DB>): Promise<CountryDto[]> {
    return handle.selectFrom('country').select(['code', 'name', 'in_union as inUnion']).orderBy('name').execute();
  }

  async closedDays(handle: Kysely<DB>): Promise<ClosedDayDto[]> {
    return handle.selectFrom('shop_closed_day').select(['day', 'name']).orderBy('day').execute();
  }

  async insertClosedDay(trx: Transaction<DB>, row: ClosedDayInputDto): Promise<void> {
    await trx.insertInto('shop_closed_day').values({ day: row.day, name: row.name }).execute();
  }

  async removeClosedDay(trx: Transaction<DB>, day: string): Promise<ClosedDayDto | undefined> {
    return trx.deleteFrom('shop_closed_day').where('day', '=', day).returning(['day', 'name']).executeTakeFirst();
  }
}
