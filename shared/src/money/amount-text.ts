import { ArithmeticError } from '../errors/arithmetic-error.js';
import { currencyExponent, type CurrencyCode } from './currency.js';
import { minorAmountOf, type MinorAmount } from './minor-units.js';

/**
 * Writes an amount in major units for files and documents (UBL, CSV): a point, no grouping, all decimals of the
 * currency.
 *
 * @param amount minor units
 * @param currency decides the decimals
 * @returns for example "-12.05" for −1205 cents, "1205" for JPY
 */
export function majorText(amount: MinorAmount, currency: CurrencyCode): string {
  const places = currencyExponent(currency);
  const digits = String(Math.abs(amount)).padStart(places + 1, '0');
  const sign = amount < 0 ? '-' : '';
  if (places === 0) return sign + digits;
  return `${sign}${digits.slice(0, -places)}.${digits.slice(-places)}`;
}

/**
 * Reads an amount in major units.
 *
 * @param text plain notation with a point ("12.5", "-0.05"); zeros past the currency's decimals are let pass
 * @param currency decides the decimals
 * @returns minor units
 * @throws ArithmeticError `money_unreadable`, `money_too_many_decimals`, `money_too_large`
 */
export function minorAmountFromMajor(text: string, currency: CurrencyCode): MinorAmount {
  const parts = /^([+-]?)(\d+)(?:\.(\d+))?$/.exec(text);
  if (!parts) throw new ArithmeticError('money_unreadable', { text });
  const places = currencyExponent(currency);
  const decimals = (parts[3] ?? '').replace(/0+$/, '');
  if (decimals.length > places) {
    throw new ArithmeticError('money_too_many_decimals', { text, currency, decimals: places });
  }
  const size = BigInt(`${parts[2] ?? ''}${decimals.padEnd(places, '0')}`);
  return minorAmountOf(parts[1] === '-' ? -size : size);
}
