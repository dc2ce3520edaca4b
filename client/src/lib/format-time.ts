/** The shop's own zone; days and hours are shown in it whatever the reader's machine is set to. */
let zone = Intl.DateTimeFormat().resolvedOptions().timeZone;

export function setShopZone(timeZone: string): void {
  zone = timeZone;
}

export function shopZone(): string {
  return zone;
}

type Instant = string | number | Date;

const locale = 'en-IE';
const asDate = (instant: Instant): Date => (instant instanceof Date ? instant : new Date(instant));

/** Days are plain `YYYY-MM-DD`; noon UTC keeps them on the same day in any formatter set to UTC. */
function formatDayWith(day: string, options: Intl.DateTimeFormatOptions): string {
  return new Intl.DateTimeFormat(locale, { ...options, timeZone: 'UTC' })
    .format(new Date(`${day}T12:00:00Z`))
    .replaceAll(',', '');
}

/** `Thu 3 Dec`, for rows and queues. */
export function formatDayShort(day: string): string {
  return formatDayWith(day, { weekday: 'short', day: 'numeric', month: 'short' });
}

/** `3 December 2026`. */
export function formatDay(day: string): string {
  return formatDayWith(day, { day: 'numeric', month: 'long', year: 'numeric' });
}

/** `Thursday 10 December`, for a promise. */
export function formatPromise(day: string): string {
  return formatDayWith(day, { weekday: 'long', day: 'numeric', month: 'long' });
}

/** `1 December 2026, 14:05:09 GMT`: the exact instant, in the shop's zone. */
export function formatInstant(instant: Instant): string {
  return new Intl.DateTimeFormat(locale, {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
    hourCycle: 'h23',
    timeZone: zone,
    timeZoneName: 'short',
  }).format(asDate(instant));
}

/** `1 Dec 2026, 14:05`, for columns. */
export function formatInstantShort(instant: Instant): string {
  return new Intl.DateTimeFormat(locale, {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
    timeZone: zone,
  }).format(asDate(instant));
}

const steps: [Intl.RelativeTimeFormatUnit, number][] = [
  ['year', 31_557_600],
  ['month', 2_629_800],
  ['week', 604_800],
  ['day', 86_400],
  ['hour', 3600],
  ['minute', 60],
];

/** `4 minutes ago`, `in 3 days`, `just now`. */
export function formatRelative(instant: Instant, now: Instant): string {
  const seconds = (asDate(instant).getTime() - asDate(now).getTime()) / 1000;
  const words = new Intl.RelativeTimeFormat(locale, { numeric: 'auto' });
  for (const [unit, length] of steps) {
    if (Math.abs(seconds) >= length) return words.format(Math.trunc(seconds / length), unit);
  }
  return 'just now';
}

/** The shop's calendar day at an instant, as `YYYY-MM-DD`. */
export function shopDay(instant: Instant): string {
  return new Intl.DateTimeFormat('en-CA', { year: 'numeric', month: '2-digit', day: '2-digit', timeZone: zone }).format(
    asDate(instant),
  );
}
