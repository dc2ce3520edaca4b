import { badParameter } from './api-error.js';

// Source: Stripe, "Supported currencies", docs.stripe.com/currencies, sections "Zero-decimal currencies",
// "Three-decimal currencies", "Special cases" and "Minimum and maximum charge amounts", as remembered.
const ZERO_DECIMAL: ReadonlySet<string> = new Set(
  'bif clp djf gnf jpy kmf krw mga pyg rwf vnd vuv xaf xof xpf'.split(' '),
);
const THREE_DECIMAL: ReadonlySet<string> = new Set('bhd jod kwd omr tnd'.split(' '));
// Written with two decimals though they have none: whole units only.
const WHOLE_UNITS_IN_HUNDREDTHS: ReadonlySet<string> = new Set(['isk', 'ugx']);
const LEAST: Readonly<Record<string, number>> = {
  usd: 50,
  aud: 50,
  cad: 50,
  chf: 50,
  czk: 1500,
  dkk: 250,
  eur: 50,
  gbp: 30,
  hkd: 400,
  huf: 17500,
  jpy: 50,
  mxn: 1000,
  nok: 300,
  nzd: 50,
  pln: 200,
  ron: 200,
  sek: 300,
  sgd: 50,
};
const MOST = 99_999_999;
const KNOWN: ReadonlySet<string> = new Set(Intl.supportedValuesOf('currency').map((code) => code.toLowerCase()));

/** @returns how many decimals the API's amounts have: 0 for JPY, 3 for KWD, 2 otherwise */
export function decimalsOf(currency: string): number {
  if (ZERO_DECIMAL.has(currency)) return 0;
  return THREE_DECIMAL.has(currency) ? 3 : 2;
}

export function checkedCurrency(code: string, param: string): string {
  const currency = code.toLowerCase();
  if (!KNOWN.has(currency)) throw badParameter(param, `Invalid currency: ${code}`);
  return currency;
}

/** Refuses what no card could be charged: too small, too large, or finer than the currency allows. */
export function checkChargeable(amount: number, currency: string, param: string): void {
  if (amount > MOST) throw badParameter(param, 'Amount must be no more than 99999999', 'amount_too_large');
  const least = LEAST[currency] ?? 1;
  if (amount < least) {
    throw badParameter(param, `The total must be at least ${moneyText(least, currency)}`, 'amount_too_small');
  }
  if (THREE_DECIMAL.has(currency) && amount % 10 !== 0) {
    throw badParameter(param, `Amounts in ${currency} must be a multiple of 10`, 'parameter_invalid_integer');
  }
  if (WHOLE_UNITS_IN_HUNDREDTHS.has(currency) && amount % 100 !== 0) {
    throw badParameter(param, `Amounts in ${currency} must be a multiple of 100`, 'parameter_invalid_integer');
  }
}

/** @returns the amount of minor units as people read it: €12.50, ¥1,250 */
export function moneyText(amount: number, currency: string): string {
  const decimals = decimalsOf(currency);
  const digits = String(Math.abs(amount)).padStart(decimals + 1, '0');
  const whole = digits.slice(0, digits.length - decimals);
  const exact = `${amount < 0 ? '-' : ''}${whole}${decimals > 0 ? '.' : ''}${digits.slice(digits.length - decimals)}`;
  return new Intl.NumberFormat('en-IE', {
    style: 'currency',
    currency: currency.toUpperCase(),
    minimumFractionDigits: decimals,
    maximumFractionDigits: decimals,
  }).format(exact as Intl.StringNumericLiteral);
}

/** What the stand-in keeps of a payment: 1.5 % and a fixed part, half up. Our own figures, no processor's price list. */
export function feeOf(amount: number, currency: string): number {
  const fixed = { 0: 35, 2: 25, 3: 80 }[decimalsOf(currency)] ?? 0;
  return Math.floor((amount * 15 + 500) / 1000) + fixed;
}

/** What a dispute costs, in minor units. */
export function disputeFeeOf(currency: string): number {
  return { 0: 2000, 2: 2000, 3: 6000 }[decimalsOf(currency)] ?? 0;
}
