/** Faults of `statistics`: code → sentence. */
export const statisticsFaults = {} as const;
