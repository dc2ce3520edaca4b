import { ArithmeticError, attempt } from '../errors/arithmetic-error.js';
import { decimal, type Decimal } from '../measure/decimal.js';
import { roundDecimal } from '../money/round.js';
import { tolerance, type Limits } from './limits.js';

export type Verdict = 'within' | 'outside';

/** How a reading stands to its limits. */
export interface Judgement {
  readonly verdict: Verdict;
  /** The limit that is nearer, or the one that is broken. */
  readonly limit: 'lower' | 'upper';
  /** Distance to that limit in the characteristic's unit: zero or more within, negative outside. */
  readonly margin: Decimal;
  /** The margin as a share of half the tolerance (1 in the middle, 0 at a limit); nothing with a single limit. */
  readonly marginShare?: Decimal;
}

/**
 * What is compared with the limits: the value as it was read (the absolute method), or the value rounded to the places
 * of the limits (the rounding method).
 * @source ASTM E29-13, sections 5 and 6; from memory.
 */
export type Comparison = 'as-read' | 'rounded';

/**
 * Judges a measured reading. A reading exactly on a limit is within.
 *
 * @param reading as the instrument shows it, plain notation with a point, in the characteristic's unit; its digits count
 * @param allowed the limits
 * @param comparison what is compared; `rounded` rounds half to even to the limits' own places (ASTM E29, 6.4)
 * @returns verdict, nearer limit and margin
 * @throws ArithmeticError `judge_unreadable`, `judge_too_few_decimals`
 */
export function judgeReading(reading: string, allowed: Limits, comparison: Comparison = 'as-read'): Judgement {
  const read = readValue(reading, allowed);
  const value = comparison === 'as-read' ? read : roundDecimal(read, limitPlaces(allowed), 'half-even');
  const below = allowed.lower && value.minus(allowed.lower);
  const above = allowed.upper && allowed.upper.minus(value);
  const lowerIsNearer = below !== undefined && (above === undefined || below.lessThanOrEqualTo(above));
  const margin = lowerIsNearer ? below : above;
  if (margin === undefined) throw new ArithmeticError('judge_no_limit');
  const width = tolerance(allowed);
  return {
    verdict: margin.lessThan(0) ? 'outside' : 'within',
    limit: lowerIsNearer ? 'lower' : 'upper',
    margin,
    ...(width && !width.isZero() && { marginShare: margin.times(2).div(width) }),
  };
}

/**
 * Judges a yes/no characteristic.
 *
 * @param reading what was found
 * @param wanted what must be found
 * @returns the verdict
 */
export function judgeYesNo(reading: boolean, wanted: boolean): Verdict {
  return reading === wanted ? 'within' : 'outside';
}

/**
 * Digits behind the point of a reading, zeros at the end included.
 *
 * @param reading plain notation with a point
 * @returns 2 for "12.30"
 * @throws ArithmeticError `judge_unreadable`
 */
export function readingDecimals(reading: string): number {
  readNumber(reading);
  return reading.includes('.') ? reading.length - reading.indexOf('.') - 1 : 0;
}

function readValue(reading: string, allowed: Limits): Decimal {
  if (readingDecimals(reading) < allowed.decimals) {
    throw new ArithmeticError('judge_too_few_decimals', { text: reading, decimals: allowed.decimals });
  }
  return readNumber(reading);
}

function readNumber(reading: string): Decimal {
  const value = attempt(() => decimal(reading));
  if (!value.ok) throw new ArithmeticError('judge_unreadable', { text: reading });
  return value.value;
}

function limitPlaces(allowed: Limits): number {
  return Math.max(allowed.lower?.decimalPlaces() ?? 0, allowed.upper?.decimalPlaces() ?? 0, allowed.decimals);
}
