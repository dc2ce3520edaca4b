import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { sql, type Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { DocumentsService } from '../journal/documents.service.js';
import type { DocumentKind } from '../journal/document-kinds.js';
import { JournalService } from '../journal/journal.service.js';
import { addBin, addLot, addPart, addShop, type PartRow } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { ReservationsService } from './reservations.service.js';
import { StockLedgerService, valueByComponent } from './stock-ledger.service.js';
import type { NewMove } from './stock-move.js';
import { StockModule } from './stock.module.js';

let app: TestApp;
let bin: PartRow;

beforeAll(async () => {
  app = await startTestApp({ modules: [StockModule] });
  await addShop(app.database.handle);
  bin = await addBin(app.database.handle);
});
afterAll(() => app.close());

/** Moves with the entry that belongs to them, as every use case does it. */
async function post(trx: Transaction<DB>, kind: DocumentKind, event: string, moves: readonly NewMove[]) {
  const document = await app.get(DocumentsService).record(trx, { kind, recordedBy: null });
  const posted = await app.get(StockLedgerService).post(trx, document, moves);
  const amounts = valueByComponent(posted);
  await app.get(JournalService).post(trx, { document, event, narrative: 'spec', amounts });
  return posted;
}

const received = (part: PartRow, lot: PartRow, quantity: string, value: number): NewMove => ({
  direction: 'in',
  partId: part.id,
  lotId: lot.id,
  binId: bin.id,
  quantity: new Decimal(quantity),
  value: minorAmount(value),
  reason: 'receipt',
});
const issued = (part: PartRow, lot: PartRow, quantity: string): NewMove => ({
  direction: 'out',
  partId: part.id,
  lotId: lot.id,
  binId: bin.id,
  quantity: new Decimal(quantity),
  reason: 'issue',
});

const receive = (...moves: NewMove[]) => app.transaction((trx) => post(trx, 'receipt', 'goods_received', moves));
const issue = (...moves: NewMove[]) => app.transaction((trx) => post(trx, 'issue', 'issued_to_batch', moves));

async function balanceOf(lot: PartRow): Promise<string> {
  const row = await app.database.handle
    .selectFrom('stock_balance')
    .select(sql<string>`trim_scale(sum(quantity))::text`.as('quantity'))
    .where('lot_id', '=', lot.id)
    .executeTakeFirstOrThrow();
  return row.quantity;
}

async function shelfAndAccounts(): Promise<{ shelf: number; accounts: number; moves: number }> {
  const { rows } = await sql<{ shelf: number; accounts: number; moves: number }>`
    select (select coalesce(sum(value_minor), 0)::int8 from cost_pool) as shelf,
           (select coalesce(sum(value_minor), 0)::int8 from stock_move) as moves,
           (select coalesce(sum(debit_minor - credit_minor), 0)::int8 from journal_line l
              join account a on a.code = l.account_code and a.is_stock) as accounts`.execute(app.database.handle);
  return rows[0] ?? { shelf: -1, accounts: -2, moves: -3 };
}

async function lotOf(part: PartRow): Promise<PartRow> {
  return addLot(app.database.handle, { partId: part.id });
}

describe('The stock ledger', () => {
  it('values issues at the weighted average, and the last one takes what is left', async () => {
    const part = await addPart(app.database.handle);
    const [first, second] = [await lotOf(part), await lotOf(part)];
    await receive(received(part, first, '2', 100), received(part, second, '1', 100));
    const moves = await issue(issued(part, first, '1'), issued(part, second, '1'), issued(part, first, '1'));
    expect(moves.map(({ value }) => value)).toEqual([-67, -66, -67]);
    expect(await balanceOf(first)).toBe('0');
  });

  it('keeps a unit at its own cost', async () => {
    const part = await addPart(app.database.handle, { traced: 'single' });
    const cheap = await addLot(app.database.handle, { partId: part.id, kind: 'unit' });
    const dear = await addLot(app.database.handle, { partId: part.id, kind: 'unit' });
    await app.transaction((trx) =>
      post(trx, 'opening', 'opening_stock', [received(part, cheap, '1', 5000), received(part, dear, '1', 9000)]),
    );
    const [move] = await issue(issued(part, dear, '1'));
    expect(move).toMatchObject({ value: -9000, component: 'units' });
  });

  it('lets a bin change leave the value where it is', async () => {
    const part = await addPart(app.database.handle);
    const lot = await lotOf(part);
    const other = await addBin(app.database.handle);
    await receive(received(part, lot, '10', 333));
    await app.transaction((trx) =>
      post(trx, 'transfer', 'stock_adjusted', [
        { ...issued(part, lot, '4'), direction: 'within', toBinId: other.id, reason: 'transfer' },
      ]),
    );
    const rows = await app.database.handle
      .selectFrom('stock_balance')
      .select(['bin_id', 'quantity'])
      .where('lot_id', '=', lot.id)
      .orderBy('bin_id')
      .execute();
    expect(rows.map(({ quantity }) => new Decimal(quantity).toNumber())).toEqual([6, 4]);
    const { shelf, accounts } = await shelfAndAccounts();
    expect(shelf).toBe(accounts);
  });

  it('never goes below zero, however many take at once', async () => {
    const part = await addPart(app.database.handle);
    const lot = await lotOf(part);
    await receive(received(part, lot, '7', 700));
    const tries = await Promise.allSettled(Array.from({ length: 20 }, () => issue(issued(part, lot, '1'))));
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(7);
    for (const outcome of tries) {
      if (outcome.status === 'rejected') expect(outcome.reason).toMatchObject({ code: 'not_enough_stock' });
    }
    expect(await balanceOf(lot)).toBe('0');
  });

  it('refuses more from one lot than lies in it, although the part has enough', async () => {
    const part = await addPart(app.database.handle);
    const [first, second] = [await lotOf(part), await lotOf(part)];
    await receive(received(part, first, '2', 200), received(part, second, '5', 500));
    await expect(issue(issued(part, first, '3'))).rejects.toMatchObject({ constraint: 'stock_balance_not_negative' });
    expect(await balanceOf(first)).toBe('2');
  });

  it('keeps shelf, moves and stock accounts equal through any history', async () => {
    const parts = await Promise.all([
      addPart(app.database.handle),
      addPart(app.database.handle, { measure: 'm' }),
      addPart(app.database.handle, { measure: 'g' }),
    ]);
    const lots = await Promise.all(parts.map((part) => lotOf(part)));
    const happening = fc.record({
      which: fc.integer({ min: 0, max: 2 }),
      inward: fc.boolean(),
      millis: fc.integer({ min: 1, max: 9_000 }),
      value: fc.integer({ min: 0, max: 100_000 }),
    });
    await fc.assert(
      fc.asyncProperty(fc.array(happening, { minLength: 1, maxLength: 12 }), async (history) => {
        for (const { which, inward, millis, value } of history) {
          const part = parts[which];
          const lot = lots[which];
          if (!part || !lot) throw new Error('no such part');
          const quantity = new Decimal(millis).div(1000).toFixed();
          const attempt = inward ? receive(received(part, lot, quantity, value)) : issue(issued(part, lot, quantity));
          await attempt.catch((error: unknown) => expect(error).toMatchObject({ code: 'not_enough_stock' }));
        }
        const { shelf, accounts, moves } = await shelfAndAccounts();
        expect(shelf).toBe(accounts);
        expect(moves).toBe(accounts);
      }),
      { numRuns: 12 },
    );
  });

  it('cannot be rewritten by the server’s role', async () => {
    for (const statement of [
      sql`update stock_move set quantity = 0`,
      sql`delete from stock_move`,
      sql`update stock_balance set quantity = 99`,
      sql`insert into cost_pool (part_id, quantity, value_minor) values (1, 1, 1)`,
      sql`update journal_line set debit_minor = 1`,
      sql`delete from journal_entry`,
      sql`truncate document cascade`,
      sql`alter table stock_move disable trigger all`,
    ]) {
      await expect(statement.execute(app.database.handle)).rejects.toMatchObject({ code: '42501' });
    }
  });

  it('does not commit moves without their entry, nor an entry that does not balance', async () => {
    const part = await addPart(app.database.handle);
    const lot = await lotOf(part);
    const silent = app.transaction(async (trx) => {
      const document = await app.get(DocumentsService).record(trx, { kind: 'receipt', recordedBy: null });
      await app.get(StockLedgerService).post(trx, document, [received(part, lot, '1', 100)]);
    });
    await expect(silent).rejects.toMatchObject({ constraint: 'stock_agrees_with_journal' });
    const crooked = app.transaction(async (trx) => {
      const document = await app.get(DocumentsService).record(trx, { kind: 'manual_entry', recordedBy: null });
      const entry = await trx
        .insertInto('journal_entry')
        .values({
          document_id: document.id,
          event: 'spec',
          source_key: `spec:${document.number}`,
          day: '2027-03-01',
          posted_at: document.occurredAt,
          narrative: 'crooked',
        })
        .returning('id')
        .executeTakeFirstOrThrow();
      await trx
        .insertInto('journal_line')
        .values([
          { entry_id: entry.id, account_code: '1260', debit_minor: 100 },
          { entry_id: entry.id, account_code: '3100', credit_minor: 99 },
        ])
        .execute();
    });
    await expect(crooked).rejects.toMatchObject({ constraint: 'journal_entry_balances' });
    expect(
      await app.database.handle.selectFrom('stock_balance').where('lot_id', '=', lot.id).selectAll().execute(),
    ).toEqual([]);
  });

  it('accepts nothing in a closed month', async () => {
    const part = await addPart(app.database.handle);
    const lot = await lotOf(part);
    await app.database.handle
      .insertInto('period')
      .values({ month: '2027-04-01', closed_at: app.clock.now() })
      .execute();
    const before = app.clock.now();
    app.clock.set(new Date('2027-04-10T10:00:00Z'));
    await expect(receive(received(part, lot, '1', 100))).rejects.toMatchObject({ constraint: 'period_closed' });
    app.clock.set(before);
  });
});

describe('Claims', () => {
  async function demandFor(part: PartRow, quantity: number): Promise<number> {
    const [id] = await app.transaction((trx) =>
      app
        .get(ReservationsService)
        .open(trx, [
          { kind: 'order_line', partId: part.id, quantity: new Decimal(quantity), neededOn: null, reference: 'spec' },
        ]),
    );
    if (id === undefined) throw new Error('no demand');
    return id;
  }

  const claim = (part: PartRow, demandId: number, quantity: number, expiresAt: Date | null = null) =>
    app.transaction((trx) =>
      app
        .get(ReservationsService)
        .claim(trx, [
          { demandId, partId: part.id, quantity: new Decimal(quantity), supply: { kind: 'shelf' }, expiresAt },
        ]),
    );

  it('give the last piece to one of many who reach for it', async () => {
    const part = await addPart(app.database.handle);
    const lot = await lotOf(part);
    await receive(received(part, lot, '1', 100));
    const demands = await Promise.all(Array.from({ length: 8 }, () => demandFor(part, 1)));
    const tries = await Promise.allSettled(demands.map((id) => claim(part, id, 1)));
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  it('leave held, expired and quarantined stock alone', async () => {
    const part = await addPart(app.database.handle);
    const held = await addLot(app.database.handle, { partId: part.id, status: 'held' });
    const old = await addLot(app.database.handle, { partId: part.id, expiresOn: '2027-02-28' });
    const away = await lotOf(part);
    const quarantine = await addBin(app.database.handle, { quarantine: true });
    await receive(received(part, held, '5', 500), received(part, old, '5', 500), {
      ...received(part, away, '5', 500),
      binId: quarantine.id,
    });
    const available = await app.get(ReservationsService).available(app.database.handle, [part.id]);
    expect(available.get(part.id)?.onShelf.toNumber()).toBe(15);
    expect(available.get(part.id)?.usable.toNumber()).toBe(0);
    await expect(claim(part, await demandFor(part, 1), 1)).rejects.toMatchObject({ code: 'not_enough_stock' });
  });

  it('end by themselves when their time is over', async () => {
    const part = await addPart(app.database.handle);
    await receive(received(part, await lotOf(part), '1', 100));
    const soon = new Date(app.clock.now().getTime() + 60_000);
    await claim(part, await demandFor(part, 1), 1, soon);
    const second = await demandFor(part, 1);
    await expect(claim(part, second, 1)).rejects.toMatchObject({ code: 'not_enough_stock' });
    app.clock.advance({ minutes: 2 });
    await claim(part, second, 1);
  });

  it('end as the quantity is taken, and close the demand when it is met', async () => {
    const part = await addPart(app.database.handle);
    await receive(received(part, await lotOf(part), '5', 500));
    const id = await demandFor(part, 3);
    await claim(part, id, 3);
    const reservations = app.get(ReservationsService);
    await app.transaction((trx) => reservations.take(trx, id, new Decimal(2)));
    const available = await reservations.available(app.database.handle, [part.id]);
    expect(available.get(part.id)?.claimed.toNumber()).toBe(1);
    await app.transaction((trx) => reservations.take(trx, id, new Decimal(1)));
    const demand = await app.database.handle
      .selectFrom('demand')
      .selectAll()
      .where('id', '=', id)
      .executeTakeFirstOrThrow();
    expect(demand.closed_at).not.toBeNull();
  });
});
