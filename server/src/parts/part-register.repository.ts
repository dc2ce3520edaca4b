import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import type { BatteryRow, ParameterRow } from './part-details.repository.js';
import type { PartRow } from './parts.repository.js';

export interface RegisteredPartRow extends PartRow {
  readonly id: number;
  readonly retiredOn: string | null;
  readonly parameters: readonly ParameterRow[];
  readonly suppliers: readonly RegisteredSupplier[];
  readonly battery: BatteryRow | null;
}

export interface RegisteredSupplier {
  readonly code: string;
  readonly supplierPartCode: string | null;
  readonly leadTimeDays: number | null;
}

export interface NewPartSupplierRow {
  readonly part: string;
  readonly supplierId: number;
  readonly supplierPartCode: string | null;
  readonly leadTimeDays: number | null;
}

/** Many parts in one statement each, for imports. */
@Injectable()
export class PartRegisterRepository {
  async byCodes(handle: Kysely<DB>, codes: readonly string[]): Promise<RegisteredPartRow[]> {
    const { rows } = await sql<RegisteredPartRow>`
      select p.id, p.code, p.name, p.description, p.measure, p.traced, p.serial_letters as "serialLetters",
        p.reorder_point::text as "reorderPoint", p.unit_weight_g::text as "unitWeightG",
        p.shelf_life_days as "shelfLifeDays", p.origin_country_code as "originCountryCode",
        p.commodity_code as "commodityCode", p.retired_on as "retiredOn",
        coalesce((
          select jsonb_agg(jsonb_build_object(
            'name', q.name, 'valueNumber', q.value_number::text, 'valueText', q.value_text, 'unit', q.unit))
          from part_parameter q where q.part_id = p.id), '[]') as parameters,
        coalesce((
          select jsonb_agg(jsonb_build_object(
            'code', s.code, 'supplierPartCode', ps.supplier_part_code, 'leadTimeDays', ps.lead_time_days))
          from part_supplier ps join supplier s on s.id = ps.supplier_id where ps.part_id = p.id), '[]') as suppliers,
        (select jsonb_build_object(
            'kind', b.kind, 'chemistry', b.chemistry, 'wattHours', b.watt_hours::text,
            'lithiumGrams', b.lithium_grams::text, 'cellCount', b.cell_count,
            'transportTestReference', b.transport_test_reference, 'transportTestPassedOn', b.transport_test_passed_on)
          from part_battery b where b.part_id = p.id) as battery
      from part p
      where p.code = any(${[...codes]}::text[])`.execute(handle);
    return rows;
  }

  async partsWithLetters(handle: Kysely<DB>, letters: readonly string[]): Promise<ReadonlyMap<string, string>> {
    const rows = await handle
      .selectFrom('part')
      .select(['code', 'serial_letters as letters'])
      .where('serial_letters', '=', sql<string>`any(${[...letters]}::text[])`)
      .execute();
    return new Map(rows.map(({ code, letters: own }) => [own ?? '', code]));
  }

  async countryCodes(handle: Kysely<DB>): Promise<ReadonlySet<string>> {
    const rows = await handle.selectFrom('country').select('code').execute();
    return new Set(rows.map(({ code }) => code));
  }

  async insert(
    trx: Transaction<DB>,
    rows: readonly PartRow[],
    by: { readonly id: number; readonly at: Date },
  ): Promise<ReadonlyMap<string, number>> {
    const { rows: inserted } = await sql<{ id: number; code: string }>`
      insert into part (code, name, description, measure, traced, serial_letters, reorder_point, unit_weight_g,
        shelf_life_days, origin_country_code, commodity_code, created_at, created_by)
      select code, name, description, measure, traced, "serialLetters", "reorderPoint", "unitWeightG",
        "shelfLifeDays", "originCountryCode", "commodityCode", ${by.at}, ${by.id}
      from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as added (
        code text, name text, description text, measure text, traced text, "serialLetters" text,
        "reorderPoint" numeric, "unitWeightG" numeric, "shelfLifeDays" integer, "originCountryCode" text,
        "commodityCode" text
      )
      returning id, code`.execute(trx);
    return new Map(inserted.map(({ id, code }) => [code, id]));
  }

  async insertParameters(trx: Transaction<DB>, rows: readonly (ParameterRow & { part: string })[]): Promise<void> {
    if (rows.length === 0) return;
    await sql`
      insert into part_parameter (part_id, name, value_number, value_text, unit)
      select p.id, a.name, a."valueNumber", a."valueText", a.unit
      from rows from (jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as (
        part text, name text, "valueNumber" numeric, "valueText" text, unit text
      )) with ordinality as a (part, name, "valueNumber", "valueText", unit, place)
      join part p on p.code = a.part
      order by a.place`.execute(trx);
  }

  async insertSuppliers(trx: Transaction<DB>, rows: readonly NewPartSupplierRow[]): Promise<void> {
    if (rows.length === 0) return;
    await sql`
      insert into part_supplier (part_id, supplier_id, supplier_part_code, lead_time_days, preferred)
      select p.id, a."supplierId", a."supplierPartCode", a."leadTimeDays", true
      from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as a (
        part text, "supplierId" bigint, "supplierPartCode" text, "leadTimeDays" integer
      ) join part p on p.code = a.part`.execute(trx);
  }

  async insertBatteries(trx: Transaction<DB>, rows: readonly (BatteryRow & { part: string })[]): Promise<void> {
    if (rows.length === 0) return;
    await sql`
      insert into part_battery (part_id, kind, chemistry, watt_hours, lithium_grams, cell_count,
        transport_test_reference, transport_test_passed_on)
      select p.id, a.kind, a.chemistry, a."wattHours", a."lithiumGrams", a."cellCount", a."transportTestReference",
        a."transportTestPassedOn"
      from jsonb_to_recordset(${JSON.stringify(rows)}::jsonb) as a (
        part text, kind text, chemistry text, "wattHours" numeric, "lithiumGrams" numeric, "cellCount" smallint,
        "transportTestReference" text, "transportTestPassedOn" date
      ) join part p on p.code = a.part`.execute(trx);
  }
}
