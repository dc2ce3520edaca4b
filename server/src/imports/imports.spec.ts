import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import type { Agent } from '../testing/agent.js';
import { addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { AppliedImportDto, ImportCheckDto } from './imports.dto.js';
import { ImportsModule } from './imports.module.js';

let app: TestApp;
let owner: Agent;

beforeAll(async () => {
  app = await startTestApp({ modules: [ImportsModule] });
  await addShop(app.database.handle);
  owner = await app.agentFor('owner');
});
afterAll(() => app.close(), 30_000);

const send = (kind: string, text: string | Buffer, fields: Record<string, string> = {}, agent = owner) => {
  const upload = agent.upload(`/api/imports/${kind}`, 'file', Buffer.from(text), 'table.csv');
  for (const [name, value] of Object.entries(fields)) void upload.field(name, value);
  return upload;
};
const dryRun = async (kind: string, text: string | Buffer, fields: Record<string, string> = {}) =>
  (await send(`${kind}/dry-run`, text, fields).expect(200)).body as ImportCheckDto;
const apply = (kind: string, text: string, key: string = randomUUID(), fields: Record<string, string> = {}) =>
  send(kind, text, fields).set('Idempotency-Key', key);
const applied = async (kind: string, text: string) => (await apply(kind, text).expect(201)).body as AppliedImportDto;

const count = async (table: 'part' | 'lot' | 'stock_move' | 'supplier' | 'bin') => {
  const row = await app.database.handle
    .selectFrom(table)
    .select(sql<number>`count(*)`.as('n'))
    .executeTakeFirstOrThrow();
  return row.n;
};

const parts = [
  'Part code;Name;Stock unit;Followed;Weight of one (g);Reorder point;Supplier;Lead time;Cell or battery;Chemistry;Watt-hours;Parameter: Resistance [kΩ];Parameter: Case;Colour',
  'r-10k;Resistor 10 kΩ;piece;by count;0,03;200;parts-co;7;;;;10,0;0603;red',
  'CELL-18;"Cell; 2,5 Ah";pcs;lots;45,5;60;CELLS-CO;21;cell;li-ion;9,25;;;',
  'CU-WIRE;Copper wire 1.5 mm;m;by delivery;15,7;;;;;;;;;',
].join('\r\n');

describe('taking in parts', () => {
  it('finds the columns, says what would happen, and writes nothing', async () => {
    const check = await dryRun('parts', `\uFEFF${parts}\r\n`);
    expect(check).toMatchObject({
      rowCount: 3,
      separator: ';',
      decimalSign: 'comma',
      faultCount: 0,
      additions: 3,
      ready: true,
    });
    expect(check.notes).toEqual(['3 parts will be added.', '2 suppliers will be added by code: PARTS-CO, CELLS-CO.']);
    expect(check.columns.find(({ header }) => header === 'Colour')).toMatchObject({ key: null, sample: 'red' });
    expect(check.columns.find(({ header }) => header === 'Lead time')).toMatchObject({
      key: 'leadTimeDays',
      sample: '7',
    });
    expect(await count('part')).toBe(0);
  });

  it('adds all of it once, with suppliers, parameters and battery data', async () => {
    const key = randomUUID();
    const first = await apply('parts', parts, key).expect(201);
    const again = await apply('parts', parts, key).expect(201);
    expect(again.body).toEqual(first.body);
    expect(await count('part')).toBe(3);
    const { rows } = await sql<{ said: string }>`
      select p.code || ' ' || p.measure || ' ' || p.traced || ' ' || trim_scale(p.unit_weight_g) || ' ' ||
        coalesce(s.code, '-') || ' ' || coalesce(b.kind || ' ' || trim_scale(b.watt_hours), '-') || ' ' ||
        coalesce((select string_agg(q.name || '=' || coalesce(q.value_text, trim_scale(q.value_number)::text) ||
          coalesce(q.unit, ''), ',' order by q.id) from part_parameter q where q.part_id = p.id), '-') as said
      from part p left join part_supplier ps on ps.part_id = p.id left join supplier s on s.id = ps.supplier_id
      left join part_battery b on b.part_id = p.id order by p.id`.execute(app.database.handle);
    expect(rows.map(({ said }) => said)).toEqual([
      'R-10K piece count 0.03 PARTS-CO - Resistance=10kΩ,Case=0603',
      'CELL-18 piece delivery 45.5 CELLS-CO cell 9.25 -',
      'CU-WIRE m delivery 15.7 - - -',
    ]);
  });

  it('says which parts exist when the file comes again, and changes nothing', async () => {
    const check = await dryRun('parts', parts);
    expect(check).toMatchObject({ faultCount: 0, additions: 0, ready: false });
    expect(check.notes).toEqual(['3 parts of the file are on record already and stay as they are.']);
    expect((await apply('parts', parts).expect(422)).body).toMatchObject({ code: 'rule_broken' });
    expect(await count('part')).toBe(3);
  });

  it('names codes that stand twice, or otherwise than on record', async () => {
    const text = 'Part code,Name,Stock unit,Followed\nNEW,A,piece,count\nnew,B,piece,count\nR-10K,Other name,m,count\n';
    const { faults, ready, notes } = await dryRun('parts', text);
    expect(ready).toBe(false);
    expect(faults.map(({ line, column }) => [line, column])).toEqual([
      [3, 'Part code'],
      [4, 'Part code'],
    ]);
    expect(faults[0]?.sentence).toContain('line 2');
    expect(faults[1]?.sentence).toContain('another name, stock unit');
    expect(notes).toHaveLength(2);
    const refused = await apply('parts', text).expect(400);
    expect(refused.body).toMatchObject({ code: 'invalid_input', check: { faultCount: 2 } });
    expect(await count('part')).toBe(3);
  });

  it('names every fault of every line', async () => {
    const text = [
      'Part code,Name,Stock unit,Followed,Serial letters,Weight of one (g),Country of origin,Supplier,Lead time (days),Cell or battery,Chemistry,Watt-hours,Lithium (g)',
      'BAD CODE,x,piece,count,,,,,,,,,',
      'OK-1,,piece,count,,,,,,,,,',
      'OK-2,x,barrel,count,,,,,,,,,',
      'OK-3,x,m,one by one,,,,,,,,,',
      'OK-4,x,piece,count,AB,,,,,,,,',
      'OK-5,x,piece,count,,-1,,,,,,,',
      'OK-6,x,piece,count,,1.2345678,,,,,,,',
      'OK-7,x,piece,count,,,ZZ,,,,,,',
      'OK-8,x,piece,count,,,,,5,,,,',
      'OK-9,x,piece,count,,,,,,cell,lithium metal,,',
      'OK-10,x,piece,count,,,,,,,,7.4,',
      'OK-11,x,piece,count,,,,,,pack,,1,',
      'OK-12,x,piece,one by one,TT,,,,,,,,',
      'OK-13,x,piece,one by one,TT,,,,,,,,,surplus',
    ].join('\n');
    const { faults, faultCount } = await dryRun('parts', text);
    expect(faultCount).toBe(faults.length);
    expect(faults.map(({ line, column }) => `${line} ${column ?? ''}`.trim())).toEqual([
      '2 Part code',
      '3 Name',
      '4 Stock unit',
      '5 Serial letters',
      '5 Stock unit',
      '6 Serial letters',
      '7 Weight of one (g)',
      '8 Weight of one (g)',
      '9 Country of origin',
      '10 Supplier',
      '11 Lithium (g)',
      '12 Watt-hours',
      '13 Chemistry',
      '15',
    ]);
    expect(faults.every(({ sentence }) => /[.]$/.test(sentence))).toBe(true);
    const letters = 'Part code,Name,Stock unit,Followed,Serial letters\nX-1,x,piece,single,TT\nX-2,x,piece,single,TT\n';
    expect((await dryRun('parts', letters)).faults.map(({ sentence }) => sentence)).toEqual([
      'TT are the letters of line 2 already.',
    ]);
  });

  it('asks for columns that are missing, and takes a person’s choice', async () => {
    const text = 'Artikel;Bezeichnung;Stock unit;Followed\nA-1;Schraube;piece;count\n';
    const check = await dryRun('parts', text);
    expect(check.faults.map(({ column }) => column)).toEqual(['Part code', 'Name']);
    const mapping = JSON.stringify({ 0: 'code', 1: 'name' });
    expect(await dryRun('parts', text, { mapping })).toMatchObject({ faultCount: 0, additions: 1 });
    const twice = await dryRun('parts', text, { mapping: JSON.stringify({ 0: 'code', 1: 'code' }) });
    expect(twice.faults.map(({ column }) => column)).toEqual(['Name', 'Part code']);
    for (const wrong of ['{', '[]', '{"0":"colour"}', '{"x":"code"}', '{"0":7}']) {
      const { body } = await send('parts/dry-run', text, { mapping: wrong }).expect(400);
      expect(body).toMatchObject({ errors: [{ pointer: '/mapping' }] });
    }
    await send('parts/dry-run', text, { decimalSign: 'dash' }).expect(400);
    await send('parts/dry-run', text, { surprise: '1' }).expect(400);
  });

  it.each<[string, Buffer]>([
    ['a workbook', Buffer.from([0x50, 0x4b, 3, 4, 20, 0, 0, 0])],
    ['a picture', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0])],
    ['Latin 1', Buffer.from('Part code,Name\nA,Gr\xfcn\n', 'latin1')],
    ['a quotation that never ends', Buffer.from('Part code,Name\nA,"never\n')],
  ])('refuses %s in a sentence', async (_what, bytes) => {
    const { body } = await send('parts/dry-run', bytes).expect(400);
    expect(body).toMatchObject({ code: 'invalid_input', errors: [{ pointer: '/file' }] });
  });

  it('refuses no file, a huge one, and a kind it does not know', async () => {
    const none = await owner.post('/api/imports/parts/dry-run', {}).expect(400);
    expect(none.body).toMatchObject({ errors: [{ pointer: '/file' }] });
    await send('parts/dry-run', Buffer.alloc(17 * 1_048_576, 'a')).expect(413);
    await send('customers/dry-run', parts).expect(404);
  });
});

describe('taking in opening stock', () => {
  const stock = [
    'Part code,Bin,Quantity,Unit cost,Lot code,Supplier,Supplier’s lot,Received on,Expires on,Status',
    'R-10K,A-12,1450,0.0125,,,,,,',
    'CELL-18,C-03,80,3.12,L-0017,CELLS-CO,ND2611,2026-05-31,2029-05-31,released',
    'CELL-18,C-04,40,3.12,L-0017,CELLS-CO,ND2611,2026-05-31,2029-05-31,released',
    'CU-WIRE,A-12,41.2,0.1714,,WIRE-CO,,31/05/2026,,held',
  ].join('\n');

  it('puts lots into bins, posts their value, and goes on counting behind the codes they brought', async () => {
    const check = await dryRun('opening_stock', stock);
    expect(check.notes).toEqual([
      '4 lines of opening stock will be put on the shelf.',
      '3 bins will be added: A-12, C-03, C-04.',
      '1 supplier will be added by code: WIRE-CO.',
    ]);
    expect([await count('lot'), await count('bin')]).toEqual([0, 0]);
    const run = await applied('opening_stock', stock);
    expect(run).toMatchObject({ rowCount: 4, title: 'Opening stock', document: expect.stringMatching(/^OB-/) });
    const { rows } = await sql<{ account: string; balance: number }>`
      select account_code as account, sum(debit_minor - credit_minor)::bigint as balance from journal_line
      group by 1 order by 1`.execute(app.database.handle);
    const value = 1_813 + 24_960 + 12_480 + 706;
    expect(rows).toEqual([
      { account: '1310', balance: value },
      { account: '3100', balance: -value },
    ]);
    const lots = await app.database.handle
      .selectFrom('lot')
      .select(['code', 'kind', 'status'])
      .orderBy('code')
      .execute();
    expect(lots).toEqual([
      { code: 'L-0017', kind: 'delivery', status: 'released' },
      { code: 'L-0018', kind: 'delivery', status: 'held' },
      { code: 'L-0019', kind: 'standing', status: 'released' },
    ]);
  });

  it('is not taken in twice, as the same file or another', async () => {
    expect((await dryRun('opening_stock', stock)).faults[0]?.sentence).toContain('not taken in twice');
    await apply('opening_stock', stock).expect(400);
    const other = await dryRun('opening_stock', `${stock}\n`.replace('1450', '1451'));
    expect(other.faults.map(({ line, column }) => [line, column])).toEqual([
      [2, 'Bin'],
      [3, 'Lot code'],
      [4, 'Lot code'],
    ]);
    expect(await count('stock_move')).toBe(4);
  });

  it('names every fault, and then takes in nothing', async () => {
    await app.database.handle
      .insertInto('part')
      .values({
        code: 'TOOL',
        name: 'Tool',
        measure: 'piece',
        traced: 'single',
        serial_letters: 'TL',
        created_at: new Date(),
      })
      .execute();
    const text = [
      'Part code,Bin,Quantity,Unit cost,Lot code,Supplier,Received on,Expires on',
      'NONE,A-1,1,1,,,,',
      'R-10K,A-1,1.5,1,,,,',
      'R-10K,A-2,1,1,L-1,,,',
      'TOOL,A-1,1,1,,,,',
      'CELL-18,A-1,0,1,,,,',
      'CELL-18,A-1,-3,1,,,,',
      'CELL-18,A-1,1,1,,,2027-03-02,',
      'CELL-18,A-1,1,1,,,2027-01-02,2026-01-01',
      'CELL-18,A-1,1,1,NEW-1,A,,',
      'CELL-18,A-2,1,2,NEW-1,A,,',
      'CELL-18,A-1,1,1,NEW-1,A,,',
    ].join('\n');
    const { faults } = await dryRun('opening_stock', text);
    expect(faults.map(({ line, column }) => `${line} ${column ?? ''}`)).toEqual([
      '2 Part code',
      '3 Quantity',
      '4 Lot code',
      '5 Part code',
      '6 Quantity',
      '7 Quantity',
      '8 Received on',
      '9 Expires on',
      '11 Unit cost',
      '12 Bin',
    ]);
    await apply('opening_stock', text).expect(400);
    expect(await count('stock_move')).toBe(4);
  });
});

describe('imports', () => {
  it('offer a template that they take themselves', async () => {
    for (const kind of ['parts', 'opening_stock']) {
      const { text, headers } = await owner.get(`/api/imports/${kind}/template`).expect(200);
      expect(headers['content-type']).toContain('text/csv');
      expect(headers['content-disposition']).toContain('attachment');
      expect(text.startsWith('\uFEFF"Part code"')).toBe(true);
      const check = await dryRun(kind, text);
      expect(check.columns.every(({ key }) => key !== null)).toBe(true);
      if (kind === 'parts') expect(check).toMatchObject({ faultCount: 1, faults: [{ column: 'Serial letters' }] });
    }
    await owner.get('/api/imports/none/template').expect(404);
    const { body } = await owner.get('/api/imports/kinds').expect(200);
    expect((body as { items: { kind: string }[] }).items.map(({ kind }) => kind)).toEqual(
      expect.arrayContaining(['parts', 'opening_stock']),
    );
  });

  it('are on record', async () => {
    const { body } = await owner.get('/api/imports').expect(200);
    expect(body).toMatchObject({
      total: 2,
      items: [{ kind: 'opening_stock' }, { kind: 'parts', fileName: 'table.csv', document: null }],
    });
  });

  it('are the owner’s', async () => {
    const assembler = await app.agentFor('assembler');
    await assembler.get('/api/imports').expect(403);
    await send('parts/dry-run', parts, {}, assembler).expect(403);
    await send('parts', parts, {}, assembler).set('Idempotency-Key', randomUUID()).expect(403);
    const visitor = await app.visitor();
    await send('parts/dry-run', parts, {}, visitor).expect(401);
    await visitor.get('/api/imports/parts/template').expect(401);
    await send('parts', parts).expect(400);
  });

  it('take fifty thousand lines, in a few statements', async () => {
    const lines = Array.from(
      { length: 50_000 },
      (_, index) => `BULK-${index},Bulk part ${index},piece,by delivery,0.5,BULK-CO`,
    );
    const bulk = `Part code,Name,Stock unit,Followed,Weight of one (g),Supplier\n${lines.join('\n')}\n`;
    expect(await applied('parts', bulk)).toMatchObject({ rowCount: 50_000 });
    const stock = Array.from(
      { length: 10_000 },
      (_, index) => `BULK-${index},B-${index % 100},${(index % 9) + 1},0.015`,
    );
    expect(await applied('opening_stock', `Part code,Bin,Quantity,Unit cost\n${stock.join('\n')}\n`)).toMatchObject({
      rowCount: 10_000,
    });
  }, 60_000);
});
