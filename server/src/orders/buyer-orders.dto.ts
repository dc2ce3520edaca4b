import { ApiProperty } from '@nestjs/swagger';
import { MoneyDto } from '../platform/api/money.dto.js';

export class BuyerOrderLineDto {
  title: string;
  quantity: number;
  net: MoneyDto;
  vatRate: string;
}

export class BuyerOrderEventDto {
  /** ISO instant. */
  at: string;
  /** What happened, in a sentence. */
  what: string;
}

export class BuyerInvoiceDto {
  id: number;
  number: string;
  @ApiProperty({ enum: ['invoice', 'credit_note'] })
  kind: string;
  issuedOn: string;
  gross: MoneyDto;
}

export class BuyerUnitDto {
  serial: string;
  /** Opens the unit's public page. */
  pageToken: string;
}

/** An order as its buyer sees it; where it stands is read from what happened to it. */
export class BuyerOrderDto {
  number: string;
  placedAt: string;
  recipient: string;
  company: string | null;
  addressLine: string;
  addressLine2: string | null;
  city: string;
  postcode: string;
  country: string;
  lines: BuyerOrderLineDto[];
  delivery: MoneyDto;
  net: MoneyDto;
  vat: MoneyDto;
  gross: MoneyDto;
  vatNote: string | null;
  /** The day it was promised to leave; it never changes. */
  promisedOn: string;
  /** Where it stands, in a sentence. */
  standing: string;
  events: BuyerOrderEventDto[];
  invoices: BuyerInvoiceDto[];
  units: BuyerUnitDto[];
  canPay: boolean;
}

export class BuyerOrderRowDto {
  number: string;
  placedAt: string;
  gross: MoneyDto;
  standing: string;
}

export class BuyerOrdersDto {
  items: BuyerOrderRowDto[];
}

export class PaymentPageDto {
  /** Null when the payments service did not answer. */
  paymentPage: string | null;
}
