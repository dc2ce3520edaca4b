import { dictionary } from '@zxcvbn-ts/language-common';
import { passwordLimit } from '@emberlot/shared/limits/password';
import { fieldFault } from '../platform/errors/app-error.js';

/** About 49,000 passwords that were found in public leaks most often, in lower case. */
const common: ReadonlySet<string> = new Set(dictionary['passwords-common']);

/** Words of our own that a guesser would try first. */
const ownWords = ['emberlot', 'soldering', 'password'];

/** Shorter pieces of a name stand in too many good passwords by chance. */
const fewestLettersOfAName = 4;

/**
 * Length, commonness and own words; no rule on kinds of characters, no expiry (NIST SP 800-63B, revision 4, 2025, 3.1.1).
 *
 * @param person whose name and address must not be most of it
 * @throws AppError `invalid_input` at the pointer given
 */
export function refuseWeakPassword(
  password: string,
  person: { readonly name: string; readonly email: string },
  pointer: string,
): void {
  if (Array.from(password).length < passwordLimit.fewestCharacters) {
    throw fieldFault(pointer, 'password_short', `Use at least ${passwordLimit.fewestCharacters} characters.`);
  }
  const lower = password.toLowerCase();
  if (common.has(lower) || isOneCharacter(lower)) {
    throw fieldFault(pointer, 'password_common', 'This is among the first that a guesser tries. Use another one.');
  }
  if (mostlyOneOf(lower, wordsOf(person))) {
    throw fieldFault(
      pointer,
      'password_own_words',
      'This is mostly a name or address. Use something less near at hand.',
    );
  }
}

function isOneCharacter(lower: string): boolean {
  return new Set(lower).size === 1;
}

/** Whether too little is left once a word that anybody knows is taken away. */
function mostlyOneOf(lower: string, words: readonly string[]): boolean {
  return words.some(
    (word) => lower.includes(word) && Array.from(lower.replaceAll(word, '')).length < passwordLimit.fewestCharacters,
  );
}

function wordsOf(person: { readonly name: string; readonly email: string }): readonly string[] {
  const pieces = `${person.name} ${person.email}`.toLowerCase().split(/[^\p{L}\p{N}]+/u);
  return [...ownWords, person.email.toLowerCase(), ...pieces.filter((piece) => piece.length >= fewestLettersOfAName)];
}
