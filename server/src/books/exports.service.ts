import { Injectable } from '@nestjs/common';
import { majorText } from '@emberlot/shared/money/amount-text';
import { currencyCode } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { Database } from '../platform/database/database.js';
import { fieldFault } from '../platform/errors/app-error.js';
import { ShopService } from '../settings/shop.service.js';
import type { ExportQuery, ExportTotalsDto } from './books.dto.js';
import { csvFile, type CsvCell } from './csv.js';
import { ExportsRepository } from './exports.repository.js';

const text = (value: string | null): CsvCell => ({ text: value ?? '' });
const number = (value: string | number): CsvCell => ({ number: String(value) });

/** Files of a period for the accountant's own program, with the totals by which to check them. */
@Injectable()
export class ExportsService {
  constructor(
    private readonly database: Database,
    private readonly shop: ShopService,
    private readonly repository: ExportsRepository,
  ) {}

  /** One line per invoice and VAT rate; credit notes stand with minus signs. */
  async invoices({ from, to }: ExportQuery): Promise<string> {
    refuseBackwards(from, to);
    const rows = await this.repository.invoices(this.database.handle, from, to);
    return csvFile(
      [
        'number',
        'kind',
        'issued_on',
        'tax_point',
        'credits',
        'order',
        'buyer',
        'country',
        'treatment',
        'vat_category',
        'vat_rate',
        'net',
        'vat',
        'gross',
        'currency',
      ],
      rows.map((row) => {
        const sign = row.kind === 'invoice' ? 1 : -1;
        const amount = (minor: number) => number(majorText(minorAmount(sign * minor), currencyCode(row.currency)));
        return [
          text(row.number),
          text(row.kind),
          text(row.issuedOn),
          text(row.taxPoint),
          text(row.creditsNumber),
          text(row.reference),
          text(row.buyer),
          text(row.country),
          text(row.treatment),
          text(row.category),
          number(new Decimal(row.rate).toFixed()),
          amount(row.taxable),
          amount(row.vat),
          amount(row.taxable + row.vat),
          text(row.currency),
        ];
      }),
    );
  }

  /** One line per line of the journal. */
  async entries({ from, to }: ExportQuery): Promise<string> {
    refuseBackwards(from, to);
    const currency = currencyCode((await this.shop.get(this.database.handle)).currency);
    const amount = (minor: number) => number(majorText(minorAmount(minor), currency));
    const rows = await this.repository.lines(this.database.handle, from, to);
    return csvFile(
      ['entry', 'day', 'event', 'document', 'narrative', 'account', 'account_name', 'debit', 'credit', 'currency'],
      rows.map((row) => [
        number(row.entry),
        text(row.day),
        text(row.event),
        text(row.document),
        text(row.narrative),
        text(row.account),
        text(row.accountName),
        amount(row.debit),
        amount(row.credit),
        text(currency),
      ]),
    );
  }

  async totals({ from, to }: ExportQuery): Promise<ExportTotalsDto> {
    refuseBackwards(from, to);
    const { currency } = await this.shop.get(this.database.handle);
    const money = (amount: number) => ({ amount, currency });
    const { net, vat, gross, debit, credit, ...counts } = await this.repository.totals(this.database.handle, from, to);
    return {
      from,
      to,
      ...counts,
      net: money(net),
      vat: money(vat),
      gross: money(gross),
      debit: money(debit),
      credit: money(credit),
    };
  }
}

function refuseBackwards(from: string, to: string): void {
  if (to < from) throw fieldFault('/to', 'period', 'The last day lies before the first. Give a later one.');
}
