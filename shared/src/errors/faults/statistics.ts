/** Faults of `statistics`: code → sentence. */
export const statisticsFaults = {
  statistics_not_a_number: 'Value {position} is not a number.',
  statistics_too_few: 'This needs at least {needed} values; there are {found}.',
  statistics_no_spread: 'All values are equal; without spread this cannot be worked out.',
  statistics_out_of_range: 'The {name} must lie from {low} to {high}; it is {value}.',
  statistics_not_a_count: 'The {name} must be a whole number of at least {low}; it is {value}.',
  statistics_subgroup_size: 'Subgroup {position} has {found} values; all need the same number, from 2 to 25.',
  statistics_more_than_all: 'There are more {name} ({found}) than there can be ({most}).',
  statistics_limits_crossed: 'The lower limit {lower} is not below the upper limit {upper}.',
  statistics_no_limit: 'Capability needs a lower or an upper limit.',
  statistics_no_such_aql: 'The acceptance quality limit {aql} is not one of the preferred values of the tables.',
} as const;
