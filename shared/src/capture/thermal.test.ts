import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { fitExponential } from './exponential-fit.js';
import type { Measure } from './measure.js';
import { TemperatureCapture, type TemperatureCaptureOptions } from './temperature-capture.js';
import { typeKCelsius, typeKMillivolts, typeKSensitivity } from './type-k.js';
import { coolingTimeConstant, measureWarmUp } from './warm-up.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};
const reasonOf = (found: Measure) => (found.measured ? 'measured' : found.reason);
const valueOf = (found: Measure): number => {
  if (!found.measured) throw new Error(found.reason);
  return found.value;
};

describe('type K', () => {
  test('both ways are each other’s inverse over the whole range', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -199.9, max: 1371.9, noNaN: true }),
        fc.double({ min: -20, max: 60, noNaN: true }),
        (celsius, cold) => {
          const found = typeKCelsius(typeKMillivolts(celsius) - typeKMillivolts(cold), cold);
          expect(Math.abs(found - celsius)).toBeLessThan(1e-6);
        },
      ),
      { numRuns: 3000 },
    );
  });

  test('rises all the way, and its slope is that of the curve', () => {
    for (let celsius = -260; celsius < 1370; celsius += 7) {
      const slope = (typeKMillivolts(celsius + 1e-3) - typeKMillivolts(celsius - 1e-3)) / 2e-3;
      expect(slope).toBeGreaterThan(0);
      if (Math.abs(celsius) > 1) expect(typeKSensitivity(celsius)).toBeCloseTo(slope, 6);
    }
  });

  test('refuses what the pair of metals cannot give', () => {
    expect(codeOf(() => typeKMillivolts(1400))).toBe('capture_thermocouple_range');
    expect(codeOf(() => typeKMillivolts(Number.NaN))).toBe('capture_thermocouple_range');
    expect(codeOf(() => typeKCelsius(60, 20))).toBe('capture_thermocouple_range');
    expect(codeOf(() => typeKCelsius(-7, 20))).toBe('capture_thermocouple_range');
  });
});

describe('exponentials', () => {
  test('of any size and constant are found again', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 60, noNaN: true }),
        fc.double({ min: 10, max: 900, noNaN: true }),
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.boolean(),
        (tau, size, offset, falling) => {
          const times = Array.from({ length: 120 }, (_, index) => (index * tau) / 25);
          const values = times.map((time) => offset + size * (falling ? 1 : -1) * Math.exp(-time / tau));
          expect(Math.abs((fitExponential({ times, values })?.timeConstant ?? 0) / tau - 1)).toBeLessThan(1e-6);
        },
      ),
      { numRuns: 30 },
    );
  });

  test('need four readings that change', () => {
    expect(codeOf(() => fitExponential({ times: [0, 1, 2], values: [1, 2, 3] }))).toBe('capture_no_samples');
    expect(fitExponential({ times: [0, 1, 2, 3], values: [5, 5, 5, 5] })).toBeUndefined();
  });
});

describe('warming up', () => {
  const options = { target: 350, band: 5 };

  test('that never gets there, or does not stay, says so', () => {
    const times = Array.from({ length: 50 }, (_, index) => index);
    const cold = measureWarmUp({ times, values: times.map((time) => 25 + time) }, options);
    expect(reasonOf(cold.timeToTarget)).toBe('target_not_reached');
    expect(reasonOf(cold.settlingTime)).toBe('not_settled');
    expect(valueOf(cold.overshoot)).toBe(0);
    const swinging = measureWarmUp(
      { times, values: times.map((time) => (time < 5 ? 25 + 65 * time : 350 + 20 * (-1) ** time)) },
      options,
    );
    expect(reasonOf(swinging.settlingTime)).toBe('not_settled');
    expect(valueOf(swinging.ripple)).toBe(40);
    expect(valueOf(swinging.rippleEffective)).toBeCloseTo(20, 0);
  });

  test('of a tool that was warm already has no step, but a settled level', () => {
    const found = measureWarmUp({ times: [0, 1, 2, 3], values: [349, 350, 351, 350] }, options);
    expect(reasonOf(found.timeToTarget)).toBe('no_step');
    expect(reasonOf(found.settled)).toBe('measured');
  });

  test('does not depend on when the log begins', () => {
    const times = Array.from({ length: 300 }, (_, index) => index * 0.1);
    const values = times.map((time) => 25 + 330 * (1 - Math.exp(-time / 4)));
    const early = measureWarmUp({ times, values }, options);
    const late = measureWarmUp({ times: times.map((time) => time + 5000), values }, options);
    expect(valueOf(late.timeToTarget)).toBeCloseTo(valueOf(early.timeToTarget), 9);
    expect(valueOf(late.timeConstant)).toBeCloseTo(valueOf(early.timeConstant), 6);
  });

  test('refuses logs that are no logs', () => {
    expect(codeOf(() => measureWarmUp({ times: [0], values: [25] }, options))).toBe('capture_no_samples');
    expect(codeOf(() => measureWarmUp({ times: [0, 1], values: [25] }, options))).toBe('capture_lengths_differ');
    expect(codeOf(() => measureWarmUp({ times: [1, 1], values: [25, 26] }, options))).toBe('capture_not_ordered');
    expect(codeOf(() => measureWarmUp({ times: [0, 1], values: [25, 26] }, { ...options, band: -1 }))).toBe(
      'capture_out_of_range',
    );
  });
});

test('cooling down: the time constant after the heat is off', () => {
  const times = Array.from({ length: 400 }, (_, index) => index * 0.5);
  const values = times.map((time) => (time < 60 ? 350 : 22 + 328 * Math.exp(-(time - 60) / 37)));
  expect(valueOf(coolingTimeConstant({ times, values })) / 37).toBeCloseTo(1, 3);
  expect(reasonOf(coolingTimeConstant({ times, values: times.map((time) => 22 + time) }))).toBe('no_cooling');
});

describe('temperature logs', () => {
  const read = (text: string, options: TemperatureCaptureOptions = {}) => {
    const capture = new TemperatureCapture(options);
    capture.push(text);
    return capture.finish();
  };

  test('in degrees are taken as they are, gaps left out, time from the first reading', () => {
    const found = read('Time;Tip (°C);Ambient (°C)\n12:00:00;25,5;21\n12:00:01;;21\n12:00:02;80;21\n');
    expect([...found.times]).toEqual([0, 2]);
    expect([...found.values]).toEqual([25.5, 80]);
    expect(found).toMatchObject({ fromThermocouple: false, column: { name: 'Tip' } });
  });

  test('in millivolts need their cold junction, as a column or as one temperature', () => {
    const text = 't (s),TC (mV),Cold junction (°C)\n0,0,25\n1,13.292907,25\n2,15.193867,30\n';
    const found = read(text);
    expect(found.fromThermocouple).toBe(true);
    [25, 350, 400].forEach((celsius, index) => expect(found.values[index]).toBeCloseTo(celsius, 3));
    const bare = 't (s),TC (mV)\n0,0\n1,13.292907\n2,13.3\n';
    expect(codeOf(() => read(bare))).toBe('capture_no_cold_junction');
    expect(read(bare, { coldJunctionCelsius: 25 }).values[1]).toBeCloseTo(350, 3);
  });

  test('without a single reading are refused', () => {
    expect(codeOf(() => read(''))).toBe('capture_empty');
  });
});
