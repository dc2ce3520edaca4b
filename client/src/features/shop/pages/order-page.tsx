import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { Money, When } from '../../../components/figures';
import { PageHeading } from '../../../components/page-heading';
import { Press } from '../../../components/press';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatPromise } from '../../../lib/format-time';
import { orderQuery, usePayAgain, type BuyerOrder } from '../api/shop';
import { LineTable } from '../components/line-table';
import { Totals } from '../components/totals';

const Page = styled('div')(({ theme }) => ({
  '& h2': { ...theme.typography.h2, margin: '26px 0 8px' },
  '& .standing': { fontSize: '1.125rem' },
  '& ul': { paddingLeft: 18 },
}));

export function Component(): ReactElement {
  const { number = '' } = useParams();
  const order = useQuery(orderQuery(number));
  if (order.isPending) return <LoadingState />;
  if (order.isError) {
    return (
      <>
        <PageHeading title={`Order ${number}`} />
        <ErrorState error={order.error} onRetry={() => void order.refetch()} what="This order" />
      </>
    );
  }
  return <OrderView order={order.data} />;
}

function OrderView({ order }: { order: BuyerOrder }): ReactElement {
  return (
    <Page>
      <PageHeading title={`Order ${order.number}`} tags={<Tag kind="order" code={order.number} />} />
      <output className="standing">{order.standing}</output>
      {order.canPay ? (
        <p>
          It is promised to leave the shop by <strong>{formatPromise(order.promisedOn)}</strong>.
        </p>
      ) : null}
      {order.canPay ? <PayAgain number={order.number} /> : null}
      <h2>What you ordered</h2>
      <LineTable>
        <thead>
          <tr>
            <th>What</th>
            <th className="figure">How many</th>
            <th className="figure">Without VAT</th>
          </tr>
        </thead>
        <tbody>
          {order.lines.map(({ title, quantity, net }) => (
            <tr key={title}>
              <td>{title}</td>
              <td className="figure">{quantity}</td>
              <td className="figure">
                <Money value={net} />
              </td>
            </tr>
          ))}
        </tbody>
      </LineTable>
      <Totals delivery={order.delivery} net={order.net} vat={order.vat} gross={order.gross} vatWords="VAT" />
      {order.vatNote ? <p>{order.vatNote}</p> : null}
      <Papers order={order} />
      <h2>Where it goes</h2>
      <address style={{ fontStyle: 'normal' }}>
        {[
          order.recipient,
          order.company,
          order.addressLine,
          order.addressLine2,
          `${order.postcode} ${order.city}`,
          order.country,
        ]
          .filter(Boolean)
          .map((line) => (
            <div key={line}>{line}</div>
          ))}
      </address>
      <h2>What happened</h2>
      <ul>
        {order.events.map(({ at, what }) => (
          <li key={`${at} ${what}`}>
            <When instant={at} />: {what}
          </li>
        ))}
      </ul>
    </Page>
  );
}

function Papers({ order }: { order: BuyerOrder }): ReactElement | null {
  if (order.invoices.length === 0 && order.units.length === 0) return null;
  return (
    <>
      <h2>Papers</h2>
      <ul>
        {order.invoices.map(({ id, number, kind, gross }) => (
          <li key={id}>
            {kind === 'invoice' ? 'Invoice' : 'Credit note'} {number}, <Money value={gross} />
          </li>
        ))}
        {order.units.map(({ serial, pageToken }) => (
          <li key={serial}>
            <Link to={`/u/${pageToken}`}>{serial}: how it measured, and its page</Link>
          </li>
        ))}
      </ul>
    </>
  );
}

function PayAgain({ number }: { number: string }): ReactElement {
  const pay = usePayAgain(number);
  return (
    <>
      <Press
        main
        large
        disabled={pay.isPending}
        onPress={() => {
          pay.mutate(undefined, {
            onSuccess: ({ paymentPage }) => {
              if (paymentPage) location.assign(paymentPage);
            },
          });
        }}
      >
        Pay now
      </Press>
      {pay.data?.paymentPage === null ? (
        <p role="alert">The payments service does not answer just now. Nothing was charged; try again in a minute.</p>
      ) : null}
      {pay.error ? <p role="alert">{pay.error.message}</p> : null}
    </>
  );
}
