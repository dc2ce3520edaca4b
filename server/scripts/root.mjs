import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The top of the checkout. */
export const root = resolve(fileURLToPath(import.meta.url), '../../..');
