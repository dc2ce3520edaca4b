import { Decimal as DecimalJs } from 'decimal.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';

/**
 * The one decimal of the product: 60 significant digits, never written with an exponent, and apart from the library's
 * global settings. Sums, differences and products of quantities and prices are exact in it; only a division rounds, far
 * behind the last digit that anyone keeps.
 */
export const Decimal = DecimalJs.clone({ precision: 60, toExpNeg: -100, toExpPos: 100, defaults: true });
export type Decimal = DecimalJs;

/** A decimal as it comes from a database, a form or code: text, a whole number, or already a decimal. */
export type DecimalInput = string | number | Decimal;

const plainDecimal = /^[+-]?(\d+\.?\d*|\.\d+)$/;

/**
 * Reads a decimal without passing through a binary fraction.
 *
 * @param input text in plain notation with a point ("12.50"), a whole safe number, or a decimal
 * @returns the exact value
 * @throws ArithmeticError `measure_not_exact` for a number that is not a safe integer, `measure_not_a_number` for text
 *   in any other notation and for values that are not finite
 */
export function decimal(input: DecimalInput): Decimal {
  if (typeof input === 'number') {
    if (!Number.isFinite(input)) throw new ArithmeticError('measure_not_a_number', { value: String(input) });
    if (!Number.isSafeInteger(input)) throw new ArithmeticError('measure_not_exact', { value: input });
    return new Decimal(input);
  }
  if (typeof input === 'string') {
    if (!plainDecimal.test(input)) throw new ArithmeticError('measure_not_a_number', { value: input });
    return new Decimal(input);
  }
  if (!input.isFinite()) throw new ArithmeticError('measure_not_a_number', { value: input.toString() });
  return new Decimal(input);
}

/**
 * Adds decimals exactly.
 *
 * @param inputs any number of decimals
 * @returns their sum; zero for none
 * @throws ArithmeticError as {@link decimal}
 */
export function sumDecimals(inputs: Iterable<DecimalInput>): Decimal {
  let sum = new Decimal(0);
  for (const input of inputs) sum = sum.plus(decimal(input));
  return sum;
}

/**
 * Writes a decimal in plain notation: no exponent, no trailing zeros, no minus before a zero.
 *
 * @param input the decimal
 * @returns for example "0.000001" or "12.5"
 * @throws ArithmeticError as {@link decimal}
 */
export function decimalText(input: DecimalInput): string {
  const value = decimal(input);
  return value.isZero() ? '0' : value.toFixed();
}

/**
 * Brings decimals to whole numbers on one common power of ten, so that they can be compared and divided exactly.
 *
 * @param inputs decimals
 * @returns `integers[i] = inputs[i] × 10^places`, with the fewest places that keep every digit
 * @throws ArithmeticError as {@link decimal}
 */
export function onCommonScale(inputs: readonly DecimalInput[]): {
  readonly integers: readonly bigint[];
  readonly places: number;
} {
  const values = inputs.map(decimal);
  const places = values.reduce((most, value) => Math.max(most, value.decimalPlaces()), 0);
  return { integers: values.map((value) => BigInt(value.toFixed(places).replace('.', ''))), places };
}
