import { type ChannelMeasures, ChannelTally, type Polarity, refuseAll } from './channel-measures.js';
import { type DeadTimes, DeadTimeTally } from './dead-time.js';
import { EdgeFinder } from './edge-finder.js';
import { refuse } from './measure.js';
import { type FoundLevels, findStateLevels } from './state-levels.js';

export interface WaveformOptions {
  /** One channel, or two whose gap is measured. */
  readonly channels: 1 | 2;
  readonly polarity?: Polarity | undefined;
  /** Half the hysteresis band as a share of the amplitude; 0.1 unless told otherwise. */
  readonly hysteresis?: number | undefined;
  /** Samples from which the levels are found; the whole of any shorter capture. */
  readonly levelSamples?: number | undefined;
}

export interface WaveformMeasures {
  readonly channels: readonly ChannelMeasures[];
  /** Undefined for one channel. */
  readonly deadTimes: DeadTimes | undefined;
  readonly samples: number;
  /** Mean seconds between samples. */
  readonly intervalSeconds: number;
  readonly warnings: readonly WaveformWarning[];
}

export type WaveformWarning = 'levels_changed' | 'period_unsteady';

export const waveformWarningSentences: Record<WaveformWarning, string> = {
  levels_changed: 'The levels change during the capture; the measures rest on those at its beginning.',
  period_unsteady: 'The period changes by more than a tenth; the mean may describe no single one.',
};

const usualLevelSamples = 262_144;

/** Later blocks are compared with the levels by every this many samples. */
const spotCheck = 16;

/** Samples of one channel looked at before the other has its turn. */
const stretch = 1024;

interface Channel {
  readonly held: Float64Array;
  found: FoundLevels | undefined;
  finder: EdgeFinder | undefined;
  readonly tally: ChannelTally;
  levelsChanged: boolean;
}

/**
 * Measures a stream of samples in one pass and constant space.
 *
 * The first samples are held until the levels are found in them, which for most captures are all there are; then edges
 * are followed sample by sample. A channel that rests at one level while the levels are looked for is looked at again in
 * the next stretch.
 */
export class WaveformAnalyser {
  private readonly heldTimes: Float64Array;
  private held = 0;
  private readonly channels: readonly Channel[];
  private readonly firstToSecond = new DeadTimeTally();
  private readonly secondToFirst = new DeadTimeTally();
  private samples = 0;
  private firstTime = Number.NaN;
  private lastTime = Number.NaN;

  /** @param options one or two channels, polarity, hysteresis */
  constructor(private readonly options: WaveformOptions) {
    const size = options.levelSamples ?? usualLevelSamples;
    this.heldTimes = new Float64Array(size);
    this.channels = Array.from({ length: options.channels }, (_, index) => this.createChannel(index, size));
  }

  private createChannel(index: number, size: number): Channel {
    const polarity = this.options.polarity ?? 'positive';
    const own = index === 0 ? this.firstToSecond : this.secondToFirst;
    const other = index === 0 ? this.secondToFirst : this.firstToSecond;
    const tally =
      this.options.channels === 2
        ? new ChannelTally(
            polarity,
            (pulse) => own.addPulse(pulse),
            (instant) => other.addLeading(instant),
          )
        : new ChannelTally(polarity);
    return { held: new Float64Array(size), found: undefined, finder: undefined, tally, levelsChanged: false };
  }

  /**
   * Takes the next samples.
   *
   * @param columns time (s), then one array of samples (V) per channel
   * @param count how many are of this block
   */
  push(columns: readonly Float64Array[], count: number): void {
    const [times] = columns;
    if (times === undefined || count === 0) return;
    if (this.samples === 0) this.firstTime = times[0] ?? Number.NaN;
    this.lastTime = times[count - 1] ?? Number.NaN;
    this.samples += count;
    for (let from = 0; from < count;) {
      if (this.channels.every((channel) => channel.finder !== undefined)) {
        this.scan(
          columns.map((column) => column.subarray(from, count)),
          count - from,
        );
        return;
      }
      const taken = Math.min(count - from, this.heldTimes.length - this.held);
      this.hold(columns, from, taken);
      from += taken;
      if (this.held === this.heldTimes.length) this.settle();
    }
  }

  private hold(columns: readonly Float64Array[], from: number, taken: number): void {
    const part = (column: Float64Array | undefined): Float64Array =>
      (column ?? new Float64Array(0)).subarray(from, from + taken);
    this.heldTimes.set(part(columns[0]), this.held);
    this.channels.forEach((channel, index) => channel.held.set(part(columns[index + 1]), this.held));
    this.held += taken;
  }

  /** Looks for levels in what is held and follows the edges in it. Both channels are scanned over the same stretch. */
  private settle(): void {
    for (const channel of this.channels) {
      if (channel.finder !== undefined) continue;
      channel.found = findStateLevels(channel.held, this.held);
      if (!('levels' in channel.found)) continue;
      const { low, high } = channel.found.levels;
      channel.finder = new EdgeFinder({ low, high, hysteresis: this.options.hysteresis ?? 0.1 }, channel.tally);
    }
    const count = this.held;
    this.held = 0;
    this.scan([this.heldTimes, ...this.channels.map((channel) => channel.held)], count);
  }

  private scan(columns: readonly Float64Array[], count: number): void {
    const [times] = columns;
    if (times === undefined) return;
    if (this.channels.length > 1) this.scanInTurns(times, columns, count);
    this.channels.forEach((channel, index) => {
      const values = columns[index + 1];
      if (values === undefined) return;
      if (this.channels.length === 1) channel.finder?.scan(times, values, count);
      if (!channel.levelsChanged) channel.levelsChanged = strays(channel, values, count);
    });
  }

  /** Short stretches, each channel in turn, so that few pulses wait for their partner in the other channel. */
  private scanInTurns(times: Float64Array, columns: readonly Float64Array[], count: number): void {
    for (let from = 0; from < count; from += stretch) {
      const to = Math.min(count, from + stretch);
      const part = times.subarray(from, to);
      this.channels.forEach((channel, index) => {
        const values = columns[index + 1];
        if (values !== undefined) channel.finder?.scan(part, values.subarray(from, to), to - from);
      });
    }
  }

  /**
   * The measures of all that was pushed.
   *
   * @returns measures per channel, dead times for two, or the reason why each is refused
   */
  finish(): WaveformMeasures {
    if (this.held > 0) this.settle();
    const intervalSeconds = this.samples > 1 ? (this.lastTime - this.firstTime) / (this.samples - 1) : Number.NaN;
    const channels = this.channels.map(({ found, tally, finder }) => {
      if (finder !== undefined && found !== undefined && 'levels' in found)
        return tally.finish(found.levels, intervalSeconds);
      return refuseAll(found !== undefined && 'refused' in found ? found.refused : 'few_samples');
    });
    return {
      channels,
      deadTimes: this.options.channels === 2 ? this.finishDeadTimes(channels, intervalSeconds) : undefined,
      samples: this.samples,
      intervalSeconds,
      warnings: [
        ...(this.channels.some((channel) => channel.levelsChanged) ? (['levels_changed'] as const) : []),
        ...(channels.some(isUnsteady) ? (['period_unsteady'] as const) : []),
      ],
    };
  }

  private finishDeadTimes(channels: readonly ChannelMeasures[], interval: number): DeadTimes {
    const refused = channels.map((channel) => channel.pulseWidth).find((width) => !width.measured);
    const period = channels[0]?.period;
    if (refused !== undefined || period === undefined || !period.measured) {
      const reason = refuse(refused !== undefined && !refused.measured ? refused.reason : 'few_cycles');
      return { firstToSecond: reason, secondToFirst: reason, overlap: undefined };
    }
    const firstToSecond = this.firstToSecond.finish(interval, period.value / 2);
    const secondToFirst = this.secondToFirst.finish(interval, period.value / 2);
    const measured = [firstToSecond, secondToFirst].filter((each) => each.measured);
    const overlap = measured.length === 0 ? undefined : measured.some((each) => each.least < 0);
    return { firstToSecond, secondToFirst, overlap };
  }
}

const isUnsteady = ({ period }: ChannelMeasures): boolean =>
  period.measured && period.greatest - period.least > 0.1 * period.value;

/** Whether a stretch rests clearly elsewhere than at the levels found: by a twentieth of the amplitude or more. */
function strays({ found, finder }: Channel, values: Float64Array, count: number): boolean {
  if (finder === undefined || found === undefined || !('levels' in found) || count < 64 * spotCheck) return false;
  const spots = values.subarray(0, count).filter((_, index) => index % spotCheck === 0);
  const now = findStateLevels(spots, spots.length);
  if (!('levels' in now)) return false;
  const { low, high } = found.levels;
  const most = 0.05 * (high - low);
  return Math.abs(now.levels.low - low) > most || Math.abs(now.levels.high - high) > most;
}
