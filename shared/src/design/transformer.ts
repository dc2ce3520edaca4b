import {
  type DesignFigure,
  type DesignMethod,
  type DesignWarning,
  requirePositive,
  requireWithin,
  warn,
} from './design-figure.js';

export interface FluxInput {
  /** Highest voltage across one half of the primary (V): the full pack. */
  readonly volts: number;
  /** Frequency of the core (Hz), which is half the oscillator's. */
  readonly coreHertz: number;
  /** On-time of one switch as a share of its own period, up to 0.5. */
  readonly duty: number;
  /** Effective cross-section of the core (mm²). */
  readonly coreSquareMillimetres: number;
}

export interface FluxSheet {
  /** Greatest flux density either way (T). */
  readonly peak: DesignFigure;
  /** From one peak to the other (T). */
  readonly swing: DesignFigure;
}

export interface TurnsSheet {
  /** Turns of one half of the primary that give just the wanted flux. */
  readonly exact: DesignFigure;
  /** The next whole number of turns. */
  readonly whole: DesignFigure;
  /** Flux with the whole number. */
  readonly flux: FluxSheet;
}

const fluxMethod: DesignMethod = {
  name: 'Flux density of a push-pull core',
  formula: 'B = V D / (2 N A f)',
  source: 'Faraday’s law with symmetric drive; at D = 1/2 it is V / (4 f N A)',
  validRange: 'rectangular voltage, no standing flux, ferrite up to about 0.3 T when hot',
};
const turnsMethod: DesignMethod = {
  name: 'Turns of one half of the primary',
  formula: 'N = V D / (2 B A f), rounded up',
  source: 'Faraday’s law with symmetric drive',
  validRange: fluxMethod.validRange,
};

function checkFlux(input: FluxInput): void {
  requirePositive('primary voltage', input.volts);
  requirePositive('core frequency', input.coreHertz);
  requirePositive('core area', input.coreSquareMillimetres);
  requireWithin('duty per switch', input.duty, 0, 0.5);
  requirePositive('duty per switch', input.duty);
}

/** Volt-seconds of half a swing over the core's area in m²: flux density times turns. */
const fluxTurns = ({ volts, duty, coreSquareMillimetres, coreHertz }: FluxInput): number =>
  (volts * duty) / (2 * coreSquareMillimetres * 1e-6 * coreHertz);

function fluxWarnings(tesla: number): readonly DesignWarning[] {
  if (tesla > 0.3) return [warn('flux_saturates')];
  return tesla > 0.2 ? [warn('flux_high')] : [];
}

/**
 * Flux density of the core of a push-pull transformer.
 *
 * @param input voltage (V), core frequency (Hz), duty per switch, core area (mm²)
 * @param turns of one half of the primary
 * @returns peak and swing (T)
 * @throws ArithmeticError `design_not_positive`, `design_out_of_range`
 * @source Faraday's law
 */
export function fluxOfTurns(input: FluxInput, turns: number): FluxSheet {
  checkFlux(input);
  requirePositive('number of turns', turns);
  const peak = fluxTurns(input) / turns;
  const warnings = fluxWarnings(peak);
  return {
    peak: { value: peak, unit: 'T', method: fluxMethod, warnings },
    swing: { value: 2 * peak, unit: 'T', method: fluxMethod, warnings },
  };
}

/**
 * Turns of one half of the primary for a wanted peak flux density.
 *
 * @param input voltage (V), core frequency (Hz), duty per switch, core area (mm²)
 * @param peakTesla greatest flux density wanted (T)
 * @returns exact and whole turns, and the flux with the whole ones
 * @throws ArithmeticError `design_not_positive`, `design_out_of_range`
 * @source Faraday's law
 */
export function turnsOfFlux(input: FluxInput, peakTesla: number): TurnsSheet {
  checkFlux(input);
  requirePositive('flux density', peakTesla);
  const exact = fluxTurns(input) / peakTesla;
  // A hair above a whole number is rounding, not a further turn.
  const whole = Math.max(1, Math.ceil(exact * (1 - 1e-12)));
  const warnings = fluxWarnings(peakTesla);
  return {
    exact: { value: exact, unit: 'turns', method: turnsMethod, warnings },
    whole: { value: whole, unit: 'turns', method: turnsMethod, warnings },
    flux: fluxOfTurns(input, whole),
  };
}

const ratioMethod: DesignMethod = {
  name: 'Turns of the secondary',
  formula: 'N_s = N_p V_s / V_p',
  source: 'ideal transformer',
  validRange: 'leakage and drop left out; a fraction of a turn counts as one',
};
const secondaryMethod: DesignMethod = {
  name: 'Secondary voltage of a push-pull transformer',
  formula: 'V_s = V N_s / N_p, effective value times √(2 D)',
  source: 'ideal transformer with rectangular drive',
  validRange: 'leakage and drop left out; in a low-voltage loop they take a large part',
};

/**
 * Turns of the secondary for a wanted voltage.
 *
 * @param primaryVolts across one half of the primary, less what the switch drops (V)
 * @param primaryTurns of one half
 * @param secondaryVolts wanted (V)
 * @returns turns, not rounded
 * @throws ArithmeticError `design_not_positive`
 * @source ideal transformer
 */
export function secondaryTurns(primaryVolts: number, primaryTurns: number, secondaryVolts: number): DesignFigure {
  requirePositive('primary voltage', primaryVolts);
  requirePositive('number of primary turns', primaryTurns);
  requirePositive('secondary voltage', secondaryVolts);
  const turns = (primaryTurns * secondaryVolts) / primaryVolts;
  return { value: turns, unit: 'turns', method: ratioMethod, warnings: turns < 1 ? [warn('fraction_of_a_turn')] : [] };
}

/**
 * Voltage of a secondary of few turns.
 *
 * @param input voltage across one half of the primary (V), its turns, those of the secondary, duty per switch (≤ 0.5)
 * @returns amplitude and effective value (V); a secondary of less than one turn counts as one, with a warning
 * @throws ArithmeticError `design_not_positive`, `design_out_of_range`
 * @source ideal transformer; effective value of a rectangle that is on twice a period
 */
export function secondaryVolts(input: {
  readonly volts: number;
  readonly primaryTurns: number;
  readonly secondaryTurns: number;
  readonly duty: number;
}): { readonly amplitude: DesignFigure; readonly effective: DesignFigure } {
  requirePositive('primary voltage', input.volts);
  requirePositive('number of primary turns', input.primaryTurns);
  requirePositive('number of secondary turns', input.secondaryTurns);
  requireWithin('duty per switch', input.duty, 0, 0.5);
  const amplitude = (input.volts * Math.max(1, input.secondaryTurns)) / input.primaryTurns;
  const warnings = input.secondaryTurns < 1 ? [warn('fraction_of_a_turn')] : [];
  return {
    amplitude: { value: amplitude, unit: 'V', method: secondaryMethod, warnings },
    effective: { value: amplitude * Math.sqrt(2 * input.duty), unit: 'V', method: secondaryMethod, warnings },
  };
}
