import { majorText } from '@emberlot/shared/money/amount-text';
import { currencyCode } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { paperFacts, paperTable, type Paper, type PaperColumn, type PaperPart } from '../platform/pdf/paper.js';
import type { InvoiceParty, VatTreatment } from './invoice-draft.js';
import type { FrozenInvoice } from './issued-invoices.repository.js';

const lineColumns: readonly PaperColumn[] = [
  { head: 'What', width: '*' },
  { head: 'Quantity', width: 55, right: true },
  { head: 'Price net', width: 60, right: true },
  { head: 'VAT', width: 40, right: true },
  { head: 'Net', width: 65, right: true },
];
const vatColumns: readonly PaperColumn[] = [
  { head: 'VAT', width: '*' },
  { head: 'On', width: 80, right: true },
  { head: 'Amount', width: 80, right: true },
];

/** What the law wants said where the order itself brought no words of its own. */
const treatmentWords: Readonly<Record<VatTreatment, string | null>> = {
  home: null,
  destination: 'VAT of the country of destination, declared through the one-stop shop.',
  export: 'Export of goods, exempt from VAT: Directive 2006/112/EC, article 146.',
  intra_community: 'Intra-Community supply, exempt from VAT: Directive 2006/112/EC, article 138.',
};

/**
 * An invoice or credit note as a paper. Everything on it is what was frozen when it was issued.
 *
 * @source what an invoice must hold: Directive 2006/112/EC, article 226, points 1 to 11 (from memory)
 */
export function invoicePaper(invoice: FrozenInvoice): Paper {
  const { seller } = invoice;
  const title = `${invoice.kind === 'invoice' ? 'Invoice' : 'Credit note'} ${invoice.number}`;
  return {
    title,
    from: seller.name,
    madeAt: invoice.issuedAt,
    foot: [seller.name, placeOf(seller), seller.vatNumber ? `VAT ${seller.vatNumber}` : '', seller.email ?? '']
      .filter((text) => text !== '')
      .join(' · '),
    parts: [
      {
        columns: [
          party('From', seller),
          party(invoice.kind === 'invoice' ? 'To' : 'Given to', invoice.buyer),
          [paperFacts(factsOf(invoice))],
        ],
        columnGap: 18,
        margin: [0, 0, 0, 14],
      },
      ...(invoice.reason === null ? [] : [{ text: `Why: ${invoice.reason}`, margin: [0, 0, 0, 6] }]),
      paperTable(lineColumns, linesOf(invoice)),
      {
        columns: [
          { text: '', width: '*' },
          { stack: [paperTable(vatColumns, vatOf(invoice))], width: 300 },
        ],
      },
      {
        columns: [
          { text: '', width: '*' },
          { stack: [totals(invoice)], width: 300 },
        ],
      },
      ...notesOf(invoice).map((text) => ({ text, margin: [0, 10, 0, 0] })),
    ],
  };
}

function party(head: string, { name, vatNumber, registrationNumber, ...address }: InvoiceParty): PaperPart {
  return [
    { text: head, color: '#55625c', fontSize: 8.5, bold: true },
    { text: name, bold: true },
    address.addressLine,
    ...(address.addressLine2 === undefined ? [] : [address.addressLine2]),
    `${address.postcode} ${address.city}`,
    address.countryCode,
    ...(vatNumber === undefined ? [] : [`VAT number ${vatNumber}`]),
    ...(registrationNumber === undefined ? [] : [`Registered as ${registrationNumber}`]),
  ];
}

function placeOf(seller: InvoiceParty): string {
  return `${seller.addressLine}, ${seller.postcode} ${seller.city}, ${seller.countryCode}`;
}

function factsOf(invoice: FrozenInvoice): readonly (readonly [string, string])[] {
  return [
    ['Number', invoice.number],
    ['Issued on', invoice.issuedOn],
    ['Tax point', invoice.taxPoint],
    ['Your order', invoice.reference],
    ...(invoice.creditsNumber === null ? [] : [['Credits', invoice.creditsNumber] as const]),
    ['Currency', invoice.currency],
  ];
}

function linesOf(invoice: FrozenInvoice): readonly (readonly string[])[] {
  return [
    ...invoice.lines.map((line) => [
      `${line.description} (${line.code})`,
      `${new Decimal(line.quantity).toFixed()} ${line.measure}`,
      new Decimal(line.unitNet).toFixed(
        Math.max(decimalsOf(invoice.currency), new Decimal(line.unitNet).decimalPlaces()),
      ),
      `${new Decimal(line.vatRate).toFixed()} %`,
      amountText(line.net, invoice.currency),
    ]),
    ...invoice.charges.map((charge) => [
      charge.reason,
      '',
      '',
      `${new Decimal(charge.vatRate).toFixed()} %`,
      amountText(charge.amount, invoice.currency),
    ]),
  ];
}

function vatOf(invoice: FrozenInvoice): readonly (readonly string[])[] {
  return invoice.vat.map(({ rate, taxable, amount }) => [
    `${new Decimal(rate).toFixed()} %`,
    amountText(taxable, invoice.currency),
    amountText(amount, invoice.currency),
  ]);
}

function totals(invoice: FrozenInvoice): PaperPart {
  const text = (amount: number) => `${amountText(amount, invoice.currency)} ${invoice.currency}`;
  const due = invoice.gross - invoice.prepaid;
  const rows: readonly (readonly [string, string, boolean])[] =
    invoice.kind === 'invoice'
      ? [
          ['Net', text(invoice.net), false],
          ['VAT', text(invoice.vatTotal), false],
          ['Total', text(invoice.gross), true],
          ['Paid', text(invoice.prepaid), false],
          ['Still to pay', text(due), true],
        ]
      : [
          ['Net', text(invoice.net), false],
          ['VAT', text(invoice.vatTotal), false],
          ['Credited in all', text(invoice.gross), true],
        ];
  return rows.map(([label, value, bold]) => ({
    columns: [
      { text: label, bold },
      { text: value, alignment: 'right', bold },
    ],
  }));
}

/** What stands under the totals: the treatment, that it is paid, what is credited. */
export function notesOf(invoice: FrozenInvoice): readonly string[] {
  const treatment = invoice.vatNote ?? treatmentWords[invoice.treatment];
  return [
    ...(treatment === null ? [] : [treatment]),
    ...(invoice.kind === 'invoice' && invoice.prepaid === invoice.gross
      ? ['Paid. This invoice was issued at the payment, which is its tax point.']
      : []),
    ...(invoice.creditsNumber === null
      ? []
      : [`This credit note takes back invoice ${invoice.creditsNumber} as a whole.`]),
  ];
}

function amountText(amount: number, currency: string): string {
  return majorText(minorAmount(amount), currencyCode(currency));
}

function decimalsOf(currency: string): number {
  return majorText(minorAmount(0), currencyCode(currency)).split('.')[1]?.length ?? 0;
}
