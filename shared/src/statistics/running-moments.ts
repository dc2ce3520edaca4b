/** Count, mean and sum of squared deviations so far; small enough to keep beside a ledger or a stream. */
export interface RunningMoments {
  readonly count: number;
  readonly mean: number;
  readonly squaredDeviations: number;
}

export const noMoments: RunningMoments = { count: 0, mean: 0, squaredDeviations: 0 };

/**
 * Takes one more value in without keeping the others.
 *
 * @param moments so far
 * @param value finite, in the same unit
 * @returns the moments with it
 * @source B. P. Welford, "Note on a method for calculating corrected sums of squares and products", Technometrics 4 (1962)
 */
export function withValue(moments: RunningMoments, value: number): RunningMoments {
  const count = moments.count + 1;
  const before = value - moments.mean;
  const mean = moments.mean + before / count;
  return { count, mean, squaredDeviations: moments.squaredDeviations + before * (value - mean) };
}

/**
 * Joins the moments of two samples.
 *
 * @param left moments of one sample
 * @param right moments of the other, in the same unit
 * @returns the moments of both together
 * @source T. Chan, G. Golub, R. LeVeque, "Updating formulae and a pairwise algorithm" (1979)
 */
export function joinMoments(left: RunningMoments, right: RunningMoments): RunningMoments {
  const count = left.count + right.count;
  if (count === 0) return noMoments;
  const apart = right.mean - left.mean;
  return {
    count,
    mean: left.mean + (apart * right.count) / count,
    squaredDeviations:
      left.squaredDeviations + right.squaredDeviations + (apart * apart * left.count * right.count) / count,
  };
}

/**
 * Sample standard deviation of what was taken in.
 *
 * @param moments of at least two values
 * @returns the standard deviation, or undefined below two values
 */
export const runningDeviation = (moments: RunningMoments): number | undefined =>
  moments.count < 2 ? undefined : Math.sqrt(moments.squaredDeviations / (moments.count - 1));
