import { Decimal } from '../measure/decimal.js';
import type { Limits } from './limits.js';

/** What looks wrong about a reading. */
export interface PlausibilityDoubt {
  /** A power of ten between what was typed and what was meant, or the wrong sign. */
  readonly kind: 'factor' | 'sign';
  /** What the reading would have to be multiplied by: 1000 if volts were typed where millivolts are asked. */
  readonly factor: Decimal;
  /** The reading as it was probably meant, in the characteristic's unit. */
  readonly suggestion: Decimal;
}

/** Slips that happen: a prefix (1000, a million), or a decimal mark one or two places off. */
const slips = ['1000', '0.001', '1000000', '0.000001', '10', '0.1', '100', '0.01'];

/** How far, as a ratio, a corrected reading may lie from what is usual; the reading itself is then at least five off. */
const credibleTo = 2;

/**
 * Doubts a reading that looks as if its unit or decimal mark had slipped. It never changes a reading: it lets the form
 * ask once more. A reading that is merely bad is not doubted.
 *
 * @param reading in the characteristic's unit
 * @param allowed the limits
 * @param usual what such readings usually are, for example the median of earlier ones; if left out, the middle of two
 *   limits or the single limit
 * @returns the doubt, or nothing
 * @source common practice, no source.
 */
export function doubtReading(reading: Decimal, allowed: Limits, usual?: Decimal): PlausibilityDoubt | undefined {
  const expected = usual ?? middle(allowed);
  if (!expected || expected.isZero() || reading.isZero()) return undefined;
  if (isWithin(reading, allowed) && usual === undefined) return undefined;
  if (reading.isNegative() !== expected.isNegative()) {
    const turned = reading.negated();
    const onlyTheSign = ratio(turned, expected).lessThanOrEqualTo(credibleTo) && isWithin(turned, allowed);
    return onlyTheSign ? { kind: 'sign', factor: new Decimal(-1), suggestion: turned } : undefined;
  }
  const doubts = slips
    .map((slip): PlausibilityDoubt => ({ kind: 'factor', factor: new Decimal(slip), suggestion: reading.times(slip) }))
    .filter(({ suggestion }) => ratio(suggestion, expected).lessThanOrEqualTo(credibleTo))
    .sort((one, other) => ratio(one.suggestion, expected).comparedTo(ratio(other.suggestion, expected)));
  return doubts[0];
}

function middle(allowed: Limits): Decimal | undefined {
  if (allowed.lower && allowed.upper) return allowed.lower.plus(allowed.upper).div(2);
  return allowed.lower ?? allowed.upper;
}

function isWithin(reading: Decimal, allowed: Limits): boolean {
  return !(allowed.lower?.greaterThan(reading) ?? false) && !(allowed.upper?.lessThan(reading) ?? false);
}

/** How many times the larger of two sizes is the smaller; 1 if they are alike. */
function ratio(one: Decimal, other: Decimal): Decimal {
  const quotient = one.div(other).abs();
  return quotient.lessThan(1) ? new Decimal(1).div(quotient) : quotient;
}
