import { describe, expect, test } from '@jest/globals';
import { fitExponential } from './exponential-fit.js';
import type { Measure } from './measure.js';
import { typeKCelsius, typeKMillivolts, typeKSensitivity } from './type-k.js';
import { measureWarmUp } from './warm-up.js';

const valueOf = (found: Measure): number => {
  if (!found.measured) throw new Error(found.reason);
  return found.value;
};

describe('type K', () => {
  // NIST ITS-90 thermocouple database, type K (type_k.tab), and its printed table to one microvolt.
  test.each([
    [0, 0, 0],
    [25, 1.000242, 1],
    [100, 4.09623, 4.096],
    [200, 8.138473, 8.138],
    [300, 12.208566, 12.209],
    [350, 14.293149, 14.293],
    [400, 16.397142, 16.397],
    [500, 20.644286, 20.644],
  ])('%d °C', (celsius, millivolts, printed) => {
    expect(typeKMillivolts(celsius)).toBeCloseTo(millivolts, 6);
    expect(Math.abs(typeKMillivolts(celsius) - printed)).toBeLessThanOrEqual(0.0005);
  });

  test('below zero: −5.891 mV at −200 °C, −2.243 mV at −60 °C', () => {
    // NIST ITS-90 table, type K; from memory.
    expect(typeKMillivolts(-200)).toBeCloseTo(-5.891, 3);
    expect(typeKMillivolts(-60)).toBeCloseTo(-2.243, 3);
  });

  test.each([
    [350, 25, 13.292907],
    [300, 22, 11.32971],
    [400, 30, 15.193867],
    [450, 18, 17.798267],
    [25, 25, 0],
  ])('%d °C with the cold junction at %d °C', (celsius, coldJunction, millivolts) => {
    expect(typeKMillivolts(celsius) - typeKMillivolts(coldJunction)).toBeCloseTo(millivolts, 6);
    expect(Math.abs(typeKCelsius(millivolts, coldJunction) - celsius)).toBeLessThan(0.001);
  });

  test('sensitivity: 40.518 µV/K at 25 °C, 41.906 µV/K at 350 °C', () => {
    expect(typeKSensitivity(25) * 1e3).toBeCloseTo(40.518, 2);
    expect(typeKSensitivity(350) * 1e3).toBeCloseTo(41.906, 2);
  });
});

describe('first order', () => {
  // Closed forms: t(T) = τ ln((Tf − T0)/(Tf − T)), 10 to 90 percent τ ln 9.
  test.each([
    [25, 400, 8, 350, 0.16, 16.119224],
    [22, 420, 3.2, 300, 0.064, 3.836673],
  ])('from %d to %d °C with %d s', (start, final, tau, target, interval, timeToTarget) => {
    const times = Array.from({ length: 400 }, (_, index) => index * interval);
    const values = times.map((time) => start + (final - start) * (1 - Math.exp(-time / tau)));
    const fit = fitExponential({ times, values });
    expect(Math.abs((fit?.timeConstant ?? 0) / tau - 1)).toBeLessThan(1e-6);
    expect(fit?.final).toBeCloseTo(final, 4);
    expect(fit?.initial).toBeCloseTo(start, 4);
    const found = measureWarmUp({ times, values }, { target, band: 5 });
    // Straight lines between readings lag the curve by less than T²/(8 τ²) of a step.
    expect(Math.abs(valueOf(found.timeToTarget) - timeToTarget)).toBeLessThan(interval * 0.01);
    expect(Math.abs(valueOf(found.timeConstant) / tau - 1)).toBeLessThan(1e-6);
    const finely = measureWarmUp({ times, values }, { target: final - 1e-9 * final, band: 0.02 * (final - start) });
    expect(Math.abs(valueOf(finely.riseTime) - tau * Math.log(9))).toBeLessThan(interval * 0.01);
    expect(Math.abs(valueOf(finely.settlingTime) - tau * Math.log(50))).toBeLessThan(interval * 0.02);
  });
});

test('second order, damping 0.4: overshoot 25.38 percent, settled to 2 percent after 16.82 s', () => {
  // Overshoot exp(−πz/√(1 − z²)); settling from a dense numerical solution.
  const natural = 0.5;
  const damping = 0.4;
  const damped = natural * Math.sqrt(1 - damping ** 2);
  const times = Array.from({ length: 40_001 }, (_, index) => index * 0.001);
  const values = times.map((time) => {
    const decay = Math.exp(-damping * natural * time);
    const wave = Math.cos(damped * time) + ((damping * natural) / damped) * Math.sin(damped * time);
    return 350 - 325 * decay * wave;
  });
  const found = measureWarmUp({ times, values }, { target: 350, band: 0.02 * 325 });
  expect(valueOf(found.overshootShare)).toBeCloseTo(0.253827, 4);
  expect(valueOf(found.overshoot)).toBeCloseTo(82.4937, 2);
  expect(valueOf(found.timeToTarget)).toBeCloseTo(4.3258, 3);
  expect(Math.abs(valueOf(found.settlingTime) - 16.819)).toBeLessThan(0.002);
});

test('a log of eighteen readings', () => {
  // Constructed: 350 °C lies between 5 and 6 s, 353.5 °C between 8 and 9 s.
  const values = [25, 80, 150, 240, 300, 335, 352, 361, 357, 353, 349, 347, 348.5, 351, 350.5, 349.8, 350.2, 350];
  const times = values.map((_, index) => index);
  const found = measureWarmUp({ times, values }, { target: 350, band: 3.5, settledShare: 5 / 17 });
  expect(valueOf(found.timeToTarget)).toBeCloseTo(5.882353, 6);
  expect(valueOf(found.peak)).toBe(361);
  expect(valueOf(found.overshoot)).toBe(11);
  expect(valueOf(found.overshootShare)).toBeCloseTo(0.033846, 6);
  expect(valueOf(found.settlingTime)).toBeCloseTo(8.875, 6);
  expect(valueOf(found.settled)).toBeCloseTo(350, 9);
  expect(valueOf(found.ripple)).toBeCloseTo(2.5, 9);
});
