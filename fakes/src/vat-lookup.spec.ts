import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startVatLookup, type VatLookupFake } from './vat-lookup.js';

let fake: VatLookupFake;

beforeAll(async () => {
  fake = await startVatLookup({
    numbers: { DE123456789: { valid: true, name: 'Buyer GmbH', address: 'Weg 1, Ulm' } },
    now: () => Date.UTC(2030, 0, 2, 3),
  });
});
afterAll(() => fake.close());

async function check(countryCode: string, vatNumber: string, more: object = {}): Promise<Record<string, unknown>> {
  const response = await fetch(`${fake.address}/check-vat-number`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ countryCode, vatNumber, ...more }),
  });
  return (await response.json()) as Record<string, unknown>;
}

describe('the lookup of VAT numbers', () => {
  it('knows a number with name and address, and gives a consultation number to who says who asks', async () => {
    expect(await check('DE', '123456789')).toMatchObject({
      valid: true,
      countryCode: 'DE',
      vatNumber: '123456789',
      name: 'Buyer GmbH',
      address: 'Weg 1, Ulm',
      requestDate: '2030-01-02T03:00:00.000Z',
      requestIdentifier: '',
    });
    const asker = { requesterMemberStateCode: 'IE', requesterNumber: '1234567T' };
    expect((await check('DE', '123456789', asker))['requestIdentifier']).toMatch(/^WAPI\d{12}$/);
    expect(fake.asked()).toEqual(['DE123456789', 'DE123456789']);
  });

  it('says of others that they are not valid, unless they are registered', async () => {
    expect(await check('FR', '12345678901')).toMatchObject({ valid: false, name: '---' });
    await fake.control('POST', '/control/numbers', { number: 'FR12345678901', name: 'Acheteur' });
    expect(await check('FR', '12345678901')).toMatchObject({ valid: true, name: 'Acheteur' });
  });

  it.each([
    ['IE', '301', 'MS_UNAVAILABLE'],
    ['IE', '300', 'SERVICE_UNAVAILABLE'],
    ['IE', '302', 'TIMEOUT'],
    ['US', '123456789', 'INVALID_INPUT'],
    ['IE', 'x y', 'INVALID_INPUT'],
  ])('answers %s %s with %s and no verdict', async (country, number, error) => {
    expect(await check(country, number)).toEqual({ actionSucceed: false, errorWrappers: [{ error }] });
  });

  it('can be unavailable as a whole or for a country, or not answer at all', async () => {
    fake.setAvailable(false, 'DE');
    expect(await check('DE', '123456789')).toMatchObject({ errorWrappers: [{ error: 'MS_UNAVAILABLE' }] });
    const status = (await (await fetch(`${fake.address}/check-status`)).json()) as { countries: unknown[] };
    expect(status.countries).toContainEqual({ countryCode: 'DE', availability: 'Unavailable' });
    fake.setAvailable(true, 'DE');
    await fake.control('POST', '/control/available', { available: false });
    expect(await check('DE', '123456789')).toMatchObject({ errorWrappers: [{ error: 'SERVICE_UNAVAILABLE' }] });
    fake.setAvailable(true);
    expect(await check('DE', '123456789')).toMatchObject({ valid: true });
    await fake.control('POST', '/control/hang');
    await expect(fetch(`${fake.address}/check-status`, { signal: AbortSignal.timeout(100) })).rejects.toMatchObject({
      name: 'TimeoutError',
    });
    await fake.control('POST', '/control/hang', { hanging: false });
  });
});
