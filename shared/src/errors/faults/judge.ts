/** Faults of `judge`: code → sentence. */
export const judgeFaults = {} as const;
