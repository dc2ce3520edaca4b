/** Centre line and control limits in the unit of what is charted. */
export interface ControlLimits {
  readonly centre: number;
  readonly lower: number;
  readonly upper: number;
}

/**
 * Which points lie beyond the limits; a point on a limit does not.
 *
 * @param points what is charted
 * @param limits one pair for all points, or one for each
 * @returns positions counted from 0
 */
export function pointsBeyond(
  points: readonly number[],
  limits: ControlLimits | readonly ControlLimits[],
): readonly number[] {
  const of = (index: number): ControlLimits | undefined => ('centre' in limits ? limits : limits[index]);
  return points.flatMap((point, index) => {
    const pair = of(index);
    return pair !== undefined && (point < pair.lower || point > pair.upper) ? [index] : [];
  });
}
