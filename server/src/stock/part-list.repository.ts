import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type RawBuilder } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { PartsQuery } from './part-list.dto.js';

export interface ListedPart {
  readonly id: number;
  readonly code: string;
  readonly name: string;
  readonly measure: string;
  readonly traced: string;
  readonly reorderPoint: string | null;
  readonly retiredOn: string | null;
}

/** The instant and day at which stock is looked at. */
export interface ShelfMoment {
  readonly at: Date;
  readonly today: string;
}

/** Most words of a search that are looked at. */
const mostWords = 6;

@Injectable()
export class PartListRepository {
  async findPage(handle: Kysely<DB>, query: PartsQuery, moment: ShelfMoment): Promise<Page<ListedPart>> {
    const found = this.filtered(handle, query, moment);
    const columns = found.select([
      'p.id',
      'p.code',
      'p.name',
      'p.measure',
      'p.traced',
      'p.reorder_point as reorderPoint',
      'p.retired_on as retiredOn',
    ]);
    const inOrder =
      query.q && !query.sort
        ? columns.orderBy(closeness(query.q)).orderBy('p.code')
        : sorted(columns, query.sort, sortColumns(moment), 'code', 'p.id');
    return { items: await paged(inOrder, query).execute(), total: await countOf(found) };
  }

  private filtered(handle: Kysely<DB>, query: PartsQuery, moment: ShelfMoment) {
    let found = handle.selectFrom('part as p').where('p.retired_on', query.retired ? 'is not' : 'is', null);
    if (query.traced) found = found.where('p.traced', '=', query.traced);
    if (query.bin) found = found.where(liesIn(query.bin));
    if (query.supplier) found = found.where(boughtFrom(query.supplier));
    if (query.short) found = found.where(runsShort(moment));
    for (const word of wordsOf(query.q)) found = found.where(speaksOf(word));
    return found;
  }
}

function wordsOf(q: string | undefined): string[] {
  return (q ?? '').split(/\s+/).filter(Boolean).slice(0, mostWords);
}

/** Code, name or a parameter holds the word, or code and name hold a word spelled much like it. */
function speaksOf(word: string): RawBuilder<boolean> {
  const pattern = containing(word);
  const alike = isSpelled(word) ? sql`or (code || ' ' || name) %> ${word}` : sql``;
  return sql<boolean>`p.id in (
    select id from part where (code || ' ' || name) ilike ${pattern} ${alike}
    union all
    select part_id from part_parameter where said ilike ${pattern}
  )`;
}

/** Only words can be misspelled recognizably; a code with one other sign is another code. */
function isSpelled(text: string): boolean {
  return /^[\p{L} ]{4,}$/u.test(text);
}

/** Exact code first, then codes that begin with it, then what is most like it. */
function closeness(q: string): RawBuilder<number> {
  const code = q.trim().toUpperCase();
  return sql<number>`case when p.code = ${code} then -2 when starts_with(p.code, ${code}) then -1
    else 1 - word_similarity(${q}, p.code || ' ' || p.name) end`;
}

function liesIn(bin: string): RawBuilder<boolean> {
  return sql<boolean>`p.id in (
    select b.part_id from stock_balance b join bin on bin.id = b.bin_id
    where bin.code = ${bin} and b.quantity > 0 and b.owner_customer_id is null
  )`;
}

function boughtFrom(supplier: string): RawBuilder<boolean> {
  return sql<boolean>`p.id in (
    select ps.part_id from part_supplier ps join supplier s on s.id = ps.supplier_id where s.code = ${supplier}
  )`;
}

/** Read over all parts at once: few have a reorder point or claims. */
export function runsShort({ at, today }: ShelfMoment): RawBuilder<boolean> {
  return sql<boolean>`p.id in (
    select asked.id
    from (
      select q.id, q.reorder_point, coalesce(claims.claimed, 0) as claimed
      from part q
      left join (
        select part_id, sum(quantity) as claimed from reservation
        where supply = 'shelf' and ended_at is null and (expires_at is null or expires_at > ${at})
        group by part_id
      ) claims on claims.part_id = q.id
      where q.reorder_point is not null or claims.claimed > 0
    ) asked
    left join lateral (
      select coalesce(sum(b.quantity), 0) as usable
      from stock_balance b join lot l on l.id = b.lot_id join bin on bin.id = b.bin_id
      where b.part_id = asked.id and b.owner_customer_id is null and b.quantity > 0 and l.status = 'released'
        and not bin.quarantine and coalesce(l.expires_on >= ${today}, true)
    ) lying on true
    where lying.usable < asked.claimed or lying.usable - asked.claimed < asked.reorder_point
  )`;
}

function sortColumns({ at }: ShelfMoment) {
  const onShelf = sql`(select coalesce(sum(b.quantity), 0) from stock_balance b
    where b.part_id = p.id and b.owner_customer_id is null)`;
  const claimed = sql`(select coalesce(sum(r.quantity), 0) from reservation r
    where r.part_id = p.id and r.supply = 'shelf' and r.ended_at is null and (r.expires_at is null or r.expires_at > ${at}))`;
  const averageCost = sql`(select sum(c.value_minor) / nullif(sum(c.quantity), 0) from cost_pool c where c.part_id = p.id)`;
  const value = sql`(select coalesce(sum(c.value_minor), 0) from cost_pool c where c.part_id = p.id)`;
  return {
    code: 'p.code',
    name: 'p.name',
    reorderPoint: 'p.reorder_point',
    onShelf,
    claimed,
    averageCost,
    value,
  };
}
