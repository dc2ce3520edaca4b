import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import type { Agent } from '../testing/agent.js';
import { addPart } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { BillsModule } from './bills.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [BillsModule] });
  owner = await app.agentFor('owner');
  const handle = app.database.handle;
  await addPart(handle, { code: 'IRON', name: 'Soldering iron', traced: 'single', letters: 'IR' });
  for (const code of ['BOARD', 'COIL', 'CASE', 'SCREW', 'SCREW-B', 'CHIP', 'CHIP-B']) await addPart(handle, { code });
  await addPart(handle, { code: 'WIRE', measure: 'm' });
});
afterAll(() => app.close());

interface LineInput {
  readonly position: number;
  readonly part: string;
  readonly quantityPer: string;
  readonly scrapPercent: string;
  readonly marks?: string | null;
  readonly alternates: readonly string[];
}

const line = (position: number, part: string, quantityPer = '1', more: Partial<LineInput> = {}): LineInput => ({
  position,
  part,
  quantityPer,
  scrapPercent: '0',
  alternates: [],
  ...more,
});
const step = { title: 'Fit the board', instruction: 'Press it home.', minutes: '2.5', caution: 'Hot tip near.' };
const heat = {
  name: 'Time to 350 °C',
  kind: 'numeric',
  unit: 's',
  lowerLimit: '2',
  target: '4.5',
  upperLimit: '8',
  digits: 1,
  condition: 'from cold, full pack',
  caution: 'The tip is hot.',
};
const looksRight = { name: 'Joints sound', kind: 'yes_no' };

interface Revision {
  readonly number: number;
  readonly version: number;
  readonly status: string;
}

async function draft(code: string, content: object): Promise<Revision> {
  const created = await owner.create(`/api/bills/${code}/revisions`, { from: 'nothing' }).expect(201);
  const { number, version } = created.body as Revision;
  const saved = await owner
    .put(`/api/bills/${code}/revisions/${number}`, { version, lines: [], steps: [], testPlan: [], ...content })
    .expect(200);
  return saved.body as Revision;
}

async function released(code: string, content: object): Promise<Revision> {
  const { number, version } = await draft(code, content);
  const answer = await owner.post(`/api/bills/${code}/revisions/${number}/release`, { version }).expect(200);
  return answer.body as Revision;
}

const errorsOf = (body: unknown) => (body as { errors: { pointer: string; detail: string }[] }).errors;
const pointersOf = (body: unknown) => errorsOf(body).map(({ pointer }) => pointer);

describe('a bill', () => {
  it('begins as an empty draft, is saved whole, and is released', async () => {
    await released('COIL', {
      lines: [line(10, 'WIRE', '5.6', { scrapPercent: '4' })],
      steps: [{ ...step, caution: null }],
    });
    await released('BOARD', {
      lines: [line(10, 'CHIP', '2', { marks: 'U1 U2', alternates: ['CHIP-B'] }), line(20, 'COIL')],
    });
    const iron = await draft('IRON', {
      note: 'First for sale',
      lines: [line(10, 'BOARD'), line(30, 'SCREW', '4', { scrapPercent: '2.5' }), line(20, 'CASE')],
      steps: [step],
      testPlan: [heat, looksRight],
    });
    expect(iron).toMatchObject({
      number: 1,
      status: 'draft',
      version: 2,
      note: 'First for sale',
      minutes: '2.5',
      part: { code: 'IRON', traced: 'single' },
      lines: [
        { position: 10, part: { code: 'BOARD' }, madeBy: 1 },
        { position: 20, part: { code: 'CASE' }, madeBy: null },
        { position: 30, part: { code: 'SCREW' }, quantityPer: '4', scrapPercent: '2.5', marks: null },
      ],
      steps: [{ position: 1, ...step }],
      testPlan: [
        { position: 1, ...heat },
        { position: 2, ...looksRight, unit: null, digits: null, caution: null },
      ],
    });
    const path = '/api/bills/IRON/revisions/1';
    const answer = await owner.post(`${path}/release`, { version: 2 }).expect(200);
    expect(answer.body).toMatchObject({ status: 'released', version: 3, releasedAt: '2027-03-01T09:00:00.000Z' });
    const frozen = await owner.put(path, { version: 3, lines: [], steps: [], testPlan: [] }).expect(409);
    expect(frozen.body).toMatchObject({ code: 'wrong_state' });
    await owner.post(`${path}/release`, { version: 3 }).expect(409);
    await owner.post(`${path}/discard`, { version: 3 }).expect(409);
  });

  it('is shown over all levels, place by place and summed', async () => {
    const { body } = await owner.get('/api/bills/IRON/revisions/1/tree?quantity=10').expect(200);
    const rows = (body as { rows: { path: number[]; part: { code: string }; quantity: string }[] }).rows;
    expect(rows.map(({ path, part, quantity }) => [path.join('.'), part.code, quantity])).toEqual([
      ['10', 'BOARD', '10'],
      ['10.10', 'CHIP', '20'],
      ['10.20', 'COIL', '10'],
      ['10.20.10', 'WIRE', '58.3333'],
      ['20', 'CASE', '10'],
      ['30', 'SCREW', '41.0256'],
    ]);
    const totals = (body as { totals: { part: { code: string }; quantity: string; made: boolean }[] }).totals;
    expect(totals.find(({ part }) => part.code === 'SCREW')).toMatchObject({ quantity: '42', made: false });
    expect(totals.find(({ part }) => part.code === 'WIRE')).toMatchObject({ quantity: '58.333334', level: 3 });
    await owner.get('/api/bills/IRON/revisions/1/tree?quantity=0').expect(400);
    await owner.get('/api/bills/IRON/revisions/9/tree').expect(404);
  });

  it('gets a second draft from the released one, which supersedes it line by line', async () => {
    await owner.create('/api/bills/CASE/revisions', { from: 'released' }).expect(409);
    const second = await owner.create('/api/bills/IRON/revisions', { from: 'released' }).expect(201);
    expect(second.body).toMatchObject({
      number: 2,
      status: 'draft',
      lines: [{}, {}, {}],
      steps: [step],
      testPlan: [heat, {}],
    });
    const again = await owner.create('/api/bills/IRON/revisions', { from: 'nothing' }).expect(409);
    expect(again.body).toMatchObject({ code: 'already_exists' });
    const edited = await owner
      .put('/api/bills/IRON/revisions/2', {
        version: (second.body as Revision).version,
        lines: [
          line(10, 'BOARD', '1', { marks: 'B' }),
          line(30, 'SCREW', '6', { scrapPercent: '2.5' }),
          line(40, 'WIRE', '0.25'),
        ],
        steps: [{ ...step, minutes: '3' }],
        testPlan: [heat],
      })
      .expect(200);
    const { version } = edited.body as Revision;
    await owner.post('/api/bills/IRON/revisions/2/release', { version }).expect(200);
    const bill = await owner.get('/api/bills/IRON').expect(200);
    expect(bill.body).toMatchObject({
      released: 2,
      draft: null,
      revisions: [
        { number: 2, status: 'released' },
        { number: 1, status: 'superseded', supersededAt: '2027-03-01T09:00:00.000Z' },
      ],
    });
    const { body } = await owner.get('/api/bills/IRON/comparison?from=1&to=2').expect(200);
    expect(body).toMatchObject({
      lines: [
        { kind: 'changed', fields: ['quantityPer'], before: { quantityPer: '4' }, after: { quantityPer: '6' } },
        { kind: 'added', after: { part: { code: 'WIRE' } } },
        { kind: 'removed', before: { part: { code: 'CASE' } }, after: null },
        { kind: 'changed', fields: ['marks'], after: { part: { code: 'BOARD' }, marks: 'B' } },
      ],
      steps: [{ kind: 'changed', fields: ['minutes'] }],
      testPlan: [{ kind: 'removed', before: { name: 'Joints sound' } }],
    });
    await owner.get('/api/bills/IRON/comparison?from=1&to=x').expect(400);
  });

  it('is found in what uses it, at every level', async () => {
    const { body } = await owner.get('/api/bills/WIRE/where-used').expect(200);
    const uses = (body as { uses: { path: string[]; top: boolean; quantityPer: string }[] }).uses;
    expect(uses.map(({ path, top, quantityPer }) => [path.join(' < '), quantityPer, top])).toEqual([
      ['WIRE < COIL', '5.6', false],
      ['WIRE < COIL < BOARD', '1', false],
      ['WIRE < COIL < BOARD < IRON', '1', true],
      ['WIRE < IRON', '0.25', true],
    ]);
    const alternate = await owner.get('/api/bills/CHIP-B/where-used').expect(200);
    expect(alternate.body).toMatchObject({
      uses: [{ part: { code: 'BOARD' }, alternate: true, level: 1 }, { level: 2 }],
    });
    await owner.get('/api/bills/NONE/where-used').expect(404);
  });

  it('is listed, filtered and sorted', async () => {
    await draft('SCREW-B', {});
    const all = await owner.get('/api/bills?sort=-minutes').expect(200);
    expect(all.body).toMatchObject({
      total: 4,
      items: [{ code: 'IRON', released: 2, lines: 3, minutes: '3', usedIn: 0 }, {}, {}, {}],
    });
    const drafts = await owner.get('/api/bills?state=unreleased&q=screw').expect(200);
    expect(drafts.body).toMatchObject({
      total: 1,
      items: [{ code: 'SCREW-B', released: null, draft: 1, draftVersion: 2 }],
    });
    await owner.get('/api/bills?sort=secret').expect(400);
    const parts = await owner.get('/api/bill-components?q=screw').expect(200);
    expect(parts.body).toMatchObject({ total: 2, items: [{ code: 'SCREW', made: false }, { code: 'SCREW-B' }] });
  });
});

describe('two people with one draft', () => {
  it('the second sees both states and may take over', async () => {
    const open = await draft('CASE', { lines: [line(10, 'SCREW', '2')] });
    const path = `/api/bills/CASE/revisions/${open.number}`;
    const mine = { version: open.version, lines: [line(10, 'SCREW', '3')], steps: [], testPlan: [] };
    const theirs = { ...mine, lines: [line(10, 'SCREW', '4')] };
    await owner.put(path, theirs).expect(200);
    const stale = await owner.put(path, mine).expect(409);
    expect(stale.body).toMatchObject({
      code: 'changed_meanwhile',
      current: { version: open.version + 1, lines: [{ quantityPer: '4' }] },
    });
    const { current } = stale.body as { current: Revision };
    await owner.post(`${path}/release`, { version: open.version }).expect(409);
    const taken = await owner.put(path, { ...mine, version: current.version }).expect(200);
    expect(taken.body).toMatchObject({ lines: [{ quantityPer: '3' }] });
    await owner.post(`${path}/discard`, { version: open.version }).expect(409);
    await owner.post(`${path}/discard`, { version: (taken.body as Revision).version }).expect(204);
    await owner.get(path).expect(404);
  });
});

describe('a content is refused', () => {
  const path = '/api/bills/SCREW-B/revisions/1';
  const content = { version: 2, lines: [], steps: [], testPlan: [] };

  it('with everything that is wrong beside its field, and nothing kept', async () => {
    const bad = {
      ...content,
      lines: [line(10, 'NOBODY'), line(10, 'CHIP', '0.5', { alternates: ['WIRE', 'CHIP', 'GHOST'] })],
      testPlan: [
        { ...heat, lowerLimit: '9' },
        { ...heat, unit: null, lowerLimit: null, upperLimit: null },
        { ...looksRight, unit: 'V' },
        { ...heat, name: 'Other', target: '90' },
      ],
    };
    const { body } = await owner.put(path, bad).expect(400);
    expect(pointersOf(body).toSorted()).toEqual([
      '/lines/0/part',
      '/lines/1/alternates',
      '/lines/1/alternates',
      '/lines/1/alternates',
      '/lines/1/position',
      '/lines/1/quantityPer',
      '/testPlan/0/upperLimit',
      '/testPlan/1/lowerLimit',
      '/testPlan/1/name',
      '/testPlan/1/unit',
      '/testPlan/2/kind',
      '/testPlan/3/target',
    ]);
    expect((await owner.get(path).expect(200)).body).toMatchObject({ version: 2, lines: [] });
  });

  it.each([
    ['quantityPer', '0'],
    ['quantityPer', '-1'],
    ['quantityPer', '1.1234567'],
    ['quantityPer', '9'.repeat(13)],
    ['quantityPer', 3],
    ['scrapPercent', '100'],
    ['scrapPercent', '-1'],
    ['position', 0],
    ['position', 1.5],
    ['part', ''],
    ['alternates', 'CHIP'],
    ['alternates', ['no code']],
  ])('for the %s %j', async (field, value) => {
    const { body } = await owner
      .put(path, { ...content, lines: [{ ...line(10, 'CHIP'), [field]: value }] })
      .expect(400);
    expect(pointersOf(body)[0]).toMatch(new RegExp(`^/lines/0/${field}`));
  });

  it('when it stands against release', async () => {
    const handle = app.database.handle;
    await addPart(handle, { code: 'TOOL', traced: 'single', letters: 'TO' });
    await addPart(handle, { code: 'OLD' });
    const empty = await draft('TOOL', {});
    const nothing = await owner.post('/api/bills/TOOL/revisions/1/release', { version: empty.version }).expect(422);
    expect(pointersOf(nothing.body)).toEqual(['/lines', '/testPlan']);
    const filled = await owner
      .put('/api/bills/TOOL/revisions/1', {
        version: empty.version,
        lines: [line(10, 'OLD'), line(20, 'CHIP', '1', { alternates: ['OLD'] })],
        steps: [],
        testPlan: [heat],
      })
      .expect(200);
    await handle.updateTable('part').set({ retired_on: '2027-02-01' }).where('code', '=', 'OLD').execute();
    const { version } = filled.body as Revision;
    const old = await owner.post('/api/bills/TOOL/revisions/1/release', { version }).expect(422);
    expect(pointersOf(old.body)).toEqual(['/lines/0/part', '/lines/1/alternates']);
    expect((await owner.get('/api/bills/TOOL').expect(200)).body).toMatchObject({ released: null, draft: 1 });
  });
});

describe('who may', () => {
  it('visitors are asked to sign in, customers and the accountant are kept out, assemblers read', async () => {
    const routes = ['/api/bills', '/api/bills/IRON', '/api/bills/IRON/revisions/2', '/api/bill-components'];
    const visitor = await app.visitor();
    const accountant = await app.agentFor('accountant');
    const customer = await app.agentFor('customer');
    const assembler = await app.agentFor('assembler');
    for (const route of routes) {
      await visitor.get(route).expect(401);
      await accountant.get(route).expect(403);
      await customer.get(route).expect(403);
      await assembler.get(route).expect(200);
    }
    await assembler.create('/api/bills/CHIP/revisions', { from: 'nothing' }).expect(403);
    await assembler
      .put('/api/bills/SCREW-B/revisions/1', { version: 2, lines: [], steps: [], testPlan: [] })
      .expect(403);
    await assembler.post('/api/bills/SCREW-B/revisions/1/release', { version: 2 }).expect(403);
    await assembler.post('/api/bills/SCREW-B/revisions/1/discard', { version: 2 }).expect(403);
  });

  it('who did what is on record', async () => {
    const rows = await app.database.handle
      .selectFrom('audit_entry')
      .select(['action', 'subject_code'])
      .where('subject_code', 'like', 'IRON revision%')
      .orderBy('id')
      .execute();
    expect(rows.map(({ action, subject_code }) => `${subject_code} ${action}`)).toEqual([
      'IRON revision 1 bill.draft_created',
      'IRON revision 1 bill.edited',
      'IRON revision 1 bill.released',
      'IRON revision 2 bill.draft_created',
      'IRON revision 2 bill.edited',
      'IRON revision 2 bill.released',
    ]);
  });
});

describe('what the database itself refuses the server', () => {
  it.each([
    ['a changed line', `update bill_line set quantity_per = 9 where revision_id = $r`],
    ['a removed line', `delete from bill_line where revision_id = $r`],
    [
      'an added line',
      `insert into bill_line (revision_id, position, part_id, quantity_per) select $r, 900, min(id), 1 from part`,
    ],
    [
      'an added alternate',
      `insert into bill_line_alternate (line_id, part_id, priority) select min(l.id), min(p.id), 9 from bill_line l, part p where l.revision_id = $r`,
    ],
    ['a changed step', `update build_step set minutes = 0 where revision_id = $r`],
    ['a removed step', `delete from build_step where revision_id = $r`],
    ['a wider limit', `update characteristic set upper_limit = 900 where revision_id = $r`],
    ['a removed characteristic', `delete from characteristic where revision_id = $r`],
    ['a return to draft', `update bill_revision set status = 'draft', released_at = null where id = $r`],
    ['another note', `update bill_revision set note = 'other' where id = $r`],
    ['its removal', `delete from bill_revision where id = $r`],
  ])('%s of a released revision', async (_what, statement) => {
    const handle = app.database.handle;
    const { id } = await handle
      .selectFrom('bill_revision as r')
      .innerJoin('part', 'part.id', 'r.part_id')
      .select('r.id')
      .where('part.code', '=', 'IRON')
      .where('r.status', '=', 'released')
      .executeTakeFirstOrThrow();
    await expect(sql.raw(statement.replaceAll('$r', String(id))).execute(handle)).rejects.toMatchObject({
      constraint: 'bill_revision_frozen',
    });
  });

  it('an alternate that is carried from a released line to a draft', async () => {
    const handle = app.database.handle;
    const moved = sql`
      update bill_line_alternate set line_id = (
        select l.id from bill_line l join bill_revision r on r.id = l.revision_id where r.status = 'draft' limit 1
      ) where line_id in (select l.id from bill_line l join bill_revision r on r.id = l.revision_id where r.status = 'released')
    `.execute(handle);
    await expect(moved).rejects.toMatchObject({ constraint: 'bill_revision_frozen' });
  });
});
