import { ArithmeticError } from '../errors/arithmetic-error.js';

/** What a conductor is made of. */
export interface ConductorMaterial {
  readonly name: 'copper' | 'iron';
  /** Resistivity at 20 °C in Ω·mm²/m, which is the same as µΩ·m. */
  readonly resistivity: number;
  /** Change of resistance per kelvin, as a share of that at 20 °C. */
  readonly temperatureCoefficient: number;
  /** Grams per cubic centimetre at 20 °C. */
  readonly density: number;
  /** Relative permeability; 1 for all that are not ferromagnetic. */
  readonly relativePermeability: number;
  /** Temperatures in °C between which the straight line is close. */
  readonly linearFrom: number;
  readonly linearTo: number;
  readonly source: string;
}

/** Annealed copper of 100 % conductivity. */
export const copper: ConductorMaterial = {
  name: 'copper',
  resistivity: 1 / 58,
  temperatureCoefficient: 0.00393,
  density: 8.89,
  relativePermeability: 1,
  linearFrom: -50,
  linearTo: 200,
  source: 'IEC 60028:1925; NBS Circular 31',
};

/**
 * Plain iron. Nominal values only: purity, strain and field change them by tens of percent, and the permeability falls
 * to 1 at 770 °C.
 */
export const iron: ConductorMaterial = {
  name: 'iron',
  resistivity: 0.0971,
  temperatureCoefficient: 0.005,
  density: 7.87,
  relativePermeability: 100,
  linearFrom: 0,
  linearTo: 100,
  source: 'handbook resistivity of iron at 20 °C; coefficient and permeability nominal, common practice, no source',
};

const coldest = -273.15;

/**
 * Resistivity at a temperature, along the straight line through 20 °C.
 *
 * @param material the conductor
 * @param celsius temperature in °C, above absolute zero
 * @returns Ω·mm²/m
 * @throws ArithmeticError `measure_not_a_number` for a temperature that does not exist or lies so far below 20 °C that
 * the line gives no positive resistivity
 * @source IEC 60028:1925, clause 3 (form of the line)
 */
export function resistivityAt(material: ConductorMaterial, celsius: number): number {
  const factor = 1 + material.temperatureCoefficient * (celsius - 20);
  if (!(celsius > coldest) || !Number.isFinite(celsius) || factor <= 0) {
    throw new ArithmeticError('measure_not_a_number', { value: `${celsius} °C` });
  }
  return material.resistivity * factor;
}
