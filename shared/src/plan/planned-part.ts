import type { PartKey } from '../bill/bill-lines.js';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { economicLot } from './economic-order-quantity.js';
import { fixedLot } from './fixed-lot.js';
import { lotForLot } from './lot-for-lot.js';
import type { LotCosts, LotRule } from './lot-rule.js';
import { minimumAndMultiple } from './minimum-and-multiple.js';
import { periodLot } from './period-lot.js';
import { silverMeal } from './silver-meal.js';
import { wagnerWhitinLot } from './wagner-whitin.js';

/** How orders for a part are sized. Sizes and holding costs are per stock unit, holding per period of the plan. */
export type LotPolicy =
  | { readonly kind: 'lot_for_lot' }
  | { readonly kind: 'fixed'; readonly size: DecimalInput }
  | { readonly kind: 'minimum_and_multiple'; readonly minimum: DecimalInput; readonly multiple: DecimalInput }
  | { readonly kind: 'period'; readonly periods: number }
  | { readonly kind: 'economic' | 'silver_meal' | 'wagner_whitin'; readonly costs: LotCosts };

/** Stock of one age. */
export interface StockLot {
  readonly quantity: DecimalInput;
  /** The first period in which it can no longer be used; never, where it is missing. */
  readonly expires?: number;
}

/** A quantity that is wanted, or that is on its way, in a period. Periods below 0 are overdue and count as 0. */
export interface Timed {
  readonly id: string;
  readonly period: number;
  readonly quantity: DecimalInput;
}

/** What the plan knows of one part. Quantities in its stock unit. */
export interface PlannedPart {
  readonly part: PartKey;
  /** Decimals of its stock unit (0 for pieces). */
  readonly decimals: number;
  readonly onHand: readonly StockLot[];
  readonly safetyStock: DecimalInput;
  /** In the timeline's measure. */
  readonly leadTime: number;
  readonly lot: LotPolicy;
  /** Orders that a lot rule arrives at are raised to this and rounded up to the multiple; none by default. */
  readonly least?: { readonly minimum: DecimalInput; readonly multiple: DecimalInput };
  /** Share of what is started or bought that is normally lost before it is good. From 0 to below 1. */
  readonly lossShare?: DecimalInput;
  /** Periods for which what arrives can be used; for ever by default. */
  readonly shelfLife?: number;
  /** Open purchase lines and batches, counted good. */
  readonly receipts: readonly Timed[];
  /** Wanted by orders and batches, as such and not through a bill. */
  readonly demands: readonly Timed[];
}

/** A quantity in whole steps, a step being the last decimal of the part's stock unit. */
export type Steps = number;

/**
 * Counts a quantity in steps, rounded up.
 *
 * @throws ArithmeticError `plan_quantity` if it is negative or too large to be counted exactly
 */
export function toSteps(quantity: DecimalInput, decimals: number, part: PartKey): Steps {
  if (decimals === 0 && Number.isSafeInteger(quantity) && (quantity as number) >= 0) return quantity as number;
  const steps = decimal(quantity).times(new Decimal(10).pow(decimals)).toDecimalPlaces(0, Decimal.ROUND_CEIL);
  if (steps.lessThan(0) || steps.greaterThan(Number.MAX_SAFE_INTEGER)) {
    throw new ArithmeticError('plan_quantity', { part, quantity: String(quantity) });
  }
  return steps.toNumber();
}

/** Steps as a quantity in the stock unit. */
export function fromSteps(steps: Steps, decimals: number): Decimal {
  return new Decimal(steps).div(new Decimal(10).pow(decimals));
}

/**
 * The lot rule of a part, over steps.
 *
 * @throws ArithmeticError as the rules
 */
export function lotRuleOf({ part, decimals, lot, least }: PlannedPart): LotRule {
  const steps = (quantity: DecimalInput): Steps => toSteps(quantity, decimals, part);
  const rule = policyRule(lot, steps, 10 ** decimals);
  if (least === undefined) return rule;
  const raise = minimumAndMultiple(steps(least.minimum), steps(least.multiple));
  return (need) => raise([rule(need)]);
}

function policyRule(lot: LotPolicy, steps: (quantity: DecimalInput) => Steps, stepsPerUnit: number): LotRule {
  switch (lot.kind) {
    case 'lot_for_lot':
      return lotForLot;
    case 'fixed':
      return fixedLot(steps(lot.size));
    case 'minimum_and_multiple':
      return minimumAndMultiple(steps(lot.minimum), steps(lot.multiple));
    case 'period':
      return periodLot(lot.periods);
    default: {
      const costs = { order: lot.costs.order, holding: lot.costs.holding / stepsPerUnit };
      const rules = { economic: economicLot, silver_meal: silverMeal, wagner_whitin: wagnerWhitinLot };
      return rules[lot.kind](costs);
    }
  }
}
