import { ApiProperty } from '@nestjs/swagger';
import { IsIn } from 'class-validator';
import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { Day, Optional } from '../platform/validation/fields.js';

export const invoiceKinds = ['invoice', 'credit_note'] as const;

export type InvoiceKind = (typeof invoiceKinds)[number];

export class InvoicesQuery extends PageQuery {
  @Optional()
  @IsIn(invoiceKinds)
  kind?: InvoiceKind;

  /** First day of issue. */
  @Optional()
  @Day()
  from?: string;

  /** Last day of issue. */
  @Optional()
  @Day()
  to?: string;
}

export class InvoiceRowDto {
  number: string;
  @ApiProperty({ enum: invoiceKinds, enumName: 'InvoiceKind' })
  kind: InvoiceKind;
  issuedOn: string;
  /** The order's number. */
  reference: string;
  buyer: string;
  country: string;
  net: MoneyDto;
  vat: MoneyDto;
  gross: MoneyDto;
  /** Of a credit note: the invoice it takes back. */
  creditsNumber: string | null;
}

export class InvoicePageDto {
  items: InvoiceRowDto[];
  total: number;
}

export class InvoicePartyDto {
  name: string;
  addressLine: string;
  addressLine2: string | null;
  city: string;
  postcode: string;
  countryCode: string;
  vatNumber: string | null;
}

export class InvoiceLineDto {
  code: string;
  description: string;
  quantity: string;
  measure: string;
  /** Major units, decimal text. */
  unitNet: string;
  vatRate: string;
  net: MoneyDto;
}

export class InvoiceChargeDto {
  reason: string;
  vatRate: string;
  amount: MoneyDto;
}

export class InvoiceVatDto {
  rate: string;
  category: string;
  taxable: MoneyDto;
  amount: MoneyDto;
}

export class InvoiceDto extends InvoiceRowDto {
  taxPoint: string;
  seller: InvoicePartyDto;
  buyerParty: InvoicePartyDto;
  prepaid: MoneyDto;
  reason: string | null;
  /** What stands under the totals. */
  notes: string[];
  creditedBy: string[];
  lines: InvoiceLineDto[];
  charges: InvoiceChargeDto[];
  vatGroups: InvoiceVatDto[];
}
