import { Injectable } from '@nestjs/common';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { notFound } from '../platform/errors/app-error.js';
import { Files } from '../platform/files/files.js';
import { drawPaper } from '../platform/pdf/paper.js';
import { invoicePaper } from './invoice-paper.js';
import { IssuedInvoicesRepository } from './issued-invoices.repository.js';

export interface InvoiceFile {
  readonly fileId: number;
  readonly fileName: string;
}

/** The invoice as a file. Drawn once, outside any transaction, and kept: whoever asks later gets the same bytes. */
@Injectable()
export class InvoiceFilesService {
  constructor(
    private readonly database: Database,
    private readonly transactions: Transactions,
    private readonly files: Files,
    private readonly repository: IssuedInvoicesRepository,
  ) {}

  /** @throws AppError `not_found` */
  async get(invoiceId: number): Promise<InvoiceFile> {
    const invoice = await this.repository.find(this.database.handle, invoiceId);
    if (!invoice) throw notFound('invoice');
    const fileName = `${invoice.number}.pdf`;
    const kept = await this.repository.fileOf(this.database.handle, invoiceId);
    if (kept !== undefined) return { fileId: kept, fileName };
    const bytes = await drawPaper(invoicePaper(invoice));
    const fileId = await this.transactions.run(async (trx) => {
      const file = await this.files.store(trx, bytes, { fileName, types: ['application/pdf'] });
      await this.repository.keepFile(trx, invoiceId, file.id);
      return this.repository.fileOf(trx, invoiceId);
    });
    if (fileId === undefined) throw new Error(`the file of ${invoice.number} was not kept`);
    return { fileId, fileName };
  }
}
