import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { zeroAmount } from '@emberlot/shared/money/minor-units';
import { totalsFromNet, type VatEntry } from '@emberlot/shared/money/vat-totals';
import type { Transaction } from 'kysely';
import { DocumentsService } from '../journal/documents.service.js';
import { JournalService } from '../journal/journal.service.js';
import { Clock } from '../platform/clock/clock.js';
import { AppError } from '../platform/errors/app-error.js';
import { Numbers } from '../platform/numbers/numbers.js';

import { ShopService, type Shop } from '../settings/shop.service.js';
import type { InvoiceDraft, InvoiceParty, IssuedInvoice } from './invoice-draft.js';
import { InvoicesRepository } from './invoices.repository.js';

interface Credited {
  readonly invoiceId: number;
  readonly reason: string;
}

/**
 * Issues invoices and credit notes inside the caller's transaction. The number is taken late, because its series stays
 * locked until the transaction ends: call this as the last step.
 */
@Injectable()
export class InvoicingService {
  constructor(
    private readonly clock: Clock,
    private readonly numbers: Numbers,
    private readonly shop: ShopService,
    private readonly documents: DocumentsService,
    private readonly journal: JournalService,
    private readonly repository: InvoicesRepository,
  ) {}

  /** Issues an invoice; its tax point is today, the day of the advance payment. */
  async issue(trx: Transaction<DB>, draft: InvoiceDraft): Promise<IssuedInvoice> {
    return this.write(trx, draft, undefined);
  }

  /**
   * Credits an invoice as a whole. Nothing is negated: a credit note carries the invoice's own amounts.
   *
   * @throws AppError `not_found`, or `wrong_state` when it is a credit note itself or is credited already
   */
  async credit(
    trx: Transaction<DB>,
    credited: Credited & { readonly recordedBy: number | null },
  ): Promise<IssuedInvoice> {
    const invoice = await this.repository.findForCredit(trx, credited.invoiceId);
    if (!invoice || invoice.customerId === null) throw new AppError('not_found', 'There is no such invoice.');
    if (invoice.kind !== 'invoice') throw new AppError('wrong_state', `${invoice.number} is itself a credit note.`);
    if (invoice.credited) throw new AppError('wrong_state', `${invoice.number} has been credited already.`);
    const draft: InvoiceDraft = {
      customerId: invoice.customerId,
      buyer: invoice.buyer,
      reference: invoice.reference,
      treatment: invoice.treatment,
      vatNote: invoice.vatNote,
      lines: await this.repository.linesOf(trx, invoice.id),
      charges: await this.repository.chargesOf(trx, invoice.id),
      prepaid: zeroAmount,
      recordedBy: credited.recordedBy,
    };
    return this.write(trx, draft, credited);
  }

  private async write(
    trx: Transaction<DB>,
    draft: InvoiceDraft,
    credits: Credited | undefined,
  ): Promise<IssuedInvoice> {
    const shop = await this.shop.get(trx);
    const totals = totalsFromNet({
      lines: draft.lines.map((line) => entry(line.net, line)),
      charges: draft.charges.map((charge) => entry(charge.amount, charge)),
      prepaid: draft.prepaid,
    });
    const kind = credits ? 'credit_note' : 'invoice';
    const today = this.clock.today();
    const year = Number(today.slice(0, 4));
    const sequence = await this.numbers.next(trx, kind, String(year));
    const series = credits ? 'CN' : 'INV';
    const number = `${series}-${year}-${String(sequence).padStart(4, '0')}`;
    const document = await this.documents.record(trx, { kind, number, recordedBy: draft.recordedBy });
    const invoiceId = await this.repository.insert(trx, {
      documentId: document.id,
      kind,
      series,
      year,
      sequence,
      number,
      creditsInvoiceId: credits?.invoiceId ?? null,
      issuedAt: document.occurredAt,
      issuedOn: today,
      taxPoint: today,
      currency: shop.currency,
      seller: sellerOf(shop),
      buyer: draft.buyer,
      customerId: draft.customerId,
      reference: draft.reference,
      treatment: draft.treatment,
      vatNote: draft.vatNote,
      reason: credits?.reason ?? null,
      totals,
    });
    await this.repository.insertLines(trx, invoiceId, draft.lines);
    await this.repository.insertCharges(trx, invoiceId, draft.charges);
    await this.repository.insertVat(trx, invoiceId, totals, draft.vatNote);
    await this.journal.post(trx, {
      document,
      event: credits ? 'credit_note_issued' : 'invoice_issued',
      narrative: `${number} for ${draft.reference}`,
      amounts: { net: totals.withoutVat, vat: totals.vat },
    });
    return {
      invoiceId,
      documentId: document.id,
      number,
      net: totals.withoutVat,
      vat: totals.vat,
      gross: totals.withVat,
    };
  }
}

function entry(amount: VatEntry['amount'], rated: { vatCategory: VatEntry['category']; vatRate: string }): VatEntry {
  return { amount, category: rated.vatCategory, ratePercent: rated.vatRate };
}

function sellerOf(shop: Shop): InvoiceParty {
  return {
    name: shop.legal_name,
    addressLine: shop.address_line,
    city: shop.city,
    postcode: shop.postcode,
    countryCode: shop.country_code,
    email: shop.email,
    ...(shop.vat_number === null ? {} : { vatNumber: shop.vat_number }),
    ...(shop.registration_number === null ? {} : { registrationNumber: shop.registration_number }),
  };
}
