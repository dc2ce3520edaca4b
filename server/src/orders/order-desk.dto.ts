import { ApiProperty } from '@nestjs/swagger';
import { IsIn } from 'class-validator';
import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { Optional } from '../platform/validation/fields.js';

/** Where an order is, read from the documents beside it; nothing is stored under these names. */
export const orderStates = [
  'cancelled',
  'shipped',
  'review',
  'packed',
  'packing',
  'short',
  'building',
  'ready',
  'paying',
  'unpaid',
] as const;

export type OrderState = (typeof orderStates)[number];

export class OrderDeskQuery extends PageQuery {
  @Optional()
  @IsIn(orderStates)
  state?: OrderState;
}

export class OrderDeskRowDto {
  number: string;
  placedAt: string;
  promisedOn: string;
  /** The promised day has passed and the order is still here. */
  late: boolean;
  recipient: string;
  country: string;
  @ApiProperty({ enum: orderStates, enumName: 'OrderState' })
  state: OrderState;
  /** Where it is, in a sentence. */
  sentence: string;
  /** The open parcel. */
  parcel: string | null;
  /** Null for who works without prices. */
  gross: MoneyDto | null;
}

export class OrderDeskPageDto {
  items: OrderDeskRowDto[];
  total: number;
}

export class OrderDeskNeedDto {
  part: string;
  partName: string;
  measure: string;
  bag: string | null;
  quantity: string;
  /** Claimed on the shelf. */
  fromShelf: string;
  /** Batches that it waits for. */
  batches: string[];
  /** Neither on the shelf nor to come. */
  short: string;
}

export class OrderDeskLineDto {
  title: string;
  part: string;
  form: string;
  quantity: number;
  net: MoneyDto | null;
  needs: OrderDeskNeedDto[];
}

export class OrderDeskDocumentDto {
  kind: string;
  number: string;
  at: string;
  /** What happened, in a sentence. */
  sentence: string;
}

export class OrderDeskReviewDto {
  id: number;
  what: string;
  createdAt: string;
  resolution: string | null;
}

export class OrderDeskDto extends OrderDeskRowDto {
  email: string;
  address: string[];
  net: MoneyDto | null;
  vat: MoneyDto | null;
  delivery: MoneyDto | null;
  vatNote: string | null;
  lines: OrderDeskLineDto[];
  documents: OrderDeskDocumentDto[];
  reviews: OrderDeskReviewDto[];
  /** Whether it may still be cancelled. */
  cancellable: boolean;
}
