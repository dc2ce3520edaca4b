import { Module } from '@nestjs/common';
import { JournalModule } from '../journal/journal.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { InvoicesRepository } from './invoices.repository.js';
import { InvoicingService } from './invoicing.service.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { invoicingConstraints } from './invoicing.constraints.js';

@Module({
  imports: [SettingsModule, JournalModule],
  providers: [InvoicesRepository, InvoicingService],
  exports: [InvoicingService],
})
export class InvoicingModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(invoicingConstraints);
  }
}
