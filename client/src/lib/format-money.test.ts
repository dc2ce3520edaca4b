import { describe, expect, it } from '@jest/globals';
import {
  currencyDecimals,
  formatMoney,
  formatPrice,
  formatUnitCost,
  groupDigits,
  minorToDecimal,
} from './format-money';

const plain = (text: string): string => text.replaceAll('\u00a0', ' ');

describe('an amount of money', () => {
  it('stands in rows with its currency behind it', () => {
    expect(plain(formatMoney({ amount: 128460, currency: 'EUR' }))).toBe('1,284.60 €');
  });

  it('stands on the storefront with its currency in front', () => {
    expect(plain(formatPrice({ amount: 11800, currency: 'EUR' }))).toBe('€ 118.00');
  });

  it('keeps its digits where a binary fraction would not', () => {
    expect(plain(formatMoney({ amount: 9007199254740991, currency: 'EUR' }))).toBe('90,071,992,547,409.91 €');
  });

  it('shows a debt with a minus sign and a few cents with a nought before the point', () => {
    expect(plain(formatMoney({ amount: -7, currency: 'EUR' }))).toBe('\u22120.07 €');
  });

  // ISO 4217:2015, list one: JPY has no minor unit, KWD three decimals, EUR two.
  it.each([
    ['JPY', 0],
    ['EUR', 2],
    ['KWD', 3],
  ])('knows that %s has %i decimals', (currency, decimals) => {
    expect(currencyDecimals(currency)).toBe(decimals);
  });

  it('moves the point by the decimals of its currency', () => {
    expect(minorToDecimal(5, 3)).toBe('0.005');
    expect(minorToDecimal(1234, 0)).toBe('1234');
    expect(minorToDecimal(-1234, 2)).toBe('-12.34');
  });
});

describe('a unit cost', () => {
  it('shows no idle zeros after the places of its currency', () => {
    expect(plain(formatUnitCost('0.412000', 'EUR'))).toBe('0.412 €');
    expect(plain(formatUnitCost('3.120000', 'EUR', 'pc'))).toBe('3.12 €/pc');
    expect(plain(formatUnitCost('12.000000', 'EUR'))).toBe('12.00 €');
  });
});

describe('digits', () => {
  it('are grouped before the point only', () => {
    expect(groupDigits('1234567.1234567')).toBe('1,234,567.1234567');
    expect(groupDigits('123')).toBe('123');
  });
});
