/** What a design sheet warns of, one sentence each. */
export const designWarningSentences = {
  timing_resistor_outside: 'The timing resistor is outside 2 kΩ to 150 kΩ, where the formula of the part holds.',
  timing_capacitor_outside: 'The timing capacitor is outside 1 nF to 200 nF, where the formula of the part holds.',
  discharge_resistor_outside: 'The discharge resistor is outside 0 Ω to 500 Ω, where the formula of the part holds.',
  oscillator_outside: 'The oscillator would run outside 100 Hz to 400 kHz, where the part is specified.',
  no_discharge_resistor: 'Without a discharge resistor only the part’s own short dead time keeps both outputs apart.',
  duty_above_possible: 'The dead time leaves at most {most} percent per output; the drive cannot reach this duty.',
  gap_set_by_duty: 'At this duty the gap between the outputs follows from the duty, not from the discharge resistor.',
  flux_high: 'The peak flux density is above 0.2 T: core loss is high at tens of kilohertz.',
  flux_saturates: 'The peak flux density is above 0.3 T: a hot ferrite core saturates and the switches fail.',
  fraction_of_a_turn: 'A wire that passes the core’s window once links the whole flux: a fraction counts as one turn.',
  strand_too_thick: 'A strand is thicker than two skin depths ({twice} mm): its middle carries little current.',
  proximity_ignored: 'The field of neighbouring wires is left out; wound or folded wire has more resistance.',
  temperature_outside: 'The temperature is outside {low} °C to {high} °C, where resistance follows a straight line.',
  ferromagnetic:
    'Iron is ferromagnetic: its permeability changes with field and heat, so this is only an order of size.',
  section_short: 'A section is shorter than three diameters: the current has not spread evenly in it.',
  cell_overloaded: 'Each cell gives {amperes} A, more than its rating of {rated} A.',
  voltage_margin: 'The switch has to bear {stress} V with the spike; its rating of {rated} V leaves too little.',
  current_margin: 'The switch carries {peak} A at its peak; its rating of {rated} A leaves less than twice that.',
} as const;

export type DesignWarningCode = keyof typeof designWarningSentences;
