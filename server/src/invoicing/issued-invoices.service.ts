import { Injectable } from '@nestjs/common';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/app-error.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import type { InvoiceParty } from './invoice-draft.js';
import type { InvoiceDto, InvoiceKind, InvoicePageDto, InvoicePartyDto, InvoicesQuery } from './invoice.dto.js';
import { InvoiceFilesService, type InvoiceFile } from './invoice-files.service.js';
import { notesOf } from './invoice-paper.js';
import { IssuedInvoicesRepository, type FrozenInvoice } from './issued-invoices.repository.js';

/** What was issued, for staff; a buyer reaches the file of an own invoice. */
@Injectable()
export class IssuedInvoicesService {
  constructor(
    private readonly database: Database,
    private readonly repository: IssuedInvoicesRepository,
    private readonly files: InvoiceFilesService,
  ) {}

  async list(query: InvoicesQuery): Promise<InvoicePageDto> {
    const { items, total } = await this.repository.findPage(this.database.handle, query);
    return {
      total,
      items: items.map(({ id: _id, currency, net, vat, gross, ...row }) => ({
        ...row,
        kind: row.kind as InvoiceKind,
        net: { amount: net, currency },
        vat: { amount: vat, currency },
        gross: { amount: gross, currency },
      })),
    };
  }

  /** @throws AppError `not_found` */
  async get(number: string): Promise<InvoiceDto> {
    const id = await this.repository.findId(this.database.handle, number);
    const invoice = id === undefined ? undefined : await this.repository.find(this.database.handle, id);
    if (!invoice) throw notFound('invoice');
    return invoiceDto(invoice);
  }

  /**
   * The file, for staff or for the buyer whose invoice it is.
   *
   * @throws AppError `not_found`, also for what is somebody else's
   */
  async file(number: string, person: SignedInUser): Promise<InvoiceFile> {
    const own = person.role === 'customer' ? (person.customerId ?? -1) : undefined;
    const id = await this.repository.findId(this.database.handle, number, own);
    if (id === undefined) throw notFound('invoice');
    return this.files.get(id);
  }
}

function invoiceDto(invoice: FrozenInvoice): InvoiceDto {
  const money = (amount: number) => ({ amount, currency: invoice.currency });
  return {
    number: invoice.number,
    kind: invoice.kind,
    issuedOn: invoice.issuedOn,
    taxPoint: invoice.taxPoint,
    reference: invoice.reference,
    buyer: invoice.buyer.name,
    country: invoice.buyer.countryCode,
    net: money(invoice.net),
    vat: money(invoice.vatTotal),
    gross: money(invoice.gross),
    prepaid: money(invoice.prepaid),
    creditsNumber: invoice.creditsNumber,
    creditedBy: [...invoice.creditedBy],
    reason: invoice.reason,
    seller: partyDto(invoice.seller),
    buyerParty: partyDto(invoice.buyer),
    notes: [...notesOf(invoice)],
    lines: invoice.lines.map(({ net, ...line }) => ({
      ...line,
      quantity: new Decimal(line.quantity).toFixed(),
      unitNet: new Decimal(line.unitNet).toFixed(),
      vatRate: new Decimal(line.vatRate).toFixed(),
      net: money(net),
    })),
    charges: invoice.charges.map(({ amount, reason, vatRate }) => ({
      reason,
      vatRate: new Decimal(vatRate).toFixed(),
      amount: money(amount),
    })),
    vatGroups: invoice.vat.map(({ rate, category, taxable, amount }) => ({
      rate: new Decimal(rate).toFixed(),
      category,
      taxable: money(taxable),
      amount: money(amount),
    })),
  };
}

function partyDto(party: InvoiceParty): InvoicePartyDto {
  return {
    name: party.name,
    addressLine: party.addressLine,
    addressLine2: party.addressLine2 ?? null,
    city: party.city,
    postcode: party.postcode,
    countryCode: party.countryCode,
    vatNumber: party.vatNumber ?? null,
  };
}
