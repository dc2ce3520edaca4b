import { DateTime } from 'luxon';

/** The only source of time. Injected everywhere, so that tests and the demo can set it. */
export abstract class Clock {
  /** The shop's own time zone, by its IANA name. */
  abstract readonly zone: string;

  abstract now(): Date;

  /** The calendar day in the shop's zone, as `YYYY-MM-DD`. */
  today(): string {
    return this.dayOf(this.now());
  }

  /** The calendar day on which an instant falls in the shop's zone. */
  dayOf(instant: Date): string {
    return DateTime.fromJSDate(instant, { zone: this.zone }).toFormat('yyyy-MM-dd');
  }

  /** The instant at which a calendar day (`YYYY-MM-DD`) begins in the shop's zone. */
  startOf(day: string): Date {
    return DateTime.fromISO(day, { zone: this.zone }).startOf('day').toJSDate();
  }

  /** The instant at which a calendar day ends, which is the next one's beginning. */
  endOf(day: string): Date {
    return DateTime.fromISO(day, { zone: this.zone }).plus({ days: 1 }).startOf('day').toJSDate();
  }
}

export class SystemClock extends Clock {
  constructor(override readonly zone: string) {
    super();
  }

  override now(): Date {
    return new Date();
  }
}
