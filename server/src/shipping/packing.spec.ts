import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { startPayments } from '@emberlot/fakes/payments';
import { isoDay } from '@emberlot/shared/plan/iso-day';
import { serialNumberOn } from '@emberlot/shared/serial/serial-number';
import { examine } from '../doctor/examine.js';
import type { Agent } from '../testing/agent.js';
import { mailsTo } from '../testing/mails.js';
import { addListing } from '../testing/sale.js';
import { addPart, type PartRow } from '../testing/shelf.js';
import type { ParcelDto, ScanAnswerDto } from './parcel.dto.js';
import { SellingApp } from './testing.js';
import { ShippingModule } from './shipping.module.js';

let shop: SellingApp;
let bench: Agent;
let serials = 0;
let tools = 0;
let letters = '';

beforeAll(async () => {
  shop = await SellingApp.start(await startPayments({ port: 0 }), [ShippingModule]);
  bench = await shop.app.agentFor('assembler');
});
afterAll(() => shop.close());

/** Letters that no other part of this spec has. */
function nextLetters(): string {
  letters = `W${String.fromCodePoint(65 + tools)}`;
  tools += 1;
  return letters;
}

async function tool(): Promise<{ part: PartRow; listingId: number }> {
  const part = await addPart(shop.app.database.handle, { traced: 'single', letters: nextLetters() });
  const { id } = await addListing(shop.app.database.handle, { part, form: 'tool', netMinor: 20_000 });
  return { part, listingId: id };
}

/** Of the tool that was made last. */
function serial(): string {
  serials += 1;
  return serialNumberOn(letters, isoDay(shop.app.clock.today()), serials);
}

async function spare(quantity: number) {
  const { id, part } = await addListing(shop.app.database.handle);
  return { listingId: id, part, ...(await shop.receive(part, quantity)) };
}

const open = async (order: string) => (await bench.create('/api/parcels', { order }).expect(201)).body as ParcelDto;
const scan = (parcel: string, code: string, more: object = {}) =>
  bench.post(`/api/parcels/${parcel}/scans`, { code, ...more });
const scanned = async (parcel: string, code: string, more: object = {}) =>
  (await scan(parcel, code, more).expect(200)).body as ScanAnswerDto;
const read = async (parcel: string) => (await bench.get(`/api/parcels/${parcel}`).expect(200)).body as ParcelDto;

async function refused(parcel: string, code: string, more: object = {}): Promise<string> {
  const answer = await scan(parcel, code, more);
  expect(answer.status).toBeGreaterThanOrEqual(400);
  expect(answer.status).toBeLessThan(500);
  return (answer.body as { detail: string }).detail;
}

async function packed(parcel: string): Promise<ParcelDto> {
  const { version } = await read(parcel);
  const { body } = await bench.post(`/api/parcels/${parcel}/packed`, { version }).expect(200);
  return body as ParcelDto;
}

async function weighed(parcel: string, more: object = {}): Promise<ParcelDto> {
  const { version } = await read(parcel);
  const facts = { mode: 'road', weightG: 850, wattHoursOnCase: true, chargePercent: null, version, ...more };
  return (await bench.put(`/api/parcels/${parcel}/lithium`, facts).expect(200)).body as ParcelDto;
}

async function dispatch(parcel: string) {
  const { version } = await read(parcel);
  return bench.post(`/api/parcels/${parcel}/dispatch`, { carrier: 'Hill Post', trackingCode: 'HP 123', version });
}

async function accountsOf(document: string): Promise<Readonly<Record<string, number>>> {
  const rows = await shop.app.database.handle
    .selectFrom('journal_line as l')
    .innerJoin('journal_entry as e', 'e.id', 'l.entry_id')
    .innerJoin('document as d', 'd.id', 'e.document_id')
    .select(['l.account_code as code', sql<number>`(l.debit_minor - l.credit_minor)::int8`.as('amount')])
    .where('d.number', '=', document)
    .execute();
  return Object.fromEntries(rows.map(({ code, amount }) => [code, amount]));
}

async function violations() {
  const findings = await examine(shop.app.database.handle, shop.app.clock.now());
  return findings.flatMap(({ violations: found }) => found);
}

describe('Packing', () => {
  it('binds the scanned unit to its order line, and refuses what does not belong', async () => {
    const { part, listingId } = await tool();
    const [first, second] = [serial(), serial()];
    await shop.finish(part, first, 5_000);
    await shop.finish(part, second, 7_000);
    const foreign = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const parcel = await open(order);
    expect(parcel).toMatchObject({ order, state: 'packing', items: [], lithium: { answer: 'no_lithium' } });
    expect(await refused(parcel.number, foreign.lot.code)).toContain('put it back');
    expect(await refused(parcel.number, 'NO-SUCH-THING')).toContain('Nothing here is called');
    const done = await scanned(parcel.number, first.toLowerCase());
    expect(done.sentence).toContain(`{unit:${first}}`);
    expect(done.parcel.items).toMatchObject([{ serial: first, quantity: '1' }]);
    expect(await refused(parcel.number, first)).toContain('already');
    expect(await refused(parcel.number, second)).toContain('in the parcel already');
  });

  it('refuses a unit whose last test failed, also where only the database looks', async () => {
    const { part, listingId } = await tool();
    const [failing, sound] = [serial(), serial()];
    const unit = await shop.finish(part, failing, 5_000);
    await shop.finish(part, sound, 5_000);
    const order = await shop.paidOrder([{ listingId, quantity: 2 }]);
    const parcel = await open(order);
    await scanned(parcel.number, failing);
    await scanned(parcel.number, sound);
    shop.app.clock.advance({ minutes: 1 });
    const { revision_id: revision } = await shop.app.database.handle
      .selectFrom('unit')
      .select('revision_id')
      .where('id', '=', unit.unitId)
      .executeTakeFirstOrThrow();
    await shop.run(unit.unitId, revision, 2, 'fail');
    const { version, items } = await read(parcel.number);
    const closing = await bench.post(`/api/parcels/${parcel.number}/packed`, { version }).expect(422);
    expect((closing.body as { detail: string }).detail).toContain('no valid pass');
    const item = items.find((candidate) => candidate.serial === failing);
    await bench.post(`/api/parcels/${parcel.number}/items/${item?.id}/taken-out`).expect(200);
    expect(await refused(parcel.number, failing)).toContain('no valid pass');
    const row = { shipment_id: 0, order_line_need_id: parcel.needs[0]?.id ?? 0, part_id: part.id };
    const { id } = await shop.app.database.handle
      .selectFrom('shipment')
      .select('id')
      .where('number', '=', parcel.number)
      .executeTakeFirstOrThrow();
    const past = shop.app.database.handle.insertInto('packed_item').values({
      ...row,
      shipment_id: id,
      lot_id: unit.lot.id,
      bin_id: unit.bin.id,
      unit_id: unit.unitId,
      quantity: '1',
      packed_at: shop.app.clock.now(),
    });
    await expect(past.execute()).rejects.toMatchObject({ constraint: 'packed_unit_is_sound' });
  });

  it('puts a unit into one parcel, however many scan it at the same moment', async () => {
    const { part, listingId } = await tool();
    const [wanted, other] = [serial(), serial()];
    await shop.finish(part, wanted, 5_000);
    await shop.finish(part, other, 5_000);
    const parcels = [
      await open(await shop.paidOrder([{ listingId, quantity: 1 }])),
      await open(await shop.paidOrder([{ listingId, quantity: 1 }])),
    ];
    const tries = await Promise.all(parcels.map(({ number }) => scan(number, wanted)));
    const codes = tries.map(({ status }) => status).toSorted((a, b) => a - b);
    expect(codes[0]).toBe(200);
    expect([409, 422]).toContain(codes[1]);
  });

  it('refuses a held lot, more than is missing, and a bin with several things', async () => {
    const { listingId, part, lot, bin } = await spare(5);
    const order = await shop.paidOrder([{ listingId, quantity: 3 }]);
    const parcel = await open(order);
    await shop.app.database.handle.updateTable('lot').set({ status: 'held' }).where('id', '=', lot.id).execute();
    expect(await refused(parcel.number, lot.code)).toContain('is held');
    await shop.app.database.handle.updateTable('lot').set({ status: 'released' }).where('id', '=', lot.id).execute();
    expect(await refused(parcel.number, lot.code, { quantity: '4' })).toContain('still to be packed');
    const other = await shop.receive(part, 5);
    expect(await refused(parcel.number, part.code)).toContain('scan the bin first');
    expect((await scanned(parcel.number, bin.code)).bin).toBe(bin.code);
    const done = await scanned(parcel.number, part.code, { bin: bin.code, quantity: '2' });
    expect(done.parcel.needs).toMatchObject([{ quantity: '3', packed: '2' }]);
    await scanned(parcel.number, other.lot.code);
    expect((await read(parcel.number)).needs).toMatchObject([{ packed: '3' }]);
  });

  it('names what is missing before it closes a parcel, and lets things be taken out again', async () => {
    const { listingId, lot } = await spare(2);
    const parcel = await open(await shop.paidOrder([{ listingId, quantity: 2 }]));
    await scanned(parcel.number, lot.code, { quantity: '1' });
    const { version, items } = await read(parcel.number);
    const closing = await bench.post(`/api/parcels/${parcel.number}/packed`, { version });
    expect((closing.body as { detail: string }).detail).toContain('Still missing: 1');
    await bench.post(`/api/parcels/${parcel.number}/items/${items[0]?.id}/taken-out`).expect(200);
    await bench.post(`/api/parcels/${parcel.number}/items/${items[0]?.id}/taken-out`).expect(404);
    expect((await read(parcel.number)).needs).toMatchObject([{ packed: '0' }]);
  });

  it('packs only what is paid', async () => {
    const { listingId } = await spare(1);
    const { number } = await shop.order([{ listingId, quantity: 1 }]);
    const answer = await bench.create('/api/parcels', { order: number }).expect(409);
    expect((answer.body as { detail: string }).detail).toContain('not paid');
    await bench.create('/api/parcels', { order: 'O-2601-999' }).expect(404);
  });

  it('is for owner and assembler; the accountant reads', async () => {
    const { listingId } = await spare(1);
    const order = await shop.paidOrder([{ listingId, quantity: 1 }]);
    const { number } = await open(order);
    const accountant = await shop.app.agentFor('accountant');
    await accountant.get(`/api/parcels/${number}`).expect(200);
    await accountant.post(`/api/parcels/${number}/scans`, { code: 'X' }).expect(403);
    await (await shop.app.agentFor('customer')).get('/api/parcels').expect(403);
    await (await shop.app.visitor()).get('/api/parcels').expect(401);
    await bench.post(`/api/parcels/${number}/scans`, { code: '' }).expect(400);
    await bench.get('/api/parcels/P-9999').expect(404);
  });
});

describe('Dispatch', () => {
  it('turns the prepayment into revenue and what left into cost of sales', async () => {
    const { part, listingId } = await tool();
    const unit = serial();
    await shop.finish(part, unit, 6_543);
    const extra = await spare(4);
    const email = 'dispatch@marsh.example';
    const order = await shop.paidOrder(
      [
        { listingId, quantity: 1 },
        { listingId: extra.listingId, quantity: 2 },
      ],
      email,
    );
    const { number } = await open(order);
    await scanned(number, unit);
    await scanned(number, extra.lot.code);
    await packed(number);
    await weighed(number);
    expect((await dispatch(number)).body).toMatchObject({ state: 'shipped', trackingCode: 'HP 123', weightG: 850 });
    // 200.00 and 2 × 100.00 for goods, 10.00 delivery; 65.43 the unit, 2 × 10.00 the spares.
    expect(await accountsOf(number)).toEqual({
      '2300': 41_000,
      '4000': -40_000,
      '4050': -1_000,
      '5000': 8_543,
      '1310': -2_000,
      '1330': -6_543,
    });
    const again = await dispatch(number);
    expect(again.status).toBe(409);
    await shop.app.runJobs();
    const mails = await mailsTo(shop.app.database.handle, email);
    expect(mails.map(({ subject }) => subject).toSorted()).toEqual(
      [`Order ${order} is on its way`, `Order ${order} is paid`].toSorted(),
    );
    expect(await violations()).toEqual([]);
    await bench.create('/api/parcels', { order }).expect(409);
    // The papers are drawn in it.
  }, 30_000);

  it('leaves no prepayment behind once everything has left', async () => {
    const row = await shop.app.database.handle
      .selectFrom('journal_line as l')
      .innerJoin('journal_entry as e', 'e.id', 'l.entry_id')
      .innerJoin('document as d', 'd.id', 'e.document_id')
      .innerJoin('order_invoice as oi', (join) => join.onTrue())
      .innerJoin('invoice as i', 'i.id', 'oi.invoice_id')
      .innerJoin('shipment as s', 's.order_id', 'oi.order_id')
      .select(sql<number>`coalesce(sum(l.credit_minor - l.debit_minor), 0)::int8`.as('left'))
      .where('l.account_code', '=', '2300')
      .where('s.status', '=', 'shipped')
      .where((where) =>
        where.or([where('d.id', '=', where.ref('i.document_id')), where('d.id', '=', where.ref('s.document_id'))]),
      )
      .executeTakeFirstOrThrow();
    expect(row.left).toBe(0);
  });

  it('draws a packing slip without prices', async () => {
    const { listingId, lot } = await spare(1);
    const { number } = await open(await shop.paidOrder([{ listingId, quantity: 1 }]));
    await scanned(number, lot.code);
    const { body, headers } = await bench.get(`/api/parcels/${number}/packing-slip`).expect(200);
    expect(headers['content-type']).toBe('application/pdf');
    expect((body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
  });

  it('never ships a pack whose own design has no passed transport test, and asks the carrier about loose cells', async () => {
    const handle = shop.app.database.handle;
    const pack = await addPart(handle, { weight: '180' });
    const kit = await addPart(handle);
    await handle
      .insertInto('part_battery')
      .values({ part_id: pack.id, kind: 'battery', chemistry: 'lithium_ion', watt_hours: '36', cell_count: 4 })
      .execute();
    await handle
      .insertInto('contents_line')
      .values({ kit_part_id: kit.id, position: 1, part_id: pack.id, quantity: '1', bag: 'A' })
      .execute();
    const { id: listingId } = await addListing(handle, { part: kit, form: 'kit' });
    const { lot } = await shop.receive(pack, 3);
    const { number } = await open(await shop.paidOrder([{ listingId, quantity: 1 }]));
    await scanned(number, lot.code);
    await packed(number);
    await weighed(number);
    const answer = await dispatch(number);
    expect(answer.status).toBe(422);
    expect((answer.body as { detail: string }).detail).toContain('never shipped');
    await handle
      .updateTable('part_battery')
      .set({ transport_test_reference: 'TS-1', transport_test_passed_on: '2026-01-10' })
      .where('part_id', '=', pack.id)
      .execute();
    expect((await read(number)).lithium).toMatchObject({ answer: 'lighter_rules', mayLeave: true });
    await handle.updateTable('part_battery').set({ kind: 'cell' }).where('part_id', '=', pack.id).execute();
    expect((await read(number)).lithium).toMatchObject({ answer: 'ask', mayLeave: false });
    expect((await dispatch(number)).status).toBe(422);
    const { version } = await read(number);
    const note = { note: 'Asked at the counter: accepted as loose cells.', version };
    await bench.post(`/api/parcels/${number}/carrier-answer`, note).expect(403);
    await (await shop.app.agentFor('owner')).post(`/api/parcels/${number}/carrier-answer`, note).expect(200);
    expect((await dispatch(number)).status).toBe(200);
    expect(await violations()).toEqual([]);
  });
});
