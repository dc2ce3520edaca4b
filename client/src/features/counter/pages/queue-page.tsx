import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { QueueList } from '../../../components/queue-list';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatDayShort } from '../../../lib/format-time';
import { waitingQuery, type OrderRow } from '../api/counter';
import { PackButton } from '../components/pack-button';

export function Component(): ReactElement {
  const waiting = useQuery(waitingQuery);
  const packs = usePerson()?.role !== 'accountant';
  return (
    <>
      <PageHeading title="At the counter" lead="Orders that somebody can go on with, the oldest promise first." />
      {waiting.isError && !waiting.data ? (
        <ErrorState error={waiting.error} onRetry={() => void waiting.refetch()} what="The counter" />
      ) : null}
      {waiting.isPending ? <LoadingState lines={6} label="Loading the orders" /> : null}
      {waiting.data?.length === 0 ? (
        <EmptyState title="Nothing waits at the counter">The next paid order shows up here by itself.</EmptyState>
      ) : null}
      {waiting.data && waiting.data.length > 0 ? (
        <QueueList
          label="Orders to go on with"
          items={waiting.data.map((order, place) => ({
            key: order.number,
            when: formatDayShort(order.promisedOn),
            late: order.late,
            sentence: (
              <>
                <Tag kind="order" code={order.number} story={order.recipient} /> {order.sentence}
              </>
            ),
            because: `For ${order.recipient}, ${order.country}`,
            action: packs ? <Act order={order} first={place === 0} /> : undefined,
          }))}
        />
      ) : null}
    </>
  );
}

const labels: Partial<Record<OrderRow['state'], string>> = {
  packed: 'Send it off',
  packing: 'Go on packing',
  review: 'Look at it',
};

function Act({ order, first }: { order: OrderRow; first: boolean }): ReactElement {
  if (order.state === 'ready') return <PackButton order={order.number} plain={!first} />;
  const inParcel = order.state === 'packed' || order.state === 'packing';
  const label = labels[order.state];
  return (
    <Button
      component={Link}
      to={inParcel ? `/counter/parcels/${order.parcel}` : `/counter/orders/${order.number}`}
      variant={first ? 'contained' : 'outlined'}
    >
      {label ?? 'See what is missing'}
    </Button>
  );
}
