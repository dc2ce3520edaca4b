import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { readSerialNumber } from '@emberlot/shared/serial/serial-number';
import { addBill } from '../testing/bills.js';
import type { Agent } from '../testing/agent.js';
import { addBin, addPart, addShop, type PartRow } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { StockModule } from '../stock/stock.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { BatchDto } from './batch.dto.js';
import { BuildsModule } from './builds.module.js';
import type { PickListDto } from './picking.dto.js';

let app: TestApp;
let owner: Agent;
let assembler: Agent;
let tool: PartRow;
let module_: PartRow;
let chip: PartRow;
let otherChip: PartRow;
let screw: PartRow;

beforeAll(async () => {
  app = await startTestApp({ modules: [BuildsModule, StockModule, SuppliersModule] });
  const handle = app.database.handle;
  await addShop(handle);
  owner = await app.agentFor('owner');
  assembler = await app.agentFor('assembler');
  await owner.create('/api/suppliers', { code: 'CHIPS', name: 'Chips', currency: 'EUR' }).expect(201);
  for (const code of ['A-1', 'B-2', 'B-10']) await addBin(handle, { code });
  await addBin(handle, { code: 'Q-1', quarantine: true });
  tool = await addPart(handle, { code: 'TOOL', traced: 'single', letters: 'TL' });
  module_ = await addPart(handle, { code: 'MODULE', traced: 'delivery' });
  chip = await addPart(handle, { code: 'CHIP', traced: 'delivery' });
  otherChip = await addPart(handle, { code: 'CHIP-2', traced: 'delivery' });
  screw = await addPart(handle, { code: 'SCREW', traced: 'count' });
  await addBill(handle, module_, {
    lines: [{ part: chip, quantity: '2', alternates: [otherChip] }],
    steps: [{ title: 'Solder the chips', minutes: '4', caution: 'The iron is hot.' }],
  });
  await addBill(handle, tool, {
    lines: [
      { part: module_, quantity: '1' },
      { part: screw, quantity: '4', scrap: '10' },
    ],
    steps: [{ title: 'Close the case', minutes: '6' }],
    plan: [{ name: 'Looks whole' }],
  });
});
afterAll(() => app.close());

async function receive(part: string, quantity: string, more: object = {}): Promise<string> {
  const line = { part, quantity, bin: 'A-1', unitPrice: '1.00', held: false, ...more };
  const { body } = await owner
    .create('/api/deliveries', { supplier: 'CHIPS', deliveryNote: null, receivedOn: '2027-03-01', lines: [line] })
    .expect(201);
  return (body as { lines: { lot: string }[] }).lines[0]?.lot ?? '';
}

async function plan(quantity: number, part = 'TOOL'): Promise<BatchDto> {
  const { body } = await owner.create('/api/batches', { part, quantity, dueOn: '2027-03-20' }).expect(201);
  return body as BatchDto;
}

/** The module is built within the batch, whatever lies on the shelf. */
async function planWithin(quantity: number): Promise<BatchDto> {
  const { number, version } = await plan(quantity);
  const choice = { path: '1', fromShelf: false, version };
  return (await owner.put(`/api/batches/${number}/sub-assemblies`, choice).expect(200)).body as BatchDto;
}

async function batch(number: string): Promise<BatchDto> {
  return (await assembler.get(`/api/batches/${number}`).expect(200)).body as BatchDto;
}

async function pickList(number: string): Promise<PickListDto> {
  return (await assembler.get(`/api/batches/${number}/pick-list`).expect(200)).body as PickListDto;
}

/** Picks everything the list suggests. */
async function pickAll(number: string): Promise<void> {
  const { rows } = await pickList(number);
  const lines = rows.map(({ path, part, lot, bin, quantity }) => ({ path, part: part.code, lot, bin, quantity }));
  await assembler.create(`/api/batches/${number}/issues`, { lines }).expect(201);
}

async function withdraw(number: string): Promise<void> {
  await owner.post(`/api/batches/${number}/withdrawal`, { reason: 'Done with it' }).expect(200);
}

const detailOf = (body: unknown) => (body as { errors: { detail: string }[] }).errors[0]?.detail ?? '';

async function workInProgress(): Promise<{ account: number; batches: number }> {
  const { rows } = await sql<{ account: number; batches: number }>`
    select (select coalesce(sum(debit_minor - credit_minor), 0)::bigint from journal_line where account_code = '1320') as account,
           (select coalesce(sum(value_minor), 0)::bigint from batch_cost where component <> 'labour') as batches`.execute(
    app.database.handle,
  );
  return rows[0] ?? { account: 0, batches: 1 };
}

describe('who may', () => {
  it('lets nobody in who is not of the bench', async () => {
    const visitor = await app.visitor();
    await visitor.get('/api/batches').expect(401);
    const accountant = await app.agentFor('accountant');
    await accountant.get('/api/batches').expect(403);
    await assembler.create('/api/batches', { part: 'TOOL', quantity: 1, dueOn: '2027-03-20' }).expect(403);
    await assembler.get('/api/batches/B-9999').expect(404);
  });

  it('refuses a batch that cannot be', async () => {
    const input = { part: 'TOOL', quantity: 1, dueOn: '2027-03-20' };
    await owner.create('/api/batches', { ...input, quantity: 0 }).expect(400);
    await owner.create('/api/batches', { ...input, quantity: 1.5 }).expect(400);
    await owner.create('/api/batches', { ...input, startOn: '2027-03-21' }).expect(400);
    const unknown = await owner.create('/api/batches', { ...input, part: 'NOTHING' }).expect(400);
    expect(detailOf(unknown.body)).toBe('There is no part NOTHING.');
    const bought = await owner.create('/api/batches', { ...input, part: 'CHIP' }).expect(400);
    expect(detailOf(bought.body)).toContain('no released bill');
  });

  it('shows costs to the owner and not at the bench', async () => {
    const planned = await plan(1);
    expect(planned.cost).toBeDefined();
    expect((await batch(planned.number)).cost).toBeUndefined();
    await withdraw(planned.number);
  });
});

describe('planning', () => {
  it('builds a made component within the batch while the shelf does not hold enough of it', async () => {
    const planned = await plan(3);
    expect(planned.lines.map(({ path, part, required }) => [path, part.code, required])).toEqual([
      ['1/1', 'CHIP', '6'],
      ['2', 'SCREW', '14'],
    ]);
    expect(planned.subAssemblies).toMatchObject([{ path: '1', fromShelf: false, required: '3' }]);
    expect(planned.steps.map(({ part, title, minutes }) => [part, title, minutes])).toEqual([
      ['MODULE', 'Solder the chips', '4'],
      ['TOOL', 'Close the case', '6'],
    ]);
    expect(planned.linesShort).toBe(2);
    expect(planned.lines[0]?.missing).toBe('6');
    await withdraw(planned.number);
  });

  it('takes it from the shelf when enough is free for the whole batch, and can be told otherwise', async () => {
    await receive('MODULE', '3');
    const planned = await plan(3);
    expect(planned.lines.map(({ part }) => part.code)).toEqual(['MODULE', 'SCREW']);
    expect(planned.lines[0]).toMatchObject({ claimed: '3', missing: '0' });
    const second = await plan(3);
    expect(second.subAssemblies).toMatchObject([{ fromShelf: false }]);
    await withdraw(second.number);
    const { body } = await owner
      .put(`/api/batches/${planned.number}/sub-assemblies`, { path: '1', fromShelf: false, version: planned.version })
      .expect(200);
    expect((body as BatchDto).lines.map(({ part }) => part.code)).toEqual(['CHIP', 'SCREW']);
    await owner
      .put(`/api/batches/${planned.number}/sub-assemblies`, { path: '1', fromShelf: true, version: planned.version })
      .expect(409);
    const third = await plan(3);
    expect(third.subAssemblies).toMatchObject([{ fromShelf: true }]);
    await withdraw(third.number);
    await withdraw(planned.number);
  });

  it('claims again what was missing, and gives its claims up when withdrawn', async () => {
    const planned = await plan(10);
    expect(planned.lines.find(({ part }) => part.code === 'SCREW')?.missing).toBe('45');
    await receive('SCREW', '40');
    const { body } = await assembler.post(`/api/batches/${planned.number}/claims`).expect(200);
    const line = (body as BatchDto).lines.find(({ part }) => part.code === 'SCREW');
    expect(line).toMatchObject({ claimed: '40', missing: '5' });
    const other = await plan(1);
    expect(other.lines.find(({ part }) => part.code === 'SCREW')?.claimed).toBe('0');
    await withdraw(planned.number);
    const again = await assembler.post(`/api/batches/${other.number}/claims`).expect(200);
    expect((again.body as BatchDto).lines.find(({ part }) => part.code === 'SCREW')?.missing).toBe('0');
    await withdraw(other.number);
    await owner.post(`/api/batches/${other.number}/withdrawal`, { reason: 'Twice' }).expect(409);
  });
});

describe('picking', () => {
  it('leads through the bins in order, the oldest released lot first', async () => {
    await receive('CHIP', '1', { bin: 'B-10' });
    await receive('CHIP', '1', { bin: 'Q-1' });
    await receive('CHIP', '9', { bin: 'B-2', held: true });
    await receive('CHIP', '5', { bin: 'B-2' });
    const planned = await planWithin(4);
    const list = await pickList(planned.number);
    expect(list.rows.map(({ bin, part, quantity }) => [bin, part.code, quantity])).toEqual([
      ['A-1', 'SCREW', '18'],
      ['B-2', 'CHIP', '5'],
      ['B-10', 'CHIP', '1'],
    ]);
    expect(list.shortages.map(({ part, quantity }) => [part.code, quantity])).toEqual([['CHIP', '2']]);
    await withdraw(planned.number);
  });

  it('refuses held, rejected, expired and quarantined lots, strangers, and more than is needed', async () => {
    const held = await receive('CHIP', '5', { held: true });
    const expired = await receive('CHIP', '5', { expiresOn: '2027-02-28' });
    const quarantined = await receive('CHIP', '5', { bin: 'Q-1' });
    const good = await receive('CHIP', '20');
    const planned = await planWithin(1);
    const issue = (line: object) =>
      assembler.create(`/api/batches/${planned.number}/issues`, {
        lines: [{ path: '1/1', part: 'CHIP', bin: 'A-1', quantity: '2', ...line }],
      });
    expect(detailOf((await issue({ lot: held }).expect(400)).body)).toContain('is held');
    expect(detailOf((await issue({ lot: expired }).expect(400)).body)).toContain('expired on 2027-02-28');
    expect(detailOf((await issue({ lot: quarantined, bin: 'Q-1' }).expect(400)).body)).toContain('quarantine');
    expect(detailOf((await issue({ part: 'SCREW' }).expect(400)).body)).toBe(
      'This place takes CHIP; approved for it: CHIP-2.',
    );
    expect(detailOf((await issue({ path: '7' }).expect(400)).body)).toContain('takes nothing at this place');
    expect(detailOf((await issue({ lot: good, quantity: '3' }).expect(422)).body)).toContain('needs 2 more');
    expect(detailOf((await issue({ lot: good, quantity: '0.5' }).expect(400)).body)).not.toBe('');
    expect((await pickList(planned.number)).picked).toEqual([]);
    await withdraw(planned.number);
  });

  it('takes an approved alternate, in parts, and keeps what went in at its cost', async () => {
    const alternate = await receive('CHIP-2', '2', { unitPrice: '3.00' });
    const planned = await planWithin(1);
    const issue = (quantity: string) =>
      assembler
        .create(`/api/batches/${planned.number}/issues`, {
          lines: [{ path: '1/1', part: 'CHIP-2', lot: alternate, bin: 'A-1', quantity }],
        })
        .expect(201);
    await issue('1');
    expect((await batch(planned.number)).lines[0]).toMatchObject({ issued: '1', claimed: '1', missing: '0' });
    await issue('1');
    const now = (await owner.get(`/api/batches/${planned.number}`).expect(200)).body as BatchDto;
    expect(now.status).toBe('picking');
    expect(now.lines[0]).toMatchObject({ issued: '2', claimed: '0' });
    expect(now.cost?.held).toEqual({ amount: 600, currency: 'EUR' });
    const wip = await workInProgress();
    expect(wip.account).toBe(wip.batches);
    await owner.post(`/api/batches/${planned.number}/withdrawal`, { reason: 'No' }).expect(409);
    await assembler
      .create(`/api/batches/${planned.number}/returns`, {
        lines: [{ path: '1/1', part: 'CHIP-2', lot: alternate, bin: 'B-2', quantity: '3' }],
      })
      .expect(409);
    await assembler
      .create(`/api/batches/${planned.number}/returns`, {
        lines: [{ path: '1/1', part: 'CHIP-2', lot: alternate, bin: 'B-2', quantity: '2' }],
      })
      .expect(201);
    const after = (await owner.get(`/api/batches/${planned.number}`).expect(200)).body as BatchDto;
    expect(after.cost?.held.amount).toBe(0);
    expect(after.lines[0]).toMatchObject({ issued: '0', claimed: '2' });
    await withdraw(planned.number);
  });

  it('never goes below zero when two pick the same pieces at once', async () => {
    const part = await addPart(app.database.handle, { code: 'RARE', traced: 'delivery' });
    const made = await addPart(app.database.handle, { code: 'THING', traced: 'count' });
    await addBill(app.database.handle, made, { lines: [{ part, quantity: '1' }], steps: [] });
    const lot = await receive('RARE', '5');
    const one = await plan(5, 'THING');
    const lines = [{ path: '1', part: 'RARE', lot, bin: 'A-1', quantity: '3' }];
    const answers = await Promise.all([
      assembler.create(`/api/batches/${one.number}/issues`, { lines }),
      owner.create(`/api/batches/${one.number}/issues`, { lines }),
    ]);
    expect(answers.map(({ status }) => status).sort((one, other) => one - other)).toEqual([201, 422]);
    const two = await plan(5, 'THING');
    expect(two.lines[0]?.missing).toBe('5');
    const taken = await assembler.create(`/api/batches/${two.number}/issues`, {
      lines: [{ path: '1', part: 'RARE', lot, bin: 'A-1', quantity: '2' }],
    });
    expect(taken.status).toBe(409);
    expect(detailOf(taken.body)).toContain('promised elsewhere');
    const { rows } = await sql<{ least: string }>`select min(quantity) as least from stock_balance`.execute(
      app.database.handle,
    );
    expect(Number(rows[0]?.least)).toBeGreaterThanOrEqual(0);
  });

  it('does not pick a lot that is held in the same moment', async () => {
    const part = await addPart(app.database.handle, { code: 'DOUBT', traced: 'delivery' });
    const made = await addPart(app.database.handle, { code: 'THING-2', traced: 'count' });
    await addBill(app.database.handle, made, { lines: [{ part, quantity: '1' }] });
    const lot = await receive('DOUBT', '5');
    const one = await plan(5, 'THING-2');
    const [held, taken] = await Promise.all([
      owner.post(`/api/lots/${lot}/status`, { status: 'held', reason: 'Looks odd', version: 1 }),
      assembler.create(`/api/batches/${one.number}/issues`, {
        lines: [{ path: '1', part: 'DOUBT', lot, bin: 'A-1', quantity: '5' }],
      }),
    ]);
    expect(held.status).toBeLessThan(300);
    const moved = (await pickList(one.number)).picked.length;
    expect(moved).toBe(taken.status === 201 ? 1 : 0);
    const again = await assembler.create(`/api/batches/${one.number}/issues`, {
      lines: [{ path: '1', part: 'DOUBT', lot, bin: 'A-1', quantity: '1' }],
    });
    expect(again.status).toBeGreaterThanOrEqual(400);
  });
});

describe('building', () => {
  it('gives every unit a serial number of its own, also when batches start at once', async () => {
    await receive('CHIP', '100');
    await receive('SCREW', '100');
    const batches = [await planWithin(2), await planWithin(2), await planWithin(2)];
    for (const { number } of batches) await pickAll(number);
    await assembler.post(`/api/batches/${batches[0]?.number}/building`).expect(200);
    await Promise.all(
      batches.slice(1).map(({ number }) => assembler.post(`/api/batches/${number}/building`).expect(200)),
    );
    const opened = await Promise.all(batches.map(({ number }) => batch(number)));
    const serials = opened.flatMap(({ units }) => units.map(({ serial }) => serial));
    expect(new Set(serials).size).toBe(6);
    for (const serial of serials) expect(readSerialNumber(serial).product).toBe('TL');
    const running = opened[0]?.units.map(({ serial }) => readSerialNumber(serial).running) ?? [];
    expect(running).toEqual([running[0], (running[0] ?? 0) + 1]);
    await assembler.post(`/api/batches/${batches[0]?.number}/building`).expect(409);
  });

  it('ticks steps on one unit or on many, and takes a tick back', async () => {
    const { items } = (await assembler.get('/api/batches?status=in_build&part=TOOL').expect(200)).body as {
      items: BatchDto[];
    };
    const number = items[0]?.number ?? '';
    const serials = items[0]?.units.map(({ serial }) => serial) ?? [];
    const tick = (position: number, units: string[], done = true) =>
      assembler.put(`/api/batches/${number}/steps/${position}`, { units, done });
    await tick(1, serials).expect(200);
    await tick(1, serials).expect(200);
    await tick(2, serials.slice(0, 1)).expect(200);
    expect((await batch(number)).units.map(({ stepsDone, stepsTotal }) => [stepsDone, stepsTotal])).toEqual([
      [2, 2],
      [1, 2],
    ]);
    await tick(2, serials.slice(0, 1), false).expect(200);
    expect((await batch(number)).units[0]?.stepsDone).toBe(1);
    await tick(9, serials).expect(404);
    const other = items[1]?.units[0]?.serial ?? '';
    expect(detailOf((await tick(1, [other]).expect(400)).body)).toContain(`not of batch ${number}`);
  });

  it('keeps exactly which lot is in which unit when it is scanned', async () => {
    const { items } = (await assembler.get('/api/batches?status=in_build&part=TOOL').expect(200)).body as {
      items: BatchDto[];
    };
    const number = items[0]?.number ?? '';
    const serial = items[0]?.units[0]?.serial ?? '';
    const { picked } = await pickList(number);
    const line = picked.find(({ part, quantity }) => part.code === 'CHIP' && Number(quantity) >= 2);
    await assembler.post(`/api/units/${serial}/fitted-lots`, { path: line?.path, lot: line?.lot }).expect(204);
    await assembler.post(`/api/units/${serial}/fitted-lots`, { path: line?.path, lot: line?.lot }).expect(400);
    await assembler.post(`/api/units/${serial}/fitted-lots`, { path: line?.path, lot: 'L-9999' }).expect(400);
    const wrong = serial.replace(/\d$/, (digit) => String((Number(digit) + 1) % 10));
    await assembler.post(`/api/units/${wrong}/fitted-lots`, { path: line?.path, lot: line?.lot }).expect(400);
    const rows = await app.database.handle.selectFrom('as_built').select(['exact', 'quantity']).execute();
    expect(rows).toEqual([{ exact: true, quantity: '2.000000' }]);
  });
});
