/** Faults of `design`: code → sentence. */
export const designFaults = {
  design_not_positive: 'The {name} must be above zero; it is {value}.',
  design_negative: 'The {name} must not be negative; it is {value}.',
  design_out_of_range: 'The {name} must lie from {low} to {high}; it is {value}.',
  design_not_a_count: 'The {name} must be a whole number of at least 1; it is {value}.',
  design_resistor_impossible: 'No timing resistor gives {hertz} Hz with this capacitor and discharge resistor.',
  design_no_sections: 'A conductor needs at least one section.',
} as const;
