import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';

/**
 * Ways to round, by name. The first six are ties only: a value that is not exactly half-way goes to the nearer side.
 *
 * - `half-up`: half-way goes away from zero (0.5 → 1, −0.5 → −1): invoices and VAT
 * - `half-down`: half-way goes towards zero
 * - `half-even`: half-way goes to the even neighbour, so that many roundings do not drift: stock values
 * - `half-ceiling`, `half-floor`: half-way goes towards plus or minus infinity
 * - `up`, `down`: always away from, always towards zero
 * - `ceiling`, `floor`: always towards plus, always towards minus infinity
 *
 * @source names in common use; IEEE 754-2019, 4.3 for the directions; half away from zero is what Council Regulation
 * (EC) 1103/97, article 5 and commercial practice ask for positive amounts.
 */
export type RoundingMode =
  'half-up' | 'half-down' | 'half-even' | 'half-ceiling' | 'half-floor' | 'up' | 'down' | 'ceiling' | 'floor';

const libraryMode = {
  'half-up': 4,
  'half-down': 5,
  'half-even': 6,
  'half-ceiling': 7,
  'half-floor': 8,
  up: 0,
  down: 1,
  ceiling: 2,
  floor: 3,
} as const satisfies Record<RoundingMode, number>;

/**
 * Rounds a decimal to a number of places.
 *
 * @param value the decimal
 * @param places digits kept after the point, 0 or more
 * @param mode the way to round
 * @returns the rounded value, never minus zero
 * @throws ArithmeticError `measure_not_a_number` or `measure_not_exact` for a value that is no decimal
 */
export function roundDecimal(value: DecimalInput, places: number, mode: RoundingMode): Decimal {
  const rounded = decimal(value).toDecimalPlaces(places, libraryMode[mode]);
  return rounded.isZero() ? new Decimal(0) : rounded;
}

/**
 * Rounds a quotient of whole numbers without ever forming the fraction, so that a tie is seen as a tie.
 *
 * @param numerator any whole number
 * @param denominator any whole number but zero
 * @param mode the way to round
 * @returns the whole number next to `numerator / denominator`
 * @throws ArithmeticError `money_division_by_zero`
 */
export function roundQuotient(numerator: bigint, denominator: bigint, mode: RoundingMode): bigint {
  if (denominator === 0n) throw new ArithmeticError('money_division_by_zero');
  if (denominator < 0n) return roundQuotient(-numerator, -denominator, mode);
  const truncated = numerator / denominator;
  const rest = numerator - truncated * denominator;
  if (rest === 0n) return truncated;
  const negative = numerator < 0n;
  const twice = (negative ? -rest : rest) * 2n;
  const side = twice < denominator ? 'below' : twice > denominator ? 'above' : 'half';
  return goesAwayFromZero(mode, side, negative, truncated) ? truncated + (negative ? -1n : 1n) : truncated;
}

function goesAwayFromZero(
  mode: RoundingMode,
  side: 'below' | 'half' | 'above',
  negative: boolean,
  truncated: bigint,
): boolean {
  if (mode === 'up') return true;
  if (mode === 'down') return false;
  if (mode === 'ceiling') return !negative;
  if (mode === 'floor') return negative;
  if (side !== 'half') return side === 'above';
  if (mode === 'half-up') return true;
  if (mode === 'half-down') return false;
  if (mode === 'half-even') return truncated % 2n !== 0n;
  return mode === 'half-ceiling' ? !negative : negative;
}
