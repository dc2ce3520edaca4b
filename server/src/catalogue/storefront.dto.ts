import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, IsArray, Matches, ValidateNested } from 'class-validator';
import { MoneyDto } from '../platform/api/money.dto.js';
import { Id, Optional, Text, Whole } from '../platform/validation/fields.js';

/** How many different things fit in a basket. */
export const mostBasketLines = 40;
/** How many of one thing can be ordered at once. */
export const mostOfOne = 20;

export class DestinationQuery {
  /** Where it goes, by ISO 3166-1; the shop's own country when nothing is said. */
  @Optional()
  @Matches(/^[A-Z]{2}$/, { message: 'Give a country by its two letters.' })
  country?: string;

  @Optional()
  @Text({ max: 16 })
  postcode?: string;
}

export class BasketLineDto {
  @Id()
  listingId: number;

  @Whole({ min: 1, max: mostOfOne })
  quantity: number;
}

export class BasketDto {
  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country it goes to.' })
  country: string;

  @Optional()
  @Text({ max: 16 })
  postcode?: string;

  @IsArray()
  @ArrayMinSize(1, { message: 'The basket is empty.' })
  @ArrayMaxSize(mostBasketLines)
  @ValidateNested({ each: true })
  @Type(() => BasketLineDto)
  lines: BasketLineDto[];
}

export class ShopCountryDto {
  code: string;
  name: string;
}

export class ShopFrontDto {
  name: string;
  legalName: string;
  addressLine: string;
  city: string;
  postcode: string;
  country: string;
  email: string;
  phone: string | null;
  vatNumber: string | null;
  registrationNumber: string | null;
  warrantyMonths: number;
  /** Countries the shop delivers to, by name. */
  countries: ShopCountryDto[];
}

/** The price of one, with the VAT of its destination. */
export class ShopPriceDto {
  net: MoneyDto;
  gross: MoneyDto;
  /** Percent. */
  vatRate: string;
  /** Name of the country whose VAT it is; null for an export. */
  vatCountry: string | null;
}

/** The day by which it leaves the shop; null where nobody can say: ask us. */
export class ShopPromiseDto {
  /** `YYYY-MM-DD` */
  leavesBy: string | null;
  /** Comes out of a batch under way, not from the shelf. */
  fromBatch: boolean;
}

export class ShopListingDto {
  id: number;
  slug: string;
  @ApiProperty({ enum: ['tool', 'kit', 'spare'] })
  form: string;
  family: string;
  title: string;
  summary: string;
  drawing: string | null;
  /** Null when its destination's VAT is a matter to ask us about. */
  @ApiProperty({ type: ShopPriceDto, nullable: true })
  price: ShopPriceDto | null;
  promise: ShopPromiseDto;
}

export class ShopListingsDto {
  items: ShopListingDto[];
  /** Why there are no prices, as a sentence; null when there are. */
  ask: string | null;
}

export class ShopContentDto {
  bag: string;
  name: string;
  quantity: string;
  measure: string;
}

export class ShopPositionDto {
  /** The number in the drawing. */
  mark: string;
  name: string;
}

export class ShopProductDto extends ShopListingDto {
  description: string;
  skills: string | null;
  cautions: string[];
  /** The same thing in its other forms. */
  siblings: ShopListingDto[];
  /** What is in the kit's bags; empty for tools and spares. */
  contents: ShopContentDto[];
  /** Names of the numbered positions in the drawing. */
  positions: ShopPositionDto[];
  ask: string | null;
}

export class QuotedLineDto {
  listingId: number;
  slug: string;
  title: string;
  form: string;
  quantity: number;
  unitNet: MoneyDto;
  unitGross: MoneyDto;
  net: MoneyDto;
}

/** A basket with its price, or the sentence that says why the shop must be asked. */
export class QuoteDto {
  /** Null when it can be ordered. */
  ask: string | null;
  lines: QuotedLineDto[];
  delivery: MoneyDto | null;
  net: MoneyDto | null;
  vat: MoneyDto | null;
  gross: MoneyDto | null;
  vatRate: string | null;
  vatCountry: string | null;
  vatNote: string | null;
  @ApiProperty({ type: ShopPromiseDto, nullable: true })
  promise: ShopPromiseDto | null;
  /** Working days on the way, as a guide. */
  transitDays: number | null;
}
