import { billLimit } from '@emberlot/shared/limits/bills';
import { codePattern } from '@emberlot/shared/limits/codes';
import { quantityDigits } from '@emberlot/shared/limits/numbers';
import { textLimit } from '@emberlot/shared/limits/text';
import { codeSentence } from '../platform/validation/codes.js';
import type { ImportColumn } from './import-kind.js';

const text = (max: number) => ({ type: 'text', max }) as const;
const partCode = { type: 'code', pattern: codePattern.part, sentence: codeSentence('part') } as const;
const position = { type: 'whole', least: 1, most: billLimit.position } as const;
const limit = { type: 'number', decimals: 9 } as const;

const owner = (sentence: string, examples: readonly string[]): ImportColumn => ({
  key: 'owner',
  title: 'Made part',
  aliases: ['parent', 'assembly', 'bill of', 'part made', 'goes into'],
  required: true,
  cell: partCode,
  sentence,
  examples,
});

export const billColumns: readonly ImportColumn[] = [
  owner('The code of the part that is made. Bills of many parts, over all levels, may stand in one table.', [
    'TOOL-60',
    'TOOL-60',
    'BOARD-60',
  ]),
  {
    key: 'part',
    title: 'Component',
    aliases: ['part', 'part code', 'item', 'child'],
    required: true,
    cell: partCode,
    sentence: 'The code of what goes into it.',
    examples: ['BOARD-60', 'SCREW-M2', 'R-10K-06'],
  },
  {
    key: 'quantityPer',
    title: 'Quantity for one',
    aliases: ['quantity', 'quantity per', 'qty', 'qty per', 'how many'],
    required: true,
    cell: { type: 'number', decimals: quantityDigits.fraction, above: 0 },
    sentence: 'How much of it goes into one, in its stock unit.',
    examples: ['1', '4', '2'],
  },
  {
    key: 'scrapPercent',
    title: 'Scrap %',
    aliases: ['scrap', 'scrap percent', 'loss', 'loss %'],
    cell: { type: 'number', decimals: billLimit.scrapDecimals, least: 0 },
    sentence: 'What is normally lost of what is taken, in percent.',
    examples: ['', '2', '2'],
  },
  {
    key: 'position',
    title: 'Position',
    aliases: ['pos', 'line', 'no'],
    cell: position,
    sentence: 'Where the line stands. Lines without one are numbered in steps of ten.',
    examples: ['10', '20', '10'],
  },
  {
    key: 'marks',
    title: 'Marks',
    aliases: ['position marks', 'designators', 'reference', 'references'],
    cell: text(billLimit.marks),
    sentence: 'Position marks, such as R1 R2.',
    examples: ['', '', 'R1 R2'],
  },
  {
    key: 'alternates',
    title: 'May be replaced by',
    aliases: ['alternates', 'alternatives', 'replacements'],
    cell: text(billLimit.alternates * 34),
    sentence: 'Codes of approved alternates, the preferred one first, with spaces between them.',
    examples: ['', 'SCREW-M2-B', ''],
  },
  {
    key: 'note',
    title: 'Note',
    aliases: ['remark', 'comment'],
    cell: text(textLimit.line),
    sentence: 'Anything to know about the line.',
    examples: ['', '', ''],
  },
];

export const stepColumns: readonly ImportColumn[] = [
  owner('The code of the part that is made.', ['TOOL-60', 'TOOL-60', 'TOOL-60']),
  {
    key: 'order',
    title: 'Step',
    aliases: ['order', 'position', 'number', 'no'],
    cell: position,
    sentence: 'Its place in the order; without one the rows count as they stand.',
    examples: ['1', '2', '3'],
  },
  {
    key: 'title',
    title: 'What to do',
    aliases: ['title', 'name', 'operation'],
    required: true,
    cell: text(billLimit.title),
    sentence: 'The act, in a few words.',
    examples: ['Fit the board', 'Solder the leads', 'Close the shell'],
  },
  {
    key: 'instruction',
    title: 'How',
    aliases: ['instruction', 'instructions', 'text'],
    cell: text(textLimit.note),
    sentence: 'What the hands need to know.',
    examples: ['Press until it clicks.', '', 'Cross-wise, by hand.'],
  },
  {
    key: 'minutes',
    title: 'Minutes',
    aliases: ['time', 'min'],
    cell: { type: 'number', decimals: billLimit.minuteDecimals, least: 0 },
    sentence: 'Work for one.',
    examples: ['2', '6.5', '3'],
  },
  {
    key: 'caution',
    title: 'Caution',
    aliases: ['warning', 'safety'],
    cell: text(billLimit.caution),
    sentence: 'A safety text that is shown at the step.',
    examples: ['', 'Solder with the extraction on.', ''],
  },
];

export const planColumns: readonly ImportColumn[] = [
  owner('The code of the part that is tested.', ['TOOL-60', 'TOOL-60', 'TOOL-60']),
  {
    key: 'order',
    title: 'Test',
    aliases: ['order', 'position', 'number', 'no'],
    cell: position,
    sentence: 'Its place in the order; without one the rows count as they stand.',
    examples: ['1', '2', '3'],
  },
  {
    key: 'name',
    title: 'What is looked at',
    aliases: ['name', 'characteristic', 'test name'],
    required: true,
    cell: text(billLimit.title),
    sentence: 'What is measured or looked at.',
    examples: ['Shell closes', 'Tip, cold', 'Time to 350 °C'],
  },
  {
    key: 'kind',
    title: 'Answered by',
    aliases: ['kind', 'type'],
    required: true,
    cell: {
      type: 'choice',
      choices: { numeric: ['a number', 'number', 'numeric'], yes_no: ['yes or no', 'yes/no', 'yes no', 'pass/fail'] },
    },
    sentence: 'A number, or yes or no.',
    examples: ['yes or no', 'a number', 'a number'],
  },
  {
    key: 'lowerLimit',
    title: 'At least',
    aliases: ['lower limit', 'lower', 'min'],
    cell: limit,
    sentence: 'The lower limit of a number.',
    examples: ['', '0.95', ''],
  },
  {
    key: 'target',
    title: 'Aim',
    aliases: ['target', 'nominal'],
    cell: limit,
    sentence: 'What is aimed at.',
    examples: ['', '1.05', ''],
  },
  {
    key: 'upperLimit',
    title: 'At most',
    aliases: ['upper limit', 'upper', 'max'],
    cell: limit,
    sentence: 'The upper limit of a number.',
    examples: ['', '1.15', '4.5'],
  },
  {
    key: 'unit',
    title: 'Unit',
    cell: text(billLimit.unit),
    sentence: 'The unit of a number.',
    examples: ['', 'mΩ', 's'],
  },
  {
    key: 'digits',
    title: 'Decimals',
    aliases: ['digits', 'places'],
    cell: { type: 'whole', least: 0, most: billLimit.digits },
    sentence: 'With how many decimals a number is given.',
    examples: ['', '2', '1'],
  },
  {
    key: 'condition',
    title: 'Taken at',
    aliases: ['condition', 'conditions'],
    cell: text(billLimit.condition),
    sentence: 'What the reading is taken at.',
    examples: ['by eye', 'four wires, at 25 °C', 'from 25 °C'],
  },
  {
    key: 'caution',
    title: 'Caution',
    aliases: ['warning', 'safety'],
    cell: text(billLimit.caution),
    sentence: 'A safety text that is shown at the reading.',
    examples: ['', '', 'The tip is hot.'],
  },
];
