import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { DefinitionList } from '../../../components/definition-list';
import { Money } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { exportTotalsQuery, type ExportTotals } from '../api/books';
import { PeriodFields } from '../components/period-fields';

const Acts = styled('div')({ display: 'flex', flexWrap: 'wrap', gap: 12, margin: '20px 0' });

export function Component(): ReactElement {
  const [search] = useSearchParams();
  const from = search.get('from') ?? '';
  const to = search.get('to') ?? '';
  return (
    <>
      <PageHeading
        title="Exports"
        lead="Two CSV files of a period, one with invoices and credit notes, one with every line of the journal."
      />
      <PeriodFields />
      {from && to ? (
        <PeriodExport from={from} to={to} />
      ) : (
        <EmptyState title="Which period?">Choose the first and the last day.</EmptyState>
      )}
    </>
  );
}

function PeriodExport({ from, to }: { from: string; to: string }): ReactElement {
  const totals = useQuery(exportTotalsQuery({ from, to }));
  if (totals.isError)
    return <ErrorState error={totals.error} onRetry={() => void totals.refetch()} what="The export" />;
  if (!totals.data) return <LoadingState lines={5} label="Adding up" />;
  const address = (file: string): string => `/api/book-exports/${file}?from=${from}&to=${to}`;
  return (
    <>
      <Totals totals={totals.data} />
      <Acts>
        <Button variant="contained" component="a" href={address('invoices.csv')} download>
          Save the invoices
        </Button>
        <Button variant="contained" component="a" href={address('entries.csv')} download>
          Save the entries
        </Button>
      </Acts>
      <Caution>Check the current rules for what you report; ask your tax adviser.</Caution>
    </>
  );
}

function Totals({ totals }: { totals: ExportTotals }): ReactElement {
  return (
    <Sheet title="Control totals">
      <p>Add the files up: they come to these figures, or something was lost on the way.</p>
      <DefinitionList
        items={[
          { term: 'Invoices', value: totals.invoices },
          { term: 'Credit notes', value: totals.creditNotes },
          { term: 'Net, credit notes taken off', value: <Money value={totals.net} /> },
          { term: 'VAT', value: <Money value={totals.vat} /> },
          { term: 'Gross', value: <Money value={totals.gross} /> },
          { term: 'Entries', value: totals.entries },
          { term: 'Lines', value: totals.lines },
          { term: 'Debit', value: <Money value={totals.debit} /> },
          { term: 'Credit', value: <Money value={totals.credit} /> },
        ]}
      />
    </Sheet>
  );
}
