import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';

export interface DeliveryRow {
  readonly netMinor: number;
  readonly transitDays: number;
  readonly carriesLithium: boolean;
}

export interface CountryRow {
  readonly code: string;
  readonly name: string;
}

/** What delivery costs on a day. */
@Injectable()
export class DeliveryRepository {
  async find(handle: Kysely<DB>, country: string, day: string): Promise<DeliveryRow | undefined> {
    return handle
      .selectFrom('delivery_rate')
      .select(['net_minor as netMinor', 'transit_days as transitDays', 'carries_lithium as carriesLithium'])
      .where('country_code', '=', country)
      .where('valid_from', '<=', day)
      .orderBy('valid_from', 'desc')
      .limit(1)
      .executeTakeFirst();
  }

  async findCountry(handle: Kysely<DB>, code: string): Promise<CountryRow | undefined> {
    return handle.selectFrom('country').select(['code', 'name']).where('code', '=', code).executeTakeFirst();
  }

  /** Countries the shop delivers to, by name. */
  async countries(handle: Kysely<DB>, day: string): Promise<CountryRow[]> {
    return handle
      .selectFrom('country')
      .select(['code', 'name'])
      .where((where) =>
        where.exists(
          where
            .selectFrom('delivery_rate as d')
            .select('d.id')
            .whereRef('d.country_code', '=', 'country.code')
            .where('d.valid_from', '<=', day),
        ),
      )
      .orderBy('name')
      .execute();
  }
}
