/** Faults of `serial`: code → sentence. */
export const serialFaults = {
  serial_not_digits: 'The check digits of {text} cannot be worked out: only digits and capital letters count.',
  serial_unreadable: 'The serial number {text} is not of the form WR-2648-0093-06.',
  serial_check_digits: 'The serial number {text} has a wrong digit or two digits swapped.',
  serial_no_such_week: 'The serial number {text} names week {week}, which the year {year} does not have.',
  serial_product_letters: 'A product has two or three capital letters in its serial numbers, not {letters}.',
  serial_year: 'Serial numbers can be issued in the years 2000 to 2099, not in {year}.',
  serial_running_number: 'The running number {number} is not a whole number from 1 to 9999999.',
} as const;
