import { describe, expect, test } from '@jest/globals';
import { oscillatorSheet, outputGap, timingResistor } from './oscillator.js';

const codes = (warnings: readonly { readonly code: string }[]) => warnings.map((each) => each.code);

describe('timing parts', () => {
  test('a published worked example: 10 kΩ, 10 nF, 5 kΩ give 4545.45 Hz', () => {
    // Worked example of a public calculator for the part (waycalculator.com); its discharge resistor is out of range.
    const sheet = oscillatorSheet({ timingOhms: 10e3, timingFarads: 10e-9, dischargeOhms: 5e3 });
    expect(sheet.oscillator.value).toBeCloseTo(4545.45, 2);
    expect(codes(sheet.oscillator.warnings)).toEqual(['discharge_resistor_outside']);
  });

  test('the data sheet’s test condition: 3.6 kΩ, 10 nF, 0 Ω, nominally 40 kHz', () => {
    // Data sheets of the 3525 kind of controller, from memory; a few percent between formula and part.
    const sheet = oscillatorSheet({ timingOhms: 3600, timingFarads: 10e-9, dischargeOhms: 0 });
    expect(sheet.oscillator.value).toBeCloseTo(39682.54, 2);
    expect(sheet.output.value).toBeCloseTo(19841.27, 2);
    expect(codes(sheet.oscillator.warnings)).toEqual(['no_discharge_resistor']);
  });

  // Formula of the data sheets, as three independent public calculators have it.
  test.each([
    [10e3, 1e-9, 100, 136986.301, 68493.151, 300],
    [15e3, 1e-9, 22, 94643.195, 47321.598, 66],
    [6.8e3, 2.2e-9, 10, 94894.667, 47447.333, 66],
  ])('%d Ω, %d F, %d Ω', (timingOhms, timingFarads, dischargeOhms, oscillator, output, nanoseconds) => {
    const sheet = oscillatorSheet({ timingOhms, timingFarads, dischargeOhms });
    expect(sheet.oscillator.value).toBeCloseTo(oscillator, 2);
    expect(sheet.output.value).toBeCloseTo(output, 2);
    expect(sheet.deadTime.value * 1e9).toBeCloseTo(nanoseconds, 6);
    expect(sheet.oscillator.warnings).toEqual([]);
  });

  test('60 kHz at the outputs with 1 nF and 47 Ω takes 11.703 kΩ', () => {
    // The same formula solved for the resistor.
    expect(timingResistor(60e3, 1e-9, 47).value).toBeCloseTo(11703.33, 2);
  });
});

test('trade figures: near 47 kHz, and at a quarter of duty the gap is not the dead time', () => {
  // Common practice, no source: such converters run near 47 kHz; discharge resistors of 33 to 100 Ω; 25 % heats best.
  for (const dischargeOhms of [33, 100]) {
    const sheet = oscillatorSheet({ timingOhms: 15e3, timingFarads: 1e-9, dischargeOhms });
    expect(sheet.output.value).toBeGreaterThan(46e3);
    expect(sheet.output.value).toBeLessThan(48e3);
    const gap = outputGap(sheet.output.value, 0.25, sheet.deadTime.value);
    expect(gap.value).toBeGreaterThan(15 * sheet.deadTime.value);
    expect(codes(gap.warnings)).toEqual(['gap_set_by_duty']);
    const full = outputGap(sheet.output.value, sheet.greatestDuty.value, sheet.deadTime.value);
    expect(full.value).toBeCloseTo(sheet.deadTime.value, 12);
  }
});
