import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { usePerson } from '../../../api/session';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { monthsQuery, useCloseMonth, useReopenMonth, type Month } from '../api/books';
import { LedgerTable } from '../components/ledger-table';

export function Component(): ReactElement {
  const months = useQuery(monthsQuery);
  const decides = usePerson()?.role === 'accountant';
  const [asked, setAsked] = useState<Month>();
  return (
    <>
      <PageHeading
        title="Months"
        lead="A closed month accepts no entry. Opening it again wants a reason, which is kept."
      />
      {months.isError ? (
        <ErrorState error={months.error} onRetry={() => void months.refetch()} what="The months" />
      ) : null}
      {months.isPending ? <LoadingState lines={6} label="Loading the months" /> : null}
      {months.data?.items.length === 0 ? (
        <EmptyState title="No months yet">The first entry opens the first month.</EmptyState>
      ) : null}
      {months.data && months.data.items.length > 0 ? (
        <LedgerTable
          label="Months of the books"
          columns={[
            { title: 'Month' },
            { title: 'Entries', figure: true },
            { title: 'How it stands' },
            { title: 'Act' },
          ]}
          rows={months.data.items.map((month) => ({
            key: month.month,
            cells: [
              month.month,
              month.entries,
              <Standing key="standing" month={month} />,
              decides ? (
                <Button key="act" size="small" variant="outlined" onClick={() => setAsked(month)}>
                  {month.closedAt ? `Open ${month.month} again` : `Close ${month.month}`}
                </Button>
              ) : null,
            ],
          }))}
        />
      ) : null}
      {asked ? <Ask month={asked} onClose={() => setAsked(undefined)} /> : null}
    </>
  );
}

function Standing({ month }: { month: Month }): ReactElement {
  if (!month.closedAt) return <Flag tone="cool">open</Flag>;
  return (
    <>
      <Flag tone="sound">closed</Flag> by {month.closedBy} <When instant={month.closedAt} />
    </>
  );
}

function Ask({ month: { month, closedAt }, onClose }: { month: Month; onClose: () => void }): ReactElement {
  const close = useCloseMonth();
  const reopen = useReopenMonth();
  const [reason, setReason] = useState('');
  if (!closedAt) {
    return (
      <ConfirmDialog
        open
        title={`Close ${month}?`}
        confirmLabel="Close the month"
        onConfirm={() => close.mutateAsync(month)}
        onClose={onClose}
      >
        No entry is accepted in it any more until somebody opens it again.
      </ConfirmDialog>
    );
  }
  return (
    <ConfirmDialog
      open
      title={`Open ${month} again?`}
      confirmLabel="Open the month"
      onConfirm={() => reopen.mutateAsync({ month, reason })}
      onClose={onClose}
    >
      <TextField
        label="Reason"
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        required
        fullWidth
        slotProps={{ htmlInput: { maxLength: 200 } }}
      />
    </ConfirmDialog>
  );
}
