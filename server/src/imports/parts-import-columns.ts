import { codePattern } from '@emberlot/shared/limits/codes';
import { partLimit } from '@emberlot/shared/limits/parts';
import { textLimit } from '@emberlot/shared/limits/text';
import { codeSentence } from '../platform/validation/codes.js';
import type { ImportColumn } from './import-kind.js';

const text = (max: number) => ({ type: 'text', max }) as const;
const code = (thing: 'part' | 'supplier' | 'bin' | 'lot') =>
  ({ type: 'code', pattern: codePattern[thing], sentence: codeSentence(thing) }) as const;

export const partColumns: readonly ImportColumn[] = [
  {
    key: 'code',
    title: 'Part code',
    aliases: ['code', 'part', 'part number', 'part no'],
    required: true,
    cell: code('part'),
    sentence: 'What is printed on its tag.',
    examples: ['R-10K-06', 'CELL-18-25', 'TOOL-60'],
  },
  {
    key: 'name',
    title: 'Name',
    aliases: ['what it is', 'part name'],
    required: true,
    cell: text(textLimit.name),
    sentence: 'What it is, in a few words.',
    examples: ['Resistor 10 kΩ', 'Cell 18650, 2.5 Ah', 'Soldering iron 60 W'],
  },
  {
    key: 'measure',
    title: 'Stock unit',
    aliases: ['unit', 'measure', 'uom'],
    required: true,
    cell: {
      type: 'choice',
      choices: {
        piece: ['piece', 'pieces', 'pc', 'pcs', 'each', 'ea'],
        pair: ['pair', 'pairs'],
        set: ['set', 'sets'],
        m: ['m', 'metre', 'metres', 'meter', 'meters'],
        mm: ['mm', 'millimetre', 'millimetres'],
        kg: ['kg', 'kilogram', 'kilograms'],
        g: ['g', 'gram', 'grams'],
        l: ['l', 'litre', 'litres', 'liter'],
        ml: ['ml', 'millilitre', 'millilitres'],
      },
    },
    sentence: 'The unit it is kept in: piece, pair, set, m, mm, kg, g, l or ml.',
    examples: ['piece', 'piece', 'piece'],
  },
  {
    key: 'traced',
    title: 'Followed',
    aliases: ['traced', 'tracked', 'how closely followed', 'tracking'],
    required: true,
    cell: {
      type: 'choice',
      choices: {
        count: ['by count', 'count', 'no'],
        delivery: ['by delivery', 'delivery', 'lot', 'lots', 'by lot'],
        single: ['one by one', 'single', 'serial', 'serial number'],
      },
    },
    sentence: 'How closely it is followed: by count, by delivery, or one by one.',
    examples: ['by count', 'by delivery', 'one by one'],
  },
  {
    key: 'serialLetters',
    title: 'Serial letters',
    aliases: ['letters', 'serial prefix'],
    cell: { type: 'code', pattern: /^[A-Z]{2,3}$/, sentence: 'Give two or three letters.' },
    sentence: 'For a part followed one by one: the letters that begin its serial numbers.',
    examples: ['', '', 'TL'],
  },
  {
    key: 'description',
    title: 'Description',
    aliases: ['notes', 'note'],
    cell: text(textLimit.note),
    sentence: 'Anything worth knowing about it.',
    examples: ['', '', ''],
  },
  {
    key: 'reorderPoint',
    title: 'Reorder point',
    aliases: ['reorder at', 'minimum stock', 'min stock'],
    cell: { type: 'number', decimals: 6, least: 0 },
    sentence: 'Order when less than this is free, in the stock unit.',
    examples: ['200', '60', ''],
  },
  {
    key: 'unitWeightG',
    title: 'Weight of one (g)',
    aliases: ['unit weight g', 'weight g', 'weight'],
    cell: { type: 'number', decimals: 6, least: 0 },
    sentence: 'Weight of one stock unit, in grams.',
    examples: ['0.03', '45.5', '240'],
  },
  {
    key: 'shelfLifeDays',
    title: 'Keeps for (days)',
    aliases: ['shelf life days', 'shelf life'],
    cell: { type: 'whole', least: 1, most: 36_500 },
    sentence: 'How long it may be used after it came, in days.',
    examples: ['', '1095', ''],
  },
  {
    key: 'originCountryCode',
    title: 'Country of origin',
    aliases: ['origin', 'origin country'],
    cell: { type: 'code', pattern: /^[A-Z]{2}$/, sentence: 'Give two letters, such as IE.' },
    sentence: 'The country it was made in, by its two letters.',
    examples: ['', 'JP', 'IE'],
  },
  {
    key: 'commodityCode',
    title: 'Commodity code',
    aliases: ['customs code', 'tariff code'],
    cell: { type: 'code', pattern: /^\d{4,10}$/, sentence: 'Give 4 to 10 digits.' },
    sentence: 'The customs code, 4 to 10 digits.',
    examples: ['', '85076000', '85151100'],
  },
  {
    key: 'supplier',
    title: 'Supplier',
    aliases: ['supplier code', 'vendor'],
    cell: code('supplier'),
    sentence: 'The code of who it is bought from. One that is not there yet is added.',
    examples: ['PARTS-CO', 'CELLS-CO', ''],
  },
  {
    key: 'supplierPartCode',
    title: 'Supplier’s part code',
    aliases: ['suppliers part code', 'supplier part code', 'supplier part number', 'order number'],
    cell: text(textLimit.code),
    sentence: 'What the supplier calls it.',
    examples: ['10K0603', '', ''],
  },
  {
    key: 'leadTimeDays',
    title: 'Lead time (days)',
    aliases: ['lead time', 'lead time days'],
    cell: { type: 'whole', least: 0, most: 730 },
    sentence: 'Days from order to delivery.',
    examples: ['7', '21', ''],
  },
  {
    key: 'batteryKind',
    title: 'Cell or battery',
    aliases: ['battery kind', 'battery'],
    cell: { type: 'choice', choices: { cell: ['cell'], battery: ['battery', 'pack'] } },
    sentence: 'For lithium cells and batteries: which of the two it is. Transport papers need it.',
    examples: ['', 'cell', ''],
  },
  {
    key: 'chemistry',
    title: 'Chemistry',
    aliases: ['battery chemistry'],
    cell: {
      type: 'choice',
      choices: {
        lithium_ion: ['lithium-ion', 'lithium ion', 'li-ion', 'liion', 'lithium polymer'],
        lithium_metal: ['lithium metal', 'lithium-metal', 'primary lithium'],
      },
    },
    sentence: 'lithium-ion or lithium metal.',
    examples: ['', 'lithium-ion', ''],
  },
  {
    key: 'wattHours',
    title: 'Watt-hours',
    aliases: ['wh', 'energy wh'],
    cell: { type: 'number', decimals: 3, above: 0 },
    sentence: 'Of a lithium-ion cell or battery.',
    examples: ['', '9.25', ''],
  },
  {
    key: 'lithiumGrams',
    title: 'Lithium (g)',
    aliases: ['lithium grams', 'lithium content g'],
    cell: { type: 'number', decimals: 3, above: 0 },
    sentence: 'Of a lithium metal cell or battery.',
    examples: ['', '', ''],
  },
  {
    key: 'cellCount',
    title: 'Cells in it',
    aliases: ['cell count', 'cells'],
    cell: { type: 'whole', least: 1, most: 1_000 },
    sentence: 'How many cells a battery is made of.',
    examples: ['', '', ''],
  },
  {
    key: 'transportTestReference',
    title: 'Transport test summary',
    aliases: ['transport test', 'un 38.3 reference', 'test summary'],
    cell: text(textLimit.line),
    sentence: 'The reference of the test summary of this very design.',
    examples: ['', 'TS-2026-014', ''],
  },
  {
    key: 'transportTestPassedOn',
    title: 'Transport test passed on',
    aliases: ['test passed on'],
    cell: { type: 'day' },
    sentence: 'The day it passed, such as 2026-05-31.',
    examples: ['', '2026-05-31', ''],
  },
];

/** One more column per parameter: `Parameter: Resistance [kΩ]` is a number in kilohms, without a unit anything. */
export function parameterColumn(header: string): ImportColumn | undefined {
  const parts = /^parameter\s*[: ]\s*([^[\]()]+?)\s*(?:[[(]([^[\]()]+)[\])])?$/iu.exec(header.trim());
  const name = parts?.[1]?.trim();
  const unit = parts?.[2]?.trim();
  if (!name || name.length > partLimit.parameterName) return undefined;
  if (unit !== undefined && unit.length > partLimit.parameterUnit) return undefined;
  return {
    key: `${parameterKey}${name}${unit === undefined ? '' : ` [${unit}]`}`,
    title: header.trim(),
    cell: unit === undefined ? text(partLimit.parameterValue) : { type: 'number', decimals: 12 },
    sentence: `The parameter ${name}.`,
    examples: [],
  };
}

/** What the keys of parameters begin with. */
export const parameterKey = 'parameter:';

/** The unit that a parameter's header names. */
export function unitIn(title: string): string | null {
  return /[[(]([^[\]()]+)[\])]$/u.exec(title)?.[1]?.trim() ?? null;
}
