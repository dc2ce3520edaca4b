import { negateMinor, sumMinor, type MinorAmount } from '../money/minor-units.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import { emptyPool, issueFromPool, receiveIntoPool, type CostPool } from '../money/movement-value.js';
import { addLayer, issueFifo, layersValue, type CostLayer } from './fifo.js';

/** A movement of one part, in the order it happened. */
export type StockEvent =
  | { readonly kind: 'in'; readonly quantity: DecimalInput; readonly value: MinorAmount }
  | { readonly kind: 'out'; readonly quantity: DecimalInput };

/** What a history cost and what is left of it. */
export interface StockValuation {
  /** Per issue, in order, minor units, not negative. */
  readonly perIssue: readonly MinorAmount[];
  /** Sum of the issues, minor units. */
  readonly costOfIssues: MinorAmount;
  /** Left at the end. */
  readonly closing: CostPool;
}

/**
 * Values a history under the moving weighted average: each receipt makes a new average, each issue takes its share.
 *
 * @param events movements of one part, oldest first
 * @returns cost of issues and closing stock, adding up to the receipts
 * @throws ArithmeticError `money_more_than_held`, `money_quantity_not_positive`, `money_value_negative`
 * @source IAS 2, paragraph 27.
 */
export function movingAverageValuation(events: readonly StockEvent[]): StockValuation {
  const perIssue: MinorAmount[] = [];
  let pool = emptyPool;
  for (const event of events) {
    const moved =
      event.kind === 'in' ? receiveIntoPool(pool, event.quantity, event.value) : issueFromPool(pool, event.quantity);
    if (event.kind === 'out') perIssue.push(negateMinor(moved.value));
    pool = moved.pool;
  }
  return { perIssue, costOfIssues: sumMinor(perIssue), closing: pool };
}

/**
 * Values a history under first in, first out.
 *
 * @param events movements of one part, oldest first
 * @returns cost of issues and closing stock, adding up to the receipts
 * @throws ArithmeticError `costing_more_than_held`, `costing_quantity_not_positive`, `costing_layer_broken`
 * @source IAS 2, paragraphs 25 and 27. It gives the same whether reckoned issue by issue or at the period's end.
 */
export function fifoValuation(events: readonly StockEvent[]): StockValuation {
  const perIssue: MinorAmount[] = [];
  // Layers before `first` are used up: an issue touches only those it needs, so a long history stays linear.
  const open: CostLayer[] = [];
  let first = 0;
  events.forEach((event, order) => {
    if (event.kind === 'in') {
      open.push(...addLayer([], { id: String(order), order, quantity: decimal(event.quantity), value: event.value }));
      return;
    }
    const needed = open.slice(first, first + layersNeeded(open, first, decimal(event.quantity)));
    const issue = issueFifo(needed, event.quantity);
    perIssue.push(negateMinor(issue.value));
    first += needed.length - issue.layers.length;
    issue.layers.forEach((layer, index) => {
      open[first + index] = layer;
    });
  });
  const layers = open.slice(first);
  const quantity = layers.reduce((sum, layer) => sum.plus(layer.quantity), new Decimal(0));
  return { perIssue, costOfIssues: sumMinor(perIssue), closing: { quantity, value: layersValue(layers) } };
}

function layersNeeded(layers: readonly CostLayer[], first: number, quantity: Decimal): number {
  let count = 0;
  let open = quantity;
  while (open.greaterThan(0) && first + count < layers.length) {
    open = open.minus(layers[first + count]?.quantity ?? 0);
    count += 1;
  }
  return count;
}
