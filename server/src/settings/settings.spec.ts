import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { SettingsModule } from './settings.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [SettingsModule] });
  owner = await app.agentFor('owner');
});
afterAll(() => app.close());

const shop = {
  name: 'Fernhollow Tools',
  legalName: 'Fernhollow Tools Limited',
  addressLine: '4 Mill Lane',
  city: 'Ballyhollow',
  postcode: 'X99 AB12',
  countryCode: 'IE',
  email: 'shop@fernhollow.example',
  vatNumber: 'IE1234567FA',
  currency: 'EUR',
  workingWeekdays: [5, 1, 2, 3, 4],
  handlingDays: 2,
  checkoutHoldMinutes: 45,
  labourRateMinor: 3_600,
  warrantyMonths: 24,
};

const pointersOf = (body: unknown) => (body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer);

describe('setting up the shop', () => {
  it('is asked for while there is none, and done once', async () => {
    expect((await owner.get('/api/shop-settings').expect(200)).body).toEqual({ shop: null, zone: 'Europe/Dublin' });
    expect((await owner.put('/api/shop-settings', { ...shop, version: 1 }).expect(409)).body).toMatchObject({
      code: 'wrong_state',
    });
    const { body } = await owner.post('/api/shop-settings', shop).expect(201);
    expect(body).toMatchObject({
      name: shop.name,
      workingWeekdays: [1, 2, 3, 4, 5],
      zone: 'Europe/Dublin',
      version: 1,
    });
    await owner.post('/api/shop-settings', shop).expect(409);
  });

  it('says what is wrong beside the field', async () => {
    const bad = { ...shop, countryCode: 'IRL', workingWeekdays: [1, 8], checkoutHoldMinutes: 5, iban: 'x', version: 1 };
    const { body } = await owner.put('/api/shop-settings', bad).expect(400);
    expect(new Set(pointersOf(body))).toEqual(
      new Set(['/countryCode', '/workingWeekdays', '/checkoutHoldMinutes', '/iban']),
    );
    const currency = await owner.put('/api/shop-settings', { ...shop, currency: 'EUX', version: 1 }).expect(400);
    expect(pointersOf(currency.body)).toEqual(['/currency']);
  });

  it('is edited from the version that was seen', async () => {
    await owner.put('/api/shop-settings', { ...shop, city: 'Millhollow', version: 1 }).expect(200);
    const stale = await owner.put('/api/shop-settings', { ...shop, version: 1 }).expect(409);
    expect(stale.body).toMatchObject({ code: 'changed_meanwhile', current: { city: 'Millhollow', version: 2 } });
  });

  it('is the owner’s alone, while all of the staff may read the countries', async () => {
    await (await app.visitor()).get('/api/shop-settings').expect(401);
    const assembler = await app.agentFor('assembler');
    await assembler.get('/api/shop-settings').expect(403);
    await assembler.post('/api/shop-settings', shop).expect(403);
    await assembler.put('/api/shop-settings', { ...shop, version: 2 }).expect(403);
    const { body } = await assembler.get('/api/countries').expect(200);
    const { items, total } = body as { items: { code: string; inUnion: boolean }[]; total: number };
    expect(total).toBe(249);
    expect(items.filter(({ inUnion }) => inUnion)).toHaveLength(28);
    await (await app.agentFor('customer')).get('/api/countries').expect(403);
  });
});

describe('the shop’s calendar and dated rules', () => {
  it('has days on which it is closed', async () => {
    await owner.post('/api/shop/closed-days', { day: '2027-03-17', name: 'Saint Patrick’s Day' }).expect(201);
    await owner.post('/api/shop/closed-days', { day: '2027-03-17', name: 'again' }).expect(409);
    await owner.post('/api/shop/closed-days', { day: '2027-02-30', name: 'never' }).expect(400);
    expect((await owner.get('/api/shop/closed-days').expect(200)).body).toMatchObject({ total: 1 });
    await owner.delete('/api/shop/closed-days/2027-03-17').expect(204);
    await owner.delete('/api/shop/closed-days/2027-03-17').expect(404);
    await owner.delete('/api/shop/closed-days/soon').expect(400);
    await (
      await app.agentFor('accountant')
    )
      .post('/api/shop/closed-days', { day: '2027-03-17', name: 'x' })
      .expect(403);
  });

  it('lets a new VAT rate end the one before it', async () => {
    const rate = { countryCode: 'ZZ', rate: '21', validFrom: '2020-01-01', source: 'the national revenue’s page' };
    const { body: unknown } = await owner.post('/api/vat-rates', rate).expect(400);
    expect(pointersOf(unknown)).toEqual(['/countryCode']);
    const home = { ...rate, countryCode: 'NO' };
    await owner.post('/api/vat-rates', home).expect(201);
    await owner.post('/api/vat-rates', { ...home, rate: '23.5', validFrom: '2027-01-01' }).expect(201);
    const early = await owner.post('/api/vat-rates', { ...home, validFrom: '2026-06-01' }).expect(400);
    expect(pointersOf(early.body)).toEqual(['/validFrom']);
    await owner.post('/api/vat-rates', { ...home, rate: '100', validFrom: '2028-01-01' }).expect(400);
    const { body } = await (await app.agentFor('accountant')).get('/api/vat-rates').expect(200);
    const mine = (body as { items: { id: number; countryCode: string }[] }).items.filter(
      (row) => row.countryCode === 'NO',
    );
    expect(mine).toMatchObject([
      { rate: '21', validFrom: '2020-01-01', validUntil: '2026-12-31' },
      { rate: '23.5', validFrom: '2027-01-01', validUntil: null },
    ]);
    await owner.delete(`/api/vat-rates/${mine[1]?.id}`).expect(204);
    await owner.delete(`/api/vat-rates/${mine[1]?.id}`).expect(404);
    await owner.delete('/api/vat-rates/one').expect(400);
    await (await app.agentFor('assembler')).get('/api/vat-rates').expect(403);
  });

  it('has delivery prices per country, and exceptions by postcode', async () => {
    const price = { countryCode: 'NO', netMinor: 1_250, transitDays: 4, carriesLithium: true, validFrom: '2027-01-01' };
    const { body } = await owner.post('/api/delivery-rates', price).expect(201);
    expect(body).toMatchObject({ net: { amount: 1_250, currency: 'EUR' }, transitDays: 4 });
    expect(pointersOf((await owner.post('/api/delivery-rates', price).expect(409)).body)).toEqual(['/validFrom']);
    await owner.post('/api/delivery-rates', { ...price, netMinor: -1 }).expect(400);
    await owner.delete(`/api/delivery-rates/${(body as { id: number }).id}`).expect(204);
    const exception = { countryCode: 'NO', postcodePrefix: '917', sentence: 'Ask us about Svalbard.' };
    await owner.post('/api/vat-exceptions', exception).expect(201);
    await owner.post('/api/vat-exceptions', exception).expect(409);
    await owner.delete('/api/vat-exceptions/NO/917').expect(204);
    await owner.delete('/api/vat-exceptions/NO/917').expect(404);
    await (await app.agentFor('accountant')).post('/api/vat-exceptions', exception).expect(403);
  });
});
