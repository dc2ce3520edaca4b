import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError, attempt } from '../errors/arithmetic-error.js';
import { Decimal, decimal, decimalText, onCommonScale, sumDecimals, type DecimalInput } from './decimal.js';

const faultOf = (input: DecimalInput) => {
  const result = attempt(() => decimal(input));
  return result.ok ? undefined : result.fault.code;
};

describe('decimals', () => {
  it('adds a tenth and two tenths to three tenths', () => {
    expect(sumDecimals(['0.1', '0.2']).equals('0.3')).toBe(true);
    expect(sumDecimals([]).isZero()).toBe(true);
  });

  it.each([
    ['1e3', 'measure_not_a_number'],
    ['', 'measure_not_a_number'],
    [' 1', 'measure_not_a_number'],
    ['1,5', 'measure_not_a_number'],
    ['0x10', 'measure_not_a_number'],
    ['.', 'measure_not_a_number'],
    ['NaN', 'measure_not_a_number'],
    [NaN, 'measure_not_a_number'],
    [Infinity, 'measure_not_a_number'],
    [new Decimal(NaN), 'measure_not_a_number'],
    [0.1, 'measure_not_exact'],
    [2 ** 53, 'measure_not_exact'],
  ])('refuses %p', (input, code) => {
    expect(faultOf(input)).toBe(code);
    expect(() => decimal(input)).toThrow(ArithmeticError);
  });

  it('writes without exponent, trailing zeros or negative zero', () => {
    expect(decimalText('0.000000100')).toBe('0.0000001');
    expect(decimalText('1000000000000000000000000')).toBe('1000000000000000000000000');
    expect(decimalText('-0.00')).toBe('0');
    expect(decimalText('+.5')).toBe('0.5');
  });

  it('keeps every digit on a common scale', () => {
    expect(onCommonScale(['1.5', '-0.25', 3])).toEqual({ integers: [150n, -25n, 300n], places: 2 });
    expect(onCommonScale(['-0.05', '0'])).toEqual({ integers: [-5n, 0n], places: 2 });
    expect(onCommonScale([])).toEqual({ integers: [], places: 0 });
  });

  it('adds as whole numbers of the last place do', () => {
    fc.assert(
      fc.property(fc.array(fc.bigInt({ min: -(10n ** 15n), max: 10n ** 15n }), { maxLength: 20 }), (millionths) => {
        const texts = millionths.map((value) => new Decimal(value.toString()).div(1_000_000).toFixed(6));
        const sum = millionths.reduce((total, value) => total + value, 0n);
        expect(sumDecimals(texts).times(1_000_000).toFixed(0)).toBe(sum === 0n ? '0' : sum.toString());
      }),
    );
  });
});
