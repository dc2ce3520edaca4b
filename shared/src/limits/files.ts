/** Bytes of one stored file at most. */
export const largestFileBytes = 25 * 1_024 * 1_024;
