import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { examine } from '../doctor/examine.js';
import type { Agent } from '../testing/agent.js';
import { addBill } from '../testing/bills.js';
import { addBin, addPart, addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { FaultDto, ReadingResultDto, UnitRunsDto } from '../testing/test-run.dto.js';
import { StockModule } from '../stock/stock.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { BatchDto } from './batch.dto.js';
import { BuildsModule } from './builds.module.js';
import type { PickListDto } from './picking.dto.js';

let app: TestApp;
let owner: Agent;
let assembler: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [BuildsModule, StockModule, SuppliersModule] });
  const handle = app.database.handle;
  await addShop(handle);
  owner = await app.agentFor('owner');
  assembler = await app.agentFor('assembler');
  await owner.create('/api/suppliers', { code: 'CHIPS', name: 'Chips', currency: 'EUR' }).expect(201);
  for (const code of ['A-1', 'F-1']) await addBin(handle, { code });
  await addBin(handle, { code: 'Q-1', quarantine: true });
  const chip = await addPart(handle, { code: 'CHIP', traced: 'delivery' });
  const iron = await addPart(handle, { code: 'IRON', traced: 'single', letters: 'IR' });
  const coil = await addPart(handle, { code: 'COIL', traced: 'delivery' });
  await addBill(handle, coil, { lines: [{ part: chip, quantity: '1' }], steps: [{ title: 'Wind', minutes: '3' }] });
  await addBill(handle, iron, {
    lines: [{ part: chip, quantity: '3' }],
    steps: [
      { title: 'Solder', minutes: '10', caution: 'Hot tip.' },
      { title: 'Close', minutes: '5' },
    ],
    plan: [
      { name: 'Pack current', unit: 'A', lower: '1.9', upper: '2.6', digits: 2 },
      { name: 'Insulation', unit: 'MΩ', lower: '10' },
      { name: 'Looks whole' },
    ],
  });
  const line = { part: 'CHIP', quantity: '200', bin: 'A-1', unitPrice: '0.3333', held: false };
  await owner
    .create('/api/deliveries', { supplier: 'CHIPS', deliveryNote: null, receivedOn: '2027-03-01', lines: [line] })
    .expect(201);
});
afterAll(() => app.close());
beforeEach(() => app.clock.advance({ minutes: 1 }));

const detail = (body: unknown) => (body as { detail: string }).detail;

async function batchOf(number: string): Promise<BatchDto> {
  return (await owner.get(`/api/batches/${number}`).expect(200)).body as BatchDto;
}

/** A batch with its parts picked and its units begun. */
async function begin(quantity: number, part = 'IRON'): Promise<{ number: string; serials: string[] }> {
  const planned = await owner.create('/api/batches', { part, quantity, dueOn: '2027-03-20' }).expect(201);
  const { number } = planned.body as BatchDto;
  const { rows } = (await assembler.get(`/api/batches/${number}/pick-list`).expect(200)).body as PickListDto;
  const lines = rows.map(({ path, part: { code }, lot, bin, quantity: taken }) => ({
    path,
    part: code,
    lot,
    bin,
    quantity: taken,
  }));
  await assembler.create(`/api/batches/${number}/issues`, { lines }).expect(201);
  const { body } = await assembler.post(`/api/batches/${number}/building`).expect(200);
  return { number, serials: (body as BatchDto).units.map(({ serial }) => serial) };
}

async function build(number: string, serials: readonly string[]): Promise<void> {
  for (const position of [1, 2]) {
    await assembler.put(`/api/batches/${number}/steps/${position}`, { units: serials, done: true }).expect(200);
  }
}

const at = (seconds: number) => new Date(app.clock.now().getTime() + seconds * 1000).toISOString();

function reading(serial: string, position: number, value: string | boolean, more: object = {}) {
  const typed = typeof value === 'boolean' ? { answer: value } : { reading: value };
  return assembler.post(`/api/units/${serial}/readings`, {
    run: 1,
    position,
    measuredAt: at(0),
    clientKey: randomUUID(),
    ...typed,
    ...more,
  });
}

async function measure(serial: string, current: string, run = 1): Promise<ReadingResultDto> {
  await reading(serial, 1, current, { run }).expect(200);
  await reading(serial, 2, '22', { run }).expect(200);
  return (await reading(serial, 3, true, { run }).expect(200)).body as ReadingResultDto;
}

const complete = (serial: string, bin = 'F-1') => assembler.create(`/api/units/${serial}/completion`, { bin });

async function books(): Promise<Record<string, number>> {
  const { rows } = await sql<{ code: string; balance: number }>`
    select account_code as code, sum(debit_minor - credit_minor)::bigint as balance
    from journal_line group by 1`.execute(app.database.handle);
  return Object.fromEntries(rows.map(({ code, balance }) => [code, balance]));
}

describe('a whole batch', () => {
  it('ends with nothing in work, and the shelf richer by issues and labour', async () => {
    const before = await books();
    const { number, serials } = await begin(6);
    await build(number, serials);
    const [bad = '', ...good] = serials;
    for (const serial of good) expect((await measure(serial, '2.27')).runVerdict).toBe('pass');
    const failed = await measure(bad, '2.71');
    expect(failed).toMatchObject({ verdict: 'within', runVerdict: 'fail' });
    expect(failed.fault).toMatch(/^N-\d{4}$/);
    for (const serial of good) await complete(serial).expect(201);
    expect(detail((await complete(bad).expect(422)).body)).toContain(`open fault, ${failed.fault}`);
    expect(detail((await reading(bad, 1, '2.27', { run: 2 }).expect(409)).body)).toContain(
      'before you measure it again',
    );
    const fault = (await assembler.get(`/api/faults/${failed.fault}`).expect(200)).body as FaultDto;
    expect(fault.what).toBe('Pack current: 2.71 A, allowed 1.9 to 2.6 A.');
    const work = { version: fault.version, cause: 'Cold joint', action: 'Soldered anew', minutes: '12.5' };
    await assembler.post(`/api/faults/${failed.fault}/rework`, work).expect(200);
    await assembler.post(`/api/faults/${failed.fault}/rework`, work).expect(409);
    expect(detail((await complete(bad).expect(422)).body)).toContain('has not passed');
    app.clock.advance({ minutes: 1 });
    expect((await measure(bad, '2.30', 2)).runVerdict).toBe('pass');
    await complete(bad).expect(201);
    const done = await batchOf(number);
    expect(done).toMatchObject({ status: 'done', finished: 6, scrapped: 0 });
    expect(done.cost?.held.amount).toBe(0);
    const after = await books();
    const moved = (code: string) => (after[code] ?? 0) - (before[code] ?? 0);
    // 18 chips at 0.3333; 6 times 15 minutes and 12.5 of rework at 36.00 an hour.
    expect(moved('1310')).toBe(-600);
    expect(moved('1320')).toBe(0);
    expect(moved('5100')).toBe(-(6 * 900 + 750));
    expect(moved('1330')).toBe(600 + 6 * 900 + 750);
  });

  it('spreads what a scrapped unit took over the good ones, and expenses it when there is none', async () => {
    const before = await books();
    const { number, serials } = await begin(2);
    await build(number, serials);
    const [one = '', two = ''] = serials;
    await assembler.post(`/api/units/${one}/scrapping`, { reason: 'Dropped' }).expect(204);
    await assembler.post(`/api/units/${one}/scrapping`, { reason: 'Dropped' }).expect(409);
    await measure(two, '2.27');
    await complete(two).expect(201);
    expect((await batchOf(number)).status).toBe('done');
    const between = await books();
    expect((between['1330'] ?? 0) - (before['1330'] ?? 0)).toBe(200 + 900);
    const other = await begin(1);
    await assembler.post(`/api/units/${other.serials[0]}/scrapping`, { reason: 'Dropped' }).expect(204);
    const after = await books();
    expect((after['5300'] ?? 0) - (between['5300'] ?? 0)).toBe(100);
    expect(after['1320']).toBe(before['1320'] ?? 0);
    expect((await batchOf(other.number)).status).toBe('done');
  });

  it('puts made pieces on the shelf at what they took', async () => {
    const { number } = await begin(4, 'COIL');
    const make = (quantity: number, last: boolean, bin = 'A-1') =>
      assembler.create(`/api/batches/${number}/made-pieces`, { quantity, bin, last });
    expect(detail((await make(5, false).expect(400)).body)).toContain('Only 4');
    await make(1, false, 'Q-1').expect(400);
    await make(2, false).expect(201);
    expect(await batchOf(number)).toMatchObject({ status: 'in_build', finished: 2 });
    await make(1, true).expect(201);
    const done = await batchOf(number);
    expect(done).toMatchObject({ status: 'done', finished: 3 });
    expect(done.cost?.held.amount).toBe(0);
    expect(done.cost?.materialsOut.amount).toBe(done.cost?.materialsIn.amount);
  });
});

describe('finishing a unit', () => {
  it('takes only sound ones with every step done, into a bin that is none of quarantine', async () => {
    const { number, serials } = await begin(1);
    const [serial = ''] = serials;
    expect(detail((await complete(serial).expect(422)).body)).toContain('has not passed');
    await measure(serial, '2.27');
    expect(detail((await complete(serial).expect(422)).body)).toBe(`${serial} still needs: Solder.`);
    await build(number, serials);
    await complete(serial, 'Q-1').expect(400);
    await complete(serial, 'Z-9').expect(400);
    const answers = await Promise.all([complete(serial), complete(serial)]);
    expect(answers.map(({ status }) => status).toSorted((one, other) => one - other)).toEqual([201, 409]);
    const { rows } = await sql<{ exact: boolean; quantity: string }>`
      select a.exact, a.quantity from as_built a join unit u on u.id = a.unit_id where u.serial = ${serial}`.execute(
      app.database.handle,
    );
    expect(rows).toEqual([{ exact: false, quantity: '3.000000' }]);
    await (await app.visitor()).create(`/api/units/${serial}/completion`, { bin: 'F-1' }).expect(401);
    await (await app.agentFor('accountant')).create(`/api/units/${serial}/completion`, { bin: 'F-1' }).expect(403);
  });

  it('is refused by the database too when the unit has no valid pass', async () => {
    const { serials } = await begin(1);
    const [serial = ''] = serials;
    const forced = sql`update unit set completed_at = ${app.clock.now()},
      lot_id = (select lot_id from unit where lot_id is not null limit 1) where serial = ${serial}`;
    await expect(forced.execute(app.database.handle)).rejects.toMatchObject({ constraint: 'unit_is_sound' });
  });
});

describe('readings', () => {
  it('are judged with every digit, and asked about when a unit seems to have slipped', async () => {
    const { serials } = await begin(1);
    const [serial = ''] = serials;
    await reading(serial, 1, '2.2').expect(400);
    await reading(serial, 1, 'two').expect(400);
    await reading(serial, 1, true).expect(400);
    await reading(serial, 9, '2.22').expect(400);
    await reading(serial, 1, '2.22', { measuredAt: at(3600) }).expect(400);
    await reading(serial, 1, '2.22', { measuredAt: at(-86_400) }).expect(400);
    await reading(serial, 1, '2.22', { run: 7 }).expect(409);
    const { body } = await reading(serial, 1, '2270.00').expect(422);
    expect(body).toMatchObject({ doubt: { kind: 'factor', suggestion: '2.27' } });
    const stands = (await reading(serial, 1, '2270.00', { confirmed: true }).expect(200)).body as ReadingResultDto;
    expect(stands).toMatchObject({ verdict: 'outside', runVerdict: null });
    const corrected = (await reading(serial, 1, '2.60').expect(200)).body as ReadingResultDto;
    expect(corrected.verdict).toBe('within');
    await (await app.visitor()).post(`/api/units/${serial}/readings`, {}).expect(401);
    await (await app.agentFor('accountant')).post(`/api/units/${serial}/readings`, {}).expect(403);
  });

  it('are applied once, however often and however many at once they arrive', async () => {
    const { serials } = await begin(2);
    const [serial = '', other = ''] = serials;
    const more = { clientKey: randomUUID() };
    const answers = await Promise.all(Array.from({ length: 5 }, () => reading(serial, 1, '2.27', more)));
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([200]));
    await reading(other, 1, '2.27', more).expect(422);
    const { runs } = (await assembler.get(`/api/units/${serial}/test-runs`).expect(200)).body as UnitRunsDto;
    expect(runs.map(({ readings }) => readings.length)).toEqual([1]);
  });

  it('count in the order of measuring, whatever the order of arrival', async () => {
    const { serials } = await begin(1);
    const [serial = ''] = serials;
    app.clock.advance({ minutes: 10 });
    await reading(serial, 2, '22', { measuredAt: at(-100) }).expect(200);
    await reading(serial, 3, true, { measuredAt: at(-90) }).expect(200);
    await reading(serial, 1, '2.27', { measuredAt: at(-80) }).expect(200);
    const late = await reading(serial, 1, '2.90', { measuredAt: at(-95) }).expect(200);
    expect(late.body).toMatchObject({ verdict: 'outside', runVerdict: 'pass', run: 1 });
    const later = await reading(serial, 2, '5', { measuredAt: at(-85) }).expect(200);
    expect(later.body).toMatchObject({ verdict: 'outside', runVerdict: 'fail', run: 1 });
    const { runs } = (await assembler.get(`/api/units/${serial}/test-runs`).expect(200)).body as UnitRunsDto;
    expect(runs.map(({ readings }) => readings.map(({ reading: typed, replaced }) => [typed, replaced]))).toEqual([
      [
        ['2.27', false],
        ['2.90', true],
        ['5', false],
        ['22', true],
        [null, false],
      ],
    ]);
  });

  it('make the run that was measured last count, not the one that arrived last', async () => {
    const { number, serials } = await begin(1);
    const [serial = ''] = serials;
    await build(number, serials);
    await measure(serial, '2.27');
    const { body } = await assembler.create(`/api/units/${serial}/faults`, { what: 'Rattles', step: 2 }).expect(201);
    const fault = body as FaultDto;
    expect(fault).toMatchObject({ step: 'Close', outcome: null });
    expect(detail((await complete(serial).expect(422)).body)).toContain('open fault');
    const work = { version: fault.version, cause: 'Loose screw', action: 'Tightened', minutes: '2' };
    await assembler.post(`/api/faults/${fault.number}/rework`, work).expect(200);
    const { runs } = (await assembler.get(`/api/units/${serial}/test-runs`).expect(200)).body as UnitRunsDto;
    expect(runs[0]).toMatchObject({ verdict: 'pass', voidReason: `Reworked for ${fault.number}` });
    expect(detail((await complete(serial).expect(422)).body)).toContain('has not passed');
    app.clock.advance({ seconds: 1 });
    await measure(serial, '2.28', 2);
    await complete(serial).expect(201);
  });
});

describe('faults', () => {
  it('are listed with how many passed the first time', async () => {
    const { body } = await assembler.get('/api/faults?open=false').expect(200);
    expect((body as { total: number }).total).toBeGreaterThanOrEqual(2);
    const yields = (await owner.get('/api/first-passes').expect(200)).body as { items: object[] };
    const { rows } = await sql<{ count: number }>`
      select count(distinct unit_id)::int8 as count from test_run where verdict is not null`.execute(
      app.database.handle,
    );
    expect(yields.items).toEqual([
      { part: 'IRON', name: expect.any(String), measured: rows[0]?.count, passed: expect.any(Number) },
    ]);
    await (await app.agentFor('accountant')).get('/api/faults').expect(403);
  });
});

it('leaves every rule of the shop kept', async () => {
  const findings = await examine(app.database.handle, app.clock.now());
  expect(findings.flatMap(({ violations }) => violations)).toEqual([]);
});
