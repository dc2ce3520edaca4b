/** Faults of `serial`: code → sentence. */
export const serialFaults = {} as const;
