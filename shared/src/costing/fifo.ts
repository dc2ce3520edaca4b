import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import { addMinor, negateMinor, sumMinor, type MinorAmount } from '../money/minor-units.js';
import { issueFromPool } from '../money/movement-value.js';
import type { RoundingMode } from '../money/round.js';

/** What is left of one receipt. */
export interface CostLayer {
  /** The receipt (lot, delivery line) it came with. */
  readonly id: string;
  /** Place in time: smaller was received earlier. */
  readonly order: number;
  /** Stock unit, more than zero. */
  readonly quantity: Decimal;
  /** Minor units, not negative. */
  readonly value: MinorAmount;
}

/** What an issue took from one layer. */
export interface LayerShare {
  readonly id: string;
  readonly order: number;
  readonly quantity: Decimal;
  /** Minor units, not negative. */
  readonly value: MinorAmount;
}

/** An issue under first in, first out. */
export interface FifoIssue {
  /** Signed as the stock sees it: zero or negative. */
  readonly value: MinorAmount;
  /** Oldest first. */
  readonly shares: readonly LayerShare[];
  /** What is left, oldest first; no layer of quantity zero. */
  readonly layers: readonly CostLayer[];
}

/**
 * Puts a receipt on the layers, or goods that came back on the layer they left (at the value they left it with).
 *
 * @param layers before, in any order
 * @param receipt quantity more than zero, value not negative; a layer of the same id grows
 * @returns the layers, oldest first
 * @throws ArithmeticError `costing_layer_broken`, `money_too_large`
 */
export function addLayer(layers: readonly CostLayer[], receipt: CostLayer): readonly CostLayer[] {
  checkLayer(receipt);
  const same = layers.find(({ id }) => id === receipt.id);
  const grown = same
    ? { ...same, quantity: same.quantity.plus(receipt.quantity), value: addMinor(same.value, receipt.value) }
    : receipt;
  return oldestFirst([...layers.filter(({ id }) => id !== receipt.id), grown]);
}

/**
 * Takes a quantity from the oldest layers. A layer that is not emptied gives its share, rounded; one that is emptied
 * gives all that is left of it.
 *
 * @param layers before, in any order
 * @param quantity stock unit, more than zero
 * @param mode the way to round the share of the last layer touched
 * @returns the value, what came from which layer, and the layers left
 * @throws ArithmeticError `costing_quantity_not_positive`, `costing_more_than_held`, `costing_layer_broken`
 * @source IAS 2, paragraphs 25 and 27 (first in, first out).
 */
export function issueFifo(
  layers: readonly CostLayer[],
  quantity: DecimalInput,
  mode: RoundingMode = 'half-even',
): FifoIssue {
  layers.forEach(checkLayer);
  const asked = decimal(quantity);
  if (asked.lessThanOrEqualTo(0)) {
    throw new ArithmeticError('costing_quantity_not_positive', { quantity: asked.toFixed() });
  }
  const held = layers.reduce((sum, layer) => sum.plus(layer.quantity), new Decimal(0));
  if (asked.greaterThan(held)) {
    throw new ArithmeticError('costing_more_than_held', { asked: asked.toFixed(), held: held.toFixed() });
  }
  const shares: LayerShare[] = [];
  const left: CostLayer[] = [];
  let open = asked;
  for (const layer of oldestFirst(layers)) {
    const taken = Decimal.min(open, layer.quantity);
    if (taken.isZero()) {
      left.push(layer);
      continue;
    }
    const { value, pool } = issueFromPool(layer, taken, mode);
    shares.push({ id: layer.id, order: layer.order, quantity: taken, value: negateMinor(value) });
    if (!pool.quantity.isZero()) left.push({ ...layer, ...pool });
    open = open.minus(taken);
  }
  return { value: negateMinor(sumMinor(shares.map((share) => share.value))), shares, layers: left };
}

/**
 * Value of all layers.
 *
 * @param layers the layers
 * @returns minor units
 * @throws ArithmeticError `money_too_large`
 */
export function layersValue(layers: readonly CostLayer[]): MinorAmount {
  return sumMinor(layers.map((layer) => layer.value));
}

function oldestFirst<T extends { readonly order: number }>(layers: readonly T[]): readonly T[] {
  return [...layers].sort((one, other) => one.order - other.order);
}

function checkLayer(layer: CostLayer): void {
  if (layer.quantity.greaterThan(0) && layer.value >= 0) return;
  throw new ArithmeticError('costing_layer_broken', {
    layer: layer.id,
    quantity: layer.quantity.toFixed(),
    value: layer.value,
  });
}
