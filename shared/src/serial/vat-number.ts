import {
  austria,
  bulgaria,
  checkVAT,
  croatia,
  cyprus,
  czechRepublic,
  denmark,
  estonia,
  finland,
  germany,
  greece,
  hungary,
  ireland,
  italy,
  latvia,
  lithuania,
  luxembourg,
  malta,
  netherlands,
  poland,
  portugal,
  romania,
  slovakiaRepublic,
  slovenia,
  spain,
  sweden,
  unitedKingdom,
  type Country,
} from 'jsvat';
import { ArithmeticError } from '../errors/arithmetic-error.js';

type NumberCheck = (number: string) => boolean;

const byLibrary =
  (prefix: string, country: Country): NumberCheck =>
  (number) =>
    checkVAT(prefix + number, [country]).isValid;

/**
 * How the number behind each prefix is checked. The library (jsvat) knows most states; where it is behind the rules in
 * force, the check is our own.
 */
const checks: Readonly<Record<string, NumberCheck>> = {
  AT: byLibrary('AT', austria),
  BE: isBelgian,
  BG: byLibrary('BG', bulgaria),
  CY: byLibrary('CY', cyprus),
  CZ: byLibrary('CZ', czechRepublic),
  DE: byLibrary('DE', germany),
  DK: byLibrary('DK', denmark),
  EE: byLibrary('EE', estonia),
  EL: byLibrary('EL', greece),
  ES: byLibrary('ES', spain),
  FI: byLibrary('FI', finland),
  FR: isFrench,
  HR: byLibrary('HR', croatia),
  HU: byLibrary('HU', hungary),
  IE: byLibrary('IE', ireland),
  IT: byLibrary('IT', italy),
  LT: byLibrary('LT', lithuania),
  LU: byLibrary('LU', luxembourg),
  LV: isLatvian,
  MT: byLibrary('MT', malta),
  NL: isDutch,
  PL: byLibrary('PL', poland),
  PT: byLibrary('PT', portugal),
  RO: byLibrary('RO', romania),
  SE: byLibrary('SE', sweden),
  SI: byLibrary('SI', slovenia),
  SK: byLibrary('SK', slovakiaRepublic),
  // Northern Ireland: numbers of the United Kingdom under a prefix of their own.
  XI: byLibrary('GB', unitedKingdom),
};

/** Prefixes that can be read, in order. */
export const vatNumberPrefixes: readonly string[] = Object.keys(checks);

/** A VAT number that was read; that it has the right form does not mean that it exists. */
export interface ReadVatNumber {
  /** Prefix and number, capital letters, no signs. */
  readonly text: string;
  /** EL for Greece, XI for Northern Ireland. */
  readonly prefix: string;
  /** Country in ISO 3166-1, as tax rules name it: GR for EL; XI stays. */
  readonly country: string;
  /** Without prefix. */
  readonly number: string;
}

/**
 * Reads a VAT number of the European Union or Northern Ireland and checks its structure and check digits. Whether it
 * exists only the official service knows.
 *
 * @param typed with prefix; spaces, hyphens, points, slashes, colons and brackets let pass; GR is taken for EL
 * @returns the number in its one written form
 * @throws ArithmeticError `serial_vat_unreadable`, `serial_vat_country` for a prefix outside, `serial_vat_number` if
 *   the digits do not fit
 * @source structures as published by the European Commission (VIES); check digits as in the library jsvat and, for BE,
 *   FR and NL, beside each function.
 */
export function readVatNumber(typed: string): ReadVatNumber {
  const compact = typed.replace(/[\s\-./:()]/g, '').toUpperCase();
  const parts = /^([A-Z]{2})([0-9A-Z+*]{2,13})$/.exec(compact);
  if (!parts) throw new ArithmeticError('serial_vat_unreadable', { text: typed });
  const prefix = parts[1] === 'GR' ? 'EL' : (parts[1] ?? '');
  const check = Object.hasOwn(checks, prefix) ? checks[prefix] : undefined;
  if (!check) throw new ArithmeticError('serial_vat_country', { text: typed, prefix });
  const number = prefix === 'BE' ? (parts[2] ?? '').padStart(10, '0') : (parts[2] ?? '');
  if (!check(number)) throw new ArithmeticError('serial_vat_number', { text: typed });
  return { text: prefix + number, prefix, country: prefix === 'EL' ? 'GR' : prefix, number };
}

/**
 * Ten digits, the first 0 or 1 (numbers beginning with 1 are issued since 2023; the library refuses them): the last two
 * are 97 less the remainder of the others. Source: structure by VIES; rule by the Belgian enterprise register, from
 * memory.
 */
function isBelgian(number: string): boolean {
  return (
    /^[01]\d{9}$/.test(number) &&
    Number(number.slice(0, 8)) > 0 &&
    Number(number.slice(0, 8)) % 97 === 97 - Number(number.slice(8))
  );
}

const frenchCharacters = '0123456789ABCDEFGHJKLMNPQRSTUVWXYZ';

/**
 * Two characters and the company number (SIREN, itself with a Luhn digit, which the numbers of Monaco, beginning with
 * 000, do not have). Numeric keys are 12 + 3 × (SIREN mod 97), mod 97; keys with a letter follow a rule by 11, which the
 * library leaves out. Source: French tax administration, from memory; test numbers in the published test.
 */
function isFrench(number: string): boolean {
  const parts = /^([0-9A-HJ-NP-Z]{2})(\d{9})$/.exec(number);
  if (!parts) return false;
  const [, key = '', company = ''] = parts;
  if (!company.startsWith('000') && !hasLuhnDigit(company)) return false;
  if (/^\d\d$/.test(key)) return Number(key) === (12 + 3 * (Number(company) % 97)) % 97;
  const [first, second] = Array.from(key).map((character) => frenchCharacters.indexOf(character));
  if (first === undefined || second === undefined) return false;
  const value = first < 10 ? first * 24 + second - 10 : first * 34 + second - 100;
  return (Number(company) + 1 + Math.floor(value / 11)) % 11 === value % 11;
}

/**
 * Nine digits, B, two digits but 00; either the old eleven-test over the nine digits or, since 2020, MOD 97-10 over the
 * whole number: the library knows both but lets B00 pass. Source: Dutch tax administration, from memory.
 */
function isDutch(number: string): boolean {
  return !number.endsWith('B00') && checkVAT(`NL${number}`, [netherlands]).isValid;
}

/**
 * Eleven digits. Companies' begin with 4 to 9 (library); persons' begin with a day and end with a check digit, which the
 * library does not look at. Source: Latvian personal code, from memory.
 */
function isLatvian(number: string): boolean {
  if (!/^[0-3]\d{10}$/.test(number)) return checkVAT(`LV${number}`, [latvia]).isValid;
  const weights = [10, 5, 8, 4, 2, 1, 6, 3, 7, 9];
  const sum = weights.reduce((total, weight, index) => total + weight * Number(number[index]), 1);
  return (sum % 11) % 10 === Number(number[10]);
}

/** Luhn: every second digit from the right doubled, digits added, a multiple of ten. Source: ISO/IEC 7812-1, annex B. */
function hasLuhnDigit(digits: string): boolean {
  const sum = Array.from(digits)
    .reverse()
    .reduce((total, digit, index) => {
      const value = Number(digit) * (index % 2 === 0 ? 1 : 2);
      return total + (value > 9 ? value - 9 : value);
    }, 0);
  return sum % 10 === 0;
}
