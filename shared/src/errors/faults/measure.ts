/** Faults of `measure`: code → sentence. */
export const measureFaults = {
  measure_not_a_number: 'The value {value} is not a number.',
  measure_not_exact: 'The number {value} is not whole; decimals must be given as text to stay exact.',
  measure_quantity_negative: 'A quantity cannot be negative: {quantity}.',
  measure_quantity_not_positive: 'The quantity must be more than zero.',
  measure_quantity_too_large: 'The quantity {quantity} is larger than {largest}.',
  measure_too_many_decimals: 'The quantity {quantity} has more than {decimals} decimals in {measure}.',
} as const;
