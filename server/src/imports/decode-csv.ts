import { AppError } from '../platform/errors/app-error.js';

/** The first bytes of files that people take for a table of text. */
const foreignFormats: readonly { readonly bytes: readonly number[]; readonly sentence: string }[] = [
  {
    bytes: [0x50, 0x4b, 0x03, 0x04],
    sentence: 'This is a workbook or an archive. Save the sheet as CSV (UTF-8) first.',
  },
  {
    bytes: [0xd0, 0xcf, 0x11, 0xe0],
    sentence: 'This is a workbook of an older kind. Save the sheet as CSV (UTF-8) first.',
  },
  { bytes: [0x25, 0x50, 0x44, 0x46], sentence: 'This is a PDF. A CSV file is needed.' },
];

/**
 * Reads the bytes of a CSV file as text.
 *
 * @returns the text without its byte-order mark
 * @throws AppError `invalid_input` for an empty file, one that is no text, and one in another encoding than UTF-8
 */
export function decodeCsv(bytes: Buffer): string {
  if (bytes.length === 0) throw unreadable('The file is empty.');
  const foreign = foreignFormats.find(({ bytes: start }) => start.every((byte, index) => bytes[index] === byte));
  if (foreign) throw unreadable(foreign.sentence);
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)) {
    throw unreadable('The file is in UTF-16. Save it as CSV in UTF-8.');
  }
  if (bytes.includes(0)) throw unreadable('The file holds bytes that no text has. A CSV file in UTF-8 is needed.');
  try {
    // The decoder drops a byte-order mark by itself.
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    const line = firstBrokenLine(bytes);
    throw unreadable(`Line ${line} holds a character that is not in UTF-8. Save the file as CSV in UTF-8.`);
  }
}

export function unreadable(sentence: string): AppError {
  return new AppError('invalid_input', sentence, {
    faults: [{ pointer: '/file', code: 'unreadable_file', detail: sentence }],
  });
}

/** No byte of a character of several bytes is a line end, so that lines can be told apart before they are decoded. */
function firstBrokenLine(bytes: Buffer): number {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  let line = 1;
  let start = 0;
  while (start < bytes.length) {
    const end = bytes.indexOf(0x0a, start);
    const until = end < 0 ? bytes.length : end;
    try {
      decoder.decode(bytes.subarray(start, until));
    } catch {
      return line;
    }
    line += 1;
    start = until + 1;
  }
  return line;
}
