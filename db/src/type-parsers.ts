import pg from 'pg';

/** Object identifiers of PostgreSQL's built-in types (pg_type.oid), stable over all versions. */
const oid = { int8: 20, textArray: 1009, date: 1082, int8Array: 1016, dateArray: 1182, numericArray: 1231 } as const;

/**
 * How values arrive in JavaScript: int8 as a number (refused when it would lose digits), numeric as a decimal string,
 * date as 'YYYY-MM-DD' (a Date would drag it into the machine's time zone), timestamptz as Date.
 */
export const typeParsers: pg.CustomTypesConfig = {
  getTypeParser: ((id: number, format?: 'text' | 'binary') =>
    (format !== 'binary' && textParsers.get(id)) || builtIn(id, format)) as pg.CustomTypesConfig['getTypeParser'],
};

/** The package's own types list scalars only; the array of text is registered all the same. */
const builtIn = pg.types.getTypeParser as (id: number, format?: 'text' | 'binary') => (text: string) => unknown;
const parseTextArray = builtIn(oid.textArray) as (text: string) => (string | null)[];

const textParsers = new Map<number, (text: string) => unknown>([
  [oid.int8, parseSafeInteger],
  [oid.date, (text) => text],
  [oid.int8Array, (text) => parseTextArray(text).map((item) => (item === null ? null : parseSafeInteger(item)))],
  [oid.dateArray, parseTextArray],
  [oid.numericArray, parseTextArray],
]);

/**
 * @param text an integer as PostgreSQL prints it
 * @throws RangeError beyond ±(2^53 − 1), where a JavaScript number no longer holds every integer
 */
export function parseSafeInteger(text: string): number {
  const value = Number(text);
  if (!Number.isSafeInteger(value)) throw new RangeError(`${text} is too large to be held exactly as a number`);
  return value;
}
