import { ArithmeticError } from '../errors/arithmetic-error.js';

export interface LotSchedule {
  /** What is built per period: nothing or one lot or more. */
  readonly lots: readonly number[];
  /** Stock at the end of each period. */
  readonly projected: readonly number[];
}

/**
 * Schedules lots of one size: in every period in which stock would fall below zero. What is expected to leave is the
 * larger of forecast and promises.
 *
 * @param onHand at the start
 * @param forecast per period
 * @param promised per period
 * @param size of a lot
 * @throws ArithmeticError `plan_lot_size`
 * Source: master schedule as in W. J. Stevenson, Operations Management (from memory).
 */
export function scheduleLots(
  onHand: number,
  forecast: readonly number[],
  promised: readonly number[],
  size: number,
): LotSchedule {
  if (!(size > 0) || !Number.isFinite(size)) throw new ArithmeticError('plan_lot_size', { size });
  const [lots, projected]: [number[], number[]] = [[], []];
  let stock = onHand;
  forecast.forEach((expected, period) => {
    stock -= Math.max(expected, promised[period] ?? 0);
    const lot = stock < 0 ? Math.ceil(-stock / size) * size : 0;
    stock += lot;
    lots.push(lot);
    projected.push(stock);
  });
  return { lots, projected };
}
