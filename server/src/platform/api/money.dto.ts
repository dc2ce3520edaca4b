import { Matches } from 'class-validator';
import { MinorAmount } from '../validation/fields.js';

/** An amount of money as it travels: whole minor units (cents) and an ISO 4217 code. */
export class MoneyDto {
  /** In minor units: 1250 is 12.50 in a currency with two decimals. */
  @MinorAmount({ negative: true })
  amount: number;

  @Matches(/^[A-Z]{3}$/, { message: 'Give a currency by its three letters, such as EUR.' })
  currency: string;
}
