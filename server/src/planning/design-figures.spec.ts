import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { DraftBillsService } from '../bills/draft-bills.service.js';
import { ReleaseBillService } from '../bills/release-bill.service.js';
import type { BillContentDto, BillLineInputDto } from '../bills/bill.dto.js';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { ReservationsService } from '../stock/reservations.service.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import type { Agent } from '../testing/agent.js';
import { addBin, addLot, addPart, addShop, type PartRow } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { PlanningModule } from './planning.module.js';

let app: TestApp;
let owner: Agent;
let person: SignedInUser;
let bin: PartRow;
const parts = new Map<string, PartRow>();

async function add(code: string, more: Parameters<typeof addPart>[1] = {}): Promise<void> {
  parts.set(code, await addPart(app.database.handle, { code, ...more }));
}

function idOf(code: string): number {
  const part = parts.get(code);
  if (!part) throw new Error(`${code} was not added`);
  return part.id;
}

async function receive(code: string, quantity: string, value: number): Promise<void> {
  const lot = await addLot(app.database.handle, { partId: idOf(code) });
  await app.transaction(async (trx) => {
    const document = await app.get(DocumentsService).record(trx, { kind: 'receipt', recordedBy: null });
    const posted = await app.get(StockLedgerService).post(trx, document, [
      {
        direction: 'in',
        partId: idOf(code),
        lotId: lot.id,
        binId: bin.id,
        quantity: new Decimal(quantity),
        value: minorAmount(value),
        reason: 'receipt',
      },
    ]);
    const amounts = valueByComponent(posted);
    await app.get(JournalService).post(trx, { document, event: 'goods_received', narrative: 'spec', amounts });
  });
}

const line = (position: number, part: string, quantityPer: string, more: Partial<BillLineInputDto> = {}) => ({
  position,
  part,
  quantityPer,
  scrapPercent: '0',
  alternates: [],
  ...more,
});

async function make(code: string, content: Partial<BillContentDto>, released = true): Promise<void> {
  const { number, version } = await app.transaction((trx) =>
    app.get(DraftBillsService).createWith(trx, person, code, { lines: [], steps: [], testPlan: [], ...content }),
  );
  if (released) await app.get(ReleaseBillService).release(person, code, number, version);
}

const step = (minutes: string) => ({ title: 'Build', instruction: '', minutes });

beforeAll(async () => {
  app = await startTestApp({ modules: [PlanningModule] });
  owner = await app.agentFor('owner');
  person = await app.userOf(owner);
  await addShop(app.database.handle);
  bin = await addBin(app.database.handle);
  await add('IRON');
  await add('PACK');
  for (const code of ['CELL', 'CELL-B', 'CORE', 'SCREW', 'LABEL', 'EMPTY']) await add(code);
  await receive('CELL', '13', 4160);
  await receive('CELL-B', '6', 1800);
  await receive('CORE', '9', 855);
  await receive('SCREW', '40', 160);
  await make('PACK', { lines: [line(10, 'CELL', '3', { alternates: ['CELL-B'] })], steps: [step('5')] });
  await make('IRON', {
    lines: [line(10, 'PACK', '1'), line(20, 'CORE', '1'), line(30, 'SCREW', '4', { scrapPercent: '20' })],
    steps: [step('20')],
  });
});
afterAll(() => app.close());

describe('how many could be built now', () => {
  it('counts made parts, alternates and what is promised, and names what stops the next', async () => {
    const first = await owner.get('/api/bills/IRON/revisions/1/buildable').expect(200);
    // By hand: 13 cells are 4 packs and 6 of the alternate 2 more; 9 cores; 40 screws at 4 / 0.8 are 8.
    expect(first.body).toMatchObject({
      quantity: '6',
      atMost: '6',
      proven: true,
      stops: [{ part: { code: expect.stringMatching(/^CELL/) }, onShelf: expect.any(String) }],
      made: [{ part: { code: 'PACK' }, quantity: '6' }],
    });
    const taken = (first.body as { takes: { part: { code: string }; taken: string }[] }).takes;
    expect(Object.fromEntries(taken.map(({ part, taken }) => [part.code, taken]))).toEqual({
      CELL: '12',
      'CELL-B': '6',
      CORE: '6',
      SCREW: '30',
    });
  });

  it('leaves alone what is claimed', async () => {
    await app.transaction(async (trx) => {
      const reservations = app.get(ReservationsService);
      const quantity = new Decimal(7);
      const demand = { kind: 'batch_line' as const, partId: idOf('CORE'), quantity, neededOn: null, reference: 'B-1' };
      const [demandId] = await reservations.open(trx, [demand]);
      const claim = { demandId: demandId ?? 0, partId: idOf('CORE'), quantity, expiresAt: null };
      await reservations.claim(trx, [{ ...claim, supply: { kind: 'shelf' } }]);
    });
    const { body } = await owner.get('/api/bills/IRON/revisions/1/buildable').expect(200);
    expect(body).toMatchObject({
      quantity: '2',
      stops: [{ part: { code: 'CORE' }, missing: '1', onShelf: '9', usable: '9', claimed: '7' }],
      aloneEnough: [{ part: { code: 'CORE' }, missing: '1' }],
    });
  });

  it('is not asked of a bill without lines, nor by those outside', async () => {
    await make('EMPTY', {}, false);
    await owner.get('/api/bills/EMPTY/revisions/1/buildable').expect(409);
    await owner.get('/api/bills/CELL/revisions/1/buildable').expect(404);
    await (await app.visitor()).get('/api/bills/IRON/revisions/1/buildable').expect(401);
    await (await app.agentFor('accountant')).get('/api/bills/IRON/revisions/1/buildable').expect(403);
    await (await app.agentFor('assembler')).get('/api/bills/IRON/revisions/1/buildable').expect(200);
  });
});

describe('what one costs today', () => {
  it('rolls up average costs and minutes, and its lines add up', async () => {
    const { body } = await owner.get('/api/bills/IRON/revisions/1/cost').expect(200);
    // By hand: 3 × 3.20 + 0.95 + 5 × 0.04 = 10.75; 25 min at 36.00 an hour = 15.00.
    expect(body).toMatchObject({
      material: { amount: 1075, currency: 'EUR' },
      labour: { amount: 1500 },
      total: { amount: 2575 },
      ownMinutes: '20',
      minutes: '25',
      unknown: [],
      lines: [
        { part: { code: 'PACK' }, basis: 'bill', unitCost: '12.6', amount: { amount: 1260 } },
        { part: { code: 'CORE' }, basis: 'average', unitCost: '0.95', amount: { amount: 95 } },
        { part: { code: 'SCREW' }, basis: 'average', taken: '5', unitCost: '0.04', amount: { amount: 20 } },
      ],
    });
  });

  it('says what it does not know', async () => {
    await add('BOX');
    await make('BOX', { lines: [line(10, 'LABEL', '2')] }, false);
    const { body } = await owner.get('/api/bills/BOX/revisions/1/cost').expect(200);
    expect(body).toMatchObject({
      total: { amount: 0 },
      unknown: [{ code: 'LABEL' }],
      lines: [{ basis: 'unknown', unitCost: null, amount: { amount: 0 } }],
    });
  });

  it('is for the owner alone', async () => {
    await (await app.agentFor('assembler')).get('/api/bills/IRON/revisions/1/cost').expect(403);
    await (await app.visitor()).get('/api/bills/IRON/revisions/1/cost').expect(401);
  });
});

describe('the queue of the designs', () => {
  it('names drafts, retired components and what cannot be built', async () => {
    await add('LAMP');
    await make('LAMP', { lines: [line(10, 'LABEL', '2'), line(20, 'SCREW', '1')] });
    await app.database.handle
      .updateTable('part')
      .set({ retired_on: '2027-02-01' })
      .where('code', '=', 'CORE')
      .execute();
    const { body } = await owner.get('/api/design-queue').expect(200);
    expect(body).toMatchObject({
      items: [
        {
          kind: 'draft_waiting',
          part: { code: 'EMPTY' },
          against: ['Add at least one line: nothing is made of nothing.'],
        },
        { kind: 'draft_waiting', part: { code: 'BOX' }, number: 1, against: [] },
        { kind: 'component_retired', part: { code: 'IRON' }, parts: ['CORE'] },
        { kind: 'cannot_build', part: { code: 'LAMP' }, parts: ['LABEL'] },
      ],
    });
    await (await app.agentFor('customer')).get('/api/design-queue').expect(403);
    await (await app.visitor()).get('/api/design-queue').expect(401);
  });
});
