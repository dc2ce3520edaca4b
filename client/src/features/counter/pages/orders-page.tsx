import type { ReactElement } from 'react';
import { column, dayColumn, moneyColumn, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid, type GridFilter } from '../../../components/grid/use-server-grid';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { ordersQuery, type OrderRow } from '../api/counter';
import { orderState, orderStates } from '../components/order-words';

const filters: readonly GridFilter[] = [{ field: 'state', label: 'Where it is', options: orderStates }];

const columns = [
  tagColumn<OrderRow>('number', 'Order', 'order', ({ number, sentence }) => ({ code: number, story: sentence })),
  column<OrderRow>('recipient', 'For', ({ recipient, country }) => `${recipient}, ${country}`, { minWidth: 200 }),
  column<OrderRow>(
    'state',
    'Where it is',
    ({ state }) => {
      const { label, tone } = orderState(state);
      return <Flag tone={tone}>{label}</Flag>;
    },
    { sortable: false, minWidth: 180 },
  ),
  dayColumn<OrderRow>('promisedOn', 'Promised', ({ promisedOn }) => promisedOn),
  whenColumn<OrderRow>('placedAt', 'Placed', ({ placedAt }) => placedAt),
  moneyColumn<OrderRow>('gross', 'With VAT', ({ gross }) => gross ?? undefined),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'orders', query: ordersQuery, filters, defaultSort: '-placedAt' });
  return (
    <>
      <PageHeading title="Orders" lead="Where each one is follows from its documents." />
      <ServerGrid
        grid={grid}
        label="Orders"
        counted={['order', 'orders']}
        rowId={({ number }) => number}
        rowHref={({ number }) => `/counter/orders/${number}`}
        columns={columns}
        empty={<EmptyState title="No orders yet">The first one comes from the storefront.</EmptyState>}
      />
    </>
  );
}
