/** Faults of `transport`: code → sentence. */
export const transportFaults = {} as const;
