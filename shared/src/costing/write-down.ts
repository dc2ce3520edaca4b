import { ArithmeticError } from '../errors/arithmetic-error.js';
import { minorAmount, subtractMinor, type MinorAmount } from '../money/minor-units.js';

/** Expected sale of an item, minor units for the whole quantity looked at. */
export interface ExpectedSale {
  readonly price: MinorAmount;
  /** Cost to finish it. */
  readonly completion: MinorAmount;
  /** Cost to sell it. */
  readonly selling: MinorAmount;
}

/** An item of stock at the balance date, minor units for the whole quantity. */
export interface StockItem {
  /** What it cost, before any write-down. */
  readonly cost: MinorAmount;
  /** What it stands at now; not above cost. */
  readonly carrying: MinorAmount;
}

/**
 * Net realisable value.
 *
 * @param sale price, cost to complete, cost to sell
 * @returns minor units, never below zero
 * @source IAS 2, paragraph 6.
 */
export function netRealisableValue(sale: ExpectedSale): MinorAmount {
  return minorAmount(Math.max(0, sale.price - sale.completion - sale.selling));
}

/**
 * What to post so that an item stands at the lower of cost and net realisable value: a write-down, a reversal of an
 * earlier one (never above the original cost), or nothing. Item by item; a gain on one does not save another.
 *
 * @param item cost and carrying value
 * @param realisable its net realisable value, minor units
 * @returns the change of the carrying value, minor units: negative a write-down, positive a reversal
 * @throws ArithmeticError `costing_carrying_above_cost`, `costing_value_negative`
 * @source IAS 2, paragraphs 9, 28, 29 and 33.
 */
export function adjustToRealisable(item: StockItem, realisable: MinorAmount): MinorAmount {
  for (const value of [item.cost, item.carrying, realisable]) {
    if (value < 0) throw new ArithmeticError('costing_value_negative', { value });
  }
  if (item.carrying > item.cost) {
    throw new ArithmeticError('costing_carrying_above_cost', { carrying: item.carrying, cost: item.cost });
  }
  return subtractMinor(minorAmount(Math.min(item.cost, realisable)), item.carrying);
}

/** A finished product a material is kept for, minor units per product. */
export interface FinishedProduct {
  readonly cost: MinorAmount;
  readonly realisable: MinorAmount;
}

/**
 * The same for materials: they are not written down while what they are built into sells at or above its cost; else
 * their replacement price stands for the net realisable value.
 *
 * @param item the material
 * @param replacement what the quantity would cost today, minor units
 * @param product what it is built into
 * @returns the change of the carrying value, minor units
 * @throws ArithmeticError as {@link adjustToRealisable}
 * @source IAS 2, paragraph 32.
 */
export function adjustMaterial(item: StockItem, replacement: MinorAmount, product: FinishedProduct): MinorAmount {
  return adjustToRealisable(item, product.realisable >= product.cost ? item.cost : replacement);
}
