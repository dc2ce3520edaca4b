/** Faults of `costing`: code → sentence. */
export const costingFaults = {} as const;
