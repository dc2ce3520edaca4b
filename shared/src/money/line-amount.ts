import { decimal, Decimal, onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { currencyExponent, type CurrencyCode } from './currency.js';
import { minorAmountOf, type MinorAmount } from './minor-units.js';
import { roundQuotient, type RoundingMode } from './round.js';

/** What a document line charges for. */
export interface PricedQuantity {
  /** In the line's unit; negative for goods that come back. */
  readonly quantity: DecimalInput;
  /** Major units for `perQuantity` units, any number of decimals. */
  readonly price: DecimalInput;
  /** The quantity the price is for (BT-149); 1 if left out, never zero. */
  readonly perQuantity?: DecimalInput;
}

/**
 * Amount of a document line: quantity × price ÷ price base, rounded once.
 *
 * @param line quantity and price
 * @param currency decides the minor units
 * @param mode the way to round; `half-up` on invoices
 * @returns minor units, before allowances and charges of the line
 * @throws ArithmeticError `money_division_by_zero` for a price base of zero; `money_too_large`; `measure_not_a_number`,
 *   `measure_not_exact`
 * @source EN 16931-1:2017, BT-131, BT-129, BT-146, BT-149.
 */
export function lineAmount(line: PricedQuantity, currency: CurrencyCode, mode: RoundingMode = 'half-up'): MinorAmount {
  const scale = new Decimal(10).pow(currencyExponent(currency));
  const { integers } = onCommonScale([
    decimal(line.quantity).times(decimal(line.price)).times(scale),
    line.perQuantity ?? 1,
  ]);
  return minorAmountOf(roundQuotient(integers[0] ?? 0n, integers[1] ?? 0n, mode));
}
