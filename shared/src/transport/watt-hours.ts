import { Decimal } from '../measure/decimal.js';

/** What the label of a cell says. */
export interface CellRating {
  /** Nominal voltage in volts. */
  readonly nominalVolts: number;
  /** Rated capacity in ampere-hours. */
  readonly ampereHours: number;
}

const isPositive = (value: number): boolean => Number.isFinite(value) && value > 0;
const isCount = (value: number): boolean => Number.isSafeInteger(value) && value > 0;

/**
 * Watt-hours of one cell: nominal voltage times rated capacity.
 *
 * Multiplied as decimals, because the transport limits are inclusive and binary rounding must not tip a cell over one.
 *
 * @param cell nominal voltage (V) and rated capacity (Ah)
 * @returns watt-hours, or undefined if a figure is not a positive number (the caller then has to ask)
 * @source UN Manual of Tests and Criteria, Part III, 38.3.2.3, "watt-hour or nominal energy"; from memory.
 */
export function cellWattHours(cell: CellRating): number | undefined {
  if (!isPositive(cell.nominalVolts) || !isPositive(cell.ampereHours)) return undefined;
  return new Decimal(cell.nominalVolts).times(cell.ampereHours).toNumber();
}

/**
 * Watt-hours of a battery: the sum over its cells, however they are joined.
 *
 * @param cell rating of each cell (V, Ah)
 * @param seriesGroups number of groups in series
 * @param parallelCells number of cells in parallel in each group
 * @returns watt-hours, or undefined if a figure is not a positive number or a count not a positive whole number
 * @source UN Manual of Tests and Criteria, Part III, 38.3.2.3; from memory.
 */
export function packWattHours(cell: CellRating, seriesGroups: number, parallelCells: number): number | undefined {
  if (!isPositive(cell.nominalVolts) || !isPositive(cell.ampereHours)) return undefined;
  if (!isCount(seriesGroups) || !isCount(parallelCells)) return undefined;
  return new Decimal(cell.nominalVolts).times(cell.ampereHours).times(seriesGroups).times(parallelCells).toNumber();
}
