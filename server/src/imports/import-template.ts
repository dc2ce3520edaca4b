import { stringify } from 'csv-stringify/sync';
import type { ImportKind } from './import-kind.js';

/**
 * A file to fill in: the headers, and example lines that can be overwritten. It begins with a byte-order mark, by which
 * spreadsheets know UTF-8, and every cell is quoted.
 */
export function importTemplate(kind: ImportKind): string {
  const height = Math.max(...kind.columns.map(({ examples }) => examples.length));
  const lines = Array.from({ length: height }, (_, line) => kind.columns.map(({ examples }) => examples[line] ?? ''));
  return stringify([kind.columns.map(({ title }) => title), ...lines], {
    bom: true,
    quoted: true,
    record_delimiter: 'windows',
  });
}
