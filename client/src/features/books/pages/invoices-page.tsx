import type { ReactElement } from 'react';
import { column, dayColumn, moneyColumn, tagColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { invoicesQuery, type InvoiceRow } from '../api/books';

const filters: readonly GridFilter[] = [
  {
    field: 'kind',
    label: 'Kind',
    options: [
      { value: 'invoice', label: 'Invoices' },
      { value: 'credit_note', label: 'Credit notes' },
    ],
  },
  { field: 'from', label: 'From', kind: 'day' },
  { field: 'to', label: 'To', kind: 'day' },
];

const columns = [
  tagColumn<InvoiceRow>('number', 'Number', 'invoice', ({ number, buyer }) => ({ code: number, story: buyer })),
  dayColumn<InvoiceRow>('issuedOn', 'Issued on', ({ issuedOn }) => issuedOn),
  column<InvoiceRow>('buyer', 'Buyer', ({ buyer, country }) => `${buyer}, ${country}`, { minWidth: 180 }),
  column<InvoiceRow>(
    'reference',
    'For',
    ({ reference, creditsNumber }) => (
      <span>
        <Tag kind="order" code={reference} /> {creditsNumber ? `credits ${creditsNumber}` : ''}
      </span>
    ),
    { minWidth: 190 },
  ),
  moneyColumn<InvoiceRow>('net', 'Net', ({ net }) => net, { sortable: false }),
  moneyColumn<InvoiceRow>('vat', 'VAT', ({ vat }) => vat, { sortable: false }),
  moneyColumn<InvoiceRow>('gross', 'Total', ({ gross }) => gross),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'invoices', query: invoicesQuery, filters, defaultSort: '-issuedOn' });
  return (
    <>
      <PageHeading
        title="Invoices"
        lead="Frozen when they are issued, without gaps in their numbers; corrected only by credit notes."
      />
      <ServerGrid
        grid={grid}
        label="Invoices and credit notes"
        counted={['document', 'documents']}
        rowId={({ number }) => number}
        rowHref={({ number }) => `/books/invoices/${number}`}
        columns={columns}
        empty={<EmptyState title="No invoices yet">The first one is issued with the first payment.</EmptyState>}
      />
    </>
  );
}
