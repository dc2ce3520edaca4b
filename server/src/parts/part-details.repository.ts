import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { Kysely, Transaction } from 'kysely';

export interface ParameterRow {
  readonly name: string;
  readonly valueNumber: string | null;
  readonly valueText: string | null;
  readonly unit: string | null;
}

export interface PartSupplierRow {
  readonly supplierId: number;
  readonly supplierPartCode: string | null;
  readonly leadTimeDays: number | null;
  readonly preferred: boolean;
}

export interface NamedPartSupplierRow extends PartSupplierRow {
  readonly supplier: string;
  readonly name: string;
}

export interface BatteryRow {
  readonly kind: 'cell' | 'battery';
  readonly chemistry: 'lithium_ion' | 'lithium_metal';
  readonly wattHours: string | null;
  readonly lithiumGrams: string | null;
  readonly cellCount: number | null;
  readonly transportTestReference: string | null;
  readonly transportTestPassedOn: string | null;
}

/** What hangs from a part: its parameters, suppliers and battery data. */
@Injectable()
export class PartDetailsRepository {
  async parametersOf(handle: Kysely<DB>, partId: number): Promise<ParameterRow[]> {
    return handle
      .selectFrom('part_parameter')
      .select(['name', 'value_number as valueNumber', 'value_text as valueText', 'unit'])
      .where('part_id', '=', partId)
      .orderBy('id')
      .execute();
  }

  async suppliersOf(handle: Kysely<DB>, partId: number): Promise<NamedPartSupplierRow[]> {
    return handle
      .selectFrom('part_supplier as ps')
      .innerJoin('supplier as s', 's.id', 'ps.supplier_id')
      .select([
        'ps.supplier_id as supplierId',
        's.code as supplier',
        's.name',
        'ps.supplier_part_code as supplierPartCode',
        'ps.lead_time_days as leadTimeDays',
        'ps.preferred',
      ])
      .where('ps.part_id', '=', partId)
      .orderBy('ps.preferred', 'desc')
      .orderBy('s.code')
      .execute();
  }

  async batteryOf(handle: Kysely<DB>, partId: number): Promise<BatteryRow | undefined> {
    const row = await handle
      .selectFrom('part_battery')
      .select([
        'kind',
        'chemistry',
        'watt_hours as wattHours',
        'lithium_grams as lithiumGrams',
        'cell_count as cellCount',
        'transport_test_reference as transportTestReference',
        'transport_test_passed_on as transportTestPassedOn',
      ])
      .where('part_id', '=', partId)
      .executeTakeFirst();
    return row as BatteryRow | undefined;
  }

  async supplierIds(handle: Kysely<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, number>> {
    if (codes.length === 0) return new Map();
    const rows = await handle
      .selectFrom('supplier')
      .select(['id', 'code'])
      .where('code', 'in', [...codes])
      .execute();
    return new Map(rows.map(({ code, id }) => [code, id]));
  }

  async replaceParameters(trx: Transaction<DB>, partId: number, rows: readonly ParameterRow[]): Promise<void> {
    await trx.deleteFrom('part_parameter').where('part_id', '=', partId).execute();
    if (rows.length === 0) return;
    await trx
      .insertInto('part_parameter')
      .values(
        rows.map(({ name, valueNumber, valueText, unit }) => ({
          part_id: partId,
          name,
          value_number: valueNumber,
          value_text: valueText,
          unit,
        })),
      )
      .execute();
  }

  async replaceSuppliers(trx: Transaction<DB>, partId: number, rows: readonly PartSupplierRow[]): Promise<void> {
    await trx.deleteFrom('part_supplier').where('part_id', '=', partId).execute();
    if (rows.length === 0) return;
    await trx
      .insertInto('part_supplier')
      .values(
        rows.map(({ supplierId, supplierPartCode, leadTimeDays, preferred }) => ({
          part_id: partId,
          supplier_id: supplierId,
          supplier_part_code: supplierPartCode,
          lead_time_days: leadTimeDays,
          preferred,
        })),
      )
      .execute();
  }

  async replaceBattery(trx: Transaction<DB>, partId: number, row: BatteryRow | null): Promise<void> {
    await trx.deleteFrom('part_battery').where('part_id', '=', partId).execute();
    if (row === null) return;
    await trx
      .insertInto('part_battery')
      .values({
        part_id: partId,
        kind: row.kind,
        chemistry: row.chemistry,
        watt_hours: row.wattHours,
        lithium_grams: row.lithiumGrams,
        cell_count: row.cellCount,
        transport_test_reference: row.transportTestReference,
        transport_test_passed_on: row.transportTestPassedOn,
      })
      .execute();
  }
}
