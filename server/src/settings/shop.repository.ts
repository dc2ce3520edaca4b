import { Injectable } from '@nestjs/common';
import type { DB, Shop } from '@emberlot/db/database.types';
import type { Kysely, Selectable } from 'kysely';

export type ShopRow = Selectable<Shop>;

@Injectable()
export class ShopRepository {
  async find(handle: Kysely<DB>): Promise<ShopRow | undefined> {
    return handle.selectFrom('shop').selectAll().executeTakeFirst();
  }

  async closedDays(handle: Kysely<DB>, from: string, until: string): Promise<string[]> {
    const rows = await handle
      .selectFrom('shop_closed_day')
      .select('day')
      .where('day', '>=', from)
      .where('day', '<=', until)
      .orderBy('day')
      .execute();
    return rows.map(({ day }) => day);
  }
}
