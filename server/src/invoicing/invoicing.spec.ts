import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { sql } from 'kysely';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { addShop } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser } from '../testing/users.js';
import type { InvoiceDraft } from './invoice-draft.js';
import { InvoicingModule } from './invoicing.module.js';
import { InvoicingService } from './invoicing.service.js';

let app: TestApp;
let customerId: number;

beforeAll(async () => {
  app = await startTestApp({ modules: [InvoicingModule] });
  await addShop(app.database.handle);
  customerId = await addCustomer('Marsh Repairs');
});
afterAll(() => app.close());

async function addCustomer(name: string): Promise<number> {
  const { id } = await app.database.handle
    .insertInto('customer')
    .values({ name, email: 'buyer@marsh.example', created_at: app.clock.now() })
    .returning('id')
    .executeTakeFirstOrThrow();
  return id;
}

interface DraftLine {
  readonly net: number;
  readonly rate?: string;
}

function draft(lines: readonly DraftLine[], more: Partial<InvoiceDraft> = {}): InvoiceDraft {
  return {
    customerId,
    buyer: {
      name: 'Marsh Repairs',
      addressLine: '1 Reed Road',
      city: 'Marshend',
      postcode: 'M1',
      countryCode: 'IE',
      email: 'buyer@marsh.example',
    },
    reference: 'O-2709-001',
    treatment: 'home',
    vatNote: null,
    lines: lines.map(({ net, rate = '23' }, index) => ({
      partId: null,
      code: `W60-${index}`,
      description: 'Wren 60',
      quantity: '1',
      measure: 'piece',
      unitNet: (net / 100).toFixed(2),
      net: minorAmount(net),
      vatCategory: 'S',
      vatRate: rate,
    })),
    charges: [],
    prepaid: minorAmount(0),
    recordedBy: null,
    ...more,
  };
}

const issue = (what: InvoiceDraft) => app.transaction((trx) => app.get(InvoicingService).issue(trx, what));
const credit = (invoiceId: number) =>
  app.transaction((trx) =>
    app.get(InvoicingService).credit(trx, { invoiceId, reason: 'The order was cancelled.', recordedBy: null }),
  );

async function accounts(documentId: number): Promise<Readonly<Record<string, number>>> {
  const rows = await app.database.handle
    .selectFrom('journal_line as l')
    .innerJoin('journal_entry as e', 'e.id', 'l.entry_id')
    .select(['l.account_code as code', sql<number>`l.debit_minor - l.credit_minor`.as('amount')])
    .where('e.document_id', '=', documentId)
    .execute();
  return Object.fromEntries(rows.map(({ code, amount }) => [code, amount]));
}

describe('An invoice', () => {
  // EN 16931-1:2017, BR-CO-14, BR-CO-17 and BR-S-8: VAT is worked out once per rate from the rate's taxable sum and
  // rounded to two decimals, not per line.
  it('rounds VAT once per rate over the sum of its lines', async () => {
    const issued = await issue(draft([{ net: 333 }, { net: 333 }, { net: 333 }]));
    // 9.99 at 23 % is 2.2977; three lines rounded one by one would come to 2.31.
    expect(issued).toMatchObject({ net: 999, vat: 230, gross: 1229 });
  });

  it('keeps rates apart and taxes delivery as the goods', async () => {
    const charges = [{ reason: 'Delivery', amount: minorAmount(650), vatCategory: 'S', vatRate: '23' }] as const;
    const issued = await issue(draft([{ net: 10_000 }, { net: 5_000, rate: '13.5' }], { charges }));
    expect(issued).toMatchObject({ net: 15_650, vat: 2_450 + 675, gross: 18_775 });
  });

  it('makes the net amount owed as goods, and VAT due', async () => {
    const { documentId } = await issue(draft([{ net: 10_000 }]));
    expect(await accounts(documentId)).toEqual({ '1200': 12_300, '2200': -2_300, '2300': -10_000 });
  });

  it('leaves no gap and no number twice, also where some of many at once are rolled back', async () => {
    const tries = await Promise.allSettled(
      Array.from({ length: 20 }, (_, place) =>
        app.transaction(async (trx) => {
          const { number } = await app.get(InvoicingService).issue(trx, draft([{ net: 100 + place }]));
          if (place % 3 === 0) throw new Error('something else went wrong');
          return number;
        }),
      ),
    );
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(13);
    const rows = await app.database.handle
      .selectFrom('invoice')
      .select('sequence')
      .where('series', '=', 'INV')
      .orderBy('sequence')
      .execute();
    expect(rows.map(({ sequence }) => sequence)).toEqual(rows.map((_, index) => index + 1));
  });

  it('cannot be changed or removed by the server', async () => {
    const { invoiceId } = await issue(draft([{ net: 100 }]));
    const change = app.database.handle.updateTable('invoice').set({ net_minor: 1 }).where('id', '=', invoiceId);
    await expect(change.execute()).rejects.toMatchObject({ code: '42501' });
    const remove = app.database.handle.deleteFrom('invoice_line').where('invoice_id', '=', invoiceId);
    await expect(remove.execute()).rejects.toMatchObject({ code: '42501' });
  });

  it('keeps seller and buyer as they were on its day', async () => {
    const { number } = await issue(draft([{ net: 100 }]));
    await app.database.handle.updateTable('shop').set({ legal_name: 'Fernhollow Works Limited' }).execute();
    const { body } = await (await app.agentFor('accountant')).get(`/api/invoices/${number}`).expect(200);
    expect(body).toMatchObject({ seller: { name: 'Fernhollow Tools Limited' } });
    await app.database.handle.updateTable('shop').set({ legal_name: 'Fernhollow Tools Limited' }).execute();
  });
});

describe('A credit note', () => {
  it('gives back what the invoice took, names it, and counts in its own series', async () => {
    const invoice = await issue(draft([{ net: 10_000 }], { prepaid: minorAmount(12_300) }));
    const note = await credit(invoice.invoiceId);
    expect(note).toMatchObject({ net: invoice.net, vat: invoice.vat, gross: invoice.gross });
    expect(note.number).toMatch(/^CN-2027-\d{4}$/);
    expect(await accounts(note.documentId)).toEqual({ '1200': -12_300, '2200': 2_300, '2300': 10_000 });
    const { body } = await (await app.agentFor('owner')).get(`/api/invoices/${note.number}`).expect(200);
    expect(body).toMatchObject({ creditsNumber: invoice.number, kind: 'credit_note' });
  });

  it('is written once, also when two ask at the same moment', async () => {
    const { invoiceId, gross } = await issue(draft([{ net: 10_000 }]));
    const tries = await Promise.allSettled([credit(invoiceId), credit(invoiceId)]);
    expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    await expect(credit(invoiceId)).rejects.toMatchObject({ code: 'wrong_state' });
    const row = await app.database.handle
      .selectFrom('invoice')
      .select(({ fn }) => fn.sum<string>('gross_minor').as('credited'))
      .where('credits_invoice_id', '=', invoiceId)
      .executeTakeFirstOrThrow();
    expect(row.credited).toBe(String(gross));
  });

  it('does not credit a credit note', async () => {
    const invoice = await issue(draft([{ net: 100 }]));
    const note = await credit(invoice.invoiceId);
    await expect(credit(note.invoiceId)).rejects.toMatchObject({ code: 'wrong_state' });
  });
});

describe('The list of invoices', () => {
  it('finds by number, order and buyer, by kind and by day', async () => {
    const { number } = await issue(draft([{ net: 4_200 }], { reference: 'O-2709-777' }));
    const agent = await app.agentFor('accountant');
    const list = async (query: string) =>
      (await agent.get(`/api/invoices?${query}`).expect(200)).body as { items: { number: string }[]; total: number };
    expect((await list('q=O-2709-777')).items).toMatchObject([
      { number, gross: { amount: 5_166, currency: 'EUR' }, buyer: 'Marsh Repairs', country: 'IE' },
    ]);
    expect((await list('q=O-2709-777&kind=credit_note')).total).toBe(0);
    expect((await list('q=O-2709-777&from=2027-03-02')).total).toBe(0);
    expect((await list('q=O-2709-777&to=2027-03-01')).total).toBe(1);
  });

  it('is for owner and accountant', async () => {
    await (await app.visitor()).get('/api/invoices').expect(401);
    await (await app.agentFor('assembler')).get('/api/invoices').expect(403);
    await (await app.agentFor('customer')).get('/api/invoices').expect(403);
    await (await app.agentFor('owner')).get('/api/invoices').expect(200);
    const refused = await (await app.agentFor('owner')).get('/api/invoices?from=yesterday&kind=bill').expect(400);
    expect((refused.body as { errors: unknown[] }).errors).toHaveLength(2);
    await (await app.agentFor('owner')).get('/api/invoices/INV-2027-9999').expect(404);
  });
});

describe('The paper of an invoice', () => {
  it('is drawn once and given to staff and to the buyer whose it is', async () => {
    const { number, invoiceId } = await issue(
      draft([{ net: 10_000 }], { treatment: 'export', vatNote: 'Export, exempt.', prepaid: minorAmount(12_300) }),
    );
    const other = await addCustomer('Somebody else');
    const buyerAgent = async (id: number) =>
      app.agentOf(await addUser(app.database.handle, { role: 'customer', customerId: id }, app.clock.now()));
    const own = await buyerAgent(customerId);
    const foreign = await buyerAgent(other);
    const first = await (await app.agentFor('accountant')).get(`/api/invoices/${number}/pdf`).expect(200);
    expect(first.headers['content-type']).toBe('application/pdf');
    expect(first.headers['content-disposition']).toContain(`${number}.pdf`);
    expect((first.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
    const again = await own.get(`/api/invoices/${number}/pdf`).expect(200);
    expect((again.body as Buffer).equals(first.body as Buffer)).toBe(true);
    await foreign.get(`/api/invoices/${number}/pdf`).expect(404);
    await (await app.agentFor('assembler')).get(`/api/invoices/${number}/pdf`).expect(403);
    await (await app.visitor()).get(`/api/invoices/${number}/pdf`).expect(401);
    const files = await app.database.handle
      .selectFrom('invoice_file')
      .select('file_id')
      .where('invoice_id', '=', invoiceId)
      .execute();
    expect(files).toHaveLength(1);
  });
});
