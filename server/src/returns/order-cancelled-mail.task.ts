import { Injectable } from '@nestjs/common';
import { majorText } from '@emberlot/shared/money/amount-text';
import { currencyCode } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { InvoiceFilesService } from '../invoicing/invoice-files.service.js';
import { OrdersService } from '../orders/orders.service.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { Outbox } from '../platform/mail/outbox.js';
import { CancellationsRepository } from './cancellations.repository.js';

interface CancelledOrder {
  readonly orderId: number;
}

/** Tells the buyer that the order was cancelled, and brings the credit note if it was paid. One mail, however often. */
@Injectable()
@Task({ name: 'order_cancelled_mail' })
export class OrderCancelledMailTask implements JobTask<CancelledOrder> {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly outbox: Outbox,
    private readonly orders: OrdersService,
    private readonly invoices: InvoiceFilesService,
    private readonly repository: CancellationsRepository,
  ) {}

  async run({ orderId }: CancelledOrder): Promise<void> {
    const order = await this.orders.get(this.database.handle, orderId);
    const cancelled = await this.repository.cancellationOf(this.database.handle, orderId);
    if (!cancelled) return;
    const { refunded, creditNoteId, creditNote, reason } = cancelled;
    const note = creditNoteId === null ? undefined : await this.invoices.get(creditNoteId);
    const money =
      refunded === null
        ? ['Nothing had been paid, so nothing goes back.']
        : [
            `${majorText(minorAmount(refunded), currencyCode(order.currency))} ${order.currency} goes back to you the way it was paid; banks take some days. Credit note ${creditNote} is with this mail.`,
          ];
    await this.transactions.run(async (trx) => {
      await this.outbox.enqueue(trx, {
        dedupeKey: `order ${order.number} cancelled`,
        to: order.email,
        subject: `Order ${order.number} is cancelled`,
        content: {
          heading: `Order ${order.number} is cancelled`,
          paragraphs: [`We have cancelled your order. The reason: ${reason}`, ...money],
        },
        attachments: note ? [note] : [],
      });
    });
  }
}
