import type { ModuleMetadata } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { CatalogueModule } from '../catalogue/catalogue.module.js';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { PaymentsModule } from '../payments/payments.module.js';
import { StockLedgerService, valueByComponent } from '../stock/stock-ledger.service.js';
import { addDelivery } from '../testing/sale.js';
import { addBin, addLot, addShop, type PartRow } from '../testing/shelf.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';

const webhookSecret = 'whsec_spec';

export interface Stocked {
  readonly lot: PartRow;
  readonly bin: PartRow;
}

/** What of the payments stand-in is used here; the spec starts it. */
export interface PaymentsStandIn {
  readonly port: number;
  setWebhooks(endpoints: { url: string; secrets: string[]; events: string[] }[]): void;
  control(method: string, path: string, body?: object): Promise<unknown>;
  webhooksSettled(): Promise<unknown>;
  close(): Promise<void>;
}

/** A shop that sells: the payments stand-in beside the application, and short ways to stock, order and pay. */
export class SellingApp {
  private constructor(
    readonly app: TestApp,
    readonly fake: PaymentsStandIn,
  ) {}

  static async start(fake: PaymentsStandIn, modules: NonNullable<ModuleMetadata['imports']>): Promise<SellingApp> {
    const app = await startTestApp({
      modules: [CatalogueModule, PaymentsModule, ...modules],
      startsAt: new Date(),
      env: {
        STRIPE_API_HOST: '127.0.0.1',
        STRIPE_API_PORT: String(fake.port),
        STRIPE_API_PROTOCOL: 'http',
        STRIPE_WEBHOOK_SECRET: webhookSecret,
      },
    });
    fake.setWebhooks([{ url: `${app.url}/api/payment-events`, secrets: [webhookSecret], events: [] }]);
    await addShop(app.database.handle);
    await addDelivery(app.database.handle, 'IE');
    return new SellingApp(app, fake);
  }

  async close(): Promise<void> {
    await this.app.close();
    await this.fake.close();
  }

  /** A delivery of a part, 10.00 each unless said. */
  async receive(part: PartRow, quantity: number, each = 1_000): Promise<Stocked> {
    const lot = await addLot(this.app.database.handle, { partId: part.id });
    return this.put(part, lot, quantity, quantity * each, 'goods_received');
  }

  /**
   * A finished unit of its own cost, with a run that passed. Made by rows: the bench has its own specs.
   */
  async finish(part: PartRow, serial: string, cost: number): Promise<Stocked & { readonly unitId: number }> {
    const handle = this.app.database.handle;
    const now = this.app.clock.now();
    const user = await handle.selectFrom('app_user').select('id').executeTakeFirst();
    const revision =
      (await handle.selectFrom('bill_revision').select('id').where('part_id', '=', part.id).executeTakeFirst()) ??
      (await handle
        .insertInto('bill_revision')
        .values({ part_id: part.id, number: 1, created_at: now, created_by: user?.id ?? null })
        .returning('id')
        .executeTakeFirstOrThrow());
    const batch = await handle
      .insertInto('batch')
      .values({
        number: `B-${serial}`,
        part_id: part.id,
        revision_id: revision.id,
        quantity: 1,
        status: 'done',
        due_on: this.app.clock.today(),
        created_at: now,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    const lot = await addLot(handle, { partId: part.id, kind: 'unit', code: serial });
    const stocked = await this.put(part, lot, 1, cost, 'opening_stock');
    const unit = await handle
      .insertInto('unit')
      .values({
        serial,
        part_id: part.id,
        revision_id: revision.id,
        batch_id: batch.id,
        place: 1,
        page_token: `token-of-${serial}-0123456789`,
        serial_issued_at: now,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    await this.run(unit.id, revision.id, 1, 'pass');
    await handle.updateTable('unit').set({ completed_at: now, lot_id: lot.id }).where('id', '=', unit.id).execute();
    return { ...stocked, unitId: unit.id };
  }

  /** A run of a unit that ended with a verdict; a later one counts more. */
  async run(unitId: number, revisionId: number, sequence: number, verdict: 'pass' | 'fail'): Promise<void> {
    const now = this.app.clock.now();
    await this.app.database.handle
      .insertInto('test_run')
      .values({ unit_id: unitId, revision_id: revisionId, sequence, started_at: now, measured_at: now, verdict })
      .execute();
  }

  /** @returns the number of an order that a guest placed, and its payment page */
  async order(lines: readonly { listingId: number; quantity: number }[], email = 'buyer@marsh.example') {
    const visitor = await this.app.visitor();
    const basket = { country: 'IE', postcode: 'D02 X285', lines };
    const { body: quote } = await visitor.post('/api/shop/quotes', basket).expect(200);
    const { body } = await visitor
      .create('/api/shop/orders', {
        ...basket,
        email,
        recipient: 'A buyer',
        addressLine: '1 Quay Street',
        city: 'Dublin',
        expectedGross: (quote as { gross: { amount: number } }).gross.amount,
        expectedDay: (quote as { promise: { leavesBy: string } }).promise.leavesBy,
        termsAccepted: true,
      })
      .expect(201);
    return body as { number: string; paymentPage: string; guestToken: string };
  }

  /** Pays the way the payment page does, and waits until the shop has been told. */
  async pay(paymentPage: string): Promise<void> {
    const session = new URL(paymentPage).pathname.split('/').at(-1) ?? '';
    await this.fake.control('POST', `/control/sessions/${session}/pay`, {});
    await this.fake.webhooksSettled();
  }

  /** @returns the number of a paid order */
  async paidOrder(lines: readonly { listingId: number; quantity: number }[], email?: string): Promise<string> {
    const { number, paymentPage } = await this.order(lines, email);
    await this.pay(paymentPage);
    return number;
  }

  private async put(part: PartRow, lot: PartRow, quantity: number, value: number, event: string): Promise<Stocked> {
    const { app } = this;
    const bin = await addBin(app.database.handle);
    const kind = event === 'opening_stock' ? 'opening' : 'receipt';
    await app.transaction(async (trx) => {
      const document = await app.get(DocumentsService).record(trx, { kind, recordedBy: null });
      const moves = await app.get(StockLedgerService).post(trx, document, [
        {
          direction: 'in',
          partId: part.id,
          lotId: lot.id,
          binId: bin.id,
          quantity: new Decimal(quantity),
          value: minorAmount(value),
          reason: kind,
        },
      ]);
      const amounts = valueByComponent(moves);
      await app.get(JournalService).post(trx, { document, event, narrative: 'spec', amounts });
    });
    return { lot, bin };
  }
}
