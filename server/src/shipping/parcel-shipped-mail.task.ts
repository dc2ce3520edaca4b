import { Injectable } from '@nestjs/common';
import { longDay } from '../orders/long-day.js';
import { OrdersService } from '../orders/orders.service.js';
import { Clock } from '../platform/clock/clock.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { type JobTask, Task } from '../platform/jobs/job-task.js';
import { Outbox } from '../platform/mail/outbox.js';

interface ShippedParcel {
  readonly parcelId: number;
}

/** Tells the buyer that the order has left. One mail however often it runs. */
@Injectable()
@Task({ name: 'parcel_shipped_mail' })
export class ParcelShippedMailTask implements JobTask<ShippedParcel> {
  constructor(
    private readonly clock: Clock,
    private readonly config: Config,
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly outbox: Outbox,
    private readonly orders: OrdersService,
  ) {}

  async run({ parcelId }: ShippedParcel): Promise<void> {
    const parcel = await this.database.handle
      .selectFrom('shipment')
      .selectAll()
      .where('id', '=', parcelId)
      .executeTakeFirst();
    if (!parcel || parcel.shipped_at === null) return;
    const order = await this.orders.get(this.database.handle, parcel.order_id);
    const left = longDay(this.clock.dayOf(parcel.shipped_at));
    const facts: readonly (readonly [string, string])[] = [
      ['Parcel', parcel.number],
      ...(parcel.carrier === null ? [] : [['Carrier', parcel.carrier] as const]),
      ...(parcel.tracking_code === null ? [] : [['Tracking code', parcel.tracking_code] as const]),
    ];
    await this.transactions.run(async (trx) => {
      await this.outbox.enqueue(trx, {
        dedupeKey: `parcel ${parcel.number} shipped`,
        to: order.email,
        subject: `Order ${order.number} is on its way`,
        content: {
          heading: `Order ${order.number} is on its way`,
          paragraphs: [`Your order left us on ${left}.`],
          facts,
          action: { label: 'See the order', url: `${this.config.baseUrl}/orders/${order.number}` },
          caution:
            'There is a lithium battery in or with your tool. If the parcel arrives crushed, wet or warm, do not open or charge it: write to us.',
        },
      });
    });
  }
}
