import { attempt } from '@emberlot/shared/errors/arithmetic-error';
import { decimal } from '@emberlot/shared/measure/decimal';
import { isStockMeasure } from '@emberlot/shared/measure/stock-measures';
import { positiveStockQuantity } from '@emberlot/shared/measure/stock-quantity';
import type { Plain } from '../platform/api/plain.js';
import type { FieldFault } from '../platform/errors/app-error.js';
import type { BillContentDto, BillLineInputDto, BuildStepInputDto, CharacteristicInputDto } from './bill.dto.js';
import type { BillPart, BillRevision, RevisionCharacteristic, RevisionLine, RevisionStep } from './bill-revision.js';
import { without } from './without.js';

export type CheckedLine = Omit<RevisionLine, 'id'>;
export type CheckedStep = Omit<RevisionStep, 'id' | 'position'>;
export type CheckedCharacteristic = Omit<RevisionCharacteristic, 'id' | 'position'>;

/** What a draft is to hold, with the parts looked up. */
export interface CheckedContent {
  readonly lines: readonly CheckedLine[];
  readonly steps: readonly CheckedStep[];
  readonly testPlan: readonly CheckedCharacteristic[];
}

export type Parts = ReadonlyMap<string, BillPart>;

/** The codes of all parts that a content names. */
export function codesIn(content: Pick<BillContentDto, 'lines'>): string[] {
  return content.lines.flatMap((line) => [line.part, ...line.alternates]);
}

/** What a revision holds, to be put into another one. */
export function contentOf(revision: BillRevision): CheckedContent {
  return {
    lines: revision.lines.map((line) => without(line, 'id')),
    steps: revision.steps.map((step) => without(step, 'id', 'position')),
    testPlan: revision.testPlan.map((characteristic) => without(characteristic, 'id', 'position')),
  };
}

/** What a revision holds, as it would be typed. */
export function inputOf(revision: BillRevision): Plain<BillContentDto> {
  const { lines, steps, testPlan } = contentOf(revision);
  return {
    note: revision.note,
    lines: lines.map((line) => ({
      ...line,
      part: line.part.code,
      alternates: line.alternates.map(({ code }) => code),
    })),
    steps: [...steps],
    testPlan: [...testPlan],
  };
}

/**
 * Looks at a content as a whole.
 *
 * @param owner the part whose bill it is
 * @returns every fault with its pointer; the content is of use only when there is none
 */
export function checkContent(
  owner: BillPart,
  content: BillContentDto,
  parts: Parts,
): { readonly content: CheckedContent; readonly faults: readonly FieldFault[] } {
  const faults = [
    ...content.lines.flatMap((line, index) => lineFaults(owner, line, parts, `/lines/${index}`)),
    ...doubled(
      content.lines,
      '/lines',
      'position',
      ({ position }) => String(position),
      'Another line has this position.',
    ),
    ...content.testPlan.flatMap((entry, index) => characteristicFaults(entry, `/testPlan/${index}`)),
    ...doubled(
      content.testPlan,
      '/testPlan',
      'name',
      ({ name }) => name.toLowerCase(),
      'Another line of the test plan has this name.',
    ),
  ];
  return {
    faults,
    content: {
      lines: content.lines.flatMap((line) => checkedLine(line, parts)),
      steps: content.steps.map(checkedStep),
      testPlan: content.testPlan.map(checkedCharacteristic),
    },
  };
}

function lineFaults(owner: BillPart, line: BillLineInputDto, parts: Parts, at: string): FieldFault[] {
  const part = parts.get(line.part);
  if (!part) return [unknownPart(`${at}/part`, line.part)];
  const faults = alternateFaults(owner, part, line, parts, at);
  if (part.code === owner.code) faults.push(containsItself(`${at}/part`, `${owner.code} contains ${owner.code}`));
  const quantity = attempt(() => isStockMeasure(part.measure) && positiveStockQuantity(line.quantityPer, part.measure));
  if (!quantity.ok) faults.push({ pointer: `${at}/quantityPer`, code: 'quantity', detail: quantity.fault.message });
  return faults;
}

function alternateFaults(
  owner: BillPart,
  part: BillPart,
  line: BillLineInputDto,
  parts: Parts,
  at: string,
): FieldFault[] {
  const pointer = `${at}/alternates`;
  const faults: FieldFault[] = [];
  const seen = new Set([part.code]);
  for (const code of line.alternates) {
    const alternate = parts.get(code);
    if (!alternate) faults.push(unknownPart(pointer, code));
    else if (code === owner.code) faults.push(containsItself(pointer, `${owner.code} contains ${owner.code}`));
    else if (seen.has(code)) faults.push({ pointer, code: 'repeated', detail: `${code} stands in this line already.` });
    else if (alternate.measure !== part.measure) {
      const detail = `${code} is kept in ${alternate.measure} and ${part.code} in ${part.measure}, so one cannot stand in for the other.`;
      faults.push({ pointer, code: 'measure', detail });
    }
    seen.add(code);
  }
  return faults;
}

function characteristicFaults(entry: CharacteristicInputDto, at: string): FieldFault[] {
  const fault = (field: string, detail: string): FieldFault => ({ pointer: `${at}/${field}`, code: 'limits', detail });
  const numbers = [entry.lowerLimit, entry.target, entry.upperLimit, entry.unit, entry.digits];
  if (entry.kind === 'yes_no') {
    return numbers.some((value) => value !== null && value !== undefined)
      ? [fault('kind', 'A yes/no question has no unit, digits or limits. Take them out, or ask for a number.')]
      : [];
  }
  const faults: FieldFault[] = [];
  if (!entry.unit) faults.push(fault('unit', 'Say in which unit the reading is taken.'));
  if (entry.digits === null || entry.digits === undefined) {
    faults.push(fault('digits', 'Say with how many decimals the reading is given.'));
  }
  const lower = limitOf(entry.lowerLimit);
  const upper = limitOf(entry.upperLimit);
  const target = limitOf(entry.target);
  if (!lower && !upper) faults.push(fault('lowerLimit', 'Give a lower limit, an upper limit, or both.'));
  if (lower && upper && !lower.lessThan(upper)) {
    faults.push(fault('upperLimit', 'The upper limit must lie above the lower one.'));
  } else if (target && ((lower && target.lessThan(lower)) || (upper && target.greaterThan(upper)))) {
    faults.push(fault('target', 'The target must lie within the limits.'));
  }
  return faults;
}

function limitOf(value: string | null | undefined) {
  return value === null || value === undefined ? undefined : decimal(value);
}

function doubled<Item>(
  items: readonly Item[],
  at: string,
  field: string,
  keyOf: (item: Item) => string,
  detail: string,
): FieldFault[] {
  const seen = new Set<string>();
  return items.flatMap((item, index) => {
    const key = keyOf(item);
    if (!seen.has(key)) {
      seen.add(key);
      return [];
    }
    return [{ pointer: `${at}/${index}/${field}`, code: 'repeated', detail }];
  });
}

function checkedLine(line: BillLineInputDto, parts: Parts): CheckedLine[] {
  const part = parts.get(line.part);
  if (!part) return [];
  const alternates = line.alternates.flatMap((code) => parts.get(code) ?? []);
  const { position, quantityPer, scrapPercent } = line;
  return [
    { position, part, quantityPer, scrapPercent, marks: line.marks ?? null, note: line.note ?? null, alternates },
  ];
}

function checkedStep({ title, instruction, minutes, caution }: BuildStepInputDto): CheckedStep {
  return { title, instruction, minutes, caution: caution ?? null };
}

function checkedCharacteristic(entry: CharacteristicInputDto): CheckedCharacteristic {
  return {
    name: entry.name,
    kind: entry.kind,
    unit: entry.unit ?? null,
    lowerLimit: entry.lowerLimit ?? null,
    target: entry.target ?? null,
    upperLimit: entry.upperLimit ?? null,
    digits: entry.digits ?? null,
    condition: entry.condition ?? null,
    caution: entry.caution ?? null,
  };
}

function unknownPart(pointer: string, code: string): FieldFault {
  return { pointer, code: 'unknown', detail: `There is no part ${code}. Add it to the shelf first.` };
}

/** @param way such as "A contains B contains A" */
export function containsItself(pointer: string, way: string): FieldFault {
  return { pointer, code: 'contains_itself', detail: `A bill may not contain itself: ${way}.` };
}
