import { Module } from '@nestjs/common';
import { BillsModule } from '../bills/bills.module.js';
import { JournalModule } from '../journal/journal.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { UnitsModule } from '../units/units.module.js';
import { BatchClaims } from './batch-claims.service.js';
import { BatchIssuesRepository } from './batch-issues.repository.js';
import { BatchLinesRepository } from './batch-lines.repository.js';
import { BatchListsRepository } from './batch-lists.repository.js';
import { BatchSupplyRepository } from './batch-supply.repository.js';
import { BatchSupplyService } from './batch-supply.service.js';
import { BatchesController } from './batches.controller.js';
import { BatchesRepository } from './batches.repository.js';
import { BatchesService } from './batches.service.js';
import { BuildBatchService } from './build-batch.service.js';
import { BuildingRepository } from './building.repository.js';
import { buildsConstraints } from './builds.constraints.js';
import { GiveBackService } from './give-back.service.js';
import { PickBatchService } from './pick-batch.service.js';
import { PickListService } from './pick-list.service.js';
import { PlanBatchService } from './plan-batch.service.js';

@Module({
  imports: [SettingsModule, BillsModule, StockModule, JournalModule, UnitsModule],
  controllers: [BatchesController],
  providers: [
    BatchClaims,
    BatchIssuesRepository,
    BatchLinesRepository,
    BatchListsRepository,
    BatchSupplyRepository,
    BatchSupplyService,
    BatchesRepository,
    BatchesService,
    BuildBatchService,
    BuildingRepository,
    GiveBackService,
    PickBatchService,
    PickListService,
    PlanBatchService,
  ],
  exports: [BatchesService, BatchSupplyService, BuildBatchService, PickBatchService, PickListService, PlanBatchService],
})
export class BuildsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(buildsConstraints);
  }
}
