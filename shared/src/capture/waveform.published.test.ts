import { describe, expect, test } from '@jest/globals';
import { EdgeFinder } from './edge-finder.js';
import type { Measure } from './measure.js';
import { WaveformAnalyser, type WaveformOptions } from './waveform.js';
import { rectangleAt, sample, type Trapezoid, trapezoidAt } from './waveform.builders.js';

/*
 * Definitions of IEEE Std 181-2011 / IEC 60469:2013: state levels by histogram modes, reference levels at 10, 50 and 90
 * percent, instants by straight lines between samples, pulse duration and period between 50 percent instants, transition
 * duration from 10 to 90 percent. The signals are analytic, so the right answers are exact.
 */

const measure = (
  signals: readonly ((seconds: number) => number)[],
  hertz: number,
  count: number,
  options: Partial<WaveformOptions> = {},
) => {
  const analyser = new WaveformAnalyser({ channels: signals.length === 2 ? 2 : 1, ...options });
  const sampled = signals.map((signal) => sample(signal, hertz, count));
  const [times] = sampled[0] ?? [new Float64Array(0)];
  analyser.push([times, ...sampled.map(([, values]) => values)], count);
  return analyser.finish();
};

const valueOf = (found: Measure | undefined): number => {
  if (found === undefined || !found.measured) throw new Error(found === undefined ? 'nothing' : found.reason);
  return found.value;
};
const relative = (found: Measure | undefined, expected: number) =>
  expect(Math.abs(valueOf(found) / expected - 1)).toBeLessThan(1e-9);

describe('trapezoids with several samples per edge', () => {
  test.each([
    [
      {
        periodSeconds: 2e-5,
        delaySeconds: 3e-6,
        riseSeconds: 1e-6,
        topSeconds: 8e-6,
        fallSeconds: 2e-6,
        low: 0,
        high: 10,
      },
      1e7,
      2000,
      { hertz: 50e3, width: 9.5e-6, duty: 0.475, rise: 8e-7, fall: 1.6e-6, periods: 9 },
    ],
    [
      {
        periodSeconds: 1 / 52e3,
        delaySeconds: 2.2e-6,
        riseSeconds: 6e-7,
        topSeconds: 8.4e-6,
        fallSeconds: 9e-7,
        low: -0.3,
        high: 11.7,
      },
      2e7,
      4000,
      { hertz: 52e3, width: 9.15e-6, duty: 0.4758, rise: 4.8e-7, fall: 7.2e-7, periods: 10 },
    ],
  ] as const)('%o', (shape, hertz, count, expected) => {
    const [channel] = measure([(seconds) => trapezoidAt(shape, seconds)], hertz, count).channels;
    relative(channel?.frequency, expected.hertz);
    relative(channel?.pulseWidth, expected.width);
    relative(channel?.duty, expected.duty);
    relative(channel?.leadingDuration, expected.rise);
    relative(channel?.trailingDuration, expected.fall);
    expect(channel?.completePeriods).toBe(expected.periods);
    expect(channel?.levels).toMatchObject({
      low: expect.closeTo(shape.low, 9),
      high: expect.closeTo(shape.high, 9),
      clipped: false,
    });
  });
});

describe('ideal rectangles: the sampling bounds the error', () => {
  test.each([
    [{ hertz: 52e3, duty: 0.45, low: 0, high: 5, delaySeconds: 1.37e-6 }, 1e7, 6400, 33],
    [{ hertz: 1000, duty: 0.1, low: 0, high: 3.3, delaySeconds: 0.0001234 }, 1e6, 10500, 10],
  ])('%o', (shape, hertz, count, periods) => {
    const [channel] = measure([(seconds) => rectangleAt(shape, seconds)], hertz, count).channels;
    const interval = 1 / hertz;
    const width = shape.duty / shape.hertz;
    expect(channel?.completePeriods).toBe(periods);
    expect(Math.abs(valueOf(channel?.period) - 1 / shape.hertz)).toBeLessThanOrEqual(
      interval / (channel?.completePeriods ?? 1),
    );
    const pulse = channel?.pulseWidth;
    expect(pulse?.measured).toBe(true);
    if (pulse?.measured !== true) return;
    expect(Math.abs(pulse.least - width)).toBeLessThanOrEqual(interval * (1 + 1e-9));
    expect(Math.abs(pulse.greatest - width)).toBeLessThanOrEqual(interval * (1 + 1e-9));
    expect(pulse.uncertainty).toBeCloseTo(interval, 12);
    // No sample lies in an edge, so its duration is refused rather than invented.
    expect(channel?.leadingDuration).toMatchObject({ measured: false, reason: 'few_samples_per_edge' });
  });
});

describe('dead time between two outputs', () => {
  const output = (delaySeconds: number, topSeconds: number): Trapezoid => ({
    periodSeconds: 2e-5,
    delaySeconds,
    riseSeconds: 4e-7,
    topSeconds,
    fallSeconds: 4e-7,
    low: 0,
    high: 10,
  });
  test.each([
    [output(1e-6, 8.6e-6), output(1.1e-5, 8.6e-6), 1e-6, 1e-6, false],
    [output(1e-6, 9.8e-6), output(1.1e-5, 9.6e-6), -2e-7, 0, true],
  ])('%#', (first, second, forth, back, overlap) => {
    const found = measure(
      [(seconds) => trapezoidAt(first, seconds), (seconds) => trapezoidAt(second, seconds)],
      2e7,
      4000,
    );
    expect(Math.abs(valueOf(found.deadTimes?.firstToSecond) - forth)).toBeLessThan(1e-12);
    expect(Math.abs(valueOf(found.deadTimes?.secondToFirst) - back)).toBeLessThan(1e-12);
    expect(found.deadTimes?.overlap).toBe(overlap);
  });
});

test('hysteresis keeps chatter about the middle from counting as pulses', () => {
  const values = Float64Array.of(
    0,
    0,
    0,
    0.1,
    0,
    2.3,
    2.6,
    2.4,
    2.7,
    2.45,
    2.9,
    5,
    5,
    5,
    4.9,
    5,
    2.6,
    2.4,
    2.55,
    2.3,
    0,
    0,
    0,
    0,
    2.4,
    2.6,
    5,
    5,
    5,
    0,
    0,
  );
  const times = Float64Array.from(values, (_, index) => index);
  const count = (hysteresis: number) => {
    const edges: boolean[] = [];
    const finder = new EdgeFinder(
      { low: 0, high: 5, hysteresis },
      { edge: (edge) => edges.push(edge.rising), duration: () => {} },
    );
    finder.scan(times, values, values.length);
    return [edges.filter(Boolean).length, edges.filter((rising) => !rising).length];
  };
  expect(count(0)).toEqual([5, 5]);
  expect(count(0.1)).toEqual([2, 2]);
});

describe('a sine sampled too seldom is refused, not measured at its mirror frequency', () => {
  // Sampling theorem: f folds to |f − k f_s|.
  test.each([
    [52000, 60000],
    [52000, 104500],
    [52000, 90000],
    [1000, 1000],
    [52000, 200000],
  ])('%d Hz at %d samples a second', (hertz, rate) => {
    const [channel] = measure([(seconds) => Math.sin(2 * Math.PI * hertz * seconds + 0.3)], rate, 4000).channels;
    expect(channel?.frequency.measured).toBe(false);
    if (channel?.frequency.measured === false) {
      expect(['few_samples_per_period', 'no_two_levels']).toContain(channel.frequency.reason);
    }
  });
});

describe('closed forms', () => {
  test('a sine takes 0.295167235 of its period from 10 to 90 percent of its peak to peak', () => {
    const found = measure([(seconds) => Math.sin(2 * Math.PI * 1000 * seconds)], 1e7, 50000, {});
    const [channel] = found.channels;
    // The modal bins lie up to 1/256 inside the extremes, so the levels and this share are that much short.
    expect(Math.abs(valueOf(channel?.leadingDuration) / valueOf(channel?.period) - 0.295167235)).toBeLessThan(0.002);
  });

  test('a first-order edge takes ln 9 time constants from 10 to 90 percent', () => {
    const tau = 1e-6;
    const signal = (seconds: number): number => {
      const phase = seconds - Math.floor(seconds / 4e-5) * 4e-5;
      return phase < 2e-5 ? 1 - Math.exp(-phase / tau) : Math.exp(-(phase - 2e-5) / tau);
    };
    const [channel] = measure([signal], 1e8, 40000).channels;
    expect(valueOf(channel?.leadingDuration) / tau).toBeCloseTo(2.197224577, 2);
  });
});

test('partial periods at both ends do not count', () => {
  // 1 kHz, 30 percent, capture begins 0.1 ms after a leading edge and lasts 3.5 ms.
  const shape = { hertz: 1000, duty: 0.3, low: 0, high: 5, delaySeconds: -0.0001 };
  const [channel] = measure([(seconds) => rectangleAt(shape, seconds, false)], 1e5, 350).channels;
  expect(channel?.leadingEdges).toBe(3);
  expect(channel?.completePeriods).toBe(2);
  expect(channel?.completePulses).toBe(3);
  expect(Math.abs(valueOf(channel?.duty) - 0.3)).toBeLessThan(0.01);
});
