import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import type { TableRow } from '../bills/bill-table-faults.js';
import { BillTablesService, type TableCheck } from '../bills/bill-tables.service.js';
import { billColumns } from './bill-import-columns.js';
import { importCheck } from './bill-rows.js';
import type { ImportCheck, ImportedBy, ImportKind, RowFault } from './import-kind.js';
import type { ImportRow } from './import-row.js';

type Sections = TableCheck<'lines'>['sections'];

/** Bills of many parts, over all levels, from one table. They become drafts, for somebody to look at and release. */
@Injectable()
export class BillImport implements ImportKind<Sections> {
  readonly key = 'bill';
  readonly title = 'Bills';
  readonly sentence =
    'What parts are made of, over all levels. Each becomes a draft, which you release once you have looked at it.';
  readonly repeatable = true;
  readonly columns = billColumns;

  constructor(private readonly tables: BillTablesService) {}

  async check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<Sections>> {
    const placed = rows.map((row) => row.whole('position') !== null);
    const check = importCheck(await this.tables.checkLines(handle, linesIn(rows), placed), rows, billColumns, 'lines');
    return { ...check, faults: [...check.faults, ...allScrap(rows)] };
  }

  async apply(trx: Transaction<DB>, plan: Sections, by: ImportedBy): Promise<{ documentId: null }> {
    await this.tables.put(trx, by.person, 'lines', plan);
    return { documentId: null };
  }
}

/** Lines without a position follow the last one that has one, in steps of ten. */
function linesIn(rows: readonly ImportRow[]): TableRow<'lines'>[] {
  const last = new Map<string, number>();
  for (const row of rows) {
    const owner = row.required('owner');
    last.set(owner, Math.max(last.get(owner) ?? 0, row.whole('position') ?? 0));
  }
  return rows.map((row) => {
    const owner = row.required('owner');
    const given = row.whole('position');
    const next = Math.floor((last.get(owner) ?? 0) / 10) * 10 + 10;
    if (given === null) last.set(owner, next);
    return {
      owner,
      item: {
        position: given ?? next,
        part: row.required('part'),
        quantityPer: row.required('quantityPer'),
        scrapPercent: row.text('scrapPercent') ?? '0',
        marks: row.text('marks'),
        note: row.text('note'),
        alternates: codesIn(row.text('alternates')),
      },
    };
  });
}

function codesIn(text: string | null): string[] {
  return (text ?? '')
    .toUpperCase()
    .split(/[\s,;|]+/)
    .filter((code) => code !== '');
}

function allScrap(rows: readonly ImportRow[]): RowFault[] {
  return rows
    .filter((row) => Number(row.text('scrapPercent') ?? 0) >= 100)
    .map((row) => ({ line: row.line, column: 'Scrap %', sentence: 'Not everything can be lost: stay below 100.' }));
}
