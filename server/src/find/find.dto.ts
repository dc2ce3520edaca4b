import { Max, Min, IsInt } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { FromDigits } from '../platform/paging/page-query.dto.js';
import { Optional, Text } from '../platform/validation/fields.js';

export class FindQuery {
  /** A scanned code, or a few letters. */
  @Text({ max: textLimit.line })
  q: string;

  @Optional()
  @FromDigits()
  @IsInt({ message: 'Give a whole number.' })
  @Min(1)
  @Max(20)
  limit: number = 8;
}

export const foundKinds = [
  'part',
  'lot',
  'unit',
  'batch',
  'order',
  'invoice',
  'bin',
  'supplier',
  'document',
  'person',
] as const;

export type FoundKind = (typeof foundKinds)[number];

export class FoundDto {
  kind: FoundKind;
  /** What stands on its tag. */
  code: string;
  /** One line about it. */
  story: string;
  /** Whether its code is the very one asked for. */
  exact: boolean;
  /** Where it lives, if not at the address of its kind. */
  to?: string;
}

export class FoundListDto {
  items: FoundDto[];
  total: number;
}
