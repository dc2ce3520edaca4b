import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type RawBuilder } from 'kysely';
import { containing } from '../platform/paging/page.js';
import type { FoundKind } from './find.dto.js';

export interface FoundRow {
  readonly kind: FoundKind;
  readonly code: string;
  readonly story: string;
  /** 0 the very code, 1 begins with it, 2 holds it, 3 is spelled much like it. */
  readonly rank: number;
}

export interface Asked {
  /** As it was typed or scanned. */
  readonly text: string;
  /** The token in the address that a unit's label leads to, if that was scanned. */
  readonly unitToken: string | null;
  readonly limit: number;
}

/** A search of one kind: its code, what is searched besides, and how it is told in a line. */
interface Source {
  readonly from: RawBuilder<unknown>;
  readonly code: RawBuilder<string>;
  /** Code and further words, as the trigram index of the table has them. */
  readonly words: RawBuilder<string>;
  readonly story: RawBuilder<string>;
  /** Another code by which it is known exactly, such as the supplier's. */
  readonly alias?: RawBuilder<string | null>;
}

const sources: Readonly<Record<FoundKind, Source>> = {
  part: { from: sql`part t`, code: sql`t.code`, words: sql`t.code || ' ' || t.name`, story: sql`t.name` },
  lot: {
    from: sql`lot t join part p on p.id = t.part_id`,
    code: sql`t.code`,
    words: sql`t.code || ' ' || coalesce(t.supplier_lot_code, '')`,
    story: sql`p.code || ', ' || p.name || ', ' || t.status`,
    alias: sql`t.supplier_lot_code`,
  },
  unit: {
    from: sql`unit t join part p on p.id = t.part_id`,
    code: sql`t.serial`,
    words: sql`t.serial`,
    story: sql`p.name`,
  },
  batch: {
    from: sql`batch t join part p on p.id = t.part_id`,
    code: sql`t.number`,
    words: sql`t.number`,
    story: sql`t.quantity || ' of ' || p.name || ', ' || replace(t.status, '_', ' ')`,
  },
  order: {
    from: sql`sales_order t`,
    code: sql`t.number`,
    words: sql`t.number || ' ' || t.recipient || ' ' || t.email`,
    story: sql`t.recipient`,
  },
  invoice: {
    from: sql`invoice t`,
    code: sql`t.number`,
    words: sql`t.number || ' ' || t.reference || ' ' || (t.buyer ->> 'name')`,
    story: sql`t.buyer ->> 'name'`,
  },
  bin: { from: sql`bin t`, code: sql`t.code`, words: sql`t.code || ' ' || t.name`, story: sql`t.name` },
  supplier: { from: sql`supplier t`, code: sql`t.code`, words: sql`t.code || ' ' || t.name`, story: sql`t.name` },
  document: {
    from: sql`receipt r join document t on t.id = r.document_id join supplier s on s.id = r.supplier_id`,
    code: sql`t.number`,
    words: sql`t.number || ' ' || coalesce(r.delivery_note, '')`,
    story: sql`'Delivery from ' || s.name`,
    alias: sql`r.delivery_note`,
  },
  person: {
    from: sql`customer t`,
    code: sql`t.name`,
    words: sql`t.name || ' ' || t.email`,
    story: sql`t.email`,
  },
};

@Injectable()
export class FindRepository {
  /** The best of each kind, the best of all first. */
  async find(handle: Kysely<DB>, kinds: readonly FoundKind[], asked: Asked): Promise<FoundRow[]> {
    if (kinds.length === 0) return [];
    const searches = kinds.map((kind) => searchOf(kind, asked));
    const { rows } = await sql<FoundRow>`
      select kind, code, story, rank from (${sql.join(searches, sql` union all `)}) found
      order by rank, length(code), code, kind
      limit ${asked.limit}`.execute(handle);
    return rows;
  }

  async unitByToken(handle: Kysely<DB>, token: string): Promise<FoundRow | undefined> {
    const { from, story } = sources.unit;
    const { rows } = await sql<FoundRow>`
      select 'unit' as kind, t.serial as code, ${story} as story, 0 as rank
      from ${from} where t.page_token = ${token}`.execute(handle);
    return rows[0];
  }
}

function searchOf(kind: FoundKind, { text, limit }: Asked): RawBuilder<unknown> {
  const { from, code, words, story, alias } = sources[kind];
  const anywhere = containing(text);
  const start = anywhere.slice(1);
  // Only words can be misspelled recognizably; a code with one other sign is another code.
  const alike = /^[\p{L} ]{4,}$/u.test(text) ? sql`or (${words}) %> ${text}` : sql``;
  const exact = alias
    ? sql`(lower(${code}) = lower(${text}) or lower(${alias}) = lower(${text}))`
    : sql`lower(${code}) = lower(${text})`;
  return sql`(
    select ${kind}::text as kind, ${code} as code, ${story} as story,
      case when ${exact} then 0 when ${code} ilike ${start} then 1 when ${words} ilike ${anywhere} then 2 else 3 end as rank
    from ${from}
    where (${words}) ilike ${anywhere} ${alike}
    order by rank, length(${code}), ${code}
    limit ${limit}
  )`;
}
