import { describe, expect, test } from '@jest/globals';
import { fluxOfTurns, secondaryTurns, secondaryVolts, turnsOfFlux } from './transformer.js';

describe('turns and flux', () => {
  const input = { volts: 10.5, coreHertz: 50e3, duty: 0.5, coreSquareMillimetres: 125 };

  test('a published design: 10.5 V, 50 kHz, 1500 G, 1.25 cm²', () => {
    // T. Mahbub, "Ferrite transformer turns calculation for high-frequency/SMPS inverter": 2.8 turns, 3 turns, 1400 G.
    const sheet = turnsOfFlux(input, 0.15);
    expect(sheet.exact.value).toBeCloseTo(2.8, 10);
    expect(sheet.whole.value).toBe(3);
    expect(sheet.flux.peak.value * 1e4).toBeCloseTo(1400, 8);
  });

  test('its secondary: 330 V from 10.29 V over 3 turns', () => {
    // The same tutorial, from memory: ratio 32.07, taken as 32, so 96 turns.
    const turns = secondaryTurns(10.5 * 0.98, 3, 330);
    expect(turns.value / 3).toBeCloseTo(32.07, 2);
    expect(Math.round(turns.value / 3) * 3).toBe(96);
  });

  // Faraday's law.
  test.each([
    [0.5, 240.3021, 480.6042],
    [0.45, 216.2719, 432.5438],
  ])('16.8 V, 60 kHz, 3 turns, 97.1 mm² at a duty of %d', (duty, peak, swing) => {
    const flux = fluxOfTurns({ volts: 16.8, coreHertz: 60e3, duty, coreSquareMillimetres: 97.1 }, 3);
    expect(flux.peak.value * 1e3).toBeCloseTo(peak, 3);
    expect(flux.swing.value * 1e3).toBeCloseTo(swing, 3);
    expect(flux.peak.warnings.map((each) => each.code)).toEqual(['flux_high']);
  });
});

test('a secondary of less than one full turn counts as one', () => {
  // Common practice, no source: a primary of 8 turns with a centre tap, a secondary of less than one turn.
  const found = secondaryVolts({ volts: 12, primaryTurns: 4, secondaryTurns: 0.7, duty: 0.25 });
  expect(found.amplitude.value).toBe(3);
  expect(found.effective.value).toBeCloseTo(3 * Math.SQRT1_2, 12);
  expect(found.amplitude.warnings.map((each) => each.code)).toEqual(['fraction_of_a_turn']);
});
