import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimal, decimalText, type Decimal, type DecimalInput } from '../measure/decimal.js';

/**
 * VAT categories of EN 16931 (UNTDID 5305, the part the standard allows): S rated, Z zero rated, E exempt, AE reverse
 * charge, K intra-Community supply, G export, O outside the scope of VAT, L Canary Islands, M Ceuta and Melilla.
 */
export type VatCategory = 'S' | 'Z' | 'E' | 'AE' | 'K' | 'G' | 'O' | 'L' | 'M';

type RateRule = 'more than zero' | 'zero' | 'any';

const rateRule = {
  S: 'more than zero',
  Z: 'zero',
  E: 'zero',
  AE: 'zero',
  K: 'zero',
  G: 'zero',
  O: 'zero',
  L: 'any',
  M: 'any',
} as const satisfies Record<VatCategory, RateRule>;

/**
 * Checks that a rate can stand with a category.
 *
 * @param category the VAT category
 * @param ratePercent percent, for example "23" or "5.5"; zero for category O, which has none
 * @returns the rate, percent
 * @throws ArithmeticError `money_vat_rate_negative`, `money_vat_rate_for_category`; `measure_not_a_number`,
 *   `measure_not_exact`
 * @source EN 16931-1:2017, rules BR-S-05, BR-Z-05, BR-E-05, BR-AE-05, BR-IC-05, BR-G-05, BR-O-05, BR-IG-05, BR-IP-05.
 */
export function vatRate(category: VatCategory, ratePercent: DecimalInput): Decimal {
  const rate = decimal(ratePercent);
  if (rate.lessThan(0)) throw new ArithmeticError('money_vat_rate_negative', { rate: decimalText(rate) });
  const rule: RateRule = rateRule[category];
  const fits = rule === 'any' || (rule === 'zero') === rate.isZero();
  if (!fits) throw new ArithmeticError('money_vat_rate_for_category', { category, rate: decimalText(rate) });
  return rate;
}
