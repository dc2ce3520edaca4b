import { codePattern } from '@emberlot/shared/limits/codes';
import { textLimit } from '@emberlot/shared/limits/text';
import { codeSentence } from '../platform/validation/codes.js';
import type { ImportColumn } from './import-kind.js';

const code = (thing: 'part' | 'supplier' | 'bin' | 'lot') =>
  ({ type: 'code', pattern: codePattern[thing], sentence: codeSentence(thing) }) as const;

export const openingStockColumns: readonly ImportColumn[] = [
  {
    key: 'part',
    title: 'Part code',
    aliases: ['part', 'code', 'part number', 'part no'],
    required: true,
    cell: code('part'),
    sentence: 'The code of a part that is on record.',
    examples: ['R-10K-06', 'CELL-18-25'],
  },
  {
    key: 'bin',
    title: 'Bin',
    aliases: ['bin code', 'location', 'place'],
    required: true,
    cell: code('bin'),
    sentence: 'Where it lies. A bin that is not there yet is added.',
    examples: ['A-12', 'C-03'],
  },
  {
    key: 'quantity',
    title: 'Quantity',
    aliases: ['qty', 'on hand', 'stock', 'amount'],
    required: true,
    cell: { type: 'number', decimals: 6, above: 0 },
    sentence: 'How much lies there, in the part’s stock unit.',
    examples: ['1450', '80'],
  },
  {
    key: 'unitCost',
    title: 'Unit cost',
    aliases: ['cost', 'unit price', 'price', 'cost each'],
    required: true,
    cell: { type: 'number', decimals: 6, least: 0 },
    sentence: 'What one stock unit cost without VAT, in the shop’s currency.',
    examples: ['0.0125', '3.12'],
  },
  {
    key: 'lot',
    title: 'Lot code',
    aliases: ['lot', 'lot number', 'our lot'],
    cell: code('lot'),
    sentence: 'For parts followed by delivery: the lot’s own code. Left empty, it gets the next number.',
    examples: ['', 'L-0001'],
  },
  {
    key: 'supplier',
    title: 'Supplier',
    aliases: ['supplier code', 'vendor'],
    cell: code('supplier'),
    sentence: 'For parts followed by delivery: who delivered it. One that is not there yet is added.',
    examples: ['', 'CELLS-CO'],
  },
  {
    key: 'supplierLot',
    title: 'Supplier’s lot',
    aliases: ['supplier lot', 'suppliers lot code', 'supplier lot code', 'batch code'],
    cell: { type: 'text', max: textLimit.code },
    sentence: 'For parts followed by delivery: what the supplier calls the lot.',
    examples: ['', 'ND2611'],
  },
  {
    key: 'receivedOn',
    title: 'Received on',
    aliases: ['received', 'date received', 'date'],
    cell: { type: 'day' },
    sentence: 'For parts followed by delivery: the day it came, such as 2026-05-31.',
    examples: ['', '2026-05-31'],
  },
  {
    key: 'expiresOn',
    title: 'Expires on',
    aliases: ['expires', 'expiry', 'best before', 'use by'],
    cell: { type: 'day' },
    sentence: 'For parts followed by delivery: the last day it may be used.',
    examples: ['', ''],
  },
  {
    key: 'status',
    title: 'Status',
    aliases: ['lot status'],
    cell: { type: 'choice', choices: { released: ['released', 'ok', 'free'], held: ['held', 'hold', 'quarantine'] } },
    sentence: 'For parts followed by delivery: released or held. Left empty, it is released.',
    examples: ['', 'released'],
  },
];

/** The cells that only a part followed by delivery has. */
export const lotKeys = ['lot', 'supplier', 'supplierLot', 'receivedOn', 'expiresOn', 'status'] as const;
