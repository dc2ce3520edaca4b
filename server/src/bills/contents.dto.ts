import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, Matches, ValidateNested } from 'class-validator';
import { billLimit } from '@emberlot/shared/limits/bills';
import { CodeOf } from '../platform/validation/codes.js';
import { Quantity, Whole } from '../platform/validation/fields.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { BillPartDto } from './bill.dto.js';

export class ContentsLineInputDto {
  @CodeOf('part')
  part: string;

  @Quantity()
  quantity: string;

  /** Which bag it goes into. */
  @Matches(/^[\p{L}\p{N}][\p{L}\p{N} .-]{0,23}$/u, {
    message: `Name the bag with up to ${billLimit.bag} letters, digits, spaces and the signs - and .`,
  })
  bag: string;
}

/** A kit's contents list, whole, in the order in which it is packed. */
export class ContentsEditDto {
  /** As read; 0 for a list that is not there yet. */
  @Whole({ min: 0, max: Number.MAX_SAFE_INTEGER })
  version: number;

  @IsArray()
  @ArrayMaxSize(billLimit.contents)
  @ValidateNested({ each: true })
  @Type(() => ContentsLineInputDto)
  lines: ContentsLineInputDto[];
}

export class ContentsLineDto {
  position: number;
  part: BillPartDto;
  quantity: string;
  bag: string;
  /** Of one stock unit. */
  unitWeightG: string | null;
  /** Of the line. */
  weightG: string | null;
  /** Whether the part has a released bill of its own; otherwise it is bought. */
  made: boolean;
}

export class ContentsBagDto {
  bag: string;
  lines: number;
  /** Sum of the weights that are known. */
  weightG: string;
  /** Codes of the parts in it whose weight is not known. */
  unweighed: string[];
}

export class ContentsDto {
  part: BillPartDto;
  /** 0 for a list that is not there yet. */
  version: number;
  lines: ContentsLineDto[];
  /** In the order in which they first occur. */
  bags: ContentsBagDto[];
  /** Expected weight of everything together, as far as weights are known. */
  weightG: string;
  unweighed: string[];
}

export class KitListQuery extends PageQuery {}

export class KitListItemDto {
  code: string;
  name: string;
  retired: boolean;
  lines: number;
  bags: number;
  weightG: string;
  /** Parts whose weight is not known. */
  unweighed: number;
}

export class KitListDto {
  items: KitListItemDto[];
  total: number;
}
