/** Faults of `plan`: code → sentence. */
export const planFaults = {
  plan_not_a_day: 'The day {text} does not exist; days are written year-month-day.',
  plan_no_such_week: 'The year {year} has no week {week}.',
} as const;
