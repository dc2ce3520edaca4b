import { Clock } from './clock.js';

/** A clock that stands still until it is moved: for tests, and for the demo's history. */
export class SettableClock extends Clock {
  #instant: number;

  constructor(
    start: Date,
    override readonly zone = 'Europe/Dublin',
  ) {
    super();
    this.#instant = start.getTime();
  }

  override now(): Date {
    return new Date(this.#instant);
  }

  set(instant: Date): void {
    this.#instant = instant.getTime();
  }

  advance(by: { days?: number; hours?: number; minutes?: number; seconds?: number }): void {
    const seconds = (((by.days ?? 0) * 24 + (by.hours ?? 0)) * 60 + (by.minutes ?? 0)) * 60 + (by.seconds ?? 0);
    this.#instant += seconds * 1_000;
  }
}
