import { Injectable } from '@nestjs/common';
import type { Kysely } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import type { Letterhead } from './mail-content.js';

/** A shop that is not set up yet writes under the product's name. */
const unnamed: Letterhead = { name: 'Emberlot', lines: ['Emberlot'] };

@Injectable()
export class LetterheadReader {
  async read(handle: Kysely<DB>): Promise<Letterhead> {
    const shop = await handle
      .selectFrom('shop')
      .select(['name', 'legal_name', 'address_line', 'city', 'postcode', 'country_code', 'email', 'vat_number'])
      .executeTakeFirst();
    if (!shop) return unnamed;
    const place = `${shop.address_line}, ${shop.postcode} ${shop.city}, ${shop.country_code}`;
    const vat = shop.vat_number ? [`VAT number ${shop.vat_number}`] : [];
    return { name: shop.name, lines: [shop.legal_name, place, shop.email, ...vat] };
  }
}
