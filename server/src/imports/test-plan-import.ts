import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import type { CharacteristicKind } from '../bills/bill-revision.js';
import { BillTablesService, type TableCheck } from '../bills/bill-tables.service.js';
import { planColumns } from './bill-import-columns.js';
import { importCheck, inOrder, repeatedOrders } from './bill-rows.js';
import type { ImportCheck, ImportedBy, ImportKind } from './import-kind.js';
import type { ImportRow } from './import-row.js';

type Sections = TableCheck<'testPlan'>['sections'];

/** Test plans of many parts from one table, put into the drafts of their bills. */
@Injectable()
export class TestPlanImport implements ImportKind<Sections> {
  readonly key = 'test_plan';
  readonly title = 'Test plans';
  readonly sentence = 'What every unit is measured against, with its limits. They go into the drafts of the bills.';
  readonly repeatable = true;
  readonly columns = planColumns;

  constructor(private readonly tables: BillTablesService) {}

  async check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<Sections>> {
    const ordered = inOrder(rows);
    const items = ordered.map((row) => ({ owner: row.required('owner'), item: characteristicIn(row) }));
    const check = importCheck(await this.tables.check(handle, 'testPlan', items), ordered, planColumns, 'test plans');
    return { ...check, faults: [...check.faults, ...repeatedOrders(rows, 'Test')] };
  }

  async apply(trx: Transaction<DB>, plan: Sections, by: ImportedBy): Promise<{ documentId: null }> {
    await this.tables.put(trx, by.person, 'testPlan', plan);
    return { documentId: null };
  }
}

function characteristicIn(row: ImportRow) {
  return {
    name: row.required('name'),
    kind: row.required('kind') as CharacteristicKind,
    unit: row.text('unit'),
    lowerLimit: row.text('lowerLimit'),
    target: row.text('target'),
    upperLimit: row.text('upperLimit'),
    digits: row.whole('digits'),
    condition: row.text('condition'),
    caution: row.text('caution'),
  };
}
