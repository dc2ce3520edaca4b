import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { QueueList, type QueueItem } from '../../../components/queue-list';
import { Sentence } from '../../../components/sentence';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { formatDayShort, shopDay } from '../../../lib/format-time';
import { designQueueQuery, type DesignQueueItem } from '../api/bills';
import { billAddress, editAddress } from '../components/addresses';
import { queueHeadline, queueSentence } from '../components/design-words';

export function Component(): ReactElement {
  const queue = useQuery(designQueueQuery);
  const owner = usePerson()?.role === 'owner';
  const start = owner ? (
    <Button variant="contained" component={Link} to="/designs/bills/new">
      Start a bill
    </Button>
  ) : undefined;
  if (queue.isError && !queue.data) {
    return <ErrorState error={queue.error} onRetry={() => void queue.refetch()} what="The designs" />;
  }
  if (!queue.data) return <LoadingState lines={8} label="Loading the designs" />;
  const { items } = queue.data;
  return (
    <>
      <PageHeading
        title={queueHeadline(items)}
        documentTitle="Designs"
        lead="Drafts that wait for release, and released bills that cannot be built to."
        actions={start}
      />
      {items.length > 0 ? (
        <QueueList label="What needs you" items={items.map((item) => queueItem(item, owner))} />
      ) : (
        <EmptyState title="Every design can be built" action={start}>
          A draft that waits, a retired component or a bill of which not one can be built would stand here.
        </EmptyState>
      )}
    </>
  );
}

function queueItem(item: DesignQueueItem, owner: boolean): QueueItem {
  const place = { code: item.part.code, number: item.number };
  const ready = item.kind === 'draft_waiting' && item.against.length === 0;
  const draft = item.kind === 'draft_waiting';
  return {
    key: `${item.kind} ${item.part.code}`,
    when: formatDayShort(shopDay(item.since)),
    sentence: <Sentence text={queueSentence(item)} />,
    because: item.against.length > 0 ? item.against.join(' ') : item.part.name,
    action: (
      <Button
        component={Link}
        to={draft && !ready && owner ? editAddress(place) : billAddress(place.code, place.number)}
        aria-label={`${actionOf(draft, ready, owner)} ${place.code}`}
      >
        {actionOf(draft, ready, owner)}
      </Button>
    ),
  };
}

function actionOf(draft: boolean, ready: boolean, owner: boolean): string {
  if (!draft || !owner) return 'Look at';
  return ready ? 'Review' : 'Go on with';
}
