/** Faults of `capture`: code → sentence. */
export const captureFaults = {} as const;
