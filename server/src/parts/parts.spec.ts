import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { Agent } from '../testing/agent.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { PartsModule } from './parts.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [PartsModule, SuppliersModule] });
  owner = await app.agentFor('owner');
  await owner.create('/api/suppliers', { code: 'CELLS', name: 'Cells', currency: 'EUR' }).expect(201);
});
afterAll(() => app.close());

const resistor = {
  code: 'R-10K',
  name: 'Resistor 10 kΩ',
  measure: 'piece',
  traced: 'count',
  reorderPoint: '200',
  unitWeightG: '0.0300',
  parameters: [
    { name: 'Resistance', value: '10.0', unit: 'kΩ' },
    { name: 'Case', value: '0603' },
    { name: 'Series', value: 'thin film' },
  ],
  suppliers: [{ supplier: 'cells', supplierPartCode: 'rc-10k', leadTimeDays: 5, preferred: true }],
};

const pointersOf = (body: unknown) => (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer);

describe('parts', () => {
  it('are added with parameters, suppliers and weight', async () => {
    const { body } = await owner.create('/api/parts', resistor).expect(201);
    expect(body).toMatchObject({
      code: 'R-10K',
      reorderPoint: '200',
      unitWeightG: '0.03',
      moved: false,
      version: 1,
      retiredOn: null,
      battery: null,
      parameters: [
        { name: 'Resistance', value: '10', unit: 'kΩ' },
        { name: 'Case', value: '0603', unit: null },
        { name: 'Series', value: 'thin film', unit: null },
      ],
      suppliers: [{ supplier: 'CELLS', name: 'Cells', preferred: true, leadTimeDays: 5, supplierPartCode: 'rc-10k' }],
    });
    const twice = await owner.create('/api/parts', resistor).expect(409);
    expect(twice.body).toMatchObject({ code: 'already_exists', errors: [{ pointer: '/code' }] });
  });

  it('carry what transport papers must know of a cell', async () => {
    const cell = {
      ...resistor,
      code: 'CELL-18',
      traced: 'delivery',
      battery: { kind: 'cell', chemistry: 'lithium_ion', wattHours: '9.25', transportTestReference: 'T-1' },
    };
    const { body } = await owner.create('/api/parts', cell).expect(201);
    expect(body).toMatchObject({ battery: { kind: 'cell', wattHours: '9.25', cellCount: null } });
    const bare = { ...cell, code: 'CELL-19', battery: { kind: 'cell', chemistry: 'lithium_ion' } };
    const refused = await owner.create('/api/parts', bare).expect(400);
    expect(pointersOf(refused.body)).toEqual(['/battery/wattHours']);
    const metal = { ...bare, battery: { kind: 'cell', chemistry: 'lithium_metal', wattHours: '1' } };
    expect(pointersOf((await owner.create('/api/parts', metal).expect(400)).body)).toEqual(['/battery/lithiumGrams']);
  });

  it('followed one by one have letters, and only those', async () => {
    const tool = { ...resistor, code: 'TOOL', traced: 'single', measure: 'm' };
    const refused = await owner.create('/api/parts', tool).expect(400);
    expect(pointersOf(refused.body)).toEqual(['/serialLetters', '/measure']);
    const whole = { ...tool, measure: 'piece', serialLetters: 'TL' };
    await owner.create('/api/parts', whole).expect(201);
    const letters = await owner.create('/api/parts', { ...whole, code: 'TOOL-2' }).expect(409);
    expect(pointersOf(letters.body)).toEqual(['/serialLetters']);
    const none = await owner.create('/api/parts', { ...resistor, code: 'R-2', serialLetters: 'RR' }).expect(400);
    expect(pointersOf(none.body)).toEqual(['/serialLetters']);
  });

  it('say beside the field what is wrong, and keep nothing of it', async () => {
    const bad = {
      ...resistor,
      code: 'BAD',
      measure: 'pieces',
      reorderPoint: '-1',
      parameters: [{ name: 'A', value: '1', unit: 'V', colour: 'red' }],
      suppliers: [{ supplier: 'CELLS', preferred: 'yes' }],
    };
    const { body } = await owner.create('/api/parts', bad).expect(400);
    expect(pointersOf(body).toSorted()).toEqual([
      '/measure',
      '/parameters/0/colour',
      '/reorderPoint',
      '/suppliers/0/preferred',
    ]);
    const doubled = {
      ...resistor,
      code: 'BAD',
      parameters: [
        { name: 'Case', value: 'big', unit: 'mm' },
        { name: 'case', value: '2' },
      ],
      suppliers: [
        { supplier: 'CELLS', preferred: true },
        { supplier: 'CELLS', preferred: true },
      ],
    };
    expect(pointersOf((await owner.create('/api/parts', doubled).expect(400)).body)).toEqual([
      '/parameters/0/unit',
      '/parameters/1/name',
      '/suppliers/1/supplier',
      '/suppliers',
    ]);
    const unknown = { ...resistor, code: 'BAD', suppliers: [{ supplier: 'NOBODY', preferred: false }] };
    expect(pointersOf((await owner.create('/api/parts', unknown).expect(400)).body)).toEqual(['/suppliers/0/supplier']);
    const left = await app.database.handle.selectFrom('part').select('id').where('code', '=', 'BAD').execute();
    expect(left).toEqual([]);
  });

  it.each(['', ' ', 'a b', '-R', 'R'.repeat(33), 'R\u0000', 'Ω', "R'; drop table part"])(
    'refuse the code %j',
    async (code) => {
      const { body } = await owner.create('/api/parts', { ...resistor, code }).expect(400);
      expect((body as { code: string }).code).toBe('invalid_input');
    },
  );

  it('are edited from the version that was seen, retired and brought back, all of it on record', async () => {
    const edit = { ...resistor, name: 'Resistor 10 kΩ 1 %', version: 1 };
    const edited = await owner.put('/api/parts/r-10k', edit).expect(200);
    expect(edited.body).toMatchObject({ name: edit.name, version: 2 });
    const stale = await owner.put('/api/parts/R-10K', { ...edit, name: 'Mine' }).expect(409);
    expect(stale.body).toMatchObject({ code: 'changed_meanwhile', current: { name: edit.name, version: 2 } });
    const retired = await owner.post('/api/parts/R-10K/retire', { version: 2 }).expect(200);
    expect(retired.body).toMatchObject({ retiredOn: '2027-03-01', version: 3 });
    await owner.post('/api/parts/R-10K/bring-back', { version: 2 }).expect(409);
    await owner.post('/api/parts/R-10K/bring-back', { version: 3 }).expect(200);
    await owner.post('/api/parts/NONE/retire', { version: 1 }).expect(404);
    const actions = await app.database.handle
      .selectFrom('audit_entry')
      .select('action')
      .where('subject_code', '=', 'R-10K')
      .orderBy('id')
      .execute();
    expect(actions.map(({ action }) => action)).toEqual([
      'part.created',
      'part.edited',
      'part.retired',
      'part.brought_back',
    ]);
  });

  it('are for the owner to change', async () => {
    await (await app.visitor()).create('/api/parts', resistor).expect(401);
    const assembler = await app.agentFor('assembler');
    await assembler.create('/api/parts', resistor).expect(403);
    await assembler.put('/api/parts/R-10K', { ...resistor, version: 4 }).expect(403);
    await assembler.post('/api/parts/R-10K/retire', { version: 4 }).expect(403);
  });
});
