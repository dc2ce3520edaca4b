import { groupDigits } from './format-money';

const noBreakSpace = '\u00a0';

/**
 * A quantity for reading: the decimal string without idle zeros, digits grouped, its unit behind a space that never breaks.
 * @param decimals keeps this many places, for columns that line up; the value is not rounded, only filled
 */
export function formatQuantity(quantity: string, unit?: string, decimals?: number): string {
  const [whole = '0', fraction = ''] = quantity.split('.');
  const bare = fraction.replace(/0+$/, '');
  const kept = decimals === undefined ? bare : bare.padEnd(decimals, '0');
  const figure = groupDigits(kept ? `${whole}.${kept}` : whole);
  return unit ? `${figure}${noBreakSpace}${unit}` : figure;
}

/** A reading keeps exactly the digits its instrument gave. */
export function formatReading(value: string, unit?: string): string {
  const figure = groupDigits(value);
  return unit ? `${figure}${noBreakSpace}${unit}` : figure;
}

/** `1 part`, `3 parts`, `no parts`. */
export function formatCount(count: number, one: string, many = `${one}s`): string {
  if (count === 0) return `no ${many}`;
  return `${groupDigits(String(count))}${noBreakSpace}${count === 1 ? one : many}`;
}
