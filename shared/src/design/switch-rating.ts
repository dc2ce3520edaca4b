import {
  type DesignFigure,
  type DesignMethod,
  requireNotNegative,
  requirePositive,
  requireWithin,
  warn,
} from './design-figure.js';

export interface SwitchInput {
  /** Voltage of the full pack (V). */
  readonly packFullVolts: number;
  /** Spike of the leakage inductance, as a share of the off-state voltage; 0.2 means a fifth more. */
  readonly spikeShare: number;
  /** Mean current from the pack while driving (A). */
  readonly packAmperes: number;
  /** Duty of one switch, as a share of its own period, above 0 to 0.5. */
  readonly duty: number;
  /** Ratings of the transistor: drain-source voltage (V) and current (A). */
  readonly ratedVolts: number;
  readonly ratedAmperes: number;
}

export interface SwitchSheet {
  /** Voltage over the switch that is off (V). */
  readonly stress: DesignFigure;
  /** Current through the switch that is on (A). */
  readonly peak: DesignFigure;
  /** Rating over stress. */
  readonly voltageMargin: DesignFigure;
  readonly currentMargin: DesignFigure;
}

const stressMethod: DesignMethod = {
  name: 'Voltage over a push-pull switch',
  formula: 'V = 2 V_pack (1 + spike)',
  source: 'the driven half induces the pack’s voltage in the other half, in series with the pack',
  validRange: 'centre-tapped primary, close coupling; the spike is to be measured',
};
const peakMethod: DesignMethod = {
  name: 'Current through a push-pull switch',
  formula: 'I = I_pack / (2 D)',
  source: 'each switch carries the pack’s current during its share of the period',
  validRange: 'rectangular current; magnetising current and start-up left out',
};

/**
 * What the switches of a push-pull converter have to bear, and how far their ratings reach.
 *
 * @param input pack voltage (V) and current (A), spike, duty per switch, ratings (V, A)
 * @returns stress (V), peak current (A) and both margins; warns of a rating below the stress, and of a current rating
 * below twice the peak
 * @throws ArithmeticError `design_not_positive`, `design_negative`, `design_out_of_range`
 * @source Kirchhoff's voltage law; a current rating of twice the peak: common practice, no source
 */
export function switchRating(input: SwitchInput): SwitchSheet {
  requirePositive('pack voltage', input.packFullVolts);
  requireNotNegative('spike', input.spikeShare);
  requirePositive('pack current', input.packAmperes);
  requirePositive('duty per switch', input.duty);
  requireWithin('duty per switch', input.duty, 0, 0.5);
  requirePositive('rated voltage', input.ratedVolts);
  requirePositive('rated current', input.ratedAmperes);
  const stress = 2 * input.packFullVolts * (1 + input.spikeShare);
  const peak = input.packAmperes / (2 * input.duty);
  const voltage =
    input.ratedVolts < stress
      ? [warn('voltage_margin', { stress: stress.toFixed(1), rated: String(input.ratedVolts) })]
      : [];
  const current =
    input.ratedAmperes < 2 * peak
      ? [warn('current_margin', { peak: peak.toFixed(1), rated: String(input.ratedAmperes) })]
      : [];
  return {
    stress: { value: stress, unit: 'V', method: stressMethod, warnings: voltage },
    peak: { value: peak, unit: 'A', method: peakMethod, warnings: current },
    voltageMargin: { value: input.ratedVolts / stress, unit: 'ratio', method: stressMethod, warnings: voltage },
    currentMargin: { value: input.ratedAmperes / peak, unit: 'ratio', method: peakMethod, warnings: current },
  };
}
