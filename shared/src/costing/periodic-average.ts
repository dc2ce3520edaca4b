import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, onCommonScale, sumDecimals, type Decimal, type DecimalInput } from '../measure/decimal.js';
import { apportion } from '../money/apportion.js';
import { minorAmountOf, subtractMinor, sumMinor, type MinorAmount } from '../money/minor-units.js';
import { costPool, type CostPool } from '../money/movement-value.js';
import { roundQuotient } from '../money/round.js';

/** What a period did to one part. */
export interface PeriodMovements {
  readonly opening: CostPool;
  /** Quantities more than zero, values in minor units. */
  readonly receipts: readonly CostPool[];
  /** Quantities issued, more than zero. */
  readonly issues: readonly DecimalInput[];
}

/** What a period's issues cost under one average for the whole period. */
export interface PeriodicAverage {
  /** Minor units, not negative. */
  readonly costOfIssues: MinorAmount;
  /** Per issue; adds up to `costOfIssues`. */
  readonly perIssue: readonly MinorAmount[];
  readonly closing: CostPool;
}

/**
 * Values a period's issues at the one average of its opening stock and all its receipts. The total is rounded once and
 * spread over the issues by the largest remainder; stock of quantity zero is left with value zero.
 *
 * @param period opening stock, receipts and issues of one part
 * @returns cost of issues and closing stock, which add up to opening and receipts
 * @throws ArithmeticError `costing_more_than_held`, `costing_quantity_not_positive`, `money_pool_broken`
 * @source IAS 2, paragraph 27 (average on a periodic basis).
 */
export function periodicAverage(period: PeriodMovements): PeriodicAverage {
  const held = sumDecimals([period.opening.quantity, ...period.receipts.map(({ quantity }) => quantity)]);
  const value = sumMinor([period.opening.value, ...period.receipts.map((receipt) => receipt.value)]);
  const issues = period.issues.map(positive);
  const issued = sumDecimals(issues);
  if (issued.greaterThan(held)) {
    throw new ArithmeticError('costing_more_than_held', { asked: issued.toFixed(), held: held.toFixed() });
  }
  const [part = 0n, whole = 0n] = onCommonScale([issued, held]).integers;
  const costOfIssues = whole === 0n ? value : minorAmountOf(roundQuotient(BigInt(value) * part, whole, 'half-even'));
  return {
    costOfIssues,
    perIssue: apportion(costOfIssues, issues),
    closing: costPool(held.minus(issued), subtractMinor(value, costOfIssues)),
  };
}

function positive(quantity: DecimalInput): Decimal {
  const value = decimal(quantity);
  if (value.greaterThan(0)) return value;
  throw new ArithmeticError('costing_quantity_not_positive', { quantity: value.toFixed() });
}
