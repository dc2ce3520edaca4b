import { type CaptureUnit, findUnit, kindOfName, splitUnit } from './capture-units.js';
import type { LayoutColumn } from './capture-layout.js';
import { splitCells } from './cells.js';
import type { TableShape } from './detect-table.js';

interface HeaderRows {
  readonly names: readonly string[];
  readonly units: readonly string[];
}

/** The last one or two lines before the data name the columns and, where there are two, their units. */
function headerRows(lines: readonly string[], shape: TableShape): HeaderRows {
  const above = lines
    .slice(0, shape.firstRow)
    .filter((line) => line.trim() !== '')
    .slice(-2)
    .map((line) => splitCells(line.replace(/^[#%;'"]+\s*(?=\S)/, ''), shape.delimiter));
  const last = above.at(-1) ?? [];
  const before = above.at(-2) ?? [];
  const filled = shape.columns.map((column) => last[column] ?? '').filter((cell) => cell !== '');
  const isUnitRow =
    filled.some((cell) => findUnit(cell) !== undefined) &&
    filled.every((cell) => findUnit(cell) !== undefined || ['index', 'time'].includes(kindOfName(cell) ?? ''));
  // A lone row of short names such as "t, V" may be either; it names the columns unless names stand above it.
  const named = shape.columns.every((column) => /[a-z]/i.test(before[column] ?? ''));
  return isUnitRow && named ? { names: before, units: last } : { names: last, units: [] };
}

function describe(index: number, rows: HeaderRows): LayoutColumn {
  const cell = rows.names[index] ?? '';
  const split = splitUnit(cell);
  const alone = findUnit(cell);
  const unit: CaptureUnit | undefined = findUnit(rows.units[index] ?? '') ?? split.unit ?? alone;
  const name = split.name === '' ? cell : split.name;
  const kind = unit?.kind ?? kindOfName(rows.units[index] ?? '') ?? kindOfName(name) ?? 'other';
  // "Time" over volts would be nonsense: a unit decides, except that an index has none.
  return { index, name: name === '' ? `column ${index + 1}` : name, kind, unit };
}

/**
 * Names, units and kinds of the columns of numbers.
 *
 * @param lines the first lines of the file
 * @param shape from `detectTable`
 * @returns one description per column, in order
 */
export function describeColumns(lines: readonly string[], shape: TableShape): readonly LayoutColumn[] {
  const rows = headerRows(lines, shape);
  return shape.columns.map((index) => describe(index, rows));
}

export interface PreambleTiming {
  readonly intervalSeconds: number | undefined;
  readonly startSeconds: number;
}

const intervalKey =
  /sampl\w* (interval|period|time)|increment|x\s*incr|time ?(base )?step|delta ?t|^dt$|^Δt$|hresolution|horizontal resolution/i;
const rateKey = /sampl\w* ?(rate|freq)/i;
const startKey = /^start$|start time|x\s*(zero|origin|start)|first sample/i;

/** "1.0E-7 s", "100 ns" or "5 MS/s" as a number in seconds or samples per second. */
function readFigure(cell: string, decimalMark: '.' | ','): number | undefined {
  const plain = decimalMark === ',' ? cell.replace(',', '.') : cell;
  const [, digits, word = ''] = /^\s*([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)\s*(\S*)\s*$/i.exec(plain) ?? [];
  if (digits === undefined) return undefined;
  const value = Number(digits);
  const unit = findUnit(word);
  if (unit?.kind === 'time') return (value * unit.factor) / unit.divisor;
  const [, prefix] = /^([kMG]?)(?:S\/s|Sa\/s|Hz)$/.exec(word) ?? [];
  if (prefix !== undefined) return value * ({ k: 1e3, M: 1e6, G: 1e9 }[prefix] ?? 1);
  return word === '' ? value : undefined;
}

/**
 * Sample interval and start from the lines above the data: "key, value" in a line, or a named column with its value one
 * line below.
 *
 * @param lines the first lines of the file
 * @param shape from `detectTable`
 * @returns seconds between samples if the file says, and the instant of the first (0 if it does not)
 */
export function readTiming(lines: readonly string[], shape: TableShape): PreambleTiming {
  const { delimiter, decimalMark } = shape;
  const split = lines
    .slice(0, shape.firstRow + 8)
    .map((line) =>
      line.includes(delimiter) ? splitCells(line, delimiter) : line.split(/[:=]/).map((cell) => cell.trim()),
    );
  const find = (key: RegExp): number | undefined => {
    for (const [row, cells] of split.entries()) {
      for (const [column, cell] of cells.entries()) {
        if (!key.test(cell)) continue;
        const { unit } = splitUnit(cell);
        const value = [cells[column + 1], split[row + 1]?.[column]]
          .map((each) => readFigure(each ?? '', decimalMark))
          .find((each) => each !== undefined);
        if (value !== undefined) return unit?.kind === 'time' ? (value * unit.factor) / unit.divisor : value;
      }
    }
    return undefined;
  };
  const interval = find(intervalKey);
  const rate = interval === undefined ? find(rateKey) : undefined;
  const seconds = interval ?? (rate === undefined ? undefined : 1 / rate);
  const usable = seconds !== undefined && seconds > 0 && Number.isFinite(seconds);
  return { intervalSeconds: usable ? seconds : undefined, startSeconds: find(startKey) ?? 0 };
}
