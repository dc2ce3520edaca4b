import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { PartsModule } from '../parts/parts.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { Agent } from '../testing/agent.js';
import { addBin, addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { PartItemDto } from './part-list.dto.js';
import type { PartStoryDto } from './part-story.dto.js';
import { ReservationsService } from './reservations.service.js';
import type { ShelfQueueDto } from './shelf-queue.dto.js';
import { ShelfQueueService } from './shelf-queue.service.js';
import { StockModule } from './stock.module.js';

let app: TestApp;
let owner: Agent;
let assembler: Agent;

const part = (code: string, name: string, more: object = {}) => ({
  code,
  name,
  measure: 'piece',
  traced: 'delivery',
  parameters: [],
  suppliers: [],
  ...more,
});

const lines = [
  { part: 'R-10K', quantity: '100', bin: 'A-1', unitPrice: '0.02', held: false },
  { part: 'R-22K', quantity: '5', bin: 'A-1', unitPrice: '0.02', held: false },
  { part: 'CELL', quantity: '40', bin: 'B-1', unitPrice: '3.00', held: true },
  { part: 'CELL', quantity: '20', bin: 'A-1', unitPrice: '3.00', held: false, expiresOn: '2027-03-10' },
];

beforeAll(async () => {
  app = await startTestApp({ modules: [StockModule, PartsModule, SuppliersModule] });
  await addShop(app.database.handle);
  owner = await app.agentFor('owner');
  assembler = await app.agentFor('assembler');
  await owner.create('/api/suppliers', { code: 'PARTS', name: 'Parts & Co', currency: 'EUR' }).expect(201);
  for (const code of ['A-1', 'B-1']) await addBin(app.database.handle, { code });
  const resistance = (value: string) => [{ name: 'Resistance', value, unit: 'kΩ' }];
  const suppliers = [{ supplier: 'PARTS', preferred: true }];
  await owner.create('/api/parts', part('R-10K', 'Resistor', { parameters: resistance('10'), suppliers })).expect(201);
  await owner
    .create('/api/parts', part('R-22K', 'Resistor', { parameters: resistance('22'), suppliers, reorderPoint: '50' }))
    .expect(201);
  await owner.create('/api/parts', part('CELL', 'Cell 18650, 2.5 Ah')).expect(201);
  await owner.create('/api/parts', part('OLD', 'Capacitor of old')).expect(201);
  await owner.post('/api/parts/OLD/retire', { version: 1 }).expect(200);
  await owner.create('/api/deliveries', { supplier: 'PARTS', receivedOn: '2027-03-01', lines }).expect(201);
});
afterAll(() => app.close());

const list = async (query: string, agent = owner) =>
  ((await agent.get(`/api/parts?${query}`).expect(200)).body as { items: PartItemDto[]; total: number }).items;
const codes = async (query: string) => (await list(query)).map(({ code }) => code);

/** A need for a quantity of a part, with a claim on the shelf for some of it. */
async function claim(code: string, needed: number, claimed: number): Promise<void> {
  const reservations = app.get(ReservationsService);
  const { id: partId } = await app.database.handle
    .selectFrom('part')
    .select('id')
    .where('code', '=', code)
    .executeTakeFirstOrThrow();
  await app.transaction(async (trx) => {
    const demand = {
      kind: 'batch_line' as const,
      partId,
      quantity: new Decimal(needed),
      neededOn: '2027-03-20',
      reference: 'B-7',
    };
    const [demandId] = await reservations.open(trx, [demand]);
    if (demandId === undefined) throw new Error('no demand');
    await reservations.claim(trx, [
      { demandId, partId, quantity: new Decimal(claimed), supply: { kind: 'shelf' }, expiresAt: null },
    ]);
  });
}

describe('the list of parts', () => {
  it('shows what lies, what is held, claimed and free, and what it costs', async () => {
    expect(await codes('')).toEqual(['CELL', 'R-10K', 'R-22K']);
    const [cell] = await list('q=cell');
    expect(cell).toMatchObject({
      onShelf: '60',
      usable: '20',
      held: '40',
      claimed: '0',
      free: '20',
      short: null,
      belowReorderPoint: false,
      lastsDays: null,
      averageCost: '3',
      value: { amount: 18_000, currency: 'EUR' },
      bins: ['A-1', 'B-1'],
    });
    expect(JSON.stringify(await list('', assembler))).not.toMatch(/averageCost|value/);
  });

  it('forgives typing, and finds words in codes, names and parameters', async () => {
    expect(await codes('q=resitor')).toEqual(['R-10K', 'R-22K']);
    expect(await codes('q=22k')).toEqual(['R-22K']);
    expect(await codes(`q=${encodeURIComponent('resistor 10kΩ')}`)).toEqual(['R-10K']);
    expect(await codes('q=r-2')).toEqual(['R-22K']);
    expect(await codes(`q=${encodeURIComponent('%')}`)).toEqual([]);
    expect(await codes(`q=${encodeURIComponent("'; drop table part; --")}`)).toEqual([]);
  });

  it('narrows by bin, supplier, way of following, what runs short and what is retired', async () => {
    expect(await codes('bin=b-1')).toEqual(['CELL']);
    expect(await codes('supplier=PARTS&sort=-code')).toEqual(['R-22K', 'R-10K']);
    expect(await codes('traced=single')).toEqual([]);
    expect(await codes('short=true')).toEqual(['R-22K']);
    expect(await codes('retired=true')).toEqual(['OLD']);
    for (const sort of ['code', 'name', '-onShelf', 'claimed', '-averageCost', 'value', 'reorderPoint']) {
      expect(await codes(`sort=${sort}`)).toHaveLength(3);
    }
    expect((await codes('sort=-onShelf'))[0]).toBe('R-10K');
    await owner.get('/api/parts?sort=password').expect(400);
    await owner.get('/api/parts?short=perhaps').expect(400);
    await owner.get('/api/parts?pageSize=100000').expect(400);
    await (await app.visitor()).get('/api/parts').expect(401);
    await (await app.agentFor('customer')).get('/api/parts').expect(403);
  });
});

describe('one part’s story', () => {
  it('tells where it lies, who claims it, what moved and where it is used', async () => {
    await claim('CELL', 30, 15);
    const story = (await owner.get('/api/parts/cell').expect(200)).body as PartStoryDto;
    expect(story.part).toMatchObject({ code: 'CELL', moved: true });
    expect(story.places).toMatchObject([
      { bin: 'B-1', status: 'held', quantity: '40', supplier: 'PARTS' },
      { bin: 'A-1', status: 'released', quantity: '20', expiresOn: '2027-03-10', expired: false },
    ]);
    expect(story.claims).toEqual([
      {
        reference: 'B-7',
        kind: 'batch_line',
        neededOn: '2027-03-20',
        needed: '30',
        claimed: '15',
        awaited: '0',
        missing: '15',
      },
    ]);
    expect(story.figures).toMatchObject({ claimed: '15', free: '5', averageCost: '3' });
    expect(story.moves.map(({ quantity }) => quantity)).toEqual(['20', '40']);
    const seen = await assembler.get('/api/parts/CELL').expect(200);
    expect(JSON.stringify(seen.body)).not.toMatch(/averageCost|"value"|currency|EUR/);
    await owner.get('/api/parts/NONE').expect(404);
    await (await app.agentFor('customer')).get('/api/parts/CELL').expect(403);
  });

  it('keeps measure and way of following once something has moved', async () => {
    const { part: cell } = (await owner.get('/api/parts/CELL')).body as PartStoryDto;
    const { id: _id, moved: _moved, retiredOn: _retiredOn, ...input } = cell;
    const refused = await owner.put('/api/parts/CELL', { ...input, measure: 'm' }).expect(400);
    expect(refused.body).toMatchObject({ errors: [{ pointer: '/measure' }] });
    const traced = await owner.put('/api/parts/CELL', { ...input, traced: 'count' }).expect(400);
    expect(traced.body).toMatchObject({ errors: [{ pointer: '/traced' }] });
    await owner.put('/api/parts/CELL', { ...input, name: 'Cell 18650, 2.6 Ah' }).expect(200);
    const change = app.database.handle.updateTable('part').set({ measure: 'm' }).where('code', '=', 'CELL').execute();
    await expect(change).rejects.toThrow(/stay/);
  });
});

describe('the shelf’s queue', () => {
  it('names held lots, parts that run short, most urgent first, and lots that expire', async () => {
    const before = (await assembler.get('/api/shelf-queue').expect(200)).body as ShelfQueueDto;
    expect(before.heldLots).toMatchObject([{ part: 'CELL', quantity: '40', bins: ['B-1'], supplier: 'PARTS' }]);
    expect(before.shortParts).toMatchObject([
      { part: 'R-22K', free: '5', reorderPoint: '50', short: null, supplier: 'PARTS' },
    ]);
    expect(before.expiringLots).toMatchObject([
      { part: 'CELL', quantity: '20', expiresOn: '2027-03-10', expired: false },
    ]);
    const lot = before.expiringLots[0]?.lot;
    await owner.post(`/api/lots/${lot}/status`, { status: 'held', reason: 'Dented.', version: 1 }).expect(200);
    app.clock.advance({ days: 10 });
    const after = await app.get(ShelfQueueService).read();
    app.clock.advance({ days: -10 });
    expect(after.shortParts.map(({ part, short }) => [part, short])).toEqual([
      ['CELL', '15'],
      ['R-22K', null],
    ]);
    expect(after.heldLotCount).toBe(2);
    expect(after.expiringLots[0]?.expired).toBe(true);
    await (await app.agentFor('customer')).get('/api/shelf-queue').expect(403);
  });
});

describe('the value of the shelf', () => {
  it('is the sum of its parts and what the stock accounts carry', async () => {
    const { body } = await (await app.agentFor('accountant')).get('/api/stock-value').expect(200);
    expect(body).toMatchObject({
      total: 3,
      shelfValue: { amount: 18_210, currency: 'EUR' },
      accountsBalance: { amount: 18_210, currency: 'EUR' },
      items: [
        { part: 'CELL', quantity: '60', averageCost: '3', account: '1310' },
        { part: 'R-10K', value: { amount: 200 } },
        { part: 'R-22K', value: { amount: 10 } },
      ],
    });
    await assembler.get('/api/stock-value').expect(403);
    await (await app.visitor()).get('/api/stock-value').expect(401);
  });
});
