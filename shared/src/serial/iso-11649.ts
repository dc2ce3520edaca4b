import { ArithmeticError } from '../errors/arithmetic-error.js';
import { mod97CheckDigits, remainderBy97 } from './mod-97-10.js';

/**
 * Reference a payer writes on a transfer so that it finds its invoice: RF, two check digits, up to 21 characters.
 *
 * @param reference 1 to 21 digits and letters, for example the invoice's number without signs
 * @returns the reference in its electronic form, for example "RF18539007547034"
 * @throws ArithmeticError `serial_reference_unreadable`
 * @source ISO 11649:2009; MOD 97-10 over the reference with RF00 moved behind it.
 */
export function creditorReference(reference: string): string {
  const payload = reference.toUpperCase();
  if (!/^[0-9A-Z]{1,21}$/.test(payload)) throw new ArithmeticError('serial_reference_unreadable', { text: reference });
  return `RF${mod97CheckDigits(`${payload}RF`)}${payload}`;
}

/**
 * Reads such a reference from a bank statement or a form.
 *
 * @param typed with or without spaces, capital or small letters
 * @returns the reference in its electronic form, and what it refers to
 * @throws ArithmeticError `serial_reference_unreadable`, `serial_reference_check_digits`
 */
export function readCreditorReference(typed: string): { readonly text: string; readonly reference: string } {
  const text = typed.replace(/\s/g, '').toUpperCase();
  if (!/^RF\d{2}[0-9A-Z]{1,21}$/.test(text)) throw new ArithmeticError('serial_reference_unreadable', { text: typed });
  const reference = text.slice(4);
  // The check digits run from 02 to 98, so comparing with the ones that would be written also refuses 00, 01 and 99.
  if (remainderBy97(reference + text.slice(0, 4)) !== 1 || creditorReference(reference) !== text) {
    throw new ArithmeticError('serial_reference_check_digits', { text: typed });
  }
  return { text, reference };
}

/**
 * Writes a reference or account number for reading aloud.
 *
 * @param text electronic form
 * @returns groups of four with spaces
 */
export function inGroupsOfFour(text: string): string {
  return text.replace(/(.{4})(?=.)/g, '$1 ');
}
