import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';
import type { Files, StoredFile } from './files.js';

/**
 * Answers with a stored file, to be saved rather than shown: under our name for it, of the type we found, and so that
 * a browser runs nothing in it. The caller has checked that this person may read it.
 */
export async function sendFile(response: Response, files: Files, file: StoredFile, fileName: string): Promise<void> {
  response.setHeader('Content-Security-Policy', "default-src 'none'; sandbox");
  response.setHeader('Content-Type', file.mediaType);
  response.setHeader('Content-Length', String(file.byteSize));
  response.setHeader('Content-Disposition', attachmentNamed(fileName));
  await pipeline(files.stream(file.id), response);
}

/** Both forms of the name (RFC 6266, 4.3): plain characters for old programs, everything else percent-encoded. */
export function attachmentNamed(fileName: string): string {
  const plain = fileName.replaceAll(/[^A-Za-z0-9 ._-]/g, '_');
  const encoded = encodeURIComponent(fileName).replaceAll(/['()*]/g, percent);
  return `attachment; filename="${plain}"; filename*=UTF-8''${encoded}`;
}

function percent(character: string): string {
  return `%${character.charCodeAt(0).toString(16).toUpperCase()}`;
}
