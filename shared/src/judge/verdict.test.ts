import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { limits, tolerance, type LimitsInput } from './limits.js';
import { judgeReading, judgeYesNo, readingDecimals } from './verdict.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('limits', () => {
  it.each<[LimitsInput, string]>([
    [{}, 'judge_no_limit'],
    [{ lower: null, upper: null }, 'judge_no_limit'],
    [{ lower: '2', upper: '1.999' }, 'judge_limits_crossed'],
    [{ lower: 1, decimals: 10 }, 'judge_decimals'],
    [{ lower: 1, decimals: -1 }, 'judge_decimals'],
    [{ lower: 1, decimals: 0.5 }, 'judge_decimals'],
    [{ upper: 'twelve' }, 'measure_not_a_number'],
    [{ upper: 0.1 }, 'measure_not_exact'],
  ])('refuse %p', (input, code) => {
    expect(codeOf(() => limits(input))).toBe(code);
  });

  it('know their width', () => {
    expect(tolerance(limits({ lower: '46.5', upper: '47.5' }))?.toFixed()).toBe('1');
    expect(tolerance(limits({ upper: '47.5' }))).toBeUndefined();
    expect(tolerance(limits({ lower: 5, upper: 5 }))?.toFixed()).toBe('0');
  });
});

describe('the verdict on a reading', () => {
  const drive = limits({ lower: '46.5', upper: '47.5', decimals: 1 });

  it.each([
    ['47.0', 'within', 'lower', '0.5', '1'],
    ['46.5', 'within', 'lower', '0', '0'],
    ['47.50', 'within', 'upper', '0', '0'],
    ['47.51', 'outside', 'upper', '-0.01', '-0.02'],
    ['46.4', 'outside', 'lower', '-0.1', '-0.2'],
    ['47.25', 'within', 'upper', '0.25', '0.5'],
    ['-47.0', 'outside', 'lower', '-93.5', '-187'],
  ])('%s kHz is %s', (reading, verdict, limit, margin, share) => {
    const judged = judgeReading(reading, drive);
    expect([judged.verdict, judged.limit, judged.margin.toFixed(), judged.marginShare?.toFixed()]).toEqual([
      verdict,
      limit,
      margin,
      share,
    ]);
  });

  it('knows one limit only', () => {
    const dropAtMost = judgeReading('59.3', limits({ upper: '60' }));
    expect(dropAtMost).toMatchObject({ verdict: 'within', limit: 'upper' });
    expect(dropAtMost.marginShare).toBeUndefined();
    expect(judgeReading('9.9', limits({ lower: 10 })).verdict).toBe('outside');
  });

  it('has no share where both limits are the same', () => {
    const exact = limits({ lower: 8, upper: 8 });
    expect(judgeReading('8', exact)).toMatchObject({ verdict: 'within' });
    expect(judgeReading('8', exact).marginShare).toBeUndefined();
    expect(judgeReading('9', exact)).toMatchObject({ verdict: 'outside', limit: 'upper' });
  });

  it('compares as read, or rounded to the limits when asked', () => {
    expect(judgeReading('47.54', drive).verdict).toBe('outside');
    expect(judgeReading('47.54', drive, 'rounded').verdict).toBe('within');
    expect(judgeReading('46.45', drive, 'rounded').verdict).toBe('outside');
    expect(judgeReading('47.56', drive, 'rounded').verdict).toBe('outside');
  });

  it.each([
    ['47', 'judge_too_few_decimals'],
    ['47.', 'judge_too_few_decimals'],
    ['', 'judge_unreadable'],
    ['47,0', 'judge_unreadable'],
    ['OL', 'judge_unreadable'],
    ['4.7e1', 'judge_unreadable'],
    ['NaN', 'judge_unreadable'],
    ['Infinity', 'judge_unreadable'],
  ])('cannot be given on %p', (reading, code) => {
    expect(codeOf(() => judgeReading(reading, drive))).toBe(code);
  });

  it('counts the digits as they were read', () => {
    expect([readingDecimals('12.30'), readingDecimals('12'), readingDecimals('-0.000')]).toEqual([2, 0, 3]);
  });

  it('agrees with comparing whole numbers of the last digit', () => {
    const hundredths = fc.integer({ min: -100_000, max: 100_000 });
    const text = (value: number) =>
      `${value < 0 ? '-' : ''}${Math.floor(Math.abs(value) / 100)}.${String(Math.abs(value) % 100).padStart(2, '0')}`;
    fc.assert(
      fc.property(hundredths, hundredths, hundredths, (one, other, reading) => {
        const [lower, upper] = one < other ? [one, other] : [other, one];
        const judged = judgeReading(text(reading), limits({ lower: text(lower), upper: text(upper) }));
        expect(judged.verdict).toBe(lower <= reading && reading <= upper ? 'within' : 'outside');
        expect(judged.margin.times(100).toNumber() + 0).toBe(Math.min(reading - lower, upper - reading));
      }),
    );
  });
});

describe('yes or no', () => {
  it.each([
    [true, true, 'within'],
    [false, true, 'outside'],
    [false, false, 'within'],
    [true, false, 'outside'],
  ])('%p where %p is wanted is %s', (reading, wanted, verdict) => {
    expect(judgeYesNo(reading, wanted)).toBe(verdict);
  });
});
