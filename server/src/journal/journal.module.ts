import { Module } from '@nestjs/common';
import { DocumentsRepository } from './documents.repository.js';
import { DocumentsService } from './documents.service.js';
import { JournalRepository } from './journal.repository.js';
import { JournalService } from './journal.service.js';
import { ConstraintSentences } from '../platform/errors/constraints.js';
import { journalConstraints } from './journal.constraints.js';

@Module({
  providers: [DocumentsRepository, DocumentsService, JournalRepository, JournalService],
  exports: [DocumentsService, JournalService],
})
export class JournalModule {
  constructor(sentences: ConstraintSentences) {
    sentences.add(journalConstraints);
  }
}
