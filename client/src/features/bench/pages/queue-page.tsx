import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { QueueList, type QueueItem } from '../../../components/queue-list';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Strip } from '../../../components/strip/strip';
import { Tag } from '../../../components/tag/tag';
import { formatDayShort } from '../../../lib/format-time';
import { capital, numberWord } from '../../../lib/number-words';
import { openBatchesQuery, type BatchItem } from '../api/bench';
import { buildAddress } from '../components/addresses';
import { NextAct } from '../components/next-act';

function headline(batches: readonly BatchItem[]): string {
  if (batches.length === 0) return 'Nothing is on the bench';
  const many = batches.length === 1 ? 'batch is' : 'batches are';
  return `${capital(numberWord(batches.length))} ${many} under way`;
}

export function Component(): ReactElement {
  const open = useQuery(openBatchesQuery);
  const owner = usePerson()?.role === 'owner';
  const navigate = useNavigate();
  const plan = owner ? (
    <Button variant="contained" component={Link} to="/bench/batches/new">
      Plan a batch
    </Button>
  ) : undefined;
  if (open.isError && !open.data) {
    return <ErrorState error={open.error} onRetry={() => void open.refetch()} what="The bench" />;
  }
  if (!open.data) return <LoadingState lines={8} label="Loading the bench" />;
  const { items } = open.data;
  const entry = (batch: BatchItem): QueueItem => ({
    key: batch.number,
    when: formatDayShort(batch.dueOn),
    late: batch.late,
    sentence: (
      <>
        <Tag kind="batch" code={batch.number} story={`${batch.quantity} ${batch.part.name}`} /> {batch.quantity}{' '}
        <em>{batch.part.name}</em>: {batch.next.sentence}
      </>
    ),
    because:
      batch.units.length > 0 ? (
        <Strip
          label={`Batch ${batch.number}`}
          units={batch.units}
          onOpen={(serial) => void navigate(buildAddress(batch.number, serial))}
        />
      ) : undefined,
    action: <NextAct batch={batch} />,
  });
  return (
    <>
      <PageHeading
        title={headline(items)}
        documentTitle="Bench"
        lead="Each batch with what to do next, the one that is due first on top."
        actions={plan}
      />
      {items.length > 0 ? (
        <QueueList label="Batches under way" items={items.map(entry)} />
      ) : (
        <EmptyState title="No batch is under way" action={plan}>
          A batch that is planned, picked or built stands here with its next act.
        </EmptyState>
      )}
    </>
  );
}
