import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely } from 'kysely';

export interface VatRuleRows {
  readonly rates: readonly { country: string; rate: string; from: string; until: string | null }[];
  readonly countries: readonly { country: string; inUnion: boolean }[];
  readonly places: readonly { country: string; prefix: string; sentence: string }[];
}

@Injectable()
export class VatRulesRepository {
  /** The rows that bear on supplies from one country to another. */
  async read(handle: Kysely<DB>, countries: readonly string[]): Promise<VatRuleRows> {
    const rates = await handle
      .selectFrom('vat_rate')
      .select(['country_code as country', 'rate', 'valid_from as from', 'valid_until as until'])
      .where('country_code', 'in', [...countries])
      .execute();
    const areas = await handle
      .selectFrom('country')
      .select(['code as country', 'in_union as inUnion'])
      .where('code', 'in', [...countries])
      .execute();
    const places = await handle
      .selectFrom('vat_exception')
      .select(['country_code as country', 'postcode_prefix as prefix', 'sentence'])
      .where('country_code', 'in', [...countries])
      .execute();
    return { rates, countries: areas, places };
  }
}
