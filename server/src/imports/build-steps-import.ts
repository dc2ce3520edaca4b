import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { BillTablesService, type TableCheck } from '../bills/bill-tables.service.js';
import { stepColumns } from './bill-import-columns.js';
import { importCheck, inOrder, repeatedOrders } from './bill-rows.js';
import type { ImportCheck, ImportedBy, ImportKind } from './import-kind.js';
import type { ImportRow } from './import-row.js';

type Sections = TableCheck<'steps'>['sections'];

/** Build steps of many parts from one table, put into the drafts of their bills. */
@Injectable()
export class BuildStepsImport implements ImportKind<Sections> {
  readonly key = 'build_steps';
  readonly title = 'Build steps';
  readonly sentence = 'What is done when building, with minutes and cautions. They go into the drafts of the bills.';
  readonly repeatable = true;
  readonly columns = stepColumns;

  constructor(private readonly tables: BillTablesService) {}

  async check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<Sections>> {
    const ordered = inOrder(rows);
    const items = ordered.map((row) => ({
      owner: row.required('owner'),
      item: {
        title: row.required('title'),
        instruction: row.text('instruction') ?? '',
        minutes: row.text('minutes') ?? '0',
        caution: row.text('caution'),
      },
    }));
    const check = importCheck(await this.tables.check(handle, 'steps', items), ordered, stepColumns, 'steps');
    return { ...check, faults: [...check.faults, ...repeatedOrders(rows, 'Step')] };
  }

  async apply(trx: Transaction<DB>, plan: Sections, by: ImportedBy): Promise<{ documentId: null }> {
    await this.tables.put(trx, by.person, 'steps', plan);
    return { documentId: null };
  }
}
