import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { SuppliersModule } from './suppliers.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [SuppliersModule] });
  owner = await app.agentFor('owner');
});
afterAll(() => app.close());

const wire = { code: 'WIRE-CO', name: 'Wire Company', currency: 'EUR', countryCode: 'DE', leadTimeDays: 10 };

describe('suppliers', () => {
  it('are added once by the owner, whatever the case of the code', async () => {
    const key = randomUUID();
    const first = await owner.create('/api/suppliers', { ...wire, code: 'wire-co' }, key).expect(201);
    expect(first.body).toMatchObject({ ...wire, version: 1, parts: [], deliveries: [] });
    const again = await owner.create('/api/suppliers', { ...wire, code: 'wire-co' }, key).expect(201);
    expect(again.body).toEqual(first.body);
    const twice = await owner.create('/api/suppliers', wire).expect(409);
    expect(twice.body).toMatchObject({ code: 'already_exists', errors: [{ pointer: '/code' }] });
  });

  it('are found by code and name, and opened by their code', async () => {
    await owner.create('/api/suppliers', { code: 'CELLS', name: 'Cells & More', currency: 'EUR' }).expect(201);
    const assembler = await app.agentFor('assembler');
    const { body } = await assembler.get('/api/suppliers?q=more').expect(200);
    expect(body).toMatchObject({ total: 1, items: [{ code: 'CELLS', partCount: 0, lastReceivedOn: null }] });
    await assembler.get('/api/suppliers/cells').expect(200);
    await assembler.get('/api/suppliers/NOBODY').expect(404);
    await assembler.get('/api/suppliers/%25').expect(404);
  });

  it('are edited from the version that was seen', async () => {
    const edit = { ...wire, name: 'Wire Company of Aachen', version: 1 };
    await owner.put('/api/suppliers/WIRE-CO', edit).expect(200);
    const stale = await owner.put('/api/suppliers/WIRE-CO', edit).expect(409);
    expect(stale.body).toMatchObject({ code: 'changed_meanwhile', current: { name: edit.name, version: 2 } });
  });

  it('say what is wrong beside the field', async () => {
    const bad = { code: 'no spaces', name: '', currency: 'EUR', email: 'nobody', leadTimeDays: -1, discount: 5 };
    const { body } = await owner.create('/api/suppliers', bad).expect(400);
    const pointers = (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer);
    expect(pointers.toSorted()).toEqual(['/code', '/discount', '/email', '/leadTimeDays', '/name']);
    const currency = await owner.create('/api/suppliers', { ...wire, code: 'X', currency: 'EUX' }).expect(400);
    expect(currency.body).toMatchObject({ errors: [{ pointer: '/currency' }] });
    const country = await owner.create('/api/suppliers', { ...wire, code: 'X', countryCode: 'XX' }).expect(400);
    expect(country.body).toMatchObject({ errors: [{ pointer: '/countryCode' }] });
  });

  it('are for staff to read and for the owner to change', async () => {
    const visitor = await app.visitor();
    await visitor.get('/api/suppliers').expect(401);
    await (await app.agentFor('customer')).get('/api/suppliers').expect(403);
    const accountant = await app.agentFor('accountant');
    await accountant.create('/api/suppliers', { ...wire, code: 'Y' }).expect(403);
    await accountant.put('/api/suppliers/WIRE-CO', { ...wire, version: 2 }).expect(403);
  });
});
