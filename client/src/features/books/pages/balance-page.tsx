import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Money } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { ErrorState, LoadingState } from '../../../components/states';
import { balanceQuery } from '../api/books';
import { LedgerTable } from '../components/ledger-table';
import { PeriodFields } from '../components/period-fields';

export function Component(): ReactElement {
  const [search] = useSearchParams();
  const from = search.get('from') ?? undefined;
  const to = search.get('to') ?? undefined;
  const balance = useQuery(balanceQuery({ ...(from ? { from } : {}), ...(to ? { to } : {}) }));
  return (
    <>
      <PageHeading
        title="Trial balance"
        lead={balance.data ? `Everything posted ${from ? `from ${from} ` : ''}to ${balance.data.to}.` : undefined}
      />
      <PeriodFields />
      {balance.isError ? (
        <ErrorState error={balance.error} onRetry={() => void balance.refetch()} what="The trial balance" />
      ) : null}
      {balance.isPending ? <LoadingState lines={10} label="Loading the trial balance" /> : null}
      {balance.data ? (
        <LedgerTable
          label="Trial balance"
          columns={[
            { title: 'Account' },
            { title: 'Name' },
            { title: 'Debit', figure: true },
            { title: 'Credit', figure: true },
            { title: 'Balance', figure: true },
          ]}
          rows={balance.data.accounts.map(({ account, name, debit, credit, balance: left }) => ({
            key: account,
            cells: [
              account,
              name,
              <Money key="debit" value={debit} />,
              <Money key="credit" value={credit} />,
              <Money key="balance" value={left} />,
            ],
          }))}
          foot={[
            '',
            'In all',
            <Money key="debit" value={balance.data.debit} />,
            <Money key="credit" value={balance.data.credit} />,
            '',
          ]}
        />
      ) : null}
    </>
  );
}
