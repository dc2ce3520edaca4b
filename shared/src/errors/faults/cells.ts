/** Faults of `cells`: code → sentence. */
export const cellsFaults = {} as const;
