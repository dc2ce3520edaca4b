import { ArithmeticError } from '../errors/arithmetic-error.js';

/**
 * Remainder by 97 of a text read as one number, letters standing for 10 (A) to 35 (Z).
 *
 * @param text digits and capital letters, any length
 * @returns 0 to 96; 0 for empty text
 * @throws ArithmeticError `serial_not_digits`
 * @source ISO/IEC 7064:2003, MOD 97-10; letters as in ISO 13616 and ISO 11649.
 */
export function remainderBy97(text: string): number {
  let remainder = 0;
  for (const character of text) {
    const value = characterValue(character, text);
    remainder = (remainder * (value > 9 ? 100 : 10) + value) % 97;
  }
  return remainder;
}

/**
 * The two check digits to write behind a text.
 *
 * @param payload digits and capital letters
 * @returns "02" to "98", the range that ISO 13616 asks for (00 and 01 would leave the same remainder as 97 and 98)
 * @throws ArithmeticError `serial_not_digits`
 * @source ISO/IEC 7064:2003, MOD 97-10.
 */
export function mod97CheckDigits(payload: string): string {
  return String(98 - ((remainderBy97(payload) * 100) % 97)).padStart(2, '0');
}

/**
 * Whether a text ends with its right check digits. The pairs 00, 01 and 99 leave the same remainder as 97, 98 and 02
 * but are never issued, and are refused.
 *
 * Over digits every single wrong digit, every swap of two digits (neighbours or not, up to 96 digits) and every wrong
 * pair of like neighbours is caught; of other faults about one in 97 is not.
 *
 * @param text payload and two check digits
 * @returns true if they belong together; false also for text that cannot be read
 * @source ISO/IEC 7064:2003, MOD 97-10.
 */
export function hasMod97CheckDigits(text: string): boolean {
  return /^[0-9A-Z]+\d{2}$/.test(text) && mod97CheckDigits(text.slice(0, -2)) === text.slice(-2);
}

function characterValue(character: string, text: string): number {
  if (!/^[0-9A-Z]$/.test(character)) throw new ArithmeticError('serial_not_digits', { text });
  return Number.parseInt(character, 36);
}
