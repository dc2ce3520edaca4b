import { ArithmeticError } from '../errors/arithmetic-error.js';
import {
  type DesignFigure,
  type DesignMethod,
  type DesignWarning,
  requireNotNegative,
  requirePositive,
  requireWithin,
  warn,
  warnOutside,
} from './design-figure.js';

export interface OscillatorParts {
  /** Timing resistor in Ω. */
  readonly timingOhms: number;
  /** Timing capacitor in F. */
  readonly timingFarads: number;
  /** Resistor between timing capacitor and discharge pin in Ω; it sets the dead time. */
  readonly dischargeOhms: number;
}

export interface OscillatorSheet {
  readonly oscillator: DesignFigure;
  /** What each output, and so the core, runs at: half the oscillator's. */
  readonly output: DesignFigure;
  /** Time in every half period in which the part holds both outputs off. */
  readonly deadTime: DesignFigure;
  /** Greatest duty of one output, as a share of its own period. */
  readonly greatestDuty: DesignFigure;
}

const frequencyMethod: DesignMethod = {
  name: 'Oscillator of the two-output pulse-width controller',
  formula: 'f = 1 / (C (0.7 R + 3 R_d))',
  source: 'data sheets of the 16-pin push-pull controller of the 3525 kind',
  validRange: 'R 2 kΩ to 150 kΩ, C 1 nF to 200 nF, R_d 0 Ω to 500 Ω, f 100 Hz to 400 kHz; a few percent between parts',
};
const outputMethod: DesignMethod = {
  name: 'Output of a push-pull controller',
  formula: 'f_output = f_oscillator / 2',
  source: 'a flip-flop gives alternate periods of the oscillator to the two outputs',
  validRange: 'as the oscillator',
};
const deadTimeMethod: DesignMethod = {
  name: 'Dead time by discharge',
  formula: 't = 3 R_d C',
  source: 'the second term of the oscillator’s period',
  validRange: 'R_d 0 Ω to 500 Ω; the part adds a short time of its own',
};
const greatestDutyMethod: DesignMethod = {
  name: 'Greatest duty of one output',
  formula: 'D = 1/2 − t f_output',
  source: 'definition; duty is per output, as a share of its own period',
  validRange: 'dead time shorter than half a period of the output',
};

function rangeWarnings(parts: OscillatorParts, hertz: number): readonly DesignWarning[] {
  return [
    ...warnOutside('timing_resistor_outside', parts.timingOhms, 2e3, 150e3),
    ...warnOutside('timing_capacitor_outside', parts.timingFarads, 1e-9, 200e-9),
    ...warnOutside('discharge_resistor_outside', parts.dischargeOhms, 0, 500),
    ...(parts.dischargeOhms === 0 ? [warn('no_discharge_resistor')] : []),
    ...warnOutside('oscillator_outside', hertz, 100, 400e3),
  ];
}

/**
 * Frequencies and dead time of a push-pull controller from its timing parts.
 *
 * @param parts timing resistor (Ω), capacitor (F) and discharge resistor (Ω)
 * @returns oscillator and output frequency (Hz), dead time (s), greatest duty per output (share of its period)
 * @throws ArithmeticError `design_not_positive`, `design_negative`
 * @source data sheets of the 3525 kind of controller; output at half the oscillator's frequency by its flip-flop
 */
export function oscillatorSheet(parts: OscillatorParts): OscillatorSheet {
  requirePositive('timing resistor', parts.timingOhms);
  requirePositive('timing capacitor', parts.timingFarads);
  requireNotNegative('discharge resistor', parts.dischargeOhms);
  const oscillator = 1 / (parts.timingFarads * (0.7 * parts.timingOhms + 3 * parts.dischargeOhms));
  const deadTime = 3 * parts.dischargeOhms * parts.timingFarads;
  const warnings = rangeWarnings(parts, oscillator);
  return {
    oscillator: { value: oscillator, unit: 'Hz', method: frequencyMethod, warnings },
    output: { value: oscillator / 2, unit: 'Hz', method: outputMethod, warnings },
    deadTime: { value: deadTime, unit: 's', method: deadTimeMethod, warnings },
    greatestDuty: {
      value: Math.max(0, 0.5 - (deadTime * oscillator) / 2),
      unit: 'ratio',
      method: greatestDutyMethod,
      warnings,
    },
  };
}

/**
 * Timing resistor for a wanted frequency of the outputs.
 *
 * @param outputHertz what each output and the core should run at (Hz)
 * @param timingFarads timing capacitor (F)
 * @param dischargeOhms discharge resistor (Ω)
 * @returns the resistor (Ω)
 * @throws ArithmeticError `design_not_positive`, `design_negative`, `design_resistor_impossible`
 * @source as {@link oscillatorSheet}, solved for the resistor
 */
export function timingResistor(outputHertz: number, timingFarads: number, dischargeOhms: number): DesignFigure {
  requirePositive('output frequency', outputHertz);
  requirePositive('timing capacitor', timingFarads);
  requireNotNegative('discharge resistor', dischargeOhms);
  const hertz = 2 * outputHertz;
  const timingOhms = (1 / (hertz * timingFarads) - 3 * dischargeOhms) / 0.7;
  if (!(timingOhms > 0)) throw new ArithmeticError('design_resistor_impossible', { hertz: String(outputHertz) });
  const warnings = rangeWarnings({ timingOhms, timingFarads, dischargeOhms }, hertz);
  return { value: timingOhms, unit: 'Ω', method: frequencyMethod, warnings };
}

const gapMethod: DesignMethod = {
  name: 'Gap between the two outputs',
  formula: 'gap = (1/2 − D) / f_output, but no less than the dead time',
  source: 'definition; duty is per output, as a share of its own period',
  validRange: 'D from 0 to 1/2',
};

function gapWarnings(byDuty: number, deadTime: number, most: number): readonly DesignWarning[] {
  if (byDuty < deadTime) return [warn('duty_above_possible', { most: (100 * most).toFixed(1) })];
  return byDuty > deadTime ? [warn('gap_set_by_duty')] : [];
}

/**
 * The time from one output's end to the other's beginning. It is the discharge resistor's dead time at full drive only.
 *
 * @param outputHertz frequency of each output (Hz)
 * @param duty of one output, as a share of its own period, 0 to 0.5
 * @param deadTimeSeconds what the discharge resistor gives (s)
 * @returns the gap (s), with a warning of which of the two sets it
 * @throws ArithmeticError `design_not_positive`, `design_negative`, `design_out_of_range`
 * @source definition
 */
export function outputGap(outputHertz: number, duty: number, deadTimeSeconds: number): DesignFigure {
  requirePositive('output frequency', outputHertz);
  requireWithin('duty per output', duty, 0, 0.5);
  requireNotNegative('dead time', deadTimeSeconds);
  const byDuty = (0.5 - duty) / outputHertz;
  const most = Math.max(0, 0.5 - deadTimeSeconds * outputHertz);
  return {
    value: Math.max(byDuty, deadTimeSeconds),
    unit: 's',
    method: gapMethod,
    warnings: gapWarnings(byDuty, deadTimeSeconds, most),
  };
}
