import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { sql } from 'kysely';
import { explode } from '@emberlot/shared/bill/explode';
import { Decimal } from '@emberlot/shared/measure/decimal';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import type { Agent } from '../testing/agent.js';
import { addPart } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { billsOf } from './bill-arithmetic.js';
import type { BillLineInputDto } from './bill.dto.js';
import { BillsModule } from './bills.module.js';
import { BillsService } from './bills.service.js';
import { DraftBillsService } from './draft-bills.service.js';
import { ReleaseBillService } from './release-bill.service.js';

let app: TestApp;
let owner: Agent;
let person: SignedInUser;

beforeAll(async () => {
  app = await startTestApp({ modules: [BillsModule] });
  owner = await app.agentFor('owner');
  person = await app.userOf(owner);
});
afterAll(() => app.close());

const line = (position: number, part: string, more: Partial<BillLineInputDto> = {}): BillLineInputDto => ({
  position,
  part,
  quantityPer: '1',
  scrapPercent: '0',
  alternates: [],
  ...more,
});

async function addParts(...codes: readonly string[]): Promise<void> {
  for (const code of codes) await addPart(app.database.handle, { code });
}

const make = (code: string, lines: BillLineInputDto[]) =>
  app.transaction((trx) =>
    app.get(DraftBillsService).createWith(trx, person, code, { lines, steps: [], testPlan: [] }),
  );

async function release(code: string, lines: BillLineInputDto[]): Promise<void> {
  const { number, version } = await make(code, lines);
  await app.get(ReleaseBillService).release(person, code, number, version);
}

const edit = (code: string, lines: BillLineInputDto[], version = 1) =>
  owner.put(`/api/bills/${code}/revisions/1`, { version, lines, steps: [], testPlan: [] });

describe('a bill may not contain itself', () => {
  it('directly, as a part or as an alternate', async () => {
    await addParts('SELF', 'SELF-C');
    await make('SELF', []);
    const asPart = await edit('SELF', [line(1, 'SELF-C'), line(2, 'SELF')]).expect(400);
    expect(asPart.body).toMatchObject({
      detail: 'A bill may not contain itself: SELF contains SELF.',
      errors: [{ pointer: '/lines/1/part', code: 'contains_itself' }],
    });
    const asAlternate = await edit('SELF', [line(1, 'SELF-C', { alternates: ['SELF'] })]).expect(400);
    expect(asAlternate.body).toMatchObject({ errors: [{ pointer: '/lines/0/alternates' }] });
  });

  it('at any depth, through released bills, drafts and alternates', async () => {
    const codes = Array.from({ length: 12 }, (_, index) => `DEEP-${index}`);
    await addParts(...codes, 'DEEP-X');
    for (const [index, code] of codes.entries()) {
      const next = codes[index + 1];
      if (next === undefined) await make(code, []);
      else if (index % 3 === 0) await release(code, [line(1, next)]);
      else if (index % 3 === 1) await make(code, [line(1, 'DEEP-X', { alternates: [next] })]);
      else await make(code, [line(1, next)]);
    }
    const { body } = await edit('DEEP-11', [line(1, 'DEEP-X'), line(2, 'DEEP-0')]).expect(400);
    expect(body).toMatchObject({
      detail: `A bill may not contain itself: DEEP-11 contains ${codes.slice(0, 11).join(' contains ')} contains DEEP-11.`,
      errors: [{ pointer: '/lines/1/part' }],
    });
    const shortcut = await edit('DEEP-11', [line(1, 'DEEP-X', { alternates: ['DEEP-5'] })]).expect(400);
    expect(shortcut.body).toMatchObject({ errors: [{ pointer: '/lines/0/alternates' }] });
  });

  it('by two edits at the same moment', async () => {
    await addParts('LEFT', 'RIGHT', 'THIRD');
    await make('LEFT', []);
    await make('RIGHT', []);
    await make('THIRD', [line(1, 'LEFT')]);
    const answers = await Promise.all([edit('LEFT', [line(1, 'RIGHT')]), edit('RIGHT', [line(1, 'THIRD')])]);
    expect(answers.map(({ status }) => String(status)).toSorted()).toEqual(['200', '400']);
  });

  it('by statements past the product, as the server', async () => {
    await addParts('RAW-A', 'RAW-B', 'RAW-C');
    const first = await make('RAW-A', [line(1, 'RAW-B')]);
    const second = await make('RAW-B', [line(1, 'RAW-C')]);
    const [ownLine] = second.lines;
    const insertLine = sql`
      insert into bill_line (revision_id, position, part_id, quantity_per) values (${second.id}, 2, ${first.part.id}, 1)
    `.execute(app.database.handle);
    await expect(insertLine).rejects.toMatchObject({ constraint: 'bill_contains_itself' });
    const insertAlternate = sql`
      insert into bill_line_alternate (line_id, part_id, priority) values (${ownLine?.id}, ${first.part.id}, 1)
    `.execute(app.database.handle);
    await expect(insertAlternate).rejects.toMatchObject({ constraint: 'bill_contains_itself' });
    const turnLine = sql`update bill_line set part_id = ${first.part.id} where id = ${ownLine?.id}`;
    await expect(turnLine.execute(app.database.handle)).rejects.toMatchObject({ constraint: 'bill_contains_itself' });
  });
});

describe('everything below a bill', () => {
  /** How much of each part goes into one, by a recursive query: an independent way to the same sums. */
  async function sumsInSql(revisionId: number): Promise<ReadonlyMap<string, string>> {
    const { rows } = await sql<{ code: string; quantity: string }>`
      with recursive place (part_id, quantity) as (
        select l.part_id, l.quantity_per::numeric from bill_line l where l.revision_id = ${revisionId}
        union all
        select l.part_id, place.quantity * l.quantity_per
        from place
        join bill_revision r on r.part_id = place.part_id and r.status = 'released'
        join bill_line l on l.revision_id = r.id
      )
      select part.code, trim_scale(sum(place.quantity))::text as quantity
      from place join part on part.id = place.part_id group by part.code
    `.execute(app.database.handle);
    return new Map(rows.map(({ code, quantity }) => [code, quantity]));
  }

  it('sums to what a recursive query sums, whatever the bills', async () => {
    const edges = fc.uniqueArray(fc.tuple(fc.nat(6), fc.nat(6), fc.integer({ min: 1, max: 9 })), {
      selector: ([a, b]) => `${Math.min(a, b)} ${Math.max(a, b)}`,
      minLength: 1,
      maxLength: 14,
    });
    let round = 0;
    const property = fc.asyncProperty(edges, async (pairs) => {
      round += 1;
      const codes = Array.from({ length: 7 }, (_, index) => `P${round}-${index}`);
      await addParts(...codes);
      const lines = codes.map((): BillLineInputDto[] => []);
      for (const [a, b, quantity] of pairs.filter(([a, b]) => a !== b)) {
        const own = lines[Math.min(a, b)] ?? [];
        own.push(line(own.length + 1, codes[Math.max(a, b)] ?? '', { quantityPer: String(quantity) }));
      }
      for (const [index, code] of codes.entries()) {
        const own = lines[index] ?? [];
        if (own.length > 0) await release(code, own);
      }
      const handle = app.database.handle;
      const bills = app.get(BillsService);
      for (const code of codes) {
        const revision = await bills.findReleased(handle, (await bills.part(handle, code)).id);
        if (!revision) continue;
        const below = await bills.withAllBelow(handle, revision);
        const sums = explode(billsOf(below.values()), code, new Decimal(1));
        expect(new Map(sums.map(({ part, quantity }) => [part, quantity.toFixed()]))).toEqual(
          await sumsInSql(revision.id),
        );
      }
    });
    await fc.assert(property, { numRuns: 12 });
  }, 60_000);
});
