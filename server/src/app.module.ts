import { Module } from '@nestjs/common';
import { CatalogueModule } from './catalogue/catalogue.module.js';
import { OrdersModule } from './orders/orders.module.js';
import { PaymentsModule } from './payments/payments.module.js';
import { BuildsModule } from './builds/builds.module.js';
import { BillsModule } from './bills/bills.module.js';
import { FindModule } from './find/find.module.js';
import { ImportsModule } from './imports/imports.module.js';
import { InvoicingModule } from './invoicing/invoicing.module.js';
import { JournalModule } from './journal/journal.module.js';
import { PartsModule } from './parts/parts.module.js';
import { PeopleModule } from './people/people.module.js';
import { PlanningModule } from './planning/planning.module.js';
import { PlatformModule } from './platform/platform.module.js';
import { SettingsModule } from './settings/settings.module.js';
import { ShippingModule } from './shipping/shipping.module.js';
import { ReturnsModule } from './returns/returns.module.js';
import { BooksModule } from './books/books.module.js';
import { TodayModule } from './today/today.module.js';
import { StockModule } from './stock/stock.module.js';
import { SuppliersModule } from './suppliers/suppliers.module.js';
import { TestingModule } from './testing/testing.module.js';
import { UnitPagesModule } from './units/unit-pages.module.js';
import { UnitsModule } from './units/units.module.js';

/** Everything the server is made of; a new module is added to its row. */
@Module({
  imports: [
    PlatformModule,
    // Master data
    PeopleModule,
    SettingsModule,
    PartsModule,
    SuppliersModule,
    BillsModule,
    // The ledgers and documents that others post to
    StockModule,
    JournalModule,
    InvoicingModule,
    // Making
    UnitsModule,
    UnitPagesModule,
    TestingModule,
    BuildsModule,
    PlanningModule,
    ImportsModule,
    // Selling and after
    CatalogueModule,
    OrdersModule,
    PaymentsModule,
    ShippingModule,
    ReturnsModule,
    // For the accountant
    BooksModule,
    TodayModule,
    FindModule,
  ],
})
export class AppModule {}
