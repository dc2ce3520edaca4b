import { ArithmeticError } from '../errors/arithmetic-error.js';

/**
 * Currencies by their number of minor unit digits: ISO 4217:2015, list one as published on 2024-06-25. Metals, bond
 * units, test and no-currency codes, for which the list says "N.A.", are left out: nothing can be priced in them. The
 * display digits that browsers report differ (HUF, IDR, IQD, MGA) and are not used.
 */
const codesByExponent = {
  0: 'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF',
  2: `AED AFN ALL AMD ANG AOA ARS AUD AWG AZN BAM BBD BDT BGN BMD BND BOB BOV BRL BSD BTN BWP BYN BZD CAD CDF CHE CHF
    CHW CNY COP COU CRC CUC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP GEL GHS GIP GMD GTQ GYD HKD HNL HTG HUF
    IDR ILS INR IRR JMD KES KGS KHR KPW KYD KZT LAK LBP LKR LRD LSL MAD MDL MGA MKD MMK MNT MOP MRU MUR MVR MWK MXN MXV
    MYR MZN NAD NGN NIO NOK NPR NZD PAB PEN PGK PHP PKR PLN QAR RON RSD RUB SAR SBD SCR SDG SEK SGD SHP SLE SOS SRD SSP
    STN SVC SYP SZL THB TJS TMT TOP TRY TTD TWD TZS UAH USD USN UYU UZS VED VES WST XCD YER ZAR ZMW ZWG`,
  3: 'BHD IQD JOD KWD LYD OMR TND',
  4: 'CLF UYW',
} as const;

const exponentOf: ReadonlyMap<string, number> = new Map(
  Object.entries(codesByExponent).flatMap(([exponent, codes]) =>
    codes.split(/\s+/).map((code) => [code, Number(exponent)] as const),
  ),
);

declare const currencyCodeBrand: unique symbol;

/** A currency of ISO 4217 that things can be priced in. */
export type CurrencyCode = string & { readonly [currencyCodeBrand]: true };

/** All currencies, in the order of their codes. */
export const currencyCodes: readonly CurrencyCode[] = [...exponentOf.keys()].sort() as CurrencyCode[];

/** The euro. */
export const euro = 'EUR' as CurrencyCode;

/**
 * Takes text as a currency.
 *
 * @param text three capital letters
 * @returns the currency
 * @throws ArithmeticError `money_unknown_currency`
 */
export function currencyCode(text: string): CurrencyCode {
  if (!exponentOf.has(text)) throw new ArithmeticError('money_unknown_currency', { currency: text });
  return text as CurrencyCode;
}

/**
 * Digits of a currency's minor unit.
 *
 * @param currency the currency
 * @returns 0, 2, 3 or 4: one major unit is 10 to this power minor units (ISO 4217)
 * @throws ArithmeticError `money_unknown_currency` for text that was never checked
 */
export function currencyExponent(currency: CurrencyCode): number {
  const exponent = exponentOf.get(currency);
  if (exponent === undefined) throw new ArithmeticError('money_unknown_currency', { currency });
  return exponent;
}
