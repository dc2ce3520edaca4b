import { ArithmeticError } from '../errors/arithmetic-error.js';
import { packWattHours } from '../transport/watt-hours.js';
import {
  type DesignFigure,
  type DesignMethod,
  requirePositive,
  requireWhole,
  requireWithin,
  warn,
} from './design-figure.js';

export interface PackInput {
  /** Nominal voltage of a cell (V), and that of a full one. */
  readonly nominalVolts: number;
  readonly fullVolts: number;
  /** Rated capacity of a cell (Ah). */
  readonly ampereHours: number;
  readonly seriesGroups: number;
  readonly parallelCells: number;
  /** Greatest lasting current of a cell by its maker (A). */
  readonly ratedAmperes: number;
}

export interface LoadInput {
  /** What the tool takes while it heats (W), before the converter's loss. */
  readonly watts: number;
  /** Share of the pack's energy that reaches the load, above 0 to 1. */
  readonly efficiency: number;
  /** Share of the rated energy that may be used, above 0 to 1. */
  readonly usableShare: number;
  /** Share of the time in which it heats, above 0 to 1. */
  readonly heatingShare: number;
}

export interface PackSheet {
  readonly energy: DesignFigure;
  readonly nominalVolts: DesignFigure;
  readonly fullVolts: DesignFigure;
}

export interface RunSheet {
  readonly packCurrent: DesignFigure;
  readonly cellCurrent: DesignFigure;
  readonly runTime: DesignFigure;
}

const energyMethod: DesignMethod = {
  name: 'Energy of a pack',
  formula: 'E = V_cell Q_cell S P',
  source: 'definition of rated energy, UN Manual of Tests and Criteria 38.3',
  validRange: 'rated capacity at the maker’s discharge; less at high current and in the cold',
};
const voltsMethod: DesignMethod = {
  name: 'Voltage of a pack',
  formula: 'V = S V_cell',
  source: 'cells in series',
  validRange: 'at rest',
};
const currentMethod: DesignMethod = {
  name: 'Current from the pack',
  formula: 'I = P / (η V)',
  source: 'power balance',
  validRange: 'mean current while heating at nominal voltage; pulses are higher',
};
const cellMethod: DesignMethod = {
  name: 'Current per cell',
  formula: 'I_cell = I / P',
  source: 'matched cells in parallel share alike',
  validRange: 'cells of equal capacity and resistance',
};
const runMethod: DesignMethod = {
  name: 'Run time',
  formula: 't = E · usable · η / (P · heating share)',
  source: 'energy balance; common practice, no source',
  validRange: 'constant power while heating; cold and age shorten it',
};

function wattHoursOf(pack: PackInput): number {
  requirePositive('nominal voltage', pack.nominalVolts);
  requirePositive('capacity', pack.ampereHours);
  requireWhole('number of series groups', pack.seriesGroups);
  requireWhole('number of parallel cells', pack.parallelCells);
  const energy = packWattHours(pack, pack.seriesGroups, pack.parallelCells);
  if (energy === undefined) throw new ArithmeticError('design_not_positive', { name: 'energy', value: 'unknown' });
  return energy;
}

/**
 * Energy and voltages of a pack.
 *
 * @param pack cell ratings (V, Ah), groups in series, cells in parallel
 * @returns energy (Wh), nominal and full voltage (V)
 * @throws ArithmeticError `design_not_positive`, `design_not_a_count`
 * @source definitions; the energy is the same figure as for transport
 */
export function packSheet(pack: PackInput): PackSheet {
  requirePositive('full voltage', pack.fullVolts);
  return {
    energy: { value: wattHoursOf(pack), unit: 'Wh', method: energyMethod, warnings: [] },
    nominalVolts: { value: pack.nominalVolts * pack.seriesGroups, unit: 'V', method: voltsMethod, warnings: [] },
    fullVolts: { value: pack.fullVolts * pack.seriesGroups, unit: 'V', method: voltsMethod, warnings: [] },
  };
}

/**
 * Currents and run time of a tool on its pack.
 *
 * @param pack cell ratings (V, Ah, A), groups in series, cells in parallel
 * @param load power while heating (W), efficiency, usable share, share of time heating
 * @returns pack and cell current (A) while heating, run time (h); warns where a cell gives more than its rating
 * @throws ArithmeticError `design_not_positive`, `design_not_a_count`, `design_out_of_range`
 * @source power and energy balance
 */
export function runSheet(pack: PackInput, load: LoadInput): RunSheet {
  requirePositive('power', load.watts);
  for (const [name, share] of [
    ['efficiency', load.efficiency],
    ['usable share', load.usableShare],
    ['share of time heating', load.heatingShare],
  ] as const) {
    requirePositive(name, share);
    requireWithin(name, share, 0, 1);
  }
  requirePositive('rated current', pack.ratedAmperes);
  const energy = wattHoursOf(pack);
  const packCurrent = load.watts / (load.efficiency * pack.nominalVolts * pack.seriesGroups);
  const cellCurrent = packCurrent / pack.parallelCells;
  const warnings =
    cellCurrent > pack.ratedAmperes
      ? [warn('cell_overloaded', { amperes: cellCurrent.toFixed(1), rated: String(pack.ratedAmperes) })]
      : [];
  return {
    packCurrent: { value: packCurrent, unit: 'A', method: currentMethod, warnings },
    cellCurrent: { value: cellCurrent, unit: 'A', method: cellMethod, warnings },
    runTime: {
      value: (energy * load.usableShare * load.efficiency) / (load.watts * load.heatingShare),
      unit: 'h',
      method: runMethod,
      warnings,
    },
  };
}
