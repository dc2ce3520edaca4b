/** Faults of `money`: code → sentence. */
export const moneyFaults = {
  money_not_whole: 'The amount {amount} is not a whole number of minor units.',
  money_too_large: 'The amount {amount} is too large to be kept exactly.',
  money_unknown_currency: 'The currency {currency} is not in the list of ISO 4217.',
  money_unreadable: 'The amount {text} cannot be read as money.',
  money_too_many_decimals: 'The amount {text} has more decimals than {currency} has ({decimals}).',
  money_mixed_currencies: 'Amounts in {left} and {right} cannot be added.',
  money_division_by_zero: 'A division by zero has no result.',
  money_weight_negative: 'Share {position} has a negative weight ({weight}).',
  money_no_weight: 'There is nothing to spread the amount over: all weights are zero.',
} as const;
