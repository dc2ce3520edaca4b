import { Module } from '@nestjs/common';
import { BillsModule } from '../bills/bills.module.js';
import { PartsModule } from '../parts/parts.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { BillImport } from './bill-import.js';
import { BuildStepsImport } from './build-steps-import.js';
import type { ImportKind } from './import-kind.js';
import { ImportKinds, importKinds } from './import-kinds.js';
import { ImportsController } from './imports.controller.js';
import { ImportsRepository } from './imports.repository.js';
import { ImportsService } from './imports.service.js';
import { OpeningStockImport } from './opening-stock-import.js';
import { PartsImport } from './parts-import.js';
import { TestPlanImport } from './test-plan-import.js';

/** The kinds of table, in the order in which a new shop takes them in. */
const kinds = [PartsImport, BillImport, BuildStepsImport, TestPlanImport, OpeningStockImport];

@Module({
  imports: [BillsModule, PartsModule, SettingsModule, StockModule, SuppliersModule],
  controllers: [ImportsController],
  providers: [
    ...kinds,
    { provide: importKinds, useFactory: (...all: readonly ImportKind[]) => all, inject: kinds },
    ImportKinds,
    ImportsRepository,
    ImportsService,
  ],
})
export class ImportsModule {}
