import { IsIn } from 'class-validator';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { Optional, Quantity, Whole } from '../platform/validation/fields.js';
import { FromDigits } from '../platform/paging/page-query.dto.js';
import type { RevisionStatus } from './bill-revision.js';
import { BillLineDto, BillPartDto, BuildStepDto, CharacteristicDto } from './bill.dto.js';

export class BillListQuery extends PageQuery {
  /** `draft`: those with a draft; `released`: those with a revision in force; `unreleased`: those with a draft only. */
  @Optional()
  @IsIn(['draft', 'released', 'unreleased'])
  state?: 'draft' | 'released' | 'unreleased';
}

export class BillListItemDto {
  code: string;
  name: string;
  traced: string;
  measure: string;
  retired: boolean;
  /** Number of the revision in force. */
  released: number | null;
  releasedAt: Date | null;
  draft: number | null;
  draftVersion: number | null;
  draftedAt: Date | null;
  /** Of the revision in force, or of the draft where there is none. */
  lines: number;
  minutes: string;
  /** Released bills that this part is in. */
  usedIn: number;
}

export class BillListDto {
  items: BillListItemDto[];
  total: number;
}

export class RevisionSummaryDto {
  number: number;
  status: RevisionStatus;
  version: number;
  note: string | null;
  createdAt: Date;
  createdBy: string | null;
  releasedAt: Date | null;
  releasedBy: string | null;
  supersededAt: Date | null;
  lines: number;
}

export class BillDto {
  part: BillPartDto;
  /** The newest first. */
  revisions: RevisionSummaryDto[];
  released: number | null;
  draft: number | null;
  usedIn: number;
}

export class TreeQuery {
  /** How many are made; one when nothing is said. */
  @Optional()
  @Quantity()
  quantity: string = '1';
}

export class TreeRowDto {
  /** Positions from the made part down to this line. */
  path: number[];
  level: number;
  parent: string;
  part: BillPartDto;
  quantityPer: string;
  scrapPercent: string;
  /** What this place takes with its allowance for scrap, to four decimals. */
  quantity: string;
  marks: string | null;
  alternates: string[];
  madeBy: number | null;
}

export class TreeTotalDto {
  part: BillPartDto;
  /** Longest way down to it. */
  level: number;
  /** Rounded up once per bill to what can be handed out. */
  quantity: string;
  made: boolean;
}

export class BillTreeDto {
  quantity: string;
  rows: TreeRowDto[];
  /** One row per part, summed over every place. */
  totals: TreeTotalDto[];
}

export class CompareQuery {
  @FromDigits()
  @Whole({ min: 1, max: 1_000_000 })
  from: number;

  @FromDigits()
  @Whole({ min: 1, max: 1_000_000 })
  to: number;
}

export class LineChangeDto {
  kind: 'added' | 'removed' | 'changed';
  before: BillLineDto | null;
  after: BillLineDto | null;
  /** Which fields differ. */
  fields: string[];
}

export class StepChangeDto {
  kind: 'added' | 'removed' | 'changed';
  before: BuildStepDto | null;
  after: BuildStepDto | null;
  fields: string[];
}

export class CharacteristicChangeDto {
  kind: 'added' | 'removed' | 'changed';
  before: CharacteristicDto | null;
  after: CharacteristicDto | null;
  fields: string[];
}

export class BillComparisonDto {
  from: number;
  to: number;
  lines: LineChangeDto[];
  steps: StepChangeDto[];
  testPlan: CharacteristicChangeDto[];
}

export class UseDto {
  /** 1 where the part itself is in the bill, 2 where what it is in is in the bill, and so on. */
  level: number;
  /** Codes from the part up to this bill's part. */
  path: string[];
  part: BillPartDto;
  revision: number;
  status: RevisionStatus;
  position: number;
  quantityPer: string;
  /** Whether it is only an alternate of the line. */
  alternate: boolean;
  /** Whether nothing that is in force or in draft contains this bill's part. */
  top: boolean;
}

export class KitUseDto {
  part: BillPartDto;
  /** What of it, or of what it is in, lies in the kit. */
  through: string;
  quantity: string;
  bag: string;
}

export class WhereUsedDto {
  part: BillPartDto;
  uses: UseDto[];
  kits: KitUseDto[];
}

export class ComponentQuery extends PageQuery {}

export class ComponentDto extends BillPartDto {
  /** Whether it has a released bill of its own. */
  made: boolean;
  unitWeightG: string | null;
}

export class ComponentListDto {
  items: ComponentDto[];
  total: number;
}
