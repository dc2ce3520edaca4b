/** Faults of `capture`: code → sentence. */
export const captureFaults = {
  capture_empty: 'The file is empty.',
  capture_binary: 'This is not a text file; export the capture as CSV.',
  capture_no_numbers: 'No columns of numbers were found in the first lines of the file.',
  capture_no_time: 'No time was found: give the sample interval, or export with a time column.',
  capture_no_channel: 'No channel was found beside the time.',
  capture_no_such_column: 'There is no column {column} of numbers in this file.',
  capture_line_too_long: 'Line {line} is longer than a megabyte; this is not a capture.',
  capture_time_not_increasing: 'Time does not go forward at data row {row}; export with more digits or in order.',
  capture_finished: 'The capture was already finished.',
  capture_no_samples: 'There are no readings in the capture.',
  capture_too_many_readings: 'A temperature log may have up to {most} readings; this one has more.',
  capture_no_cold_junction: 'These are thermocouple voltages: give the temperature of the cold junction.',
  capture_not_ordered: 'Times must rise from one reading to the next; reading {position} does not.',
  capture_lengths_differ: 'There are {times} times for {values} values.',
  capture_out_of_range: 'The {name} must lie from {low} to {high}; it is {value}.',
  capture_thermocouple_range: 'A type K thermocouple gives no {value}; its range is {low} to {high}.',
} as const;
