import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import { limits, type LimitsInput } from './limits.js';
import { doubtReading } from './plausibility.js';

const doubt = (reading: string, range: LimitsInput, usual?: string) => {
  const found = doubtReading(new Decimal(reading), limits(range), usual === undefined ? undefined : new Decimal(usual));
  return found ? [found.kind, found.factor.toFixed(), found.suggestion.toFixed()] : undefined;
};

describe('doubting a reading', () => {
  const kilohertz = { lower: '46.5', upper: '47.5' };

  it.each<[string, string, LimitsInput, string | undefined, [string, string, string]]>([
    ['hertz where kilohertz are asked', '47020', kilohertz, undefined, ['factor', '0.001', '47.02']],
    ['megahertz', '0.04702', kilohertz, undefined, ['factor', '1000', '47.02']],
    ['the decimal mark one place off', '470.2', kilohertz, undefined, ['factor', '0.1', '47.02']],
    ['the decimal mark lost', '4702', kilohertz, undefined, ['factor', '0.01', '47.02']],
    ['volts where millivolts are asked, though within', '0.0593', { upper: 60 }, '58.9', ['factor', '1000', '59.3']],
    ['microvolts where millivolts are asked', '59300', { upper: 60 }, undefined, ['factor', '0.001', '59.3']],
    ['ohms where megohms are asked', '12000000', { lower: 10 }, '12', ['factor', '0.000001', '12']],
    ['a sign', '-47.02', kilohertz, undefined, ['sign', '-1', '47.02']],
    ['a corrected value that fails as well', '48100', kilohertz, undefined, ['factor', '0.001', '48.1']],
  ])('for %s', (_what, reading, range, usual, expected) => {
    expect(doubt(reading, range, usual)).toEqual(expected);
  });

  it.each<[string, string, LimitsInput, string | undefined]>([
    ['within', '47.02', kilohertz, undefined],
    ['just outside', '49', kilohertz, undefined],
    ['bad, but no power of ten off', '12', kilohertz, undefined],
    ['far off, but by no slip', '47.02e9', kilohertz, undefined],
    ['zero', '0', kilohertz, undefined],
    ['usually zero', '47', { lower: '-1', upper: '1' }, undefined],
    ['within a single limit with nothing known', '0.0593', { upper: 60 }, undefined],
    ['negative and far off', '-470', kilohertz, undefined],
    ['as usual', '59.3', { upper: 60 }, '58.9'],
  ])('is not done where the reading is %s', (_what, reading, range, usual) => {
    expect(doubt(reading, range, usual)).toBeUndefined();
  });

  it('suggests nothing but the reading times the factor, and only nearer to what is usual', () => {
    const numbers = fc.integer({ min: 1, max: 10_000_000 }).map((value) => new Decimal(value).div(1000));
    fc.assert(
      fc.property(numbers, numbers, (reading, usual) => {
        const found = doubtReading(reading, limits({ lower: 0, upper: 1_000_000 }), usual);
        if (!found) return;
        expect(found.suggestion.equals(reading.times(found.factor))).toBe(true);
        const away = (value: Decimal) => Math.abs(Math.log10(value.div(usual).toNumber()));
        expect(away(found.suggestion)).toBeLessThan(away(reading));
      }),
    );
  });
});
