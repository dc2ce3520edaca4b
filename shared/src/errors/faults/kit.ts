/** Faults of `kit`: code → sentence. */
export const kitFaults = {} as const;
