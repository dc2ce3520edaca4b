import { IsBoolean, IsIn } from 'class-validator';
import { FromTrueFalse, PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Optional, Text, Version } from '../platform/validation/fields.js';
import { MoveDto } from './move.dto.js';

export const lotStatuses = ['held', 'released', 'rejected'] as const;

export type LotStatus = (typeof lotStatuses)[number];

export class LotStatusInputDto {
  @IsIn(lotStatuses, { message: 'Say whether the lot is held, released or rejected.' })
  status: LotStatus;

  /** Why, for whoever asks later. */
  @Text({ max: 500 })
  reason: string;

  @Version()
  version: number;
}

export class LotsQuery extends PageQuery {
  @Optional()
  @IsIn(lotStatuses)
  status?: LotStatus;

  /** A part's code. */
  @Optional()
  @CodeOf('part')
  part?: string;

  /** A supplier's code. */
  @Optional()
  @CodeOf('supplier')
  supplier?: string;

  /** A bin's code: lots of which something lies there. */
  @Optional()
  @CodeOf('bin')
  bin?: string;

  /** Out of date, or within thirty days. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  expiring?: boolean;

  /** Also the ones of which nothing is left. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  used?: boolean;
}

export class LotItemDto {
  code: string;
  part: string;
  name: string;
  measure: string;
  kind: string;
  status: LotStatus;
  supplier: string | null;
  supplierLot: string | null;
  receivedOn: string | null;
  expiresOn: string | null;
  expired: boolean;
  /** What of it lies on the shelf, over all bins. */
  quantity: string;
  bins: string[];
}

export class LotPageDto {
  items: LotItemDto[];
  total: number;
}

export class LotPlaceDto {
  bin: string;
  quarantine: boolean;
  quantity: string;
}

export class LotStatusChangeDto {
  document: string;
  occurredAt: string;
  person: string | null;
  from: string;
  to: string;
  reason: string;
}

export class LotBatchDto {
  number: string;
  part: string;
  quantity: string;
}

export class LotDto extends LotItemDto {
  version: number;
  /** The document that brought it, and what kind that is. */
  origin: string | null;
  originKind: string | null;
  note: string | null;
  places: LotPlaceDto[];
  moves: MoveDto[];
  statusChanges: LotStatusChangeDto[];
  /** Which batches took of it. */
  batches: LotBatchDto[];
  /** What one unit cost when it came. Not shown to assemblers. */
  unitCost?: string;
  currency?: string;
}
