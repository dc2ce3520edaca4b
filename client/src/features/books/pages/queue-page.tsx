import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { QueueList, type QueueItem } from '../../../components/queue-list';
import { Sentence } from '../../../components/sentence';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { monthsQuery, waitingQuery, type Month } from '../api/books';

export function Component(): ReactElement {
  const waiting = useQuery(waitingQuery);
  const months = useQuery(monthsQuery);
  const accountant = usePerson()?.role === 'accountant';
  const fault = waiting.error ?? months.error;
  const items =
    waiting.data && months.data
      ? [...(accountant ? waiting.data.queue.map(reviewItem) : []), ...openMonths(months.data.items, waiting.data.day)]
      : undefined;
  return (
    <>
      <PageHeading
        title="The books"
        lead="The record for stock, sales and purchases. Check figures for your return with your tax adviser."
      />
      {fault && !items ? (
        <ErrorState
          error={fault}
          onRetry={() => {
            void waiting.refetch();
            void months.refetch();
          }}
          what="The books"
        />
      ) : null}
      {!fault && !items ? <LoadingState lines={4} label="Loading what waits" /> : null}
      {items?.length === 0 ? (
        <EmptyState title="Nothing waits in the books">
          Every payment fits, and every month that is over is closed.
        </EmptyState>
      ) : null}
      {items && items.length > 0 ? <QueueList label="What waits in the books" items={items} /> : null}
    </>
  );
}

interface Waiting {
  key: string;
  sentence: string;
  because: string | null;
  action: { label: string; to: string } | null;
}

function reviewItem({ key, sentence, because, action }: Waiting): QueueItem {
  return {
    key,
    sentence: <Sentence text={sentence} />,
    because,
    action: action ? (
      <Button component={Link} to={action.to} variant="outlined">
        {action.label}
      </Button>
    ) : undefined,
  };
}

/** Months that are over and still open, oldest first. */
function openMonths(months: readonly Month[], today: string): readonly QueueItem[] {
  return months
    .filter(({ month, closedAt }) => closedAt === null && month < today.slice(0, 7))
    .toSorted((a, b) => a.month.localeCompare(b.month))
    .map(({ month, entries }) => ({
      key: month,
      sentence: `${month} is over and still open.`,
      because: `${entries} ${entries === 1 ? 'entry' : 'entries'}`,
      action: (
        <Button component={Link} to="/books/months" variant="outlined">
          Close it
        </Button>
      ),
    }));
}
