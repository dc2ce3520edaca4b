import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { currencyCodes } from '@emberlot/shared/money/currency';
import type { Kysely, Transaction } from 'kysely';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { AppError, changedMeanwhile, fieldFault, notFound } from '../platform/errors/app-error.js';
import type {
  ClosedDayDto,
  ClosedDayInputDto,
  CountryDto,
  ShopAnswerDto,
  ShopDto,
  ShopEditDto,
  ShopInputDto,
} from './shop.dto.js';
import { ShopRepository, type ShopRow } from './shop.repository.js';
import { ShopSettingsRepository, type ShopValues } from './shop-settings.repository.js';

/** What the owner says about the shop: at first, and whenever it changes. */
@Injectable()
export class ShopSettingsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    private readonly audit: Audit,
    private readonly shops: ShopRepository,
    private readonly settings: ShopSettingsRepository,
  ) {}

  async read(handle: Kysely<DB> = this.database.handle): Promise<ShopAnswerDto> {
    const row = await this.shops.find(handle);
    const shop = row ? dtoOf(row, await this.settings.hasPosted(handle)) : null;
    return { shop, zone: this.clock.zone };
  }

  /** @throws AppError `already_exists` once the shop is set up */
  async setUp(input: ShopInputDto, person: SignedInUser): Promise<ShopDto> {
    checkCurrency(input.currency);
    return this.transactions.run(async (trx) => {
      if (!(await this.settings.insert(trx, valuesOf(input), this.clock.zone))) {
        throw new AppError('already_exists', 'The shop is set up already. Change it where its details stand.');
      }
      const shop = await this.known(trx);
      await this.record(trx, person, 'shop.set_up', { after: shop });
      return shop;
    });
  }

  /** @throws AppError `changed_meanwhile` with the newer state */
  async edit(input: ShopEditDto, person: SignedInUser): Promise<ShopDto> {
    checkCurrency(input.currency);
    return this.transactions.run(async (trx) => {
      const before = await this.known(trx);
      if (before.currencyStays && before.currency !== input.currency) {
        throw fieldFault('/currency', 'stays', 'The books are kept in this currency already, so it stays.');
      }
      if (!(await this.settings.update(trx, input.version, valuesOf(input)))) {
        throw changedMeanwhile(await this.known(trx));
      }
      const after = await this.known(trx);
      await this.record(trx, person, 'shop.edited', { before, after });
      return after;
    });
  }

  async countries(): Promise<CountryDto[]> {
    return this.settings.countries(this.database.handle);
  }

  async closedDays(): Promise<ClosedDayDto[]> {
    return this.settings.closedDays(this.database.handle);
  }

  async close(input: ClosedDayInputDto, person: SignedInUser): Promise<ClosedDayDto> {
    return this.transactions.run(async (trx) => {
      await this.settings.insertClosedDay(trx, input);
      await this.recordDay(trx, person, 'shop.day_closed', input);
      return input;
    });
  }

  /** @throws AppError `not_found` */
  async open(day: string, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const removed = await this.settings.removeClosedDay(trx, day);
      if (!removed) throw notFound('closed day');
      await this.recordDay(trx, person, 'shop.day_opened', removed);
    });
  }

  private async known(handle: Kysely<DB>): Promise<ShopDto> {
    const { shop } = await this.read(handle);
    if (!shop) throw new AppError('wrong_state', 'The shop is not set up yet.');
    return shop;
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    change: { before?: ShopDto; after: ShopDto },
  ): Promise<void> {
    const { before, after } = change;
    await this.audit.record(trx, {
      actor,
      action,
      subjectKind: 'shop',
      subjectId: null,
      subjectCode: after.name,
      ...(before && { before }),
      after,
    });
  }

  private async recordDay(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    day: ClosedDayInputDto,
  ): Promise<void> {
    const subject = { subjectKind: 'shop_closed_day', subjectId: null, subjectCode: day.day };
    await this.audit.record(trx, { actor, action, ...subject, after: day });
  }
}

function checkCurrency(currency: string): void {
  if (currencyCodes.some((code) => code === currency)) return;
  throw fieldFault('/currency', 'unknown', 'There is no currency of these letters.');
}

function valuesOf(input: ShopInputDto): ShopValues {
  return {
    name: input.name,
    legal_name: input.legalName,
    address_line: input.addressLine,
    city: input.city,
    postcode: input.postcode,
    country_code: input.countryCode,
    email: input.email,
    phone: input.phone ?? null,
    vat_number: input.vatNumber ?? null,
    registration_number: input.registrationNumber ?? null,
    bank_name: input.bankName ?? null,
    iban: input.iban ?? null,
    currency: input.currency,
    working_weekdays: input.workingWeekdays.toSorted((left, right) => left - right),
    handling_days: input.handlingDays,
    checkout_hold_minutes: input.checkoutHoldMinutes,
    labour_rate_minor: input.labourRateMinor,
    warranty_months: input.warrantyMonths,
    one_stop_shop_from: input.oneStopShopFrom ?? null,
  };
}

function dtoOf(row: ShopRow, currencyStays: boolean): ShopDto {
  return {
    name: row.name,
    legalName: row.legal_name,
    addressLine: row.address_line,
    city: row.city,
    postcode: row.postcode,
    countryCode: row.country_code,
    email: row.email,
    phone: row.phone,
    vatNumber: row.vat_number,
    registrationNumber: row.registration_number,
    bankName: row.bank_name,
    iban: row.iban,
    currency: row.currency,
    workingWeekdays: row.working_weekdays,
    handlingDays: row.handling_days,
    checkoutHoldMinutes: row.checkout_hold_minutes,
    labourRateMinor: row.labour_rate_minor,
    warrantyMonths: row.warranty_months,
    oneStopShopFrom: row.one_stop_shop_from,
    zone: row.zone,
    currencyStays,
    version: row.version,
  };
}
