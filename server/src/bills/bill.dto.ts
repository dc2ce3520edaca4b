import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform, Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, IsIn, Matches, ValidateNested } from 'class-validator';
import { billLimit } from '@emberlot/shared/limits/bills';
import { codePattern } from '@emberlot/shared/limits/codes';
import { textLimit } from '@emberlot/shared/limits/text';
import { CodeOf, codeSentence } from '../platform/validation/codes.js';
import { cleanText, Nullable, Optional, Quantity, Text, Version, Whole } from '../platform/validation/fields.js';
import { characteristicKinds, type CharacteristicKind, type RevisionStatus } from './bill-revision.js';

/** A limit of a reading: any decimal number, also below zero. */
function Limit(): PropertyDecorator {
  return Matches(/^-?(?:0|[1-9]\d{0,11})(?:\.\d{1,9})?$/, {
    message: 'Give a number with at most nine decimals, such as -2.5.',
  });
}

/** Codes of parts; small letters are taken as capitals. */
function PartCodes(): PropertyDecorator {
  const upper = (value: unknown) => (typeof value === 'string' ? value.toUpperCase() : value);
  return applyDecorators(
    Transform(({ value }: { value: unknown }) =>
      Array.isArray(value) ? value.map((code: unknown) => upper(cleanText(code))) : value,
    ),
    Matches(codePattern.part, { each: true, message: codeSentence('part') }),
    ApiProperty({ type: [String] }),
  );
}

export class BillLineInputDto {
  /** Where the line stands; unique within the bill, and what the exploded drawing numbers it by. */
  @Whole({ min: 1, max: billLimit.position })
  position: number;

  /** The component's code. */
  @CodeOf('part')
  part: string;

  /** In the component's stock unit, for one made. */
  @Quantity()
  quantityPer: string;

  /** Share of what is taken that is normally lost, in percent. */
  @Matches(/^\d{1,2}(?:\.\d{1,4})?$/, { message: 'Give a percentage from 0 to below 100, with at most four decimals.' })
  scrapPercent: string;

  /** Position marks, such as R1 R2. */
  @Optional()
  @Nullable()
  @Text({ max: billLimit.marks })
  marks?: string | null;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.line })
  note?: string | null;

  /** Codes of the parts approved to stand in, the preferred one first. */
  @IsArray()
  @ArrayMaxSize(billLimit.alternates)
  @PartCodes()
  alternates: string[];
}

export class BuildStepInputDto {
  @Text({ max: billLimit.title })
  title: string;

  @Text({ max: textLimit.note, min: 0, lines: true })
  instruction: string;

  /** For one made. */
  @Matches(/^\d{1,6}(?:\.\d{1,2})?$/, { message: 'Give minutes with at most two decimals, such as 2.5.' })
  minutes: string;

  /** Shown wherever the step is done. */
  @Optional()
  @Nullable()
  @Text({ max: billLimit.caution })
  caution?: string | null;
}

export class CharacteristicInputDto {
  @Text({ max: billLimit.title })
  name: string;

  @IsIn(characteristicKinds, { message: 'Choose a number or yes/no.' })
  kind: CharacteristicKind;

  @Optional()
  @Nullable()
  @Text({ max: billLimit.unit })
  unit?: string | null;

  @Optional()
  @Nullable()
  @Limit()
  lowerLimit?: string | null;

  @Optional()
  @Nullable()
  @Limit()
  target?: string | null;

  @Optional()
  @Nullable()
  @Limit()
  upperLimit?: string | null;

  /** Decimals a reading is given with. */
  @Optional()
  @Nullable()
  @Whole({ min: 0, max: billLimit.digits })
  digits?: number | null;

  /** What the reading is taken at, such as 30 s after switching on. */
  @Optional()
  @Nullable()
  @Text({ max: billLimit.condition })
  condition?: string | null;

  /** Shown wherever the reading is taken. */
  @Optional()
  @Nullable()
  @Text({ max: billLimit.caution })
  caution?: string | null;
}

/** All that a draft holds. What stands in it replaces what stood there. */
export class BillContentDto {
  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  note?: string | null;

  @IsArray()
  @ArrayMaxSize(billLimit.lines)
  @ValidateNested({ each: true })
  @Type(() => BillLineInputDto)
  lines: BillLineInputDto[];

  @IsArray()
  @ArrayMaxSize(billLimit.steps)
  @ValidateNested({ each: true })
  @Type(() => BuildStepInputDto)
  steps: BuildStepInputDto[];

  @IsArray()
  @ArrayMaxSize(billLimit.characteristics)
  @ValidateNested({ each: true })
  @Type(() => CharacteristicInputDto)
  testPlan: CharacteristicInputDto[];
}

export class BillEditDto extends BillContentDto {
  @Version()
  version: number;
}

export class NewDraftDto {
  /** `released` copies the revision in force; `nothing` begins an empty one. */
  @IsIn(['nothing', 'released'], { message: 'Begin with nothing or with the released revision.' })
  from: 'nothing' | 'released';
}

export class RevisionVersionDto {
  @Version()
  version: number;
}

export class BillPartDto {
  code: string;
  name: string;
  /** The stock unit. */
  measure: string;
  traced: string;
  retired: boolean;
}

export class BillLineDto {
  position: number;
  part: BillPartDto;
  quantityPer: string;
  scrapPercent: string;
  marks: string | null;
  note: string | null;
  alternates: BillPartDto[];
  /** Number of the released revision of the component's own bill, if it is made. */
  madeBy: number | null;
}

export class BuildStepDto {
  position: number;
  title: string;
  instruction: string;
  minutes: string;
  caution: string | null;
}

export class CharacteristicDto {
  position: number;
  name: string;
  kind: CharacteristicKind;
  unit: string | null;
  lowerLimit: string | null;
  target: string | null;
  upperLimit: string | null;
  digits: number | null;
  condition: string | null;
  caution: string | null;
}

export class BillRevisionDto {
  part: BillPartDto;
  number: number;
  status: RevisionStatus;
  version: number;
  note: string | null;
  createdAt: Date;
  createdBy: string | null;
  releasedAt: Date | null;
  releasedBy: string | null;
  supersededAt: Date | null;
  /** Of all steps, for one made. */
  minutes: string;
  lines: BillLineDto[];
  steps: BuildStepDto[];
  testPlan: CharacteristicDto[];
}
