/**
 * Reads a number as people type it: `1.5`, `1,5`, `1 284,60`, `1,284.60`. A single separator is the decimal sign unless
 * it can only be grouping (`1,284,600`); where both stand, the last one is the decimal sign.
 * @returns a plain decimal string, or undefined if it is no number
 */
export function parseDecimal(typed: string): string | undefined {
  const bare = typed
    .trim()
    .replace(/[\s\u00a0\u202f']/g, '')
    .replace('\u2212', '-');
  if (!/^-?[\d.,]*\d[.,]?$|^-?[.,]\d+$/.test(bare)) return undefined;
  const sign = bare.startsWith('-') ? '-' : '';
  const figure = sign ? bare.slice(1) : bare;
  const point = decimalSign(figure);
  const whole = (point === -1 ? figure : figure.slice(0, point)).replace(/[.,]/g, '').replace(/^0+(?=\d)/, '') || '0';
  const fraction = point === -1 ? '' : figure.slice(point + 1);
  if (!groupsAreWhole(point === -1 ? figure : figure.slice(0, point))) return undefined;
  const value = fraction ? `${whole}.${fraction}` : whole;
  return /^0(\.0*)?$/.test(value) ? value : sign + value;
}

function decimalSign(figure: string): number {
  const comma = figure.lastIndexOf(',');
  const dot = figure.lastIndexOf('.');
  if (comma !== -1 && dot !== -1) return Math.max(comma, dot);
  const last = Math.max(comma, dot);
  if (last === -1) return -1;
  const sign = figure.charAt(last);
  return figure.indexOf(sign) === last ? last : -1;
}

/** `12,84` before a decimal sign is a slip, not a thousand. */
function groupsAreWhole(whole: string): boolean {
  const separators = new Set(whole.replace(/\d/g, ''));
  if (separators.size > 1) return false;
  const [first = '', ...groups] = whole.split(/[.,]/);
  return groups.length === 0 || (first.length > 0 && first.length <= 3 && groups.every((group) => group.length === 3));
}

/**
 * A typed amount of money as whole minor units.
 * @returns undefined if it is no number, has more places than the currency, or is too large to be exact
 */
export function parseMinor(typed: string, decimals: number): number | undefined {
  const value = parseDecimal(typed);
  if (value === undefined) return undefined;
  const [whole = '0', fraction = ''] = value.split('.');
  const kept = fraction.replace(/0+$/, '');
  if (kept.length > decimals) return undefined;
  const minor = Number(`${whole}${kept.padEnd(decimals, '0')}`);
  return Number.isSafeInteger(minor) ? minor + 0 : undefined;
}
