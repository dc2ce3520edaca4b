import { Decimal } from '../measure/decimal.js';
import { addingUp, asCost } from './adding-up.js';
import { type BillLine, type PartKey, takenPerUnit } from './bill-lines.js';
import { compareBills, pairLines } from './compare.js';
import { type CostState, type ExactCosts, exactCosts, hoursOf } from './cost-state.js';

/** One reason why a part costs something else than before. */
export type CostDriver =
  | { readonly kind: 'price' | 'minutes' | 'made_or_bought'; readonly part: PartKey }
  | { readonly kind: LineDriverKind; readonly part: PartKey; readonly position: string; readonly component: PartKey }
  | { readonly kind: 'labour_rate' | 'overhead_rate' };

export type LineDriverKind = 'quantity' | 'scrap' | 'line_added' | 'line_removed' | 'part_exchanged';

export interface CostAttribution {
  readonly before: Decimal;
  readonly after: Decimal;
  /** Largest effect first. The amounts, six decimals each, add up to after − before. */
  readonly drivers: readonly { readonly driver: CostDriver; readonly amount: Decimal }[];
}

/**
 * Says why one unit of a part costs more or less than before, driver by driver, so that the amounts add up.
 *
 * Where two factors of a product change together, each is credited with its own change times the mean of the other:
 * Δ(q·c) = Δq·(c₀+c₁)/2 + Δc·(q₀+q₁)/2. That is exact, treats both alike, and carries through the levels: the effect of
 * a component's driver is weighted with the mean quantity taken of it. An added, removed or exchanged line counts whole.
 *
 * @param before the earlier state
 * @param after the later state
 * @param part what is costed
 * @throws ArithmeticError as `exactCosts`
 * Source: mean of the two orders of substitution, which is the Shapley value of two factors; L. S. Shapley, A Value for
 *   n-Person Games, 1953 (from memory).
 */
export function attributeCost(before: CostState, after: CostState, part: PartKey): CostAttribution {
  const attribution = new Attribution(before, after, part);
  const effects = [...attribution.effectsOn(part).values()];
  const [from, to] = [asCost(attribution.costBefore(part)), asCost(attribution.costAfter(part))];
  const amounts = addingUp(
    effects.map(({ amount }) => amount),
    to.minus(from),
  );
  const drivers = effects.map(({ driver }, index) => ({ driver, amount: amounts[index] ?? new Decimal(0) }));
  return {
    before: from,
    after: to,
    drivers: drivers
      .filter(({ amount }) => !amount.isZero())
      .toSorted((a, b) => b.amount.abs().comparedTo(a.amount.abs())),
  };
}

interface Effect {
  readonly driver: CostDriver;
  readonly amount: Decimal;
}

type Effects = ReadonlyMap<string, Effect>;

class Attribution {
  private readonly old: ExactCosts;
  private readonly now: ExactCosts;
  private readonly known = new Map<PartKey, Effects>();

  constructor(
    private readonly before: CostState,
    private readonly after: CostState,
    part: PartKey,
  ) {
    this.old = exactCosts(before, part);
    this.now = exactCosts(after, part);
  }

  costBefore(part: PartKey): Decimal {
    return this.old.exact.get(part) ?? new Decimal(0);
  }

  costAfter(part: PartKey): Decimal {
    return this.now.exact.get(part) ?? new Decimal(0);
  }

  /** The effect of each driver on the exact cost of one unit of a part that is there before and after. */
  effectsOn(part: PartKey): Effects {
    const known = this.known.get(part);
    if (known !== undefined) return known;
    const [oldLines, newLines] = [this.old.made.get(part), this.now.made.get(part)];
    const effects = new Map<string, Effect>();
    if (oldLines === undefined || newLines === undefined) {
      const kind = oldLines === newLines ? 'price' : 'made_or_bought';
      add(effects, { kind, part }, this.costAfter(part).minus(this.costBefore(part)));
    } else {
      this.addLines(effects, part, oldLines, newLines);
      this.addBench(effects, part);
    }
    this.known.set(part, effects);
    return effects;
  }

  private addLines(
    effects: Map<string, Effect>,
    part: PartKey,
    oldLines: readonly BillLine[],
    newLines: readonly BillLine[],
  ): void {
    for (const [line, earlier] of pairLines(oldLines, newLines)) this.addKept(effects, part, earlier, line);
    for (const change of compareBills(oldLines, newLines)) {
      if (change.kind === 'added') {
        const { position, part: component } = change.after;
        add(effects, { kind: 'line_added', part, position, component }, this.lineAfter(change.after));
      }
      if (change.kind === 'removed') {
        const { position, part: component } = change.before;
        add(effects, { kind: 'line_removed', part, position, component }, this.lineBefore(change.before).negated());
      }
    }
  }

  private addKept(effects: Map<string, Effect>, part: PartKey, earlier: BillLine, line: BillLine): void {
    const { position, part: component } = line;
    if (earlier.part !== component) {
      const change = this.lineAfter(line).minus(this.lineBefore(earlier));
      add(effects, { kind: 'part_exchanged', part, position, component }, change);
      return;
    }
    const [taken, takenBefore] = [takenPerUnit(line), takenPerUnit(earlier)];
    for (const { driver, amount } of this.effectsOn(component).values()) {
      add(effects, driver, amount.times(mean(taken, takenBefore)));
    }
    const cost = mean(this.costBefore(component), this.costAfter(component));
    const [lossBefore, loss] = [lossFactor(earlier), lossFactor(line)];
    const more = line.quantityPer.minus(earlier.quantityPer).times(mean(lossBefore, loss));
    const lost = loss.minus(lossBefore).times(mean(line.quantityPer, earlier.quantityPer));
    add(effects, { kind: 'quantity', part, position, component }, more.times(cost));
    add(effects, { kind: 'scrap', part, position, component }, lost.times(cost));
  }

  private addBench(effects: Map<string, Effect>, part: PartKey): void {
    const [old, now] = [this.before, this.after];
    const [oldHours, hours] = [hoursOf(old, part), hoursOf(now, part)];
    const oldRate = old.labourRate.plus(old.overheadRate);
    const rate = now.labourRate.plus(now.overheadRate);
    const meanHours = mean(oldHours, hours);
    add(effects, { kind: 'minutes', part }, hours.minus(oldHours).times(mean(oldRate, rate)));
    add(effects, { kind: 'labour_rate' }, now.labourRate.minus(old.labourRate).times(meanHours));
    add(effects, { kind: 'overhead_rate' }, now.overheadRate.minus(old.overheadRate).times(meanHours));
  }

  private lineBefore(line: BillLine): Decimal {
    return takenPerUnit(line).times(this.costBefore(line.part));
  }

  private lineAfter(line: BillLine): Decimal {
    return takenPerUnit(line).times(this.costAfter(line.part));
  }
}

function add(effects: Map<string, Effect>, driver: CostDriver, amount: Decimal): void {
  if (amount.isZero()) return;
  const key = JSON.stringify(driver);
  effects.set(key, { driver, amount: amount.plus(effects.get(key)?.amount ?? 0) });
}

/** Taken per fitted: 1 / (1 − scrap share). */
function lossFactor(line: BillLine): Decimal {
  return new Decimal(1).div(new Decimal(1).minus(line.scrapShare));
}

function mean(a: Decimal, b: Decimal): Decimal {
  return a.plus(b).div(2);
}
