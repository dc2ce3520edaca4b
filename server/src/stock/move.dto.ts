import { Matches } from 'class-validator';
import { MoneyDto } from '../platform/api/money.dto.js';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Day, Optional } from '../platform/validation/fields.js';

export class MovesQuery extends PageQuery {
  @Optional()
  @CodeOf('part')
  part?: string;

  @Optional()
  @CodeOf('lot')
  lot?: string;

  @Optional()
  @CodeOf('bin')
  bin?: string;

  @Optional()
  @Matches(/^[a-z_]{1,20}$/, { message: 'Give a reason by its name.' })
  reason?: string;

  /** First day, in the shop's zone. */
  @Optional()
  @Day()
  from?: string;

  /** Last day, in the shop's zone. */
  @Optional()
  @Day()
  to?: string;
}

export class MoveDto {
  id: number;
  occurredAt: string;
  document: string;
  documentKind: string;
  /** The document's note. */
  note: string | null;
  part: string;
  measure: string;
  lot: string;
  bin: string;
  /** Signed: above zero in, below zero out. */
  quantity: string;
  reason: string;
  person: string | null;
  /** Whether the document can still be reversed from here: it is a delivery, transfer or adjustment, and was not. */
  reversible: boolean;
  /** Not shown to assemblers. */
  value?: MoneyDto;
}

export class MovePageDto {
  items: MoveDto[];
  total: number;
}
