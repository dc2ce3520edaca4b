import { ArithmeticError } from '../errors/arithmetic-error.js';
import { onCommonScale, type DecimalInput } from '../measure/decimal.js';
import type { CurrencyCode } from './currency.js';
import { roundQuotient, type RoundingMode } from './round.js';

declare const minorAmountBrand: unique symbol;

/** An amount in whole minor units of its currency (cents for EUR, yen for JPY): a safe integer, never minus zero. */
export type MinorAmount = number & { readonly [minorAmountBrand]: true };

/** An amount with its currency. */
export interface Money {
  readonly amount: MinorAmount;
  readonly currency: CurrencyCode;
}

/** Nothing. */
export const zeroAmount = 0 as MinorAmount;

/**
 * Takes a number as an amount.
 *
 * @param value whole minor units; may be negative
 * @returns the amount
 * @throws ArithmeticError `money_not_whole` for fractions and NaN, `money_too_large` beyond ±(2^53 − 1)
 */
export function minorAmount(value: number): MinorAmount {
  if (Number.isSafeInteger(value)) return (value === 0 ? 0 : value) as MinorAmount;
  const whole = Number.isInteger(value) || Math.abs(value) === Infinity;
  throw new ArithmeticError(whole ? 'money_too_large' : 'money_not_whole', { amount: String(value) });
}

/**
 * Takes a big integer as an amount.
 *
 * @param value whole minor units
 * @returns the amount
 * @throws ArithmeticError `money_too_large` beyond ±(2^53 − 1)
 */
export function minorAmountOf(value: bigint): MinorAmount {
  const number = Number(value);
  if (!Number.isSafeInteger(number)) throw new ArithmeticError('money_too_large', { amount: value.toString() });
  return number as MinorAmount;
}

/**
 * Adds amounts of one currency.
 *
 * @param amounts minor units
 * @returns their sum; nothing for none
 * @throws ArithmeticError `money_too_large` when the sum is no longer exact
 */
export function sumMinor(amounts: Iterable<MinorAmount>): MinorAmount {
  let sum = 0;
  for (const amount of amounts) sum = minorAmount(sum + amount);
  return sum as MinorAmount;
}

/**
 * Adds two amounts of one currency.
 *
 * @param left minor units
 * @param right minor units
 * @returns `left + right`
 * @throws ArithmeticError `money_too_large`
 */
export function addMinor(left: MinorAmount, right: MinorAmount): MinorAmount {
  return minorAmount(left + right);
}

/**
 * Takes one amount from another of the same currency.
 *
 * @param left minor units
 * @param right minor units
 * @returns `left − right`
 * @throws ArithmeticError `money_too_large`
 */
export function subtractMinor(left: MinorAmount, right: MinorAmount): MinorAmount {
  return minorAmount(left - right);
}

/**
 * The amount with its sign turned.
 *
 * @param amount minor units
 * @returns `−amount`
 */
export function negateMinor(amount: MinorAmount): MinorAmount {
  return minorAmount(0 - amount);
}

/**
 * Multiplies an amount by a decimal (a quantity, a rate, a discount) and rounds once.
 *
 * @param amount minor units
 * @param factor the decimal, for example "0.23" for 23 percent
 * @param mode the way to round
 * @returns minor units
 * @throws ArithmeticError `measure_not_a_number`, `measure_not_exact`, `money_too_large`
 */
export function multiplyMinor(amount: MinorAmount, factor: DecimalInput, mode: RoundingMode): MinorAmount {
  const { integers, places } = onCommonScale([factor]);
  return minorAmountOf(roundQuotient(BigInt(amount) * (integers[0] ?? 0n), 10n ** BigInt(places), mode));
}

/**
 * Adds amounts that carry their currency.
 *
 * @param left an amount
 * @param right an amount of the same currency
 * @returns their sum
 * @throws ArithmeticError `money_mixed_currencies`, `money_too_large`
 */
export function addMoney(left: Money, right: Money): Money {
  if (left.currency !== right.currency) {
    throw new ArithmeticError('money_mixed_currencies', { left: left.currency, right: right.currency });
  }
  return { amount: addMinor(left.amount, right.amount), currency: left.currency };
}
