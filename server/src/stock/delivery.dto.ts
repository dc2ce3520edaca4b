import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsBoolean, Matches, ValidateNested } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Day, MinorAmount, Nullable, Optional, Quantity, Text } from '../platform/validation/fields.js';

export class DeliveryLineInputDto {
  @CodeOf('part')
  part: string;

  /** In the part's stock unit. */
  @Quantity()
  quantity: string;

  /** Price of one stock unit without VAT, in the shop's currency; or give the value of the line. */
  @Optional()
  @Nullable()
  @Matches(/^(?:0|[1-9]\d{0,8})(?:\.\d{1,6})?$/, { message: 'Give a price with at most six decimals, such as 0.0125.' })
  unitPrice?: string | null;

  /** Value of the whole line without VAT, in minor units of the shop's currency. */
  @Optional()
  @Nullable()
  @MinorAmount()
  lineValueMinor?: number | null;

  @CodeOf('bin')
  bin: string;

  /** What the supplier calls the lot; for parts followed by delivery. */
  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  supplierLot?: string | null;

  @Optional()
  @Nullable()
  @Day()
  expiresOn?: string | null;

  /** Kept back until somebody has looked at it; for parts followed by delivery. */
  @IsBoolean()
  held: boolean;
}

export class DeliveryInputDto {
  @CodeOf('supplier')
  supplier: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  deliveryNote?: string | null;

  @Day()
  receivedOn: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  note?: string | null;

  @IsArray()
  @ArrayMinSize(1, { message: 'Enter at least one line.' })
  @ArrayMaxSize(200)
  @ValidateNested({ each: true })
  @Type(() => DeliveryLineInputDto)
  lines: DeliveryLineInputDto[];
}

export class DeliveriesQuery extends PageQuery {
  /** A supplier's code. */
  @Optional()
  @CodeOf('supplier')
  supplier?: string;
}

export class DeliveryItemDto {
  number: string;
  receivedOn: string;
  supplier: string;
  supplierName: string;
  deliveryNote: string | null;
  lineCount: number;
  recordedBy: string | null;
  /** The number of the document that reversed it. */
  reversedBy: string | null;
  /** Not shown to assemblers. */
  value?: MoneyDto;
}

export class DeliveryPageDto {
  items: DeliveryItemDto[];
  total: number;
}

export class DeliveryLineDto {
  part: string;
  name: string;
  measure: string;
  lot: string;
  lotStatus: string;
  supplierLot: string | null;
  expiresOn: string | null;
  bin: string;
  quantity: string;
  /** Not shown to assemblers. */
  unitCost?: string;
  value?: MoneyDto;
}

export class DeliveryDto extends DeliveryItemDto {
  note: string | null;
  occurredAt: string;
  lines: DeliveryLineDto[];
}
