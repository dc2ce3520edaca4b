/** A cell: text is made harmless for spreadsheets, a number stands as it is. */
export type CsvCell = { readonly text: string } | { readonly number: string };

/**
 * A CSV file (RFC 4180): every cell quoted, lines end with CR LF, and a byte-order mark in front, so that spreadsheets
 * read it as UTF-8. A text that a spreadsheet could take for a formula gets an apostrophe before it; numbers never do.
 */
export function csvFile(heads: readonly string[], rows: readonly (readonly CsvCell[])[]): string {
  const lines = [heads.map((head) => quoted(head)), ...rows.map((row) => row.map(cellText))];
  return `\uFEFF${lines.map((cells) => `${cells.join(',')}\r\n`).join('')}`;
}

function cellText(cell: CsvCell): string {
  if ('text' in cell) return quoted(harmless(cell.text));
  if (!/^-?\d+(\.\d+)?$/.test(cell.number)) throw new Error(`${cell.number} is no number`);
  return quoted(cell.number);
}

/** What starts a formula: also after blanks, and in the full-width forms that some programs fold. */
function harmless(text: string): string {
  return /^[\s\u00A0\u3000]*[=+\-@\uFF1D\uFF0B\uFF0D\uFF20]/.test(text) || /^[\t\r\n]/.test(text) ? `'${text}` : text;
}

function quoted(text: string): string {
  return `"${text.replaceAll('"', '""')}"`;
}
