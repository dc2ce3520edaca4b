import { fileTypeFromBuffer } from 'file-type';

/** What a file can be, as its first bytes and its whole text show; nothing that a browser would run. */
export const storableTypes = {
  'image/png': ['png'],
  'image/jpeg': ['jpg', 'jpeg'],
  'image/webp': ['webp'],
  'application/pdf': ['pdf'],
  'application/zip': ['zip'],
  'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet': ['xlsx'],
  'application/xml': ['xml'],
  'text/csv': ['csv'],
  'text/plain': ['txt'],
} as const;

export type StorableType = keyof typeof storableTypes;

/** Types that only their text tells apart: known by the name, if the content is text at all. */
const textTypes: ReadonlyMap<string, StorableType> = new Map([
  ['csv', 'text/csv'],
  ['txt', 'text/plain'],
  ['xml', 'application/xml'],
]);

/**
 * Finds the type from the content; the sender's word for it is never asked. Extension and content must agree.
 *
 * @returns undefined for what cannot be stored
 */
export async function typeOfContent(bytes: Uint8Array, fileName: string): Promise<StorableType | undefined> {
  const extension = fileName.slice(fileName.lastIndexOf('.') + 1).toLowerCase();
  const found = await fileTypeFromBuffer(bytes);
  if (found && found.mime !== 'application/xml') {
    const type = found.mime as StorableType;
    const extensions: readonly string[] | undefined = Object.hasOwn(storableTypes, type)
      ? storableTypes[type]
      : undefined;
    return extensions?.includes(extension) ? type : undefined;
  }
  const type = textTypes.get(extension);
  return type && isText(bytes) && !(type !== 'application/xml' && looksLikeMarkup(bytes)) ? type : undefined;
}

function isText(bytes: Uint8Array): boolean {
  if (bytes.includes(0)) return false;
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return true;
  } catch {
    // Not UTF-8: what this asks.
    return false;
  }
}

/** A page renamed to look like a table. */
function looksLikeMarkup(bytes: Uint8Array): boolean {
  const start = new TextDecoder().decode(bytes.subarray(0, 512)).trimStart().toLowerCase();
  return /^<(!doctype|html|script|svg|\?xml|body|iframe)/.test(start);
}
