import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { TraceDecimator } from './decimate.js';
import { EdgeFinder } from './edge-finder.js';
import { type Measure, refusalSentences } from './measure.js';
import { findStateLevels } from './state-levels.js';
import { WaveformAnalyser, type WaveformOptions } from './waveform.js';
import { WaveformCapture } from './waveform-capture.js';
import { rectangleAt, sample, type Trapezoid, trapezoidAt } from './waveform.builders.js';

/** Noise that is the same in every run (linear congruential generator of Numerical Recipes). */
function createNoise(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 31 - 1;
  };
}

const analyse = (columns: readonly Float64Array[], options: Partial<WaveformOptions> = {}) => {
  const analyser = new WaveformAnalyser({
    channels: columns.length === 3 ? 2 : 1,
    levelSamples: columns[0]?.length ?? 1,
    ...options,
  });
  analyser.push(columns, columns[0]?.length ?? 0);
  return analyser.finish();
};
const reasonOf = (found: Measure | undefined) =>
  found === undefined ? 'nothing' : found.measured ? 'measured' : found.reason;
const valueOf = (found: Measure | undefined): number => {
  if (found === undefined || !found.measured) throw new Error(reasonOf(found));
  return found.value;
};

const drive: Trapezoid = {
  periodSeconds: 2e-5,
  delaySeconds: 3e-6,
  riseSeconds: 1e-6,
  topSeconds: 8e-6,
  fallSeconds: 1e-6,
  low: 0,
  high: 10,
};

/** Transitions by looking at all samples at once: states outside the band, one edge wherever the state changes. */
function edgesByDefinition(times: Float64Array, values: Float64Array, middle: number, band: number): readonly number[] {
  const edges: number[] = [];
  let state = 0;
  let since = 0;
  values.forEach((value, index) => {
    const now = value - middle >= band ? 1 : value - middle < -band ? -1 : 0;
    if (now === 0) return;
    if (state !== 0 && now !== state) {
      for (let at = since + 1; at <= index; at += 1) {
        const before = (values[at - 1] ?? 0) - middle;
        const after = (values[at] ?? 0) - middle;
        const crosses = now > 0 ? before < 0 && after >= 0 : before > 0 && after <= 0;
        if (!crosses) continue;
        edges.push((times[at - 1] ?? 0) + (((times[at] ?? 0) - (times[at - 1] ?? 0)) * -before) / (after - before));
        break;
      }
    }
    state = now;
    since = index;
  });
  return edges;
}

describe('edges', () => {
  test('agree with a model that sees all samples at once', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -10, max: 10 }), { maxLength: 80 }),
        fc.constantFrom(0.05, 0.1, 0.2),
        (samples, hysteresis) => {
          // Odd multiples of a half keep samples off the levels, where either reading is right.
          const values = Float64Array.from(samples, (value) => value + 0.25);
          const times = values.map((_, index) => index);
          const found: number[] = [];
          const finder = new EdgeFinder(
            { low: -10, high: 10, hysteresis },
            { edge: (edge) => found.push(edge.middle), duration: () => {} },
          );
          finder.scan(times, values, values.length);
          const expected = edgesByDefinition(times, values, 0, hysteresis * 20);
          expect(found).toHaveLength(expected.length);
          found.forEach((instant, index) => expect(instant).toBeCloseTo(expected[index] ?? Number.NaN, 12));
        },
      ),
      { numRuns: 2000 },
    );
  });

  test('do not depend on how the samples are cut into blocks', () => {
    const [times, values] = sample((seconds) => trapezoidAt(drive, seconds), 2e7, 8000);
    const whole = analyse([times, values]);
    for (const size of [1, 7, 640, 5000]) {
      const analyser = new WaveformAnalyser({ channels: 1 });
      for (let from = 0; from < times.length; from += size) {
        const to = Math.min(times.length, from + size);
        analyser.push([times.subarray(from, to), values.subarray(from, to)], to - from);
      }
      expect(analyser.finish()).toEqual(whole);
    }
  });

  test('are found in the same places when the levels are known from a beginning only', () => {
    const [times, values] = sample((seconds) => trapezoidAt(drive, seconds), 2e7, 40_000);
    const whole = analyse([times, values]).channels[0];
    const stream = analyse([times, values], { levelSamples: 2000 }).channels[0];
    expect(stream?.leadingEdges).toBe(whole?.leadingEdges);
    expect(valueOf(stream?.duty)).toBeCloseTo(valueOf(whole?.duty), 9);
  });
});

describe('measures', () => {
  test('of any trapezoid agree with how it was made', () => {
    const shapes = fc.record({
      periodSeconds: fc.double({ min: 1e-5, max: 4e-5, noNaN: true }),
      delaySeconds: fc.double({ min: 1e-6, max: 5e-6, noNaN: true }),
      rise: fc.double({ min: 0.03, max: 0.1, noNaN: true }),
      top: fc.double({ min: 0.1, max: 0.6, noNaN: true }),
      fall: fc.double({ min: 0.03, max: 0.1, noNaN: true }),
      low: fc.double({ min: -20, max: 20, noNaN: true }),
      amplitude: fc.double({ min: 0.5, max: 50, noNaN: true }),
    });
    fc.assert(
      fc.property(shapes, (random) => {
        const { periodSeconds, delaySeconds, low } = random;
        const shape: Trapezoid = {
          periodSeconds,
          delaySeconds,
          riseSeconds: random.rise * periodSeconds,
          topSeconds: random.top * periodSeconds,
          fallSeconds: random.fall * periodSeconds,
          low,
          high: low + random.amplitude,
        };
        const [times, values] = sample((seconds) => trapezoidAt(shape, seconds), 5e7, 10_000);
        const [channel] = analyse([times, values]).channels;
        const width = shape.topSeconds + (shape.riseSeconds + shape.fallSeconds) / 2;
        expect(Math.abs(valueOf(channel?.period) / periodSeconds - 1)).toBeLessThan(1e-6);
        // Samples of an edge that fall into a modal bin draw the level by a small part of a bin, 1/256.
        expect(Math.abs(valueOf(channel?.pulseWidth) / width - 1)).toBeLessThan(1e-4);
        expect(Math.abs(valueOf(channel?.leadingDuration) / (0.8 * shape.riseSeconds) - 1)).toBeLessThan(1e-3);
        expect(Math.abs(valueOf(channel?.trailingDuration) / (0.8 * shape.fallSeconds) - 1)).toBeLessThan(1e-3);
      }),
      { numRuns: 25 },
    );
  });

  test('stand noise of three percent and ringing of half the amplitude', () => {
    const noise = createNoise(7);
    const signal = (seconds: number): number => {
      const phase = (seconds - 3e-6) / 2e-5 - Math.floor((seconds - 3e-6) / 2e-5);
      const sinceRise = phase * 2e-5;
      const ringing =
        seconds > 3e-6 && sinceRise < 3e-6 ? 5 * Math.exp(-sinceRise / 5e-7) * Math.cos(sinceRise * 2e7) : 0;
      return (
        trapezoidAt({ ...drive, riseSeconds: 1e-7 }, seconds) + ringing * (sinceRise > 1e-7 ? 1 : 0) + 0.3 * noise()
      );
    };
    const [times, values] = sample(signal, 5e7, 20_000);
    const [channel] = analyse([times, values]).channels;
    expect(Math.abs(valueOf(channel?.frequency) / 50e3 - 1)).toBeLessThan(1e-3);
    expect(Math.abs((channel?.levels?.high ?? 0) - 10)).toBeLessThan(0.1);
    expect(Math.abs((channel?.levels?.low ?? 9) - 0)).toBeLessThan(0.1);
    expect(channel?.completePulses).toBe(20);
  });

  test('of negative pulses are those of the mirrored signal', () => {
    const [times, values] = sample((seconds) => trapezoidAt({ ...drive, fallSeconds: 2e-6 }, seconds), 2e7, 8000);
    const mirrored = values.map((value) => 10 - value);
    const [upright] = analyse([times, values]).channels;
    const [negative] = analyse([times, mirrored], { polarity: 'negative' }).channels;
    expect(valueOf(negative?.pulseWidth)).toBeCloseTo(valueOf(upright?.pulseWidth), 12);
    expect(valueOf(negative?.leadingDuration)).toBeCloseTo(valueOf(upright?.leadingDuration), 12);
    expect(valueOf(negative?.trailingDuration)).toBeCloseTo(valueOf(upright?.trailingDuration), 12);
  });

  test('say how far a spike goes beyond the levels', () => {
    const [times, values] = sample((seconds) => trapezoidAt(drive, seconds), 2e7, 8000);
    const spiked = values.map((value, index) => (index % 400 === 90 ? 12.5 : index % 400 === 20 ? -0.5 : value));
    const [channel] = analyse([times, spiked]).channels;
    expect(valueOf(channel?.overshoot)).toBeCloseTo(0.25, 9);
    expect(valueOf(channel?.undershoot)).toBeCloseTo(0.05, 9);
    const [plain] = analyse([times, values]).channels;
    expect(valueOf(plain?.overshoot)).toBeCloseTo(0, 9);
  });

  test('pass over gaps', () => {
    const [times, values] = sample((seconds) => trapezoidAt(drive, seconds), 2e7, 8000);
    const gappy = values.map((value, index) => (index % 97 === 0 ? Number.NaN : value));
    expect(valueOf(analyse([times, gappy]).channels[0]?.frequency) / 50e3).toBeCloseTo(1, 6);
  });

  test('begin when the pulses do, however long the flat before', () => {
    const [times, values] = sample((seconds) => trapezoidAt({ ...drive, delaySeconds: 1e-3 }, seconds), 2e7, 40_000);
    const [channel] = analyse([times, values], { levelSamples: 4000 }).channels;
    expect(valueOf(channel?.frequency) / 50e3).toBeCloseTo(1, 6);
  });
});

describe('refusals', () => {
  const flat = sample(() => 3.3, 1e6, 1000);

  test('a flat line, a triangle and noise have no two levels', () => {
    const noise = createNoise(1);
    const triangle = sample((seconds) => Math.abs(((seconds * 1e4) % 2) - 1), 1e7, 20_000);
    const hiss = sample(() => noise(), 1e6, 20_000);
    for (const signal of [flat, triangle, hiss]) {
      const [channel] = analyse(signal).channels;
      expect(reasonOf(channel?.frequency)).toBe('no_two_levels');
      expect(channel?.levels).toBeUndefined();
    }
  });

  test('few samples, few samples in a period, few periods, no pulse', () => {
    expect(reasonOf(analyse(sample((seconds) => seconds, 1, 5)).channels[0]?.period)).toBe('few_samples');
    const square = (hertz: number) => (seconds: number) =>
      rectangleAt({ hertz, duty: 0.5, low: 0, high: 5, delaySeconds: 1e-6 }, seconds);
    expect(reasonOf(analyse(sample(square(15e4), 1e6, 4000)).channels[0]?.period)).toBe('few_samples_per_period');
    const one = analyse(sample(square(600), 1e6, 2000)).channels[0];
    expect(reasonOf(one?.frequency)).toBe('few_cycles');
    expect(reasonOf(one?.pulseWidth)).toBe('measured');
    const step = analyse(sample((seconds) => (seconds > 5e-4 ? 5 : 0), 1e6, 1000)).channels[0];
    expect(reasonOf(step?.pulseWidth)).toBe('no_complete_pulse');
  });

  test('a noisy signal pressed flat at the top is clipped: times by level are refused, the frequency is not', () => {
    const noise = createNoise(3);
    const [times, values] = sample((seconds) => Math.min(8, trapezoidAt(drive, seconds) + 0.2 * noise()), 2e7, 20_000);
    const found = analyse([times, values, values.map((value) => 10 - value)]);
    expect(reasonOf(found.channels[0]?.pulseWidth)).toBe('clipped');
    expect(reasonOf(found.channels[0]?.leadingDuration)).toBe('clipped');
    expect(reasonOf(found.channels[0]?.frequency)).toBe('measured');
    expect(reasonOf(found.deadTimes?.firstToSecond)).toBe('clipped');
    expect(found.deadTimes?.overlap).toBeUndefined();
    const overflow = values.map((value) => (value === 8 ? Number.POSITIVE_INFINITY : value));
    expect(findStateLevels(overflow, overflow.length)).toEqual({ refused: 'clipped' });
  });

  test('edges that go back and forth', () => {
    const stairs = (seconds: number): number => {
      const value = trapezoidAt({ ...drive, riseSeconds: 4e-6, topSeconds: 5e-6 }, seconds);
      return value > 6 && value < 8.5 ? value + 1.5 * Math.sin(seconds * 2e7) : value;
    };
    const [channel] = analyse(sample(stairs, 5e7, 20_000)).channels;
    expect(reasonOf(channel?.leadingDuration)).toBe('edge_not_monotonic');
  });

  test('each has its sentence', () => {
    for (const sentence of Object.values(refusalSentences)) expect(sentence).toMatch(/^[A-Z][^!]*\.$/);
  });
});

describe('two outputs', () => {
  const gate = (delaySeconds: number, topSeconds: number) => (seconds: number) =>
    trapezoidAt({ ...drive, riseSeconds: 2e-7, fallSeconds: 2e-7, delaySeconds, topSeconds }, seconds);

  test('the gaps add up: period = both pulses and both gaps', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 2e-6, max: 9.9e-6, noNaN: true }),
        fc.double({ min: 2e-6, max: 9.9e-6, noNaN: true }),
        (first, second) => {
          const [times, a] = sample(gate(1e-6, first), 5e7, 10_000);
          const [, b] = sample(gate(1.1e-5, second), 5e7, 10_000);
          const found = analyse([times, a, b]);
          const gaps = valueOf(found.deadTimes?.firstToSecond) + valueOf(found.deadTimes?.secondToFirst);
          const widths = valueOf(found.channels[0]?.pulseWidth) + valueOf(found.channels[1]?.pulseWidth);
          expect(gaps + widths).toBeCloseTo(2e-5, 9);
          expect(found.deadTimes?.overlap).toBe(
            valueOf(found.deadTimes?.firstToSecond) < 0 || valueOf(found.deadTimes?.secondToFirst) < 0,
          );
        },
      ),
      { numRuns: 15 },
    );
  });

  test('that run together, or of which one is silent, have no dead time', () => {
    const [times, a] = sample(gate(1e-6, 5e-6), 5e7, 10_000);
    const together = analyse([times, a, a.slice()]);
    expect(reasonOf(together.deadTimes?.firstToSecond)).toBe('no_pairs');
    const silent = analyse([times, a, a.map(() => 0)]);
    expect(reasonOf(silent.deadTimes?.firstToSecond)).toBe('no_two_levels');
    expect(silent.deadTimes?.overlap).toBeUndefined();
  });

  test('of which one runs only half the time are paired where both run', () => {
    const [times, a] = sample(gate(1e-6, 5e-6), 2e7, 40_000);
    const [, b] = sample(gate(1.1e-5, 5e-6), 2e7, 40_000);
    const late = b.map((value, index) => (index < 10_000 ? 0 : value));
    const found = analyse([times, a, late]);
    expect(valueOf(found.deadTimes?.secondToFirst)).toBeCloseTo(4.8e-6, 8);
  });
});

test('a change of level or of period during the capture is told', () => {
  const [times, values] = sample((seconds) => trapezoidAt(drive, seconds) * (seconds > 1.5e-3 ? 1.3 : 1), 2e7, 60_000);
  const warningsOf = (count: number) => {
    const analyser = new WaveformAnalyser({ channels: 1, levelSamples: 10_000 });
    for (let from = 0; from < count; from += 5000) {
      analyser.push([times.subarray(from, from + 5000), values.subarray(from, from + 5000)], 5000);
    }
    return analyser.finish().warnings;
  };
  expect(warningsOf(25_000)).toEqual([]);
  expect(warningsOf(60_000)).toEqual(['levels_changed']);
  const swept = sample(
    (seconds) => (Math.sin(2 * Math.PI * (1000 * seconds + 2e4 * seconds * seconds)) > 0 ? 5 : 0),
    1e6,
    20_000,
  );
  expect(analyse(swept).warnings).toEqual(['period_unsteady']);
});

describe('the drawn trace', () => {
  test('keeps the extremes, its order and its bound, whatever comes', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -1e3, max: 1e3, noNaN: true }), { minLength: 1, maxLength: 3000 }),
        fc.integer({ min: 2, max: 40 }),
        (values, stretches) => {
          const decimator = new TraceDecimator(stretches);
          const samples = Float64Array.from(values);
          decimator.push(
            samples.map((_, index) => index),
            samples,
            samples.length,
          );
          const trace = decimator.trace();
          expect(Math.max(...trace.values)).toBe(Math.max(...values));
          expect(Math.min(...trace.values)).toBe(Math.min(...values));
          expect(trace.times.length).toBeLessThanOrEqual(2 * (stretches + 1));
          trace.times.forEach((time, index) => {
            expect(values[time]).toBe(trace.values[index]);
            if (index > 0) expect(time).toBeGreaterThan(trace.times[index - 1] ?? Number.POSITIVE_INFINITY);
          });
        },
      ),
    );
  });

  test('of a short capture is the capture', () => {
    const decimator = new TraceDecimator(10);
    decimator.push(Float64Array.of(0, 1, 2), Float64Array.of(5, Number.NaN, 7), 3);
    expect(decimator.trace()).toEqual({ times: [0, 2], values: [5, 7] });
  });
});

test('a file of two channels is measured from text to dead time', () => {
  const rows = Array.from({ length: 6000 }, (_, index) => {
    const seconds = index / 5e7;
    const first = trapezoidAt({ ...drive, delaySeconds: 1e-6, topSeconds: 7e-6 }, seconds);
    const second = trapezoidAt({ ...drive, delaySeconds: 1.1e-5, topSeconds: 7e-6 }, seconds);
    return `${(seconds * 1e6).toFixed(2)};${first.toFixed(3)};${second.toFixed(3)}`.replaceAll('.', ',');
  });
  const capture = new WaveformCapture();
  const text = ['t (µs);Gate 1 (V);Gate 2 (V)', ...rows, ''].join('\r\n');
  for (let from = 0; from < text.length; from += 9999) capture.push(text.slice(from, from + 9999));
  const report = capture.finish();
  expect(valueOf(report.measures.channels[0]?.frequency)).toBeCloseTo(50e3, 1);
  expect(valueOf(report.measures.channels[1]?.duty)).toBeCloseTo(0.4, 4);
  expect(valueOf(report.measures.deadTimes?.firstToSecond)).toBeCloseTo(2e-6, 9);
  expect(report.traces).toHaveLength(2);
  expect(report.closeUps[0]?.times).toHaveLength(2000);
  expect(report.counts).toEqual({ rows: 6000, unreadable: 0, gaps: 0 });
});
