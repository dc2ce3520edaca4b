/** One transition through the middle level that hysteresis has confirmed. */
export interface Edge {
  /** Instant of the middle level (s). */
  readonly middle: number;
  readonly rising: boolean;
}

/** The whole way of a transition from 10 to 90 percent, or back. */
export interface EdgeDuration {
  readonly rising: boolean;
  /** Seconds between the outer reference levels. */
  readonly seconds: number;
  /** Samples strictly between them. */
  readonly samples: number;
  /** False where the signal turned back on the way by more than the hysteresis allows. */
  readonly monotonic: boolean;
}

export interface EdgeSink {
  edge(edge: Edge): void;
  duration(duration: EdgeDuration): void;
}

export interface EdgeLevels {
  /** State levels (V). */
  readonly low: number;
  readonly high: number;
  /** Half the width of the hysteresis band about the middle, as a share of the amplitude. */
  readonly hysteresis: number;
  /** Outer reference levels as shares of the amplitude; 0.1 and 0.9 unless told otherwise. */
  readonly outer?: readonly [number, number];
}

/**
 * Finds transitions in a stream of samples.
 *
 * Instants lie where straight lines between samples cross a level. A crossing of the middle counts once the signal has
 * left the hysteresis band on the other side; of several crossings within one transition the first counts. Descending
 * transitions are found as ascending ones of the mirrored signal, so both are treated alike.
 */
export class EdgeFinder {
  private readonly middle: number;
  private readonly band: number;
  private readonly inner: number;
  private readonly outer: number;
  /** +1 waits for a rise, −1 for a fall, 0 does not know yet. */
  private waiting: 1 | -1 | 0 = 0;
  private lastTime = Number.NaN;
  private lastHeight = Number.NaN;
  private outerStart = Number.NaN;
  private middleAt = Number.NaN;
  private samples = 0;
  private turnedBack = false;
  private peak = Number.NEGATIVE_INFINITY;
  /** A confirmed transition has yet to reach its far reference level. */
  private finishing = false;

  /**
   * @param levels state levels (V), hysteresis and reference levels
   * @param sink told of each transition when it is confirmed, and of its duration when that is complete
   */
  constructor(
    levels: EdgeLevels,
    private readonly sink: EdgeSink,
  ) {
    const amplitude = levels.high - levels.low;
    const [near, far] = levels.outer ?? [0.1, 0.9];
    this.middle = levels.low + amplitude / 2;
    this.band = levels.hysteresis * amplitude;
    // Heights are measured from the middle, so that mirroring is a change of sign.
    this.inner = (near - 0.5) * amplitude;
    this.outer = (far - 0.5) * amplitude;
  }

  /**
   * Looks at the next samples.
   *
   * @param times instants (s)
   * @param values samples (V); gaps are passed over
   * @param count how many
   */
  scan(times: Float64Array, values: Float64Array, count: number): void {
    const { middle, inner, band } = this;
    for (let index = 0; index < count; index += 1) {
      const value = values[index] ?? Number.NaN;
      if (value !== value) continue;
      const height = value - middle;
      const { waiting } = this;
      // At rest on the near side of the first reference level: nothing can happen.
      const towards = waiting * height;
      if (waiting !== 0 && !this.finishing && towards < inner) {
        this.middleAt = Number.NaN;
        this.outerStart = Number.NaN;
        this.lastTime = times[index] ?? Number.NaN;
        this.lastHeight = height;
      } else if (waiting === 0) this.start(times[index] ?? Number.NaN, height, band);
      else this.step(times[index] ?? Number.NaN, height);
    }
  }

  private start(time: number, height: number, band: number): void {
    if (height >= band) this.waiting = -1;
    else if (height < -band) this.waiting = 1;
    this.lastTime = time;
    this.lastHeight = height;
  }

  private step(time: number, height: number): void {
    if (this.finishing) this.followToFarLevel(time, height);
    this.approach(time, height);
    this.lastTime = time;
    this.lastHeight = height;
  }

  /** The transition before is confirmed (`waiting` already looks for its opposite) and runs to its far level. */
  private followToFarLevel(time: number, height: number): void {
    const way = -this.waiting;
    const now = way * height;
    const before = way * this.lastHeight;
    if (now >= this.outer) {
      const reached = this.crossing(time, before, now, this.outer);
      this.report(way > 0, reached);
      return;
    }
    this.samples += 1;
    this.watchTurn(now);
  }

  private watchTurn(now: number): void {
    if (now < this.peak - this.band) this.turnedBack = true;
    if (now > this.peak) this.peak = now;
  }

  private report(rising: boolean, reached: number): void {
    this.finishing = false;
    if (Number.isNaN(this.outerStart)) return;
    this.sink.duration({
      rising,
      seconds: reached - this.outerStart,
      samples: this.samples,
      monotonic: !this.turnedBack,
    });
    this.outerStart = Number.NaN;
  }

  /** Follows the signal towards the transition that is waited for. */
  private approach(time: number, height: number): void {
    const way = this.waiting;
    const now = way * height;
    const before = way * this.lastHeight;
    if (Number.isNaN(this.middleAt) && before < 0 && now >= 0) this.middleAt = this.crossing(time, before, now, 0);
    else if (now < -this.band) this.middleAt = Number.NaN;
    if (this.finishing) {
      if (now < this.band) return;
      // The far level was never reached: the transition before has no duration, and neither has this one.
      this.finishing = false;
      this.outerStart = Number.NaN;
    }
    if (before < this.inner && now >= this.inner) {
      this.outerStart = this.crossing(time, before, now, this.inner);
      this.samples = 0;
      this.turnedBack = false;
      this.peak = Number.NEGATIVE_INFINITY;
    }
    if (now < this.outer && now > this.inner) {
      this.samples += 1;
      this.watchTurn(now);
    }
    if (!Number.isNaN(this.middleAt) && now >= this.band) this.confirm(time, before, now);
  }

  private confirm(time: number, before: number, now: number): void {
    const rising = this.waiting > 0;
    this.sink.edge({ middle: this.middleAt, rising });
    this.middleAt = Number.NaN;
    this.waiting = rising ? -1 : 1;
    this.finishing = true;
    if (now >= this.outer) this.report(rising, this.crossing(time, before, now, this.outer));
  }

  private crossing(time: number, before: number, now: number, level: number): number {
    return this.lastTime + ((time - this.lastTime) * (level - before)) / (now - before);
  }
}
