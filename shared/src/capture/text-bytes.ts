/*
 * Text without an encoder of the platform: this package runs in the browser, on the server and in tests alike, and has
 * neither of their libraries.
 */

/**
 * UTF-8 bytes of a text.
 *
 * @param text any
 * @returns its bytes; a lone surrogate becomes the replacement character
 * @source RFC 3629
 */
export function encodeUtf8(text: string): Uint8Array {
  const bytes = new Uint8Array(text.length * 3);
  let length = 0;
  for (let index = 0; index < text.length; index += 1) {
    let code = text.codePointAt(index) ?? 0;
    if (code > 0xffff) index += 1;
    if (code >= 0xd800 && code <= 0xdfff) code = 0xfffd;
    if (code < 0x80) {
      bytes[length] = code;
      length += 1;
      continue;
    }
    const tail = code < 0x800 ? 1 : code < 0x10000 ? 2 : 3;
    const lead = tail === 1 ? 0xc0 : tail === 2 ? 0xe0 : 0xf0;
    bytes[length] = lead | (code >> (6 * tail));
    for (let step = 1; step <= tail; step += 1) bytes[length + step] = 0x80 | ((code >> (6 * (tail - step))) & 0x3f);
    length += tail + 1;
  }
  return bytes.subarray(0, length);
}

/** One character from UTF-8 at a position, or undefined where the bytes are not UTF-8. */
function readUtf8(bytes: Uint8Array, at: number): { readonly code: number; readonly length: number } | undefined {
  const lead = bytes[at] ?? 0;
  if (lead < 0x80) return { code: lead, length: 1 };
  const tail = lead >= 0xf0 && lead < 0xf5 ? 3 : lead >= 0xe0 ? 2 : lead >= 0xc2 ? 1 : 0;
  if (tail === 0 || lead >= 0xf5) return undefined;
  let code = lead & (0x3f >> tail);
  for (let step = 1; step <= tail; step += 1) {
    const next = bytes[at + step] ?? 0;
    if ((next & 0xc0) !== 0x80) return undefined;
    code = (code << 6) | (next & 0x3f);
  }
  return { code, length: tail + 1 };
}

/**
 * Text of some bytes: UTF-8, and byte for character where they are not (exports of older instruments).
 *
 * @param bytes any
 * @param from first byte
 * @param to one past the last
 * @returns the text
 */
export function decodeText(bytes: Uint8Array, from = 0, to = bytes.length): string {
  let text = '';
  for (let at = from; at < to;) {
    const character = readUtf8(bytes, at);
    const whole = character !== undefined && at + character.length <= to;
    text += String.fromCodePoint(whole ? character.code : (bytes[at] ?? 0));
    at += whole ? character.length : 1;
  }
  return text;
}

/**
 * Turns a stream of UTF-16 bytes into UTF-8 ones; anything else passes unchanged. Spreadsheets save "Unicode text" so.
 *
 * @returns a function from one chunk to the next
 */
export function createUnicodeFilter(): (chunk: Uint8Array) => Uint8Array {
  let kind: 'unknown' | 'plain' | 'little' | 'big' = 'unknown';
  let carried = new Uint8Array(0);
  return (chunk) => {
    if (kind === 'plain') return chunk;
    const bytes = new Uint8Array(carried.length + chunk.length);
    bytes.set(carried);
    bytes.set(chunk, carried.length);
    if (kind === 'unknown') {
      if (bytes.length < 2) {
        carried = bytes;
        return new Uint8Array(0);
      }
      if (bytes[0] === 0xff && bytes[1] === 0xfe) kind = 'little';
      else if (bytes[0] === 0xfe && bytes[1] === 0xff) kind = 'big';
      else {
        kind = 'plain';
        carried = new Uint8Array(0);
        return bytes;
      }
    }
    const even = bytes.length - (bytes.length % 2);
    carried = bytes.slice(even);
    const units: string[] = [];
    for (let at = 0; at < even; at += 2) {
      const low = bytes[kind === 'little' ? at : at + 1] ?? 0;
      const high = bytes[kind === 'little' ? at + 1 : at] ?? 0;
      const unit = (high << 8) | low;
      if (unit !== 0xfeff) units.push(String.fromCharCode(unit));
    }
    return encodeUtf8(units.join(''));
  };
}
