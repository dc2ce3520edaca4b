import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { limits, type Limits } from '@emberlot/shared/judge/limits';
import { doubtReading } from '@emberlot/shared/judge/plausibility';
import { judgeReading, judgeYesNo } from '@emberlot/shared/judge/verdict';
import { decimal } from '@emberlot/shared/measure/decimal';
import { AppError, fieldFault } from '../platform/errors/app-error.js';
import type { ReadingInputDto } from './test-run.dto.js';
import type { CharacteristicRow, NewReadingRow, ReadingRow } from './test-runs.repository.js';

type Judged = Pick<NewReadingRow, 'value' | 'typed' | 'answer' | 'unit' | 'lower' | 'upper' | 'verdict'>;

/**
 * Judges a reading by the limits of its characteristic, which are kept with it.
 *
 * @throws AppError `invalid_input` for a reading of the wrong kind or with too few digits; `rule_broken` with the doubt
 *   for one that looks as if its unit had slipped and that nobody has looked at again
 */
export function judged(characteristic: CharacteristicRow, input: ReadingInputDto): Judged {
  const { unit, lower, upper } = characteristic;
  if (characteristic.kind === 'yes_no') {
    if (typeof input.answer !== 'boolean')
      throw fieldFault('/answer', 'missing', `Answer ${characteristic.name} by yes or no.`);
    const verdict = judgeYesNo(input.answer, true);
    return { value: null, typed: null, answer: input.answer, unit, lower, upper, verdict };
  }
  const reading = input.reading;
  if (typeof reading !== 'string')
    throw fieldFault('/reading', 'missing', `Give the reading of ${characteristic.name}.`);
  const allowed = limits({ lower, upper, decimals: characteristic.digits });
  const judgement = attempt(() => judgeReading(reading, allowed));
  if (!judgement.ok) throw fieldFault('/reading', 'reading', judgement.fault.message);
  if (input.confirmed !== true) refuseSlip(reading, allowed, characteristic);
  return { value: reading, typed: reading, answer: null, unit, lower, upper, verdict: judgement.value.verdict };
}

function refuseSlip(reading: string, allowed: Limits, { name, unit }: CharacteristicRow): void {
  const doubt = doubtReading(decimal(reading), allowed);
  if (!doubt) return;
  const suggestion = doubt.suggestion.toFixed();
  const sentence = `${name}: ${reading} ${unit ?? ''} looks as if its unit or point had slipped. Did you mean ${suggestion} ${unit ?? ''}?`;
  throw new AppError('rule_broken', sentence, {
    faults: [{ pointer: '/reading', code: 'doubtful', detail: sentence }],
    extra: { doubt: { kind: doubt.kind, factor: doubt.factor.toFixed(), suggestion } },
  });
}

/** The reading that counts of each characteristic: the one measured last. Expects them ordered so. */
export function counting(readings: readonly ReadingRow[]): ReadonlyMap<number, ReadingRow> {
  const first = new Map<number, ReadingRow>();
  for (const reading of readings) {
    if (!first.has(reading.characteristicId)) first.set(reading.characteristicId, reading);
  }
  return first;
}

/** What was outside, as a fault says it. */
export function whatFailed(readings: Iterable<ReadingRow>): string {
  return [...readings]
    .filter(({ verdict }) => verdict === 'outside')
    .map((reading) => {
      if (reading.kind === 'yes_no') return `${reading.name}: no.`;
      return `${reading.name}: ${reading.typed ?? ''} ${reading.unit ?? ''}, allowed ${allowedWords(reading)}.`;
    })
    .join(' ')
    .slice(0, 500);
}

function allowedWords({ lower, upper, unit }: ReadingRow): string {
  if (lower === null) return `at most ${upper ?? ''} ${unit ?? ''}`;
  if (upper === null) return `at least ${lower} ${unit ?? ''}`;
  return `${lower} to ${upper} ${unit ?? ''}`;
}
