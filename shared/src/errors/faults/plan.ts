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
} as const;
