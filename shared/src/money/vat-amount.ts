import { onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { minorAmountOf, type MinorAmount } from './minor-units.js';
import { roundQuotient } from './round.js';

/**
 * VAT on a net amount.
 *
 * @param net minor units
 * @param ratePercent percent, for example "23"
 * @returns minor units, rounded half away from zero
 * @throws ArithmeticError `measure_not_a_number`, `measure_not_exact`, `money_too_large`
 * @source EN 16931-1:2017, BR-CO-17.
 */
export function vatOnNet(net: MinorAmount, ratePercent: DecimalInput): MinorAmount {
  const [rate = 0n, hundred = 100n] = onCommonScale([ratePercent, 100]).integers;
  return minorAmountOf(roundQuotient(BigInt(net) * rate, hundred, 'half-up'));
}

/**
 * The net amount inside a gross one.
 *
 * @param gross minor units, VAT included
 * @param ratePercent percent, more than −100
 * @returns minor units, gross × 100 / (100 + rate) rounded half away from zero; the VAT is the rest
 * @throws ArithmeticError `money_division_by_zero` at −100 percent; `measure_not_a_number`, `measure_not_exact`
 * @source Directive 2006/112/EC, articles 73 and 78 (the taxable amount leaves out the tax itself).
 */
export function netWithinGross(gross: MinorAmount, ratePercent: DecimalInput): MinorAmount {
  const [rate = 0n, hundred = 100n] = onCommonScale([ratePercent, 100]).integers;
  return minorAmountOf(roundQuotient(BigInt(gross) * hundred, hundred + rate, 'half-up'));
}
