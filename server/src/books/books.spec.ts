import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startPayments } from '@emberlot/fakes/payments';
import { parse } from 'csv-parse/sync';
import { ReturnsModule } from '../returns/returns.module.js';
import { ShippingModule } from '../shipping/shipping.module.js';
import { SellingApp } from '../shipping/testing.js';
import type { Agent } from '../testing/agent.js';
import { addListing } from '../testing/sale.js';
import { TodayModule } from '../today/today.module.js';
import type { TodayDto } from '../today/today.dto.js';
import type { ExportTotalsDto, JournalPageDto, ReceivedPaymentsDto, TrialBalanceDto } from './books.dto.js';
import { BooksModule } from './books.module.js';
import { csvFile } from './csv.js';

let shop: SellingApp;
let accountant: Agent;
let shipped: string;
let waiting: string;

beforeAll(async () => {
  shop = await SellingApp.start(await startPayments({ port: 0 }), [
    ShippingModule,
    ReturnsModule,
    BooksModule,
    TodayModule,
  ]);
  accountant = await shop.app.agentFor('accountant');
  const owner = await shop.app.agentFor('owner');
  const { id: listingId, part } = await addListing(shop.app.database.handle);
  const { lot } = await shop.receive(part, 9, 1_234);
  shipped = await shop.paidOrder([{ listingId, quantity: 2 }], 'one@marsh.example');
  waiting = await shop.paidOrder([{ listingId, quantity: 1 }], 'two@marsh.example');
  const cancelled = await shop.paidOrder([{ listingId, quantity: 3 }], 'three@marsh.example');
  await owner.create('/api/order-cancellations', { order: cancelled, reason: '=2+5' }).expect(201);
  const { body } = await owner.create('/api/parcels', { order: shipped }).expect(201);
  const path = `/api/parcels/${(body as { number: string }).number}`;
  await owner.post(`${path}/scans`, { code: lot.code }).expect(200);
  const version = async () => ((await owner.get(path)).body as { version: number }).version;
  await owner.post(`${path}/packed`, { version: await version() }).expect(200);
  const sent = { carrier: 'Hill Post', trackingCode: null, version: await version() };
  await owner.post(`${path}/dispatch`, sent).expect(200);
  await shop.app.runJobs();
}, 60_000);
afterAll(() => shop.close());

const read = async <Body>(path: string) => (await accountant.get(path).expect(200)).body as Body;
const minor = (major: string | undefined) => Math.round(Number(major) * 100);

describe('The books', () => {
  it('list each entry with its lines, by day, account and document', async () => {
    const all = await read<JournalPageDto>('/api/journal-entries?pageSize=100');
    expect(all.total).toBe(all.items.length);
    for (const { lines } of all.items) {
      const sum = (side: 'debit' | 'credit') => lines.reduce((total, line) => total + (line[side]?.amount ?? 0), 0);
      expect(sum('debit')).toBe(sum('credit'));
    }
    const onCost = await read<JournalPageDto>('/api/journal-entries?account=5000');
    expect(onCost.items.map(({ event }) => event)).toEqual(['dispatched']);
    const ofDocument = await read<JournalPageDto>(`/api/journal-entries?document=${onCost.items[0]?.document}`);
    expect(ofDocument.items.map(({ id }) => id)).toEqual([onCost.items[0]?.id]);
    expect((await read<JournalPageDto>('/api/journal-entries?to=2020-01-01')).total).toBe(0);
  });

  it('balance', async () => {
    const { debit, credit, accounts } = await read<TrialBalanceDto>('/api/trial-balance');
    expect(debit).toEqual(credit);
    expect(accounts.reduce((sum, { balance }) => sum + balance.amount, 0)).toBe(0);
    const prepaid = accounts.find(({ account }) => account === '2300');
    // One order of 100.00 and 10.00 delivery waits.
    expect(prepaid?.balance.amount).toBe(-11_000);
  });

  it('list payments with what the card processor still holds', async () => {
    const { items, clearing } = await read<ReceivedPaymentsDto>('/api/payments');
    expect(items).toHaveLength(3);
    const { accounts } = await read<TrialBalanceDto>('/api/trial-balance');
    expect(clearing).toEqual(accounts.find(({ account }) => account === '1250')?.balance);
    expect(items.filter(({ refundState }) => refundState === 'sent')).toMatchObject([{ refunded: { amount: 38_130 } }]);
  });

  it('are for accountant and owner', async () => {
    for (const path of ['journal-entries', 'trial-balance', 'posting-rules', 'payments', 'periods']) {
      await (await shop.app.visitor()).get(`/api/${path}`).expect(401);
      await (await shop.app.agentFor('assembler')).get(`/api/${path}`).expect(403);
      await (await shop.app.agentFor('customer')).get(`/api/${path}`).expect(403);
      await (await shop.app.agentFor('owner')).get(`/api/${path}`).expect(200);
    }
    await accountant.get('/api/journal-entries?account=12').expect(400);
    await accountant.get('/api/trial-balance?to=soon').expect(400);
  });
});

describe('The export of a period', () => {
  const period = 'from=2020-01-01&to=2099-12-31';

  it('comes to the control totals when its files are added up again', async () => {
    const totals = await read<ExportTotalsDto>(`/api/book-exports/totals?${period}`);
    const rowsOf = async (file: string) => {
      const { text } = await accountant.get(`/api/book-exports/${file}?${period}`).buffer(true).expect(200);
      return parse<Record<string, string>>(text, { bom: true, columns: true });
    };
    const invoices = await rowsOf('invoices.csv');
    const sumOf = (rows: readonly Record<string, string>[], column: string) =>
      rows.reduce((sum, row) => sum + minor(row[column]), 0);
    expect(new Set(invoices.map(({ number }) => number)).size).toBe(totals.invoices + totals.creditNotes);
    expect(totals).toMatchObject({ invoices: 3, creditNotes: 1 });
    expect(sumOf(invoices, 'net')).toBe(totals.net.amount);
    expect(sumOf(invoices, 'vat')).toBe(totals.vat.amount);
    expect(sumOf(invoices, 'gross')).toBe(totals.gross.amount);
    const entries = await rowsOf('entries.csv');
    expect(entries).toHaveLength(totals.lines);
    expect(new Set(entries.map(({ entry }) => entry)).size).toBe(totals.entries);
    expect(sumOf(entries, 'debit')).toBe(totals.debit.amount);
    expect(sumOf(entries, 'credit')).toBe(totals.credit.amount);
    expect(totals.debit).toEqual(totals.credit);
  });

  it('wants a period that runs forwards', async () => {
    await accountant.get('/api/book-exports/totals').expect(400);
    await accountant.get('/api/book-exports/entries.csv?from=2027-02-01&to=2027-01-01').expect(400);
    await (await shop.app.agentFor('assembler')).get(`/api/book-exports/entries.csv?${period}`).expect(403);
  });

  it('makes texts harmless for spreadsheets and leaves numbers alone', () => {
    const dangerous = ['=1+1', '+1', '-1', '@a', '\t=1', '  =1', '\r=1', '\n=1', '＝1', '\u00A0=1'];
    const file = csvFile(
      ['what', 'amount'],
      dangerous.map((text) => [{ text }, { number: '-12.05' }]),
    );
    const rows = parse(file, { bom: true, from_line: 2 });
    expect(rows).toEqual(dangerous.map((text) => [`'${text}`, '-12.05']));
    expect(csvFile(['a'], [[{ text: 'say "hot"' }]])).toBe('\uFEFF"a"\r\n"say ""hot"""\r\n');
  });
});

describe('A month', () => {
  it('takes no entry once it is closed, until it is opened again with a reason', async () => {
    const month = new Date(shop.app.clock.now().getTime() - 40 * 86_400_000).toISOString().slice(0, 7);
    await accountant.post(`/api/periods/${month}/closed`).expect(204);
    await accountant.post(`/api/periods/${month}/closed`).expect(409);
    const post = () =>
      shop.app.database.handle.transaction().execute(async (trx) => {
        const { id } = await trx.selectFrom('document').select('id').orderBy('id').executeTakeFirstOrThrow();
        await trx
          .insertInto('journal_entry')
          .values({
            document_id: id,
            event: 'goods_received',
            source_key: 'late',
            day: `${month}-15`,
            posted_at: shop.app.clock.now(),
            narrative: 'late',
          })
          .execute();
        throw new Error('accepted');
      });
    await expect(post()).rejects.toMatchObject({ constraint: 'period_closed' });
    await accountant.post(`/api/periods/${month}/reopened`, {}).expect(400);
    await accountant.post(`/api/periods/${month}/reopened`, { reason: 'A late invoice.' }).expect(204);
    await expect(post()).rejects.toThrow('accepted');
  });

  it('that is not over, or is none, is not closed; the owner only reads', async () => {
    await accountant.post(`/api/periods/${shop.app.clock.today().slice(0, 7)}/closed`).expect(409);
    await accountant.post('/api/periods/2027-13/closed').expect(404);
    await (await shop.app.agentFor('owner')).post('/api/periods/2026-01/closed').expect(403);
  });
});

describe('Today', () => {
  it('says what waits, with one action each, and shows the assembler no money', async () => {
    const owner = await shop.app.agentFor('owner');
    const today = (await owner.get('/api/today').expect(200)).body as TodayDto;
    expect(today.queue).toMatchObject([
      { key: `order ${waiting}`, sentence: `{order:${waiting}} can be packed.`, action: { label: 'Pack it' } },
    ]);
    expect(today.promises).toEqual({ thisWeek: 1, safe: 1 });
    expect(today.figures[0]?.money?.amount).toBeGreaterThan(0);
    const bench = (await (await shop.app.agentFor('assembler')).get('/api/today').expect(200)).body as TodayDto;
    expect(bench.figures.map(({ money }) => money)).toEqual([null, null, null]);
    expect((await read<TodayDto>('/api/today')).promises).toBeNull();
    await (await shop.app.agentFor('customer')).get('/api/today').expect(403);
    await (await shop.app.visitor()).get('/api/today').expect(401);
  });
});
