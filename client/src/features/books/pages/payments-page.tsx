import type { ReactElement } from 'react';
import { column, moneyColumn, tagColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { Money } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { paymentsQuery, type PaymentRow } from '../api/books';

const columns = [
  column<PaymentRow>('document', 'Payment', ({ document }) => document, { flex: 0, width: 120, sortable: false }),
  whenColumn<PaymentRow>('receivedAt', 'Received', ({ receivedAt }) => receivedAt),
  tagColumn<PaymentRow>('order', 'Order', 'order', ({ order }) => ({ code: order })),
  tagColumn<PaymentRow>('invoice', 'Invoice', 'invoice', ({ invoice }) => (invoice ? { code: invoice } : undefined), {
    sortable: false,
  }),
  column<PaymentRow>('providerPaymentId', 'At the processor', ({ providerPaymentId }) => providerPaymentId, {
    sortable: false,
    minWidth: 200,
  }),
  moneyColumn<PaymentRow>('amount', 'Amount', ({ amount }) => amount),
  moneyColumn<PaymentRow>('refunded', 'Gone back', ({ refunded }) => (refunded.amount === 0 ? undefined : refunded), {
    sortable: false,
  }),
];

export function Component(): ReactElement {
  const grid = useServerGrid({ name: 'payments', query: paymentsQuery, defaultSort: '-receivedAt' });
  const clearing = grid.answer?.clearing;
  return (
    <>
      <PageHeading
        title="Payments"
        lead={
          clearing ? (
            <>
              By the books the card processor holds <Money value={clearing} />: payments less fees and refunds.
            </>
          ) : undefined
        }
      />
      <ServerGrid
        grid={grid}
        label="Payments"
        counted={['payment', 'payments']}
        rowId={({ document }) => document}
        columns={columns}
        empty={<EmptyState title="No payments yet">The first one comes with the first paid order.</EmptyState>}
      />
    </>
  );
}
