import { describe, expect, it } from '@jest/globals';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { faultsOfAccess, owner, refusal, serve, show, type Call } from '../../app/testing';
import { counter } from './area';
import type { DeskOrder, Parcel } from './api/counter';

const routes = [{ path: '/counter', children: [...counter.routes] }];

const parcel: Parcel = {
  number: 'P-0007',
  order: 'O-2649-003',
  state: 'packing',
  recipient: 'A buyer',
  country: 'IE',
  promisedOn: '2027-03-04',
  openedAt: '2027-03-01T09:00:00Z',
  shippedAt: null,
  carrier: null,
  trackingCode: null,
  version: 3,
  address: ['A buyer', '1 Quay Street', 'D02 Dublin', 'IE'],
  weightG: null,
  needs: [
    {
      id: 11,
      title: 'Wren 60, kit',
      bag: 'A',
      part: 'TIP-60',
      partName: 'Tip',
      measure: 'piece',
      traced: 'delivery',
      quantity: '2',
      packed: '0',
      places: [{ bin: 'A-01', lot: 'L-0004', quantity: '9' }],
    },
  ],
  items: [],
  lithium: {
    answer: 'no_lithium',
    sentence: 'Nothing with lithium is in this parcel.',
    mayLeave: true,
    edition: null,
    rules: [],
    mark: null,
    labels: [],
    papers: [],
    conditions: [],
    reasons: [],
    missing: [],
    caution: 'Check the current edition and local rules; ask your carrier.',
    carrierAnswer: null,
    mode: null,
    wattHoursOnCase: null,
    chargePercent: null,
  },
  cautions: ['The tip burns skin at once and stays hot after switching off.'],
};

const packed: Parcel = {
  ...parcel,
  version: 4,
  needs: parcel.needs.map((need) => ({ ...need, packed: '2' })),
  items: [
    {
      id: 21,
      needId: 11,
      part: 'TIP-60',
      lot: 'L-0004',
      bin: 'A-01',
      serial: null,
      quantity: '2',
      packedAt: '2027-03-01T09:05:00Z',
    },
  ],
};

const order: DeskOrder = {
  number: 'O-2649-003',
  placedAt: '2027-03-01T08:00:00Z',
  promisedOn: '2027-03-04',
  late: false,
  recipient: 'A buyer',
  country: 'IE',
  state: 'ready',
  sentence: 'Paid, and all of it is on the shelf. Pack it.',
  parcel: null,
  gross: { amount: 12_300, currency: 'EUR' },
  email: 'buyer@marsh.example',
  address: ['A buyer', '1 Quay Street'],
  net: { amount: 10_000, currency: 'EUR' },
  vat: { amount: 2_300, currency: 'EUR' },
  delivery: { amount: 0, currency: 'EUR' },
  vatNote: null,
  lines: [],
  documents: [{ kind: 'payment', number: 'PY-0001', at: '2027-03-01T08:01:00Z', sentence: 'The payment is here.' }],
  reviews: [],
  cancellable: true,
};

const session = { 'GET /api/session': () => ({ body: owner }) };
const bodiesOf = (calls: readonly Call[], route: string) =>
  calls.flatMap((call) => (call.route === route ? [call.body] : []));

describe('Packing', () => {
  it('takes a scan by keyboard and says what came of it', async () => {
    let now = parcel;
    const calls = serve({
      ...session,
      'GET /api/parcels/P-0007': () => ({ body: now }),
      'POST /api/parcels/P-0007/scans': ({ body }) => {
        if ((body as { code: string }).code === 'L-0009')
          return refusal(422, 'rule_broken', '{lot:L-0009} is held: it is not packed until the owner lets it go.');
        now = packed;
        return { body: { sentence: '2 piece of {part:TIP-60}, in bag A.', bin: null, parcel: packed } };
      },
    });
    const { container } = show(routes, '/counter/parcels/P-0007');
    const field = await screen.findByLabelText('Scan a unit, a lot or a bin');
    expect(screen.getByText(/1 of 1 lines still to be packed/)).toBeTruthy();
    await userEvent.type(field, 'L-0009{Enter}');
    expect(await screen.findByText('refused')).toBeTruthy();
    await userEvent.clear(field);
    await userEvent.type(field, 'L-0004{Enter}');
    expect(await screen.findByText('taken')).toBeTruthy();
    expect(bodiesOf(calls, 'POST /api/parcels/P-0007/scans')).toEqual([{ code: 'L-0009' }, { code: 'L-0004' }]);
    expect(await faultsOfAccess(container)).toEqual([]);
  });
});

describe('An order', () => {
  it('is cancelled only with its name and consequence said, and a reason given', async () => {
    const calls = serve({
      ...session,
      'GET /api/desk-orders/O-2649-003': () => ({ body: order }),
      'POST /api/order-cancellations': () => ({
        status: 201,
        body: { order: order.number, creditNote: 'CN-2027-0001' },
      }),
    });
    show(routes, '/counter/orders/O-2649-003');
    await userEvent.click(await screen.findByRole('button', { name: 'Cancel the order' }));
    const dialog = await screen.findByRole('dialog', { name: 'Cancel order O-2649-003?' });
    expect(dialog.textContent).toContain('The whole payment goes back');
    await userEvent.type(screen.getByLabelText(/Reason/), 'Changed their mind.');
    const buttons = screen.getAllByRole('button', { name: 'Cancel the order' });
    const confirm = buttons.find((button) => dialog.contains(button));
    if (confirm) await userEvent.click(confirm);
    await waitFor(() => {
      expect(bodiesOf(calls, 'POST /api/order-cancellations')).toEqual([
        { order: 'O-2649-003', reason: 'Changed their mind.' },
      ]);
    });
  });
});
