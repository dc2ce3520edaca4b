import { beforeEach, describe, expect, it } from '@jest/globals';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { faultsOfAccess, owner, refusal, serve, show, type Call } from '../../app/testing';
import { designs } from './area';
import type { Bill, BillEdit, BillRevision } from './api/bills';

const routes = [{ path: '/designs', children: [...designs.routes] }];
const part = (code: string, name = `The ${code}`) => ({
  code,
  name,
  measure: 'piece',
  traced: 'delivery',
  retired: false,
});

const draft: BillRevision = {
  part: { ...part('IRON', 'Soldering iron'), traced: 'single' },
  number: 2,
  status: 'draft',
  version: 4,
  note: null,
  createdAt: '2027-03-01T09:00:00Z',
  createdBy: 'Owner',
  releasedAt: null,
  releasedBy: null,
  supersededAt: null,
  minutes: '2.5',
  lines: [
    {
      position: 10,
      part: part('BOARD'),
      quantityPer: '1',
      scrapPercent: '0',
      marks: 'B1',
      note: null,
      alternates: [],
      madeBy: 1,
    },
  ],
  steps: [{ position: 1, title: 'Fit the board', instruction: '', minutes: '2.5', caution: 'The tip is hot.' }],
  testPlan: [
    {
      position: 1,
      name: 'Time to 350 °C',
      kind: 'numeric',
      unit: 's',
      lowerLimit: null,
      target: null,
      upperLimit: '4.5',
      digits: 1,
      condition: null,
      caution: null,
    },
  ],
};

const bill: Bill = {
  part: draft.part,
  released: null,
  draft: 2,
  usedIn: 0,
  revisions: [
    {
      number: 2,
      status: 'draft',
      version: 4,
      note: null,
      createdAt: draft.createdAt,
      createdBy: 'Owner',
      releasedAt: null,
      releasedBy: null,
      supersededAt: null,
      lines: 1,
    },
  ],
};

const served = {
  'GET /api/session': () => ({ body: owner }),
  'GET /api/bills/IRON': () => ({ body: bill }),
  'GET /api/bills/IRON/revisions/2': () => ({ body: draft }),
  'GET /api/bill-components': () => ({
    body: { items: [{ ...part('SCREW'), made: false, unitWeightG: null }], total: 1 },
  }),
  'GET /api/kits/IRON': () => ({
    body: { part: draft.part, version: 0, lines: [], bags: [], weightG: '0', unweighed: [] },
  }),
  'GET /api/bills/IRON/revisions/2/buildable': () => ({
    body: {
      quantity: '6',
      atMost: '6',
      proven: true,
      stops: [{ part: part('CORE'), missing: '1', onShelf: '9', usable: '9', claimed: '7' }],
      aloneEnough: [],
      takes: [],
      made: [],
    },
  }),
  'GET /api/bills/IRON/revisions/2/cost': () => ({
    body: {
      lines: [],
      ownMinutes: '2.5',
      minutes: '2.5',
      labourPerHour: { amount: 3600, currency: 'EUR' },
      material: { amount: 100, currency: 'EUR' },
      labour: { amount: 150, currency: 'EUR' },
      total: { amount: 250, currency: 'EUR' },
      unknown: [],
    },
  }),
};

const sent = (calls: readonly Call[]): BillEdit[] =>
  calls.filter(({ route }) => route.startsWith('PUT')).map(({ body }) => body as BillEdit);

const editor = '/designs/bills/IRON/revisions/2/edit';

beforeEach(() => sessionStorage.clear());

describe('editing a draft', () => {
  it('takes a line from the keyboard alone and sends the draft whole', async () => {
    const calls = serve({ ...served, 'PUT /api/bills/IRON/revisions/2': () => ({ body: { ...draft, version: 5 } }) });
    const { container } = show(routes, editor);
    const person = userEvent.setup();
    const quantity = await screen.findByRole('textbox', { name: 'For one, line 1' });
    await person.click(quantity);
    await person.keyboard('{Enter}');
    const added = await screen.findByRole('combobox', { name: 'Part, line 2' });
    await waitFor(() => expect(added).toHaveFocus());
    await person.keyboard('screw{Tab}');
    await person.clear(screen.getByRole('textbox', { name: 'For one, line 2' }));
    await person.type(screen.getByRole('textbox', { name: 'For one, line 2' }), '4,5');
    await person.type(screen.getByRole('textbox', { name: 'May be replaced by, line 2' }), 'nut, bolt');
    expect(await faultsOfAccess(container)).toEqual([]);
    await person.click(screen.getByRole('button', { name: 'Save the draft' }));
    await waitFor(() => expect(sent(calls)).toHaveLength(1));
    expect(sent(calls)[0]).toMatchObject({
      version: 4,
      note: null,
      lines: [
        { position: 10, part: 'BOARD', marks: 'B1', scrapPercent: '0' },
        { position: 20, part: 'screw', quantityPer: '4.5', scrapPercent: '0', alternates: ['nut', 'bolt'] },
      ],
      steps: [{ title: 'Fit the board', minutes: '2.5', caution: 'The tip is hot.' }],
      testPlan: [{ kind: 'numeric', upperLimit: '4.5', lowerLimit: null, digits: 1, unit: 's' }],
    });
  });

  it('moves and removes steps with Alt', async () => {
    serve(served);
    show(routes, editor);
    const person = userEvent.setup();
    await person.click(await screen.findByRole('button', { name: 'Add a step' }));
    await waitFor(() => expect(screen.getByRole('textbox', { name: 'What to do, step 2' })).toHaveFocus());
    await person.keyboard('Close the shell{Alt>}{ArrowUp}{/Alt}');
    expect(screen.getByRole('textbox', { name: 'What to do, step 1' })).toHaveValue('Close the shell');
    await person.click(screen.getByRole('textbox', { name: 'What to do, step 2' }));
    await person.keyboard('{Alt>}{Delete}{/Alt}');
    expect(screen.queryByRole('textbox', { name: 'What to do, step 2' })).not.toBeInTheDocument();
  });

  it('puts what the server refuses into its cell', async () => {
    serve({
      ...served,
      'PUT /api/bills/IRON/revisions/2': () =>
        refusal(400, 'invalid_input', 'A bill may not contain itself.', [
          {
            pointer: '/lines/0/part',
            code: 'contains_itself',
            detail: 'A bill may not contain itself: IRON contains IRON.',
          },
        ]),
    });
    show(routes, editor);
    await userEvent.click(await screen.findByRole('button', { name: 'Save the draft' }));
    const cell = screen.getByRole('combobox', { name: 'Part, line 1' });
    await waitFor(() => expect(cell).toBeInvalid());
    expect(cell).toHaveAccessibleDescription('✕ A bill may not contain itself: IRON contains IRON.');
  });

  it('shows both states when somebody else was first, and saves over theirs when told to', async () => {
    const theirs: BillRevision = {
      ...draft,
      version: 9,
      lines: draft.lines.map((line) => ({ ...line, quantityPer: '7' })),
    };
    const calls = serve({
      ...served,
      'PUT /api/bills/IRON/revisions/2': ({ body }) => {
        if ((body as BillEdit).version === 9) return { body: { ...draft, version: 10 } };
        const stale = refusal(409, 'changed_meanwhile', 'Somebody changed this while you had it open.');
        return { ...stale, body: { ...(stale.body as object), current: theirs } };
      },
    });
    show(routes, editor);
    const person = userEvent.setup();
    const quantity = await screen.findByRole('textbox', { name: 'For one, line 1' });
    await person.clear(quantity);
    await person.type(quantity, '3');
    await person.click(screen.getByRole('button', { name: 'Save the draft' }));
    const panel = await screen.findByRole('region', { name: 'Changed meanwhile' });
    expect(within(panel).getByRole('row', { name: /Line 10 for one 3 7/ })).toBeInTheDocument();
    await person.click(within(panel).getByRole('button', { name: 'Keep yours, and save again' }));
    await waitFor(() => expect(sent(calls)).toHaveLength(2));
    expect(sent(calls)[1]).toMatchObject({ version: 9, lines: [{ quantityPer: '3' }] });
  });

  it('takes theirs when told to', async () => {
    const stale = refusal(409, 'changed_meanwhile', 'Somebody changed this while you had it open.');
    const theirs = { ...draft, version: 9, note: 'Theirs' };
    serve({
      ...served,
      'PUT /api/bills/IRON/revisions/2': () => ({ ...stale, body: { ...(stale.body as object), current: theirs } }),
    });
    show(routes, editor);
    await userEvent.click(await screen.findByRole('button', { name: 'Save the draft' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Take theirs' }));
    expect(screen.getByRole('textbox', { name: /What is new/ })).toHaveValue('Theirs');
    expect(screen.queryByRole('region', { name: 'Changed meanwhile' })).not.toBeInTheDocument();
  });
});

describe('a design', () => {
  it('shows lines, steps, plan, how many now and what one costs, and is released after asking', async () => {
    const calls = serve({
      ...served,
      'POST /api/bills/IRON/revisions/2/release': () => ({ body: { ...draft, status: 'released' } }),
    });
    const { container } = show(routes, '/designs/bills/IRON');
    expect(await screen.findByRole('heading', { level: 1, name: 'Soldering iron' })).toBeInTheDocument();
    expect(await screen.findByRole('table', { name: 'Lines' })).toHaveTextContent('BOARD');
    expect(screen.getByRole('note', { name: 'Caution' })).toHaveTextContent('The tip is hot.');
    expect(screen.getByRole('table', { name: 'Test plan' })).toHaveTextContent('at most 4.5');
    const stops = await screen.findByRole('list', { name: 'What stops the next one' });
    expect(stops).toHaveTextContent('9 on the shelf, 7 promised');
    expect(await screen.findByText(/2\.50/)).toBeInTheDocument();
    expect(await faultsOfAccess(container)).toEqual([]);
    await userEvent.click(await screen.findByRole('button', { name: 'Release revision 2' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Release it' }));
    await waitFor(() => expect(calls.find(({ route }) => route.endsWith('/release'))?.body).toEqual({ version: 4 }));
  });

  it('says in the dialog what stands against releasing it', async () => {
    serve({
      ...served,
      'POST /api/bills/IRON/revisions/2/release': () => refusal(422, 'rule_broken', 'CORE is retired.'),
    });
    show(routes, '/designs/bills/IRON');
    await userEvent.click(await screen.findByRole('button', { name: 'Release revision 2' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Release it' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('CORE is retired.');
  });

  it('shows an assembler neither costs nor acts', async () => {
    const person = { id: 2, name: 'Assembler', email: 'a@fernhollow.example', role: 'assembler' as const };
    const calls = serve({ ...served, 'GET /api/session': () => ({ body: { ...owner, person } }) });
    show(routes, '/designs/bills/IRON');
    await screen.findByRole('table', { name: 'Lines' });
    await screen.findByRole('list', { name: 'What stops the next one' });
    expect(screen.queryByText('What one costs today')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Release/ })).not.toBeInTheDocument();
    expect(calls.some(({ route }) => route.endsWith('/cost'))).toBe(false);
  });
});

describe('the queue', () => {
  it('says what needs a hand, one act each', async () => {
    const item = (kind: string, code: string, more: object) => ({
      kind,
      part: part(code),
      number: 1,
      since: '2027-03-01T09:00:00Z',
      parts: [],
      against: [],
      ...more,
    });
    serve({
      ...served,
      'GET /api/design-queue': () => ({
        body: {
          items: [
            item('draft_waiting', 'LAMP', { against: ['Add at least one line: nothing is made of nothing.'] }),
            item('component_retired', 'IRON', { parts: ['CORE'] }),
            item('cannot_build', 'BOX', { parts: ['LABEL', 'LID'] }),
          ],
        },
      }),
    });
    const { container } = show(routes, '/designs');
    expect(await screen.findByRole('heading', { level: 1, name: 'Three designs need a hand' })).toBeInTheDocument();
    const [first, second, third] = screen.getAllByRole('listitem');
    expect(first).toHaveTextContent(/LAMP is not ready to be released\./);
    expect(first).toHaveTextContent('nothing is made of nothing');
    expect(second).toHaveTextContent(/asks for Part CORE, which is retired/);
    expect(third).toHaveTextContent(/LABEL, Part LID are missing/);
    await waitFor(() =>
      expect(screen.getByRole('link', { name: 'Go on with LAMP' })).toHaveAttribute(
        'href',
        '/designs/bills/LAMP/revisions/1/edit',
      ),
    );
    expect(await faultsOfAccess(container)).toEqual([]);
  });
});
