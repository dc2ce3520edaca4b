import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { minorAmountOf, type MinorAmount } from './minor-units.js';

/**
 * Splits an amount by weights so that the parts add up to it: every share is rounded down, and the units left over go
 * to the largest fractions lost, ties to the earlier share. A negative amount is split like its opposite. A share of
 * weight zero gets nothing.
 *
 * @param total minor units; may be negative
 * @param weights one per share, none negative, any scale (values, grams, pieces)
 * @returns minor units per share, in the order of the weights; each less than one unit from its exact share
 * @throws ArithmeticError `money_weight_negative`; `money_no_weight` if something is to be spread over nothing;
 *   `measure_not_a_number`, `measure_not_exact`
 * @source largest remainder method (Hamilton, Hare).
 */
export function apportion(total: MinorAmount, weights: readonly DecimalInput[]): readonly MinorAmount[] {
  weights.forEach((weight, index) => {
    if (decimal(weight).isNegative() && !decimal(weight).isZero()) {
      throw new ArithmeticError('money_weight_negative', { position: index + 1, weight: weight.toString() });
    }
  });
  const { integers } = onCommonScale(weights);
  const sum = integers.reduce((all, weight) => all + weight, 0n);
  if (sum === 0n) {
    if (total !== 0) throw new ArithmeticError('money_no_weight');
    return integers.map(() => minorAmountOf(0n));
  }
  const size = BigInt(Math.abs(total));
  const shares = roundToTotal(
    integers.map((weight) => weight * size),
    sum,
    size,
  );
  return shares.map((share) => minorAmountOf(total < 0 ? -share : share));
}

/**
 * Rounds fractions with one denominator to whole numbers of a given sum by the largest remainder.
 *
 * @param numerators may be negative
 * @param denominator positive
 * @param total the wanted sum: the exact sum of the fractions, rounded down or up to a whole number
 * @returns whole numbers that add up to `total`, each at most one unit from its fraction
 */
export function roundToTotal(numerators: readonly bigint[], denominator: bigint, total: bigint): readonly bigint[] {
  const floors = numerators.map((numerator) => floorQuotient(numerator, denominator));
  const left = total - floors.reduce((sum, floor) => sum + floor, 0n);
  const order = numerators
    .map((numerator, index) => ({ index, fraction: numerator - (floors[index] ?? 0n) * denominator }))
    .sort((one, other) => compare(other.fraction, one.fraction) || one.index - other.index);
  const raised = new Set(order.slice(0, Number(left)).map(({ index }) => index));
  return floors.map((floor, index) => (raised.has(index) ? floor + 1n : floor));
}

function floorQuotient(numerator: bigint, denominator: bigint): bigint {
  const truncated = numerator / denominator;
  return numerator < 0n && truncated * denominator !== numerator ? truncated - 1n : truncated;
}

function compare(one: bigint, other: bigint): number {
  return one < other ? -1 : one > other ? 1 : 0;
}
