/** Faults of `costing`: code → sentence. */
export const costingFaults = {
  costing_more_than_held: 'Only {held} is held; {asked} cannot be issued.',
  costing_quantity_not_positive: 'The quantity {quantity} is not more than zero.',
  costing_quantity_negative: 'The quantity {quantity} is negative.',
  costing_value_negative: 'A value of {value} minor units is negative.',
  costing_layer_broken: 'Layer {layer} of {quantity} cannot be worth {value} minor units.',
  costing_return_too_large: 'Only {left} of this issue has not come back yet; {asked} cannot be returned.',
  costing_nothing_to_spread_over: 'There is no line the cost could be spread over.',
  costing_destinations_differ: 'The received quantity is {received}, but {found} was accounted for.',
  costing_capacity_not_positive: 'The normal capacity must be more than zero ({capacity}).',
  costing_nothing_good: 'Nothing good came out, so there is nothing that could carry the cost.',
  costing_more_good_than_started: 'Of {started} started, {good} cannot be good.',
  costing_carrying_above_cost: 'A carrying value of {carrying} minor units is above the cost of {cost}.',
} as const;
