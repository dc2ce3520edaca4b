export type DecimalSign = 'point' | 'comma';

export interface DecimalSigns {
  /** The sign the file uses, as far as it shows one. */
  readonly sign: DecimalSign | undefined;
  /** Whether some numbers can only be read one way and some only the other. */
  readonly mixed: boolean;
}

/** Grouped thousands with one kind of separator can be read two ways only where there is exactly one group. */
const undecided = /^-?[1-9]\d{0,2}[.,]\d{3}$/;

/**
 * Finds out which sign a file writes before decimals. A single `1,500` could be one and a half or fifteen hundred, but
 * a file writes all its numbers one way, and any of `0,5`, `12,50` or `1.284,60` gives it away.
 */
export function decimalSignOf(numbers: Iterable<string>): DecimalSigns {
  const seen = new Set<DecimalSign>();
  for (const text of numbers) {
    const bare = withoutSpaces(text);
    const sign = undecided.test(bare) ? undefined : signIn(bare);
    if (sign) seen.add(sign);
  }
  const [sign] = seen;
  return { sign: seen.size === 1 ? sign : undefined, mixed: seen.size > 1 };
}

function signIn(text: string): DecimalSign | undefined {
  const comma = text.lastIndexOf(',');
  const point = text.lastIndexOf('.');
  if (comma < 0 && point < 0) return undefined;
  if (comma >= 0 && point >= 0) return comma > point ? 'comma' : 'point';
  const mark = comma >= 0 ? ',' : '.';
  const groups = text.split(mark).length - 1;
  // Several of one kind are grouping, so the other one is the decimal sign.
  if (groups > 1) return mark === ',' ? 'point' : 'comma';
  return mark === ',' ? 'comma' : 'point';
}

/**
 * Reads a number as a file writes it.
 *
 * @param text trimmed, as it stands in the cell
 * @param sign the file's decimal sign, or undefined while it has shown none
 * @returns a plain decimal text with a point; null for one that could be read two ways; undefined for no number
 */
export function readNumber(text: string, sign: DecimalSign | undefined): string | null | undefined {
  const bare = withoutSpaces(text);
  if (/^-?\d+$/.test(bare)) return plain(bare);
  if (sign === undefined) return undecided.test(bare) ? null : undefined;
  const [decimalMark, groupMark] = sign === 'comma' ? [',', '.'] : ['.', ','];
  const [whole = '', fraction, ...more] = bare.split(decimalMark);
  if (more.length > 0 || (fraction !== undefined && !/^\d+$/.test(fraction))) return undefined;
  const groups = whole.split(groupMark);
  const [first = '', ...others] = groups;
  if (!/^-?\d*$/.test(first) || others.some((group) => !/^\d{3}$/.test(group))) return undefined;
  if (others.length > 0 && !/^-?\d{1,3}$/.test(first)) return undefined;
  const digits = groups.join('');
  if (!/\d/.test(digits) && fraction === undefined) return undefined;
  return plain(`${/\d/.test(digits) ? digits : `${digits}0`}${fraction === undefined ? '' : `.${fraction}`}`);
}

/** Spaces of any width and apostrophes group thousands; a true minus sign counts as one. */
function withoutSpaces(text: string): string {
  return text.replaceAll(/[\s\u00a0\u202f']/g, '').replace('\u2212', '-');
}

function plain(text: string): string {
  const negative = text.startsWith('-');
  const [whole = '0', fraction = ''] = (negative ? text.slice(1) : text).split('.');
  const kept = fraction.replace(/0+$/, '');
  const value = `${whole.replace(/^0+(?=\d)/, '')}${kept ? `.${kept}` : ''}`;
  return negative && value !== '0' ? `-${value}` : value;
}
