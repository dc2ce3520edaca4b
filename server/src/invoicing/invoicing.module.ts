import { Module } from '@nestjs/common';
import { JournalModule } from '../journal/journal.module.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { SettingsModule } from '../settings/settings.module.js';
import { InvoiceFilesService } from './invoice-files.service.js';
import { InvoicesController } from './invoices.controller.js';
import { InvoicesRepository } from './invoices.repository.js';
import { invoicingConstraints } from './invoicing.constraints.js';
import { InvoicingService } from './invoicing.service.js';
import { IssuedInvoicesRepository } from './issued-invoices.repository.js';
import { IssuedInvoicesService } from './issued-invoices.service.js';

@Module({
  imports: [SettingsModule, JournalModule],
  controllers: [InvoicesController],
  providers: [
    InvoiceFilesService,
    InvoicesRepository,
    InvoicingService,
    IssuedInvoicesRepository,
    IssuedInvoicesService,
  ],
  exports: [InvoiceFilesService, InvoicingService],
})
export class InvoicingModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(invoicingConstraints);
  }
}
