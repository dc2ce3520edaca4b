import { issueQuantity } from '@emberlot/shared/bill/requirement';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { isStockMeasure, stockMeasures } from '@emberlot/shared/measure/stock-measures';
import { arithmeticLine } from '../bills/bill-arithmetic.js';
import type { BillRevision, RevisionLine } from '../bills/bill-revision.js';
import { AppError } from '../platform/errors/app-error.js';

/** A part that the batch takes from the shelf. */
export interface PlannedLine {
  /** Positions of the bill lines from the batch's own bill down to this one: `2/5`. */
  readonly path: string;
  readonly billLineId: number;
  readonly partId: number;
  /** What stays in one unit, in the part's stock unit. */
  readonly quantityPer: Decimal;
  /** For the whole batch, with the normal scrap. */
  readonly required: Decimal;
}

export interface PlannedStep {
  readonly path: string;
  readonly buildStepId: number;
  readonly perUnit: Decimal;
}

export interface SubAssembly {
  readonly path: string;
  readonly partId: number;
  readonly revisionId: number;
  readonly required: Decimal;
  readonly fromShelf: boolean;
}

export interface BatchPlan {
  readonly lines: readonly PlannedLine[];
  readonly steps: readonly PlannedStep[];
  readonly subAssemblies: readonly SubAssembly[];
}

/** Whether a made component is taken from the shelf rather than built within the batch. */
export type TakesFromShelf = (component: { path: string; partId: number; required: Decimal }) => boolean;

/** Shared sub-assemblies multiply; nobody picks from a list longer than this. */
const lineLimit = 2_000;

/**
 * Works out what a batch takes from the shelf and what is done in it. Each place of a component is rounded up once for
 * the whole batch. What is made one by one has a serial number of its own and is never built within another batch.
 *
 * @param quantity units of the batch
 * @param made released revisions of made components by the id of the part they make
 * @throws AppError `rule_broken` when the list would be too long to work by
 */
export function planBatch(
  revision: BillRevision,
  made: ReadonlyMap<number, BillRevision>,
  quantity: number,
  takesFromShelf: TakesFromShelf,
): BatchPlan {
  const lines: PlannedLine[] = [];
  const steps: PlannedStep[] = [];
  const subAssemblies: SubAssembly[] = [];
  const walk = (parent: BillRevision, amount: Decimal, perUnit: Decimal, above: string): void => {
    for (const line of parent.lines) {
      const path = above === '' ? String(line.position) : `${above}/${line.position}`;
      const required = issueQuantity(amount, arithmeticLine(line), decimalsOf(line));
      const quantityPer = stays(perUnit, line);
      const below = made.get(line.part.id);
      if (below) {
        const partId = line.part.id;
        const fromShelf = line.part.traced === 'single' || takesFromShelf({ path, partId, required });
        subAssemblies.push({ path, partId, revisionId: below.id, required, fromShelf });
        if (!fromShelf) {
          walk(below, required, quantityPer, path);
          continue;
        }
      }
      if (lines.length >= lineLimit) {
        throw new AppError(
          'rule_broken',
          `The batch would take more than ${lineLimit} lines. Build sub-assemblies first.`,
        );
      }
      lines.push({ path, billLineId: line.id, partId: line.part.id, quantityPer, required });
    }
    for (const { id } of parent.steps) steps.push({ path: above, buildStepId: id, perUnit });
  };
  walk(revision, new Decimal(quantity), new Decimal(1), '');
  return { lines, steps, subAssemblies };
}

/** Kept with the six decimals of the ledger, and never as nothing. */
function stays(perUnit: Decimal, line: RevisionLine): Decimal {
  const exact = perUnit.times(line.quantityPer);
  return Decimal.max(exact.toDecimalPlaces(6), new Decimal('0.000001'));
}

function decimalsOf(line: RevisionLine): number {
  return isStockMeasure(line.part.measure) ? stockMeasures[line.part.measure].decimals : 6;
}
