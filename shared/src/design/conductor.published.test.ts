import { describe, expect, test } from '@jest/globals';
import { copper, iron, resistivityAt } from '../measure/conductor-material.js';
import { alternatingResistance, directResistance, skinEffectRatio } from './round-wire-resistance.js';
import { skinDepth } from './skin-depth.js';
import { steppedConductor } from './stepped-conductor.js';
import { strandBundle } from './strand-bundle.js';

describe('copper', () => {
  test('constants of IEC 60028:1925', () => {
    expect(copper.resistivity).toBeCloseTo(0.0172413793, 10);
    expect(copper.resistivity * copper.density).toBeCloseTo(0.153276, 5);
    expect(resistivityAt(copper, 100) / copper.resistivity).toBeCloseTo(1.3144, 6);
  });

  // IEC 60028 values: one metre of 0.5 mm wire.
  test.each([
    [20, 0.0878096],
    [75, 0.1067897],
    [100, 0.115417],
    [150, 0.1326716],
  ])('0.5 mm by 1 m at %d °C', (celsius, ohms) => {
    const wire = { material: copper, lengthMillimetres: 1000, diameterMillimetres: 0.5, celsius };
    expect(directResistance(wire).value).toBeCloseTo(ohms, 6);
  });

  // ASTM B258 diameters; handbook resistance per kilometre at 20 °C to 0.2 percent.
  test.each([
    [1.02369, 20.95],
    [0.81182, 33.31],
    [0.51056, 84.22],
    [0.25464, 338.6],
  ])('wire of %d mm', (diameterMillimetres, ohms) => {
    const wire = { material: copper, lengthMillimetres: 1e6, diameterMillimetres, celsius: 20 };
    expect(Math.abs(directResistance(wire).value / ohms - 1)).toBeLessThan(0.002);
  });

  // Classical formula with IEC 60028; 0.209 mm at 100 kHz and 9.35 mm at 50 Hz stand in many handbooks.
  test.each([
    [60e3, 0.26979],
    [100e3, 0.20898],
    [50, 9.3459],
  ])('skin depth at %d Hz', (hertz, millimetres) => {
    expect(skinDepth(copper, hertz).value).toBeCloseTo(millimetres, 4);
  });
});

describe('skin effect of a round wire', () => {
  // NBS Circular 74 (1937), table of R/R0 against x = r √2 / δ, from memory; SciPy's Bessel functions give the rest.
  test.each([
    [1, 1.005, 1.0051867313921385],
    [2, 1.078, 1.0781587461306228],
    [3, 1.318, 1.318094818293714],
    [4, 1.678, 1.6778688630392353],
    [5, 2.043, 2.0427250624562876],
    [10, 3.799, 3.798576052182255],
    [20, 7.328, 7.327672350503167],
  ])('x = %d', (x, printed, exact) => {
    expect(Math.abs(skinEffectRatio(x / Math.SQRT2) - printed)).toBeLessThan(0.0006);
    expect(skinEffectRatio(x / Math.SQRT2)).toBeCloseTo(exact, 12);
  });
});

describe('strands', () => {
  test('twelve of 0.4 mm', () => {
    // Geometry; IEC 60028.
    const bundle = strandBundle(12, 0.4, 60e3);
    expect(bundle.area.value).toBeCloseTo(1.507964, 6);
    expect(bundle.equalWire.value).toBeCloseTo(1.385641, 6);
  });

  test('eight of 0.5 mm are added up to 4 mm, and carry like one wire of 1.41 mm', () => {
    // Common practice, no source.
    const bundle = strandBundle(8, 0.5, 47e3);
    expect(bundle.addedDiameters.value).toBe(4);
    expect(bundle.equalWire.value).toBeCloseTo(1.41, 2);
    expect(bundle.area.warnings.map((each) => each.code)).toEqual(['proximity_ignored']);
    expect(strandBundle(1, 1.41, 47e3).area.warnings.map((each) => each.code)).toContain('strand_too_thick');
  });
});

describe('a tip', () => {
  const hairpin = { lengthMillimetres: 45, diameterMillimetres: 1 };

  test('of 45 mm copper at 60 A direct current', () => {
    // IEC 60028; at 350 °C the straight line is an extrapolation, and the sheet says so.
    const cold = steppedConductor([{ ...hairpin, material: copper, celsius: 20 }], 60);
    const hot = steppedConductor([{ ...hairpin, material: copper, celsius: 350 }], 60);
    expect(cold.resistance.value * 1e3).toBeCloseTo(0.98786, 4);
    expect(hot.resistance.value * 1e3).toBeCloseTo(2.26901, 4);
    expect(cold.power.value).toBeCloseTo(3.5563, 4);
    expect(hot.power.value).toBeCloseTo(8.1684, 4);
    expect(cold.drop.value * 1e3).toBeCloseTo(59.271, 2);
    expect(hot.power.warnings.map((each) => each.code)).toEqual(['temperature_outside']);
  });

  test('of iron: 5.6 times the resistance at direct current, many times more at 60 kHz', () => {
    // Handbook resistivity 9.71e-8 Ω·m; permeability nominal. Skin depth 0.064 mm at 60 kHz.
    const wire = { ...hairpin, material: iron, celsius: 20 };
    expect(directResistance(wire).value * 1e3).toBeCloseTo(5.56342, 4);
    expect(directResistance({ ...wire, celsius: 350 }).value * 1e3).toBeCloseTo(14.74306, 4);
    expect(directResistance(wire).value / directResistance({ ...wire, material: copper }).value).toBeCloseTo(5.6318, 4);
    expect(skinDepth(iron, 60e3).value).toBeCloseTo(0.064, 3);
    const alternating = alternatingResistance(wire, 60e3);
    expect(alternating.value / directResistance(wire).value).toBeGreaterThan(3.5);
    expect(alternating.warnings.map((each) => each.code)).toContain('ferromagnetic');
  });

  test('of iron heats more than one of copper, and a thinned end heats most', () => {
    // Common practice, no source: tips of 1.5 to 2 mm copper, iron heats more, a thinned end heats most.
    for (const diameterMillimetres of [1.5, 2]) {
      const leg = { lengthMillimetres: 20, diameterMillimetres, celsius: 20 };
      const end = { ...leg, lengthMillimetres: 6, diameterMillimetres: diameterMillimetres * 0.6 };
      const of = (material: typeof copper) =>
        steppedConductor(
          [
            { ...leg, material },
            { ...end, material },
            { ...leg, material },
          ],
          80,
          47e3,
        );
      expect(of(iron).power.value).toBeGreaterThan(of(copper).power.value);
      const perMillimetre = of(copper).sections.map((section, index) => section.power.value / (index === 1 ? 6 : 20));
      expect(Math.max(...perMillimetre)).toBe(perMillimetre[1]);
    }
  });
});
