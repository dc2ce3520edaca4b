import { ArithmeticError } from '../errors/arithmetic-error.js';

export interface ControlConstants {
  /** Mean range of n standard normal values. */
  readonly d2: number;
  /** Standard deviation of that range. */
  readonly d3: number;
  /** Limits of a chart of means lie A2 mean ranges from the centre. */
  readonly A2: number;
  /** Limits of a chart of ranges, as multiples of the mean range. */
  readonly D3: number;
  readonly D4: number;
}

/** Mean and standard deviation of the range of n standard normal values, n from 2 to 25, to six places. */
const rangeMoments: readonly (readonly [d2: number, d3: number])[] = [
  [1.128379, 0.852502],
  [1.692569, 0.888368],
  [2.058751, 0.879808],
  [2.325929, 0.864082],
  [2.534413, 0.84804],
  [2.704357, 0.833205],
  [2.847201, 0.819831],
  [2.970026, 0.807834],
  [3.077505, 0.797051],
  [3.172873, 0.787315],
  [3.258455, 0.778478],
  [3.33598, 0.770416],
  [3.406763, 0.763023],
  [3.471827, 0.756211],
  [3.531983, 0.749908],
  [3.587884, 0.744052],
  [3.640064, 0.738591],
  [3.688963, 0.733481],
  [3.73495, 0.728686],
  [3.778336, 0.724173],
  [3.819385, 0.719915],
  [3.858323, 0.715887],
  [3.895348, 0.712068],
  [3.930629, 0.708441],
];

/**
 * Constants of Shewhart charts for subgroups of one size.
 *
 * Worked out from the range distribution, so they differ from printed tables in the last digit these round.
 *
 * @param size values in each subgroup, 2 to 25
 * @returns d2, d3, A2, D3 and D4, without unit
 * @throws ArithmeticError `statistics_out_of_range`
 * @source NIST/SEMATECH e-Handbook 6.3.2.1; d2 and d3 by integration of the range distribution
 */
export function controlConstants(size: number): ControlConstants {
  const moments = rangeMoments[size - 2];
  if (moments === undefined) {
    throw new ArithmeticError('statistics_out_of_range', {
      name: 'subgroup size',
      low: 2,
      high: 25,
      value: String(size),
    });
  }
  const [d2, d3] = moments;
  return { d2, d3, A2: 3 / (d2 * Math.sqrt(size)), D3: Math.max(0, 1 - (3 * d3) / d2), D4: 1 + (3 * d3) / d2 };
}
