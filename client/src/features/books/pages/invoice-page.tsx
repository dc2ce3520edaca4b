import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useParams } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { DefinitionList } from '../../../components/definition-list';
import { Money, Quantity } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { invoiceQuery, type Invoice } from '../api/books';
import { LedgerTable } from '../components/ledger-table';

const Layout = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) 340px',
  gap: 32,
  alignItems: 'start',
  '& > div': { display: 'grid', gap: 24, minWidth: 0 },
  [theme.breakpoints.down('lg')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const invoice = useQuery(invoiceQuery(code));
  if (invoice.isError) {
    return <ErrorState error={invoice.error} onRetry={() => void invoice.refetch()} what="The invoice" />;
  }
  if (!invoice.data) return <LoadingState lines={8} label="Loading the invoice" />;
  return <InvoiceContent invoice={invoice.data} />;
}

function InvoiceContent({ invoice }: { invoice: Invoice }): ReactElement {
  const what = invoice.kind === 'invoice' ? 'Invoice' : 'Credit note';
  return (
    <>
      <PageHeading
        title={`${what} ${invoice.number}`}
        lead={leadOf(invoice)}
        tags={<Tag kind="order" code={invoice.reference} size="big" />}
        actions={
          <Button variant="contained" component="a" href={`/api/invoices/${invoice.number}/pdf`} download>
            Save as PDF
          </Button>
        }
      />
      <Layout>
        <div>
          <Sheet title="Lines">
            <LedgerTable
              label="Lines of the invoice"
              columns={[
                { title: 'What' },
                { title: 'Quantity', figure: true },
                { title: 'Price net', figure: true },
                { title: 'VAT %', figure: true },
                { title: 'Net', figure: true },
              ]}
              rows={[
                ...invoice.lines.map((line) => ({
                  key: line.code,
                  cells: [
                    `${line.description} (${line.code})`,
                    <Quantity key="quantity" value={line.quantity} unit={line.measure} />,
                    line.unitNet,
                    line.vatRate,
                    <Money key="net" value={line.net} />,
                  ],
                })),
                ...invoice.charges.map((charge) => ({
                  key: charge.reason,
                  cells: [charge.reason, '', '', charge.vatRate, <Money key="net" value={charge.amount} />],
                })),
              ]}
            />
          </Sheet>
          <Sheet title="VAT">
            <LedgerTable
              label="VAT per rate"
              columns={[{ title: 'Rate %' }, { title: 'On', figure: true }, { title: 'VAT', figure: true }]}
              rows={invoice.vatGroups.map(({ rate, category, taxable, amount }) => ({
                key: `${category} ${rate}`,
                cells: [rate, <Money key="on" value={taxable} />, <Money key="vat" value={amount} />],
              }))}
            />
            {invoice.notes.map((note) => (
              <p key={note}>{note}</p>
            ))}
            <Caution>Check the current rates and rules; ask your tax adviser.</Caution>
          </Sheet>
        </div>
        <div>
          <Sheet title="Totals">
            <DefinitionList
              items={[
                { term: 'Net', value: <Money value={invoice.net} /> },
                { term: 'VAT', value: <Money value={invoice.vat} /> },
                { term: 'Total', value: <Money value={invoice.gross} /> },
                { term: 'Paid', value: invoice.kind === 'invoice' ? <Money value={invoice.prepaid} /> : undefined },
              ]}
            />
          </Sheet>
          <Sheet title="Facts">
            <DefinitionList
              items={[
                { term: 'Issued on', value: invoice.issuedOn },
                { term: 'Tax point', value: invoice.taxPoint },
                { term: 'Credits', value: tagOf(invoice.creditsNumber) },
                { term: 'Credited by', value: tagOf(invoice.creditedBy[0] ?? null) },
                { term: 'Why', value: invoice.reason ?? undefined },
                { term: 'Buyer', value: partyOf(invoice.buyerParty) },
                { term: 'Seller', value: partyOf(invoice.seller) },
              ]}
            />
          </Sheet>
        </div>
      </Layout>
    </>
  );
}

function leadOf({ kind, creditsNumber, buyer, creditedBy }: Invoice): string {
  if (kind === 'credit_note') return `Takes back ${creditsNumber} for ${buyer}.`;
  return creditedBy.length > 0 ? `For ${buyer}. Credited by ${creditedBy.join(', ')}.` : `For ${buyer}.`;
}

function tagOf(number: string | null): ReactElement | undefined {
  return number === null ? undefined : <Tag kind="invoice" code={number} />;
}

function partyOf({
  name,
  addressLine,
  addressLine2,
  postcode,
  city,
  countryCode,
  vatNumber,
}: Invoice['seller']): string {
  const lines = [name, addressLine, addressLine2, `${postcode} ${city}`, countryCode, vatNumber && `VAT ${vatNumber}`];
  return lines.filter((line) => line !== null && line !== '').join(', ');
}
