import { formatQuantity } from '../../../lib/format-quantity';
import { formatDay, formatInstantShort, shopDay } from '../../../lib/format-time';
import { capital, numberWord } from '../../../lib/number-words';
import type { Bill, BillRevision, Characteristic, DesignQueueItem } from '../api/bills';

/** `piece` is said only where something else could be meant. */
export function unitOf(measure: string): string | undefined {
  return measure === 'piece' ? undefined : measure;
}

/** `between 2 and 8 s`, `at most 5 V`, `at least 10 Ω`, `yes`. */
export function limitsInWords(characteristic: Omit<Characteristic, 'position' | 'name'>): string {
  const { kind, lowerLimit, upperLimit, unit } = characteristic;
  if (kind === 'yes_no') return 'must be yes';
  const figure = (value: string): string => formatQuantity(value, undefined, characteristic.digits ?? undefined);
  const suffix = unit ? `\u00a0${unit}` : '';
  if (lowerLimit !== null && upperLimit !== null) return `${figure(lowerLimit)} to ${figure(upperLimit)}${suffix}`;
  if (upperLimit !== null) return `at most ${figure(upperLimit)}${suffix}`;
  return `at least ${figure(lowerLimit ?? '')}${suffix}`;
}

/** How a bill stands, in a sentence. */
export function billStanding(bill: Bill): string {
  const draft = bill.draft === null ? '' : ` Revision ${bill.draft} is being drafted.`;
  const released = bill.revisions.find(({ number }) => number === bill.released);
  if (released?.releasedAt) {
    return `Revision ${released.number} is in force since ${formatDay(shopDay(released.releasedAt))}.${draft}`;
  }
  return bill.draft === null ? 'It has no bill: it is bought.' : `Nothing is released yet.${draft}`;
}

/** What one revision is, for its heading. */
export function revisionStanding({ number, status, releasedAt, supersededAt }: BillRevision): string {
  if (status === 'draft') return `Revision ${number}, a draft`;
  const since = releasedAt ? `, released ${formatInstantShort(releasedAt)}` : '';
  return status === 'released'
    ? `Revision ${number}, in force${since}`
    : `Revision ${number}, superseded ${supersededAt ? formatInstantShort(supersededAt) : ''}`.trimEnd();
}

export const statusWords = { draft: 'draft', released: 'in force', superseded: 'superseded' } as const;

/** `three parts are retired`, with the parts named as tags. */
export function queueSentence({ kind, part, number, parts, against }: DesignQueueItem): string {
  const it = `{part:${part.code}}`;
  const named = parts.map((code) => `{part:${code}}`).join(', ');
  if (kind === 'draft_waiting') {
    return against.length === 0
      ? `Revision ${number} of ${it} waits to be released.`
      : `Revision ${number} of ${it} is not ready to be released.`;
  }
  if (kind === 'component_retired') {
    const verb = parts.length === 1 ? 'is' : 'are';
    return `Revision ${number} of ${it} asks for ${named}, which ${verb} retired.`;
  }
  return `Not one ${it} can be built now: ${named} ${parts.length === 1 ? 'is' : 'are'} missing.`;
}

export function queueHeadline(items: readonly DesignQueueItem[]): string {
  if (items.length === 0) return 'Nothing waits here';
  return items.length === 1 ? 'One design needs a hand' : `${capital(numberWord(items.length))} designs need a hand`;
}
