import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import jsQRModule from 'jsqr';
import sharp from 'sharp';
import { BuildsModule } from '../builds/builds.module.js';
import type { BatchDto } from '../builds/batch.dto.js';
import type { PickListDto } from '../builds/picking.dto.js';
import { StockModule } from '../stock/stock.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import type { Agent } from '../testing/agent.js';
import { addBill } from '../testing/bills.js';
import { addBin, addPart, addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { PublicUnitDto, UnitDto, UnitPageDto } from './unit.dto.js';
import { unitLabel } from './unit-label.js';
import { UnitPagesModule } from './unit-pages.module.js';

// The package is CommonJS whose default export is the function itself.
const jsQR = jsQRModule as unknown as (typeof jsQRModule)['default'];

let app: TestApp;
let assembler: Agent;
let serial: string;
let batch: string;

beforeAll(async () => {
  app = await startTestApp({ modules: [BuildsModule, UnitPagesModule, StockModule, SuppliersModule] });
  const handle = app.database.handle;
  await addShop(handle);
  const owner = await app.agentFor('owner');
  assembler = await app.agentFor('assembler');
  await owner.create('/api/suppliers', { code: 'CHIPS', name: 'Chips of Cork', currency: 'EUR' }).expect(201);
  for (const code of ['A-1', 'F-1']) await addBin(handle, { code });
  const chip = await addPart(handle, { code: 'CHIP', traced: 'delivery' });
  const iron = await addPart(handle, { code: 'IRON', name: 'Iron & tip', traced: 'single', letters: 'IR' });
  await addBill(handle, iron, {
    lines: [{ part: chip, quantity: '1' }],
    steps: [{ title: 'Solder', minutes: '10', caution: 'Hot tip.' }],
    plan: [{ name: 'Pack current', unit: 'A', lower: '1.9', upper: '2.6', digits: 2 }, { name: 'Looks whole' }],
  });
  const line = { part: 'CHIP', quantity: '2', bin: 'A-1', unitPrice: '1.00', held: false };
  await owner
    .create('/api/deliveries', { supplier: 'CHIPS', deliveryNote: null, receivedOn: '2027-03-01', lines: [line] })
    .expect(201);
  const planned = await owner.create('/api/batches', { part: 'IRON', quantity: 2, dueOn: '2027-03-20' }).expect(201);
  batch = (planned.body as BatchDto).number;
  const { rows } = (await assembler.get(`/api/batches/${batch}/pick-list`).expect(200)).body as PickListDto;
  const lines = rows.map(({ path, part, lot, bin, quantity }) => ({ path, part: part.code, lot, bin, quantity }));
  await assembler.create(`/api/batches/${batch}/issues`, { lines }).expect(201);
  const started = await assembler.post(`/api/batches/${batch}/building`).expect(200);
  serial = (started.body as BatchDto).units[0]?.serial ?? '';
});
afterAll(() => app.close());

const unit = async () => (await assembler.get(`/api/units/${serial}`).expect(200)).body as UnitDto;

async function measure(position: number, typed: object): Promise<void> {
  const measuredAt = app.clock.now().toISOString();
  const reading = { run: 1, position, measuredAt, clientKey: randomUUID(), ...typed };
  await assembler.post(`/api/units/${serial}/readings`, reading).expect(200);
}

describe('a unit', () => {
  it('is found by its number in any spelling, and not by a mistyped one', async () => {
    const typed = serial.toLowerCase().replaceAll('-', '');
    const { body } = await assembler.get(`/api/units/${typed}`).expect(200);
    expect((body as UnitDto).serial).toBe(serial);
    const wrong = serial.replace(/\d$/, (digit) => String((Number(digit) + 1) % 10));
    await assembler.get(`/api/units/${wrong}`).expect(400);
    await (await app.visitor()).get(`/api/units/${serial}`).expect(401);
    await (await app.agentFor('customer')).get(`/api/units/${serial}`).expect(403);
  });

  it('says what is in it, how it measured and where it is', async () => {
    expect(await unit()).toMatchObject({ state: 'under_way', sound: false, bin: null, batch, batchSize: 2, place: 1 });
    await assembler.put(`/api/batches/${batch}/steps/1`, { units: [serial], done: true }).expect(200);
    await measure(1, { reading: '2.27' });
    await measure(2, { answer: true });
    await assembler.create(`/api/units/${serial}/completion`, { bin: 'F-1' }).expect(201);
    const finished = await unit();
    expect(finished).toMatchObject({ state: 'on_shelf', sound: true, bin: 'F-1' });
    expect(finished.asBuilt).toMatchObject([{ part: 'CHIP', quantity: '1', exact: false, supplier: 'Chips of Cork' }]);
    expect(finished.steps).toMatchObject([{ title: 'Solder', caution: 'Hot tip.' }]);
    expect(finished.steps[0]?.doneAt).not.toBeNull();
    expect(finished.runs).toMatchObject([{ verdict: 'pass' }]);
    const { body } = await assembler.get('/api/units?state=on_shelf').expect(200);
    expect((body as UnitPageDto).items.map((item) => item.serial)).toEqual([serial]);
    const search = await assembler.get(`/api/units?q=${serial.slice(0, 9)}`).expect(200);
    expect((search.body as UnitPageDto).total).toBe(2);
  });
});

describe('its public page', () => {
  it('is open to whoever scans the label, kept out of search engines, and names no person', async () => {
    const { page } = await unit();
    const visitor = await app.visitor();
    const answer = await visitor.get(`/api/unit-pages/${page.slice('/u/'.length)}`).expect(200);
    expect(answer.headers['x-robots-tag']).toContain('noindex');
    const shown = answer.body as PublicUnitDto;
    expect(shown).toMatchObject({ serial, sound: true, revision: 1, warrantyUntil: null, shop: 'Fernhollow Tools' });
    expect(shown.readings).toEqual([
      {
        name: 'Pack current',
        reading: '2.27',
        answer: null,
        unit: 'A',
        lowerLimit: '1.9',
        upperLimit: '2.6',
        within: true,
      },
      {
        name: 'Looks whole',
        reading: null,
        answer: true,
        unit: null,
        lowerLimit: null,
        upperLimit: null,
        within: true,
      },
    ]);
    expect(JSON.stringify(shown)).not.toMatch(/assembler|recordedBy|Cork/);
    await visitor.get('/api/unit-pages/AAAAAAAAAAAAAAAAAAAAAAAA').expect(404);
    await visitor.get('/api/unit-pages/x').expect(404);
  });
});

describe('its label', () => {
  // The QR code is read back by jsQR, an independent decoder.
  it('carries a code that leads to its page', async () => {
    const address = 'https://shop.fernhollow.example/u/abcdefghijklmnopqrstuvwx';
    const drawn = unitLabel({ serial, name: 'Iron & tip', address });
    const { data, info } = await sharp(Buffer.from(drawn), { density: 250 })
      .flatten({ background: '#ffffff' })
      .ensureAlpha()
      .raw()
      .toBuffer({ resolveWithObject: true });
    expect(jsQR(new Uint8ClampedArray(data), info.width, info.height)?.data).toBe(address);
    expect(drawn).toContain(serial);
    expect(drawn).toContain('Iron &amp; tip');
  });

  it('comes as PDF, for one unit and for a whole batch', async () => {
    for (const path of [`/api/units/${serial}/label`, `/api/batches/${batch}/labels`]) {
      const { body, headers } = await assembler.get(path).expect(200);
      expect(headers['content-type']).toContain('application/pdf');
      expect((body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    }
    await assembler.get('/api/batches/B-9999/labels').expect(404);
    await (await app.agentFor('accountant')).get(`/api/units/${serial}/label`).expect(403);
  });
});
