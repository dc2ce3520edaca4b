import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { Agent } from '../testing/agent.js';
import { addBin, addPart, addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { StockModule } from './stock.module.js';

let app: TestApp;
let owner: Agent;
let assembler: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [StockModule, SuppliersModule] });
  const handle = app.database.handle;
  await addShop(handle);
  owner = await app.agentFor('owner');
  assembler = await app.agentFor('assembler');
  await owner.create('/api/suppliers', { code: 'CELLS', name: 'Cells', currency: 'EUR' }).expect(201);
  await addPart(handle, { code: 'CELL', traced: 'delivery' });
  await addPart(handle, { code: 'SCREW', traced: 'count' });
  await addPart(handle, { code: 'WIRE', traced: 'delivery', measure: 'm' });
  await addPart(handle, { code: 'TOOL', traced: 'single' });
  for (const code of ['A-1', 'A-2', 'B-1']) await addBin(handle, { code });
  await addBin(handle, { code: 'Q-1', quarantine: true });
});
afterAll(() => app.close());

const line = (part: string, quantity: string, more: object = {}) => ({
  part,
  quantity,
  bin: 'A-1',
  unitPrice: '1.00',
  held: false,
  ...more,
});
const delivery = (...lines: object[]) => ({ supplier: 'CELLS', deliveryNote: 'DN 7', receivedOn: '2027-03-01', lines });

interface Delivery {
  number: string;
  lines: { part: string; lot: string; quantity: string; value?: { amount: number } }[];
  value?: { amount: number };
}

async function receive(...lines: object[]): Promise<Delivery> {
  const { body } = await owner.create('/api/deliveries', delivery(...lines)).expect(201);
  return body as Delivery;
}

const lotOf = async (part: string, quantity: string, more: object = {}) =>
  (await receive(line(part, quantity, more))).lines[0]?.lot ?? '';

const pointersOf = (body: unknown) => (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer);

async function accounts(): Promise<Record<string, number>> {
  const { rows } = await sql<{ code: string; balance: number }>`
    select account_code as code, sum(debit_minor - credit_minor)::bigint as balance
    from journal_line group by 1`.execute(app.database.handle);
  return Object.fromEntries(rows.map(({ code, balance }) => [code, balance]));
}

async function change(work: () => Promise<unknown>): Promise<Record<string, number>> {
  const before = await accounts();
  await work();
  const after = await accounts();
  return Object.fromEntries(
    Object.entries(after)
      .map(([code, balance]) => [code, balance - (before[code] ?? 0)] as const)
      .filter(([, moved]) => moved !== 0),
  );
}

async function agreement(): Promise<{ shelf: number; accounts: number }> {
  const { rows } = await sql<{ shelf: number; accounts: number }>`
    select (select coalesce(sum(value_minor), 0)::bigint from cost_pool) as shelf,
           (select coalesce(sum(debit_minor - credit_minor), 0)::bigint from journal_line l
              join account a on a.code = l.account_code and a.is_stock) as accounts`.execute(app.database.handle);
  return rows[0] ?? { shelf: 0, accounts: 1 };
}

describe('receiving a delivery', () => {
  it('makes lots with their origin, puts them into bins and posts what they are worth', async () => {
    const posted = await change(async () => {
      const { number, lines, value } = await receive(
        line('CELL', '40', { unitPrice: '3.125', supplierLot: 'S-77', held: true, expiresOn: '2029-03-01' }),
        line('SCREW', '1000', { unitPrice: null, lineValueMinor: 1_999, bin: 'B-1' }),
      );
      expect(number).toMatch(/^R-\d{4}$/);
      expect(value).toEqual({ amount: 14_499, currency: 'EUR' });
      expect(lines).toMatchObject([
        { part: 'CELL', lotStatus: 'held', supplierLot: 'S-77', bin: 'A-1', quantity: '40', unitCost: '3.125' },
        { part: 'SCREW', lotStatus: 'released', supplierLot: null, bin: 'B-1', quantity: '1000' },
      ]);
      const lot = await owner.get(`/api/lots/${lines[0]?.lot.toLowerCase()}`).expect(200);
      expect(lot.body).toMatchObject({
        part: 'CELL',
        supplier: 'CELLS',
        origin: number,
        status: 'held',
        expiresOn: '2029-03-01',
        expired: false,
        places: [{ bin: 'A-1', quantity: '40', quarantine: false }],
        moves: [{ document: number, quantity: '40', reason: 'receipt', reversible: true }],
      });
    });
    expect(posted).toEqual({ '1310': 14_499, '2100': -14_499 });
  });

  it('keeps what comes by count in one standing lot', async () => {
    const first = await lotOf('SCREW', '10');
    const second = await lotOf('SCREW', '20', { bin: 'A-2' });
    expect(first).toBe(second);
  });

  it('takes effect once however often it is sent', async () => {
    const key = randomUUID();
    const body = delivery(line('CELL', '1'));
    const answers = await Promise.all([1, 2, 3].map(() => owner.create('/api/deliveries', body, key)));
    expect(new Set(answers.map((answer) => (answer.body as Delivery).number)).size).toBe(1);
    await owner.create('/api/deliveries', delivery(line('CELL', '2')), key).expect(422);
  });

  it('shows assemblers no prices, and leaves receiving to the owner', async () => {
    const { number } = await receive(line('CELL', '1'));
    const { body } = await assembler.get(`/api/deliveries/${number}`).expect(200);
    expect(JSON.stringify(body)).not.toMatch(/value|unitCost|amount/);
    const list = await assembler.get('/api/deliveries?q=DN%207').expect(200);
    expect(JSON.stringify(list.body)).not.toMatch(/value|amount/);
    await assembler.create('/api/deliveries', delivery(line('CELL', '1'))).expect(403);
    await (await app.visitor()).get('/api/deliveries').expect(401);
    await (await app.agentFor('customer')).get(`/api/deliveries/${number}`).expect(403);
    await owner.get('/api/deliveries/R-9999').expect(404);
  });

  it.each<[string, object, string[]]>([
    ['an unknown part', line('NONE', '1'), ['/lines/0/part']],
    ['an unknown bin', line('CELL', '1', { bin: 'Z-9' }), ['/lines/0/bin']],
    ['a part followed one by one', line('TOOL', '1'), ['/lines/0/part']],
    ['nothing', line('CELL', '0'), ['/lines/0/quantity']],
    ['less than nothing', line('CELL', '-1'), ['/lines/0/quantity']],
    ['half a piece', line('CELL', '0.5'), ['/lines/0/quantity']],
    ['too many decimals', line('WIRE', '0.1234567'), ['/lines/0/quantity']],
    ['more than can be', line('CELL', '1000000000'), ['/lines/0/quantity']],
    ['a huge number', line('CELL', '1'.repeat(40)), ['/lines/0/quantity']],
    ['neither price nor value', line('CELL', '1', { unitPrice: null }), ['/lines/0/unitPrice']],
    ['both price and value', line('CELL', '1', { lineValueMinor: 5 }), ['/lines/0/unitPrice']],
    [
      'a lot of screws',
      line('SCREW', '1', { held: true, supplierLot: 'x' }),
      ['/lines/0/held', '/lines/0/supplierLot'],
    ],
    ['a price with a comma', line('CELL', '1', { unitPrice: '1,5' }), ['/lines/0/unitPrice']],
  ])('refuses %s beside the field, and keeps nothing', async (_what, refused, pointers) => {
    const before = await app.database.handle.selectFrom('document').select('id').execute();
    const { body } = await owner.create('/api/deliveries', delivery(refused)).expect(400);
    expect(pointersOf(body)).toEqual(pointers);
    expect(await app.database.handle.selectFrom('document').select('id').execute()).toHaveLength(before.length);
  });

  it('refuses what has not come yet, from nobody, or without a line', async () => {
    const later = await owner.create('/api/deliveries', { ...delivery(line('CELL', '1')), receivedOn: '2027-03-02' });
    expect(pointersOf(later.body)).toEqual(['/receivedOn']);
    const nobody = await owner.create('/api/deliveries', { ...delivery(line('CELL', '1')), supplier: 'NONE' });
    expect(pointersOf(nobody.body)).toEqual(['/supplier']);
    expect(pointersOf((await owner.create('/api/deliveries', delivery()).expect(400)).body)).toEqual(['/lines']);
  });
});

describe('moving between bins', () => {
  it('moves no value and cannot take what is not there', async () => {
    const lot = await lotOf('WIRE', '12.5', { unitPrice: '0.1714' });
    const move = (quantity: string) => ({ lines: [{ part: 'WIRE', lot, bin: 'A-1', toBin: 'A-2', quantity }] });
    expect(await change(() => assembler.create('/api/stock-transfers', move('2.5')).expect(201))).toEqual({});
    const { body } = await assembler.get(`/api/lots/${lot}`).expect(200);
    expect(body).toMatchObject({
      quantity: '12.5',
      places: [
        { bin: 'A-1', quantity: '10' },
        { bin: 'A-2', quantity: '2.5' },
      ],
    });
    const refused = await assembler.create('/api/stock-transfers', move('10.000001')).expect(409);
    expect(refused.body).toMatchObject({ code: 'not_enough_stock', errors: [{ pointer: '/lines/0/quantity' }] });
    const twice = { lines: [...move('6').lines, ...move('6').lines] };
    expect(pointersOf((await assembler.create('/api/stock-transfers', twice).expect(409)).body)).toEqual([
      '/lines/1/quantity',
    ]);
  });

  it('needs a lot where there are lots, and another bin', async () => {
    const base = { part: 'WIRE', bin: 'A-1', toBin: 'A-2', quantity: '1' };
    const none = await owner.create('/api/stock-transfers', { lines: [base] }).expect(400);
    expect(pointersOf(none.body)).toEqual(['/lines/0/lot']);
    const other = await owner
      .create('/api/stock-transfers', { lines: [{ ...base, lot: await lotOf('CELL', '1') }] })
      .expect(400);
    expect(pointersOf(other.body)).toEqual(['/lines/0/lot']);
    const same = await owner.create('/api/stock-transfers', { lines: [{ ...base, toBin: 'A-1' }] }).expect(400);
    expect(pointersOf(same.body)).toEqual(['/lines/0/toBin']);
    await (await app.agentFor('accountant')).create('/api/stock-transfers', { lines: [base] }).expect(403);
    await (await app.visitor()).create('/api/stock-transfers', { lines: [base] }).expect(401);
  });
});

describe('adjusting', () => {
  const adjust = (agent: Agent, reason: string, ...lines: object[]) =>
    agent.create('/api/stock-adjustments', { reason, note: 'Seen at the shelf.', lines });

  it('books what was found, lost and damaged where it belongs', async () => {
    const lot = await lotOf('CELL', '10', { unitPrice: '2.00', bin: 'B-1' });
    const average = await app.database.handle
      .selectFrom('cost_pool as c')
      .innerJoin('part as p', 'p.id', 'c.part_id')
      .where('p.code', '=', 'CELL')
      .select(['c.quantity', 'c.value_minor as value'])
      .executeTakeFirstOrThrow();
    const each = average.value / Number(average.quantity);
    const of = (quantity: string) => ({ part: 'CELL', lot, bin: 'B-1', quantity });
    const lost = await change(() => adjust(assembler, 'lost', of('1')).expect(201));
    expect(lost['5200']).toBeCloseTo(each, -1);
    expect(lost['1310']).toBe(-(lost['5200'] ?? 0));
    const damaged = await change(() => adjust(assembler, 'damaged', of('2')).expect(201));
    expect(Object.keys(damaged)).toEqual(['1310', '5300']);
    const found = await change(() => adjust(owner, 'found', { ...of('1'), unitCost: '2.50' }).expect(201));
    expect(found).toEqual({ '1310': 250, '5200': -250 });
    expect((await owner.get(`/api/lots/${lot}`)).body).toMatchObject({ quantity: '8' });
    expect(await agreement()).toMatchObject({ shelf: (await agreement()).accounts });
  });

  it('lets the record follow a count, in either direction at once', async () => {
    const lot = await lotOf('WIRE', '5', { bin: 'B-1' });
    await lotOf('SCREW', '7', { bin: 'Q-1' });
    const counted = await change(() =>
      adjust(
        owner,
        'counted',
        { part: 'WIRE', lot, bin: 'B-1', quantity: '4.75' },
        { part: 'SCREW', bin: 'Q-1', quantity: '9' },
      ).expect(201),
    );
    expect(Object.keys(counted)).toEqual(['1310', '5200']);
    const { body } = await owner.get('/api/bins/B-1').expect(200);
    expect((body as { contents: { lot: string }[] }).contents.find((row) => row.lot === lot)).toMatchObject({
      quantity: '4.75',
    });
    const agreed = await adjust(owner, 'counted', { part: 'WIRE', lot, bin: 'B-1', quantity: '4.75' }).expect(422);
    expect((agreed.body as { code: string }).code).toBe('rule_broken');
    const twice = { part: 'WIRE', lot, bin: 'B-1', quantity: '1' };
    expect(pointersOf((await adjust(owner, 'counted', twice, twice).expect(400)).body)).toEqual(['/lines/1/part']);
  });

  it('asks for a reason, and for no cost where none belongs', async () => {
    const lot = await lotOf('CELL', '1');
    const one = { part: 'CELL', lot, bin: 'A-1', quantity: '1' };
    await adjust(owner, 'because', one).expect(400);
    await owner.create('/api/stock-adjustments', { reason: 'lost', note: '', lines: [one] }).expect(400);
    expect(pointersOf((await adjust(owner, 'lost', { ...one, unitCost: '1' }).expect(400)).body)).toEqual([
      '/lines/0/unitCost',
    ]);
    expect(pointersOf((await adjust(assembler, 'found', { ...one, unitCost: '1' }).expect(400)).body)).toEqual([
      '/lines/0/unitCost',
    ]);
    await adjust(owner, 'lost', { ...one, quantity: '2' }).expect(409);
    await adjust(await app.agentFor('accountant'), 'lost', one).expect(403);
  });
});

describe('a lot’s status', () => {
  it('changes with a reason, from the version that was seen, and is kept', async () => {
    const lot = await lotOf('CELL', '5');
    const say = (agent: Agent, status: string, version: number) =>
      agent.post(`/api/lots/${lot}/status`, { status, reason: 'Wrappers look torn.', version });
    const held = await say(assembler, 'held', 1).expect(200);
    expect(held.body).toMatchObject({ status: 'held', version: 2, statusChanges: [{ from: 'released', to: 'held' }] });
    await say(owner, 'rejected', 1).expect(409);
    await say(owner, 'held', 2).expect(409);
    await say(owner, 'rejected', 2).expect(200);
    await owner.post(`/api/lots/${lot}/status`, { status: 'released', reason: ' ', version: 3 }).expect(400);
    await say(await app.agentFor('accountant'), 'held', 3).expect(403);
    await owner.post('/api/lots/L-99999/status', { status: 'held', reason: 'x', version: 1 }).expect(404);
    const list = await owner.get('/api/lots?status=rejected').expect(200);
    expect(list.body).toMatchObject({ total: 1, items: [{ code: lot }] });
  });

  it('does not exist for what is followed by count', async () => {
    const lot = await lotOf('SCREW', '1');
    const refused = await owner
      .post(`/api/lots/${lot}/status`, { status: 'held', reason: 'Rust.', version: 1 })
      .expect(422);
    expect((refused.body as { detail: string }).detail).toContain('quarantine');
  });
});

describe('reversing', () => {
  const reverse = (number: string, agent = owner) =>
    agent.create(`/api/stock-documents/${number}/reversal`, { reason: 'Typed the wrong delivery.' });

  it('takes a delivery back as if it had never come', async () => {
    const before = await accounts();
    const received = await receive(line('CELL', '3', { unitPrice: '9.99' }), line('SCREW', '5'));
    const { body } = await reverse(received.number).expect(201);
    expect((body as { number: string }).number).toMatch(/^[A-Z]{1,2}-\d{4}$/);
    expect(await accounts()).toEqual(before);
    expect((await owner.get(`/api/deliveries/${received.number}`)).body).toMatchObject({
      reversedBy: (body as { number: string }).number,
    });
    await reverse(received.number).expect(409);
    await reverse((body as { number: string }).number).expect(422);
  });

  it('takes a transfer and an adjustment back', async () => {
    const lot = await lotOf('WIRE', '4');
    const before = await accounts();
    const moved = await owner
      .create('/api/stock-transfers', { lines: [{ part: 'WIRE', lot, bin: 'A-1', toBin: 'B-1', quantity: '3' }] })
      .expect(201);
    const lost = await owner
      .create('/api/stock-adjustments', {
        reason: 'damaged',
        note: 'Kinked.',
        lines: [{ part: 'WIRE', lot, bin: 'A-1', quantity: '1' }],
      })
      .expect(201);
    await reverse((lost.body as { number: string }).number).expect(201);
    await reverse((moved.body as { number: string }).number).expect(201);
    expect(await accounts()).toEqual(before);
    expect((await owner.get(`/api/lots/${lot}`)).body).toMatchObject({ places: [{ bin: 'A-1', quantity: '4' }] });
  });

  it('is refused once some of it has gone elsewhere', async () => {
    const received = await receive(line('WIRE', '4'));
    const lot = received.lines[0]?.lot;
    await owner
      .create('/api/stock-transfers', { lines: [{ part: 'WIRE', lot, bin: 'A-1', toBin: 'B-1', quantity: '1' }] })
      .expect(201);
    expect((await reverse(received.number).expect(409)).body).toMatchObject({ code: 'not_enough_stock' });
    await reverse('R-9999').expect(404);
    await reverse(received.number, assembler).expect(403);
  });

  it('books what the average cannot give back as a difference', async () => {
    await addPart(app.database.handle, { code: 'MIX', traced: 'delivery' });
    const cheap = await lotOf('MIX', '10', { unitPrice: '0.10' });
    const dear = await receive(line('MIX', '10', { unitPrice: '20.00' }));
    await owner
      .create('/api/stock-adjustments', {
        reason: 'lost',
        note: 'Gone.',
        lines: [{ part: 'MIX', lot: cheap, bin: 'A-1', quantity: '9' }],
      })
      .expect(201);
    const moved = await change(() => reverse(dear.number).expect(201));
    expect(moved['2100']).toBe(20_000);
    expect((moved['1310'] ?? 0) + (moved['5200'] ?? 0)).toBe(-20_000);
    const { shelf, accounts: posted } = await agreement();
    expect(shelf).toBe(posted);
  });

  it('happens once when two ask at the same time', async () => {
    const { number } = await receive(line('CELL', '2'));
    const answers = await Promise.all([reverse(number), reverse(number)]);
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201, 409]));
  });
});

describe('the lists of the shelf', () => {
  it('find moves by part, day and reason, without values for assemblers', async () => {
    const { body } = await owner
      .get('/api/stock-moves?part=cell&reason=receipt&from=2027-03-01&pageSize=2')
      .expect(200);
    expect((body as { items: { part: string; value: object }[] }).items).toHaveLength(2);
    expect((body as { items: { part: string; value: object }[] }).items[0]).toMatchObject({
      part: 'CELL',
      reason: 'receipt',
    });
    expect(JSON.stringify((await assembler.get('/api/stock-moves').expect(200)).body)).not.toMatch(/"value"/);
    await owner.get('/api/stock-moves?sort=drop').expect(400);
    await owner.get('/api/stock-moves?from=2027-02-30').expect(400);
    await (await app.agentFor('customer')).get('/api/stock-moves').expect(403);
  });

  it('find lots by bin, supplier and what expires', async () => {
    const soon = await lotOf('CELL', '1', { expiresOn: '2027-03-20' });
    const { body } = await owner.get('/api/lots?expiring=true').expect(200);
    expect(body).toMatchObject({ total: 1, items: [{ code: soon, expired: false, bins: ['A-1'] }] });
    await owner.get('/api/lots?bin=A-1&supplier=CELLS&part=CELL&sort=-quantity&q=s-77').expect(200);
    await (await app.visitor()).get('/api/lots').expect(401);
    await (await app.agentFor('customer')).get(`/api/lots/${soon}`).expect(403);
  });
});

describe('bins', () => {
  it('are added, edited, and retired when empty', async () => {
    const { body } = await owner.create('/api/bins', { code: 'c-7', name: 'Drawer', quarantine: false }).expect(201);
    expect(body).toMatchObject({ code: 'C-7', contents: [], retired: false });
    expect(
      pointersOf((await owner.create('/api/bins', { code: 'C-7', name: '', quarantine: false }).expect(409)).body),
    ).toEqual(['/code']);
    await owner.put('/api/bins/C-7', { code: 'C-7', name: 'Left drawer', quarantine: false, version: 1 }).expect(200);
    await owner.put('/api/bins/C-7', { code: 'C-7', name: 'Right drawer', quarantine: false, version: 1 }).expect(409);
    const lot = await lotOf('WIRE', '1', { bin: 'C-7' });
    await owner.post('/api/bins/C-7/retire', { version: 2 }).expect(409);
    await owner
      .create('/api/stock-transfers', { lines: [{ part: 'WIRE', lot, bin: 'C-7', toBin: 'A-1', quantity: '1' }] })
      .expect(201);
    await owner.post('/api/bins/C-7/retire', { version: 2 }).expect(200);
    const into = await owner.create('/api/deliveries', delivery(line('WIRE', '1', { bin: 'C-7' }))).expect(400);
    expect(pointersOf(into.body)).toEqual(['/lines/0/bin']);
    const list = await owner.get('/api/bins?q=c-7').expect(200);
    expect((list.body as { total: number }).total).toBe(0);
    await owner.post('/api/bins/C-7/bring-back', { version: 3 }).expect(200);
    await assembler.create('/api/bins', { code: 'D-1', name: '', quarantine: false }).expect(403);
    await (await app.visitor()).get('/api/bins').expect(401);
    await owner.get('/api/bins/NOPE').expect(404);
  });
});
