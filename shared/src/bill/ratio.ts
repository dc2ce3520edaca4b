import { type Decimal, onCommonScale } from '../measure/decimal.js';
import type { BillLine } from './bill-lines.js';

/** An exact fraction; the denominator is above zero. */
export interface Ratio {
  readonly numerator: bigint;
  readonly denominator: bigint;
}

export const one: Ratio = { numerator: 1n, denominator: 1n };

/** amount × ratio, rounded up to a whole number. */
export function timesRoundedUp(amount: bigint, { numerator, denominator }: Ratio): bigint {
  return (amount * numerator + denominator - 1n) / denominator;
}

/**
 * What a line takes, from steps of the built part to steps of the component, a step being the last decimal of a stock
 * unit: quantity per / (1 − scrap share).
 */
export function lineRatio(line: BillLine, parentDecimals: number, componentDecimals: number): Ratio {
  return inSteps(ratioOf(line.quantityPer, line.scrapShare.negated().plus(1)), componentDecimals - parentDecimals);
}

/** dividend / divisor, exactly. */
export function ratioOf(dividend: Decimal, divisor: Decimal): Ratio {
  const [numerator = 0n, denominator = 1n] = onCommonScale([dividend, divisor]).integers;
  return reduce({ numerator, denominator });
}

export function multiply(a: Ratio, b: Ratio): Ratio {
  return reduce({ numerator: a.numerator * b.numerator, denominator: a.denominator * b.denominator });
}

/** The same ratio counted in other steps: its results have so many more decimals than what it is applied to. */
export function inSteps({ numerator, denominator }: Ratio, moreDecimals: number): Ratio {
  const power = 10n ** BigInt(Math.abs(moreDecimals));
  return moreDecimals >= 0
    ? reduce({ numerator: numerator * power, denominator })
    : reduce({ numerator, denominator: denominator * power });
}

function reduce({ numerator, denominator }: Ratio): Ratio {
  let [a, b] = [numerator, denominator];
  while (b !== 0n) [a, b] = [b, a % b];
  return { numerator: numerator / a, denominator: denominator / a };
}
