import { beforeEach, describe, expect, it } from '@jest/globals';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { RouteObject } from 'react-router-dom';
import { faultsOfAccess, owner, refusal, serve, show } from '../../app/testing';
import type { ImportCheck } from './api/imports';
import type { Part, PartStory } from './api/parts';
import type { ShelfQueue } from './api/stock';
import { shelf } from './area';

const routes: RouteObject[] = [{ path: '/shelf', children: [...shelf.routes] }];
const session = { 'GET /api/session': () => ({ body: owner }) };
const assembler = {
  'GET /api/session': () => ({
    body: { ...owner, person: { id: 2, name: 'Bench', email: 'bench@fernhollow.example', role: 'assembler' } },
  }),
};
const noQueue: ShelfQueue = {
  heldLots: [],
  heldLotCount: 0,
  shortParts: [],
  shortPartCount: 0,
  expiringLots: [],
  expiringLotCount: 0,
};
const emptyList = { items: [], total: 0 };

beforeEach(() => sessionStorage.clear());

const cell: Part = {
  id: 3,
  version: 4,
  code: 'CELL-18',
  name: 'Cell 18650, 2.5 Ah',
  description: null,
  measure: 'piece',
  traced: 'delivery',
  serialLetters: null,
  reorderPoint: '60',
  unitWeightG: '45.5',
  shelfLifeDays: null,
  originCountryCode: null,
  commodityCode: null,
  parameters: [{ name: 'Capacity', value: '2.5', unit: 'Ah' }],
  suppliers: [{ supplier: 'CELLS', name: 'Cells & Co', supplierPartCode: null, leadTimeDays: 21, preferred: true }],
  battery: null,
  retiredOn: null,
  moved: true,
};

const story: PartStory = {
  part: cell,
  figures: {
    onShelf: '156',
    usable: '36',
    held: '120',
    claimed: '40',
    free: '-4',
    short: '4',
    belowReorderPoint: true,
    lastsDays: 0,
    averageCost: '3.12',
    value: { amount: 48_672, currency: 'EUR' },
  },
  places: [
    {
      bin: 'C-02',
      quarantine: false,
      lot: 'L-0019',
      kind: 'delivery',
      status: 'held',
      supplier: 'CELLS',
      supplierLot: 'ND2640',
      receivedOn: '2026-11-28',
      expiresOn: null,
      expired: false,
      quantity: '120',
    },
  ],
  claims: [
    {
      reference: 'B-2648',
      kind: 'batch_line',
      neededOn: '2026-12-04',
      needed: '40',
      claimed: '36',
      awaited: '0',
      missing: '4',
    },
  ],
  uses: [],
  moves: [],
  currency: 'EUR',
};

describe('the shelf’s queue', () => {
  it('says in sentences what needs a hand, each with one act, what is missing first', async () => {
    const queue: ShelfQueue = {
      ...noQueue,
      heldLots: [
        {
          lot: 'L-0019',
          part: 'CELL-18',
          name: cell.name,
          measure: 'piece',
          quantity: '120',
          bins: ['C-02'],
          receivedOn: '2026-11-28',
          supplier: 'CELLS',
        },
      ],
      heldLotCount: 1,
      shortParts: [
        {
          part: 'CLAMP',
          name: 'Clamp pair',
          measure: 'pair',
          free: '-15',
          claimed: '96',
          short: '15',
          reorderPoint: null,
          supplier: null,
        },
      ],
      shortPartCount: 1,
    };
    serve({ ...session, 'GET /api/shelf-queue': () => ({ body: queue }) });
    const { container } = show(routes, '/shelf');
    const items = await screen.findAllByRole('listitem');
    expect(items.map((item) => item.textContent)).toEqual([
      expect.stringMatching(/15\spairs are missing/),
      expect.stringMatching(/120\spieces of/),
    ]);
    // Who it is comes a moment later than the queue.
    const decide = await screen.findByRole('link', { name: 'Decide about it' });
    expect(decide).toHaveAttribute('href', '/shelf/lots/L-0019');
    expect(screen.getByText('One part runs short, one lot is held.')).toBeVisible();
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('says so when nothing does, and offers nothing to receive to those who may not', async () => {
    serve({ ...assembler, 'GET /api/shelf-queue': () => ({ body: noQueue }) });
    show(routes, '/shelf');
    expect(await screen.findByText('Nothing on the shelf needs a hand')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'Receive a delivery' })).toBeNull();
  });
});

describe('the list of parts', () => {
  it('says what to do first while there is none', async () => {
    serve({
      ...session,
      'GET /api/parts': () => ({ body: emptyList }),
      'GET /api/bins': () => ({ body: emptyList }),
      'GET /api/shelf-queue': () => ({ body: noQueue }),
    });
    show(routes, '/shelf/parts');
    expect(await screen.findByRole('link', { name: 'Take them in from a CSV file' })).toHaveAttribute(
      'href',
      '/shelf/imports/parts',
    );
  });
});

describe('a part’s page', () => {
  it('tells what is missing, where it lies, who claims it and what it cost', async () => {
    serve({ ...session, 'GET /api/parts/CELL-18': () => ({ body: story }) });
    const { container } = show(routes, '/shelf/parts/CELL-18');
    expect(await screen.findByText('More is claimed than can be used: 4 pieces are missing.')).toBeVisible();
    expect(screen.getByRole('table', { name: 'Where it lies' })).toHaveTextContent('held');
    expect(screen.getByRole('table', { name: 'Who claims it' })).toHaveTextContent('short 4');
    expect(screen.getByText('3.12 €')).toBeVisible();
    expect(screen.getByText('2.5 Ah')).toBeVisible();
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('shows an assembler no cost, and no way to edit', async () => {
    const { averageCost: _cost, value: _value, ...figures } = story.figures;
    const { currency: _currency, ...rest } = story;
    serve({ ...assembler, 'GET /api/parts/CELL-18': () => ({ body: { ...rest, figures } }) });
    show(routes, '/shelf/parts/CELL-18');
    await screen.findByRole('heading', { name: cell.name });
    expect(screen.queryByText('Average cost')).toBeNull();
    expect(screen.queryByRole('link', { name: 'Edit' })).toBeNull();
    expect(await screen.findByRole('link', { name: 'Adjust' })).toBeVisible();
  });

  it('says that there is none, and lets the person try again', async () => {
    serve({ ...session, 'GET /api/parts/NONE': () => refusal(404, 'not_found', 'There is no such part here.') });
    show(routes, '/shelf/parts/NONE');
    expect(await screen.findByText('There is no such part here.')).toBeVisible();
  });
});

describe('a part’s form', () => {
  const countries = { 'GET /api/countries': () => ({ body: { items: [], total: 0 } }) };

  it('sends what was typed, without what was left empty', async () => {
    const calls = serve({
      ...session,
      ...countries,
      'POST /api/parts': () => ({ status: 201, body: { ...cell, code: 'R-10K' } }),
      'GET /api/parts/R-10K': () => ({ body: story }),
    });
    show(routes, '/shelf/parts/new');
    await userEvent.type(await screen.findByRole('textbox', { name: /^Code/ }), 'r-10k');
    await userEvent.type(screen.getByRole('textbox', { name: /^Name/ }), 'Resistor 10 kΩ');
    await userEvent.type(screen.getByRole('textbox', { name: /^Order below/ }), '200');
    await userEvent.click(screen.getByRole('button', { name: 'Add a parameter' }));
    const parameter = within(screen.getByRole('group', { name: 'Parameter 1' }));
    await userEvent.type(parameter.getByRole('textbox', { name: /^Parameter/ }), 'Resistance');
    await userEvent.type(parameter.getByRole('textbox', { name: /^Value/ }), '10');
    await userEvent.type(parameter.getByRole('textbox', { name: /^Unit/ }), 'kΩ');
    await userEvent.click(screen.getByRole('button', { name: 'Add the part' }));
    await waitFor(() => expect(calls.some(({ route }) => route === 'POST /api/parts')).toBe(true));
    expect(calls.find(({ route }) => route === 'POST /api/parts')?.body).toMatchObject({
      code: 'r-10k',
      measure: 'piece',
      traced: 'count',
      reorderPoint: '200',
      unitWeightG: null,
      serialLetters: null,
      parameters: [{ name: 'Resistance', value: '10', unit: 'kΩ' }],
      suppliers: [],
      battery: null,
    });
  });

  it('puts the server’s faults on the fields of rows', async () => {
    const fault = { pointer: '/suppliers/0/supplier', code: 'unknown', detail: 'There is no supplier NOBODY.' };
    serve({
      ...session,
      ...countries,
      'GET /api/suppliers': () => ({ body: emptyList }),
      'POST /api/parts': () => refusal(400, 'invalid_input', fault.detail, [fault]),
    });
    const { container } = show(routes, '/shelf/parts/new');
    await userEvent.type(await screen.findByRole('textbox', { name: /^Code/ }), 'X-1');
    await userEvent.type(screen.getByRole('textbox', { name: /^Name/ }), 'Thing');
    await userEvent.click(screen.getByRole('button', { name: 'Add a supplier' }));
    await userEvent.type(screen.getByRole('combobox', { name: /^Supplier/ }), 'nobody');
    await userEvent.click(screen.getByRole('button', { name: 'Add the part' }));
    await screen.findByRole('link', { name: fault.detail });
    expect(screen.getByRole('combobox', { name: /^Supplier/ })).toHaveAccessibleDescription(fault.detail);
    expect(screen.getByRole('combobox', { name: /^Supplier/ })).toHaveValue('NOBODY');
    expect(await faultsOfAccess(container)).toEqual([]);
  });

  it('keeps measure and way of following once something has moved', async () => {
    serve({
      ...session,
      ...countries,
      'GET /api/parts/CELL-18': () => ({ body: story }),
      'GET /api/suppliers': () => ({ body: emptyList }),
    });
    show(routes, '/shelf/parts/CELL-18/edit');
    expect(await screen.findByRole('combobox', { name: /^Kept in/ })).toBeDisabled();
    expect(screen.getByRole('radio', { name: /By count/ })).toBeDisabled();
  });
});

describe('taking in a table', () => {
  const kinds = {
    items: [
      {
        kind: 'parts',
        title: 'Parts',
        sentence: 'Parts of the shelf.',
        columns: [
          { key: 'code', title: 'Part code', required: true, sentence: 'Its code.' },
          { key: 'name', title: 'Name', required: true, sentence: 'Its name.' },
        ],
      },
    ],
    total: 1,
  };
  const check: ImportCheck = {
    kind: 'parts',
    fileName: 'parts.csv',
    rowCount: 2,
    separator: ';',
    decimalSign: null,
    columns: [
      { index: 0, header: 'Code', key: 'code', title: 'Part code', sample: 'A-1' },
      { index: 1, header: 'Bezeichnung', key: null, title: null, sample: 'Schraube' },
    ],
    faultCount: 1,
    faults: [{ line: 1, column: 'Name', sentence: 'No column of the file fills Name, which is needed. Choose one.' }],
    notes: [],
    additions: 0,
    ready: false,
  };
  const file = new File(['Code;Bezeichnung\nA-1;Schraube\n'], 'parts.csv', { type: 'text/csv' });

  it('shows every fault by its line, takes a column’s correction, and then takes the file in', async () => {
    const asked: string[] = [];
    serve({
      ...session,
      'GET /api/imports/kinds': () => ({ body: kinds }),
      'GET /api/imports': () => ({ body: emptyList }),
      'POST /api/imports/parts/dry-run': ({ body }) => {
        asked.push(String(body));
        const corrected = String(body).includes('"1":"name"');
        return {
          body: corrected
            ? { ...check, faultCount: 0, faults: [], notes: ['2 parts will be added.'], additions: 2, ready: true }
            : check,
        };
      },
      'POST /api/imports/parts': () => ({
        status: 201,
        body: {
          id: 1,
          kind: 'parts',
          title: 'Parts',
          fileName: 'parts.csv',
          rowCount: 2,
          appliedAt: '2026-12-01T10:00:00Z',
          appliedBy: 'Owner',
          document: null,
          notes: [],
        },
      }),
    });
    const { container, router } = show(routes, '/shelf/imports/parts');
    await userEvent.upload(await screen.findByLabelText('Choose a CSV file', { selector: 'input' }), file);
    expect(await screen.findByRole('table', { name: 'Faults' })).toHaveTextContent('No column of the file fills Name');
    expect(screen.getByRole('button', { name: 'Take it in' })).toBeDisabled();
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(screen.getByRole('combobox', { name: 'What Bezeichnung is' }));
    await userEvent.click(await screen.findByRole('option', { name: 'Name' }));
    expect(await screen.findByText('2 parts will be added.')).toBeVisible();
    expect(asked).toHaveLength(2);
    await userEvent.click(screen.getByRole('button', { name: 'Take it in' }));
    await waitFor(() => expect(router.state.location.pathname).toBe('/shelf/imports'));
  });

  it('says what can’t be read at all', async () => {
    serve({
      ...session,
      'GET /api/imports/kinds': () => ({ body: kinds }),
      'POST /api/imports/parts/dry-run': () =>
        refusal(400, 'invalid_input', 'This is a workbook or an archive. Save the sheet as CSV (UTF-8) first.'),
    });
    show(routes, '/shelf/imports/parts');
    await userEvent.upload(await screen.findByLabelText('Choose a CSV file', { selector: 'input' }), file);
    expect(await screen.findByText(/Save the sheet as CSV/)).toBeVisible();
  });
});

describe('receiving a delivery', () => {
  it('sends each line with a price or a value, whole minor units for the value', async () => {
    const calls = serve({
      ...session,
      'GET /api/suppliers': () => ({ body: emptyList }),
      'GET /api/parts': () => ({ body: emptyList }),
      'GET /api/bins': () => ({ body: emptyList }),
      'GET /api/parts/CELL-18': () => ({ body: story }),
      'POST /api/deliveries': () => refusal(409, 'wrong_state', 'The shop is not set up yet.'),
    });
    show(routes, '/shelf/deliveries/new?part=CELL-18&supplier=CELLS');
    const line = within(await screen.findByRole('group', { name: 'Line 1' }));
    await userEvent.type(line.getByRole('textbox', { name: /^Quantity/ }), '40');
    await userEvent.type(line.getByRole('combobox', { name: /^Bin/ }), 'c-01');
    await userEvent.type(line.getByRole('textbox', { name: /^Line value/ }), '124,80');
    await userEvent.click(await line.findByRole('checkbox', { name: /Hold it back/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Put it on the shelf' }));
    expect(await screen.findByText('The shop is not set up yet.')).toBeVisible();
    expect(calls.find(({ route }) => route === 'POST /api/deliveries')?.body).toMatchObject({
      supplier: 'CELLS',
      lines: [
        {
          part: 'CELL-18',
          quantity: '40',
          bin: 'C-01',
          unitPrice: null,
          lineValueMinor: 12_480,
          held: true,
          supplierLot: null,
        },
      ],
    });
  });
});
