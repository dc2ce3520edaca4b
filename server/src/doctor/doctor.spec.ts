import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startPayments } from '@emberlot/fakes/payments';
import pg from 'pg';
import { ReturnsModule } from '../returns/returns.module.js';
import { ShippingModule } from '../shipping/shipping.module.js';
import { SellingApp } from '../shipping/testing.js';
import { addListing } from '../testing/sale.js';
import { addPart } from '../testing/shelf.js';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import { serialNumberOn } from '@emberlot/shared/serial/serial-number';
import { examine } from './examine.js';

let shop: SellingApp;
let superuser: pg.Client;

beforeAll(async () => {
  shop = await SellingApp.start(await startPayments({ port: 0 }), [ShippingModule, ReturnsModule]);
  const { app } = shop;
  const bench = await app.agentFor('owner');
  const part = await addPart(app.database.handle, { traced: 'single', letters: 'DOC' });
  const { id: toolId } = await addListing(app.database.handle, { part, form: 'tool' });
  const serial = serialNumberOn('DOC', isoDay(app.clock.today()), 1);
  await shop.finish(part, serial, 5_000);
  const spare = await addListing(app.database.handle);
  await shop.receive(spare.part, 9);
  const sent = await shop.paidOrder([{ listingId: toolId, quantity: 1 }], 'sent@marsh.example');
  const cancelled = await shop.paidOrder([{ listingId: spare.id, quantity: 1 }], 'cancelled@marsh.example');
  await shop.paidOrder([{ listingId: spare.id, quantity: 2 }], 'waiting@marsh.example');
  await bench.create('/api/order-cancellations', { order: cancelled, reason: 'spec' }).expect(201);
  const { body } = await bench.create('/api/parcels', { order: sent }).expect(201);
  const path = `/api/parcels/${(body as { number: string }).number}`;
  await bench.post(`${path}/scans`, { code: serial }).expect(200);
  const version = async () => ((await bench.get(path)).body as { version: number }).version;
  await bench.post(`${path}/packed`, { version: await version() }).expect(200);
  const away = { carrier: 'Hill Post', trackingCode: null, version: await version() };
  await bench.post(`${path}/dispatch`, away).expect(200);
  await app.runJobs();
  const admin = new URL(process.env['TEST_DATABASE_ADMIN_URL'] ?? app.ownerUrl);
  admin.pathname = new URL(app.ownerUrl).pathname;
  superuser = new pg.Client({ connectionString: admin.href });
  await superuser.connect();
  await superuser.query('set session_replication_role = replica');
}, 60_000);
afterAll(async () => {
  await superuser.end();
  await shop.close();
});

async function broken(): Promise<readonly string[]> {
  const findings = await examine(shop.app.database.handle, shop.app.clock.now());
  return findings.filter(({ violations }) => violations.length > 0).map(({ name }) => name);
}

/** What is planted past every constraint, how it is taken away again, and the rule that must name it. */
const planted: readonly (readonly [rule: string, plant: string, mend: string])[] = [
  [
    'invoice-numbers',
    `update invoice set sequence = sequence + 100 where series = 'INV' and sequence = 3`,
    `update invoice set sequence = 3 where series = 'INV' and sequence = 103`,
  ],
  [
    'invoices-add-up',
    `update invoice_line set net_minor = net_minor + 1 where id = (select min(id) from invoice_line)`,
    `update invoice_line set net_minor = net_minor - 1 where id = (select min(id) from invoice_line)`,
  ],
  [
    'invoices-are-posted',
    `update invoice_vat set vat_minor = vat_minor + 1 where invoice_id = 1;
     update invoice set vat_minor = vat_minor + 1, gross_minor = gross_minor + 1 where id = 1`,
    `update invoice_vat set vat_minor = vat_minor - 1 where invoice_id = 1;
     update invoice set vat_minor = vat_minor - 1, gross_minor = gross_minor - 1 where id = 1`,
  ],
  [
    'entries-balance',
    `update journal_line set debit_minor = debit_minor + 1 where id = (select min(id) from journal_line where debit_minor > 0)`,
    `update journal_line set debit_minor = debit_minor - 1 where id = (select min(id) from journal_line where debit_minor > 0)`,
  ],
  [
    'closed-months',
    `update period set closed_at = '2000-01-01' where month = (select min(month) from period)`,
    `update period set closed_at = null`,
  ],
  [
    'mail',
    `update outbox_mail set sent_at = null, created_at = created_at - interval '1 day' where id = (select min(id) from outbox_mail)`,
    `update outbox_mail set created_at = created_at + interval '1 day' where id = (select min(id) from outbox_mail)`,
  ],
  [
    'ledgers-are-append-only',
    `grant update on invoice to emberlot_server`,
    `revoke update on invoice from emberlot_server`,
  ],
  [
    'paid-and-invoiced',
    `update payment set amount_minor = amount_minor + 1 where document_id = (select min(document_id) from payment)`,
    `update payment set amount_minor = amount_minor - 1 where document_id = (select min(document_id) from payment)`,
  ],
  [
    'orders-add-up',
    `update sales_order set net_minor = net_minor + 1, vat_minor = vat_minor - 1 where id = 1`,
    `update sales_order set net_minor = net_minor - 1, vat_minor = vat_minor + 1 where id = 1`,
  ],
  ['refunds', `update refund set amount_minor = amount_minor + 1`, `update refund set amount_minor = amount_minor - 1`],
  ['processor-clearing', `update refund set status = 'requested'`, `update refund set status = 'sent'`],
  [
    'prepayments',
    `update journal_line set account_code = '1260' where id = (select max(id) from journal_line where account_code = '2300')`,
    `update journal_line set account_code = '2300' where account_code = '1260'`,
  ],
  [
    'shipped-is-packed',
    `update packed_item set taken_out_at = packed_at where id = (select min(id) from packed_item)`,
    `update packed_item set taken_out_at = null where id = (select min(id) from packed_item)`,
  ],
  [
    'serial-numbers',
    `update unit set serial = overlay(serial placing '00' from length(serial) - 1)`,
    `update unit set serial = (select code from lot where lot.id = unit.lot_id)`,
  ],
];

describe('The doctor', () => {
  it('finds nothing wrong with a shop that sold, sent and cancelled', async () => {
    await superuser.query('update outbox_mail set sent_at = created_at');
    expect(await broken()).toEqual([]);
  });

  it.each(planted)('names what breaks the rule of %s', async (rule, plant, mend) => {
    await superuser.query(plant);
    expect(await broken()).toContain(rule);
    await superuser.query(mend);
    await superuser.query('update outbox_mail set sent_at = created_at');
    expect(await broken()).toEqual([]);
  });
});
