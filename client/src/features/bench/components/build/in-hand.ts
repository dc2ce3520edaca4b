import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { limits } from '@emberlot/shared/judge/limits';
import { doubtReading } from '@emberlot/shared/judge/plausibility';
import { judgeReading } from '@emberlot/shared/judge/verdict';
import { decimal } from '@emberlot/shared/measure/decimal';
import type { Batch, Characteristic, UnitRuns } from '../../api/bench';

/** What goes to the server for one reading; it waits on this device while there is no connection. */
export interface TypedReading {
  run: number;
  position: number;
  reading?: string;
  answer?: boolean;
  measuredAt: string;
  clientKey: string;
  confirmed?: boolean;
}

export type Verdict = 'within' | 'outside';

/** A reading of the run in hand, from the server or still on this device. */
export interface ShownReading {
  text: string;
  verdict: Verdict | undefined;
  measuredAt: string;
}

export type Item = { kind: 'step' | 'reading'; position: number };

/** What stands in front: the next step, the next reading, or what became of the unit. */
export type Front = Item | { kind: 'fault' | 'finish' | 'finished' | 'scrapped' | 'waiting' };

export function limitsOf({ lowerLimit, upperLimit, digits }: Characteristic) {
  return limits({ lower: lowerLimit, upper: upperLimit, decimals: digits });
}

/** Judged here for the eye; the server works the verdict out again. */
export function verdictOf(characteristic: Characteristic, typed: string | boolean): Verdict | undefined {
  if (typeof typed === 'boolean') return typed ? 'within' : 'outside';
  const judged = attempt(() => judgeReading(typed, limitsOf(characteristic)));
  return judged.ok ? judged.value.verdict : undefined;
}

/** Why a reading cannot be taken, in a sentence. */
export function readingFault(characteristic: Characteristic, typed: string): string | undefined {
  const judged = attempt(() => judgeReading(typed, limitsOf(characteristic)));
  return judged.ok ? undefined : judged.fault.message;
}

/** What was probably meant, where a unit or point seems to have slipped. */
export function suggestionFor(characteristic: Characteristic, typed: string): string | undefined {
  const meant = doubtReading(decimal(typed), limitsOf(characteristic))?.suggestion;
  if (!meant) return undefined;
  const digits = characteristic.digits ?? 0;
  return meant.decimalPlaces() < digits ? meant.toFixed(digits) : meant.toFixed();
}

/** Readings of the run in hand by position; the one measured last counts. */
export function readingsInHand(
  plan: readonly Characteristic[],
  runs: UnitRuns,
  typed: readonly TypedReading[],
): ReadonlyMap<number, ShownReading> {
  const shown = new Map<number, ShownReading>();
  const open = runs.runs.find(({ run }) => run === runs.nextRun);
  for (const reading of open?.readings ?? []) {
    if (reading.replaced) continue;
    const text = reading.reading ?? (reading.answer ? 'yes' : 'no');
    shown.set(reading.position, { text, verdict: reading.verdict, measuredAt: reading.measuredAt });
  }
  for (const reading of typed) {
    const characteristic = plan.find(({ position }) => position === reading.position);
    const known = shown.get(reading.position);
    if (!characteristic || reading.run !== runs.nextRun) continue;
    if (known && Date.parse(known.measuredAt) >= Date.parse(reading.measuredAt)) continue;
    const value = reading.reading ?? reading.answer ?? false;
    shown.set(reading.position, {
      text: typeof value === 'boolean' ? (value ? 'yes' : 'no') : value,
      verdict: verdictOf(characteristic, value),
      measuredAt: reading.measuredAt,
    });
  }
  return shown;
}

/** Once a run is judged and no other has begun, its readings are what the unit has. */
export function readingsToShow(
  runs: UnitRuns,
  shown: ReadonlyMap<number, ShownReading>,
  judged: boolean,
): ReadonlyMap<number, ShownReading> {
  const last = runs.runs.findLast(({ verdict }) => verdict !== null);
  if (!judged || !last || shown.size > 0) return shown;
  return new Map(
    last.readings
      .filter(({ replaced }) => !replaced)
      .map(({ position, reading, answer, verdict, measuredAt }) => [
        position,
        { text: reading ?? (answer ? 'yes' : 'no'), verdict, measuredAt },
      ]),
  );
}

/** Steps first, then readings, then what came of them. */
export function frontOf(batch: Batch, serial: string, shown: ReadonlyMap<number, ShownReading>): Front {
  const unit = batch.units.find((candidate) => candidate.serial === serial);
  if (unit?.verdict === 'scrapped') return { kind: 'scrapped' };
  if (unit?.verdict === 'failed') return { kind: 'fault' };
  if (unit?.finished) return { kind: 'finished' };
  const step = batch.steps.find(({ doneOn }) => !doneOn.includes(serial));
  if (step) return { kind: 'step', position: step.position };
  if (unit?.verdict === 'passed') return { kind: 'finish' };
  const next = batch.testPlan.find(({ position }) => !shown.has(position));
  return next ? { kind: 'reading', position: next.position } : { kind: 'waiting' };
}
