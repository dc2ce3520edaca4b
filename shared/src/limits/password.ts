/**
 * Lengths of a password: characters at least, and bytes (UTF-8) at most.
 * No rule on kinds of characters, as NIST SP 800-63B (revision 4, 2025), 3.1.1.2 advises; fifteen are suggested.
 */
export const passwordLimit = { fewestCharacters: 8, advisedCharacters: 15, mostBytes: 1_024 } as const;
