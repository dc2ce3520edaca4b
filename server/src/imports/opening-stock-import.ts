import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimal } from '@emberlot/shared/measure/decimal';
import { currencyCode, type CurrencyCode } from '@emberlot/shared/money/currency';
import { lineAmount } from '@emberlot/shared/money/line-amount';
import type { Kysely, Transaction } from 'kysely';
import { Clock } from '../platform/clock/clock.js';
import { ShopService } from '../settings/shop.service.js';
import { OpeningStockService, type OpeningLot } from '../stock/opening-stock.service.js';
import { SupplierRegister } from '../suppliers/supplier-register.service.js';
import { counted, listed } from './counted.js';
import type { ImportCheck, ImportedBy, ImportKind } from './import-kind.js';
import type { ImportRow } from './import-row.js';
import { openingStockColumns } from './opening-stock-columns.js';
import { openingFaults, type ShelfSeen } from './opening-stock-faults.js';

export interface OpeningPlan {
  readonly rows: readonly ImportRow[];
  readonly newBins: readonly string[];
  readonly newSuppliers: readonly string[];
}

/** What lies on the shelf when the books begin, from a table. It is taken in once: a second time it would be twice there. */
@Injectable()
export class OpeningStockImport implements ImportKind<OpeningPlan> {
  readonly key = 'opening_stock';
  readonly title = 'Opening stock';
  readonly sentence =
    'What lies in which bin when the books begin, with its lots and what it cost. Posted against opening balances.';
  readonly repeatable = false;
  readonly columns = openingStockColumns;

  constructor(
    private readonly clock: Clock,
    private readonly shop: ShopService,
    private readonly opening: OpeningStockService,
    private readonly suppliers: SupplierRegister,
  ) {}

  async check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<OpeningPlan>> {
    const seen = await this.look(handle, rows);
    const faults = openingFaults(rows, seen, this.clock.today());
    const newBins = distinct(rows, 'bin').filter((code) => !seen.bins.has(code));
    const named = distinct(rows, 'supplier');
    const known = await this.suppliers.ids(handle, named);
    const newSuppliers = named.filter((code) => !known.has(code));
    const notes = [
      `${counted(rows.length, 'line')} of opening stock will be put on the shelf.`,
      ...(newBins.length > 0 ? [`${counted(newBins.length, 'bin')} will be added: ${listed(newBins)}.`] : []),
      ...(newSuppliers.length > 0
        ? [`${counted(newSuppliers.length, 'supplier')} will be added by code: ${listed(newSuppliers)}.`]
        : []),
    ];
    return { faults, notes, additions: rows.length, plan: { rows, newBins, newSuppliers } };
  }

  async apply(trx: Transaction<DB>, plan: OpeningPlan, by: ImportedBy): Promise<{ documentId: number }> {
    const { currency } = await this.shop.get(trx);
    await this.opening.addBins(trx, plan.newBins);
    await this.suppliers.add(trx, plan.newSuppliers, currency);
    const seen = await this.look(trx, plan.rows);
    const supplierIds = await this.suppliers.ids(trx, distinct(plan.rows, 'supplier'));
    const lots = new Map<string, OpeningLot>();
    const lines = plan.rows.map((row) => {
      const part = seen.parts.get(row.required('part'));
      const bin = seen.bins.get(row.required('bin'));
      if (!part || !bin) throw new Error('a part or bin went away between check and apply');
      const lot = part.traced === 'count' ? null : lotOf(row, part.id, supplierIds, lots);
      const quantity = decimal(row.required('quantity'));
      return { partId: part.id, binId: bin.id, quantity, value: valueOf(row, currencyCode(currency)), lot };
    });
    const document = await this.opening.take(trx, lines, { personId: by.person.id, note: by.fileName });
    return { documentId: document.id };
  }

  private async look(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ShelfSeen> {
    const parts = await this.opening.parts(handle, distinct(rows, 'part'));
    const bins = await this.opening.bins(handle, distinct(rows, 'bin'));
    const lots = await this.opening.lots(handle, distinct(rows, 'lot'));
    const counted = await this.opening.counted(
      handle,
      parts.filter(({ traced }) => traced === 'count').map(({ id }) => id),
    );
    return {
      parts: new Map(parts.map((part) => [part.code, part])),
      bins: new Map(bins.map((bin) => [bin.code, bin])),
      lots: new Set(lots.map((lot) => lot.code)),
      counted: new Set(counted.map(({ partId, bin }) => `${partId}/${bin}`)),
    };
  }
}

function distinct(rows: readonly ImportRow[], key: string): string[] {
  return [...new Set(rows.flatMap((row) => row.text(key) ?? []))];
}

function valueOf(row: ImportRow, currency: CurrencyCode) {
  return lineAmount({ quantity: row.required('quantity'), price: row.required('unitCost') }, currency);
}

/** Lines that name the same lot are one lot in several bins; a line that names none is a lot of its own. */
function lotOf(
  row: ImportRow,
  partId: number,
  supplierIds: ReadonlyMap<string, number>,
  lots: Map<string, OpeningLot>,
): OpeningLot {
  const code = row.text('lot');
  const known = code === null ? undefined : lots.get(code);
  if (known) return known;
  const supplier = row.text('supplier');
  const lot: OpeningLot = {
    partId,
    code,
    status: row.text('status') === 'held' ? 'held' : 'released',
    supplierId: supplier === null ? null : (supplierIds.get(supplier) ?? null),
    supplierLotCode: row.text('supplierLot'),
    receivedOn: row.text('receivedOn'),
    expiresOn: row.text('expiresOn'),
    unitCost: decimal(row.required('unitCost')),
  };
  if (code !== null) lots.set(code, lot);
  return lot;
}
