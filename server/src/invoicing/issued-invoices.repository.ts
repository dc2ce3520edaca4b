import { Injectable } from '@nestjs/common';
import type { DB } from '@emberlot/db/database.types';
import { sql, type Kysely, type Transaction } from 'kysely';
import { containing, countOf, paged, sorted, type Page } from '../platform/paging/page.js';
import type { InvoiceParty, VatTreatment } from './invoice-draft.js';
import type { InvoicesQuery } from './invoice.dto.js';

/** An invoice as it was issued, with everything on it. */
export interface FrozenInvoice {
  readonly id: number;
  readonly kind: 'invoice' | 'credit_note';
  readonly number: string;
  readonly issuedAt: Date;
  readonly issuedOn: string;
  readonly taxPoint: string;
  readonly currency: string;
  readonly seller: InvoiceParty;
  readonly buyer: InvoiceParty;
  readonly reference: string;
  readonly treatment: VatTreatment;
  readonly vatNote: string | null;
  readonly net: number;
  readonly vatTotal: number;
  readonly gross: number;
  readonly prepaid: number;
  readonly reason: string | null;
  readonly creditsNumber: string | null;
  readonly creditedBy: readonly string[];
  readonly lines: readonly FrozenLine[];
  readonly charges: readonly { readonly reason: string; readonly amount: number; readonly vatRate: string }[];
  readonly vat: readonly {
    readonly rate: string;
    readonly category: string;
    readonly taxable: number;
    readonly amount: number;
  }[];
}

interface FrozenLine {
  readonly code: string;
  readonly description: string;
  readonly quantity: string;
  readonly measure: string;
  readonly unitNet: string;
  readonly net: number;
  readonly vatRate: string;
}

const sortColumns = {
  issuedOn: 'i.issued_at',
  number: 'i.number',
  reference: 'i.reference',
  gross: 'i.gross_minor',
  buyer: sql`i.buyer ->> 'name'`,
};

/** Reads what was issued; nothing here changes an invoice. */
@Injectable()
export class IssuedInvoicesRepository {
  async findPage(handle: Kysely<DB>, query: InvoicesQuery) {
    let found = handle
      .selectFrom('invoice as i')
      .leftJoin('invoice as credited', 'credited.id', 'i.credits_invoice_id');
    if (query.q) {
      const pattern = containing(query.q);
      found = found.where(
        sql<boolean>`(i.number || ' ' || i.reference || ' ' || (i.buyer ->> 'name')) ilike ${pattern}`,
      );
    }
    if (query.kind) found = found.where('i.kind', '=', query.kind);
    if (query.from) found = found.where('i.issued_on', '>=', query.from);
    if (query.to) found = found.where('i.issued_on', '<=', query.to);
    const rows = found.select([
      'i.id',
      'i.kind',
      'i.number',
      'i.issued_on as issuedOn',
      'i.reference',
      sql<string>`i.buyer ->> 'name'`.as('buyer'),
      sql<string>`i.buyer ->> 'countryCode'`.as('country'),
      'i.currency',
      'i.net_minor as net',
      'i.vat_minor as vat',
      'i.gross_minor as gross',
      'credited.number as creditsNumber',
    ]);
    const items = await paged(sorted(rows, query.sort, sortColumns, '-issuedOn', 'i.id'), query).execute();
    return { items, total: await countOf(found) } satisfies Page<(typeof items)[number]>;
  }

  /** @param customerId whose it must be; nothing for staff */
  async findId(handle: Kysely<DB>, number: string, customerId?: number): Promise<number | undefined> {
    let found = handle.selectFrom('invoice').select('id').where('number', '=', number);
    if (customerId !== undefined) found = found.where('customer_id', '=', customerId);
    return (await found.executeTakeFirst())?.id;
  }

  async find(handle: Kysely<DB>, id: number): Promise<FrozenInvoice | undefined> {
    const row = await handle
      .selectFrom('invoice as i')
      .leftJoin('invoice as credited', 'credited.id', 'i.credits_invoice_id')
      .selectAll('i')
      .select('credited.number as creditsNumber')
      .where('i.id', '=', id)
      .executeTakeFirst();
    if (!row) return undefined;
    return {
      id: row.id,
      kind: row.kind as FrozenInvoice['kind'],
      number: row.number,
      issuedAt: row.issued_at,
      issuedOn: row.issued_on,
      taxPoint: row.tax_point,
      currency: row.currency,
      seller: row.seller as unknown as InvoiceParty,
      buyer: row.buyer as unknown as InvoiceParty,
      reference: row.reference,
      treatment: row.vat_treatment as VatTreatment,
      vatNote: row.vat_note,
      net: row.net_minor,
      vatTotal: row.vat_minor,
      gross: row.gross_minor,
      prepaid: row.prepaid_minor,
      reason: row.reason,
      creditsNumber: row.creditsNumber,
      creditedBy: await this.creditedBy(handle, id),
      lines: await this.lines(handle, id),
      charges: await this.charges(handle, id),
      vat: await this.vat(handle, id),
    };
  }

  async fileOf(handle: Kysely<DB>, invoiceId: number): Promise<number | undefined> {
    const row = await handle
      .selectFrom('invoice_file')
      .select('file_id')
      .where('invoice_id', '=', invoiceId)
      .where('kind', '=', 'pdf')
      .executeTakeFirst();
    return row?.file_id;
  }

  /** A second file of an invoice is not kept: what was made first stays. */
  async keepFile(trx: Transaction<DB>, invoiceId: number, fileId: number): Promise<void> {
    await trx
      .insertInto('invoice_file')
      .values({ invoice_id: invoiceId, kind: 'pdf', file_id: fileId })
      .onConflict((conflict) => conflict.doNothing())
      .execute();
  }

  private async creditedBy(handle: Kysely<DB>, id: number): Promise<string[]> {
    const rows = await handle
      .selectFrom('invoice')
      .select('number')
      .where('credits_invoice_id', '=', id)
      .orderBy('id')
      .execute();
    return rows.map(({ number }) => number);
  }

  private async lines(handle: Kysely<DB>, id: number): Promise<FrozenLine[]> {
    return handle
      .selectFrom('invoice_line')
      .select([
        'code',
        'description',
        'quantity',
        'measure',
        'unit_net as unitNet',
        'net_minor as net',
        'vat_rate as vatRate',
      ])
      .where('invoice_id', '=', id)
      .orderBy('position')
      .execute();
  }

  private async charges(handle: Kysely<DB>, id: number) {
    return handle
      .selectFrom('invoice_charge')
      .select(['reason', 'amount_minor as amount', 'vat_rate as vatRate'])
      .where('invoice_id', '=', id)
      .orderBy('position')
      .execute();
  }

  private async vat(handle: Kysely<DB>, id: number) {
    return handle
      .selectFrom('invoice_vat')
      .select(['vat_rate as rate', 'vat_category as category', 'taxable_minor as taxable', 'vat_minor as amount'])
      .where('invoice_id', '=', id)
      .orderBy('vat_rate', 'desc')
      .execute();
  }
}
