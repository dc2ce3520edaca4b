/** Exponents of the base quantities of the International System, and of things counted one by one. */
export interface Exponents {
  readonly length: number;
  readonly mass: number;
  readonly time: number;
  readonly current: number;
  readonly temperature: number;
  readonly count: number;
}

const exponents = (given: Partial<Exponents>): Exponents => ({
  length: 0,
  mass: 0,
  time: 0,
  current: 0,
  temperature: 0,
  count: 0,
  ...given,
});

/**
 * What can be measured. Two units convert into each other if they share one of these; frequency and a count per time,
 * or energy and torque, stay apart although their exponents agree.
 * @source The International System of Units (SI brochure), 9th edition, 2019, tables 2 to 6.
 */
export const dimensions = {
  count: exponents({ count: 1 }),
  ratio: exponents({}),
  length: exponents({ length: 1 }),
  area: exponents({ length: 2 }),
  volume: exponents({ length: 3 }),
  mass: exponents({ mass: 1 }),
  time: exponents({ time: 1 }),
  frequency: exponents({ time: -1 }),
  temperature: exponents({ temperature: 1 }),
  voltage: exponents({ length: 2, mass: 1, time: -3, current: -1 }),
  current: exponents({ current: 1 }),
  resistance: exponents({ length: 2, mass: 1, time: -3, current: -2 }),
  capacitance: exponents({ length: -2, mass: -1, time: 4, current: 2 }),
  inductance: exponents({ length: 2, mass: 1, time: -2, current: -2 }),
  charge: exponents({ time: 1, current: 1 }),
  power: exponents({ length: 2, mass: 1, time: -3 }),
  energy: exponents({ length: 2, mass: 1, time: -2 }),
  fluxDensity: exponents({ mass: 1, time: -2, current: -1 }),
  flux: exponents({ length: 2, mass: 1, time: -2, current: -1 }),
  massPerLength: exponents({ length: -1, mass: 1 }),
  resistancePerLength: exponents({ length: 1, mass: 1, time: -3, current: -2 }),
  force: exponents({ length: 1, mass: 1, time: -2 }),
  torque: exponents({ length: 2, mass: 1, time: -2 }),
} as const satisfies Record<string, Exponents>;

/** The name of something that can be measured. */
export type Dimension = keyof typeof dimensions;
