import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import type { DocumentTotals } from '@emberlot/shared/money/vat-totals';
import type { Transaction } from 'kysely';
import type { InvoiceDraftCharge, InvoiceDraftLine, InvoiceParty, VatTreatment } from './invoice-draft.js';

export interface NewInvoiceRow {
  readonly documentId: number;
  readonly kind: 'invoice' | 'credit_note';
  readonly series: string;
  readonly year: number;
  readonly sequence: number;
  readonly number: string;
  readonly creditsInvoiceId: number | null;
  readonly issuedAt: Date;
  readonly issuedOn: string;
  readonly taxPoint: string;
  readonly currency: string;
  readonly seller: InvoiceParty;
  readonly buyer: InvoiceParty;
  readonly customerId: number;
  readonly reference: string;
  readonly treatment: VatTreatment;
  readonly vatNote: string | null;
  readonly reason: string | null;
  readonly totals: DocumentTotals;
}

export interface InvoiceToCredit {
  readonly id: number;
  readonly number: string;
  readonly kind: string;
  readonly customerId: number | null;
  readonly buyer: InvoiceParty;
  readonly reference: string;
  readonly treatment: VatTreatment;
  readonly vatNote: string | null;
  readonly credited: boolean;
}

@Injectable()
export class InvoicesRepository {
  async insert(trx: Transaction<DB>, row: NewInvoiceRow): Promise<number> {
    const { id } = await trx
      .insertInto('invoice')
      .values({
        document_id: row.documentId,
        kind: row.kind,
        series: row.series,
        year: row.year,
        sequence: row.sequence,
        number: row.number,
        credits_invoice_id: row.creditsInvoiceId,
        issued_at: row.issuedAt,
        issued_on: row.issuedOn,
        tax_point: row.taxPoint,
        currency: row.currency,
        seller: JSON.stringify(row.seller),
        buyer: JSON.stringify(row.buyer),
        customer_id: row.customerId,
        reference: row.reference,
        vat_treatment: row.treatment,
        vat_note: row.vatNote,
        net_minor: row.totals.withoutVat,
        vat_minor: row.totals.vat,
        gross_minor: row.totals.withVat,
        prepaid_minor: row.totals.prepaid,
        reason: row.reason,
      })
      .returning('id')
      .executeTakeFirstOrThrow();
    return id;
  }

  async insertLines(trx: Transaction<DB>, invoiceId: number, lines: readonly InvoiceDraftLine[]): Promise<void> {
    await trx
      .insertInto('invoice_line')
      .values(
        lines.map((line, index) => ({
          invoice_id: invoiceId,
          position: index + 1,
          part_id: line.partId,
          code: line.code,
          description: line.description,
          quantity: line.quantity,
          measure: line.measure,
          unit_net: line.unitNet,
          net_minor: line.net,
          vat_category: line.vatCategory,
          vat_rate: line.vatRate,
        })),
      )
      .execute();
  }

  async insertCharges(trx: Transaction<DB>, invoiceId: number, charges: readonly InvoiceDraftCharge[]): Promise<void> {
    if (charges.length === 0) return;
    await trx
      .insertInto('invoice_charge')
      .values(
        charges.map((charge, index) => ({
          invoice_id: invoiceId,
          position: index + 1,
          kind: 'charge',
          reason: charge.reason,
          amount_minor: charge.amount,
          vat_category: charge.vatCategory,
          vat_rate: charge.vatRate,
        })),
      )
      .execute();
  }

  async insertVat(
    trx: Transaction<DB>,
    invoiceId: number,
    totals: DocumentTotals,
    reason: string | null,
  ): Promise<void> {
    await trx
      .insertInto('invoice_vat')
      .values(
        totals.groups.map((group) => ({
          invoice_id: invoiceId,
          vat_category: group.category,
          vat_rate: group.ratePercent,
          taxable_minor: group.taxable,
          vat_minor: group.vat,
          reason: group.category === 'S' ? null : reason,
        })),
      )
      .execute();
  }

  /** Reads an invoice to credit it. Two credit notes at once are kept apart by the order's lock and by the database at commit. */
  async findForCredit(trx: Transaction<DB>, invoiceId: number): Promise<InvoiceToCredit | undefined> {
    const row = await trx
      .selectFrom('invoice as i')
      .select([
        'i.id',
        'i.number',
        'i.kind',
        'i.customer_id',
        'i.buyer',
        'i.reference',
        'i.vat_treatment',
        'i.vat_note',
      ])
      .select((select) =>
        select
          .exists(select.selectFrom('invoice as c').select('c.id').whereRef('c.credits_invoice_id', '=', 'i.id'))
          .as('credited'),
      )
      .where('i.id', '=', invoiceId)
      .executeTakeFirst();
    if (!row) return undefined;
    return {
      id: row.id,
      number: row.number,
      kind: row.kind,
      customerId: row.customer_id,
      buyer: row.buyer as unknown as InvoiceParty,
      reference: row.reference,
      treatment: row.vat_treatment as VatTreatment,
      vatNote: row.vat_note,
      credited: Boolean(row.credited),
    };
  }

  async linesOf(trx: Transaction<DB>, invoiceId: number): Promise<readonly InvoiceDraftLine[]> {
    const rows = await trx
      .selectFrom('invoice_line')
      .selectAll()
      .where('invoice_id', '=', invoiceId)
      .orderBy('position')
      .execute();
    return rows.map((row) => ({
      partId: row.part_id,
      code: row.code,
      description: row.description,
      quantity: row.quantity,
      measure: row.measure,
      unitNet: row.unit_net,
      net: row.net_minor as InvoiceDraftLine['net'],
      vatCategory: row.vat_category as InvoiceDraftLine['vatCategory'],
      vatRate: row.vat_rate,
    }));
  }

  async chargesOf(trx: Transaction<DB>, invoiceId: number): Promise<readonly InvoiceDraftCharge[]> {
    const rows = await trx
      .selectFrom('invoice_charge')
      .selectAll()
      .where('invoice_id', '=', invoiceId)
      .orderBy('position')
      .execute();
    return rows.map((row) => ({
      reason: row.reason,
      amount: row.amount_minor as InvoiceDraftCharge['amount'],
      vatCategory: row.vat_category as InvoiceDraftCharge['vatCategory'],
      vatRate: row.vat_rate,
    }));
  }
}
