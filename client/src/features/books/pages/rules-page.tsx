import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { PageHeading } from '../../../components/page-heading';
import { ErrorState, LoadingState } from '../../../components/states';
import { rulesQuery } from '../api/books';
import { LedgerTable } from '../components/ledger-table';

export function Component(): ReactElement {
  const rules = useQuery(rulesQuery);
  return (
    <>
      <PageHeading
        title="Posting rules"
        lead="Every entry follows from one of these. An amount below zero swaps the sides."
      />
      {rules.isError ? <ErrorState error={rules.error} onRetry={() => void rules.refetch()} what="The rules" /> : null}
      {rules.isPending ? <LoadingState lines={10} label="Loading the rules" /> : null}
      {rules.data ? (
        <LedgerTable
          label="Posting rules"
          columns={[{ title: 'What happens' }, { title: 'Debit' }, { title: 'Credit' }, { title: 'Event' }]}
          rows={rules.data.items.map((rule) => ({
            key: `${rule.event} ${rule.component}`,
            cells: [
              rule.sentence,
              `${rule.debitAccount} ${rule.debitName}`,
              `${rule.creditAccount} ${rule.creditName}`,
              `${rule.event.replaceAll('_', ' ')}, ${rule.component.replaceAll('_', ' ')}`,
            ],
          }))}
        />
      ) : null}
    </>
  );
}
