import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import { copper, iron, resistivityAt } from '../measure/conductor-material.js';
import { designWarningSentences } from './design-warnings.js';
import { oscillatorSheet, outputGap, timingResistor } from './oscillator.js';
import { packSheet, runSheet } from './pack.js';
import { alternatingResistance, directResistance, skinEffectRatio } from './round-wire-resistance.js';
import { steppedConductor } from './stepped-conductor.js';
import { strandBundle } from './strand-bundle.js';
import { switchRating } from './switch-rating.js';
import { fluxOfTurns, secondaryVolts, turnsOfFlux } from './transformer.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};
const codes = (warnings: readonly { readonly code: string }[]) => warnings.map((each) => each.code);
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the oscillator', () => {
  test('its resistor and its frequency are each other’s inverse, and the outputs run at half', () => {
    fc.assert(
      fc.property(
        between(2e3, 150e3),
        between(1e-9, 200e-9),
        between(0, 500),
        (timingOhms, timingFarads, dischargeOhms) => {
          const sheet = oscillatorSheet({ timingOhms, timingFarads, dischargeOhms });
          expect(sheet.output.value * 2).toBeCloseTo(sheet.oscillator.value, 6);
          const back = timingResistor(sheet.output.value, timingFarads, dischargeOhms);
          expect(Math.abs(back.value / timingOhms - 1)).toBeLessThan(1e-9);
          expect(sheet.greatestDuty.value).toBeLessThanOrEqual(0.5);
        },
      ),
    );
  });

  test('refuses parts that do not exist and frequencies that cannot be', () => {
    const parts = { timingOhms: 15e3, timingFarads: 1e-9, dischargeOhms: 22 };
    expect(codeOf(() => oscillatorSheet({ ...parts, timingOhms: 0 }))).toBe('design_not_positive');
    expect(codeOf(() => oscillatorSheet({ ...parts, timingFarads: Number.NaN }))).toBe('design_not_positive');
    expect(codeOf(() => oscillatorSheet({ ...parts, dischargeOhms: -1 }))).toBe('design_negative');
    expect(codeOf(() => timingResistor(1e9, 1e-9, 100))).toBe('design_resistor_impossible');
  });

  test('warns outside each range of the part', () => {
    const sheet = oscillatorSheet({ timingOhms: 1e3, timingFarads: 0.1e-9, dischargeOhms: 600 });
    expect(codes(sheet.output.warnings)).toEqual([
      'timing_resistor_outside',
      'timing_capacitor_outside',
      'discharge_resistor_outside',
      'oscillator_outside',
    ]);
  });

  test('a duty that the dead time forbids is named with the most there is', () => {
    const gap = outputGap(50e3, 0.49, 1e-6);
    expect(gap.value).toBe(1e-6);
    expect(gap.warnings.map((each) => each.sentence)).toEqual([
      'The dead time leaves at most 45.0 percent per output; the drive cannot reach this duty.',
    ]);
    expect(codeOf(() => outputGap(50e3, 0.6, 0))).toBe('design_out_of_range');
  });
});

describe('the transformer', () => {
  const input = fc.record({
    volts: between(1, 60),
    coreHertz: between(1e3, 400e3),
    duty: between(0.01, 0.5),
    coreSquareMillimetres: between(10, 500),
  });

  test('whole turns keep the flux at or below the wish, one turn fewer does not', () => {
    fc.assert(
      fc.property(input, between(0.05, 0.3), (core, wish) => {
        const sheet = turnsOfFlux(core, wish);
        expect(sheet.flux.peak.value).toBeLessThanOrEqual(wish * (1 + 1e-9));
        if (sheet.whole.value > 1) expect(fluxOfTurns(core, sheet.whole.value - 1).peak.value).toBeGreaterThan(wish);
        expect(sheet.flux.swing.value).toBeCloseTo(2 * sheet.flux.peak.value, 12);
      }),
    );
  });

  test('warns of loss and of saturation', () => {
    const core = { volts: 12.6, coreHertz: 47e3, duty: 0.5, coreSquareMillimetres: 50 };
    expect(codes(fluxOfTurns(core, 100).peak.warnings)).toEqual([]);
    expect(codes(fluxOfTurns(core, 6).peak.warnings)).toEqual(['flux_high']);
    expect(codes(fluxOfTurns(core, 3).peak.warnings)).toEqual(['flux_saturates']);
    expect(codeOf(() => fluxOfTurns({ ...core, duty: 0.7 }, 3))).toBe('design_out_of_range');
    expect(codeOf(() => secondaryVolts({ volts: 12, primaryTurns: 0, secondaryTurns: 1, duty: 0.2 }))).toBe(
      'design_not_positive',
    );
  });
});

describe('round wire', () => {
  test('has never less resistance at alternating current, and grows towards r / 2δ + 1/4', () => {
    fc.assert(
      fc.property(between(0, 300), (ratio) => {
        const found = skinEffectRatio(ratio);
        expect(found).toBeGreaterThanOrEqual(1);
        if (ratio < 0.5) expect(found).toBeCloseTo(1 + ratio ** 4 / 48, 4);
        if (ratio > 50) expect(Math.abs(found - ratio / 2 - 0.25)).toBeLessThan(0.1 / ratio + 1e-9);
        expect(skinEffectRatio(ratio + 0.5)).toBeGreaterThanOrEqual(found);
      }),
    );
    expect(skinEffectRatio(2e5)).toBe(1e5 + 0.25);
    expect(Math.abs(skinEffectRatio(99_999) - 99_999 / 2 - 0.25)).toBeLessThan(1e-4);
  });

  test('refuses sizes and temperatures that do not exist', () => {
    const wire = { material: copper, lengthMillimetres: 10, diameterMillimetres: 1, celsius: 20 };
    expect(codeOf(() => directResistance({ ...wire, diameterMillimetres: 0 }))).toBe('design_not_positive');
    expect(codeOf(() => directResistance({ ...wire, celsius: -300 }))).toBe('measure_not_a_number');
    expect(codeOf(() => resistivityAt(iron, -200))).toBe('measure_not_a_number');
    expect(codeOf(() => alternatingResistance(wire, 0))).toBe('design_not_positive');
    expect(codeOf(() => strandBundle(1.5, 0.5, 47e3))).toBe('design_not_a_count');
  });
});

describe('a stepped conductor', () => {
  const section = fc.record({
    material: fc.constantFrom(copper, iron),
    lengthMillimetres: between(1, 100),
    diameterMillimetres: between(0.2, 8),
    celsius: between(0, 400),
  });

  test('its drops, heats and shares add up, with and without a frequency', () => {
    fc.assert(
      fc.property(
        fc.array(section, { minLength: 1, maxLength: 6 }),
        between(0.1, 200),
        fc.option(between(50, 200e3), { nil: undefined }),
        (sections, amperes, hertz) => {
          const sheet = steppedConductor(sections, amperes, hertz);
          const total = (of: (index: number) => number) => sections.reduce((sum, _, index) => sum + of(index), 0);
          expect(total((index) => sheet.sections[index]?.share.value ?? Number.NaN)).toBeCloseTo(1, 9);
          expect(sheet.power.value / (amperes * sheet.drop.value)).toBeCloseTo(1, 9);
          expect(sheet.drop.value / (amperes * sheet.resistance.value)).toBeCloseTo(1, 9);
          expect(sheet.sections.every((each) => (each.alternating === undefined) === (hertz === undefined))).toBe(true);
        },
      ),
    );
  });

  test('needs a section, and warns of a stubby one', () => {
    expect(codeOf(() => steppedConductor([], 10))).toBe('design_no_sections');
    const stub = { material: copper, lengthMillimetres: 2, diameterMillimetres: 1, celsius: 20 };
    expect(codes(steppedConductor([stub], 10).power.warnings)).toEqual(['section_short']);
  });
});

describe('pack and switches', () => {
  const pack = {
    nominalVolts: 3.6,
    fullVolts: 4.2,
    ampereHours: 2.5,
    seriesGroups: 3,
    parallelCells: 1,
    ratedAmperes: 20,
  };
  const load = { watts: 15, efficiency: 0.9, usableShare: 0.9, heatingShare: 0.3 };

  test('a pack of three in series: 27 Wh, 12.6 V when full, and 1.5 A at 15 W', () => {
    // Common practice, no source: about 1.5 A from the pack at the duty that heats best.
    expect(packSheet(pack).energy.value).toBe(27);
    expect(packSheet(pack).fullVolts.value).toBeCloseTo(12.6, 12);
    const run = runSheet(pack, load);
    expect(run.packCurrent.value).toBeCloseTo(1.54, 2);
    expect(run.runTime.value).toBeCloseTo((27 * 0.9 * 0.9) / 4.5, 12);
    expect(codes(runSheet({ ...pack, ratedAmperes: 1 }, load).cellCurrent.warnings)).toEqual(['cell_overloaded']);
  });

  test('time and current balance: what leaves the pack is its usable energy', () => {
    fc.assert(
      fc.property(
        between(1, 200),
        between(0.3, 1),
        between(0.1, 1),
        fc.integer({ min: 1, max: 4 }),
        (watts, efficiency, heatingShare, parallelCells) => {
          const wide = { ...pack, parallelCells };
          const run = runSheet(wide, { ...load, watts, efficiency, heatingShare });
          const taken = run.packCurrent.value * 10.8 * heatingShare * run.runTime.value;
          expect(taken / (packSheet(wide).energy.value * load.usableShare)).toBeCloseTo(1, 9);
          expect(run.cellCurrent.value * parallelCells).toBeCloseTo(run.packCurrent.value, 9);
        },
      ),
    );
    expect(codeOf(() => runSheet(pack, { ...load, efficiency: 1.1 }))).toBe('design_out_of_range');
    expect(codeOf(() => packSheet({ ...pack, seriesGroups: 0 }))).toBe('design_not_a_count');
  });

  test('30 V is the least for three cells in series, and 40 A is ample at 1.5 A from the pack', () => {
    // Common practice, no source: transistors of at least 30 V and more than 40 A.
    const input = {
      packFullVolts: 12.6,
      spikeShare: 0.19,
      packAmperes: 1.5,
      duty: 0.25,
      ratedVolts: 30,
      ratedAmperes: 40,
    };
    const sheet = switchRating(input);
    expect(sheet.stress.value).toBeCloseTo(29.99, 2);
    expect(sheet.peak.value).toBe(3);
    expect([...sheet.stress.warnings, ...sheet.peak.warnings]).toEqual([]);
    expect(codes(switchRating({ ...input, ratedVolts: 25 }).voltageMargin.warnings)).toEqual(['voltage_margin']);
    expect(codes(switchRating({ ...input, ratedAmperes: 5 }).currentMargin.warnings)).toEqual(['current_margin']);
    expect(codeOf(() => switchRating({ ...input, duty: 0 }))).toBe('design_not_positive');
  });
});

test('each warning is one plain sentence', () => {
  for (const sentence of Object.values(designWarningSentences)) expect(sentence).toMatch(/^[A-Z][^!]*\.$/);
});
