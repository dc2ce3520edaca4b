import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { sessionQuery } from '../../../api/session';
import { Money, When } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { Press } from '../../../components/press';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { ownOrdersQuery } from '../api/shop';
import { LineTable } from '../components/line-table';

export function Component(): ReactElement {
  const session = useQuery(sessionQuery);
  if (session.isPending) return <LoadingState />;
  if (session.data?.person?.role === 'customer') return <OwnOrders />;
  return (
    <>
      <PageHeading title="Your orders" />
      <EmptyState title="Sign in to see your orders" action={<Press to="/sign-in">Sign in</Press>}>
        Ordered without an account? The confirmation in your mail says all about the order.
      </EmptyState>
    </>
  );
}

function OwnOrders(): ReactElement {
  const orders = useQuery(ownOrdersQuery);
  return (
    <>
      <PageHeading title="Your orders" />
      {orders.isError ? (
        <ErrorState error={orders.error} onRetry={() => void orders.refetch()} what="Your orders" />
      ) : null}
      {orders.isPending ? <LoadingState /> : null}
      {orders.data?.items.length === 0 ? (
        <EmptyState title="You have not ordered anything yet" action={<Press to="/">See what there is</Press>}>
          What you order while you are signed in is listed here.
        </EmptyState>
      ) : null}
      {orders.data && orders.data.items.length > 0 ? (
        <LineTable>
          <thead>
            <tr>
              <th>Order</th>
              <th>Ordered</th>
              <th>How it stands</th>
              <th className="figure">With VAT</th>
            </tr>
          </thead>
          <tbody>
            {orders.data.items.map(({ number, placedAt, standing, gross }) => (
              <tr key={number}>
                <td>
                  <Tag kind="order" code={number} to={`/orders/${number}`} />
                </td>
                <td>
                  <When instant={placedAt} />
                </td>
                <td>{standing}</td>
                <td className="figure">
                  <Money value={gross} />
                </td>
              </tr>
            ))}
          </tbody>
        </LineTable>
      ) : null}
    </>
  );
}
