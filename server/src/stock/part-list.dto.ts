import { IsBoolean, IsIn } from 'class-validator';
import { MoneyDto } from '../platform/api/money.dto.js';
import { FromTrueFalse, PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Optional } from '../platform/validation/fields.js';

export class PartsQuery extends PageQuery {
  /** Less is free than the reorder point, or more is claimed than can be used. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  short?: boolean;

  /** A bin's code: parts of which something lies there. */
  @Optional()
  @CodeOf('bin')
  bin?: string;

  @Optional()
  @IsIn(['count', 'delivery', 'single'])
  traced?: 'count' | 'delivery' | 'single';

  /** A supplier's code: parts that can be bought there. */
  @Optional()
  @CodeOf('supplier')
  supplier?: string;

  /** Only the ones no longer in use; otherwise only those that are. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  retired?: boolean;
}

export class PartFiguresDto {
  /** All that lies on the shelf. */
  onShelf: string;
  /** Of that, what may be issued: released, not expired, in no quarantine bin. */
  usable: string;
  /** Of that, what is held back. */
  held: string;
  claimed: string;
  /** Usable and claimed by nobody; below zero when supply shrank under its claims. */
  free: string;
  /** By how much more is claimed than can be used; null when nothing is missing. */
  short: string | null;
  belowReorderPoint: boolean;
  /** How many days the free quantity lasts at the pace of the last 90 days; null without use. */
  lastsDays: number | null;
  /** In major units per stock unit. Not shown to assemblers. */
  averageCost?: string | null;
  value?: MoneyDto;
}

export class PartItemDto extends PartFiguresDto {
  code: string;
  name: string;
  measure: string;
  traced: string;
  reorderPoint: string | null;
  retired: boolean;
  bins: string[];
}

export class PartPageDto {
  items: PartItemDto[];
  total: number;
}
