import { OmitType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, IsBoolean, IsIn, Matches, ValidateNested } from 'class-validator';
import { stockMeasureCodes, type StockMeasure } from '@emberlot/shared/measure/stock-measures';
import { partLimit } from '@emberlot/shared/limits/parts';
import { textLimit } from '@emberlot/shared/limits/text';
import { CodeOf } from '../platform/validation/codes.js';
import { Day, Nullable, Optional, Quantity, Text, Version, Whole } from '../platform/validation/fields.js';

export const tracedWays = ['count', 'delivery', 'single'] as const;

/** How closely a part is followed: by count, by delivery (lots), or one by one (serial numbers). */
export type Traced = (typeof tracedWays)[number];

export class PartParameterDto {
  @Text({ max: partLimit.parameterName })
  name: string;

  /** A decimal number, or a word. */
  @Text({ max: partLimit.parameterValue })
  value: string;

  /** Of a number: its unit. */
  @Optional()
  @Nullable()
  @Text({ max: partLimit.parameterUnit })
  unit?: string | null;
}

export class PartSupplierDto {
  /** The supplier's code. */
  @CodeOf('supplier')
  supplier: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  supplierPartCode?: string | null;

  @Optional()
  @Nullable()
  @Whole({ min: 0, max: 730 })
  leadTimeDays?: number | null;

  /** The one to order from first; at most one of a part's suppliers. */
  @IsBoolean()
  preferred: boolean;
}

/** What the transport papers must know of a lithium cell or battery. */
export class PartBatteryDto {
  @IsIn(['cell', 'battery'])
  kind: 'cell' | 'battery';

  @IsIn(['lithium_ion', 'lithium_metal'])
  chemistry: 'lithium_ion' | 'lithium_metal';

  @Optional()
  @Nullable()
  @Quantity()
  wattHours?: string | null;

  @Optional()
  @Nullable()
  @Quantity()
  lithiumGrams?: string | null;

  @Optional()
  @Nullable()
  @Whole({ min: 1, max: 1_000 })
  cellCount?: number | null;

  /** The test summary of this very design (UN Manual of Tests and Criteria, 38.3). */
  @Optional()
  @Nullable()
  @Text({ max: textLimit.line })
  transportTestReference?: string | null;

  @Optional()
  @Nullable()
  @Day()
  transportTestPassedOn?: string | null;
}

export class PartInputDto {
  @CodeOf('part')
  code: string;

  @Text({ max: textLimit.name })
  name: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.note, lines: true })
  description?: string | null;

  /** The stock unit; it stays once something has moved. */
  @IsIn(stockMeasureCodes, { message: 'Choose the unit that this part is kept in.' })
  measure: StockMeasure;

  /** It stays once something has moved. */
  @IsIn(tracedWays, { message: 'Choose how closely this part is followed.' })
  traced: Traced;

  /** The letters that begin the serial numbers of a part followed one by one. */
  @Optional()
  @Nullable()
  @Matches(/^[A-Z]{2,3}$/, { message: 'Give two or three capital letters.' })
  serialLetters?: string | null;

  @Optional()
  @Nullable()
  @Quantity({ zero: true })
  reorderPoint?: string | null;

  @Optional()
  @Nullable()
  @Quantity({ zero: true })
  unitWeightG?: string | null;

  @Optional()
  @Nullable()
  @Whole({ min: 1, max: 36_500 })
  shelfLifeDays?: number | null;

  @Optional()
  @Nullable()
  @Matches(/^[A-Z]{2}$/, { message: 'Give the country by its two letters.' })
  originCountryCode?: string | null;

  @Optional()
  @Nullable()
  @Matches(/^\d{4,10}$/, { message: 'Give the commodity code as 4 to 10 digits.' })
  commodityCode?: string | null;

  @IsArray()
  @ArrayMaxSize(partLimit.parameters)
  @ValidateNested({ each: true })
  @Type(() => PartParameterDto)
  parameters: PartParameterDto[];

  @IsArray()
  @ArrayMaxSize(partLimit.suppliers)
  @ValidateNested({ each: true })
  @Type(() => PartSupplierDto)
  suppliers: PartSupplierDto[];

  @Optional()
  @Nullable()
  @ValidateNested()
  @Type(() => PartBatteryDto)
  battery?: PartBatteryDto | null;
}

export class PartEditDto extends PartInputDto {
  @Version()
  version: number;
}

export class PartRetireDto {
  @Version()
  version: number;
}

export class NamedSupplierDto extends PartSupplierDto {
  name: string;
}

export class PartDto extends OmitType(PartInputDto, ['suppliers'] as const) {
  id: number;
  version: number;
  retiredOn: string | null;
  /** Whether measure and the way it is followed stay as they are, because something has moved. */
  moved: boolean;
  suppliers: NamedSupplierDto[];
}
