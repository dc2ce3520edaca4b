import { ArithmeticError } from '../errors/arithmetic-error.js';
import { type ConductorMaterial, resistivityAt } from './conductor-material.js';
import { Decimal, decimal, type DecimalInput } from './decimal.js';

/** A round wire, or several alike in parallel. */
export interface Wire {
  readonly material: ConductorMaterial;
  /** Bare diameter of one strand, mm. */
  readonly diameterMillimetres: DecimalInput;
  /** How many strands lie side by side; 1 for a single wire. */
  readonly strands: number;
}

/** π to 50 digits. */
const pi = new Decimal('3.14159265358979323846264338327950288419716939937511');

/**
 * Conductor area of all strands.
 *
 * @param wire the wire
 * @returns mm²
 * @throws ArithmeticError `measure_wire_size`; `measure_not_a_number`, `measure_not_exact`
 * @source geometry, n π d² / 4.
 */
export function crossSection(wire: Wire): Decimal {
  const diameter = decimal(wire.diameterMillimetres);
  if (diameter.lessThanOrEqualTo(0) || !Number.isSafeInteger(wire.strands) || wire.strands < 1) {
    throw new ArithmeticError('measure_wire_size', { diameter: diameter.toFixed(), strands: wire.strands });
  }
  return pi.times(diameter.pow(2)).times(wire.strands).div(4);
}

/**
 * Mass of a metre of bare wire.
 *
 * @param wire the wire
 * @returns grams per metre
 * @throws ArithmeticError as {@link crossSection}
 * @source density × area; copper 8.89 g/cm³ by IEC 60028:1925. Makers reckon with up to 8.96, and enamel adds some
 *   percent in fine wire; a reel that is weighed differs by that much.
 */
export function gramsPerMetre(wire: Wire): Decimal {
  // 1 mm² × 1 m = 1 cm³.
  return crossSection(wire).times(String(wire.material.density));
}

/**
 * Length of wire in a mass.
 *
 * @param grams bare conductor, without reel and tare
 * @param wire the wire
 * @returns metres
 * @throws ArithmeticError as {@link crossSection}
 */
export function metresOfMass(grams: DecimalInput, wire: Wire): Decimal {
  return decimal(grams).div(gramsPerMetre(wire)).toSignificantDigits(40);
}

/**
 * Mass of a length of wire.
 *
 * @param metres length
 * @param wire the wire
 * @returns grams
 * @throws ArithmeticError as {@link crossSection}
 */
export function gramsOfLength(metres: DecimalInput, wire: Wire): Decimal {
  return decimal(metres).times(gramsPerMetre(wire)).toSignificantDigits(40);
}

/**
 * Direct-current resistance of a metre of wire.
 *
 * @param wire the wire
 * @param celsius temperature, °C
 * @returns Ω per metre
 * @throws ArithmeticError `measure_not_a_number` for a temperature outside the straight line; as {@link crossSection}
 * @source resistivity ÷ area; copper 1/58 Ω·mm²/m at 20 °C by IEC 60028:1925.
 */
export function ohmsPerMetre(wire: Wire, celsius: number): number {
  return resistivityAt(wire.material, celsius) / crossSection(wire).toNumber();
}

/**
 * Length of a wire by its measured resistance: how much is left on a reel.
 *
 * @param ohms measured between the ends, Ω, direct current
 * @param wire the wire
 * @param celsius temperature of the wire, °C
 * @returns metres
 * @throws ArithmeticError as {@link ohmsPerMetre}
 */
export function metresOfResistance(ohms: number, wire: Wire, celsius: number): number {
  return ohms / ohmsPerMetre(wire, celsius);
}

/**
 * The single wire with the same conductor area.
 *
 * @param wire strands
 * @returns diameter in mm, d √n
 * @throws ArithmeticError as {@link crossSection}
 */
export function equalSingleDiameter(wire: Wire): Decimal {
  crossSection(wire);
  return decimal(wire.diameterMillimetres).times(new Decimal(wire.strands).sqrt()).toSignificantDigits(40);
}

/**
 * The diameters of all strands added up: what is said at the bench, not what carries the current.
 *
 * @param wire strands
 * @returns mm, n d
 * @throws ArithmeticError as {@link crossSection}
 * @source common practice, no source.
 */
export function addedDiameters(wire: Wire): Decimal {
  crossSection(wire);
  return decimal(wire.diameterMillimetres).times(wire.strands);
}

/**
 * How many strands have at least a given area together.
 *
 * @param squareMillimetres wanted conductor area, mm²
 * @param wire material and diameter of one strand (its own strands do not count)
 * @returns the smallest sufficient number, at least 1
 * @throws ArithmeticError as {@link crossSection}
 */
export function strandsForArea(squareMillimetres: DecimalInput, wire: Omit<Wire, 'strands'>): number {
  const one = crossSection({ ...wire, strands: 1 });
  return Math.max(1, decimal(squareMillimetres).div(one).toSignificantDigits(30).ceil().toNumber());
}

/**
 * Diameter of a wire by American gauge number.
 *
 * @param gauge from −3 (written 4/0) to 50
 * @returns bare diameter, mm
 * @source ASTM B258-18: 0.127 mm × 92^((36 − n) / 39).
 */
export function gaugeDiameter(gauge: number): number {
  return 0.127 * 92 ** ((36 - gauge) / 39);
}
