/** Faults of `plan`: code → sentence. */
export const planFaults = {
  plan_not_a_day: 'The day {text} does not exist; days are written year-month-day.',
  plan_no_such_week: 'The year {year} has no week {week}.',
  plan_never_working: 'No working day follows {day} within a year; look at the calendar.',
  plan_days_negative: '{workingDays} is not a number of working days; give a whole number, zero or more.',
} as const;
