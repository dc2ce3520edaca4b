import { Module } from '@nestjs/common';
import { InvoicingModule } from '../invoicing/invoicing.module.js';
import { JournalModule } from '../journal/journal.module.js';
import { OrdersModule } from '../orders/orders.module.js';
import { PaymentsModule } from '../payments/payments.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { ShippingModule } from '../shipping/shipping.module.js';
import { CancelOrderService } from './cancel-order.service.js';
import { CancellationsController } from './cancellations.controller.js';
import { CancellationsRepository } from './cancellations.repository.js';
import { OrderCancelledMailTask } from './order-cancelled-mail.task.js';
import { returnsConstraints } from './returns.constraints.js';

@Module({
  imports: [InvoicingModule, JournalModule, OrdersModule, PaymentsModule, ShippingModule],
  controllers: [CancellationsController],
  providers: [CancelOrderService, CancellationsRepository, OrderCancelledMailTask],
})
export class ReturnsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(returnsConstraints);
  }
}
