import { describe, expect, it } from '@jest/globals';
import { AppError } from '../platform/errors/app-error.js';
import { decimalSignOf, readNumber } from './decimal-sign.js';
import { columnFaults, columnFor, findColumns } from './find-columns.js';
import type { ImportKind } from './import-kind.js';
import { readCsv } from './read-csv.js';
import { readTable } from './read-table.js';

const kind: ImportKind<null> = {
  key: 'parts',
  title: 'Parts',
  sentence: 'Parts of the shelf.',
  repeatable: true,
  columns: [
    {
      key: 'code',
      title: 'Code',
      aliases: ['part number'],
      required: true,
      cell: { type: 'code', pattern: /^[A-Z0-9-]{1,8}$/, sentence: 'Use letters and digits.' },
      sentence: '',
      examples: [],
    },
    { key: 'name', title: 'Name', cell: { type: 'text', max: 20 }, sentence: '', examples: [] },
    { key: 'cost', title: 'Unit cost', cell: { type: 'number', decimals: 6, least: 0 }, sentence: '', examples: [] },
    { key: 'days', title: 'Days', cell: { type: 'whole', least: 0, most: 9_999 }, sentence: '', examples: [] },
    { key: 'received', title: 'Received on', cell: { type: 'day' }, sentence: '', examples: [] },
    {
      key: 'followed',
      title: 'Followed',
      cell: { type: 'choice', choices: { count: ['by count'], delivery: ['by delivery', 'lots'] } },
      sentence: '',
      examples: [],
    },
  ],
  check: () => Promise.resolve({ faults: [], notes: [], additions: 0, plan: null }),
  apply: () => Promise.resolve({ documentId: null }),
};

const isKnown = (header: string) => columnFor(header, kind) !== undefined;
const csv = (text: string | Buffer) => readCsv(typeof text === 'string' ? Buffer.from(text) : text, isKnown);

async function refusal(text: string | Buffer): Promise<string> {
  const fault: unknown = await csv(text).catch((error: unknown) => error);
  if (!(fault instanceof AppError)) throw new Error('the file was taken');
  expect(fault.code).toBe('invalid_input');
  return fault.message;
}

async function read(text: string) {
  const table = await csv(text);
  return readTable(table, findColumns(table.headers, kind, new Map()), undefined);
}

describe('a CSV file', () => {
  it('is read with a byte-order mark, semicolons, Windows line ends and decimal commas', async () => {
    const { rows, faults, decimalSign } = await read(
      '\uFEFFCode;Unit cost;Received on\r\nr-10k;0,0125;28.02.2027\r\nr-1k;1.284,5;2027-03-01\r\n',
    );
    expect(faults).toEqual([]);
    expect(decimalSign).toBe('comma');
    expect(rows.map((row) => [row.line, row.text('code'), row.text('cost'), row.text('received')])).toEqual([
      [2, 'R-10K', '0.0125', '2027-02-28'],
      [3, 'R-1K', '1284.5', '2027-03-01'],
    ]);
  });

  it.each([',', ';', '\t'])('is cut at %j where that finds the headers', async (separator) => {
    const table = await csv(['Code', 'Name', 'Days'].join(separator) + '\n' + ['A', 'b', '3'].join(separator));
    expect(table.separator).toBe(separator);
    expect(table.rows).toEqual([{ line: 2, cells: ['A', 'b', '3'] }]);
  });

  it('counts lines as an editor does, over blank lines and cells of several lines', async () => {
    const table = await csv('Code,Name\n\nA,"two\nlines"\n,\nB,x\nC,3" tube');
    expect(table.rows).toEqual([
      { line: 3, cells: ['A', 'two\nlines'] },
      { line: 6, cells: ['B', 'x'] },
      { line: 7, cells: ['C', '3" tube'] },
    ]);
  });

  it('is refused where it is no text, with what to do', async () => {
    await expect(refusal('')).resolves.toContain('empty');
    await expect(refusal(Buffer.from([0x50, 0x4b, 3, 4, 0, 0]))).resolves.toContain('workbook');
    await expect(refusal(Buffer.from('%PDF-1.7'))).resolves.toContain('PDF');
    await expect(refusal(Buffer.from([0x89, 0x50, 0, 0x1a]))).resolves.toContain('no text');
    await expect(refusal(Buffer.from('\uFEFFCode\nA', 'utf16le'))).resolves.toContain('UTF-16');
    await expect(
      refusal(Buffer.concat([Buffer.from('Code,Name\nA,'), Buffer.from([0xe9]), Buffer.from('\nB,c')])),
    ).resolves.toContain('Line 2');
  });

  it('is refused where it is no table, with the line', async () => {
    await expect(refusal('Code,Name\nA,b\nC,"never\nclosed\n')).resolves.toContain('line 3');
    await expect(refusal('Code,Name\n')).resolves.toContain('nothing below');
    await expect(refusal(`Code,Name\nA,${'x'.repeat(3_000)}\n`)).resolves.toContain('Line 2');
    await expect(
      refusal(`${Array.from({ length: 101 }, (_, index) => `c${index}`).join(',')}\n1\n`),
    ).resolves.toContain('101 columns');
  });

  it('names every fault by its line and column, and leaves faulty lines out', async () => {
    const { rows, faults } = await read(
      'Part number,Name,Unit cost,Days,Received on,Followed\n' +
        'A,ok,0.5,1,2027-01-01,lots\n' +
        ',no code,0.5,1,2027-01-01,lots\n' +
        'B!,x,-1,1.5,2027-02-30,sometimes,extra\n' +
        `C,${'n'.repeat(21)},0.1234567,99999,,\n`,
    );
    expect(rows.map((row) => row.line)).toEqual([2]);
    expect(faults.map(({ line, column }) => [line, column])).toEqual([
      [3, 'Code'],
      [4, null],
      [4, 'Code'],
      [4, 'Unit cost'],
      [4, 'Days'],
      [4, 'Received on'],
      [4, 'Followed'],
      [5, 'Name'],
      [5, 'Unit cost'],
      [5, 'Days'],
    ]);
  });

  it('does not guess between two readings of a number', async () => {
    const unsure = await read('Code,Unit cost\nA,"1,500"\n');
    expect(unsure.faults.map(({ sentence }) => sentence).join()).toContain('decimals or with thousands');
    const mixed = await read('Code,Unit cost\nA,"1,50"\nB,1.25\n');
    expect(mixed.faults.map(({ line }) => line)).toEqual([1]);
    const shown = await read('Code;Unit cost\nA;1,500\nB;0,25\n');
    expect(shown.rows.map((row) => row.text('cost'))).toEqual(['1.5', '0.25']);
  });
});

describe('the columns of a file', () => {
  it('are found by title or other names whatever their case and signs, and can be corrected', () => {
    const found = findColumns(['PART NUMBER', 'unit_cost', 'Colour'], kind, new Map());
    expect(found.map(({ column }) => column?.key)).toEqual(['code', 'cost', undefined]);
    const corrected = findColumns(
      ['PART NUMBER', 'unit_cost', 'Colour'],
      kind,
      new Map([
        [1, null],
        [2, 'name'],
      ]),
    );
    expect(corrected.map(({ column }) => column?.key)).toEqual(['code', undefined, 'name']);
  });

  it('must be there when they are needed, and once', () => {
    const missing = columnFaults(findColumns(['Name'], kind, new Map()), kind);
    expect(missing.missing.map(({ key }) => key)).toEqual(['code']);
    const doubled = columnFaults(findColumns(['Code', 'Part number'], kind, new Map()), kind);
    expect(doubled.doubled).toEqual(['Code']);
  });
});

describe('numbers in a file', () => {
  it.each<[string, 'point' | 'comma' | undefined, string | null | undefined]>([
    ['12', undefined, '12'],
    ['-012.50', 'point', '-12.5'],
    ['1 284,60', 'comma', '1284.6'],
    ["1'284.60", 'point', '1284.6'],
    ['.5', 'point', '0.5'],
    [',5', 'comma', '0.5'],
    ['1,500', undefined, null],
    ['1,500', 'point', '1500'],
    ['1,500', 'comma', '1.5'],
    ['12,84,60', 'point', undefined],
    ['1.2.3', 'point', undefined],
    ['1e5', 'point', undefined],
    ['abc', 'point', undefined],
    ['\u22123', undefined, '-3'],
    ['-0', undefined, '0'],
  ])('%s with decimal %s reads as %s', (text, sign, value) => {
    expect(readNumber(text, sign)).toBe(value);
  });

  it('show their decimal sign together', () => {
    expect(decimalSignOf(['1,500', '2,750', '3'])).toEqual({ sign: undefined, mixed: false });
    expect(decimalSignOf(['1,500', '0,5'])).toEqual({ sign: 'comma', mixed: false });
    expect(decimalSignOf(['1,284,600', '12'])).toEqual({ sign: 'point', mixed: false });
    expect(decimalSignOf(['0,5', '0.5'])).toEqual({ sign: undefined, mixed: true });
  });
});
