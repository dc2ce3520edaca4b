import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { startPayments } from '@emberlot/fakes/payments';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { examine } from '../doctor/examine.js';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import { addDelivery, addListing } from '../testing/sale.js';
import { addBin, addLot, addShop, type PartRow } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { CatalogueModule } from '../catalogue/catalogue.module.js';
import { PaymentSweepTask } from './payment-sweep.task.js';
import { PaymentsModule } from './payments.module.js';

const webhookSecret = 'whsec_spec';
let fake: Awaited<ReturnType<typeof startPayments>>;
let app: TestApp;

beforeAll(async () => {
  fake = await startPayments({ port: 0 });
  app = await startTestApp({
    modules: [CatalogueModule, PaymentsModule],
    startsAt: new Date(),
    env: {
      STRIPE_API_HOST: '127.0.0.1',
      STRIPE_API_PORT: String(fake.port),
      STRIPE_API_PROTOCOL: 'http',
      STRIPE_WEBHOOK_SECRET: webhookSecret,
    },
  });
  fake.setWebhooks([{ url: `${app.url}/api/payment-events`, secrets: [webhookSecret], events: [] }]);
  await addShop(app.database.handle);
  await addDelivery(app.database.handle, 'IE');
});
afterAll(async () => {
  await app.close();
  await fake.close();
});
beforeEach(() => app.clock.set(new Date()));

async function stock(part: PartRow, quantity: number): Promise<void> {
  const bin = await addBin(app.database.handle);
  const lot = await addLot(app.database.handle, { partId: part.id });
  await app.transaction(async (trx) => {
    const document = await app.get(DocumentsService).record(trx, { kind: 'receipt', recordedBy: null });
    const moves = await app.get(StockLedgerService).post(trx, document, [
      {
        direction: 'in',
        partId: part.id,
        lotId: lot.id,
        binId: bin.id,
        quantity: new Decimal(quantity),
        value: minorAmount(quantity * 1_000),
        reason: 'receipt',
      },
    ]);
    const amounts = valueByComponent(moves);
    await app.get(JournalService).post(trx, { document, event: 'goods_received', narrative: 'spec', amounts });
  });
}

async function offered(quantity: number): Promise<number> {
  const listing = await addListing(app.database.handle);
  await stock(listing.part, quantity);
  return listing.id;
}

const basketOf = (listingId: number, quantity = 1) => ({
  country: 'IE',
  postcode: 'D02 X285',
  lines: [{ listingId, quantity }],
});

async function orderOf(listingId: number, change: Record<string, unknown> = {}) {
  const visitor = await app.visitor();
  const { body: quote } = await visitor.post('/api/shop/quotes', basketOf(listingId)).expect(200);
  return visitor.create('/api/shop/orders', {
    ...basketOf(listingId),
    email: `buyer-${listingId}@fernhollow.example`,
    recipient: 'A buyer',
    addressLine: '1 Quay Street',
    city: 'Dublin',
    expectedGross: quote.gross.amount,
    expectedDay: quote.promise.leavesBy,
    termsAccepted: true,
    ...change,
  });
}

/** Pays the way the payment page does, and waits until the shop has been told. */
async function pay(paymentPage: string): Promise<void> {
  const session = new URL(paymentPage).pathname.split('/').at(-1) ?? '';
  await fake.control('POST', `/control/sessions/${session}/pay`, {});
  await fake.webhooksSettled();
}

async function orderRow(number: string) {
  return app.database.handle
    .selectFrom('sales_order')
    .selectAll()
    .where('number', '=', number)
    .executeTakeFirstOrThrow();
}

async function paymentsOf(orderId: number) {
  return app.database.handle.selectFrom('payment').selectAll().where('order_id', '=', orderId).execute();
}

describe('Checkout', () => {
  it('prices with VAT and delivery, and promises a day', async () => {
    const listingId = await offered(5);
    const visitor = await app.visitor();
    const { body } = await visitor.post('/api/shop/quotes', basketOf(listingId, 2)).expect(200);
    // 2 × 100.00 and 10.00 delivery at 23 %: 210.00 + 48.30.
    expect(body).toMatchObject({
      ask: null,
      net: { amount: 21_000, currency: 'EUR' },
      vat: { amount: 4_830 },
      gross: { amount: 25_830 },
      promise: { fromBatch: false },
    });
  });

  it('takes an order, a payment, and issues the invoice once', async () => {
    const listingId = await offered(2);
    const { body, status } = await orderOf(listingId);
    expect(status).toBe(201);
    await pay(body.paymentPage);
    const order = await orderRow(body.number);
    const payments = await paymentsOf(order.id);
    expect(payments.map(({ amount_minor: amount }) => amount)).toEqual([order.gross_minor]);
    const invoices = await app.database.handle
      .selectFrom('order_invoice as o')
      .innerJoin('invoice as i', 'i.id', 'o.invoice_id')
      .select(['i.gross_minor', 'i.prepaid_minor'])
      .where('o.order_id', '=', order.id)
      .execute();
    expect(invoices).toEqual([{ gross_minor: order.gross_minor, prepaid_minor: order.gross_minor }]);
    await app.runJobs();
    const findings = await examine(app.database.handle, app.clock.now());
    expect(findings.flatMap(({ violations }) => violations)).toEqual([]);
  });

  it('applies an event once, however often it comes', async () => {
    const listingId = await offered(1);
    const { body } = await orderOf(listingId);
    await fake.control('POST', '/control/webhooks/conduct', { repeat: 5 });
    await pay(body.paymentPage);
    await fake.control('POST', '/control/webhooks/conduct', { repeat: 1 });
    const order = await orderRow(body.number);
    expect(await paymentsOf(order.id)).toHaveLength(1);
  });

  it('sells the last one once to two buyers at the same time', async () => {
    const listingId = await offered(1);
    const tries = await Promise.all([orderOf(listingId), orderOf(listingId, { email: 'other@fernhollow.example' })]);
    expect(tries.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([201, 409]);
  });

  it('refuses another price than the buyer saw, and fields that are not asked for', async () => {
    const listingId = await offered(3);
    const cheaper = await orderOf(listingId, { expectedGross: 1 });
    expect(cheaper.status).toBe(409);
    expect(cheaper.body.code).toBe('changed_meanwhile');
    const tampered = await orderOf(listingId, { gross: 1, status: 'paid' });
    expect(tampered.status).toBe(400);
  });

  it('refuses events that are not signed by the payments service', async () => {
    const visitor = await app.visitor();
    await visitor.post('/api/payment-events', { id: 'evt_1', type: 'checkout.session.completed' }).expect(400);
  });

  it('keeps the order and tells the buyer when the payments service is down', async () => {
    const listingId = await offered(1);
    await fake.control('POST', '/control/faults', {
      kind: 'fail',
      status: 503,
      count: 3,
      path: '/v1/checkout',
      retry: false,
    });
    const { body, status } = await orderOf(listingId);
    await fake.control('DELETE', '/control/faults');
    expect(status).toBe(201);
    expect(body.paymentPage).toBeNull();
    app.clock.advance({ minutes: 50 });
    await app.get(PaymentSweepTask).run();
    const available = await orderOf(listingId, { email: 'later@fernhollow.example' });
    expect(available.status).toBe(201);
  });

  it('shows an order to who holds its link, and to nobody else', async () => {
    const listingId = await offered(1);
    const { body } = await orderOf(listingId);
    const visitor = await app.visitor();
    const path = `/api/shop/orders/${body.number}`;
    const own = await visitor.get(path).set('x-order-token', body.guestToken).expect(200);
    expect(own.body).toMatchObject({ number: body.number, canPay: true });
    const foreign = await visitor.get(path).set('x-order-token', 'x'.repeat(43)).expect(404);
    const missing = await visitor.get('/api/shop/orders/O-0000-000').expect(404);
    expect(foreign.body.detail).toBe(missing.body.detail);
    await visitor.get(path).expect(404);
    await (await app.agentFor('customer')).get(path).expect(404);
  });

  it('lets a buyer pay again after the page ran out, while the goods are there', async () => {
    const listingId = await offered(1);
    const { body } = await orderOf(listingId);
    const session = new URL(body.paymentPage).pathname.split('/').at(-1) ?? '';
    await fake.control('POST', `/control/sessions/${session}/expire`, {});
    await fake.webhooksSettled();
    const visitor = await app.visitor();
    const again = await visitor
      .post(`/api/shop/orders/${body.number}/payment-pages`)
      .set('x-order-token', body.guestToken)
      .expect(200);
    await pay(again.body.paymentPage);
    const order = await visitor.get(`/api/shop/orders/${body.number}`).set('x-order-token', body.guestToken);
    expect(order.body).toMatchObject({ canPay: false, invoices: [expect.objectContaining({ kind: 'invoice' })] });
    await visitor
      .post(`/api/shop/orders/${body.number}/payment-pages`)
      .set('x-order-token', body.guestToken)
      .expect(409);
  });

  it('waits for a bank, and frees the goods when it refuses', async () => {
    const listingId = await offered(1);
    const { body } = await orderOf(listingId);
    const session = new URL(body.paymentPage).pathname.split('/').at(-1) ?? '';
    await fake.control('POST', `/control/sessions/${session}/pay-later`, {});
    await fake.webhooksSettled();
    app.clock.advance({ days: 2 });
    expect((await orderOf(listingId, { expectedGross: 13_530, expectedDay: '2099-01-01' })).status).toBe(409);
    await fake.control('POST', `/control/sessions/${session}/settle`, { outcome: 'failed' });
    await fake.webhooksSettled();
    expect((await orderOf(listingId, { email: 'next@fernhollow.example' })).status).toBe(201);
  });

  it('holds back goods when another amount was paid', async () => {
    const listingId = await offered(1);
    const { body } = await orderOf(listingId);
    await fake.control('POST', '/control/next-payment', { amount: 1 });
    await pay(body.paymentPage);
    const order = await orderRow(body.number);
    expect(await paymentsOf(order.id)).toEqual([]);
    const reviews = await app.database.handle
      .selectFrom('payment_review')
      .selectAll()
      .where('order_id', '=', order.id)
      .execute();
    expect(reviews).toHaveLength(1);
  });
});
