/** Why a measure is refused, one sentence each. */
export const refusalSentences = {
  no_two_levels: 'The signal does not rest at two levels.',
  few_samples: 'There are too few samples.',
  few_samples_per_period: 'There are fewer than ten samples in a period; capture faster or for a shorter time.',
  few_samples_per_edge: 'There are fewer than two samples in an edge; capture faster to measure it.',
  few_cycles: 'There are fewer than two complete periods; capture for longer.',
  no_complete_pulse: 'There is no complete pulse.',
  clipped: 'The signal is cut off at the edge of the instrument’s range; set a larger range.',
  edge_incomplete: 'No edge runs all the way from 10 to 90 percent.',
  edge_not_monotonic: 'Most edges go back and forth, so their duration has no single value.',
  no_pairs: 'The two channels do not take turns.',
  other_channel: 'The other channel could not be measured.',
  target_not_reached: 'The target was not reached.',
  not_settled: 'The temperature did not stay within the band until the end.',
  no_step: 'The temperature does not change enough to measure a step.',
  no_cooling: 'The capture does not show the tool cooling down.',
  poor_fit: 'The curve is not the exponential that a time constant describes.',
} as const;

export type RefusalCode = keyof typeof refusalSentences;

export interface Measured {
  readonly measured: true;
  /** In the unit of the measure: s, Hz, V, °C or a share. */
  readonly value: number;
  readonly least: number;
  readonly greatest: number;
  /** How many single measures it is the mean of. */
  readonly count: number;
  /** The value is off by no more than this for want of samples; noise and the instrument come on top. */
  readonly uncertainty: number;
}

export interface Refused {
  readonly measured: false;
  readonly reason: RefusalCode;
  readonly sentence: string;
}

export type Measure = Measured | Refused;

/**
 * A measure that cannot be given.
 *
 * @param reason why
 * @returns reason and sentence
 */
export const refuse = (reason: RefusalCode): Refused => ({
  measured: false,
  reason,
  sentence: refusalSentences[reason],
});

/** Mean and extremes of many single measures, kept in constant space. */
export class Tally {
  private total = 0;
  private lost = 0;
  count = 0;
  least = Number.POSITIVE_INFINITY;
  greatest = Number.NEGATIVE_INFINITY;

  /** @param value one more */
  add(value: number): void {
    const next = this.total + value;
    // Neumaier's compensated sum, see statistics/summary.
    this.lost += Math.abs(this.total) >= Math.abs(value) ? this.total - next + value : value - next + this.total;
    this.total = next;
    this.count += 1;
    if (value < this.least) this.least = value;
    if (value > this.greatest) this.greatest = value;
  }

  get mean(): number {
    return (this.total + this.lost) / this.count;
  }

  /**
   * The tally as a measure.
   *
   * @param uncertainty of the mean
   * @returns the measure; there has to be at least one value
   */
  asMeasure(uncertainty: number): Measured {
    const { mean: value, least, greatest, count } = this;
    return { measured: true, value, least, greatest, count, uncertainty };
  }
}
