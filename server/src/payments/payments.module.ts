import { Module } from '@nestjs/common';
import { InvoicingModule } from '../invoicing/invoicing.module.js';
import { JournalModule } from '../journal/journal.module.js';
import { OrdersModule } from '../orders/orders.module.js';
import { ApplyPaymentService } from './apply-payment.service.js';
import { CheckoutController } from './checkout.controller.js';
import { CheckoutService } from './checkout.service.js';
import { OpenPaymentPageService } from './open-payment-page.service.js';
import { PastPaymentsService } from './past-payments.service.js';
import { PaymentEventsService } from './payment-events.service.js';
import { PaymentFeeTask } from './payment-fee.task.js';
import { PaymentServiceClient } from './payment-service.client.js';
import { ClosePaymentPagesService } from './close-payment-pages.service.js';
import { PaymentReviewsController } from './payment-reviews.controller.js';
import { PaymentReviewsService } from './payment-reviews.service.js';
import { RefundsService } from './refunds.service.js';
import { SendRefundTask } from './send-refund.task.js';
import { PaymentSessionsRepository } from './payment-sessions.repository.js';
import { PaymentSweepTask } from './payment-sweep.task.js';
import { PaymentsController } from './payments.controller.js';
import { RefundEventsService } from './refund-events.service.js';
import { RefundsRepository } from './refunds.repository.js';

@Module({
  imports: [InvoicingModule, JournalModule, OrdersModule],
  controllers: [CheckoutController, PaymentsController, PaymentReviewsController],
  providers: [
    ApplyPaymentService,
    CheckoutService,
    ClosePaymentPagesService,
    PaymentReviewsService,
    RefundsService,
    SendRefundTask,
    OpenPaymentPageService,
    PastPaymentsService,
    PaymentEventsService,
    PaymentFeeTask,
    PaymentServiceClient,
    PaymentSessionsRepository,
    PaymentSweepTask,
    RefundEventsService,
    RefundsRepository,
  ],
  exports: [ClosePaymentPagesService, RefundsService, CheckoutService, PaymentServiceClient],
})
export class PaymentsModule {}
