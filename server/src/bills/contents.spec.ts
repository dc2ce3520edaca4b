import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { addPart } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { BillsModule } from './bills.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [BillsModule] });
  owner = await app.agentFor('owner');
  const handle = app.database.handle;
  await addPart(handle, { code: 'KIT', name: 'Iron as a kit' });
  await addPart(handle, { code: 'KIT-2' });
  await addPart(handle, { code: 'SCREW', weight: '0.35' });
  await addPart(handle, { code: 'BOARD', weight: '12.5' });
  await addPart(handle, { code: 'WIRE', measure: 'm', weight: '2.4' });
  await addPart(handle, { code: 'PAPER' });
});
afterAll(() => app.close());

const lines = [
  { part: 'SCREW', quantity: '8', bag: 'A' },
  { part: 'BOARD', quantity: '1', bag: 'B' },
  { part: 'wire', quantity: '0.25', bag: 'A' },
  { part: 'PAPER', quantity: '1', bag: 'B' },
];
const pointersOf = (body: unknown) => (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer);

describe('a contents list', () => {
  it('is empty at first, is saved whole, and adds up what is expected by bag', async () => {
    expect((await owner.get('/api/kits/KIT').expect(200)).body).toMatchObject({ version: 0, lines: [], weightG: '0' });
    const { body } = await owner.put('/api/kits/KIT', { version: 0, lines }).expect(200);
    // By hand: 8 × 0.35 + 0.25 × 2.4 = 3.4; with the board 15.9.
    expect(body).toMatchObject({
      version: 1,
      weightG: '15.9',
      unweighed: ['PAPER'],
      bags: [
        { bag: 'A', lines: 2, weightG: '3.4', unweighed: [] },
        { bag: 'B', lines: 2, weightG: '12.5', unweighed: ['PAPER'] },
      ],
      lines: [
        { position: 1, part: { code: 'SCREW' }, quantity: '8', weightG: '2.8', made: false },
        { position: 2, part: { code: 'BOARD' } },
        { position: 3, part: { code: 'WIRE' }, quantity: '0.25', weightG: '0.6' },
        { position: 4, part: { code: 'PAPER' }, unitWeightG: null, weightG: null },
      ],
    });
    const list = await owner.get('/api/kits?sort=-lines&q=kit').expect(200);
    expect(list.body).toEqual({
      total: 1,
      items: [{ code: 'KIT', name: 'Iron as a kit', retired: false, lines: 4, bags: 2, weightG: '15.9', unweighed: 1 }],
    });
    const used = await owner.get('/api/bills/SCREW/where-used').expect(200);
    expect(used.body).toMatchObject({
      uses: [],
      kits: [{ part: { code: 'KIT' }, through: 'SCREW', quantity: '8', bag: 'A' }],
    });
  });

  it('shows the second of two people what the first has saved', async () => {
    const fewer = lines.slice(0, 1);
    await owner.put('/api/kits/KIT', { version: 1, lines: fewer }).expect(200);
    const stale = await owner.put('/api/kits/KIT', { version: 1, lines }).expect(409);
    expect(stale.body).toMatchObject({
      code: 'changed_meanwhile',
      current: { version: 2, lines: [{ quantity: '8' }] },
    });
    await owner.put('/api/kits/KIT', { version: 2, lines }).expect(200);
  });

  it('is refused with every fault beside its field', async () => {
    const bad = [
      { part: 'NOBODY', quantity: '1', bag: '1' },
      { part: 'KIT-2', quantity: '1', bag: '1' },
      { part: 'KIT', quantity: '1', bag: '1' },
      { part: 'SCREW', quantity: '1.5', bag: '1' },
      { part: 'BOARD', quantity: '1', bag: '1' },
      { part: 'BOARD', quantity: '1', bag: '1' },
    ];
    const { body } = await owner.put('/api/kits/KIT-2', { version: 0, lines: bad }).expect(400);
    expect(pointersOf(body)).toEqual([
      '/lines/0/part',
      '/lines/1/part',
      '/lines/2/part',
      '/lines/3/quantity',
      '/lines/5/part',
    ]);
    const form = [{ part: 'SCREW', quantity: '0', bag: ' ' }];
    const shape = await owner.put('/api/kits/KIT-2', { version: 0, lines: form }).expect(400);
    expect(pointersOf(shape.body).toSorted()).toEqual(['/lines/0/bag', '/lines/0/quantity']);
    await owner.get('/api/kits/NONE').expect(404);
  });

  it('never puts a kit into a kit, from either side', async () => {
    const inside = [{ part: 'BOARD', quantity: '1', bag: '1' }];
    await owner.put('/api/kits/KIT-2', { version: 0, lines: inside }).expect(200);
    const outer = await owner
      .put('/api/kits/KIT-2', { version: 1, lines: [{ ...inside[0], part: 'KIT' }] })
      .expect(400);
    expect(outer.body).toMatchObject({ errors: [{ pointer: '/lines/0/part', code: 'kit' }] });
    const inner = await owner
      .put('/api/kits/BOARD', { version: 0, lines: [{ ...inside[0], part: 'SCREW' }] })
      .expect(400);
    expect(inner.body).toMatchObject({ errors: [{ pointer: '/lines', code: 'in_kit' }] });
  });

  it('is for the owner to change and for the assembler to read', async () => {
    await (await app.visitor()).get('/api/kits').expect(401);
    await (await app.agentFor('accountant')).get('/api/kits/KIT').expect(403);
    const assembler = await app.agentFor('assembler');
    await assembler.get('/api/kits/KIT').expect(200);
    await assembler.put('/api/kits/KIT', { version: 3, lines }).expect(403);
  });
});
