import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { addBin, addLot, addPart, addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { FoundDto } from './find.dto.js';
import { FindModule } from './find.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [FindModule] });
  const handle = app.database.handle;
  await addShop(handle);
  owner = await app.agentFor('owner');
  const clamp = await addPart(handle, { code: 'CLAMP-N2', name: 'Clamp pair, nickel on brass' });
  await addPart(handle, { code: 'CLAMP-N20', name: 'Clamp, long' });
  await addPart(handle, { code: 'A-12', name: 'A part named like a bin' });
  await addBin(handle, { code: 'A-12' });
  const lot = await addLot(handle, { partId: clamp.id, code: 'L-0042' });
  await handle.updateTable('lot').set({ supplier_lot_code: 'ND2611' }).where('id', '=', lot.id).execute();
  await handle
    .insertInto('customer')
    .values({ name: 'A buyer of clamps', email: 'buyer@fernhollow.example', created_at: app.clock.now() })
    .execute();
});
afterAll(() => app.close());

const find = async (q: string, agent = owner) =>
  ((await agent.get(`/api/find?q=${encodeURIComponent(q)}`).expect(200)).body as { items: FoundDto[] }).items;
const named = (items: readonly FoundDto[]) => items.map(({ kind, code }) => `${kind} ${code}`);

describe('find or scan', () => {
  it('puts the very code first, then what begins with it, then what is like it', async () => {
    const found = await find('clamp-n2');
    expect(named(found)).toEqual(['part CLAMP-N2', 'part CLAMP-N20']);
    expect(found.map(({ exact }) => exact)).toEqual([true, false]);
    expect(named(await find('nickle'))).toEqual(['part CLAMP-N2']);
    expect(named(await find('A-12'))).toEqual(['bin A-12', 'part A-12']);
  });

  it('knows a lot by the supplier’s code too', async () => {
    expect(await find('nd2611')).toMatchObject([
      { kind: 'lot', code: 'L-0042', exact: true, story: expect.stringContaining('CLAMP-N2') },
    ]);
  });

  it('leaves out what a role has no place for', async () => {
    expect(await find('buyer')).toMatchObject([{ kind: 'person', to: '/counter/orders?q=buyer%40fernhollow.example' }]);
    expect(await find('buyer', await app.agentFor('assembler'))).toEqual([]);
    await (await app.agentFor('customer')).get('/api/find?q=clamp').expect(403);
    await (await app.visitor()).get('/api/find?q=clamp').expect(401);
  });

  it('bears anything a scanner types', async () => {
    for (const odd of [
      '%',
      '_',
      '\\',
      "' or 1=1 --",
      'http://127.0.0.1/u/aaaaaaaaaaaaaaaaaaaaaaaa',
      '()',
      '<->',
      '*',
    ]) {
      expect(await find(odd)).toEqual([]);
    }
    await owner.get('/api/find').expect(400);
    await owner.get('/api/find?q=').expect(400);
    await owner.get('/api/find?q=a&limit=21').expect(400);
  });
});
