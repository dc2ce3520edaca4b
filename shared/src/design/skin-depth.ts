import { type ConductorMaterial, resistivityAt } from '../measure/conductor-material.js';
import { type DesignFigure, type DesignMethod, requirePositive, warn, warnOutside } from './design-figure.js';

/** Permeability of vacuum in H/m. */
const vacuumPermeability = 4e-7 * Math.PI;

const skinMethod: DesignMethod = {
  name: 'Skin depth',
  formula: 'δ = √(ρ / (π f µ))',
  source: 'classical electrodynamics, for example NBS Circular 74',
  validRange: 'constant permeability; for iron only an order of size',
};

/**
 * Warnings that any figure of a conductor at a temperature carries.
 *
 * @param material of the conductor
 * @param celsius its temperature
 * @param hertz frequency, or 0 for direct current
 * @returns none, or a temperature outside the straight line, or iron at alternating current
 */
export function materialWarnings(
  material: ConductorMaterial,
  celsius: number,
  hertz: number,
): DesignFigure['warnings'] {
  const { linearFrom, linearTo } = material;
  return [
    ...warnOutside('temperature_outside', celsius, linearFrom, linearTo, {
      low: String(linearFrom),
      high: String(linearTo),
    }),
    ...(hertz > 0 && material.relativePermeability > 1 ? [warn('ferromagnetic')] : []),
  ];
}

/**
 * Depth at which the current density has fallen to 1/e.
 *
 * @param material copper or iron
 * @param hertz frequency (Hz)
 * @param celsius temperature (°C)
 * @returns depth (mm)
 * @throws ArithmeticError `design_not_positive`, `measure_not_a_number`
 * @source classical electrodynamics
 */
export function skinDepth(material: ConductorMaterial, hertz: number, celsius = 20): DesignFigure {
  requirePositive('frequency', hertz);
  // Ω·mm²/m is 1e-6 Ω·m.
  const ohmMetres = resistivityAt(material, celsius) * 1e-6;
  const permeability = vacuumPermeability * material.relativePermeability;
  return {
    value: Math.sqrt(ohmMetres / (Math.PI * hertz * permeability)) * 1e3,
    unit: 'mm',
    method: skinMethod,
    warnings: materialWarnings(material, celsius, hertz),
  };
}
