import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, decimal, type DecimalInput } from '../measure/decimal.js';
import { apportion } from '../money/apportion.js';
import { addMinor, subtractMinor, type MinorAmount } from '../money/minor-units.js';
import { costPool, issueFromPool } from '../money/movement-value.js';

/** A finished batch. */
export interface BatchOutcome {
  /** Pieces started. */
  readonly started: number;
  /** Pieces that came out good. */
  readonly good: number;
  /** Pieces that are lost in a normal batch of this size; may be a fraction. */
  readonly normalLoss: DecimalInput;
  /** All that the batch cost, minor units. */
  readonly cost: MinorAmount;
  /** What the lost pieces bring (recovered parts, scrap), minor units for all of them. */
  readonly salvage: MinorAmount;
}

/** Who bears a batch's cost. */
export interface BatchCost {
  /** Minor units that the good pieces carry together. */
  readonly good: MinorAmount;
  /** Per good piece, adding up to `good`; the earlier ones take the odd minor units. */
  readonly perPiece: readonly MinorAmount[];
  /** Abnormal loss: an expense of the period, minor units, after its salvage. */
  readonly abnormalLoss: MinorAmount;
  /** Pieces lost beyond the normal. */
  readonly abnormalPieces: Decimal;
}

/**
 * Divides a batch's cost between its good pieces and the period. Normal loss is spread over the good pieces; what is
 * lost beyond it is expensed at the cost a good piece would have had. A loss below normal makes each piece cheaper and
 * is not shown as a gain, so that stock is never above cost.
 *
 * @param batch started, good, normal loss, cost and salvage; cost not below salvage
 * @returns the division; `good + abnormalLoss = cost − salvage`
 * @throws ArithmeticError `costing_more_good_than_started`, `costing_nothing_good` when there is a cost, nothing good,
 *   and all of the loss is normal; `costing_quantity_negative`, `costing_value_negative`
 * @source IAS 2, paragraph 16(a); unit cost (cost − salvage of normal loss) ÷ (started − normal loss) is common practice
 *   of process costing.
 */
export function divideBatchCost(batch: BatchOutcome): BatchCost {
  checkBatch(batch);
  const lost = batch.started - batch.good;
  const normal = Decimal.min(decimal(batch.normalLoss), lost);
  const abnormalPieces = new Decimal(lost).minus(normal);
  const [normalSalvage, abnormalSalvage] =
    lost === 0
      ? [batch.salvage, subtractMinor(batch.salvage, batch.salvage)]
      : splitSalvage(batch, normal, abnormalPieces);
  const spread = subtractMinor(batch.cost, normalSalvage);
  if (spread < 0) throw new ArithmeticError('costing_value_negative', { value: spread });
  const expected = abnormalPieces.plus(batch.good);
  if (expected.isZero()) {
    if (spread !== 0) throw new ArithmeticError('costing_nothing_good');
    return { good: spread, perPiece: [], abnormalLoss: spread, abnormalPieces };
  }
  const pool = costPool(expected, spread);
  const issue = abnormalPieces.isZero()
    ? { value: subtractMinor(spread, spread), pool }
    : issueFromPool(pool, abnormalPieces);
  const good = addMinor(spread, issue.value);
  return {
    good,
    perPiece: apportion(
      good,
      Array.from({ length: batch.good }, () => 1),
    ),
    abnormalLoss: subtractMinor(subtractMinor(spread, good), abnormalSalvage),
    abnormalPieces,
  };
}

function splitSalvage(batch: BatchOutcome, normal: Decimal, abnormal: Decimal): readonly [MinorAmount, MinorAmount] {
  const [normalSalvage = batch.salvage, abnormalSalvage = batch.salvage] = apportion(batch.salvage, [normal, abnormal]);
  return [normalSalvage, abnormalSalvage];
}

function checkBatch(batch: BatchOutcome): void {
  const { started, good, cost, salvage } = batch;
  for (const quantity of [started, good]) {
    if (!Number.isSafeInteger(quantity) || quantity < 0) {
      throw new ArithmeticError('costing_quantity_negative', { quantity });
    }
  }
  if (good > started) throw new ArithmeticError('costing_more_good_than_started', { started, good });
  for (const value of [cost, salvage]) {
    if (value < 0) throw new ArithmeticError('costing_value_negative', { value });
  }
  const normal = decimal(batch.normalLoss);
  if (normal.lessThan(0)) throw new ArithmeticError('costing_quantity_negative', { quantity: normal.toFixed() });
}
