import { Module } from '@nestjs/common';
import { InvoicingModule } from '../invoicing/invoicing.module.js';
import { CatalogueModule } from '../catalogue/catalogue.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { BuyerOrdersController } from './buyer-orders.controller.js';
import { BuyerOrdersRepository } from './buyer-orders.repository.js';
import { BuyerOrdersService } from './buyer-orders.service.js';
import { OrderClaimsService } from './order-claims.service.js';
import { OrderDeskController } from './order-desk.controller.js';
import { OrderDeskRepository } from './order-desk.repository.js';
import { OrderDeskService } from './order-desk.service.js';
import { OrderPaidMailTask } from './order-paid-mail.task.js';
import { OrderNeedsRepository } from './order-needs.repository.js';
import { OrdersRepository } from './orders.repository.js';
import { OrdersService } from './orders.service.js';
import { PlaceOrderService } from './place-order.service.js';

@Module({
  imports: [SettingsModule, StockModule, CatalogueModule, InvoicingModule],
  controllers: [BuyerOrdersController, OrderDeskController],
  providers: [
    BuyerOrdersRepository,
    BuyerOrdersService,
    OrderDeskRepository,
    OrderDeskService,
    OrderClaimsService,
    OrderNeedsRepository,
    OrderPaidMailTask,
    OrdersRepository,
    OrdersService,
    PlaceOrderService,
  ],
  exports: [BuyerOrdersService, OrderClaimsService, OrdersService, PlaceOrderService],
})
export class OrdersModule {}
