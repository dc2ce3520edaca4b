import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { majorText, minorAmountFromMajor } from './amount-text.js';
import { currencyCode, currencyCodes, euro } from './currency.js';
import { lineAmount } from './line-amount.js';
import {
  addMoney,
  minorAmount,
  minorAmountOf,
  multiplyMinor,
  negateMinor,
  subtractMinor,
  sumMinor,
} from './minor-units.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('amounts in minor units', () => {
  it.each([
    [0.5, 'money_not_whole'],
    [NaN, 'money_not_whole'],
    [Infinity, 'money_too_large'],
    [2 ** 53, 'money_too_large'],
    [-(2 ** 53), 'money_too_large'],
  ])('refuses %p', (value, code) => {
    expect(codeOf(() => minorAmount(value))).toBe(code);
  });

  it('never holds a minus zero', () => {
    expect(Object.is(minorAmount(-0), 0)).toBe(true);
    expect(Object.is(negateMinor(minorAmount(0)), 0)).toBe(true);
  });

  it('refuses a sum that is no longer exact', () => {
    const most = minorAmount(Number.MAX_SAFE_INTEGER);
    expect(codeOf(() => sumMinor([most, minorAmount(1)]))).toBe('money_too_large');
    expect(codeOf(() => subtractMinor(negateMinor(most), minorAmount(1)))).toBe('money_too_large');
    expect(codeOf(() => minorAmountOf(2n ** 53n))).toBe('money_too_large');
    expect(sumMinor([])).toBe(0);
  });

  it('multiplies by a decimal and rounds once', () => {
    expect(multiplyMinor(minorAmount(1005), '0.1', 'half-even')).toBe(100);
    expect(multiplyMinor(minorAmount(1005), '0.1', 'half-up')).toBe(101);
    expect(multiplyMinor(minorAmount(-1005), '0.1', 'half-up')).toBe(-101);
    expect(multiplyMinor(minorAmount(146050), '0.25', 'half-up')).toBe(36513);
    expect(codeOf(() => multiplyMinor(minorAmount(Number.MAX_SAFE_INTEGER), 2, 'half-up'))).toBe('money_too_large');
  });

  it('does not add two currencies', () => {
    const one = { amount: minorAmount(5), currency: euro };
    expect(addMoney(one, one)).toEqual({ amount: 10, currency: 'EUR' });
    expect(codeOf(() => addMoney(one, { amount: minorAmount(5), currency: currencyCode('SEK') }))).toBe(
      'money_mixed_currencies',
    );
  });

  it('prices a quantity in the decimals of its currency', () => {
    expect(lineAmount({ quantity: '16000', price: '0.00880' }, euro)).toBe(14080);
    expect(lineAmount({ quantity: 132, price: '15.24', perQuantity: 12 }, euro)).toBe(16764);
    expect(lineAmount({ quantity: '2.5', price: '333.3' }, currencyCode('JPY'))).toBe(833);
    expect(lineAmount({ quantity: '0.5', price: '1.001' }, currencyCode('KWD'))).toBe(501);
    expect(lineAmount({ quantity: -1, price: '0.005' }, euro)).toBe(-1);
    expect(codeOf(() => lineAmount({ quantity: 1, price: 1, perQuantity: 0 }, euro))).toBe('money_division_by_zero');
  });
});

describe('amounts as text', () => {
  it.each([
    [-1205, 'EUR', '-12.05'],
    [5, 'EUR', '0.05'],
    [0, 'EUR', '0.00'],
    [1205, 'JPY', '1205'],
    [-5, 'KWD', '-0.005'],
    [12345, 'CLF', '1.2345'],
  ])('%i in %s is %s', (amount, code, text) => {
    const currency = currencyCode(code);
    expect(majorText(minorAmount(amount), currency)).toBe(text);
    expect(minorAmountFromMajor(text, currency)).toBe(amount);
  });

  it.each([
    ['12.345', 'EUR', 'money_too_many_decimals'],
    ['1.5', 'JPY', 'money_too_many_decimals'],
    ['1,50', 'EUR', 'money_unreadable'],
    ['1e2', 'EUR', 'money_unreadable'],
    ['', 'EUR', 'money_unreadable'],
    ['.5', 'EUR', 'money_unreadable'],
    ['99999999999999999', 'EUR', 'money_too_large'],
  ])('refuses %p in %s', (text, code, fault) => {
    expect(codeOf(() => minorAmountFromMajor(text, currencyCode(code)))).toBe(fault);
  });

  it('lets zeros past the last decimal pass', () => {
    expect(minorAmountFromMajor('1.500000', euro)).toBe(150);
  });

  it('reads back what it wrote in every currency', () => {
    fc.assert(
      fc.property(fc.maxSafeInteger(), fc.constantFrom(...currencyCodes), (value, currency) => {
        expect(minorAmountFromMajor(majorText(minorAmount(value), currency), currency)).toBe(minorAmount(value));
      }),
    );
  });
});
