import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';
import { PartRegister, type NewPart, type RegisteredPart } from '../parts/part-register.service.js';
import { ShopService } from '../settings/shop.service.js';
import { SupplierRegister } from '../suppliers/supplier-register.service.js';
import { counted, listed } from './counted.js';
import type { ImportCheck, ImportedBy, ImportKind, RowFault } from './import-kind.js';
import type { ImportRow } from './import-row.js';
import { differences, faultsOfPart, partIn } from './part-rows.js';
import { parameterColumn, partColumns } from './parts-import-columns.js';

export interface PartsPlan {
  readonly parts: readonly NewPart[];
  readonly newSuppliers: readonly string[];
}

/** Parts from a table. What is there already is left as it is, and must not stand differently in the file. */
@Injectable()
export class PartsImport implements ImportKind<PartsPlan> {
  readonly key = 'parts';
  readonly title = 'Parts';
  readonly sentence =
    'Parts with their unit, weight, supplier, battery data and parameters. Nothing comes onto the shelf.';
  readonly repeatable = true;
  readonly columns = partColumns;

  constructor(
    private readonly shop: ShopService,
    private readonly parts: PartRegister,
    private readonly suppliers: SupplierRegister,
  ) {}

  openColumn(header: string) {
    return parameterColumn(header);
  }

  async check(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<ImportCheck<PartsPlan>> {
    const known = await this.parts.known(
      handle,
      rows.map((row) => row.required('code')),
    );
    const countries = await this.parts.countryCodes(handle);
    const fresh = rows.filter((row) => !known.has(row.required('code')));
    const faults = [
      ...repeatedCodes(rows),
      ...rows.flatMap((row) => faultsOfPart(row, countries)),
      ...(await this.faultsOfLetters(handle, fresh)),
      ...rows.flatMap((row) => faultsOfKnown(row, known)),
    ];
    const newSuppliers = await this.unknownSuppliers(handle, fresh);
    const parts = fresh.map(partIn);
    const notes = notesOn(parts.length, rows.length - fresh.length, newSuppliers);
    return { faults, notes, additions: parts.length, plan: { parts, newSuppliers } };
  }

  async apply(trx: Transaction<DB>, plan: PartsPlan, by: ImportedBy): Promise<{ documentId: null }> {
    const { currency } = await this.shop.get(trx);
    await this.suppliers.add(trx, plan.newSuppliers, currency);
    const codes = plan.parts.flatMap(({ supplier }) => (supplier ? [supplier.code] : []));
    const supplierIds = await this.suppliers.ids(trx, [...new Set(codes)]);
    await this.parts.add(trx, plan.parts, supplierIds, by.person);
    return { documentId: null };
  }

  private async unknownSuppliers(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<readonly string[]> {
    const named = [...new Set(rows.flatMap((row) => row.text('supplier') ?? []))];
    const known = await this.suppliers.ids(handle, named);
    return named.filter((code) => !known.has(code));
  }

  private async faultsOfLetters(handle: Kysely<DB>, rows: readonly ImportRow[]): Promise<RowFault[]> {
    const lettered = rows.filter((row) => row.text('serialLetters') !== null);
    const taken = await this.parts.withLetters(
      handle,
      lettered.map((row) => row.text('serialLetters') ?? ''),
    );
    const seen = new Map<string, number>();
    return lettered.flatMap((row) => {
      const letters = row.text('serialLetters') ?? '';
      const before = seen.get(letters);
      seen.set(letters, before ?? row.line);
      const owner = taken.get(letters) ?? (before === undefined ? undefined : `line ${before}`);
      if (owner === undefined) return [];
      return [
        { line: row.line, column: 'Serial letters', sentence: `${letters} are the letters of ${owner} already.` },
      ];
    });
  }
}

function repeatedCodes(rows: readonly ImportRow[]): RowFault[] {
  const seen = new Map<string, number>();
  return rows.flatMap((row) => {
    const code = row.required('code');
    const before = seen.get(code);
    if (before === undefined) {
      seen.set(code, row.line);
      return [];
    }
    return [{ line: row.line, column: 'Part code', sentence: `${code} stands in line ${before} already.` }];
  });
}

function faultsOfKnown(row: ImportRow, known: ReadonlyMap<string, RegisteredPart>): RowFault[] {
  const part = known.get(row.required('code'));
  const different = part ? differences(row, part) : [];
  if (!part || different.length === 0) return [];
  const sentence = `${part.code} is on record already, with another ${different.join(', ')}. Change it on its page, or leave the line out.`;
  return [{ line: row.line, column: 'Part code', sentence }];
}

function notesOn(added: number, there: number, suppliers: readonly string[]): string[] {
  const stay = there === 1 ? 'is on record already and stays as it is' : 'are on record already and stay as they are';
  return [
    ...(added > 0 ? [`${counted(added, 'part')} will be added.`] : []),
    ...(there > 0 ? [`${counted(there, 'part')} of the file ${stay}.`] : []),
    ...(suppliers.length > 0
      ? [`${counted(suppliers.length, 'supplier')} will be added by code: ${listed(suppliers)}.`]
      : []),
  ];
}
