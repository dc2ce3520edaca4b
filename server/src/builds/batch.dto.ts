import { IsBoolean, IsIn, Matches } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { MoneyDto } from '../platform/api/money.dto.js';
import { FromTrueFalse, PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Day, Nullable, Optional, Text, Version, Whole } from '../platform/validation/fields.js';
import { batchStatuses, type BatchStatus } from './batches.repository.js';

/** The place of a component in the bill: positions from the top, such as `2/5`. */
export const pathPattern = /^\d{1,5}(?:\/\d{1,5}){0,20}$/;

export class BatchInputDto {
  /** What is built: a part with a released bill. */
  @CodeOf('part')
  part: string;

  @Whole({ min: 1, max: 1000 })
  quantity: number;

  @Optional()
  @Nullable()
  @Day()
  startOn?: string | null;

  @Day()
  dueOn: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  note?: string | null;
}

export class SubAssemblyInputDto {
  @Matches(pathPattern, { message: 'Give the place of the component in the bill, such as 2/5.' })
  path: string;

  /** From the shelf, or built within the batch. */
  @IsBoolean()
  fromShelf: boolean;

  @Version()
  version: number;
}

export class WithdrawalInputDto {
  /** Why it will not be built. */
  @Text({ max: textLimit.line })
  reason: string;
}

export class BatchesQuery extends PageQuery {
  @Optional()
  @IsIn(batchStatuses, { message: 'Give one of planned, picking, in_build, done, withdrawn.' })
  status?: BatchStatus;

  /** Neither done nor withdrawn. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  open?: boolean;

  @Optional()
  @CodeOf('part')
  part?: string;
}

export type UnitVerdict = 'open' | 'passed' | 'failed' | 'rework' | 'scrapped';

export class StripUnitDto {
  serial: string;
  stepsDone: number;
  stepsTotal: number;
  verdict: UnitVerdict;
  finished: boolean;
}

export class BatchPartDto {
  code: string;
  name: string;
  measure: string;
  traced: string;
}

/** What to do next about a batch. */
export class NextActDto {
  sentence: string;
  /** Names the act for a program: `claim`, `pick`, `start_building`, `build`, `none`. */
  act: string;
}

export class BatchItemDto {
  id: number;
  number: string;
  part: BatchPartDto;
  revision: number;
  quantity: number;
  status: BatchStatus;
  startOn: string | null;
  dueOn: string;
  late: boolean;
  /** Pieces that came onto the shelf. */
  finished: number;
  scrapped: number;
  /** Lines of which the shelf does not hold enough. */
  linesShort: number;
  next: NextActDto;
  units: StripUnitDto[];
}

export class BatchPageDto {
  items: BatchItemDto[];
  total: number;
}

export class BatchLineDto {
  path: string;
  part: BatchPartDto;
  marks: string | null;
  quantityPer: string;
  required: string;
  issued: string;
  /** Claimed on the shelf for this line. */
  claimed: string;
  /** Needed, and neither issued nor claimed. */
  missing: string;
  /** Approved to stand in, the preferred one first. */
  alternates: BatchPartDto[];
}

export class BatchSubAssemblyDto {
  path: string;
  part: BatchPartDto;
  required: string;
  fromShelf: boolean;
}

export class BatchStepDto {
  position: number;
  /** What the step makes: the batch's own part, or a sub-assembly built within it. */
  part: string;
  title: string;
  instruction: string;
  /** Expected for one unit. */
  minutes: string;
  caution: string | null;
  /** Serial numbers of the units on which it is done. */
  doneOn: string[];
}

export class BatchCharacteristicDto {
  position: number;
  name: string;
  kind: 'numeric' | 'yes_no';
  unit: string | null;
  lowerLimit: string | null;
  target: string | null;
  upperLimit: string | null;
  digits: number | null;
  condition: string | null;
  caution: string | null;
}

/** For those who are shown money. */
export class BatchCostDto {
  materialsIn: MoneyDto;
  materialsOut: MoneyDto;
  labour: MoneyDto;
  loss: MoneyDto;
  /** What the batch still holds of work in progress. */
  held: MoneyDto;
}

export class BatchDto extends BatchItemDto {
  version: number;
  note: string | null;
  createdAt: string;
  buildStartedAt: string | null;
  finishedAt: string | null;
  lines: BatchLineDto[];
  subAssemblies: BatchSubAssemblyDto[];
  steps: BatchStepDto[];
  testPlan: BatchCharacteristicDto[];
  /** Not shown to assemblers. */
  cost?: BatchCostDto;
}
