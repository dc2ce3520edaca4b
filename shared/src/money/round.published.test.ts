import { describe, expect, it } from '@jest/globals';
import { roundDecimal, type RoundingMode } from './round.js';

describe('ties in two decimals', () => {
  const values = ['0.125', '0.135', '2.675', '1.005', '365.125', '-0.125', '-2.675'];

  // Half away from zero and half to even: decimal arithmetic, computed by hand; ties to plus infinity: fn:round of XPath
  // and XQuery Functions and Operators 3.1 (W3C, 2017), section 4.4.4, from memory.
  it.each<[RoundingMode, readonly string[]]>([
    ['half-up', ['0.13', '0.14', '2.68', '1.01', '365.13', '-0.13', '-2.68']],
    ['half-even', ['0.12', '0.14', '2.68', '1.00', '365.12', '-0.12', '-2.68']],
    ['half-ceiling', ['0.13', '0.14', '2.68', '1.01', '365.13', '-0.12', '-2.67']],
  ])('%s', (mode, expected) => {
    expect(values.map((value) => roundDecimal(value, 2, mode).toFixed(2))).toEqual(expected);
  });
});
