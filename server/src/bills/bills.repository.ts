import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { decimalText } from '@emberlot/shared/measure/decimal';
import { sql, type Kysely } from 'kysely';
import type {
  BillPart,
  BillRevision,
  CharacteristicKind,
  RevisionCharacteristic,
  RevisionLine,
  RevisionStatus,
  RevisionStep,
} from './bill-revision.js';
import { without } from './without.js';

const partColumns = (alias: string) =>
  [
    sql<number>`${sql.ref(`${alias}.id`)}`.as('partId'),
    sql<string>`${sql.ref(`${alias}.code`)}`.as('partCode'),
    sql<string>`${sql.ref(`${alias}.name`)}`.as('partName'),
    sql<string>`${sql.ref(`${alias}.measure`)}`.as('partMeasure'),
    sql<string>`${sql.ref(`${alias}.traced`)}`.as('partTraced'),
    sql<boolean>`${sql.ref(`${alias}.retired_on`)} is not null`.as('partRetired'),
  ] as const;

interface PartColumns {
  readonly partId: number;
  readonly partCode: string;
  readonly partName: string;
  readonly partMeasure: string;
  readonly partTraced: string;
  readonly partRetired: boolean;
}

/** Reads revisions whole. */
@Injectable()
export class BillsRepository {
  /** @returns the parts of these codes; those that do not exist are left out */
  async partsByCode(handle: Kysely<DB>, codes: readonly string[]): Promise<ReadonlyMap<string, BillPart>> {
    if (codes.length === 0) return new Map();
    const rows = await handle
      .selectFrom('part')
      .select(partColumns('part'))
      .where(sql<boolean>`part.code = any(${sql.val([...new Set(codes)])}::text[])`)
      .execute();
    return new Map(rows.map((row) => [row.partCode, partFrom(row)]));
  }

  async findRevisionId(handle: Kysely<DB>, partId: number, number: number): Promise<number | undefined> {
    const row = await handle
      .selectFrom('bill_revision')
      .select('id')
      .where('part_id', '=', partId)
      .where('number', '=', number)
      .executeTakeFirst();
    return row?.id;
  }

  /** Drafts and released revisions of the parts. */
  async idsInHand(handle: Kysely<DB>, partIds: readonly number[]): Promise<number[]> {
    const rows = await handle
      .selectFrom('bill_revision')
      .select('id')
      .where(sql<boolean>`part_id = any(${sql.val([...partIds])}::bigint[])`)
      .where('status', '<>', 'superseded')
      .execute();
    return rows.map(({ id }) => id);
  }

  async releasedIds(handle: Kysely<DB>, partIds: readonly number[]): Promise<number[]> {
    if (partIds.length === 0) return [];
    const rows = await handle
      .selectFrom('bill_revision')
      .select('id')
      .where('part_id', 'in', [...new Set(partIds)])
      .where('status', '=', 'released')
      .orderBy('part_id')
      .execute();
    return rows.map(({ id }) => id);
  }

  /** Ids of the released revisions of everything that these revisions reach, by lines and alternates, at any depth. */
  async releasedIdsBelow(handle: Kysely<DB>, revisionIds: readonly number[]): Promise<number[]> {
    if (revisionIds.length === 0) return [];
    const { rows } = await sql<{ id: number }>`
      with recursive below (revision_id) as (
        select unnest(${sql.val([...revisionIds])}::bigint[])
        union
        select r.id
        from below
        join bill_line l on l.revision_id = below.revision_id
        cross join lateral (
          select l.part_id union all select a.part_id from bill_line_alternate a where a.line_id = l.id
        ) component
        join bill_revision r on r.part_id = component.part_id and r.status = 'released'
      )
      select revision_id as id from below order by revision_id
    `.execute(handle);
    return rows.map(({ id }) => id);
  }

  /** @returns in the order of their ids */
  async read(handle: Kysely<DB>, ids: readonly number[]): Promise<BillRevision[]> {
    if (ids.length === 0) return [];
    const wanted = [...new Set(ids)];
    const heads = await handle
      .selectFrom('bill_revision as r')
      .innerJoin('part', 'part.id', 'r.part_id')
      .leftJoin('app_user as maker', 'maker.id', 'r.created_by')
      .leftJoin('app_user as releaser', 'releaser.id', 'r.released_by')
      .select(partColumns('part'))
      .select([
        'r.id',
        'r.number',
        'r.status',
        'r.version',
        'r.note',
        'r.created_at as createdAt',
        'maker.name as createdBy',
        'r.released_at as releasedAt',
        'releaser.name as releasedBy',
        'r.superseded_at as supersededAt',
      ])
      .where('r.id', 'in', wanted)
      .orderBy('r.id')
      .execute();
    const lines = await this.#lines(handle, wanted);
    const steps = await this.#steps(handle, wanted);
    const plans = await this.#plans(handle, wanted);
    return heads.map((row) => ({
      id: row.id,
      part: partFrom(row),
      number: row.number,
      status: row.status as RevisionStatus,
      version: row.version,
      note: row.note,
      createdAt: row.createdAt,
      createdBy: row.createdBy,
      releasedAt: row.releasedAt,
      releasedBy: row.releasedBy,
      supersededAt: row.supersededAt,
      lines: lines.get(row.id) ?? [],
      steps: steps.get(row.id) ?? [],
      testPlan: plans.get(row.id) ?? [],
    }));
  }

  async #lines(handle: Kysely<DB>, revisionIds: readonly number[]): Promise<Map<number, RevisionLine[]>> {
    const rows = await handle
      .selectFrom('bill_line as l')
      .innerJoin('part', 'part.id', 'l.part_id')
      .select(partColumns('part'))
      .select(['l.id', 'l.revision_id as revisionId', 'l.position', 'l.quantity_per', 'l.scrap_percent'])
      .select(['l.marks', 'l.note'])
      .where('l.revision_id', 'in', revisionIds)
      .orderBy('l.revision_id')
      .orderBy('l.position')
      .execute();
    const alternates = await handle
      .selectFrom('bill_line_alternate as a')
      .innerJoin('bill_line as l', 'l.id', 'a.line_id')
      .innerJoin('part', 'part.id', 'a.part_id')
      .select(partColumns('part'))
      .select('a.line_id as lineId')
      .where('l.revision_id', 'in', revisionIds)
      .orderBy('a.line_id')
      .orderBy('a.priority')
      .execute();
    const byLine = grouped(alternates, 'lineId', partFrom);
    return grouped(rows, 'revisionId', (row) => ({
      id: row.id,
      position: row.position,
      part: partFrom(row),
      quantityPer: decimalText(row.quantity_per),
      scrapPercent: decimalText(row.scrap_percent),
      marks: row.marks,
      note: row.note,
      alternates: byLine.get(row.id) ?? [],
    }));
  }

  async #steps(handle: Kysely<DB>, revisionIds: readonly number[]): Promise<Map<number, RevisionStep[]>> {
    const rows = await handle
      .selectFrom('build_step')
      .select(['id', 'revision_id as revisionId', 'position', 'title', 'instruction', 'minutes', 'caution'])
      .where('revision_id', 'in', revisionIds)
      .orderBy('revision_id')
      .orderBy('position')
      .execute();
    return grouped(rows, 'revisionId', (row) => ({ ...without(row, 'revisionId'), minutes: decimalText(row.minutes) }));
  }

  async #plans(handle: Kysely<DB>, revisionIds: readonly number[]): Promise<Map<number, RevisionCharacteristic[]>> {
    const rows = await handle
      .selectFrom('characteristic')
      .selectAll()
      .select('revision_id as revisionId')
      .where('revision_id', 'in', revisionIds)
      .orderBy('revision_id')
      .orderBy('position')
      .execute();
    return grouped(rows, 'revisionId', (row) => ({
      id: row.id,
      position: row.position,
      name: row.name,
      kind: row.kind as CharacteristicKind,
      unit: row.unit,
      lowerLimit: plain(row.lower_limit),
      target: plain(row.target),
      upperLimit: plain(row.upper_limit),
      digits: row.digits,
      condition: row.condition,
      caution: row.caution,
    }));
  }
}

function partFrom(row: PartColumns): BillPart {
  return {
    id: row.partId,
    code: row.partCode,
    name: row.partName,
    measure: row.partMeasure,
    traced: row.partTraced,
    retired: row.partRetired,
  };
}

function plain(value: string | null): string | null {
  return value === null ? null : decimalText(value);
}

function grouped<Key extends string, Row extends Readonly<Record<Key, number>>, Item>(
  rows: readonly Row[],
  key: Key,
  toItem: (row: Row) => Item,
): Map<number, Item[]> {
  const groups = new Map<number, Item[]>();
  for (const row of rows) {
    const group = groups.get(row[key]) ?? [];
    group.push(toItem(row));
    groups.set(row[key], group);
  }
  return groups;
}
