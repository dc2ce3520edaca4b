import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import type { CurrencyCode } from '../money/currency.js';
import { lineAmount } from '../money/line-amount.js';
import { addMinor, sumMinor, type MinorAmount } from '../money/minor-units.js';

/** What went into one unit that is made and kept by its serial number. */
export interface UnitInput {
  /** Values of the issues to this unit (or its shares of issues to the batch), minor units, not negative. */
  readonly materials: readonly MinorAmount[];
  /** Minutes of work, rework included. */
  readonly minutes: DecimalInput;
}

/** Rates of the bench. */
export interface BenchRates {
  readonly currency: CurrencyCode;
  /** Major units per hour of work. */
  readonly labourPerHour: DecimalInput;
  /** Major units of overhead per hour of work, at normal capacity. */
  readonly overheadPerHour: DecimalInput;
}

/** A unit's own cost, minor units. */
export interface UnitCost {
  readonly materials: MinorAmount;
  readonly labour: MinorAmount;
  readonly overhead: MinorAmount;
  readonly total: MinorAmount;
}

/**
 * Own cost of a unit that is made one by one: it is not interchangeable with another, so it carries its own materials
 * and minutes rather than an average.
 *
 * @param input materials and minutes
 * @param rates of the bench
 * @returns the cost by kind; each kind is rounded once, half to even, and the total is their sum
 * @throws ArithmeticError `costing_value_negative`, `costing_quantity_negative`; `measure_not_a_number`,
 *   `measure_not_exact`, `money_too_large`
 * @source IAS 2, paragraphs 12 (costs of conversion), 23 and 24 (specific identification).
 */
export function unitCost(input: UnitInput, rates: BenchRates): UnitCost {
  const minutes = decimal(input.minutes);
  if (minutes.lessThan(0)) throw new ArithmeticError('costing_quantity_negative', { quantity: minutes.toFixed() });
  for (const value of input.materials) {
    if (value < 0) throw new ArithmeticError('costing_value_negative', { value });
  }
  const timed = (perHour: DecimalInput): MinorAmount => {
    const price = decimal(perHour);
    if (price.lessThan(0)) throw new ArithmeticError('costing_quantity_negative', { quantity: price.toFixed() });
    return lineAmount({ quantity: minutes, price, perQuantity: new Decimal(60) }, rates.currency, 'half-even');
  };
  const materials = sumMinor(input.materials);
  const labour = timed(rates.labourPerHour);
  const overhead = timed(rates.overheadPerHour);
  return { materials, labour, overhead, total: addMinor(addMinor(materials, labour), overhead) };
}
