import pg from 'pg';
import { AppError } from './app-error.js';
import type { ConstraintSentences } from './constraints.js';

/**
 * SQLSTATE codes (PostgreSQL documentation, appendix A) that mean: the request asked for something impossible.
 * Anything else is a fault of ours or of the machine.
 */
const sentencesByState: ReadonlyMap<string, readonly [AppError['code'], string]> = new Map([
  ['22P02', ['invalid_input', 'A value is not of the kind that is expected here.']],
  ['22003', ['invalid_input', 'A number is larger than can be kept.']],
  ['22021', ['invalid_input', 'A text holds characters that cannot be kept.']],
  ['22001', ['invalid_input', 'A text is longer than can be kept.']],
  ['22007', ['invalid_input', 'A date or time is not a real one.']],
  ['22008', ['invalid_input', 'A date or time is out of range.']],
  ['23502', ['invalid_input', 'A value that is needed is missing.']],
  ['23503', ['rule_broken', 'Something that this refers to does not exist, or is still in use.']],
  ['23505', ['already_exists', 'Something of that name or code exists already.']],
  ['23514', ['rule_broken', 'A value breaks a rule of the shop.']],
  ['23P01', ['rule_broken', 'This overlaps with something that is there already.']],
  ['40001', ['changed_meanwhile', 'Somebody else was changing the same things. Try again.']],
  ['40P01', ['changed_meanwhile', 'Somebody else was changing the same things. Try again.']],
  ['53100', ['service_unavailable', 'The disk is full, so nothing can be saved just now.']],
  ['53300', ['service_unavailable', 'The database takes no more connections just now. Try again in a moment.']],
  ['55P03', ['changed_meanwhile', 'Somebody else is changing the same things. Try again in a moment.']],
  ['57014', ['service_unavailable', 'This took too long and was stopped. Try again, or ask for less at once.']],
  ['57P01', ['service_unavailable', 'The database is restarting. Try again in a moment.']],
  ['57P02', ['service_unavailable', 'The database is restarting. Try again in a moment.']],
  ['57P03', ['service_unavailable', 'The database is starting. Try again in a moment.']],
]);

/** Connection faults have a code of Node, or none at all, instead of an SQLSTATE. */
const lostConnection =
  /^(Connection terminated|timeout exceeded when trying to connect|Query read timeout|Client has encountered)/;
const unreachable = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'ENOTFOUND']);

/** The refusal that a fault of the database means, or undefined when it is none we can name. */
export function translateDatabaseFault(error: unknown, constraints: ConstraintSentences): AppError | undefined {
  if (!(error instanceof Error)) return undefined;
  if (!(error instanceof pg.DatabaseError)) return translateConnectionFault(error);
  const known = error.constraint === undefined ? undefined : constraints.find(error.constraint);
  if (known) {
    const { pointer, code, sentence } = known;
    const faults = pointer === undefined ? [] : [{ pointer, code, detail: sentence }];
    return new AppError(code, sentence, { faults, cause: error });
  }
  const general = sentencesByState.get(error.code ?? '');
  return general && new AppError(general[0], general[1], { cause: error });
}

function translateConnectionFault(error: Error): AppError | undefined {
  const code = 'code' in error && typeof error.code === 'string' ? error.code : '';
  if (!lostConnection.test(error.message) && !unreachable.has(code)) return undefined;
  return new AppError('service_unavailable', 'The database does not answer just now. Try again in a moment.', {
    cause: error,
  });
}
