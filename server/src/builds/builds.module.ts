import { Module } from '@nestjs/common';
import { BillsModule } from '../bills/bills.module.js';
import { JournalModule } from '../journal/journal.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SettingsModule } from '../settings/settings.module.js';
import { StockModule } from '../stock/stock.module.js';
import { UnitsModule } from '../units/units.module.js';
import { TestingModule } from '../testing/testing.module.js';
import { AsBuiltRecord } from './as-built-record.service.js';
import { BatchClaims } from './batch-claims.service.js';
import { BatchCloser } from './batch-closer.service.js';
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
import { FinishUnitService } from './finish-unit.service.js';
import { GiveBackService } from './give-back.service.js';
import { PickBatchService } from './pick-batch.service.js';
import { PickListService } from './pick-list.service.js';
import { PlanBatchService } from './plan-batch.service.js';

@Module({
  imports: [SettingsModule, BillsModule, StockModule, JournalModule, UnitsModule, TestingModule],
  controllers: [BatchesController],
  providers: [
    AsBuiltRecord,
    BatchClaims,
    BatchCloser,
    BatchIssuesRepository,
    BatchLinesRepository,
    BatchListsRepository,
    BatchSupplyRepository,
    BatchSupplyService,
    BatchesRepository,
    BatchesService,
    BuildBatchService,
    BuildingRepository,
    FinishUnitService,
    GiveBackService,
    PickBatchService,
    PickListService,
    PlanBatchService,
  ],
  exports: [
    GiveBackService,
    BatchesService,
    BatchSupplyService,
    BuildBatchService,
    FinishUnitService,
    PickBatchService,
    PickListService,
    PlanBatchService,
  ],
})
export class BuildsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(buildsConstraints);
  }
}
