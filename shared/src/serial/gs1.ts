import { ArithmeticError } from '../errors/arithmetic-error.js';

/**
 * Check digit of a GS1 number (GTIN-8, -12, -13, -14, SSCC). It catches every single wrong digit and most swaps of
 * neighbours, but not the swap of two that differ by five.
 *
 * @param payload the digits before the check digit
 * @returns one digit: weights 3, 1, 3 … from the right, filled up to the next ten
 * @throws ArithmeticError `serial_gs1_unreadable` for anything but digits
 * @source GS1 General Specifications, section 7.9 (check digit calculations).
 */
export function gs1CheckDigit(payload: string): string {
  if (!/^\d+$/.test(payload)) throw new ArithmeticError('serial_gs1_unreadable', { text: payload });
  const sum = Array.from(payload)
    .reverse()
    .reduce((total, digit, index) => total + Number(digit) * (index % 2 === 0 ? 3 : 1), 0);
  return String((10 - (sum % 10)) % 10);
}

/**
 * Reads a trade item number as it stands under a bar code.
 *
 * @param typed 8, 12, 13 or 14 digits, spaces and hyphens let pass
 * @returns the number in its 14-digit form, zeros in front
 * @throws ArithmeticError `serial_gs1_unreadable`, `serial_gs1_check_digit`
 */
export function readTradeItemNumber(typed: string): string {
  return readNumber(typed, [8, 12, 13, 14]).padStart(14, '0');
}

/**
 * Reads the number of a parcel or pallet (SSCC).
 *
 * @param typed 18 digits, spaces and hyphens let pass, with or without the identifier 00 in front
 * @returns the 18 digits
 * @throws ArithmeticError `serial_gs1_unreadable`, `serial_gs1_check_digit`
 */
export function readShippingContainerNumber(typed: string): string {
  return readNumber(typed.replace(/^\s*(\(00\)|00(?=(?:\D*\d){18}\D*$))/, ''), [18]);
}

function readNumber(typed: string, lengths: readonly number[]): string {
  const digits = typed.replace(/[\s-]/g, '');
  if (!/^\d+$/.test(digits) || !lengths.includes(digits.length)) {
    throw new ArithmeticError('serial_gs1_unreadable', { text: typed });
  }
  if (gs1CheckDigit(digits.slice(0, -1)) !== digits.slice(-1)) {
    throw new ArithmeticError('serial_gs1_check_digit', { text: typed });
  }
  return digits;
}
