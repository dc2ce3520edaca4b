import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { ArithmeticError } from '../errors/arithmetic-error.js';
import type { CaptureLayout, LayoutHints } from './capture-layout.js';
import { CaptureParser } from './capture-parser.js';
import { decodeText, encodeUtf8 } from './text-bytes.js';

const codeOf = (compute: () => unknown): string => {
  try {
    compute();
  } catch (error) {
    if (error instanceof ArithmeticError) return error.code;
    throw error;
  }
  return 'no fault';
};

interface Read {
  readonly layout: CaptureLayout;
  readonly columns: readonly (readonly number[])[];
  readonly unreadable: number;
  readonly gaps: number;
}

function readAll(chunks: readonly (Uint8Array | string)[], hints: LayoutHints = {}): Read {
  const columns: number[][] = [];
  const parser = new CaptureParser({
    hints,
    onRows: (blocks, count) =>
      blocks.forEach((block, slot) => (columns[slot] ??= []).push(...block.subarray(0, count))),
  });
  for (const chunk of chunks) parser.push(chunk);
  const { layout, counts } = parser.finish();
  expect(columns[0]).toHaveLength(counts.rows);
  return { layout, columns, unreadable: counts.unreadable, gaps: counts.gaps };
}
const read = (text: string, hints: LayoutHints = {}) => readAll([text], hints);
const lines = (...rows: readonly string[]) => rows.join('\n');

describe('layouts', () => {
  test('a header with units in brackets', () => {
    const found = read(lines('Time (ms),CH1 (mV),CH2 (V)', '0,1000,5', '0.5,1500,4', '1,2000,3'));
    expect(found.columns).toEqual([
      [0, 0.0005, 0.001],
      [1, 1.5, 2],
      [5, 4, 3],
    ]);
    expect(found.layout).toMatchObject({ delimiter: ',', decimalMark: '.', preambleLines: 1, notes: [] });
    expect(found.layout.channels.map((column) => column.name)).toEqual(['CH1', 'CH2']);
  });

  test('semicolons, decimal commas, a byte-order mark and Windows line ends', () => {
    const found = read('\uFEFFZeit in ms;Kanal 1 [V]\r\n0,0;1,5\r\n0,5;-2,25\r\n1,0;3\r\n');
    expect(found.columns).toEqual([
      [0, 0.0005, 0.001],
      [1.5, -2.25, 3],
    ]);
    expect(found.layout).toMatchObject({ delimiter: ';', decimalMark: ',' });
  });

  test('tabs, units in a row of their own, old line ends', () => {
    const found = read('Time\tGate A\tGate B\r\r(us)\t(V)\t(V)\r-1\t0\t1\r0\t0\t1\r1\t10\t0\r');
    expect(found.columns[0]).toEqual([-1e-6, 0, 1e-6]);
    expect(found.layout.channels.map((column) => column.name)).toEqual(['Gate A', 'Gate B']);
    expect(found.layout.newline).toBe(13);
  });

  test('columns parted by blanks, with remarks before', () => {
    const found = read(lines('# made at the bench', '# t  U', '  0.0   1.0', '  1.0   2.0', '  2.0  10.0'));
    expect(found.columns).toEqual([
      [0, 1, 2],
      [1, 2, 10],
    ]);
    expect(found.layout.notes).toContain('time_in_seconds_assumed');
  });

  test('a long preamble of keys and values', () => {
    const found = read(
      lines(
        'Instrument,bench scope',
        'Record length,4',
        'Probe,10',
        'Vertical Units,V',
        '',
        'TIME,CH1',
        '-1e-6,0.1',
        '0,0.2',
        '1e-6,0.3',
        '2e-6,0.4',
      ),
    );
    expect(found.columns).toEqual([
      [-1e-6, 0, 1e-6, 2e-6],
      [0.1, 0.2, 0.3, 0.4],
    ]);
    expect(found.layout.preambleLines).toBe(6);
  });

  test('settings in columns beside the first rows of data', () => {
    const rows = Array.from({ length: 30 }, (_, index) => {
      const settings = ['Record Length,2500,Points', 'Sample Interval,1e-6,s', 'Probe Atten,1,'][index] ?? ',,';
      return `${settings},${(index * 1e-6).toExponential(6)},${(index % 5).toFixed(2)}`;
    });
    const found = read(lines(...rows));
    expect(found.columns[0]).toHaveLength(30);
    expect(found.columns[0]?.[29]).toBe(29e-6);
    expect(found.columns[1]?.slice(0, 6)).toEqual([0, 1, 2, 3, 4, 0]);
  });

  test('a counter with start and increment in the second line', () => {
    const found = read(
      lines(
        'X,CH1,CH2,Start,Increment',
        'Sequence,Volt,Volt,-6.0e-4,1.0e-6',
        '0,1.5,2.5,,',
        '1,1.6,2.6,,',
        '2,1.7,2.7,,',
      ),
    );
    expect(found.layout.time).toEqual({ from: 'interval', startSeconds: -6e-4, intervalSeconds: 1e-6 });
    expect(found.layout.channels.map((column) => column.name)).toEqual(['CH1', 'CH2']);
    expect(found.columns[0]?.[2]).toBeCloseTo(-5.98e-4, 12);
    expect(found.columns[2]).toEqual([2.5, 2.6, 2.7]);
    expect(found.layout.notes).toEqual(['interval_from_header']);
  });

  test('no time at all, but a rate in the preamble or an interval from the person', () => {
    const withRate = read(lines('Sampling Rate: 5 MSa/s', 'CH1 (V)', '1', '2', '4', '3'));
    expect(withRate.columns[0]?.[3]).toBeCloseTo(6e-7, 15);
    const given = read(lines('sample,V', '7,1', '8,2', '9,4'), { sampleIntervalSeconds: 0.25 });
    expect(given.columns).toEqual([
      [0, 0.25, 0.5],
      [1, 2, 4],
    ]);
    expect(given.layout.notes).toContain('interval_given');
    expect(codeOf(() => read(lines('sample,V', '7,1', '8,2', '9,4')))).toBe('capture_no_time');
    expect(codeOf(() => read(lines('V', '7', '1', '8')))).toBe('capture_no_time');
  });

  test('no header at all: the first rising column is time in seconds', () => {
    const found = read(lines('0.1,5', '0.2,7', '0.3,6'));
    expect(found.columns).toEqual([
      [0.1, 0.2, 0.3],
      [5, 7, 6],
    ]);
    expect(found.layout.notes).toEqual(['time_in_seconds_assumed', 'volts_assumed']);
  });

  test('clock times that run past midnight, and dates', () => {
    const clock = read(lines('Time,Temp (°C)', '23:59:58,20', '23:59:59.5,21', '00:00:01,22'));
    expect(clock.columns[0]).toEqual([86398, 86399.5, 86401]);
    const dated = read(lines('Date,Temp (°F)', '2026-03-01 23:59:00,212', '2026-03-02 00:01:00,32'));
    expect((dated.columns[0]?.[1] ?? 0) - (dated.columns[0]?.[0] ?? 0)).toBe(120);
    expect(dated.columns[1]?.[0]).toBeCloseTo(100, 10);
    expect(dated.columns[1]?.[1]).toBeCloseTo(0, 10);
  });

  test('quoted cells, trailing delimiters, footers, gaps and overflows', () => {
    const plain = Array.from({ length: 12 }, (_, index) => `${index - 12},1,`);
    const odd = ['"0","1.5",', '"1","--",', '"2",inf,', '3,,', '4,1.25V,', '5', '', 'end of data,,', ''];
    const found = read(lines('"Time (s)","CH1 (V)",', ...plain, ...odd));
    expect(found.columns.map((column) => column.slice(12))).toEqual([
      [0, 1, 2, 3, 4, 5],
      [1.5, Number.NaN, Number.POSITIVE_INFINITY, Number.NaN, 1.25, Number.NaN],
    ]);
    expect(found.unreadable).toBe(1);
    expect(found.gaps).toBe(3);
  });

  test('only the columns asked for, in the order asked for', () => {
    const text = lines('t (s),A (V),B (V),C (V)', '0,1,2,3', '1,4,5,6', '2,7,8,9');
    expect(read(text, { channels: [3, 1] }).columns).toEqual([
      [0, 1, 2],
      [3, 6, 9],
      [1, 4, 7],
    ]);
    expect(codeOf(() => read(text, { channels: [9] }))).toBe('capture_no_such_column');
  });

  test('sixteen-bit text, as spreadsheets save it', () => {
    const text = 'Time (µs)\tCH1 (V)\r\n0\t1\r\n1\t2\r\n2\t3\r\n';
    for (const little of [true, false]) {
      const bytes = new Uint8Array(2 + text.length * 2);
      bytes.set(little ? [0xff, 0xfe] : [0xfe, 0xff]);
      text.split('').forEach((character, index) => {
        const code = character.charCodeAt(0);
        bytes.set(little ? [code & 0xff, code >> 8] : [code >> 8, code & 0xff], 2 + index * 2);
      });
      const found = readAll([bytes.subarray(0, 7), bytes.subarray(7)]);
      expect(found.columns).toEqual([
        [0, 1e-6, 2e-6],
        [1, 2, 3],
      ]);
    }
  });

  test('micro signs of older eight-bit exports', () => {
    const latin = Uint8Array.from('Time (\xb5s),U (V)\n0,1\n1,2\n2,3\n', (character) => character.charCodeAt(0));
    expect(readAll([latin]).columns[0]).toEqual([0, 1e-6, 2e-6]);
  });
});

describe('refusals', () => {
  test.each([
    ['', 'capture_empty'],
    ['\n \r\n', 'capture_empty'],
    ['a,b\nc,d\n', 'capture_no_numbers'],
    ['PK\u0003\u0004\u0000\u0000', 'capture_binary'],
    ['t (s)\n0\n1\n2\n', 'capture_no_channel'],
    ['t (s),U (V)\n0,1\n1,2\n1,3\n2,4\n', 'capture_time_not_increasing'],
    ['t (s),U (V)\n0,1\n2,2\n1,3\n3,4\n', 'capture_time_not_increasing'],
  ])('%j', (text, code) => {
    expect(codeOf(() => read(text))).toBe(code);
  });

  test('a file that never ends its line', () => {
    const parser = new CaptureParser({ onRows: () => {} });
    parser.push(lines('t (s),U (V)', ...Array.from({ length: 9000 }, (_, index) => `${index},1`), ''));
    expect(codeOf(() => parser.push('9'.repeat(1_100_000)))).toBe('capture_line_too_long');
  });

  test('a capture that is used after its end', () => {
    const parser = new CaptureParser({ onRows: () => {} });
    parser.push('t (s),U (V)\n0,1\n1,2\n');
    parser.finish();
    expect(codeOf(() => parser.push('2,3\n'))).toBe('capture_finished');
    expect(codeOf(() => parser.finish())).toBe('capture_finished');
  });

  test('the row at which time stands still is named', () => {
    try {
      read('t (s),U (V)\n0,1\n1,2\n1,3\n2,4\n');
    } catch (error) {
      expect(error instanceof ArithmeticError && error.message).toBe(
        'Time does not go forward at data row 3; export with more digits or in order.',
      );
    }
    expect.assertions(1);
  });
});

describe('figures', () => {
  const figure = fc.oneof(
    fc.double({ noNaN: true, noDefaultInfinity: true }).map(String),
    fc.double({ min: -20, max: 20, noNaN: true }).map((value) => value.toFixed(4)),
    fc.double({ min: -1, max: 1, noNaN: true }).map((value) => value.toExponential(7)),
    fc
      .tuple(fc.bigInt({ min: 0n, max: 10n ** 20n }), fc.integer({ min: -330, max: 310 }))
      .map(([digits, power]) => `${digits}e${power}`),
    fc.constantFrom('.5', '5.', '+3', '-0', '007', '1E+05', '1e-05', '900719925474098.9', '9007199254740993'),
  );

  test('are read to the very double that the language reads', () => {
    fc.assert(
      fc.property(
        fc.array(figure, { minLength: 3, maxLength: 30 }),
        fc.constantFrom(',', ';', '\t', ' '),
        (figures, delimiter) => {
          const head = ['t (s)', 'U (V)'].join(delimiter === ' ' ? ',' : delimiter);
          // Six plain rows settle the layout; the odd ones follow.
          const plain = Array.from({ length: 60 }, (_, index) => `${index}${delimiter}1.5`);
          const odd = figures.map((text, index) => `${60 + index}${delimiter}${text}`);
          const found = read(
            lines(head, ...plain, ...odd, ...plain.map((_, index) => `${200 + index}${delimiter}2.5`)),
          );
          const values = found.columns[1]?.slice(60, 60 + figures.length) ?? [];
          values.forEach((value, index) => expect(Object.is(value, Number(figures[index]))).toBe(true));
          expect(values).toHaveLength(figures.length);
        },
      ),
      { numRuns: 300 },
    );
  });

  test('do not depend on where the file is cut', () => {
    const text = `\uFEFFZeit (µs);U (mV)\r\n${Array.from({ length: 3000 }, (_, index) => `${index},5;${(Math.sin(index) * 3300).toFixed(3).replace('.', ',')}`).join('\r\n')}`;
    const bytes = encodeUtf8(text);
    const whole = readAll([bytes]);
    expect(whole.columns[0]).toHaveLength(3000);
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 30_000 }), { minLength: 1, maxLength: 12 }), (cuts) => {
        const chunks: Uint8Array[] = [];
        let from = 0;
        for (let turn = 0; from < bytes.length; turn += 1) {
          const to = Math.min(bytes.length, from + (cuts[turn % cuts.length] ?? 1) + (turn > 400 ? 9999 : 0));
          chunks.push(bytes.subarray(from, to));
          from = to;
        }
        const found = readAll(chunks);
        expect(found.columns).toEqual(whole.columns);
        expect(found.layout).toEqual(whole.layout);
      }),
      { numRuns: 25 },
    );
  });

  test('may come from a buffer that is used again', () => {
    const bytes = encodeUtf8(lines('t (s),U (V)', '0,1', '1,2', '2,3', ''));
    const parser = new CaptureParser({
      onRows: (columns, count) => expect([...(columns[1] ?? [])].slice(0, count)).toEqual([1, 2, 3]),
    });
    const shared = new Uint8Array(4);
    for (let from = 0; from < bytes.length; from += 4) {
      const part = bytes.subarray(from, from + 4);
      shared.set(part);
      parser.push(shared.subarray(0, part.length));
    }
    parser.finish();
    expect.assertions(1);
  });
});

describe('whatever is brought', () => {
  const scrap = fc.constantFrom(
    ',',
    ';',
    '\t',
    ' ',
    '\n',
    '\r\n',
    '"',
    '1',
    '-2.5',
    '3e4',
    '1,5',
    'V',
    'time (s)',
    'nan',
    '0',
    '\u00b5',
  );

  test('is read or refused by a fault of ours, never otherwise', () => {
    const outcomes = new Set<string>();
    fc.assert(
      fc.property(fc.array(scrap, { maxLength: 200 }), (parts) => {
        outcomes.add(codeOf(() => read(parts.join(''))));
      }),
      { numRuns: 3000, seed: 5 },
    );
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
        outcomes.add(codeOf(() => readAll([bytes])));
      }),
      { numRuns: 1000, seed: 6 },
    );
    expect(outcomes).toContain('no fault');
    expect(outcomes).toContain('capture_no_numbers');
    expect(outcomes).toContain('capture_binary');
  });
});

test('text survives its way through bytes', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', maxLength: 40 }), (text) => {
      expect(decodeText(encodeUtf8(text))).toBe(text);
    }),
  );
  expect(decodeText(encodeUtf8('\ud800'))).toBe('\ufffd');
});
