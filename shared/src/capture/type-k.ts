import { ArithmeticError } from '../errors/arithmetic-error.js';

/** Powers 1 to 10 of t below 0 °C, mV; c0 is 0. NIST ITS-90, type K. */
const belowZero: readonly number[] = [
  0, 0.39450128025e-1, 0.23622373598e-4, -0.32858906784e-6, -0.49904828777e-8, -0.67509059173e-10, -0.57410327428e-12,
  -0.31088872894e-14, -0.10451609365e-16, -0.19889266878e-19, -0.16322697486e-22,
];

/** Powers 0 to 9 of t from 0 °C, mV, beside the bell-shaped term. */
const fromZero: readonly number[] = [
  -0.17600413686e-1, 0.38921204975e-1, 0.18558770032e-4, -0.99457592874e-7, 0.31840945719e-9, -0.56072844889e-12,
  0.56075059059e-15, -0.3202072e-18, 0.97151147152e-22, -0.12104721275e-25,
];
const bell = { height: 0.1185976, width: -0.1183432e-3, centre: 126.9686 };

/** Powers of mV for °C: start of the exact inverse. NIST ITS-90, type K. */
const inverse: readonly { readonly from: number; readonly coefficients: readonly number[] }[] = [
  {
    from: 20.644,
    coefficients: [-1.318058e2, 4.830222e1, -1.646031, 5.464731e-2, -9.650715e-4, 8.802193e-6, -3.11081e-8],
  },
  {
    from: 0,
    coefficients: [
      0, 2.508355e1, 7.860106e-2, -2.503131e-1, 8.31527e-2, -1.228034e-2, 9.804036e-4, -4.41303e-5, 1.057734e-6,
      -1.052755e-8,
    ],
  },
  // Below 0 mV a straight line is start enough; the steps that follow find the rest.
  { from: Number.NEGATIVE_INFINITY, coefficients: [0, 25] },
];

const coldest = -270;
const hottest = 1372;

const polynomial = (coefficients: readonly number[], x: number): number =>
  coefficients.reduceRight((sum, coefficient) => sum * x + coefficient, 0);

const derivative = (coefficients: readonly number[], x: number): number =>
  polynomial(
    coefficients.slice(1).map((coefficient, power) => coefficient * (power + 1)),
    x,
  );

/**
 * Thermoelectric voltage of a type K thermocouple whose cold junction is at 0 °C.
 *
 * @param celsius temperature of the hot junction, −270 to 1372 °C
 * @returns millivolts
 * @throws ArithmeticError `capture_thermocouple_range`
 * @source NIST ITS-90 thermocouple database, type K; IEC 60584-1
 */
export function typeKMillivolts(celsius: number): number {
  if (!(celsius >= coldest && celsius <= hottest)) {
    throw new ArithmeticError('capture_thermocouple_range', {
      value: `${celsius} °C`,
      low: `${coldest} °C`,
      high: `${hottest} °C`,
    });
  }
  if (celsius < 0) return polynomial(belowZero, celsius);
  return polynomial(fromZero, celsius) + bell.height * Math.exp(bell.width * (celsius - bell.centre) ** 2);
}

/**
 * How much the voltage of a type K thermocouple changes with temperature.
 *
 * @param celsius −270 to 1372 °C
 * @returns mV per kelvin
 * @throws ArithmeticError `capture_thermocouple_range`
 * @source derivative of {@link typeKMillivolts}
 */
export function typeKSensitivity(celsius: number): number {
  typeKMillivolts(celsius);
  if (celsius < 0) return derivative(belowZero, celsius);
  const away = celsius - bell.centre;
  return derivative(fromZero, celsius) + 2 * bell.width * away * bell.height * Math.exp(bell.width * away * away);
}

const leastMillivolts = polynomial(belowZero, -200);
const greatestMillivolts = typeKMillivolts(hottest);

/**
 * Temperature of a type K thermocouple from its voltage, the cold junction taken into account.
 *
 * The voltage of the cold junction is added to the one measured; adding temperatures instead would be wrong by degrees.
 * The reference function is inverted exactly by Newton's method, from the inverse polynomials as start.
 *
 * @param millivolts measured between the leads
 * @param coldJunction temperature of the place where the leads end (°C)
 * @returns temperature of the hot junction (°C), −200 to 1372
 * @throws ArithmeticError `capture_thermocouple_range`
 * @source NIST ITS-90 thermocouple database, type K
 */
export function typeKCelsius(millivolts: number, coldJunction: number): number {
  const whole = millivolts + typeKMillivolts(coldJunction);
  // A few nanovolts of play: the two branches do not meet exactly at 0 °C.
  if (!(whole >= leastMillivolts - 1e-6 && whole <= greatestMillivolts + 1e-6)) {
    throw new ArithmeticError('capture_thermocouple_range', {
      value: `${whole} mV`,
      low: `${leastMillivolts.toFixed(3)} mV`,
      high: `${greatestMillivolts.toFixed(3)} mV`,
    });
  }
  const start = inverse.find((branch) => whole >= branch.from) ?? { coefficients: [0, 25] };
  let celsius = Math.min(hottest, Math.max(-200, polynomial(start.coefficients, whole)));
  for (let step = 0; step < 50; step += 1) {
    const next = celsius - (typeKMillivolts(celsius) - whole) / typeKSensitivity(celsius);
    const held = Math.min(hottest, Math.max(-200, next));
    if (Math.abs(held - celsius) < 1e-10) return held;
    celsius = held;
  }
  return celsius;
}
