import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import { roundDecimal, roundQuotient, type RoundingMode } from './round.js';

const modes: readonly RoundingMode[] = [
  'half-up',
  'half-down',
  'half-even',
  'half-ceiling',
  'half-floor',
  'up',
  'down',
  'ceiling',
  'floor',
];

describe('rounding by name', () => {
  // IEEE 754-2019, 4.3 and the usual table of rounding names; from memory.
  const values = ['2.5', '1.5', '0.5', '0.4', '-0.4', '-0.5', '-1.5', '-2.5', '1.6', '-1.6'];
  it.each<[RoundingMode, readonly number[]]>([
    ['half-up', [3, 2, 1, 0, 0, -1, -2, -3, 2, -2]],
    ['half-down', [2, 1, 0, 0, 0, 0, -1, -2, 2, -2]],
    ['half-even', [2, 2, 0, 0, 0, 0, -2, -2, 2, -2]],
    ['half-ceiling', [3, 2, 1, 0, 0, 0, -1, -2, 2, -2]],
    ['half-floor', [2, 1, 0, 0, 0, -1, -2, -3, 2, -2]],
    ['up', [3, 2, 1, 1, -1, -1, -2, -3, 2, -2]],
    ['down', [2, 1, 0, 0, 0, 0, -1, -2, 1, -1]],
    ['ceiling', [3, 2, 1, 1, 0, 0, -1, -2, 2, -1]],
    ['floor', [2, 1, 0, 0, -1, -1, -2, -3, 1, -2]],
  ])('%s', (mode, expected) => {
    expect(values.map((value) => Number(roundDecimal(value, 0, mode)))).toEqual(expected);
    expect(values.map((value) => Number(roundQuotient(BigInt(Number(value) * 10), 10n, mode)))).toEqual(expected);
  });

  it('never leaves a minus before zero', () => {
    expect(Object.is(roundDecimal('-0.001', 2, 'half-even').toNumber(), 0)).toBe(true);
  });

  it('refuses a division by zero', () => {
    expect(() => roundQuotient(1n, 0n, 'half-up')).toThrow('A division by zero has no result.');
  });

  it('rounds a quotient as the decimal library rounds the same fraction, whatever the signs', () => {
    const whole = fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n });
    const denominators = fc.constantFrom(1n, 2n, 4n, 5n, 8n, 10n, 16n, 125n, 1000n, -2n, -8n, -1000n);
    fc.assert(
      fc.property(whole, denominators, fc.constantFrom(...modes), (numerator, denominator, mode) => {
        const fraction = new Decimal(numerator.toString()).div(denominator.toString());
        expect(roundQuotient(numerator, denominator, mode).toString()).toBe(roundDecimal(fraction, 0, mode).toFixed(0));
      }),
    );
  });
});
