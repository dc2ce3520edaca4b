import { ApiProperty } from '@nestjs/swagger';
import { IsBoolean, IsIn, Matches } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { PageQuery } from '../platform/paging/page-query.dto.js';
import { CodeOf } from '../platform/validation/codes.js';
import { Id, Nullable, Optional, Quantity, Text, Version, Whole } from '../platform/validation/fields.js';

export const parcelStates = ['packing', 'packed', 'shipped', 'dissolved'] as const;

export type ParcelState = (typeof parcelStates)[number];

/** Ways a parcel may go; what is not chosen yet is not guessed. */
export const parcelModes = ['road', 'sea', 'passenger_aircraft', 'cargo_aircraft', 'letter_post'] as const;

export type ParcelMode = (typeof parcelModes)[number];

export class OpenParcelInput {
  /** The order's number. */
  @CodeOf('document')
  order: string;
}

export class ScanInput {
  /** What was scanned or typed: a serial number, a lot, a part, a bin, or the address on a unit's label. */
  @Text({ max: 200 })
  code: string;

  /** The bin that was scanned before, where the thing lies in several. */
  @Optional()
  @CodeOf('bin')
  bin?: string;

  /** The line of the contents that it is for; the next open one of the part when nothing is said. */
  @Optional()
  @Id()
  needId?: number;

  /** How much of a lot; all that is still missing when nothing is said. */
  @Optional()
  @Quantity()
  quantity?: string;
}

export class ParcelVersionInput {
  @Version()
  version: number;
}

export class LithiumInput {
  @IsIn(parcelModes, { message: 'Say how the parcel travels.' })
  mode: ParcelMode;

  /** The whole parcel, weighed. */
  @Whole({ min: 1, max: 100_000 })
  weightG: number;

  /** Whether the watt-hours stand on the outside of each battery. */
  @Nullable()
  @IsBoolean({ message: 'Say yes or no.' })
  wattHoursOnCase: boolean | null;

  /** Charge of the batteries in percent of their rated capacity; asked for where they fly. */
  @Nullable()
  @Whole({ min: 0, max: 100 })
  chargePercent: number | null;

  @Version()
  version: number;
}

export class CarrierAnswerInput {
  /** Who was asked at the carrier, when, and what they said. */
  @Text({ max: textLimit.line, lines: true })
  note: string;

  @Version()
  version: number;
}

export class DispatchInput {
  @Text({ max: 60 })
  carrier: string;

  @Nullable()
  @Matches(/^[A-Za-z0-9 ./-]{1,60}$/, { message: 'Use letters, digits, spaces and the signs - . / in it.' })
  trackingCode: string | null;

  @Version()
  version: number;
}

export class ParcelsQuery extends PageQuery {
  @Optional()
  @IsIn(parcelStates)
  state?: ParcelState;
}

export class ParcelRowDto {
  number: string;
  order: string;
  @ApiProperty({ enum: parcelStates, enumName: 'ParcelState' })
  state: ParcelState;
  recipient: string;
  country: string;
  promisedOn: string;
  openedAt: string;
  shippedAt: string | null;
  carrier: string | null;
  trackingCode: string | null;
}

export class ParcelPageDto {
  items: ParcelRowDto[];
  total: number;
}

export class ParcelPlaceDto {
  bin: string;
  lot: string;
  quantity: string;
}

/** One thing that has to be in the parcel. */
export class ParcelNeedDto {
  id: number;
  /** What was ordered: the tool, or the kit that this is part of. */
  title: string;
  bag: string | null;
  part: string;
  partName: string;
  measure: string;
  traced: string;
  quantity: string;
  packed: string;
  /** Where it lies, the lot to take first in front. */
  places: ParcelPlaceDto[];
}

export class PackedItemDto {
  id: number;
  needId: number;
  part: string;
  lot: string;
  bin: string;
  serial: string | null;
  quantity: string;
  packedAt: string;
}

export class LithiumRuleDto {
  unNumber: string;
  properName: string;
  instruction: string;
  rule: string;
}

export class ParcelLithiumDto {
  answer: string;
  /** The answer in a sentence. */
  sentence: string;
  mayLeave: boolean;
  edition: string | null;
  rules: LithiumRuleDto[];
  mark: string | null;
  labels: string[];
  papers: string[];
  conditions: string[];
  reasons: string[];
  missing: string[];
  caution: string;
  /** What the carrier answered, and who wrote it down. */
  carrierAnswer: string | null;
  @ApiProperty({ enum: parcelModes, enumName: 'ParcelMode', nullable: true })
  mode: ParcelMode | null;
  wattHoursOnCase: boolean | null;
  chargePercent: number | null;
}

export class ParcelDto extends ParcelRowDto {
  version: number;
  address: string[];
  weightG: number | null;
  needs: ParcelNeedDto[];
  items: PackedItemDto[];
  lithium: ParcelLithiumDto;
  /** Cautions that go with what is in it. */
  cautions: string[];
}

/** What came of a scan. */
export class ScanAnswerDto {
  /** In a sentence, to be read out. */
  sentence: string;
  /** The bin that was scanned, to be sent with the next scan. */
  bin: string | null;
  parcel: ParcelDto;
}
