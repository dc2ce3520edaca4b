import { Injectable } from '@nestjs/common';
import { majorText } from '@emberlot/shared/money/amount-text';
import { currencyCode } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { InvoiceFilesService } from '../invoicing/invoice-files.service.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import type { MailContent } from '../platform/mail/mail-content.js';
import { Outbox } from '../platform/mail/outbox.js';
import { OrdersService, type Order, type OrderLines } from './orders.service.js';
import { longDay } from './long-day.js';

interface PaidOrder {
  readonly orderId: number;
  readonly invoiceId: number;
}

/** Tells the buyer that the order is paid, what was promised, and brings the invoice. One mail however often it runs. */
@Injectable()
@Task({ name: 'order_paid_mail' })
export class OrderPaidMailTask implements JobTask<PaidOrder> {
  constructor(
    private readonly config: Config,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly outbox: Outbox,
    private readonly orders: OrdersService,
    private readonly invoices: InvoiceFilesService,
  ) {}

  async run({ orderId, invoiceId }: PaidOrder): Promise<void> {
    const order = await this.orders.get(this.database.handle, orderId);
    const lines = await this.orders.lines(this.database.handle, orderId);
    const invoice = await this.invoices.get(invoiceId);
    await this.transactions.run(async (trx) => {
      await this.outbox.enqueue(trx, {
        dedupeKey: `order ${order.number} paid`,
        to: order.email,
        subject: `Order ${order.number} is paid`,
        content: paidContent(order, lines, this.config.baseUrl),
        attachments: [invoice],
      });
    });
  }
}

function paidContent(order: Order, lines: OrderLines, baseUrl: string): MailContent {
  const money = `${majorText(minorAmount(order.gross_minor), currencyCode(order.currency))} ${order.currency}`;
  return {
    heading: `Thank you: order ${order.number} is paid`,
    paragraphs: [
      `Your payment of ${money} is here, and the invoice is with this mail.`,
      `We promised that your order leaves us by ${longDay(order.promised_on)}. You get another mail when it does.`,
    ],
    facts: [
      ...lines.map(({ quantity, title }) => [`${quantity} ×`, title] as const),
      ['Goes to', `${order.recipient}, ${order.address_line}, ${order.postcode} ${order.city}, ${order.country_code}`],
      ['Total with VAT', money],
    ],
    action: { label: 'See the order', url: `${baseUrl}/orders/${order.number}` },
    caution:
      'A soldering tip burns skin at once, fumes harm, and lithium cells must not be crushed, shorted or charged unattended. Read the papers in the box before you switch anything on.',
  };
}
