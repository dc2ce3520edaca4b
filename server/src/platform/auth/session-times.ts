const minute = 60_000;
const hour = 60 * minute;

/**
 * How long a session lasts: a working day without use, a week in any case; then people sign in again.
 * A visitor who never signs in is forgotten sooner.
 */
export const sessionTimes = {
  idleMilliseconds: 12 * hour,
  absoluteMilliseconds: 7 * 24 * hour,
  visitorMilliseconds: 2 * hour,
  /** The instant of last use is kept to this grain, so that reading a list does not write a row for each request. */
  grainMilliseconds: minute,
} as const;

/** Whether a session is over by its age or by lack of use. */
export function isSessionOver(session: { createdAt?: number; lastSeenAt?: number }, now: number): boolean {
  const createdAt = session.createdAt ?? now;
  const lastSeenAt = session.lastSeenAt ?? createdAt;
  return now - createdAt > sessionTimes.absoluteMilliseconds || now - lastSeenAt > sessionTimes.idleMilliseconds;
}
