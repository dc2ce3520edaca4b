import type { Pulse } from './channel-measures.js';
import { type Measure, Tally, refuse } from './measure.js';

export interface DeadTimes {
  /** From the end of a pulse of the first output to the beginning of the next one of the second (s). */
  readonly firstToSecond: Measure;
  readonly secondToFirst: Measure;
  /** Whether both were on at once, at their middle levels; undefined where neither way could be measured. */
  readonly overlap: boolean | undefined;
}

/** Pulses kept while their partner is awaited; the outputs take turns, so a few are enough. */
const longestQueue = 256;

/** Pairs the pulses of one output with the leading edges of the other. */
export class DeadTimeTally {
  private readonly gaps = new Tally();
  private readonly pulses: Pulse[] = [];
  private readonly leadings: number[] = [];
  private unpaired = 0;
  private inPhase = 0;

  /** @param pulse of the output that ends */
  addPulse(pulse: Pulse): void {
    this.pulses.push(pulse);
    this.pair();
    if (this.pulses.length > longestQueue) {
      this.pulses.shift();
      this.unpaired += 1;
    }
  }

  /** @param instant at which the other output begins */
  addLeading(instant: number): void {
    this.leadings.push(instant);
    this.pair();
    if (this.leadings.length > longestQueue) {
      this.leadings.shift();
      this.unpaired += 1;
    }
  }

  /** The partner of a pulse is the first leading edge after its own; edges arrive in order, so it cannot come late. */
  private pair(): void {
    for (let [pulse] = this.pulses; pulse !== undefined; [pulse] = this.pulses) {
      const { leading, trailing } = pulse;
      while (this.leadings.length > 0 && (this.leadings[0] ?? 0) <= leading) this.leadings.shift();
      const [partner] = this.leadings;
      if (partner === undefined) return;
      this.pulses.shift();
      // An edge hard behind the pulse's own belongs to an output that runs with it, not against it.
      if (partner - leading < 0.1 * (trailing - leading)) this.inPhase += 1;
      else this.gaps.add(partner - trailing);
    }
  }

  get least(): number {
    return this.gaps.least;
  }

  /**
   * The gap as a measure.
   *
   * @param interval seconds between samples: two instants, each off by at most half of it
   * @param halfPeriod of the outputs (s): a gap as long as that means that they do not take turns
   * @returns the measure or why it is refused
   */
  finish(interval: number, halfPeriod: number): Measure {
    const { gaps } = this;
    if (gaps.count === 0 || this.inPhase + this.unpaired > gaps.count || gaps.mean >= halfPeriod)
      return refuse('no_pairs');
    return gaps.asMeasure(interval);
  }
}
