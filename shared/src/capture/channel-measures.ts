import { type Measure, Tally, refuse } from './measure.js';
import type { Edge, EdgeDuration, EdgeSink } from './edge-finder.js';
import type { StateLevels } from './state-levels.js';

/** What one channel shows. Times in s, frequency in Hz, duty as a share of the period. */
export interface ChannelMeasures {
  readonly levels: StateLevels | undefined;
  readonly frequency: Measure;
  readonly period: Measure;
  /** Width of a pulse between the middle instants of its edges. */
  readonly pulseWidth: Measure;
  readonly duty: Measure;
  /** Leading and trailing transition of a pulse, 10 to 90 percent; for positive pulses rise and fall. */
  readonly leadingDuration: Measure;
  readonly trailingDuration: Measure;
  /** How far the extremes lie beyond the levels, as shares of the amplitude; seen where the levels were found. */
  readonly overshoot: Measure;
  readonly undershoot: Measure;
  readonly leadingEdges: number;
  readonly completePeriods: number;
  readonly completePulses: number;
}

export type Polarity = 'positive' | 'negative';

export interface Pulse {
  readonly leading: number;
  readonly trailing: number;
}

/** Fewer samples than this in a period, and the shape between them is a guess. Common practice, no source. */
const fewestPerPeriod = 10;
const fewestPerEdge = 2;
const fewestPeriods = 2;

class EdgeTally {
  readonly seconds = new Tally();
  readonly samples = new Tally();
  turnedBack = 0;

  add(duration: EdgeDuration): void {
    if (!duration.monotonic) {
      this.turnedBack += 1;
      return;
    }
    this.seconds.add(duration.seconds);
    this.samples.add(duration.samples);
  }

  measure(clipped: boolean, interval: number, edges: number): Measure {
    if (clipped) return refuse('clipped');
    if (this.seconds.count === 0 && this.turnedBack === 0) {
      return refuse(edges === 0 ? 'no_complete_pulse' : 'edge_incomplete');
    }
    if (this.turnedBack > this.seconds.count) return refuse('edge_not_monotonic');
    if (this.samples.mean < fewestPerEdge) return refuse('few_samples_per_edge');
    return this.seconds.asMeasure(interval / Math.sqrt(this.seconds.count));
  }
}

/** Overshoot and undershoot as shares of the amplitude. IEEE Std 181-2011, 5.3.4; from memory. */
function excursions({
  low,
  high,
  least,
  greatest,
  clipped,
}: StateLevels): Pick<ChannelMeasures, 'overshoot' | 'undershoot'> {
  if (clipped) return { overshoot: refuse('clipped'), undershoot: refuse('clipped') };
  const share = (beyond: number): Measure => {
    const value = Math.max(0, beyond / (high - low));
    return { measured: true, value, least: value, greatest: value, count: 1, uncertainty: 0 };
  };
  return { overshoot: share(greatest - high), undershoot: share(low - least) };
}

/** Gathers the transitions of one channel into its measures; only complete periods and pulses count. */
export class ChannelTally implements EdgeSink {
  private readonly periods = new Tally();
  private readonly widths = new Tally();
  private readonly duties = new Tally();
  private readonly leadingDurations = new EdgeTally();
  private readonly trailingDurations = new EdgeTally();
  private leadingEdges = 0;
  private firstLeading = Number.NaN;
  private lastLeading = Number.NaN;
  private lastWidth = Number.NaN;

  /**
   * @param polarity which way pulses point
   * @param onPulse told of each complete pulse
   * @param onLeading told of each leading edge
   */
  constructor(
    private readonly polarity: Polarity,
    private readonly onPulse: (pulse: Pulse) => void = () => {},
    private readonly onLeading: (instant: number) => void = () => {},
  ) {}

  edge({ middle, rising }: Edge): void {
    if (rising === (this.polarity === 'positive')) this.takeLeading(middle);
    else this.takeTrailing(middle);
  }

  duration(duration: EdgeDuration): void {
    const leading = duration.rising === (this.polarity === 'positive');
    (leading ? this.leadingDurations : this.trailingDurations).add(duration);
  }

  private takeLeading(instant: number): void {
    this.leadingEdges += 1;
    if (this.leadingEdges === 1) this.firstLeading = instant;
    else {
      const period = instant - this.lastLeading;
      this.periods.add(period);
      if (!Number.isNaN(this.lastWidth)) this.duties.add(this.lastWidth / period);
    }
    this.lastLeading = instant;
    this.lastWidth = Number.NaN;
    this.onLeading(instant);
  }

  private takeTrailing(instant: number): void {
    if (this.leadingEdges === 0) return;
    this.lastWidth = instant - this.lastLeading;
    this.widths.add(this.lastWidth);
    this.onPulse({ leading: this.lastLeading, trailing: instant });
  }

  /** Mean period from the first to the last leading edge: errors of the edges between cancel. */
  get meanPeriod(): number {
    return (this.lastLeading - this.firstLeading) / (this.leadingEdges - 1);
  }

  get periodCount(): number {
    return this.periods.count;
  }

  /**
   * The measures, or why each is refused.
   *
   * @param levels that the edges were found with
   * @param interval mean seconds between samples; an instant is off by at most half of it
   * @returns the measures
   */
  finish(levels: StateLevels, interval: number): ChannelMeasures {
    const counts = {
      levels,
      leadingEdges: this.leadingEdges,
      completePeriods: this.periods.count,
      completePulses: this.widths.count,
    };
    const scarce = this.periods.count > 0 && this.meanPeriod < fewestPerPeriod * interval;
    if (scarce) return { ...refuseAll('few_samples_per_period'), ...counts };
    const { clipped } = levels;
    const { periods, widths, duties } = this;
    const enough = periods.count >= fewestPeriods;
    const frequency = 1 / this.meanPeriod;
    const share = interval / periods.count / this.meanPeriod;
    return {
      ...counts,
      period: enough ? periods.asMeasure(interval / periods.count) : refuse('few_cycles'),
      frequency: enough
        ? {
            measured: true,
            value: frequency,
            least: 1 / periods.greatest,
            greatest: 1 / periods.least,
            count: periods.count,
            uncertainty: frequency * share,
          }
        : refuse('few_cycles'),
      pulseWidth: clipped
        ? refuse('clipped')
        : widths.count > 0
          ? widths.asMeasure(interval)
          : refuse('no_complete_pulse'),
      duty: clipped
        ? refuse('clipped')
        : enough && duties.count > 0
          ? duties.asMeasure(interval / this.meanPeriod)
          : refuse('few_cycles'),
      ...excursions(levels),
      leadingDuration: this.leadingDurations.measure(clipped, interval, this.leadingEdges),
      trailingDuration: this.trailingDurations.measure(clipped, interval, widths.count),
    };
  }
}

/**
 * Measures that are all refused for one reason.
 *
 * @param reason why
 * @returns the measures with no edges
 */
export function refuseAll(reason: Parameters<typeof refuse>[0]): ChannelMeasures {
  const refused = refuse(reason);
  return {
    levels: undefined,
    frequency: refused,
    period: refused,
    pulseWidth: refused,
    duty: refused,
    leadingDuration: refused,
    trailingDuration: refused,
    overshoot: refused,
    undershoot: refused,
    leadingEdges: 0,
    completePeriods: 0,
    completePulses: 0,
  };
}
