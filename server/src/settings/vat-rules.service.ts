import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { VatRules } from '@emberlot/shared/money/vat-rules';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import type { Kysely } from 'kysely';
import { ShopService } from './shop.service.js';
import { VatRulesRepository } from './vat-rules.repository.js';

/** The kind of goods of all that the shop sells: the standard rate. */
export const standardRate = 'standard';

/** Rates and borders hold from the first row's day on; what is older is not asked about. */
const always = isoDay('2000-01-01');

/** What the shop has set down about VAT, in the form in which the decision is made. */
@Injectable()
export class VatRulesService {
  constructor(
    private readonly shop: ShopService,
    private readonly repository: VatRulesRepository,
  ) {}

  /** The rules for supplies to a country. */
  async load(handle: Kysely<DB>, destination: string): Promise<VatRules> {
    const shop = await this.shop.get(handle);
    const rows = await this.repository.read(handle, [...new Set([shop.country_code, destination])]);
    return {
      home: shop.country_code,
      rates: rows.rates.map(({ country, rate, from, until }) => ({
        country,
        rateClass: standardRate,
        ratePercent: rate,
        from: isoDay(from),
        until: until === null ? null : isoDay(until),
      })),
      areas: rows.countries.map(({ country, inUnion }) => ({
        country,
        area: inUnion ? 'union' : 'outside',
        from: always,
      })),
      specialPlaces: rows.places.map(({ country, prefix }) => ({ country, postcodePrefix: prefix, from: always })),
      oneStopShop: shop.one_stop_shop_from === null ? [] : [{ from: isoDay(shop.one_stop_shop_from) }],
      overThreshold: [],
    };
  }
}
