/** A trace to draw: points in order of time, extremes kept. */
export interface Trace {
  /** Seconds. */
  readonly times: readonly number[];
  /** In the unit of the channel. */
  readonly values: readonly number[];
}

/**
 * Thins a stream of samples for drawing, so that no peak is lost: of each stretch the least and the greatest sample are
 * kept, in the order in which they came. When the stretches run out, neighbours are joined and each becomes twice as
 * long, so the space needed does not grow with the capture.
 *
 * @source common practice, no source
 */
export class TraceDecimator {
  private readonly leastTimes: Float64Array;
  private readonly leastValues: Float64Array;
  private readonly greatestTimes: Float64Array;
  private readonly greatestValues: Float64Array;
  private used = 0;
  private perStretch = 1;
  private inStretch = 0;

  /** @param stretches how many at most; the trace has up to twice as many points */
  constructor(private readonly stretches = 1024) {
    const size = Math.max(2, stretches + (stretches % 2));
    this.stretches = size;
    this.leastTimes = new Float64Array(size);
    this.leastValues = new Float64Array(size);
    this.greatestTimes = new Float64Array(size);
    this.greatestValues = new Float64Array(size);
  }

  /**
   * Takes the next samples; gaps and infinities leave no point.
   *
   * @param times seconds, rising
   * @param values of one channel
   * @param count how many
   */
  push(times: Float64Array, values: Float64Array, count: number): void {
    for (let index = 0; index < count; index += 1) {
      const value = values[index] ?? Number.NaN;
      if (value - value === 0) this.take(times[index] ?? Number.NaN, value);
    }
  }

  private take(time: number, value: number): void {
    if (this.inStretch === 0) {
      if (this.used === this.stretches) this.joinNeighbours();
      if (this.inStretch === 0) {
        const at = this.used;
        this.leastTimes[at] = time;
        this.leastValues[at] = value;
        this.greatestTimes[at] = time;
        this.greatestValues[at] = value;
        this.used += 1;
      }
    }
    const at = this.used - 1;
    if (value < (this.leastValues[at] ?? value)) {
      this.leastValues[at] = value;
      this.leastTimes[at] = time;
    } else if (value > (this.greatestValues[at] ?? value)) {
      this.greatestValues[at] = value;
      this.greatestTimes[at] = time;
    }
    this.inStretch += 1;
    if (this.inStretch === this.perStretch) this.inStretch = 0;
  }

  private joinNeighbours(): void {
    for (let left = 0; left < this.used; left += 2) {
      const right = left + 1;
      const lower = (this.leastValues[right] ?? 0) < (this.leastValues[left] ?? 0) ? right : left;
      const upper = (this.greatestValues[right] ?? 0) > (this.greatestValues[left] ?? 0) ? right : left;
      const to = left / 2;
      this.leastValues[to] = this.leastValues[lower] ?? 0;
      this.leastTimes[to] = this.leastTimes[lower] ?? 0;
      this.greatestValues[to] = this.greatestValues[upper] ?? 0;
      this.greatestTimes[to] = this.greatestTimes[upper] ?? 0;
    }
    this.used /= 2;
    this.perStretch *= 2;
  }

  /**
   * The trace so far.
   *
   * @returns points in order of time; a stretch of one value gives one point
   */
  trace(): Trace {
    const times: number[] = [];
    const values: number[] = [];
    for (let at = 0; at < this.used; at += 1) {
      const least = { time: this.leastTimes[at] ?? 0, value: this.leastValues[at] ?? 0 };
      const greatest = { time: this.greatestTimes[at] ?? 0, value: this.greatestValues[at] ?? 0 };
      const inOrder = least.time <= greatest.time ? [least, greatest] : [greatest, least];
      for (const point of least.time === greatest.time ? [least] : inOrder) {
        times.push(point.time);
        values.push(point.value);
      }
    }
    return { times, values };
  }
}
