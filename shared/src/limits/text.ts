/** Longest texts, in characters after trimming; forms and server refuse the same ones. */
export const textLimit = {
  /** A code printed on a tag. */
  code: 40,
  /** A person, a part, a supplier. */
  name: 120,
  /** One line: a reason, a subject. */
  line: 200,
  /** An address as RFC 5321, 4.5.3.1.3 bounds it. */
  email: 254,
  /** A note of several lines. */
  note: 2_000,
  /** A search term. */
  search: 100,
} as const;
