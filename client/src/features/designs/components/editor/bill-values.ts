import { parseDecimal } from '../../../../lib/parse-number';
import type { BillEdit, BillRevision } from '../../api/bills';

export interface LineValues {
  position: string;
  part: string;
  quantityPer: string;
  scrapPercent: string;
  marks: string;
  note: string;
  /** Codes with commas or spaces between them, the preferred one first. */
  alternates: string;
}

export interface StepValues {
  title: string;
  instruction: string;
  minutes: string;
  caution: string;
}

export interface CharacteristicValues {
  name: string;
  kind: 'numeric' | 'yes_no';
  unit: string;
  lowerLimit: string;
  target: string;
  upperLimit: string;
  digits: string;
  condition: string;
  caution: string;
}

/** A draft as it is typed: everything is text until it is sent. */
export interface BillValues {
  version: number;
  note: string;
  lines: LineValues[];
  steps: StepValues[];
  testPlan: CharacteristicValues[];
}

export const emptyStep: StepValues = { title: '', instruction: '', minutes: '', caution: '' };

export const emptyCharacteristic: CharacteristicValues = {
  name: '',
  kind: 'numeric',
  unit: '',
  lowerLimit: '',
  target: '',
  upperLimit: '',
  digits: '1',
  condition: '',
  caution: '',
};

/** An empty line whose position leaves room for another between it and the last. */
export function emptyLine(lines: readonly LineValues[]): LineValues {
  const last = Math.max(0, ...lines.map(({ position }) => Number(position) || 0));
  return {
    position: String(Math.floor(last / 10) * 10 + 10),
    part: '',
    quantityPer: '1',
    scrapPercent: '',
    marks: '',
    note: '',
    alternates: '',
  };
}

export function valuesOf(revision: BillRevision): BillValues {
  return {
    version: revision.version,
    note: revision.note ?? '',
    lines: revision.lines.map((line) => ({
      position: String(line.position),
      part: line.part.code,
      quantityPer: line.quantityPer,
      scrapPercent: line.scrapPercent === '0' ? '' : line.scrapPercent,
      marks: line.marks ?? '',
      note: line.note ?? '',
      alternates: line.alternates.map(({ code }) => code).join(', '),
    })),
    steps: revision.steps.map(({ title, instruction, minutes, caution }) => ({
      title,
      instruction,
      minutes: minutes === '0' ? '' : minutes,
      caution: caution ?? '',
    })),
    testPlan: revision.testPlan.map((entry) => ({
      name: entry.name,
      kind: entry.kind,
      unit: entry.unit ?? '',
      lowerLimit: entry.lowerLimit ?? '',
      target: entry.target ?? '',
      upperLimit: entry.upperLimit ?? '',
      digits: entry.digits === null ? '' : String(entry.digits),
      condition: entry.condition ?? '',
      caution: entry.caution ?? '',
    })),
  };
}

/** What is sent. Text that is no number goes as it is, so that the server's sentence lands on its field. */
export function editOf(values: BillValues): BillEdit {
  return {
    version: values.version,
    note: orNone(values.note),
    lines: values.lines.map((line) => ({
      position: Number(line.position),
      part: line.part.trim(),
      quantityPer: decimalOf(line.quantityPer),
      scrapPercent: decimalOf(line.scrapPercent, '0'),
      marks: orNone(line.marks),
      note: orNone(line.note),
      alternates: line.alternates.split(/[\s,;]+/).filter((code) => code !== ''),
    })),
    steps: values.steps.map((step) => ({
      title: step.title,
      instruction: step.instruction,
      minutes: decimalOf(step.minutes, '0'),
      caution: orNone(step.caution),
    })),
    testPlan: values.testPlan.map((entry) => {
      const isNumber = entry.kind === 'numeric';
      const limit = (text: string): string | null => (isNumber && text.trim() !== '' ? decimalOf(text) : null);
      return {
        name: entry.name,
        kind: entry.kind,
        unit: isNumber ? orNone(entry.unit) : null,
        lowerLimit: limit(entry.lowerLimit),
        target: limit(entry.target),
        upperLimit: limit(entry.upperLimit),
        digits: isNumber && entry.digits.trim() !== '' ? Number(entry.digits) : null,
        condition: orNone(entry.condition),
        caution: orNone(entry.caution),
      };
    }),
  };
}

function decimalOf(text: string, none = ''): string {
  return text.trim() === '' ? none : (parseDecimal(text) ?? text);
}

function orNone(text: string): string | null {
  return text.trim() === '' ? null : text;
}
