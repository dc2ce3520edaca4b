import type { RawBuilder } from 'kysely';

/** A row of a check's query: one violation, as a sentence. */
export interface Violation {
  readonly what: string;
}

/** A rule of the shop that the database can be asked about. */
export interface Check {
  /** Short and unique; printed first. */
  readonly name: string;
  /** The promise it looks after. */
  readonly promise: string;
  /** Answers one row for each violation, none when all is well. */
  readonly violations: (now: Date) => RawBuilder<Violation>;
}
