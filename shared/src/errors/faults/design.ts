/** Faults of `design`: code → sentence. */
export const designFaults = {} as const;
