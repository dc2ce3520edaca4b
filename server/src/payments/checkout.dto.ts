import { Type } from 'class-transformer';
import { ArrayMaxSize, ArrayMinSize, Equals, IsArray, IsBoolean, Matches, ValidateNested } from 'class-validator';
import { textLimit } from '@emberlot/shared/limits/text';
import { BasketLineDto, mostBasketLines } from '../catalogue/storefront.dto.js';
import { Day, Email, MinorAmount, Optional, Text } from '../platform/validation/fields.js';

export class CheckoutDto {
  @IsArray()
  @ArrayMinSize(1, { message: 'The basket is empty.' })
  @ArrayMaxSize(mostBasketLines)
  @ValidateNested({ each: true })
  @Type(() => BasketLineDto)
  lines: BasketLineDto[];

  @Matches(/^[A-Z]{2}$/, { message: 'Choose the country it goes to.' })
  country: string;

  @Email()
  email: string;

  @Text({ max: textLimit.name })
  recipient: string;

  @Optional()
  @Text({ max: textLimit.name })
  company?: string;

  @Text({ max: textLimit.line })
  addressLine: string;

  @Optional()
  @Text({ max: textLimit.line })
  addressLine2?: string;

  @Text({ max: textLimit.name })
  city: string;

  @Text({ max: 16 })
  postcode: string;

  /** The total the buyer saw, in minor units. */
  @MinorAmount()
  expectedGross: number;

  /** The day the buyer was promised. */
  @Day()
  expectedDay: string;

  /** The terms were read and accepted. */
  @IsBoolean()
  @Equals(true, { message: 'Read and accept the terms first.' })
  termsAccepted: boolean;
}

export class CheckedOutDto {
  number: string;
  /** Opens the order without signing in; given out once. */
  guestToken: string;
  /** Where to pay; null when the payments service did not answer. */
  paymentPage: string | null;
}
