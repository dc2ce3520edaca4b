import { Module } from '@nestjs/common';
import { JournalModule } from '../journal/journal.module.js';
import { PartsModule } from '../parts/parts.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SettingsModule } from '../settings/settings.module.js';
import { AdjustStockService } from './adjust-stock.service.js';
import { AvailabilityRepository } from './availability.repository.js';
import { BinsController } from './bins.controller.js';
import { BinsRepository } from './bins.repository.js';
import { BinsService } from './bins.service.js';
import { DeliveriesController } from './deliveries.controller.js';
import { DeliveriesRepository } from './deliveries.repository.js';
import { DeliveriesService } from './deliveries.service.js';
import { LotRegisterRepository } from './lot-register.repository.js';
import { LotRegister } from './lot-register.service.js';
import { LotStatusRepository } from './lot-status.repository.js';
import { LotStatusService } from './lot-status.service.js';
import { LotsController } from './lots.controller.js';
import { LotsRepository } from './lots.repository.js';
import { LotsService } from './lots.service.js';
import { MovesRepository } from './moves.repository.js';
import { MovesService } from './moves.service.js';
import { OpeningStockRepository } from './opening-stock.repository.js';
import { OpeningStockService } from './opening-stock.service.js';
import { ReceiveDeliveryService } from './receive-delivery.service.js';
import { ReservationsRepository } from './reservations.repository.js';
import { ReservationsService } from './reservations.service.js';
import { ReversalsRepository } from './reversals.repository.js';
import { ReverseDocumentService } from './reverse-document.service.js';
import { PartFiguresRepository } from './part-figures.repository.js';
import { PartFiguresService } from './part-figures.service.js';
import { PartListRepository } from './part-list.repository.js';
import { PartStoryRepository } from './part-story.repository.js';
import { ShelfController } from './shelf.controller.js';
import { ShelfPartsService } from './shelf-parts.service.js';
import { ShelfQueueRepository } from './shelf-queue.repository.js';
import { ShelfQueueService } from './shelf-queue.service.js';
import { StockValueRepository } from './stock-value.repository.js';
import { StockValueService } from './stock-value.service.js';
import { StockLedgerRepository } from './stock-ledger.repository.js';
import { StockLedgerService } from './stock-ledger.service.js';
import { StockLines } from './stock-lines.service.js';
import { StockLookupRepository } from './stock-lookup.repository.js';
import { StockMovesController } from './stock-moves.controller.js';
import { stockConstraints } from './stock.constraints.js';
import { TransferStockService } from './transfer-stock.service.js';

@Module({
  imports: [JournalModule, PartsModule, SettingsModule],
  controllers: [BinsController, DeliveriesController, LotsController, ShelfController, StockMovesController],
  providers: [
    AdjustStockService,
    AvailabilityRepository,
    BinsRepository,
    BinsService,
    DeliveriesRepository,
    DeliveriesService,
    LotRegister,
    LotRegisterRepository,
    LotStatusRepository,
    LotStatusService,
    LotsRepository,
    LotsService,
    MovesRepository,
    MovesService,
    OpeningStockRepository,
    OpeningStockService,
    ReceiveDeliveryService,
    ReservationsRepository,
    ReservationsService,
    ReversalsRepository,
    ReverseDocumentService,
    PartFiguresRepository,
    PartFiguresService,
    PartListRepository,
    PartStoryRepository,
    ShelfPartsService,
    ShelfQueueRepository,
    ShelfQueueService,
    StockValueRepository,
    StockValueService,
    StockLedgerRepository,
    StockLedgerService,
    StockLines,
    StockLookupRepository,
    TransferStockService,
  ],
  exports: [
    BinsService,
    PartFiguresService,
    ShelfQueueService,
    StockValueService,
    LotRegister,
    OpeningStockService,
    ReservationsService,
    StockLedgerService,
    StockLines,
  ],
})
export class StockModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(stockConstraints);
  }
}
