import { beforeEach, describe, expect, it } from '@jest/globals';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { queryClient } from '../../app/query-client';
import { routes } from '../../app/routes';
// Loaded beforehand: the test runner can fail to link two lazy modules that are first asked for at the same moment.
import '../../app/shell/staff-shell';
import './pages/shop-page';
import { faultsOfAccess, owner, refusal, serve, show } from '../../app/testing';
import type { Shop } from './api/shop';
import { changesOf } from './components/audit-words';
import { emptyShop, shopInput, shopValues } from './components/shop-values';

const shop: Shop = {
  name: 'Fernhollow Tools',
  legalName: 'Fernhollow Tools Limited',
  addressLine: '4 Mill Lane',
  city: 'Cork',
  postcode: 'T12 XY99',
  countryCode: 'IE',
  email: 'shop@fernhollow.example',
  phone: null,
  vatNumber: null,
  registrationNumber: null,
  bankName: null,
  iban: null,
  currency: 'EUR',
  workingWeekdays: [1, 2, 3, 4, 5],
  handlingDays: 2,
  checkoutHoldMinutes: 60,
  labourRateMinor: 3250,
  warrantyMonths: 24,
  oneStopShopFrom: null,
  zone: 'Europe/Dublin',
  currencyStays: false,
  version: 1,
};

const countries = { items: [{ code: 'IE', name: 'Ireland', inUnion: true }], total: 1 };
const base = { 'GET /api/session': () => ({ body: owner }), 'GET /api/countries': () => ({ body: countries }) };
const at = (address: string) => show(routes, address, queryClient);

beforeEach(() => {
  queryClient.clear();
  sessionStorage.clear();
});

describe('the shop’s form', () => {
  it('sends numbers as numbers, money in minor units, and nothing for what is left open', () => {
    const values = {
      ...shopValues(shop),
      labourRateMinor: '32.5',
      iban: 'ie29 aibk 9311 5212 3456 78',
      workingWeekdays: ['1', '6'],
    };
    expect(shopInput(values)).toMatchObject({
      labourRateMinor: 3250,
      iban: 'IE29AIBK93115212345678',
      workingWeekdays: [1, 6],
      handlingDays: 2,
      phone: null,
      oneStopShopFrom: null,
    });
    expect(shopInput(values)).not.toHaveProperty('version');
  });

  it('gives back what it was given', () => {
    const { zone: _zone, currencyStays: _stays, version: _version, ...input } = shop;
    expect(shopInput(shopValues(shop))).toEqual(input);
    expect(shopInput({ ...emptyShop, currency: 'JPY', labourRateMinor: '4000' }).labourRateMinor).toBe(4000);
  });

  it('sets the shop up the first time', async () => {
    const calls = serve({
      ...base,
      'GET /api/shop-settings': () => ({ body: { shop: null, zone: 'Europe/Dublin' } }),
      'POST /api/shop-settings': () => ({ status: 201, body: shop }),
    });
    const { container } = at('/setup/shop');
    expect(await screen.findByRole('heading', { name: 'Set up the shop' })).toBeVisible();
    for (const [label, text] of Object.entries({
      Name: 'Fernhollow Tools',
      'Legal name': 'Fernhollow Tools Limited',
      'Street and number': '4 Mill Lane',
      Postcode: 'T12 XY99',
      Town: 'Cork',
      'E-mail address': 'shop@fernhollow.example',
      'An hour at the bench costs': '32,50',
    })) {
      await userEvent.type(screen.getByRole('textbox', { name: label }), text);
    }
    await screen.findByRole('option', { name: 'Ireland' });
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Country' }), 'IE');
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(screen.getByRole('button', { name: 'Open the shop' }));
    await waitFor(() => expect(calls.some(({ route }) => route === 'POST /api/shop-settings')).toBe(true));
    expect(calls.find(({ route }) => route === 'POST /api/shop-settings')?.body).toMatchObject({
      labourRateMinor: 3250,
      workingWeekdays: [1, 2, 3, 4, 5],
    });
  });
});

describe('an edit that somebody else was faster with', () => {
  const collide = () => {
    const kept: unknown[] = [];
    serve({
      ...base,
      'GET /api/shop-settings': () => ({ body: { shop, zone: 'Europe/Dublin' } }),
      'PUT /api/shop-settings': ({ body }) => {
        const sent = body as Shop;
        if (sent.version === 1) {
          const answer = refusal(409, 'changed_meanwhile', 'Somebody changed this.');
          return { ...answer, body: { ...(answer.body as object), current: { ...shop, city: 'Kinsale', version: 2 } } };
        }
        kept.push(sent);
        return { body: { ...sent, version: sent.version + 1, zone: 'Europe/Dublin', currencyStays: false } };
      },
    });
    return kept;
  };

  it('shows both states and sends mine over theirs when I say so', async () => {
    const kept = collide();
    const { container } = at('/setup/shop');
    const town = await screen.findByRole('textbox', { name: 'Town' });
    await userEvent.clear(town);
    await userEvent.type(town, 'Cobh');
    await userEvent.click(screen.getByRole('button', { name: 'Keep these' }));
    const panel = await screen.findByRole('alert');
    expect(within(panel).getByText('There it is Kinsale; here it is Cobh.')).toBeVisible();
    expect(within(panel).getAllByRole('term')).toHaveLength(1);
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(within(panel).getByRole('button', { name: 'Keep mine' }));
    await waitFor(() => expect(kept).toHaveLength(1));
    expect(kept[0]).toMatchObject({ city: 'Cobh', version: 2 });
    await waitFor(() => expect(screen.queryByRole('alert')).not.toBeInTheDocument());
  });

  it('takes theirs when I say so, and goes on from there', async () => {
    const kept = collide();
    at('/setup/shop');
    const town = await screen.findByRole('textbox', { name: 'Town' });
    await userEvent.clear(town);
    await userEvent.type(town, 'Cobh');
    await userEvent.click(screen.getByRole('button', { name: 'Keep these' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Take theirs' }));
    expect(screen.getByRole('textbox', { name: 'Town' })).toHaveValue('Kinsale');
    expect(kept).toEqual([]);
    await userEvent.click(screen.getByRole('button', { name: 'Keep these' }));
    await waitFor(() => expect(kept).toHaveLength(1));
    expect(kept[0]).toMatchObject({ city: 'Kinsale', version: 2 });
  });
});

describe('people of the shop', () => {
  const assembler = {
    id: 2,
    name: 'Assembler',
    email: 'assembler@fernhollow.example',
    role: 'assembler',
    status: 'active',
    version: 3,
  };

  it('are shut out only after a question that names them and the consequence', async () => {
    const calls = serve({
      ...base,
      'GET /api/staff': () => ({ body: { items: [assembler], total: 1 } }),
      'PATCH /api/staff/2': () => ({ body: { ...assembler, status: 'disabled', version: 4 } }),
    });
    at('/setup/people');
    await userEvent.click(await screen.findByRole('button', { name: 'Change Assembler' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Shut Assembler out' }));
    const question = await screen.findByRole('dialog', { name: 'Shut Assembler out?' });
    expect(within(question).getByText(/signed out at once/)).toBeVisible();
    await userEvent.click(within(question).getByRole('button', { name: 'Shut out' }));
    expect(await screen.findByText('Assembler is shut out.')).toBeVisible();
    expect(calls.find(({ route }) => route === 'PATCH /api/staff/2')?.body).toEqual({ version: 3, status: 'disabled' });
  });

  it('stay as they are when the act is refused, and the question says why', async () => {
    serve({
      ...base,
      'GET /api/staff': () => ({ body: { items: [assembler], total: 1 } }),
      'PATCH /api/staff/2': () => refusal(422, 'rule_broken', 'The last owner stays.'),
    });
    at('/setup/people');
    await userEvent.click(await screen.findByRole('button', { name: 'Change Assembler' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Shut Assembler out' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Shut out' }));
    expect(await screen.findByText(/The last owner stays\./)).toBeVisible();
    expect(screen.getByRole('dialog', { name: 'Shut Assembler out?' })).toBeVisible();
  });

  it('are invited once however often the same is sent', async () => {
    let tries = 0;
    const calls = serve({
      ...base,
      'GET /api/staff': () => ({ body: { items: [], total: 0 } }),
      'POST /api/invitations': () => {
        tries += 1;
        return tries === 1 ? refusal(503, 'service_unavailable', 'The mail rests.') : { status: 201, body: assembler };
      },
    });
    const { router } = at('/setup/people/invite');
    await userEvent.type(await screen.findByRole('textbox', { name: 'Name' }), 'Assembler');
    await userEvent.type(screen.getByRole('textbox', { name: 'E-mail address' }), 'assembler@fernhollow.example');
    await userEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    expect(await screen.findByText('The mail rests.')).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Send the invitation' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/setup/people'));
    const keys = calls
      .filter(({ route }) => route === 'POST /api/invitations')
      .map(({ headers }) => headers.get('idempotency-key'));
    expect(keys[0]).toMatch(/^[0-9a-f-]{36}$/);
    expect(keys[1]).toBe(keys[0]);
  });
});

describe('rules of the shop', () => {
  it('are taken out only after a question, and added from the form beside them', async () => {
    const rate = {
      id: 4,
      countryCode: 'IE',
      rate: '23',
      validFrom: '2021-03-01',
      validUntil: null,
      source: 'revenue office',
    };
    let rates = [rate];
    const calls = serve({
      ...base,
      'GET /api/vat-rates': () => ({ body: { items: rates, total: rates.length } }),
      'GET /api/vat-exceptions': () => ({ body: { items: [], total: 0 } }),
      'DELETE /api/vat-rates/4': () => {
        rates = [];
        return { status: 204 };
      },
    });
    const { container } = at('/setup/vat');
    await userEvent.click(
      await screen.findByRole('button', { name: 'Take out the rate of 23 % for Ireland from 1 March 2021' }),
    );
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(await screen.findByRole('button', { name: 'Take it out' }));
    expect(await screen.findByText('No rates yet')).toBeVisible();
    expect(calls.filter(({ route }) => route.startsWith('DELETE'))).toHaveLength(1);
  });
});

describe('an entry of the audit', () => {
  it('shows every field that either state has', () => {
    expect(
      changesOf({ before: { unitCost: '0.41', note: null }, after: { unitCost: '0.44', bin_code: 'A-12' } }),
    ).toEqual([
      { field: 'unit cost', before: '0.41', after: '0.44' },
      { field: 'note', before: '', after: '' },
      { field: 'bin code', before: '', after: 'A-12' },
    ]);
  });
});
