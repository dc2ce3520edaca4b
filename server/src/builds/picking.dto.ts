import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, IsBoolean, Matches, ValidateNested } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { CodeOf } from '../platform/validation/codes.js';
import { Nullable, Optional, Quantity, Text, Whole } from '../platform/validation/fields.js';
import { Serial } from '../units/serial.js';
import { BatchPartDto, pathPattern } from './batch.dto.js';

export class IssueLineDto {
  /** The place of the component in the bill: which line of the batch it is for. */
  @Matches(pathPattern, { message: 'Give the place of the component in the bill, such as 2/5.' })
  path: string;

  /** The line's own part, or one approved to stand in for it. */
  @CodeOf('part')
  part: string;

  /** Not needed for a part followed by count. */
  @Optional()
  @Nullable()
  @CodeOf('lot')
  lot?: string | null;

  @CodeOf('bin')
  bin: string;

  @Quantity()
  quantity: string;
}

export class IssueInputDto {
  @IsArray()
  @ArrayMinSize(1, { message: 'Pick at least one line.' })
  @ArrayMaxSize(200)
  @ValidateNested({ each: true })
  @Type(() => IssueLineDto)
  lines: IssueLineDto[];
}

/** A place to go to, in the order of the bins. */
export class PickRowDto {
  path: string;
  part: BatchPartDto;
  marks: string | null;
  bin: string;
  /** Null for a part followed by count. */
  lot: string | null;
  quantity: string;
  /** The part of the bill, where this one stands in for it. */
  standsInFor: string | null;
}

/** What the shelf cannot give just now. */
export class PickShortageDto {
  path: string;
  part: BatchPartDto;
  quantity: string;
}

/** What has been picked and not given back. */
export class PickedDto {
  path: string;
  part: BatchPartDto;
  lot: string | null;
  /** Where it was taken from last. */
  bin: string;
  quantity: string;
}

export class PickListDto {
  number: string;
  rows: PickRowDto[];
  shortages: PickShortageDto[];
  picked: PickedDto[];
}

/** The document that was made. */
export class BatchDocumentDto {
  document: string;
}

export class StepTickDto {
  /** Done, or not done after all. */
  @IsBoolean()
  done: boolean;

  /** On which units. */
  @IsArray()
  @ArrayMinSize(1, { message: 'Name at least one unit.' })
  @ArrayMaxSize(1000)
  @Matches(/^[A-Z]{2,3}-\d{4}-\d{4,7}-\d{2}$/, { each: true, message: 'One of these is no serial number.' })
  units: string[];
}

export class FittedLotDto {
  @Matches(pathPattern, { message: 'Give the place of the component in the bill, such as 2/5.' })
  path: string;

  /** A lot that was picked for this line. */
  @CodeOf('lot')
  lot: string;

  /** In one unit; left out, all that the bill asks for. */
  @Optional()
  @Nullable()
  @Quantity()
  quantity?: string | null;
}

export class CompletionDto {
  @CodeOf('bin')
  bin: string;
}

export class MadePiecesDto {
  @Whole({ min: 1, max: 1000 })
  quantity: number;

  @CodeOf('bin')
  bin: string;

  /** Nothing more comes of this batch: what is missing is lost. */
  @IsBoolean()
  last: boolean;
}

export class ScrapDto {
  @Text({ max: textLimit.line })
  reason: string;
}

export class FinishedUnitDto {
  @Serial()
  serial: string;
  lot: string;
  document: string;
}
