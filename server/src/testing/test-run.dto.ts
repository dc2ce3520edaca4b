import { IsBoolean, IsISO8601, IsUUID, Matches } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { FromTrueFalse, PageQuery } from '../platform/paging/page-query.dto.js';
import { Nullable, Optional, Text, Version, Whole } from '../platform/validation/fields.js';

/** A reading as the instrument shows it: its digits count. */
const readingPattern = /^-?(?:0|[1-9]\d{0,11})(?:\.\d{1,9})?$/;

export class ReadingInputDto {
  /** The run it was measured for: the one under way, or the one after the last. */
  @Whole({ min: 1, max: 10_000 })
  run: number;

  /** Which characteristic of the test plan, by its position. */
  @Whole({ min: 1, max: 10_000 })
  position: number;

  /** Of a measured characteristic: the number with a point, in its unit, with every digit that the instrument gives. */
  @Optional()
  @Nullable()
  @Matches(readingPattern, { message: 'Give the reading as a number with a point, such as 2.27.' })
  reading?: string | null;

  /** Of a yes-or-no characteristic. */
  @Optional()
  @Nullable()
  @IsBoolean()
  answer?: boolean | null;

  /** When it was measured, by the device it was typed on. */
  @IsISO8601(
    { strict: true, strictSeparator: true },
    { message: 'Give the instant of measuring, such as 2027-03-01T09:00:00Z.' },
  )
  measuredAt: string;

  /** Made afresh for each reading: sent again with the same one, it is applied once. */
  @IsUUID('4', { message: 'Give a key made afresh for each reading.' })
  clientKey: string;

  /** The person looked again at a reading that seemed to have slipped by a factor, and it stands. */
  @Optional()
  @IsBoolean()
  confirmed?: boolean;
}

export class RunReadingDto {
  position: number;
  name: string;
  kind: 'numeric' | 'yes_no';
  /** As it was typed. */
  reading: string | null;
  answer: boolean | null;
  unit: string | null;
  /** The limits it was judged by. */
  lowerLimit: string | null;
  upperLimit: string | null;
  verdict: 'within' | 'outside';
  measuredAt: string;
  recordedBy: string;
  /** Whether a later reading took its place. */
  replaced: boolean;
}

export class TestRunDto {
  run: number;
  /** Worked out when each characteristic has a reading. */
  verdict: 'pass' | 'fail' | null;
  startedAt: string;
  measuredAt: string | null;
  voidedAt: string | null;
  voidReason: string | null;
  readings: RunReadingDto[];
}

export class UnitRunsDto {
  serial: string;
  /** The run that the next reading is for. */
  nextRun: number;
  runs: TestRunDto[];
}

export class ReadingResultDto {
  verdict: 'within' | 'outside';
  run: number;
  runVerdict: 'pass' | 'fail' | null;
  /** The fault that the run opened, if it failed. */
  fault: string | null;
}

export class FaultInputDto {
  /** What is wrong. */
  @Text({ max: 500, lines: true })
  what: string;

  /** At which step of the batch it was seen. */
  @Optional()
  @Nullable()
  @Whole({ min: 1, max: 10_000 })
  step?: number | null;
}

export class ReworkInputDto {
  @Version()
  version: number;

  /** Why it was so. */
  @Text({ max: textLimit.line })
  cause: string;

  /** What was done about it. */
  @Text({ max: textLimit.line })
  action: string;

  /** Time at the bench. */
  @Matches(/^\d{1,5}(?:\.\d{1,2})?$/, { message: 'Give minutes with at most two decimals, such as 12.5.' })
  minutes: string;
}

export class NoFaultInputDto {
  @Version()
  version: number;

  /** Why it is none. */
  @Text({ max: textLimit.line })
  reason: string;
}

export class FaultsQuery extends PageQuery {
  /** Not closed yet. */
  @Optional()
  @FromTrueFalse()
  @IsBoolean()
  open?: boolean;
}

export class FaultDto {
  id: number;
  number: string;
  version: number;
  serial: string;
  part: string;
  partName: string;
  batch: string;
  /** The run that failed, if a measurement found it. */
  run: number | null;
  step: string | null;
  what: string;
  cause: string | null;
  action: string | null;
  outcome: 'reworked' | 'scrapped' | 'no_fault' | null;
  foundAt: string;
  foundBy: string | null;
  closedAt: string | null;
}

export class FaultPageDto {
  items: FaultDto[];
  total: number;
}

export class FirstPassDto {
  part: string;
  name: string;
  /** Units whose first complete run is known. */
  measured: number;
  /** Of them, how many passed it. */
  passed: number;
}

export class FirstPassListDto {
  items: FirstPassDto[];
}
