import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimalText } from '@emberlot/shared/measure/decimal';
import { addDays, isoDay } from '@emberlot/shared/plan/iso-day';
import type { Transaction } from 'kysely';
import type { Plain } from '../platform/api/plain.js';
import { Audit } from '../platform/audit/audit.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { fieldFault, notFound } from '../platform/errors/app-error.js';
import type {
  DeliveryRateDto,
  DeliveryRateInputDto,
  VatExceptionDto,
  VatExceptionInputDto,
  VatRateDto,
  VatRateInputDto,
} from './shop.dto.js';
import { ShopService } from './shop.service.js';
import { TaxSettingsRepository, type DeliveryRateRow } from './tax-settings.repository.js';

/**
 * The dated rules by which tax and delivery are worked out. A rule is added and removed, not edited: what was sold by it
 * keeps its own figures, and the record shows both.
 */
@Injectable()
export class TaxSettingsService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly audit: Audit,
    private readonly shop: ShopService,
    private readonly rules: TaxSettingsRepository,
  ) {}

  async vatRates(): Promise<VatRateDto[]> {
    return (await this.rules.vatRates(this.database.handle)).map(rateDto);
  }

  /** A new rate ends the one before it on the day before. */
  async addVatRate(input: VatRateInputDto, person: SignedInUser): Promise<VatRateDto> {
    return this.transactions.run(async (trx) => {
      const known = await this.rules.lockVatRates(trx, input.countryCode);
      const last = known.at(-1);
      if (last && last.validFrom >= input.validFrom) {
        const sentence = `There is a rate from ${last.validFrom} on already. A new one must begin later; remove the other if it is wrong.`;
        throw fieldFault('/validFrom', 'too_early', sentence);
      }
      const dayBefore = addDays(isoDay(input.validFrom), -1);
      if (last && (last.validUntil === null || last.validUntil > dayBefore)) {
        await this.rules.endVatRate(trx, last.id, dayBefore);
      }
      const added = await this.rules.insertVatRate(trx, input);
      await this.record(trx, person, 'vat_rate.added', added.countryCode, { after: added });
      return rateDto(added);
    });
  }

  async removeVatRate(id: number, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const removed = await this.rules.removeVatRate(trx, id);
      if (!removed) throw notFound('VAT rate');
      await this.record(trx, person, 'vat_rate.removed', removed.countryCode, { before: removed });
    });
  }

  async vatExceptions(): Promise<VatExceptionDto[]> {
    return this.rules.vatExceptions(this.database.handle);
  }

  async addVatException(input: VatExceptionInputDto, person: SignedInUser): Promise<VatExceptionDto> {
    return this.transactions.run(async (trx) => {
      const added = await this.rules.insertVatException(trx, input);
      await this.record(trx, person, 'vat_exception.added', added.countryCode, { after: added });
      return added;
    });
  }

  async removeVatException(countryCode: string, postcodePrefix: string, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const removed = await this.rules.removeVatException(trx, countryCode, postcodePrefix);
      if (!removed) throw notFound('VAT exception');
      await this.record(trx, person, 'vat_exception.removed', removed.countryCode, { before: removed });
    });
  }

  async deliveryRates(): Promise<DeliveryRateDto[]> {
    const { currency } = await this.shop.get(this.database.handle);
    const rows = await this.rules.deliveryRates(this.database.handle);
    return rows.map((row) => deliveryDto(row, currency));
  }

  async addDeliveryRate(input: DeliveryRateInputDto, person: SignedInUser): Promise<DeliveryRateDto> {
    return this.transactions.run(async (trx) => {
      const { currency } = await this.shop.get(trx);
      const added = await this.rules.insertDeliveryRate(trx, input);
      await this.record(trx, person, 'delivery_rate.added', added.countryCode, { after: added });
      return deliveryDto(added, currency);
    });
  }

  async removeDeliveryRate(id: number, person: SignedInUser): Promise<void> {
    await this.transactions.run(async (trx) => {
      const removed = await this.rules.removeDeliveryRate(trx, id);
      if (!removed) throw notFound('delivery rate');
      await this.record(trx, person, 'delivery_rate.removed', removed.countryCode, { before: removed });
    });
  }

  private async record(
    trx: Transaction<DB>,
    actor: SignedInUser,
    action: string,
    country: string,
    change: { before?: object; after?: object },
  ): Promise<void> {
    const [subjectKind = 'rule'] = action.split('.');
    await this.audit.record(trx, {
      actor,
      action,
      subjectKind,
      subjectId: null,
      subjectCode: country,
      ...(change.before && { before: change.before }),
      ...(change.after && { after: change.after }),
    });
  }
}

function rateDto(row: Plain<VatRateDto>): VatRateDto {
  return { ...row, rate: decimalText(row.rate) };
}

function deliveryDto(row: DeliveryRateRow, currency: string): DeliveryRateDto {
  const { netMinor, ...rest } = row;
  return { ...rest, net: { amount: netMinor, currency } };
}
