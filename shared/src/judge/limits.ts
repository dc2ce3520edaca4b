import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, type Decimal, type DecimalInput } from '../measure/decimal.js';

/** Limits of a measured characteristic, both belonging to what is allowed; at least one is set. */
export interface Limits {
  /** In the characteristic's unit. */
  readonly lower?: Decimal;
  /** In the characteristic's unit. */
  readonly upper?: Decimal;
  /** Digits behind the point that a reading must have at least. */
  readonly decimals: number;
}

/** Limits as they are typed or stored. */
export interface LimitsInput {
  readonly lower?: DecimalInput | null | undefined;
  readonly upper?: DecimalInput | null | undefined;
  readonly decimals?: number | null | undefined;
}

/**
 * Checks limits.
 *
 * @param input lower and upper limit in the characteristic's unit, either may be missing; decimals asked of a reading
 *   (0 if left out)
 * @returns the limits
 * @throws ArithmeticError `judge_no_limit`, `judge_limits_crossed`, `judge_decimals`; `measure_not_a_number`,
 *   `measure_not_exact`
 */
export function limits(input: LimitsInput): Limits {
  const lower = limitOf(input.lower);
  const upper = limitOf(input.upper);
  const decimals = input.decimals ?? 0;
  if (!lower && !upper) throw new ArithmeticError('judge_no_limit');
  if (lower && upper && lower.greaterThan(upper)) {
    throw new ArithmeticError('judge_limits_crossed', { lower: lower.toFixed(), upper: upper.toFixed() });
  }
  if (!Number.isInteger(decimals) || decimals < 0 || decimals > 9) {
    throw new ArithmeticError('judge_decimals', { decimals });
  }
  return { ...(lower && { lower }), ...(upper && { upper }), decimals };
}

/**
 * Width of the allowed range.
 *
 * @param allowed the limits
 * @returns upper − lower in the characteristic's unit, or nothing with a single limit
 */
export function tolerance(allowed: Limits): Decimal | undefined {
  return allowed.lower && allowed.upper ? allowed.upper.minus(allowed.lower) : undefined;
}

function limitOf(input: DecimalInput | null | undefined): Decimal | undefined {
  return input === null || input === undefined ? undefined : decimal(input);
}
