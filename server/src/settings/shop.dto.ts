import { ArrayMaxSize, ArrayMinSize, ArrayUnique, IsArray, IsBoolean, IsInt, Matches, Max, Min } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { MoneyDto } from '../platform/api/money.dto.js';
import { Day, Email, MinorAmount, Nullable, Optional, Text, Version, Whole } from '../platform/validation/fields.js';

export class ShopInputDto {
  /** As customers know it. */
  @Text({ max: textLimit.name })
  name: string;

  /** As it stands on invoices. */
  @Text({ max: textLimit.name })
  legalName: string;

  @Text({ max: textLimit.line })
  addressLine: string;

  @Text({ max: textLimit.name })
  city: string;

  @Text({ max: 16 })
  postcode: string;

  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country.' })
  countryCode: string;

  @Email()
  email: string;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  phone?: string | null;

  @Optional()
  @Nullable()
  @Matches(/^[A-Z]{2}[A-Z0-9+*]{2,13}$/, { message: 'Give the VAT number with the letters of its country in front.' })
  vatNumber?: string | null;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.code })
  registrationNumber?: string | null;

  @Optional()
  @Nullable()
  @Text({ max: textLimit.name })
  bankName?: string | null;

  @Optional()
  @Nullable()
  @Matches(/^[A-Z]{2}\d{2}[A-Z0-9]{10,30}$/, { message: 'Give the account as its IBAN, without spaces.' })
  iban?: string | null;

  /** Of the books; it stays once something is posted. */
  @Matches(/^[A-Z]{3}$/, { message: 'Give the currency by its three letters, such as EUR.' })
  currency: string;

  /** ISO weekdays on which the shop works: Monday 1 to Sunday 7. */
  @IsArray()
  @ArrayMinSize(1, { message: 'Choose at least one day.' })
  @ArrayMaxSize(7)
  @ArrayUnique({ message: 'Name each day once.' })
  @IsInt({ each: true })
  @Min(1, { each: true })
  @Max(7, { each: true })
  workingWeekdays: number[];

  /** Working days from an order to its parcel. */
  @Whole({ min: 0, max: 60 })
  handlingDays: number;

  /** How long goods stay claimed for a buyer on the payment page. */
  @Whole({ min: 31, max: 1_440 })
  checkoutHoldMinutes: number;

  /** Cost of an hour at the bench, in minor units. */
  @MinorAmount()
  labourRateMinor: number;

  @Whole({ min: 0, max: 240 })
  warrantyMonths: number;

  /** First day on which destination VAT is charged to consumers elsewhere in the union; null: not elected. */
  @Optional()
  @Nullable()
  @Day()
  oneStopShopFrom?: string | null;
}

export class ShopEditDto extends ShopInputDto {
  @Version()
  version: number;
}

export class ShopDto extends ShopInputDto {
  /** The zone of its days, set where the server is started. */
  zone: string;
  /** Whether the currency stays, because something is posted in it. */
  currencyStays: boolean;
  version: number;
}

export class ShopAnswerDto {
  /** Null until the owner has set the shop up. */
  shop: ShopDto | null;
  /** The zone of the shop's days, which is set where the server is started. */
  zone: string;
}

export class ClosedDayInputDto {
  @Day()
  day: string;

  @Text({ max: textLimit.name })
  name: string;
}

export class ClosedDayDto extends ClosedDayInputDto {}

export class ClosedDaysDto {
  items: ClosedDayDto[];
  total: number;
}

export class CountryDto {
  code: string;
  name: string;
  /** Whether its goods are inside the European Union's VAT area. */
  inUnion: boolean;
}

export class CountriesDto {
  items: CountryDto[];
  total: number;
}

export class VatRateInputDto {
  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country.' })
  countryCode: string;

  /** Percent. */
  @Matches(/^(?:0|[1-9]\d?)(?:\.\d{1,4})?$/, { message: 'Give the rate in percent, below 100, such as 23 or 13.5.' })
  rate: string;

  @Day()
  validFrom: string;

  /** Where the rate was read. */
  @Text({ max: textLimit.line })
  source: string;
}

export class VatRateDto extends VatRateInputDto {
  id: number;
  validUntil: string | null;
}

export class VatRatesDto {
  items: VatRateDto[];
  total: number;
}

export class VatExceptionInputDto {
  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country.' })
  countryCode: string;

  /** The beginning of the postcodes it holds for. */
  @Matches(/^[A-Z0-9][A-Z0-9 -]{0,9}$/, { message: 'Give the beginning of the postcodes, in capitals.' })
  postcodePrefix: string;

  /** What the buyer is told. */
  @Text({ max: textLimit.line })
  sentence: string;
}

export class VatExceptionDto extends VatExceptionInputDto {}

export class VatExceptionsDto {
  items: VatExceptionDto[];
  total: number;
}

export class DeliveryRateInputDto {
  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country.' })
  countryCode: string;

  /** Net price, in minor units of the shop's currency. */
  @MinorAmount()
  netMinor: number;

  @Whole({ min: 0, max: 90 })
  transitDays: number;

  /** Whether parcels with lithium cells or batteries can go this way. */
  @IsBoolean()
  carriesLithium: boolean;

  @Day()
  validFrom: string;
}

export class DeliveryRateDto {
  id: number;
  countryCode: string;
  net: MoneyDto;
  transitDays: number;
  carriesLithium: boolean;
  validFrom: string;
}

export class DeliveryRatesDto {
  items: DeliveryRateDto[];
  total: number;
}
