import type { BillRevision } from './bill-revision.js';
import { without } from './without.js';

/** How the audit names a revision. */
export function revisionCode(revision: Pick<BillRevision, 'part' | 'number'>): string {
  return `${revision.part.code} revision ${revision.number}`;
}

/** What the audit keeps of a revision: everything a person typed, parts by their codes. */
export function recordedContent(revision: BillRevision): Readonly<Record<string, unknown>> {
  return {
    note: revision.note,
    lines: revision.lines.map((line) => ({
      ...without(line, 'id'),
      part: line.part.code,
      alternates: line.alternates.map(({ code }) => code),
    })),
    steps: revision.steps.map((step) => without(step, 'id')),
    testPlan: revision.testPlan.map((characteristic) => without(characteristic, 'id')),
  };
}
