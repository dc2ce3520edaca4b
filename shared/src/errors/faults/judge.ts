/** Faults of `judge`: code → sentence. */
export const judgeFaults = {
  judge_no_limit: 'A characteristic needs a lower limit, an upper limit or both.',
  judge_limits_crossed: 'The lower limit {lower} is above the upper limit {upper}.',
  judge_decimals: 'Readings can be asked for with 0 to 9 decimals, not {decimals}.',
  judge_unreadable: 'The reading {text} is not a number.',
  judge_too_few_decimals: 'The reading {text} needs at least {decimals} decimals.',
  judge_uncertainty_not_positive: 'A standard uncertainty must be more than zero ({uncertainty}).',
  judge_confidence: 'A probability for a decision lies above 50 and below 100 percent, not at {confidence}.',
  judge_formula_unreadable: 'The formula {text} cannot be read.',
  judge_formula_too_long: 'A formula may have up to {most} characters.',
  judge_formula_forbidden: 'A formula cannot contain {part}.',
  judge_formula_unknown_name: 'The formula names {name}, which is neither a reading nor a unit.',
  judge_formula_units: 'The units in the formula do not fit together, or not the unit {unit} of its result.',
  judge_formula_missing_reading: 'The formula needs the reading {name}.',
  judge_formula_no_result:
    'The formula has no result for these readings (a division by zero or a root of less than zero).',
} as const;
