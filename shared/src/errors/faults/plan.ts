/** Faults of `plan`: code → sentence. */
export const planFaults = {
  plan_not_a_day: 'The day {text} does not exist; days are written year-month-day.',
  plan_no_such_week: 'The year {year} has no week {week}.',
  plan_never_working: 'No working day follows {day} within a year; look at the calendar.',
  plan_days_negative: '{workingDays} is not a number of working days; give a whole number, zero or more.',
  plan_lot_size: 'A lot of {size} cannot be ordered.',
  plan_lot_periods: 'An order cannot cover {periods} periods; it takes a whole number of at least one.',
  plan_lot_costs: 'An order cost of {order} with a holding cost of {holding} cannot be planned with.',
  plan_demand_negative: 'A need of {demand} is not a need.',
  plan_periods: 'A plan of {count} periods cannot be made.',
  plan_lead_time: 'A lead time of {leadTime} cannot be planned with; give a whole number, zero or more.',
  plan_quantity: 'The quantity {quantity} of {part} cannot be planned with.',
  plan_all_lost: 'The share of {part} that is lost, {share}, is not from 0 to below 1.',
  plan_part_unknown: '{part}, used in {usedIn}, is not among the parts to plan.',
  plan_promise_input:
    'What is there, what comes and what is promised must be quantities for the same periods, none below zero.',
  plan_not_available: '{quantity} cannot be promised for period {period}; {free} are free.',
  plan_load: 'The time of {id} cannot be planned with: {minutes} minutes.',
  plan_mix_product:
    '{part} cannot be in a build mix: it needs a bill, whole numbers of at least zero, and a weight above zero, once.',
  plan_offer: 'The prices of {supplier} cannot be used: none may be below zero, and no quantity may have two.',
  plan_discount_bands: 'Price bands need quantities of at least zero and prices above zero.',
} as const;
