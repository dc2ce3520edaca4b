import { Module } from '@nestjs/common';
import { InvoicingModule } from '../invoicing/invoicing.module.js';
import { JournalModule } from '../journal/journal.module.js';
import { OrdersModule } from '../orders/orders.module.js';
import { ApplyPaymentService } from './apply-payment.service.js';
import { CheckoutController } from './checkout.controller.js';
import { CheckoutService } from './checkout.service.js';
import { OpenPaymentPageService } from './open-payment-page.service.js';
import { PaymentEventsService } from './payment-events.service.js';
import { PaymentFeeTask } from './payment-fee.task.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';
import { PaymentSweepTask } from './payment-sweep.task.js';
import { PaymentsController } from './payments.controller.js';
import { RefundEventsService } from './refund-events.service.js';
import { RefundsRepository } from './refunds.repository.js';

@Module({
  imports: [InvoicingModule, JournalModule, OrdersModule],
  controllers: [CheckoutController, PaymentsController],
  providers: [
    ApplyPaymentService,
    CheckoutService,
    OpenPaymentPageService,
    PaymentEventsService,
    PaymentFeeTask,
    PaymentServiceClient,
    PaymentSessionsRepository,
    PaymentSweepTask,
    RefundEventsService,
    RefundsRepository,
  ],
  exports: [CheckoutService, PaymentServiceClient],
})
export class PaymentsModule {}
