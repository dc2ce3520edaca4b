import type { Clock } from '../platform/clock/clock.js';

/** Turns the product's clock back, so that the services write history with the instants it happened at. */
export class TurnedClock {
  #instant: number;

  /** @param clock the one clock of the application, whose `now` is taken over until the process ends */
  constructor(clock: Clock, start: Date) {
    this.#instant = start.getTime();
    Object.defineProperty(clock, 'now', { value: () => new Date(this.#instant) });
  }

  now(): Date {
    return new Date(this.#instant);
  }

  advance(by: { days?: number; hours?: number; minutes?: number }): void {
    this.#instant += (((by.days ?? 0) * 24 + (by.hours ?? 0)) * 60 + (by.minutes ?? 0)) * 60_000;
  }
}
