import { describe, expect, test } from '@jest/globals';
import { controlConstants } from './control-constants.js';
import { shareChart, faultChart } from './count-charts.js';
import { individualsChart } from './individuals-chart.js';
import { runSignals } from './run-rules.js';
import { subgroupChart } from './subgroup-chart.js';
import { standardDeviation } from './summary.js';

describe('Shewhart constants', () => {
  // NIST/SEMATECH e-Handbook 6.3.2.1 and ASTM tables, printed to three places; D4 of 3 and 5 is printed both ways.
  test.each([
    [2, 1.128, 1.88, 0, 3.267],
    [3, 1.693, 1.023, 0, 2.575],
    [5, 2.326, 0.577, 0, 2.115],
    [6, 2.534, 0.483, 0, 2.004],
    [8, 2.847, 0.373, 0.136, 1.864],
    [10, 3.078, 0.308, 0.223, 1.777],
  ])('subgroups of %d', (size, d2, A2, D3, D4) => {
    const found = controlConstants(size);
    expect(Math.abs(found.d2 - d2)).toBeLessThan(0.0006);
    expect(Math.abs(found.A2 - A2)).toBeLessThan(0.0006);
    expect(Math.abs(found.D3 - D3)).toBeLessThan(0.0006);
    expect(Math.abs(found.D4 - D4)).toBeLessThan(0.0006);
  });
});

test('individuals and moving range: the flow rates of ten batches', () => {
  // NIST/SEMATECH e-Handbook 6.3.2.2: centre 50.81, mean moving range 1.8778, limits 45.8159 and 55.8041 with d2 = 1.128.
  const chart = individualsChart([49.6, 47.6, 49.9, 51.3, 47.8, 51.2, 52.6, 52.4, 53.6, 52.1]);
  expect(chart.individuals.centre).toBeCloseTo(50.81, 10);
  expect(chart.ranges.centre).toBeCloseTo(1.8778, 4);
  expect(chart.individuals.centre + (3 * chart.ranges.centre) / 1.128).toBeCloseTo(55.8041, 4);
  expect(chart.individuals.centre - (3 * chart.ranges.centre) / 1.128).toBeCloseTo(45.8159, 4);
  expect(chart.individuals.upper).toBeCloseTo(55.802412, 6);
  expect(chart.individuals.lower).toBeCloseTo(45.817588, 6);
  expect(chart.ranges).toMatchObject({ lower: 0 });
  // Printed 6.1347 with D4 rounded to 3.267.
  expect(Math.abs(chart.ranges.upper - 6.1347)).toBeLessThan(0.001);
  expect(chart.beyond).toEqual([]);
  expect(standardDeviation([49.6, 47.6, 49.9, 51.3, 47.8, 51.2, 52.6, 52.4, 53.6, 52.1])).toBeCloseTo(2.033852, 6);
});

const pistonRings = [
  [74.03, 74.002, 74.019, 73.992, 74.008],
  [73.995, 73.992, 74.001, 74.011, 74.004],
  [73.988, 74.024, 74.021, 74.005, 74.002],
  [74.002, 73.996, 73.993, 74.015, 74.009],
  [73.992, 74.007, 74.015, 73.989, 74.014],
  [74.009, 73.994, 73.997, 73.985, 73.993],
  [73.995, 74.006, 73.994, 74.0, 74.005],
  [73.985, 74.003, 73.993, 74.015, 73.988],
  [74.008, 73.995, 74.009, 74.005, 74.004],
  [73.998, 74.0, 73.99, 74.007, 73.995],
  [73.994, 73.998, 73.994, 73.995, 73.99],
  [74.004, 74.0, 74.007, 74.0, 73.996],
  [73.983, 74.002, 73.998, 73.997, 74.012],
  [74.006, 73.967, 73.994, 74.0, 73.984],
  [74.012, 74.014, 73.998, 73.999, 74.007],
  [74.0, 73.984, 74.005, 73.998, 73.996],
  [73.994, 74.012, 73.986, 74.005, 74.007],
  [74.006, 74.01, 74.018, 74.003, 74.0],
  [73.984, 74.002, 74.003, 74.005, 73.997],
  [74.0, 74.01, 74.013, 74.02, 74.003],
  [73.988, 74.001, 74.009, 74.005, 73.996],
  [74.004, 73.999, 73.99, 74.006, 74.009],
  [74.01, 73.989, 73.99, 74.009, 74.014],
  [74.015, 74.008, 73.993, 74.0, 74.01],
  [73.982, 73.984, 73.995, 74.017, 74.013],
];

test('means and ranges: the piston rings', () => {
  // D. C. Montgomery, Introduction to Statistical Quality Control, chapter 6: 74.00118, 0.02276, 74.0143, 73.98805, 0.04812.
  const chart = subgroupChart(pistonRings);
  expect(chart.meanLimits.centre).toBeCloseTo(74.00118, 5);
  expect(chart.rangeLimits.centre).toBeCloseTo(0.02276, 5);
  expect(Math.abs(chart.meanLimits.upper - 74.0143)).toBeLessThan(1e-4);
  expect(Math.abs(chart.meanLimits.lower - 73.98805)).toBeLessThan(1e-4);
  expect(Math.abs(chart.rangeLimits.upper - 0.04812)).toBeLessThan(1e-4);
  expect(chart.rangeLimits.lower).toBe(0);
  expect(chart.withinDeviation).toBeCloseTo(0.009785, 6);
  expect([...chart.meansBeyond, ...chart.rangesBeyond]).toEqual([]);
});

test('share nonconforming: thirty wafers of fifty chips', () => {
  // NIST/SEMATECH e-Handbook 6.3.3.2: mean share 0.2313; wafers 15 and 23 are out of control.
  const defectives = [
    12, 15, 8, 10, 4, 7, 16, 9, 14, 10, 5, 6, 17, 12, 22, 8, 10, 5, 13, 11, 20, 18, 24, 15, 9, 12, 7, 13, 9, 6,
  ];
  const chart = shareChart(defectives.map((nonconforming) => ({ inspected: 50, nonconforming })));
  expect(chart.centre).toBeCloseTo(0.2313, 4);
  expect(chart.limits[0]?.upper).toBeCloseTo(0.410239, 6);
  expect(chart.limits[0]?.lower).toBeCloseTo(0.052428, 6);
  expect(chart.beyond.map((index) => index + 1)).toEqual([15, 23]);
});

test('faults per wafer: the limits of a mean of 16', () => {
  // NIST/SEMATECH e-Handbook 6.3.3.1: 400 faults on 25 wafers, limits 4 and 28.
  const chart = faultChart(Array.from({ length: 25 }, () => 16));
  expect(chart.limits).toEqual({ centre: 16, lower: 4, upper: 28 });
});

describe('the four run rules', () => {
  // Western Electric, Statistical Quality Control Handbook (1956), rules as worded in NIST/SEMATECH e-Handbook 6.3.2;
  // the sequences are constructed on them. Positions from 1.
  const positions = (points: readonly number[]) =>
    ['one_beyond_three', 'two_of_three_beyond_two', 'four_of_five_beyond_one', 'eight_on_one_side'].map((rule) =>
      runSignals(points)
        .filter((signal) => signal.rule === rule)
        .map((signal) => signal.point + 1),
    );

  test('beyond three, two of three, four of five', () => {
    const points = [0.2, -0.5, 2.3, 0.4, 2.1, -0.3, -3.2, 0.1, 1.2, 1.4, 0.3, 1.1, 1.6, -0.2, -0.4];
    expect(positions(points)).toEqual([[7], [5], [13], []]);
  });

  test('eight on one side; a point on the line does not count', () => {
    const points = [
      0.1, 0.4, 0.3, 0.6, 0.2, 0.8, 0.5, 0.9, 0.7, -0.1, -1.3, -1.2, -0.4, -1.5, -1.1, -1.01, 2.0, 2.2, 3.0,
    ];
    expect(positions(points)).toEqual([[], [19], [15, 16], [8, 9]]);
  });
});
