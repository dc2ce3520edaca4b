import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import type {
  DeliveryRateInputDto,
  VatExceptionDto,
  VatExceptionInputDto,
  VatRateDto,
  VatRateInputDto,
} from './shop.dto.js';

export interface DeliveryRateRow {
  readonly id: number;
  readonly countryCode: string;
  readonly netMinor: number;
  readonly transitDays: number;
  readonly carriesLithium: boolean;
  readonly validFrom: string;
}

const rateColumns = [
  'id',
  'country_code as countryCode',
  'rate',
  'valid_from as validFrom',
  'valid_until as validUntil',
  'source',
] as const;

const deliveryColumns = [
  'id',
  'country_code as countryCode',
  'net_minor as netMinor',
  'transit_days as transitDays',
  'carries_lithium as carriesLithium',
  'valid_from as validFrom',
] as const;

const exceptionColumns = ['country_code as countryCode', 'postcode_prefix as postcodePrefix', 'sentence'] as const;

/** Dated tax and delivery rules, as data. */
@Injectable()
export class TaxSettingsRepository {
  async vatRates(handle: Kysely<DB>): Promise<VatRateDto[]> {
    return handle.selectFrom('vat_rate').select(rateColumns).orderBy('country_code').orderBy('valid_from').execute();
  }

  async lockVatRates(trx: Transaction<DB>, countryCode: string): Promise<VatRateDto[]> {
    // The country's row stands for all its rates, those that are just being added included.
    await trx.selectFrom('country').select('code').where('code', '=', countryCode).forNoKeyUpdate().execute();
    return trx
      .selectFrom('vat_rate')
      .select(rateColumns)
      .where('country_code', '=', countryCode)
      .orderBy('valid_from')
      .execute();
  }

  async endVatRate(trx: Transaction<DB>, id: number, until: string): Promise<void> {
    await trx.updateTable('vat_rate').set({ valid_until: until }).where('id', '=', id).execute();
  }

  async insertVatRate(trx: Transaction<DB>, row: VatRateInputDto): Promise<VatRateDto> {
    return trx
      .insertInto('vat_rate')
      .values({ country_code: row.countryCode, rate: row.rate, valid_from: row.validFrom, source: row.source })
      .returning(rateColumns)
      .executeTakeFirstOrThrow();
  }

  async removeVatRate(trx: Transaction<DB>, id: number): Promise<VatRateDto | undefined> {
    return trx.deleteFrom('vat_rate').where('id', '=', id).returning(rateColumns).executeTakeFirst();
  }

  async vatExceptions(handle: Kysely<DB>): Promise<VatExceptionDto[]> {
    return handle
      .selectFrom('vat_exception')
      .select(exceptionColumns)
      .orderBy('country_code')
      .orderBy('postcode_prefix')
      .execute();
  }

  async insertVatException(trx: Transaction<DB>, row: VatExceptionInputDto): Promise<VatExceptionDto> {
    return trx
      .insertInto('vat_exception')
      .values({ country_code: row.countryCode, postcode_prefix: row.postcodePrefix, sentence: row.sentence })
      .returning(exceptionColumns)
      .executeTakeFirstOrThrow();
  }

  async removeVatException(
    trx: Transaction<DB>,
    countryCode: string,
    postcodePrefix: string,
  ): Promise<VatExceptionDto | undefined> {
    return trx
      .deleteFrom('vat_exception')
      .where('country_code', '=', countryCode)
      .where('postcode_prefix', '=', postcodePrefix)
      .returning(exceptionColumns)
      .executeTakeFirst();
  }

  async deliveryRates(handle: Kysely<DB>): Promise<DeliveryRateRow[]> {
    return handle
      .selectFrom('delivery_rate')
      .select(deliveryColumns)
      .orderBy('country_code')
      .orderBy('valid_from')
      .execute();
  }

  async insertDeliveryRate(trx: Transaction<DB>, row: DeliveryRateInputDto): Promise<DeliveryRateRow> {
    return trx
      .insertInto('delivery_rate')
      .values({
        country_code: row.countryCode,
        net_minor: row.netMinor,
        transit_days: row.transitDays,
        carries_lithium: row.carriesLithium,
        valid_from: row.validFrom,
      })
      .returning(deliveryColumns)
      .executeTakeFirstOrThrow();
  }

  async removeDeliveryRate(trx: Transaction<DB>, id: number): Promise<DeliveryRateRow | undefined> {
    return trx.deleteFrom('delivery_rate').where('id', '=', id).returning(deliveryColumns).executeTakeFirst();
  }
}
