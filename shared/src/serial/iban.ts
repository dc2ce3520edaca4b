import { ArithmeticError } from '../errors/arithmetic-error.js';
import { mod97CheckDigits } from './mod-97-10.js';

/**
 * Countries by the length of their account numbers. Source: IBAN registry of ISO 13616 (SWIFT, release 99 of 2024),
 * compared with the npm package ibantools 4.5.4.
 */
const countriesByLength: Readonly<Record<number, string>> = {
  15: 'NO',
  16: 'BE',
  18: 'DK FI FK FO GL NL SD',
  19: 'MK SI',
  20: 'AT BA EE KZ LT LU MN XK',
  21: 'CH HR LI LV',
  22: 'BG BH CR DE GB GE IE ME RS VA',
  23: 'AE GI IL IQ OM SO TL',
  24: 'AD CZ ES MD PK RO SA SE SK TN VG',
  25: 'LY PT ST',
  26: 'IS TR',
  27: 'BI DJ FR GR IT MC MR SM',
  28: 'AL AZ BY CY DO GT HU LB NI PL SV',
  29: 'BR EG PS QA UA',
  30: 'JO KW MU YE',
  31: 'MT SC',
  32: 'LC',
  33: 'RU',
};

const lengthOf: ReadonlyMap<string, number> = new Map(
  Object.entries(countriesByLength).flatMap(([length, countries]) =>
    countries.split(' ').map((country) => [country, Number(length)] as const),
  ),
);

/** Countries whose account numbers can be read, with the length of the whole number. */
export const ibanLengths: ReadonlyMap<string, number> = lengthOf;

/** A bank account number that was read. */
export interface ReadIban {
  /** Electronic form: capital letters, no spaces. */
  readonly text: string;
  /** ISO 3166-1 alpha-2. */
  readonly country: string;
}

/**
 * Reads a bank account number: country, its length, and check digits. The bank's own digits inside are not looked at.
 *
 * @param typed with or without spaces, capital or small letters
 * @returns the account number in its electronic form
 * @throws ArithmeticError `serial_iban_unreadable`, `serial_iban_country`, `serial_iban_length`,
 *   `serial_iban_check_digits`
 * @source ISO 13616-1:2020; ISO/IEC 7064:2003, MOD 97-10.
 */
export function readIban(typed: string): ReadIban {
  const text = typed.replace(/\s/g, '').toUpperCase();
  if (!/^[A-Z]{2}\d{2}[0-9A-Z]+$/.test(text)) throw new ArithmeticError('serial_iban_unreadable', { text: typed });
  const country = text.slice(0, 2);
  const length = lengthOf.get(country);
  if (length === undefined) throw new ArithmeticError('serial_iban_country', { text: typed, country });
  if (text.length !== length) throw new ArithmeticError('serial_iban_length', { text: typed, country, length });
  if (mod97CheckDigits(text.slice(4) + country) !== text.slice(2, 4)) {
    throw new ArithmeticError('serial_iban_check_digits', { text: typed });
  }
  return { text, country };
}
