import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import type { Kysely } from 'kysely';
import { AppError } from '../platform/errors/app-error.js';
import { ShopRepository, type ShopRow } from './shop.repository.js';

/** The one shop as it is set up. */
export type Shop = ShopRow;

/** The shop's own settings, as every domain reads them. */
@Injectable()
export class ShopService {
  constructor(private readonly repository: ShopRepository) {}

  /** The shop, or nothing while it has not been set up. */
  async find(handle: Kysely<DB>): Promise<Shop | undefined> {
    return this.repository.find(handle);
  }

  /** @throws AppError `wrong_state` while the shop has not been set up */
  async get(handle: Kysely<DB>): Promise<Shop> {
    const shop = await this.repository.find(handle);
    if (!shop)
      throw new AppError('wrong_state', 'The shop is not set up yet: give its name, address and currency first.');
    return shop;
  }

  /** Digits of the minor unit of the shop's currency. */
  async exponent(handle: Kysely<DB>): Promise<number> {
    const { currency } = await this.get(handle);
    return currencyExponent(currencyCode(currency));
  }
}
