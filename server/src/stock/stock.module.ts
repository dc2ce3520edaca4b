import { Module } from '@nestjs/common';
import { JournalModule } from '../journal/journal.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { AvailabilityRepository } from './availability.repository.js';
import { ReservationsRepository } from './reservations.repository.js';
import { ReservationsService } from './reservations.service.js';
import { StockLedgerRepository } from './stock-ledger.repository.js';
import { StockLedgerService } from './stock-ledger.service.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { stockConstraints } from './stock.constraints.js';

@Module({
  imports: [SettingsModule, JournalModule],
  providers: [
    AvailabilityRepository,
    ReservationsRepository,
    ReservationsService,
    StockLedgerRepository,
    StockLedgerService,
  ],
  exports: [ReservationsService, StockLedgerService],
})
export class StockModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(stockConstraints);
  }
}
