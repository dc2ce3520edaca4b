import { IsIn } from 'class-validator';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Optional } from '../platform/validation/fields.js';
import { FaultDto, TestRunDto } from '../testing/test-run.dto.js';

export const unitStates = ['under_way', 'on_shelf', 'gone', 'scrapped'] as const;

export type UnitState = (typeof unitStates)[number];

export class UnitsQuery extends PageQuery {
  @Optional()
  @IsIn(unitStates, { message: 'Give one of under_way, on_shelf, gone, scrapped.' })
  state?: UnitState;

  @Optional()
  @CodeOf('part')
  part?: string;

  @Optional()
  @CodeOf('document')
  batch?: string;
}

export class UnitItemDto {
  id: number;
  serial: string;
  part: string;
  partName: string;
  revision: number;
  batch: string;
  state: UnitState;
  /** The bin it lies in, while it is on the shelf. */
  bin: string | null;
  sound: boolean;
  issuedAt: string;
  completedAt: string | null;
}

export class UnitPageDto {
  items: UnitItemDto[];
  total: number;
}

export class AsBuiltDto {
  path: string;
  part: string;
  partName: string;
  measure: string;
  /** Null for a part followed by count. */
  lot: string | null;
  quantity: string;
  /** Scanned to this unit; otherwise one of the lots picked for its batch. */
  exact: boolean;
  supplier: string | null;
  fittedAt: string;
}

export class UnitStepDto {
  position: number;
  title: string;
  caution: string | null;
  doneAt: string | null;
  doneBy: string | null;
}

export class UnitReworkDto {
  what: string;
  minutes: string;
  doneAt: string;
  doneBy: string | null;
}

export class UnitDto extends UnitItemDto {
  place: number;
  /** How many were built together. */
  batchSize: number;
  scrappedAt: string | null;
  scrapReason: string | null;
  /** The path of its public page. */
  page: string;
  steps: UnitStepDto[];
  asBuilt: AsBuiltDto[];
  runs: TestRunDto[];
  faults: FaultDto[];
  rework: UnitReworkDto[];
}

export class PublicReadingDto {
  name: string;
  reading: string | null;
  answer: boolean | null;
  unit: string | null;
  lowerLimit: string | null;
  upperLimit: string | null;
  within: boolean;
}

/** What whoever holds a tool may read about it: nothing of any person. */
export class PublicUnitDto {
  serial: string;
  name: string;
  shop: string;
  /** ISO year and week in which it was begun. */
  builtYear: number;
  builtWeek: number;
  revision: number;
  batchSize: number;
  /** Whether its last measurement passed and nothing was found wrong with it since. */
  sound: boolean;
  measuredOn: string | null;
  readings: PublicReadingDto[];
  /** Counted from the day it left the shop; null while it has not. */
  warrantyUntil: string | null;
  cautions: string[];
}
