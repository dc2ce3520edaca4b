import { Module } from '@nestjs/common';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { BillContentRepository } from './bill-content.repository.js';
import { BillListsRepository } from './bill-lists.repository.js';
import { BillTablesService } from './bill-tables.service.js';
import { BillViewsService } from './bill-views.service.js';
import { billsConstraints } from './bills.constraints.js';
import { BillsController } from './bills.controller.js';
import { BillsRepository } from './bills.repository.js';
import { BillsService } from './bills.service.js';
import { ContentsController } from './contents.controller.js';
import { ContentsRepository } from './contents.repository.js';
import { ContentsService } from './contents.service.js';
import { DraftBillsService } from './draft-bills.service.js';
import { ReleaseBillService } from './release-bill.service.js';
import { RevisionReader } from './revision-reader.js';
import { WhereUsedRepository } from './where-used.repository.js';

@Module({
  controllers: [BillsController, ContentsController],
  providers: [
    BillContentRepository,
    BillListsRepository,
    BillsRepository,
    BillsService,
    BillTablesService,
    BillViewsService,
    ContentsRepository,
    ContentsService,
    DraftBillsService,
    ReleaseBillService,
    RevisionReader,
    WhereUsedRepository,
  ],
  exports: [BillsService, BillTablesService, ContentsService, DraftBillsService, ReleaseBillService],
})
export class BillsModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(billsConstraints);
  }
}
