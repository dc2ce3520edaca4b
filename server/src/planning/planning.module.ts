import { Module } from '@nestjs/common';
import { BillsModule } from '../bills/bills.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { BillCostService } from './bill-cost.service.js';
import { BuildQuestionsService } from './build-questions.service.js';
import { BuildableService } from './buildable.service.js';
import { DesignFiguresController } from './design-figures.controller.js';
import { DesignQueueService } from './design-queue.service.js';
import { PartCostsRepository } from './part-costs.repository.js';
import { ReleasedBillsRepository } from './released-bills.repository.js';

@Module({
  imports: [BillsModule, SettingsModule, StockModule],
  controllers: [DesignFiguresController],
  providers: [
    BillCostService,
    BuildableService,
    BuildQuestionsService,
    DesignQueueService,
    PartCostsRepository,
    ReleasedBillsRepository,
  ],
  exports: [BuildableService],
})
export class PlanningModule {}
