/** Faults of `judge`: code → sentence. */
export const judgeFaults = {
  judge_no_limit: 'A characteristic needs a lower limit, an upper limit or both.',
  judge_limits_crossed: 'The lower limit {lower} is above the upper limit {upper}.',
  judge_decimals: 'Readings can be asked for with 0 to 9 decimals, not {decimals}.',
  judge_unreadable: 'The reading {text} is not a number.',
  judge_too_few_decimals: 'The reading {text} needs at least {decimals} decimals.',
} as const;
