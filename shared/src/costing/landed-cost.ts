import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, Decimal, sumDecimals, type DecimalInput } from '../measure/decimal.js';
import { apportion } from '../money/apportion.js';
import type { MinorAmount } from '../money/minor-units.js';
import { revaluePool, type CostPool } from '../money/movement-value.js';

/** A line of a delivery that freight, duty or insurance is spread over. */
export interface LandedLine {
  /** Stock unit. */
  readonly quantity: DecimalInput;
  /** Minor units. */
  readonly value: MinorAmount;
  /** Any one unit for all lines. */
  readonly weight: DecimalInput;
}

/** What decides a line's share. */
export type LandedBasis = 'value' | 'weight' | 'quantity';

/**
 * Spreads a cost of a delivery over its lines.
 *
 * @param cost minor units; a later credit may be negative
 * @param lines the lines
 * @param basis value for duty and insurance, weight for freight, quantity where neither fits
 * @returns minor units per line, adding up to the cost; ties to the earlier line
 * @throws ArithmeticError `costing_nothing_to_spread_over` if no line has any of the basis; `money_weight_negative`
 * @source IAS 2, paragraphs 10 and 11 (costs of purchase); largest remainder.
 */
export function spreadLandedCost(
  cost: MinorAmount,
  lines: readonly LandedLine[],
  basis: LandedBasis,
): readonly MinorAmount[] {
  const weights = lines.map((line) => line[basis]);
  if (cost !== 0 && weights.every((weight) => decimal(weight).isZero())) {
    throw new ArithmeticError('costing_nothing_to_spread_over');
  }
  return apportion(cost, weights);
}

/** Where a received quantity is by the time a late cost arrives. */
export interface Destination {
  readonly name: string;
  /** Stock unit, not negative. */
  readonly quantity: DecimalInput;
}

/**
 * Splits a cost that arrives after the goods: the part for what is still held (as it is, or built into something still
 * held) goes to stock, the rest to where the goods went.
 *
 * @param cost minor units
 * @param received quantity of the receipt the cost belongs to, stock unit
 * @param destinations where all of it is; quantities add up to `received`
 * @returns minor units per destination, adding up to the cost
 * @throws ArithmeticError `costing_destinations_differ`, `costing_nothing_to_spread_over`, `money_weight_negative`
 * @source IAS 2, paragraphs 10, 11 and 34.
 */
export function splitLateCost(
  cost: MinorAmount,
  received: DecimalInput,
  destinations: readonly Destination[],
): readonly MinorAmount[] {
  const found = sumDecimals(destinations.map(({ quantity }) => quantity));
  if (!found.equals(decimal(received))) {
    throw new ArithmeticError('costing_destinations_differ', {
      received: decimal(received).toFixed(),
      found: found.toFixed(),
    });
  }
  if (found.isZero() && cost !== 0) throw new ArithmeticError('costing_nothing_to_spread_over');
  return apportion(
    cost,
    destinations.map(({ quantity }) => quantity),
  );
}

/** A late cost under a moving average, where nobody knows which piece is left. */
export interface LateCostOnPool {
  /** Minor units. */
  readonly toStock: MinorAmount;
  /** Minor units. */
  readonly toCostOfSales: MinorAmount;
  readonly pool: CostPool;
}

/**
 * Splits a late cost under a moving average: as much of the receipt counts as still held as the pool holds at all.
 *
 * @param cost minor units
 * @param received quantity of the receipt, stock unit, more than zero
 * @param pool what is held now
 * @returns the two parts and the pool after them; a pool of quantity zero stays at value zero
 * @throws ArithmeticError `costing_quantity_not_positive`, `money_pool_broken` if a credit is larger than the value held
 * @source IAS 2, paragraphs 11 and 27; the presumption is common practice, no source.
 */
export function lateCostOnPool(cost: MinorAmount, received: DecimalInput, pool: CostPool): LateCostOnPool {
  const all = decimal(received);
  if (all.lessThanOrEqualTo(0)) {
    throw new ArithmeticError('costing_quantity_not_positive', { quantity: all.toFixed() });
  }
  const held = Decimal.min(all, pool.quantity);
  const [toStock, toCostOfSales] = splitLateCost(cost, all, [
    { name: 'stock', quantity: held },
    { name: 'sold', quantity: all.minus(held) },
  ]);
  if (toStock === undefined || toCostOfSales === undefined) throw new ArithmeticError('costing_nothing_to_spread_over');
  return { toStock, toCostOfSales, pool: revaluePool(pool, toStock).pool };
}
