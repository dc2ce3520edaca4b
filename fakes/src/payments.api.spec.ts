import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import Stripe from 'stripe';
import { idOf } from './payments/wire.js';
import { startPayments, type PaymentsFake } from './payments.js';
import { clientOf, errorOf, line, order, paidOrder } from './testing/shop.js';

let fake: PaymentsFake;
let client: Stripe;

beforeAll(async () => {
  fake = await startPayments();
  client = clientOf(fake);
});
afterAll(() => fake.close());
beforeEach(() => fake.control('POST', '/control/reset'));

describe('a checkout session', () => {
  it('is created open and unpaid, with the sum of its lines and a page to pay at', async () => {
    const session = await client.checkout.sessions.create(order());
    expect(session).toMatchObject({
      object: 'checkout.session',
      amount_total: 20_800,
      amount_subtotal: 20_800,
      currency: 'eur',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      client_reference_id: 'order-17',
      metadata: { order: '17' },
      customer_email: 'customer@fernhollow.example',
      livemode: false,
      url: `${fake.address}/pay/${session.id}`,
    });
    expect(session.expires_at - session.created).toBe(24 * 3600);
    expect(session.lastResponse.requestId).toMatch(/^req_/);
  });

  it('can be read again, with its lines when asked for', async () => {
    const { id } = await client.checkout.sessions.create(order());
    expect((await client.checkout.sessions.retrieve(id)).line_items).toBeUndefined();
    const session = await client.checkout.sessions.retrieve(id, { expand: ['line_items'] });
    expect(session.line_items?.data.map((one) => [one.description, one.quantity, one.amount_total])).toEqual([
      ['Wren 60', 1, 18_900],
      ['Tip, chisel', 2, 1900],
    ]);
    const lines = await client.checkout.sessions.listLineItems(id, { limit: 1 });
    expect(lines.data[0]?.description).toBe('Wren 60');
    expect(lines.has_more).toBe(true);
    expect(lines.data[0]?.price?.unit_amount_decimal?.toString()).toBe('18900');
  });

  it('takes yen without decimals and dinars with three', async () => {
    const yen = await client.checkout.sessions.create(order({ line_items: [line('Wren 60', 28_000, 1, 'jpy')] }));
    expect([yen.amount_total, yen.currency]).toEqual([28_000, 'jpy']);
    const dinars = await client.checkout.sessions.create(order({ line_items: [line('Wren 60', 62_340, 1, 'kwd')] }));
    expect(dinars.amount_total).toBe(62_340);
    const fine = await errorOf(
      client.checkout.sessions.create(order({ line_items: [line('Wren', 62_345, 1, 'kwd')] })),
    );
    expect(fine.message).toContain('multiple of 10');
  });

  it.each([
    ['no lines', { line_items: [] }, 'line_items', 'parameter_missing'],
    ['too small a total', { line_items: [line('Screw', 12)] }, 'line_items', 'amount_too_small'],
    ['too large a total', { line_items: [line('Everything', 100_000_000)] }, 'line_items', 'amount_too_large'],
    [
      'an unknown currency',
      { line_items: [line('Wren', 900, 1, 'zzz')] },
      'line_items[0][price_data][currency]',
      undefined,
    ],
    ['two currencies', { line_items: [line('Wren', 900), line('Tip', 900, 1, 'usd')] }, 'line_items', undefined],
    [
      'a quantity of zero',
      { line_items: [line('Wren', 900, 0)] },
      'line_items[0][quantity]',
      'parameter_invalid_integer',
    ],
    ['a bad e-mail address', { customer_email: 'nobody' }, 'customer_email', 'email_invalid'],
    ['an end within the half hour', { expires_at: Math.floor(Date.now() / 1000) + 600 }, 'expires_at', undefined],
    ['an end after a day', { expires_at: Math.floor(Date.now() / 1000) + 90_000 }, 'expires_at', undefined],
    ['a success address that is none', { success_url: 'somewhere' }, 'success_url', 'url_invalid'],
    ['a parameter nobody knows', { colour: 'green' }, 'colour', 'parameter_unknown'],
    ['a feature the stand-in lacks', { allow_promotion_codes: true }, 'allow_promotion_codes', undefined],
    ['too long a reference', { client_reference_id: 'x'.repeat(201) }, 'client_reference_id', undefined],
  ])('is refused with %s', async (_what, overrides: object, param, code) => {
    const refusal = await errorOf(client.checkout.sessions.create({ ...order(), ...overrides }));
    expect(refusal).toBeInstanceOf(Stripe.errors.StripeInvalidRequestError);
    expect([refusal.statusCode, refusal.param, refusal.code]).toEqual([400, param, code]);
  });

  it('can be expired while open, and only then', async () => {
    const { id } = await client.checkout.sessions.create(order());
    const expired = await client.checkout.sessions.expire(id);
    expect([expired.status, expired.url]).toEqual(['expired', null]);
    const refusal = await errorOf(client.checkout.sessions.expire(id));
    expect([refusal.statusCode, refusal.message]).toEqual([400, expect.stringContaining('expired')]);
  });

  it('expires by itself when its time has come', async () => {
    let now = Date.UTC(2030, 0, 1);
    const dated = await startPayments({ now: () => now });
    try {
      const its = clientOf(dated);
      const soon = Math.floor(now / 1000) + 1800;
      const { id } = await its.checkout.sessions.create(order({ expires_at: soon }));
      now += 1_799_000;
      expect((await its.checkout.sessions.retrieve(id)).status).toBe('open');
      now += 1000;
      expect((await its.checkout.sessions.retrieve(id)).status).toBe('expired');
      expect((await its.events.list({ type: 'checkout.session.expired' })).data).toHaveLength(1);
    } finally {
      await dated.close();
    }
  });

  it('is unknown under another id', async () => {
    const refusal = await errorOf(client.checkout.sessions.retrieve('cs_test_none'));
    expect([refusal.statusCode, refusal.code]).toEqual([404, 'resource_missing']);
  });
});

describe('a paid session', () => {
  it('leads to intent, charge and balance transaction, whose net is amount less fee', async () => {
    const session = await paidOrder(fake, client);
    expect([session.status, session.payment_status, session.url]).toEqual(['complete', 'paid', null]);
    const whole = await client.checkout.sessions.retrieve(session.id, {
      expand: ['payment_intent.latest_charge.balance_transaction'],
    });
    const intent = whole.payment_intent as Stripe.PaymentIntent;
    const charge = intent.latest_charge as Stripe.Charge;
    const transaction = charge.balance_transaction as Stripe.BalanceTransaction;
    expect([intent.status, intent.amount_received, intent.metadata]).toEqual(['succeeded', 20_800, { order: '17' }]);
    expect([charge.paid, charge.amount_captured, charge.payment_method_details?.card?.last4]).toEqual([
      true,
      20_800,
      '4242',
    ]);
    // 1.5 % of 208.00 and 0.25: the stand-in's own tariff.
    expect([transaction.amount, transaction.fee, transaction.net]).toEqual([20_800, 337, 20_463]);
    expect(transaction.source).toBe(charge.id);
  });

  it('is found by its intent, its charge by intent, its transaction by charge', async () => {
    const session = await paidOrder(fake, client);
    await paidOrder(fake, client);
    const intent = idOf(session.payment_intent);
    expect((await client.checkout.sessions.list({ payment_intent: intent })).data.map(({ id }) => id)).toEqual([
      session.id,
    ]);
    const charges = await client.charges.list({ payment_intent: intent });
    expect(charges.data).toHaveLength(1);
    const source = charges.data[0]?.id ?? '';
    const transactions = await client.balanceTransactions.list({ source });
    expect(transactions.data.map(({ type }) => type)).toEqual(['charge']);
    const [transaction] = transactions.data;
    expect(await client.balanceTransactions.retrieve(transaction?.id ?? '')).toEqual(transaction);
    expect((await client.paymentIntents.retrieve(intent, { expand: ['latest_charge'] })).latest_charge).toMatchObject({
      id: source,
    });
    expect((await client.paymentIntents.list()).data).toHaveLength(2);
    expect((await client.charges.retrieve(source)).id).toBe(source);
    expect((await client.balance.retrieve()).pending).toEqual([
      { amount: 40_926, currency: 'eur', source_types: { card: 40_926 } },
    ]);
  });

  it('needs no payment when it costs nothing', async () => {
    const session = await paidOrder(fake, client, { line_items: [line('Sticker', 0)] });
    expect([session.status, session.payment_status, session.payment_intent]).toEqual([
      'complete',
      'no_payment_required',
      null,
    ]);
  });
});

describe('refunds', () => {
  it('give back part by part, never more than was paid, and the balance shows it', async () => {
    const { payment_intent } = await paidOrder(fake, client);
    const intent = idOf(payment_intent);
    const first = await client.refunds.create({
      payment_intent: intent,
      amount: 8000,
      reason: 'requested_by_customer',
      metadata: { note: '4' },
    });
    expect(first).toMatchObject({ amount: 8000, status: 'succeeded', currency: 'eur', metadata: { note: '4' } });
    const over = await errorOf(client.refunds.create({ payment_intent: intent, amount: 12_801 }));
    expect([over.statusCode, over.param, over.message]).toEqual([
      400,
      'amount',
      'Refund amount (€128.01) is greater than unrefunded amount on charge (€128.00)',
    ]);
    await client.refunds.create({ payment_intent: intent });
    const again = await errorOf(client.refunds.create({ payment_intent: intent, amount: 1 }));
    expect([again.statusCode, again.code]).toEqual([400, 'charge_already_refunded']);
    const charge = await client.charges.retrieve(idOf(first.charge), { expand: ['refunds'] });
    expect([charge.amount_refunded, charge.refunded]).toEqual([20_800, true]);
    expect(charge.refunds?.data.map(({ amount }) => amount)).toEqual([12_800, 8000]);
    const transactions = await client.balanceTransactions.list({ type: 'refund' });
    expect(transactions.data.map(({ net }) => net)).toEqual([-12_800, -8000]);
    expect((await client.refunds.list({ payment_intent: intent })).data).toHaveLength(2);
    expect((await client.refunds.retrieve(first.id)).id).toBe(first.id);
  });

  it('need a charge that exists and succeeded', async () => {
    expect((await errorOf(client.refunds.create({ charge: 'ch_none' }))).code).toBe('resource_missing');
    expect((await errorOf(client.refunds.create({}))).code).toBe('parameter_missing');
    const { id } = await client.checkout.sessions.create(order());
    await fake.control('POST', `/control/sessions/${id}/pay`, { number: '4000000000000002' });
    const session = await client.checkout.sessions.retrieve(id);
    const refusal = await errorOf(client.refunds.create({ payment_intent: idOf(session.payment_intent) }));
    expect(refusal.message).toContain('does not have a successful charge');
  });
});

describe('payouts', () => {
  it('carry what the balance holds, and list the transactions they carried', async () => {
    const { payment_intent } = await paidOrder(fake, client);
    await client.refunds.create({ payment_intent: idOf(payment_intent), amount: 800 });
    const made = (await fake.control('POST', '/control/payouts', { currency: 'eur' })) as Stripe.Payout;
    const payout = await client.payouts.retrieve(made.id, { expand: ['balance_transaction'] });
    expect([payout.amount, payout.status, payout.currency]).toEqual([19_663, 'paid', 'eur']);
    const carried = await client.balanceTransactions.list({ payout: payout.id });
    expect(carried.data.map(({ type, net }) => [type, net])).toEqual([
      ['payout', -19_663],
      ['refund', -800],
      ['charge', 20_463],
    ]);
    expect(carried.data.reduce((sum, { net }) => sum + net, 0)).toBe(0);
    await expect(fake.control('POST', '/control/payouts')).rejects.toThrow('409');
    await fake.control('POST', `/control/payouts/${made.id}/fail`);
    expect((await client.payouts.list()).data[0]).toMatchObject({ status: 'failed', failure_code: 'account_closed' });
    expect(((await fake.control('POST', '/control/payouts')) as Stripe.Payout).amount).toBe(19_663);
  });
});

describe('lists', () => {
  it('come in pages, newest first, forwards and backwards', async () => {
    const made: string[] = [];
    for (let number = 1; number <= 5; number += 1) {
      made.push((await client.checkout.sessions.create(order({ client_reference_id: String(number) }))).id);
    }
    const newest = made.toReversed();
    const first = await client.checkout.sessions.list({ limit: 2 });
    expect([first.data.map(({ id }) => id), first.has_more]).toEqual([newest.slice(0, 2), true]);
    const last = await client.checkout.sessions.list({ limit: 3, starting_after: newest[1] ?? '' });
    expect([last.data.map(({ id }) => id), last.has_more]).toEqual([newest.slice(2), false]);
    const back = await client.checkout.sessions.list({ limit: 2, ending_before: newest[4] ?? '' });
    expect([back.data.map(({ id }) => id), back.has_more]).toEqual([newest.slice(2, 4), true]);
    const all: string[] = [];
    for await (const session of client.checkout.sessions.list({ limit: 2 })) all.push(session.id);
    expect(all).toEqual(newest);
  });

  it('can be narrowed by instant and state, and their things expanded', async () => {
    const session = await paidOrder(fake, client);
    await client.checkout.sessions.create(order());
    const open = await client.checkout.sessions.list({ status: 'open' });
    expect(open.data).toHaveLength(1);
    expect((await client.charges.list({ created: { gt: session.created + 3600 } })).data).toEqual([]);
    expect((await client.charges.list({ created: { gte: session.created } })).data).toHaveLength(1);
    const expanded = await client.checkout.sessions.list({ status: 'complete', expand: ['data.payment_intent'] });
    expect(expanded.data[0]?.payment_intent).toMatchObject({ object: 'payment_intent' });
  });

  it('refuse a bad page size, cursor or expansion', async () => {
    expect((await errorOf(client.charges.list({ limit: 101 }))).param).toBe('limit');
    expect((await errorOf(client.charges.list({ starting_after: 'ch_none' }))).code).toBe('resource_missing');
    const { id } = await client.checkout.sessions.create(order());
    expect((await errorOf(client.checkout.sessions.retrieve(id, { expand: ['colour'] }))).param).toBe('expand');
  });
});

describe('events', () => {
  it('tell the story of a payment and can be read again', async () => {
    const session = await paidOrder(fake, client);
    const events = await client.events.list();
    expect(events.data.map(({ type }) => type).toReversed()).toEqual([
      'payment_intent.created',
      'charge.succeeded',
      'payment_intent.succeeded',
      'checkout.session.completed',
    ]);
    const completed = await client.events.list({ type: 'checkout.session.completed' });
    expect(completed.data[0]?.data.object).toMatchObject({ id: session.id, payment_status: 'paid' });
    const [event] = completed.data;
    expect((await client.events.retrieve(event?.id ?? '')).id).toBe(event?.id);
    expect((await client.events.list({ types: ['charge.succeeded', 'payment_intent.created'] })).data).toHaveLength(2);
  });
});

describe('a request', () => {
  it('is refused without a key, and with a key that is no test key', async () => {
    const bare = await fetch(`${fake.address}/v1/charges`);
    expect(bare.status).toBe(401);
    const live = new Stripe('sk_live_x', { host: '127.0.0.1', port: fake.port, protocol: 'http' });
    const refusal = await errorOf(live.charges.list());
    expect(refusal).toBeInstanceOf(Stripe.errors.StripeAuthenticationError);
    const own = await startPayments({ apiKey: 'sk_test_other' });
    try {
      expect((await errorOf(clientOf(own).charges.list())).statusCode).toBe(401);
    } finally {
      await own.close();
    }
  });

  it('to an address nobody knows is refused as the service would', async () => {
    const refusal = await errorOf(client.customers.create({ name: 'Somebody' }));
    expect([refusal.statusCode, refusal.type]).toEqual([404, 'StripeInvalidRequestError']);
  });

  it('with a key of idempotency is run once and its answer replayed', async () => {
    const first = await client.checkout.sessions.create(order(), { idempotencyKey: 'op-1' });
    const second = await client.checkout.sessions.create(order(), { idempotencyKey: 'op-1' });
    expect(second.id).toBe(first.id);
    expect(second.lastResponse.headers['idempotent-replayed']).toBe('true');
    expect((await client.checkout.sessions.list()).data).toHaveLength(1);
  });

  it('with the same key and other parameters, or to another address, is an idempotency error', async () => {
    await client.checkout.sessions.create(order(), { idempotencyKey: 'op-2' });
    const other = order({ client_reference_id: 'order-18' });
    const changed = await errorOf(client.checkout.sessions.create(other, { idempotencyKey: 'op-2' }));
    expect(changed).toBeInstanceOf(Stripe.errors.StripeIdempotencyError);
    const elsewhere = await errorOf(client.refunds.create({ charge: 'ch_1' }, { idempotencyKey: 'op-2' }));
    expect(elsewhere).toBeInstanceOf(Stripe.errors.StripeIdempotencyError);
  });

  it('that failed its checks keeps nothing, one that was refused in its work is replayed', async () => {
    await errorOf(client.checkout.sessions.create(order({ customer_email: 'x' }), { idempotencyKey: 'op-3' }));
    await expect(client.checkout.sessions.create(order(), { idempotencyKey: 'op-3' })).resolves.toHaveProperty('id');
    const { payment_intent } = await paidOrder(fake, client);
    const too = { payment_intent: idOf(payment_intent), amount: 99_999 };
    await errorOf(client.refunds.create(too, { idempotencyKey: 'op-4' }));
    const replayed = await errorOf(client.refunds.create(too, { idempotencyKey: 'op-4' }));
    expect(replayed.headers?.['idempotent-replayed']).toBe('true');
  });

  it('whose key is still in progress is told so', async () => {
    await fake.control('POST', '/control/faults', { kind: 'delay', milliseconds: 300 });
    const slow = client.checkout.sessions.create(order(), { idempotencyKey: 'op-5' });
    await new Promise((resolve) => setTimeout(resolve, 100));
    const second = await errorOf(client.checkout.sessions.create(order(), { idempotencyKey: 'op-5' }));
    expect([second.statusCode, second.code]).toEqual([409, 'idempotency_key_in_use']);
    await expect(slow).resolves.toHaveProperty('id');
  });
});
