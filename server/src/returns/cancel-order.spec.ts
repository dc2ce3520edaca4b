import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startPayments } from '@emberlot/fakes/payments';
import { sql } from 'kysely';
import { examine } from '../doctor/examine.js';
import { ShippingModule } from '../shipping/shipping.module.js';
import { SellingApp } from '../shipping/testing.js';
import type { Agent } from '../testing/agent.js';
import { mailsTo } from '../testing/mails.js';
import { addListing } from '../testing/sale.js';
import type { CancellationDto } from './cancellation.dto.js';
import { ReturnsModule } from './returns.module.js';

let shop: SellingApp;
let owner: Agent;

beforeAll(async () => {
  shop = await SellingApp.start(await startPayments({ port: 0 }), [ShippingModule, ReturnsModule]);
  owner = await shop.app.agentFor('owner');
});
afterAll(() => shop.close());

async function spare(quantity: number) {
  const { id, part } = await addListing(shop.app.database.handle);
  return { listingId: id, part, ...(await shop.receive(part, quantity)) };
}

const cancel = (order: string, reason = 'The buyer changed their mind.') =>
  owner.create('/api/order-cancellations', { order, reason });

async function refundOf(order: string) {
  return shop.app.database.handle
    .selectFrom('refund as r')
    .innerJoin('sales_order as o', 'o.id', 'r.order_id')
    .selectAll('r')
    .where('o.number', '=', order)
    .execute();
}

async function balance(account: string): Promise<number> {
  const row = await shop.app.database.handle
    .selectFrom('journal_line')
    .select(sql<number>`coalesce(sum(debit_minor - credit_minor), 0)::int8`.as('balance'))
    .where('account_code', '=', account)
    .executeTakeFirstOrThrow();
  return row.balance;
}

async function liveClaims(partId: number): Promise<number> {
  const rows = await shop.app.database.handle
    .selectFrom('reservation')
    .select('id')
    .where('part_id', '=', partId)
    .where('ended_at', 'is', null)
    .execute();
  return rows.length;
}

async function violations() {
  const findings = await examine(shop.app.database.handle, shop.app.clock.now());
  return findings.flatMap(({ violations: found }) => found);
}

describe('Cancelling a paid order', () => {
  it('credits the invoice, sends the money back once, frees the goods, and tells the buyer', async () => {
    const email = 'cancelled@marsh.example';
    const { listingId, part, lot } = await spare(2);
    const order = await shop.paidOrder([{ listingId, quantity: 2 }], email);
    await shop.app.runJobs();
    const bench = await shop.app.agentFor('assembler');
    const { body: parcel } = await bench.create('/api/parcels', { order }).expect(201);
    const { number } = parcel as { number: string };
    await bench.post(`/api/parcels/${number}/scans`, { code: lot.code }).expect(200);
    const [receivable, prepaid, vat] = [await balance('1200'), await balance('2300'), await balance('2200')];
    const { body } = await cancel(order).expect(201);
    expect((body as CancellationDto).creditNote).toMatch(/^CN-\d{4}-\d{4}$/);
    // 2 × 100.00 and 10.00 delivery at 23 %.
    expect((await balance('2300')) - prepaid).toBe(21_000);
    expect((await balance('2200')) - vat).toBe(4_830);
    expect((await balance('1200')) - receivable).toBe(-25_830);
    await shop.app.runJobs();
    await shop.fake.webhooksSettled();
    expect(await refundOf(order)).toMatchObject([{ status: 'sent', amount_minor: 25_830 }]);
    expect(await balance('1200')).toBe(receivable);
    expect(await liveClaims(part.id)).toBe(0);
    expect((await bench.get(`/api/parcels/${number}`).expect(200)).body).toMatchObject({
      state: 'dissolved',
      items: [],
    });
    const mails = await mailsTo(shop.app.database.handle, email);
    expect(mails.map(({ subject }) => subject)).toContain(`Order ${order} is cancelled`);
    expect(await violations()).toEqual([]);
    const again = await shop.paidOrder([{ listingId, quantity: 2 }]);
    expect(again).not.toBe(order);
    // The papers are drawn in it.
  }, 30_000);

  it('happens once when two press the button at the same moment', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const tries = await Promise.all([cancel(order), cancel(order)]);
    expect(tries.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([201, 409]);
    expect(await refundOf(order)).toHaveLength(1);
    await shop.app.runJobs();
    expect(await violations()).toEqual([]);
  });

  it('sends one refund although the answer of the payments service was lost', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    await cancel(order).expect(201);
    await shop.fake.control('POST', '/control/faults', {
      kind: 'reset',
      processed: true,
      count: 1,
      path: '/v1/refunds',
    });
    await shop.app.runJobs();
    shop.app.clock.advance({ minutes: 10 });
    await shop.app.runJobs();
    await shop.fake.control('DELETE', '/control/faults');
    expect(await refundOf(order)).toMatchObject([{ status: 'sent' }]);
    const state = (await shop.fake.control('GET', '/control/state')) as { refunds: { metadata: { order?: string } }[] };
    expect(state.refunds.filter(({ metadata }) => metadata.order === order)).toHaveLength(1);
  });

  it('takes the entry back and asks the owner when the bank refuses the refund', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    await cancel(order).expect(201);
    await shop.app.runJobs();
    const [refund] = await refundOf(order);
    const clearing = await balance('1250');
    await shop.fake.control('POST', `/control/refunds/${refund?.provider_refund_id}/fail`, {});
    await shop.fake.webhooksSettled();
    expect(await refundOf(order)).toMatchObject([{ status: 'failed' }]);
    expect((await balance('1250')) - clearing).toBe(refund?.amount_minor);
    const review = await shop.app.database.handle
      .selectFrom('payment_review')
      .selectAll()
      .where('order_id', '=', refund?.order_id ?? 0)
      .executeTakeFirstOrThrow();
    await (await shop.app.agentFor('assembler')).post(`/api/payment-reviews/${review.id}/settled`, {}).expect(403);
    await owner.post(`/api/payment-reviews/${review.id}/settled`, { resolution: '' }).expect(400);
    await owner.post(`/api/payment-reviews/${review.id}/settled`, { resolution: 'Paid back by transfer.' }).expect(204);
    await owner.post(`/api/payment-reviews/${review.id}/settled`, { resolution: 'Again.' }).expect(409);
  });
});

describe('Cancelling an order', () => {
  it('closes the payment page of one that was not paid, so that nobody can pay any more', async () => {
    const { listingId, part } = await spare(1);
    const { number, paymentPage } = await shop.order([{ listingId, quantity: 1 }]);
    const { body } = await cancel(number).expect(201);
    expect(body).toEqual({ order: number, creditNote: null });
    expect(await liveClaims(part.id)).toBe(0);
    const session = new URL(paymentPage).pathname.split('/').at(-1) ?? '';
    const state = (await shop.fake.control('GET', '/control/state')) as { sessions: { id: string; status: string }[] };
    expect(state.sessions.find(({ id }) => id === session)?.status).toBe('expired');
  });

  it('is refused once it has left', async () => {
    const { listingId, lot } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const { body } = await owner.create('/api/parcels', { order }).expect(201);
    const path = `/api/parcels/${(body as { number: string }).number}`;
    await owner.post(`${path}/scans`, { code: lot.code }).expect(200);
    const version = async () => ((await owner.get(path)).body as { version: number }).version;
    await owner.post(`${path}/packed`, { version: await version() }).expect(200);
    const sent = { carrier: 'Hill Post', trackingCode: null, version: await version() };
    await owner.post(`${path}/dispatch`, sent).expect(200);
    const refused = await cancel(order).expect(409);
    expect((refused.body as { detail: string }).detail).toContain('has left');
  });

  it('is the owner’s, and wants a reason', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const body = { order, reason: 'x' };
    await (await shop.app.visitor()).create('/api/order-cancellations', body).expect(401);
    await (await shop.app.agentFor('assembler')).create('/api/order-cancellations', body).expect(403);
    await (await shop.app.agentFor('customer')).create('/api/order-cancellations', body).expect(403);
    await cancel(order, '').expect(400);
    await cancel('O-2601-998').expect(404);
  });
});

describe('The order desk', () => {
  it('says where each order is, without prices for the assembler', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const { body } = await owner.get(`/api/desk-orders/${order}`).expect(200);
    expect(body).toMatchObject({
      state: 'ready',
      gross: { amount: 13_530 },
      cancellable: true,
      documents: [{ kind: 'payment' }, { kind: 'invoice' }],
      lines: [{ needs: [{ fromShelf: '1', short: '0' }] }],
    });
    const assembler = await shop.app.agentFor('assembler');
    expect((await assembler.get(`/api/desk-orders/${order}`).expect(200)).body).toMatchObject({
      gross: null,
      lines: [{ net: null }],
    });
    const list = await assembler.get('/api/desk-orders?state=cancelled&sort=promisedOn').expect(200);
    const { items, total } = list.body as { items: { state: string }[]; total: number };
    expect(total).toBe(items.length);
    expect(new Set(items.map(({ state }) => state))).toEqual(new Set(['cancelled']));
    await (await shop.app.agentFor('customer')).get('/api/desk-orders').expect(403);
    await (await shop.app.visitor()).get('/api/desk-orders').expect(401);
    await owner.get('/api/desk-orders?state=lost').expect(400);
    await owner.get('/api/desk-orders/O-2601-997').expect(404);
  });
});
