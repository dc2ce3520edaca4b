import { Module } from '@nestjs/common';
import { InvoicingModule } from '../invoicing/invoicing.module.js';
import { CatalogueModule } from '../catalogue/catalogue.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { OrderClaimsService } from './order-claims.service.js';
import { OrderPaidMailTask } from './order-paid-mail.task.js';
import { OrderNeedsRepository } from './order-needs.repository.js';
import { OrdersRepository } from './orders.repository.js';
import { OrdersService } from './orders.service.js';
import { PlaceOrderService } from './place-order.service.js';

@Module({
  imports: [SettingsModule, StockModule, CatalogueModule, InvoicingModule],
  providers: [
    OrderClaimsService,
    OrderNeedsRepository,
    OrderPaidMailTask,
    OrdersRepository,
    OrdersService,
    PlaceOrderService,
  ],
  exports: [OrderClaimsService, OrdersService, PlaceOrderService],
})
export class OrdersModule {}
