/** Faults of `measure`: code → sentence. */
export const measureFaults = {
  measure_not_a_number: 'The value {value} is not a number.',
  measure_not_exact: 'The number {value} is not whole; decimals must be given as text to stay exact.',
} as const;
