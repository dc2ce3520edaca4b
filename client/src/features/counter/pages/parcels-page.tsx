import type { ReactElement } from 'react';
import { column, dayColumn, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { parcelsQuery, type ParcelRow } from '../api/counter';
import { parcelState, parcelStates } from '../components/order-words';

const filters: readonly GridFilter[] = [{ field: 'state', label: 'Where it is', options: parcelStates }];

const columns = [
  column<ParcelRow>('number', 'Parcel', ({ number }) => number, { flex: 0, width: 110, hideable: false }),
  tagColumn<ParcelRow>('order', 'Order', 'order', ({ order, recipient }) => ({ code: order, story: recipient })),
  column<ParcelRow>('recipient', 'For', ({ recipient, country }) => `${recipient}, ${country}`, { sortable: false }),
  column<ParcelRow>(
    'state',
    'Where it is',
    ({ state }) => {
      const { label, tone } = parcelState(state);
      return <Flag tone={tone}>{label}</Flag>;
    },
    { sortable: false, minWidth: 150 },
  ),
  dayColumn<ParcelRow>('promisedOn', 'Promised', ({ promisedOn }) => promisedOn),
  whenColumn<ParcelRow>('shippedAt', 'Sent', ({ shippedAt }) => shippedAt),
  column<ParcelRow>('carrier', 'Carrier', ({ carrier, trackingCode }) => [carrier, trackingCode].join(' ').trim(), {
    sortable: false,
  }),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'parcels', query: parcelsQuery, filters, defaultSort: '-openedAt' });
  return (
    <>
      <PageHeading title="Parcels" lead="An order leaves in one parcel." />
      <ServerGrid
        grid={grid}
        label="Parcels"
        counted={['parcel', 'parcels']}
        rowId={({ number }) => number}
        rowHref={({ number }) => `/counter/parcels/${number}`}
        columns={columns}
        empty={<EmptyState title="No parcels yet">Open one from an order that is ready to pack.</EmptyState>}
      />
    </>
  );
}
