import type { ConductorMaterial } from '../measure/conductor-material.js';
import { ohmsPerMetre } from '../measure/wire.js';
import { type DesignFigure, type DesignMethod, requireNotNegative, requirePositive, warn } from './design-figure.js';
import { materialWarnings, skinDepth } from './skin-depth.js';

export interface RoundWire {
  readonly material: ConductorMaterial;
  readonly lengthMillimetres: number;
  readonly diameterMillimetres: number;
  readonly celsius: number;
}

const directMethod: DesignMethod = {
  name: 'Resistance at direct current',
  formula: 'R = ρ L / A, ρ along a straight line over temperature',
  source: 'IEC 60028:1925 for copper; nominal handbook values for iron',
  validRange: 'even current over the cross-section; copper −50 °C to 200 °C, iron 0 °C to 100 °C',
};
const alternatingMethod: DesignMethod = {
  name: 'Resistance at alternating current, approximated by an isolated straight round wire',
  formula: 'R = R_dc · Re(x J₀(x) / (2 J₁(x))), x = (1 − j) r / δ',
  source: 'NBS Circular 74 (1937), section on skin effect; the ratio of Bessel functions by its continued fraction',
  validRange: 'straight wire far from others, constant permeability; a hairpin has more',
};

/**
 * How much larger the resistance of a round wire is at alternating than at direct current.
 *
 * J₁(x)/J₀(x) = x/(2 − x²/(4 − x²/(6 − …))) converges for every x, so no table or series switch is needed.
 *
 * @param radiusOverSkin radius divided by skin depth, from 0 to 100,000
 * @returns ratio of at least 1
 * @throws ArithmeticError `design_negative`
 * @source NBS Circular 74 (1937); Abramowitz, Stegun 9.1.73 (continued fraction)
 */
export function skinEffectRatio(radiusOverSkin: number): number {
  requireNotNegative('radius over skin depth', radiusOverSkin);
  // Far in, the middle carries nothing: R grows with the radius, and the next terms are below 1e-9.
  if (radiusOverSkin > 1e5) return radiusOverSkin / 2 + 0.25;
  // x² = −2j (r/δ)²: purely imaginary.
  const square = -2 * radiusOverSkin * radiusOverSkin;
  const terms = Math.ceil(2 * radiusOverSkin) + 40;
  let real = 2 * terms;
  let imaginary = 0;
  for (let n = terms - 1; n >= 2; n -= 1) {
    const size = real * real + imaginary * imaginary;
    // j·square / (real + j·imaginary)
    const quotientReal = (square * imaginary) / size;
    const quotientImaginary = (square * real) / size;
    real = 2 * n - quotientReal;
    imaginary = -quotientImaginary;
  }
  const size = real * real + imaginary * imaginary;
  return 1 - (square * imaginary) / size / 2;
}

/**
 * A diameter as the wire measures take it: text in plain notation, to a billionth of a micrometre.
 *
 * @param millimetres positive
 * @returns for example "0.5"
 */
export const diameterText = (millimetres: number): string => millimetres.toFixed(12);

function checkWire(wire: RoundWire): void {
  requirePositive('length', wire.lengthMillimetres);
  requirePositive('diameter', wire.diameterMillimetres);
}

/**
 * Resistance of a round wire at direct current.
 *
 * @param wire material, length (mm), diameter (mm), temperature (°C)
 * @returns resistance (Ω)
 * @throws ArithmeticError `design_not_positive`, `measure_not_a_number`
 * @source IEC 60028:1925
 */
export function directResistance(wire: RoundWire): DesignFigure {
  checkWire(wire);
  const { material, celsius } = wire;
  const one = { material, diameterMillimetres: diameterText(wire.diameterMillimetres), strands: 1 };
  return {
    value: ohmsPerMetre(one, celsius) * wire.lengthMillimetres * 1e-3,
    unit: 'Ω',
    method: directMethod,
    warnings: materialWarnings(wire.material, wire.celsius, 0),
  };
}

/**
 * Resistance of a round wire at alternating current, by the approximation of an isolated straight wire.
 *
 * @param wire material, length (mm), diameter (mm), temperature (°C)
 * @param hertz frequency of the current (Hz): of the drive, not of its harmonics
 * @returns resistance (Ω)
 * @throws ArithmeticError `design_not_positive`, `measure_not_a_number`
 * @source NBS Circular 74 (1937)
 */
export function alternatingResistance(wire: RoundWire, hertz: number): DesignFigure {
  const direct = directResistance(wire);
  const skin = skinDepth(wire.material, hertz, wire.celsius);
  return {
    value: direct.value * skinEffectRatio(wire.diameterMillimetres / 2 / skin.value),
    unit: 'Ω',
    method: alternatingMethod,
    warnings: [...skin.warnings, warn('proximity_ignored')],
  };
}
