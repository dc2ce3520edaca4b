import { Transform } from 'class-transformer';
import { IsInt, Matches, Max, Min } from 'class-validator';
import { largestPage, pageSizeLimit } from '@emberlot/shared/limits/paging';
import { textLimit } from '@emberlot/shared/limits/text';
import { Optional, Text } from '../validation/fields.js';

/** Numbers in an address arrive as text; only plain digits become one, everything else stays for the check to refuse. */
export function FromDigits(): PropertyDecorator {
  return Transform(({ value }: { value: unknown }) =>
    typeof value === 'string' && /^\d{1,16}$/.test(value) ? Number(value) : value,
  );
}

/** `true` and `false` in an address; everything else stays for the check to refuse. */
export function FromTrueFalse(): PropertyDecorator {
  return Transform(({ value }: { value: unknown }) => (value === 'true' ? true : value === 'false' ? false : value));
}

/** What every list takes; a list with filters extends it. */
export class PageQuery {
  /** Words to look for. */
  @Optional()
  @Text({ max: textLimit.search, min: 0 })
  q?: string;

  @Optional()
  @FromDigits()
  @IsInt({ message: 'Give the page as a whole number.' })
  @Min(1)
  @Max(largestPage)
  page: number = 1;

  @Optional()
  @FromDigits()
  @IsInt({ message: 'Give the size of a page as a whole number.' })
  @Min(1)
  @Max(pageSizeLimit.largest)
  pageSize: number = pageSizeLimit.usual;

  /** A column to sort by; a hyphen in front turns the order round. */
  @Optional()
  @Matches(/^-?[a-zA-Z]{1,40}$/, { message: 'Give one column to sort by, with a hyphen in front to turn it round.' })
  sort?: string;
}
