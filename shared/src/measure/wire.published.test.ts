import { describe, expect, it } from '@jest/globals';
import { attempt } from '../errors/arithmetic-error.js';
import { copper } from './conductor-material.js';
import { enamelledDiameter, type EnamelGrade } from './enamel.js';
import {
  addedDiameters,
  crossSection,
  equalSingleDiameter,
  gaugeDiameter,
  gramsOfLength,
  gramsPerMetre,
  metresOfMass,
  metresOfResistance,
  ohmsPerMetre,
  strandsForArea,
  type Wire,
} from './wire.js';

const wire = (diameterMillimetres: string, strands = 1): Wire => ({ material: copper, diameterMillimetres, strands });
const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('round copper wire', () => {
  // ASTM B258 gauge formula with the resistivity and density of IEC 60028:1925; Ω/km also against handbook figures.
  it.each([
    [18, 1.02369, 0.82305, 20.948, 7.3169, 20.95],
    [20, 0.81182, 0.51762, 33.309, 4.6016, 33.31],
    [24, 0.51056, 0.20473, 84.215, 1.8201, 84.22],
    [30, 0.25464, 0.05093, 338.557, 0.4527, 338.6],
  ])('of gauge %i', (gauge, diameter, area, ohmsPerKilometre, kilogramsPerKilometre, handbook) => {
    const own = gaugeDiameter(gauge);
    const single = wire(own.toFixed(12));
    expect(own).toBeCloseTo(diameter, 5);
    expect(crossSection(single).toNumber()).toBeCloseTo(area, 5);
    expect(ohmsPerMetre(single, 20) * 1000).toBeCloseTo(ohmsPerKilometre, 2);
    expect(gramsPerMetre(single).toNumber()).toBeCloseTo(kilogramsPerKilometre, 4);
    expect(Math.abs(ohmsPerMetre(single, 20) * 1000 - handbook) / handbook).toBeLessThan(0.002);
  });

  // IEC 60028:1925: 1/58 Ω·mm²/m, 0.00393 per kelvin.
  it.each([
    [20, 0.0878096],
    [75, 0.1067897],
    [100, 0.115417],
    [150, 0.1326716],
  ])('of 0.5 mm at %i °C', (celsius, ohms) => {
    expect(ohmsPerMetre(wire('0.5'), celsius)).toBeCloseTo(ohms, 6);
  });

  // Geometry with the density 8.89 g/cm³ of IEC 60028:1925.
  it.each([
    ['0.5', 1.74555, 572.886],
    ['1.0', 6.98219, 143.222],
    ['1.5', 15.70993, 63.654],
  ])('of %s mm weighs %f g/m and is %f m/kg long', (diameter, grams, metres) => {
    expect(gramsPerMetre(wire(diameter)).toNumber()).toBeCloseTo(grams, 4);
    expect(metresOfMass(1000, wire(diameter)).toNumber()).toBeCloseTo(metres, 3);
  });

  // Geometry and IEC 60028:1925; overall diameters by IEC 60317-0-1, from memory.
  it('of twelve strands of 0.4 mm', () => {
    const bundle = wire('0.4', 12);
    expect(crossSection(bundle).toNumber()).toBeCloseTo(1.507964, 6);
    expect(equalSingleDiameter(bundle).toNumber()).toBeCloseTo(1.385641, 6);
    expect(ohmsPerMetre(bundle, 20)).toBeCloseTo(0.0114335, 7);
    expect(gramsPerMetre(bundle).toNumber()).toBeCloseTo(13.4058, 4);
    expect(enamelledDiameter('0.4', 1).largest.toFixed(3)).toBe('0.439');
    expect(enamelledDiameter('0.4', 2).largest.toFixed(3)).toBe('0.459');
  });

  // Common practice, no source: eight strands of 0.5 mm are said to be "4 mm"; one wire of equal area has 1.41 mm.
  it('of eight strands of 0.5 mm, as it is said and as it is', () => {
    expect(addedDiameters(wire('0.5', 8)).toFixed()).toBe('4');
    expect(equalSingleDiameter(wire('0.5', 8)).toFixed(2)).toBe('1.41');
  });

  it('goes from length to mass and back, and from resistance to length', () => {
    expect(metresOfMass(gramsOfLength('12.5', wire('0.63')), wire('0.63')).toFixed()).toBe('12.5');
    expect(metresOfResistance(ohmsPerMetre(wire('0.5'), 25) * 40, wire('0.5'), 25)).toBeCloseTo(40, 10);
  });

  it('needs so many strands for an area', () => {
    expect(strandsForArea(crossSection(wire('0.5', 8)), { material: copper, diameterMillimetres: '0.5' })).toBe(8);
    expect(strandsForArea('1.58', { material: copper, diameterMillimetres: '0.5' })).toBe(9);
    expect(strandsForArea(0, { material: copper, diameterMillimetres: '0.5' })).toBe(1);
  });

  it.each([
    ['0', 1],
    ['-1', 1],
    ['0.5', 0],
    ['0.5', 1.5],
  ])('does not exist with %s mm and %d strands', (diameter, strands) => {
    expect(codeOf(() => gramsPerMetre(wire(diameter, strands)))).toBe('measure_wire_size');
  });
});

describe('enamelled wire', () => {
  // A maker's table quoted in the trade press gives 0.117 mm for 0.100 mm in grade 1; the rest of IEC 60317-0-1 from memory.
  it.each<[string, EnamelGrade, string]>([
    ['0.1', 1, '0.117'],
    ['0.500', 1, '0.544'],
    ['0.5', 2, '0.566'],
    ['1', 3, '1.124'],
  ])('of %s mm in grade %i is at most %s mm thick', (diameter, grade, largest) => {
    expect(enamelledDiameter(diameter, grade)).toMatchObject({ standard: true });
    expect(enamelledDiameter(diameter, grade).largest.toFixed(3)).toBe(largest);
  });

  it('between two diameters takes the enamel of the thicker one', () => {
    const between = enamelledDiameter('0.47', 1);
    expect(between.standard).toBe(false);
    expect(between.largest.toFixed(3)).toBe('0.514');
  });

  it('grows with diameter and grade', () => {
    const steps = Array.from({ length: 496 }, (_, index) => String((index + 5) / 100)).filter(
      (text) => Number(text) <= 5,
    );
    for (const grade of [1, 2, 3] as const) {
      const thickness = steps.map((diameter) => enamelledDiameter(diameter, grade).largest.toNumber());
      expect(thickness).toEqual([...thickness].sort((one, other) => one - other));
      if (grade > 1) {
        steps.forEach((diameter, index) =>
          expect(enamelledDiameter(diameter, (grade - 1) as EnamelGrade).largest.toNumber()).toBeLessThan(
            thickness[index] ?? 0,
          ),
        );
      }
    }
  });

  it.each(['0.04', '5.01', '0', '-1'])('is not in the table at %s mm', (diameter) => {
    expect(codeOf(() => enamelledDiameter(diameter, 1))).toBe('measure_enamel_range');
  });
});
