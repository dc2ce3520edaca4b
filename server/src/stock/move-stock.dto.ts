import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsIn, Matches, ValidateNested } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { CodeOf } from '../platform/validation/codes.js';
import { Nullable, Optional, Quantity, Text } from '../platform/validation/fields.js';

export class TransferLineDto {
  @CodeOf('part')
  part: string;

  /** Not needed for a part followed by count. */
  @Optional()
  @Nullable()
  @CodeOf('lot')
  lot?: string | null;

  /** Where it lies. */
  @CodeOf('bin')
  bin: string;

  /** Where it goes. */
  @CodeOf('bin')
  toBin: string;

  @Quantity()
  quantity: string;
}

export class TransferInputDto {
  @IsArray()
  @ArrayMinSize(1, { message: 'Enter at least one line.' })
  @ArrayMaxSize(200)
  @ValidateNested({ each: true })
  @Type(() => TransferLineDto)
  lines: TransferLineDto[];

  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  note?: string | null;
}

export const adjustmentReasons = ['found', 'lost', 'damaged', 'counted'] as const;

export type AdjustmentReason = (typeof adjustmentReasons)[number];

export class AdjustmentLineDto {
  @CodeOf('part')
  part: string;

  /** Not needed for a part followed by count. */
  @Optional()
  @Nullable()
  @CodeOf('lot')
  lot?: string | null;

  @CodeOf('bin')
  bin: string;

  /** How much was found, lost or damaged; where it was counted, how much lies there. */
  @Quantity({ zero: true })
  quantity: string;

  /** Cost of one stock unit of what was found, in the shop's currency; left out, the shelf's average counts. */
  @Optional()
  @Nullable()
  @Matches(/^(?:0|[1-9]\d{0,8})(?:\.\d{1,6})?$/, { message: 'Give a cost with at most six decimals, such as 0.0125.' })
  unitCost?: string | null;
}

export class AdjustmentInputDto {
  @IsIn(adjustmentReasons, { message: 'Say why the shelf differs: found, lost, damaged or counted.' })
  reason: AdjustmentReason;

  /** What happened, for whoever reads it later. */
  @Text({ max: textLimit.line })
  note: string;

  @IsArray()
  @ArrayMinSize(1, { message: 'Enter at least one line.' })
  @ArrayMaxSize(200)
  @ValidateNested({ each: true })
  @Type(() => AdjustmentLineDto)
  lines: AdjustmentLineDto[];
}

export class ReversalInputDto {
  /** Why it was wrong. */
  @Text({ max: textLimit.line })
  reason: string;
}

/** The document that was made. */
export class StockDocumentDto {
  number: string;
}
