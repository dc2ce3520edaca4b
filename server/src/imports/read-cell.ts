import { quantityDigits } from '@emberlot/shared/limits/numbers';
import { readNumber, type DecimalSign } from './decimal-sign.js';
import type { CellType } from './import-kind.js';
import type { CellValue } from './import-row.js';

export type ReadCell = { readonly value: CellValue } | { readonly fault: string };

/** Tabs and line ends may stand in a quoted cell; other control characters cannot be shown and do not belong there. */
const unprintable = /(?![\n\r\t])\p{Cc}/u;

/** Reads a filled cell by its column's type, or says what is wrong with it. */
export function readCell(text: string, cell: CellType, sign: DecimalSign | undefined): ReadCell {
  switch (cell.type) {
    case 'text':
      return readText(text, cell.max);
    case 'code': {
      const code = text.toUpperCase();
      return cell.pattern.test(code)
        ? { value: code }
        : { fault: `“${short(text)}” is no such code. ${cell.sentence}` };
    }
    case 'number':
      return readDecimal(text, cell, sign);
    case 'whole':
      return readWhole(text, cell, sign);
    case 'day':
      return readDay(text);
    default:
      return readChoice(text, cell.choices);
  }
}

function readText(text: string, max: number): ReadCell {
  if (unprintable.test(text)) return { fault: 'There is a character in it that cannot be shown.' };
  const length = Array.from(text).length;
  return length > max ? { fault: `It has ${length} characters; at most ${max} are kept.` } : { value: text };
}

function readDecimal(text: string, cell: CellType & { type: 'number' }, sign: DecimalSign | undefined): ReadCell {
  const value = readNumber(text, sign);
  if (value === undefined) return { fault: `“${short(text)}” is not a number.` };
  if (value === null) {
    return {
      fault: `“${text}” could be read with decimals or with thousands. Write it without separators, or say which sign the file uses before decimals.`,
    };
  }
  const [whole = '', fraction = ''] = value.replace('-', '').split('.');
  if (whole.length > quantityDigits.whole) return { fault: `${short(value)} is larger than can be kept.` };
  if (fraction.length > cell.decimals) {
    return {
      fault:
        cell.decimals === 0 ? `${value} must be a whole number.` : `${value} has more than ${cell.decimals} decimals.`,
    };
  }
  const negative = value.startsWith('-');
  if (cell.above === 0 && (negative || value === '0')) return { fault: `${value} must be above zero.` };
  if (cell.least === 0 && negative) return { fault: `${value} must not be below zero.` };
  return { value };
}

function readWhole(text: string, cell: CellType & { type: 'whole' }, sign: DecimalSign | undefined): ReadCell {
  const value = readNumber(text, sign);
  const number = typeof value === 'string' && /^-?\d{1,15}$/.test(value) ? Number(value) : Number.NaN;
  if (number >= cell.least && number <= cell.most) return { value: number };
  return { fault: `“${short(text)}” must be a whole number from ${cell.least} to ${cell.most}.` };
}

/** Year first as in ISO 8601, or day first as the countries around the shop write it. */
function readDay(text: string): ReadCell {
  const yearFirst = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  const dayFirst = /^(\d{1,2})[./](\d{1,2})[./](\d{4})$/.exec(text);
  const [year, month, day] = yearFirst ? yearFirst.slice(1) : (dayFirst?.slice(1).toReversed() ?? []);
  const iso = `${year}-${month?.padStart(2, '0')}-${day?.padStart(2, '0')}`;
  const date = new Date(`${iso}T00:00:00Z`);
  const real = !Number.isNaN(date.getTime()) && date.toISOString().startsWith(iso) && iso >= '1900-01-01';
  return real ? { value: iso } : { fault: `“${short(text)}” is no day. Write it as 2027-02-28 or 28.02.2027.` };
}

function readChoice(text: string, choices: Readonly<Record<string, readonly string[]>>): ReadCell {
  const asked = text.toLowerCase();
  const found = Object.entries(choices).find(([value, words]) => value === asked || words.includes(asked));
  if (found) return { value: found[0] };
  const known = Object.entries(choices).map(([value, words]) => words[0] ?? value);
  return { fault: `“${short(text)}” is none of: ${known.join(', ')}.` };
}

function short(text: string): string {
  return text.length > 40 ? `${text.slice(0, 39)}…` : text;
}
