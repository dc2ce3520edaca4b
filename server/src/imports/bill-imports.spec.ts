import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { addPart } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { ImportCheckDto } from './imports.dto.js';
import { ImportsModule } from './imports.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [ImportsModule] });
  owner = await app.agentFor('owner');
  const handle = app.database.handle;
  await addPart(handle, { code: 'IRON', traced: 'single', letters: 'IR' });
  for (const code of ['BOARD', 'COIL', 'CHIP', 'CHIP-B', 'SCREW', 'CORE']) await addPart(handle, { code });
  await addPart(handle, { code: 'WIRE', measure: 'm' });
});
afterAll(() => app.close(), 30_000);

const dryRun = async (kind: string, text: string): Promise<ImportCheckDto> => {
  const answer = await owner.upload(`/api/imports/${kind}/dry-run`, 'file', Buffer.from(text), 'bill.csv').expect(200);
  return answer.body as ImportCheckDto;
};
const apply = (kind: string, text: string) =>
  owner.upload(`/api/imports/${kind}`, 'file', Buffer.from(text), 'bill.csv').set('Idempotency-Key', randomUUID());

const faultsOf = ({ faults }: ImportCheckDto) =>
  faults.map(({ line, column, sentence }) => `${line} ${column}: ${sentence}`);
const draftCount = async () =>
  (await app.database.handle.selectFrom('bill_revision').select('id').where('status', '=', 'draft').execute()).length;

const bill = [
  'Made part;Component;Quantity for one;Scrap %;Marks;May be replaced by;Colour',
  'iron;board;1;;;;red',
  'IRON;SCREW;4;2,5;;;',
  'BOARD;CHIP;2;;U1 U2;chip-b;',
  'BOARD;COIL;1;;;;',
  'COIL;WIRE;5,6;4;;;',
].join('\r\n');

const steps = [
  'Made part,Step,What to do,How,Minutes,Caution',
  'IRON,2,Close the shell,,3,',
  'IRON,1,Fit the board,"Press, until it clicks",2.5,The tip is hot.',
  'COIL,1,Wind,,12,',
].join('\n');

const plan = [
  'Made part,What is looked at,Answered by,At least,Aim,At most,Unit,Decimals,Taken at,Caution',
  'IRON,Shell closes,yes or no,,,,,,by eye,',
  'IRON,Time to 350 °C,a number,,,4.5,s,1,from 25 °C,The tip is hot.',
].join('\n');

describe('a bill from a table', () => {
  it('says what would happen, and writes nothing', async () => {
    const check = await dryRun('bill', `\uFEFF${bill}`);
    expect(faultsOf(check)).toEqual([]);
    expect(check).toMatchObject({ rowCount: 5, separator: ';', decimalSign: 'comma', ready: true, additions: 3 });
    expect(check.notes).toEqual(['3 drafts will be begun: IRON, BOARD, COIL.']);
    expect(await draftCount()).toBe(0);
  });

  it('becomes a draft of each made part, over all levels, with steps and test plan from their own tables', async () => {
    await apply('bill', bill).expect(201);
    await apply('build_steps', steps).expect(201);
    await apply('test_plan', plan).expect(201);
    const iron = await owner.get('/api/bills/IRON/revisions/1').expect(200);
    expect(iron.body).toMatchObject({
      status: 'draft',
      lines: [
        { position: 10, part: { code: 'BOARD' }, quantityPer: '1', scrapPercent: '0' },
        { position: 20, part: { code: 'SCREW' }, quantityPer: '4', scrapPercent: '2.5' },
      ],
      steps: [
        {
          position: 1,
          title: 'Fit the board',
          instruction: 'Press, until it clicks',
          minutes: '2.5',
          caution: 'The tip is hot.',
        },
        { position: 2, title: 'Close the shell', minutes: '3', caution: null },
      ],
      testPlan: [
        { name: 'Shell closes', kind: 'yes_no', condition: 'by eye', unit: null },
        { name: 'Time to 350 °C', kind: 'numeric', upperLimit: '4.5', lowerLimit: null, unit: 's', digits: 1 },
      ],
    });
    const board = await owner.get('/api/bills/BOARD/revisions/1').expect(200);
    expect(board.body).toMatchObject({ lines: [{ marks: 'U1 U2', alternates: [{ code: 'CHIP-B' }] }, {}], steps: [] });
    for (const code of ['COIL', 'BOARD', 'IRON']) {
      const { version } = (await owner.get(`/api/bills/${code}/revisions/1`).expect(200)).body as { version: number };
      await owner.post(`/api/bills/${code}/revisions/1/release`, { version }).expect(200);
    }
  });

  it('leaves alone what says the same already', async () => {
    for (const [kind, text] of [
      ['bill', bill],
      ['build_steps', steps],
      ['test_plan', plan],
    ] as const) {
      const check = await dryRun(kind, text);
      expect(check).toMatchObject({ ready: false, faultCount: 0, additions: 0 });
      await apply(kind, text).expect(422);
    }
    expect(await draftCount()).toBe(0);
  });

  it('begins a draft from the released revision, and replaces the lines of a draft', async () => {
    const changed = bill.replace('IRON;SCREW;4', 'IRON;SCREW;6');
    const check = await dryRun('bill', changed);
    expect(check.notes).toEqual(['1 draft will be begun: IRON.', '2 bills say this already: BOARD, COIL.']);
    await apply('bill', changed).expect(201);
    const draft = await owner.get('/api/bills/IRON/revisions/2').expect(200);
    expect(draft.body).toMatchObject({ lines: [{}, { quantityPer: '6' }], steps: [{}, {}], testPlan: [{}, {}] });
    const again = bill.replace('IRON;SCREW;4', 'IRON;SCREW;8');
    expect((await dryRun('bill', again)).notes[0]).toBe('The lines of 1 draft will be put in place: IRON.');
    await apply('bill', again).expect(201);
    const replaced = await owner.get('/api/bills/IRON/revisions/2').expect(200);
    expect(replaced.body).toMatchObject({ lines: [{}, { quantityPer: '8' }], steps: [{}, {}] });
  });

  it('turns two drafts round where their old lines would seem to close a loop', async () => {
    await apply('bill', 'Made part,Component,Quantity for one\nCHIP,CORE,1\n').expect(201);
    await apply('bill', 'Made part,Component,Quantity for one\nCORE,CHIP,1\nCHIP,WIRE,1\n').expect(201);
    expect((await owner.get('/api/bills/CORE/revisions/1').expect(200)).body).toMatchObject({
      lines: [{ part: { code: 'CHIP' } }],
    });
  });
});

describe('a bill with faults is refused whole, with each fault by line', () => {
  const head = 'Made part,Component,Quantity for one,Scrap %,Position,May be replaced by\n';

  it('for unknown parts, quantities, positions and lines that stand twice', async () => {
    const text = [
      'GHOST,CHIP,1,,,',
      'SCREW,NOBODY,1,,,',
      'SCREW,CHIP,0.5,,10,WIRE',
      'SCREW,WIRE,1,,10,',
      'CHIP-B,CHIP,1,,,',
      'CHIP-B,CHIP,2,,,',
    ].join('\n');
    const check = await dryRun('bill', head + text);
    expect(faultsOf(check)).toEqual([
      '2 Made part: There is no part GHOST. Take in the parts first.',
      '3 Component: There is no part NOBODY. Add it to the shelf first.',
      expect.stringMatching(/^4 May be replaced by: WIRE is kept in m and CHIP in piece/),
      expect.stringMatching(/^4 Quantity for one: /),
      '5 Position: Another line has this position.',
      '7 Component: CHIP stands in the bill of CHIP-B already. Add the quantities up, or give both a position.',
    ]);
    const refused = await apply('bill', head + text).expect(400);
    expect(refused.body).toMatchObject({ code: 'invalid_input', check: { faultCount: 6 } });
    expect((await owner.get('/api/bills/CHIP-B').expect(200)).body).toMatchObject({ revisions: [] });
  });

  it('for loops, within the file and through what is there, by parts and by alternates', async () => {
    const within = await dryRun('bill', `${head}SCREW,CHIP-B,1,,,\nCHIP-B,SCREW,1,,,\n`);
    expect(faultsOf(within)).toEqual([
      '2 Component: A bill may not contain itself: SCREW contains CHIP-B contains SCREW.',
    ]);
    const through = await dryRun('bill', `${head}WIRE,SCREW,1,,,\nSCREW,CHIP-B,1,,,COIL\n`);
    expect(faultsOf(through)).toEqual([expect.stringMatching(/^2 Component: .* COIL contains WIRE contains SCREW/)]);
    const itself = await dryRun('bill', `${head}SCREW,SCREW,1,,,\n`);
    expect(faultsOf(itself)[0]).toBe('2 Component: A bill may not contain itself: SCREW contains SCREW.');
  });

  it('for numbers that are none, and for scrap of everything', async () => {
    const check = await dryRun('bill', `${head}SCREW,CHIP,many,,,\nSCREW,CHIP-B,-1,,,\nSCREW,CORE,1,100,,\n`);
    expect(faultsOf(check).slice(0, 2)).toEqual([
      '2 Quantity for one: “many” is not a number.',
      '3 Quantity for one: -1 must be above zero.',
    ]);
    const scrap = await dryRun('bill', `${head}SCREW,CORE,1,100,,\n`);
    expect(faultsOf(scrap)).toEqual(['2 Scrap %: Not everything can be lost: stay below 100.']);
  });

  it('for a test plan whose limits are no limits, and steps that claim one place', async () => {
    const limits = await dryRun('test_plan', `${plan}\nIRON,Shell closes,a number,5,,4,V,1,,\n`);
    expect(faultsOf(limits)).toEqual([
      '4 At most: The upper limit must lie above the lower one.',
      '4 What is looked at: Another line of the test plan has this name.',
    ]);
    const places = await dryRun('build_steps', `${steps}\nIRON,1,Again,,1,\n`);
    expect(faultsOf(places)).toEqual(['5 Step: 1 stands in line 3 already.']);
  });

  it('is for the owner alone', async () => {
    const file = ['file', Buffer.from(bill), 'bill.csv'] as const;
    await (await app.visitor()).upload('/api/imports/bill/dry-run', ...file).expect(401);
    await (await app.agentFor('assembler')).upload('/api/imports/bill/dry-run', ...file).expect(403);
  });

  it('has templates that the import itself takes, once their parts are there', async () => {
    const handle = app.database.handle;
    for (const code of ['TOOL-60', 'BOARD-60', 'SCREW-M2', 'SCREW-M2-B', 'R-10K-06']) await addPart(handle, { code });
    for (const kind of ['bill', 'build_steps', 'test_plan']) {
      const template = await owner.get(`/api/imports/${kind}/template`).expect(200);
      expect(faultsOf(await dryRun(kind, template.text))).toEqual([]);
    }
  });
});
