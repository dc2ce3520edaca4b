import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { capabilityOf, capabilityStudy } from './capability.js';
import { capabilitySentence, expectedOutside } from './capability-words.js';
import { controlConstants } from './control-constants.js';
import { faultChart, shareChart } from './count-charts.js';
import { individualsChart } from './individuals-chart.js';
import { normalShareBelow } from './normal-distribution.js';
import { checkNormality } from './normality.js';
import { runSignals, standardise } from './run-rules.js';
import { subgroupChart } from './subgroup-chart.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};

test('the constants agree with an integration of the range distribution', () => {
  // d2 = ∫ 1 − Φⁿ − (1 − Φ)ⁿ, by the trapezoid rule over ±10.
  for (const size of [2, 5, 9, 17, 25]) {
    const step = 0.02;
    let sum = 0;
    for (let x = -10; x <= 10; x += step) {
      const below = normalShareBelow(x);
      sum += 1 - below ** size - normalShareBelow(-x) ** size;
    }
    expect(controlConstants(size).d2).toBeCloseTo(sum * step, 5);
  }
  expect(codeOf(() => controlConstants(1))).toBe('statistics_out_of_range');
  expect(codeOf(() => controlConstants(2.5))).toBe('statistics_out_of_range');
});

describe('charts', () => {
  const readings = fc.array(fc.double({ min: -100, max: 100, noNaN: true }), { minLength: 2, maxLength: 40 });

  test('of single values move with their unit', () => {
    fc.assert(
      fc.property(readings, (values) => {
        const chart = individualsChart(values);
        const scaled = individualsChart(values.map((value) => value * 1000));
        expect(scaled.individuals.upper).toBeCloseTo(chart.individuals.upper * 1000, 5);
        expect(chart.movingRanges).toHaveLength(values.length - 1);
      }),
    );
  });

  test('of equal values have limits on the centre and no point beyond', () => {
    const chart = individualsChart([5, 5, 5]);
    expect(chart.individuals).toEqual({ centre: 5, lower: 5, upper: 5 });
    expect(chart.beyond).toEqual([]);
    expect(codeOf(() => standardise([5], chart.individuals))).toBe('statistics_no_spread');
  });

  test('of unequal subgroups are refused, naming the one', () => {
    expect(codeOf(() => subgroupChart([[1, 2], [1]]))).toBe('statistics_subgroup_size');
    expect(codeOf(() => subgroupChart([[1], [2]]))).toBe('statistics_subgroup_size');
    expect(codeOf(() => subgroupChart([[1, 2]]))).toBe('statistics_too_few');
  });

  test('of shares cut their limits at 0 and 1 and follow the group size', () => {
    const chart = shareChart([
      { inspected: 10, nonconforming: 1 },
      { inspected: 1000, nonconforming: 20 },
    ]);
    expect(chart.limits[0]?.lower).toBe(0);
    expect((chart.limits[0]?.upper ?? 0) > (chart.limits[1]?.upper ?? 0)).toBe(true);
    expect(codeOf(() => shareChart([{ inspected: 3, nonconforming: 4 }]))).toBe('statistics_more_than_all');
    expect(codeOf(() => shareChart([]))).toBe('statistics_too_few');
    expect(codeOf(() => faultChart([1.5]))).toBe('statistics_not_a_count');
  });

  test('a run of eight is signalled on its eighth point and on each after it', () => {
    const signals = runSignals([0.1, 0.1, 0.1, 0.1, 0.1, 0.1, 0.1, 0.1, 0.1, 0]);
    expect(signals.map((signal) => signal.point)).toEqual([7, 8]);
  });

  test('signals mirror with the sign', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -4, max: 4, noNaN: true }), { maxLength: 40 }), (points) => {
        const up = runSignals(points);
        const down = runSignals(points.map((point) => -point));
        expect(down.map((signal) => [signal.rule, signal.point])).toEqual(
          up.map((signal) => [signal.rule, signal.point]),
        );
        expect(down.every((signal, index) => signal.side !== up[index]?.side)).toBe(true);
      }),
    );
  });
});

describe('capability', () => {
  const values = [10.1, 10.4, 9.8, 10.0, 10.2, 9.9, 10.3, 10.1, 9.7, 10.0, 10.2, 10.1];

  test('with one limit has no spread index', () => {
    const study = capabilityStudy(values, { upper: 11 });
    expect(study.capability.spread).toBeUndefined();
    expect(study.capability.toLower).toBeUndefined();
    expect(study.capability.nearer.value).toBe(study.capability.toUpper);
  });

  test('never exceeds the spread index, and both intervals hold their value', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.double({ min: 0.01, max: 20, noNaN: true }),
        (average, deviation) => {
          const found = capabilityOf({ mean: average, deviation, count: 30, degrees: 29 }, { lower: -10, upper: 12 });
          const spread = found.spread;
          expect(spread).toBeDefined();
          if (spread === undefined) return;
          expect(found.nearer.value).toBeLessThanOrEqual(spread.value + 1e-9);
          expect(spread.low < spread.value && spread.value < spread.high).toBe(true);
          expect(found.nearer.low < found.nearer.value && found.nearer.value < found.nearer.high).toBe(true);
        },
      ),
    );
  });

  test('refuses crossed limits, no limit and no spread', () => {
    expect(codeOf(() => capabilityStudy(values, { lower: 3, upper: 3 }))).toBe('statistics_limits_crossed');
    expect(codeOf(() => capabilityStudy(values, {}))).toBe('statistics_no_limit');
    expect(codeOf(() => capabilityStudy([1, 1, 1], { upper: 3 }))).toBe('statistics_no_spread');
  });

  test('speaks by the whole interval', () => {
    const sentence = (deviation: number, count: number, average = 14) =>
      capabilitySentence(
        capabilityOf({ mean: average, deviation, count, degrees: count - 1 }, { lower: 8, upper: 20 }),
        count,
      );
    expect(sentence(1.2, 200)).toMatch(
      /^Clearly capable: 1\.67 \(1\.\d\d to 1\.\d\d at 95 percent confidence, from 200 values\)/,
    );
    expect(sentence(1.4, 12)).toMatch(/^Looks capable, but these values do not prove it/);
    expect(sentence(1.8, 60)).toMatch(/^Too close to the limits/);
    expect(sentence(4, 100)).toMatch(/^Not capable.*about 134 in 1,000 would lie outside/);
    expect(sentence(2, 60, 21)).toMatch(/^The average itself lies outside/);
    expect(expectedOutside({ toLower: 1, toUpper: 1 })).toBeCloseTo(0.0027, 4);
  });
});

test('normality needs eight values with some spread', () => {
  expect(codeOf(() => checkNormality([1, 2, 3, 4, 5, 6, 7]))).toBe('statistics_too_few');
  expect(codeOf(() => checkNormality([2, 2, 2, 2, 2, 2, 2, 2]))).toBe('statistics_no_spread');
  expect(checkNormality([1, 2, 3, 4, 5, 6, 7, 8]).probability).toBeGreaterThan(0.5);
});
