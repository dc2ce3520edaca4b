import { IsBoolean } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { FromTrueFalse, PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Optional, Text, Version } from '../platform/validation/fields.js';

export class BinInputDto {
  @CodeOf('bin')
  code: string;

  @Text({ max: textLimit.name, min: 0 })
  name: string;

  /** What lies in a quarantine bin can be neither picked nor sold. */
  @IsBoolean()
  quarantine: boolean;
}

export class BinEditDto extends BinInputDto {
  @Version()
  version: number;
}

export class BinRetireDto {
  @Version()
  version: number;
}

export class BinsQuery extends PageQuery {
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  quarantine?: boolean;

  /** Also the ones no longer in use. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  retired?: boolean;
}

export class BinItemDto {
  id: number;
  code: string;
  name: string;
  quarantine: boolean;
  retired: boolean;
  partCount: number;
  lotCount: number;
}

export class BinPageDto {
  items: BinItemDto[];
  total: number;
}

export class BinContentDto {
  part: string;
  name: string;
  measure: string;
  traced: string;
  lot: string;
  lotStatus: string;
  expiresOn: string | null;
  quantity: string;
}

export class BinDto extends BinInputDto {
  id: number;
  version: number;
  retired: boolean;
  contents: BinContentDto[];
}
