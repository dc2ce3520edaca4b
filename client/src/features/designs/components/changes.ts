import { formatQuantity } from '../../../lib/format-quantity';
import type { BillComparison, BillLine, BuildStep, Characteristic } from '../api/bills';
import { limitsInWords, unitOf } from './design-words';

/** One row of a comparison, in words. */
export interface ChangeRow {
  key: string;
  kind: 'added' | 'removed' | 'changed';
  /** The code of the part, for a line. */
  part?: string;
  what: string;
  before: string;
  after: string;
}

export function lineChangeRows(comparison: BillComparison): ChangeRow[] {
  return comparison.lines.map(({ kind, before, after, fields }, index) => {
    const line = after ?? before;
    return {
      key: `line ${index}`,
      kind,
      part: line?.part.code,
      what: `Position ${line?.position ?? ''}`,
      before: before ? lineWords(before, kind === 'changed' ? fields : undefined) : '–',
      after: after ? lineWords(after, kind === 'changed' ? fields : undefined) : '–',
    };
  });
}

export function stepChangeRows(comparison: BillComparison): ChangeRow[] {
  return comparison.steps.map(({ kind, before, after, fields }, index) => ({
    key: `step ${index}`,
    kind,
    what: (after ?? before)?.title ?? '',
    before: before ? stepWords(before, kind === 'changed' ? fields : undefined) : '–',
    after: after ? stepWords(after, kind === 'changed' ? fields : undefined) : '–',
  }));
}

export function planChangeRows(comparison: BillComparison): ChangeRow[] {
  return comparison.testPlan.map(({ kind, before, after }, index) => ({
    key: `test ${index}`,
    kind,
    what: (after ?? before)?.name ?? '',
    before: before ? characteristicWords(before) : '–',
    after: after ? characteristicWords(after) : '–',
  }));
}

/** @param only the fields to say; all that are filled when nothing is given */
function lineWords(line: BillLine, only?: readonly string[]): string {
  const words: Record<string, string> = {
    position: `position ${line.position}`,
    part: line.part.code,
    quantityPer: `${formatQuantity(line.quantityPer, unitOf(line.part.measure))} for one`,
    scrapShare: `${line.scrapPercent} % scrap`,
    marks: line.marks ?? 'no marks',
    note: line.note ?? 'no note',
    alternates:
      line.alternates.length > 0 ? `or ${line.alternates.map(({ code }) => code).join(', ')}` : 'no replacement',
  };
  const fields = only ?? ['quantityPer', ...(line.scrapPercent === '0' ? [] : ['scrapShare'])];
  return fields.map((field) => words[field] ?? '').join(', ');
}

function stepWords(step: BuildStep, only?: readonly string[]): string {
  const words: Record<string, string> = {
    position: `as step ${step.position}`,
    instruction: step.instruction || 'without instruction',
    minutes: `${step.minutes} min`,
    caution: step.caution ?? 'no caution',
  };
  return (only ?? ['minutes']).map((field) => words[field] ?? '').join(', ');
}

function characteristicWords(entry: Characteristic): string {
  const more = [entry.target === null ? '' : `aim ${entry.target}`, entry.condition ?? '', entry.caution ?? ''];
  return [limitsInWords(entry), ...more.filter((word) => word !== '')].join(', ');
}
