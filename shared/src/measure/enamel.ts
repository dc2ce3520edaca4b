import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from './decimal.js';

/** Thickness of the enamel, 1 the thinnest. */
export type EnamelGrade = 1 | 2 | 3;

/**
 * Nominal conductor diameter and largest overall diameter in grade 1, 2 and 3, mm.
 * @source IEC 60317-0-1:2013, table 1, from memory.
 */
const overallDiameters: readonly (readonly [string, string, string, string])[] = [
  ['0.050', '0.060', '0.066', '0.070'],
  ['0.063', '0.076', '0.083', '0.088'],
  ['0.071', '0.084', '0.091', '0.097'],
  ['0.080', '0.094', '0.101', '0.108'],
  ['0.090', '0.105', '0.113', '0.120'],
  ['0.100', '0.117', '0.125', '0.132'],
  ['0.112', '0.130', '0.139', '0.147'],
  ['0.125', '0.144', '0.154', '0.163'],
  ['0.140', '0.160', '0.171', '0.181'],
  ['0.160', '0.182', '0.194', '0.205'],
  ['0.180', '0.204', '0.217', '0.229'],
  ['0.200', '0.226', '0.239', '0.252'],
  ['0.224', '0.252', '0.266', '0.280'],
  ['0.250', '0.281', '0.297', '0.312'],
  ['0.280', '0.312', '0.329', '0.345'],
  ['0.315', '0.349', '0.367', '0.384'],
  ['0.355', '0.392', '0.411', '0.428'],
  ['0.400', '0.439', '0.459', '0.478'],
  ['0.450', '0.491', '0.513', '0.533'],
  ['0.500', '0.544', '0.566', '0.587'],
  ['0.560', '0.606', '0.630', '0.653'],
  ['0.630', '0.679', '0.704', '0.728'],
  ['0.710', '0.762', '0.789', '0.814'],
  ['0.800', '0.855', '0.884', '0.911'],
  ['0.900', '0.959', '0.989', '1.018'],
  ['1.000', '1.062', '1.094', '1.124'],
  ['1.120', '1.184', '1.217', '1.248'],
  ['1.250', '1.316', '1.349', '1.381'],
  ['1.400', '1.468', '1.502', '1.535'],
  ['1.600', '1.670', '1.706', '1.740'],
  ['1.800', '1.872', '1.909', '1.944'],
  ['2.000', '2.074', '2.112', '2.148'],
  ['2.240', '2.316', '2.355', '2.392'],
  ['2.500', '2.578', '2.618', '2.656'],
  ['2.800', '2.880', '2.922', '2.961'],
  ['3.150', '3.233', '3.276', '3.316'],
  ['3.550', '3.635', '3.679', '3.721'],
  ['4.000', '4.088', '4.133', '4.176'],
  ['4.500', '4.591', '4.637', '4.681'],
  ['5.000', '5.093', '5.141', '5.186'],
];

/** Overall diameter of an enamelled wire. */
export interface EnamelledDiameter {
  /** Largest overall diameter, mm. */
  readonly largest: Decimal;
  /** Whether the conductor's diameter stands in the table; else the enamel of the next thicker one was taken. */
  readonly standard: boolean;
}

/**
 * Largest overall diameter of an enamelled round copper wire, for reckoning whether a winding fits.
 *
 * @param diameterMillimetres bare nominal diameter, 0.05 to 5 mm
 * @param grade 1, 2 or 3
 * @returns mm; between two diameters of the table with the enamel of the thicker one
 * @throws ArithmeticError `measure_enamel_range`; `measure_not_a_number`, `measure_not_exact`
 * @source IEC 60317-0-1:2013, table 1 and 4.3, from memory.
 */
export function enamelledDiameter(diameterMillimetres: DecimalInput, grade: EnamelGrade): EnamelledDiameter {
  const diameter = decimal(diameterMillimetres);
  const first = overallDiameters[0]?.[0] ?? '0';
  const row = overallDiameters.find(([nominal]) => diameter.lessThanOrEqualTo(nominal));
  if (!row || diameter.lessThan(first)) {
    throw new ArithmeticError('measure_enamel_range', { diameter: diameter.toFixed(), grade });
  }
  const enamel = new Decimal(row[grade]).minus(row[0]);
  return { largest: diameter.plus(enamel), standard: diameter.equals(row[0]) };
}
