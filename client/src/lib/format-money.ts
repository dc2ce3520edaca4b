export interface MoneyAmount {
  /** Whole minor units. */
  amount: number;
  /** ISO 4217 code. */
  currency: string;
}

const noBreakSpace = '\u00a0';
const minus = '\u2212';

/** How many decimals a currency has, as the browser's own ISO 4217 data says. */
export function currencyDecimals(currency: string): number {
  return new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ?? 2;
}

/** The sign a reader knows the currency by, or its code. */
export function currencySign(currency: string): string {
  const parts = new Intl.NumberFormat('en', {
    style: 'currency',
    currency,
    currencyDisplay: 'narrowSymbol',
  }).formatToParts(0);
  return parts.find((part) => part.type === 'currency')?.value ?? currency;
}

/** Puts separators into a plain decimal string, leaving every digit as it stands. */
export function groupDigits(decimal: string): string {
  const negative = decimal.startsWith('-');
  const [whole = '0', fraction] = (negative ? decimal.slice(1) : decimal).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',');
  return `${negative ? minus : ''}${grouped}${fraction === undefined ? '' : `.${fraction}`}`;
}

/** Whole minor units as a plain decimal string, by shifting digits: no binary fraction is involved. */
export function minorToDecimal(amount: number, decimals: number): string {
  const digits = String(Math.abs(amount)).padStart(decimals + 1, '0');
  const sign = amount < 0 ? '-' : '';
  if (decimals === 0) return sign + digits;
  return `${sign}${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
}

/** An amount for rows and columns: `1,284.60 €`. */
export function formatMoney({ amount, currency }: MoneyAmount): string {
  return `${groupDigits(minorToDecimal(amount, currencyDecimals(currency)))}${noBreakSpace}${currencySign(currency)}`;
}

/** A price as the storefront says it: `€ 118.00`. */
export function formatPrice({ amount, currency }: MoneyAmount): string {
  return `${currencySign(currency)}${noBreakSpace}${groupDigits(minorToDecimal(amount, currencyDecimals(currency)))}`;
}

/** A unit cost, which has up to six places: at least the currency's own, no idle zeros after them. */
export function formatUnitCost(cost: string, currency: string, unit?: string): string {
  const least = currencyDecimals(currency);
  const [whole = '0', fraction = ''] = cost.split('.');
  const kept = fraction.replace(/0+$/, '').padEnd(least, '0');
  const sign = currencySign(currency);
  return `${groupDigits(kept ? `${whole}.${kept}` : whole)}${noBreakSpace}${sign}${unit ? `/${unit}` : ''}`;
}
