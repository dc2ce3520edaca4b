import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { groupDigits } from './format-money';
import { parseDecimal, parseMinor } from './parse-number';

describe('a number as people type it', () => {
  it.each([
    ['1.5', '1.5'],
    ['1,5', '1.5'],
    [' 12 ', '12'],
    ['1 284,60', '1284.60'],
    ['1,284.60', '1284.60'],
    ['1.284,60', '1284.60'],
    ['1,284,600', '1284600'],
    ["1'284.6", '1284.6'],
    ['.5', '0.5'],
    [',5', '0.5'],
    ['5.', '5'],
    ['007', '7'],
    ['-3,2', '-3.2'],
    ['\u22123.2', '-3.2'],
    ['-0,00', '0.00'],
  ])('%s is %s', (typed, value) => {
    expect(parseDecimal(typed)).toBe(value);
  });

  it.each(['', 'abc', '1.2.3,4', '12,84.60', '1e5', '--1', '.', ',', '1,2,3', '1.2.3', '0x10', '½'])(
    '%s is none',
    (typed) => {
      expect(parseDecimal(typed)).toBeUndefined();
    },
  );

  it('is read back from the way it is shown', () => {
    const decimals = fc.tuple(fc.boolean(), fc.integer({ min: 1, max: 999_999_999 }), fc.stringMatching(/^\d{1,6}$/));
    fc.assert(
      fc.property(decimals, ([negative, whole, fraction]) => {
        const value = `${negative ? '-' : ''}${whole}.${fraction}`;
        expect(parseDecimal(groupDigits(value))).toBe(value);
      }),
    );
  });
});

describe('a typed amount of money', () => {
  it('becomes whole minor units', () => {
    expect(parseMinor('1 284,60', 2)).toBe(128460);
    expect(parseMinor('0,1', 2)).toBe(10);
    expect(parseMinor('5', 0)).toBe(5);
    expect(parseMinor('1.005', 3)).toBe(1005);
    expect(parseMinor('-2,50', 2)).toBe(-250);
  });

  it('is refused with more places than its currency has, and when too large to be exact', () => {
    expect(parseMinor('0.001', 2)).toBeUndefined();
    expect(parseMinor('99999999999999999', 2)).toBeUndefined();
    expect(parseMinor('0.100', 2)).toBe(10);
  });
});
