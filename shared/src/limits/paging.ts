/** Rows on a page of a list when nothing is said, and at most. */
export const pageSizeLimit = { usual: 50, largest: 200 } as const;

/** The last page that can be asked for by its number; behind it, narrow the search. */
export const largestPage = 10_000;
