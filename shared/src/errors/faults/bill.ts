/** Faults of `bill`: code → sentence. */
export const billFaults = {} as const;
