/** Faults of `bill`: code → sentence. */
export const billFaults = {
  bill_quantity_negative: 'The {what} of {value} is below zero.',
  bill_cycle: 'A bill contains itself: {cycle}.',
  bill_line_without_quantity: 'Bill of {part}, line {position}: the quantity must be above zero.',
  bill_line_all_scrap: 'Bill of {part}, line {position}: the scrap share {share} is not from 0 to below 1.',
  bill_line_factor: 'Bill of {part}, line {position}: the factor of alternate {alternate} must be above zero.',
  bill_line_repeated: 'Bill of {part}, line {position}: {what} stands there twice.',
  bill_too_many_places: 'The bill of {part} has more than {limit} places and cannot be written out one by one.',
  bill_missing: '{part} has no bill, so it cannot be built.',
  bill_too_large_to_count: 'The quantities of {part} are too large to be counted exactly.',
  bill_cost_missing: '{part} has no cost.',
  bill_cost_negative: 'The {what} of {part} is below zero ({value}).',
  bill_rule_broken: 'The rule on {parameter} ({wanted}) cannot be used.',
} as const;
