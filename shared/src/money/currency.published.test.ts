import { describe, expect, it } from '@jest/globals';
import currencies from 'currency-codes';
import { currencyCode, currencyCodes, currencyExponent } from './currency.js';

// ISO 4217:2015, list one of 2024-06-25, as packed in the npm package currency-codes 2.2.0, whose build reads the
// maintenance agency's file. Codes for which that list has no minor unit ("N.A.") are not currencies to price in.
const withoutMinorUnit = ['XAG', 'XAU', 'XBA', 'XBB', 'XBC', 'XBD', 'XDR', 'XPD', 'XPT', 'XSU', 'XTS', 'XUA', 'XXX'];

describe('minor units of ISO 4217', () => {
  it('holds the codes and digits of the published list', () => {
    const published = currencies.data.filter(({ code }) => !withoutMinorUnit.includes(code));
    expect(currencyCodes).toEqual(published.map(({ code }) => code).sort());
    for (const { code, digits } of published) expect(currencyExponent(currencyCode(code))).toBe(digits);
  });

  it.each([
    ['EUR', 2],
    ['JPY', 0],
    ['KWD', 3],
    ['CLF', 4],
    ['HUF', 2],
    ['IQD', 3],
    ['MGA', 2],
  ])('%s has %i decimals', (code, digits) => {
    expect(currencyExponent(currencyCode(code))).toBe(digits);
  });

  it.each(['', 'eur', 'EURO', 'XXX', 'ZZZ', 'toString'])('refuses %p', (text) => {
    expect(() => currencyCode(text)).toThrow('is not in the list of ISO 4217');
  });
});
