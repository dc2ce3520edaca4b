import { randomInt } from 'node:crypto';

const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz';

/** @returns the prefix and that many random letters and digits: cs_test_4fK… */
export function identifier(prefix: string, length = 24): string {
  return prefix + Array.from({ length }, () => ALPHABET[randomInt(ALPHABET.length)]).join('');
}
