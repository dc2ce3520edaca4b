import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { Money, Quantity, When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sentence } from '../../../components/sentence';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatPromise } from '../../../lib/format-time';
import { orderQuery, type DeskOrder } from '../api/counter';
import { CancelOrder } from '../components/cancel-order';
import { PackButton } from '../components/pack-button';
import { PaymentReviews } from '../components/payment-reviews';

const Layout = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) 340px',
  gap: 32,
  alignItems: 'start',
  '& > div': { display: 'grid', gap: 24, minWidth: 0 },
  '& table': { width: '100%', borderCollapse: 'collapse' },
  '& th, & td': {
    padding: '8px 10px 8px 0',
    textAlign: 'left',
    verticalAlign: 'top',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& .number': { textAlign: 'right' },
  [theme.breakpoints.down('lg')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const order = useQuery(orderQuery(code));
  if (order.isError) return <ErrorState error={order.error} onRetry={() => void order.refetch()} what="The order" />;
  if (!order.data) return <LoadingState lines={8} label="Loading the order" />;
  return <OrderContent order={order.data} />;
}

function OrderContent({ order }: { order: DeskOrder }): ReactElement {
  const role = usePerson()?.role;
  return (
    <>
      <PageHeading
        title={`Order ${order.number}`}
        lead={
          <>
            {order.sentence} Promised for {formatPromise(order.promisedOn)}
            {order.late ? ', and late' : ''}.
          </>
        }
        tags={
          <>
            <Tag kind="order" code={order.number} story={order.recipient} size="big" />
            {order.late ? <Flag tone="hot">late</Flag> : null}
          </>
        }
        actions={<Acts order={order} owner={role === 'owner'} packs={role !== 'accountant'} />}
      />
      <Layout>
        <div>
          {order.reviews.length > 0 ? <PaymentReviews reviews={order.reviews} settles={role === 'owner'} /> : null}
          {order.lines.map((line) => (
            <Line key={line.part} line={line} here={order.cancellable} />
          ))}
        </div>
        <div>
          <Sheet title="Goes to">
            {order.address.map((text) => (
              <div key={text}>{text}</div>
            ))}
            <div>{order.email}</div>
          </Sheet>
          {order.gross ? (
            <Sheet title="Price">
              <DefinitionList
                items={[
                  { term: 'Delivery', value: order.delivery ? <Money value={order.delivery} /> : undefined },
                  { term: 'Net', value: order.net ? <Money value={order.net} /> : undefined },
                  { term: 'VAT', value: order.vat ? <Money value={order.vat} /> : undefined },
                  { term: 'With VAT', value: <Money value={order.gross} /> },
                ]}
              />
              {order.vatNote ? <p>{order.vatNote} Check the current rules; ask your tax adviser.</p> : null}
            </Sheet>
          ) : null}
          <Sheet title="What happened">
            <DefinitionList
              items={order.documents.map(({ kind, number, at, sentence }) => ({
                term: number,
                value: (
                  <span key={`${kind} ${number}`}>
                    {sentence} <When instant={at} />
                  </span>
                ),
              }))}
            />
          </Sheet>
        </div>
      </Layout>
    </>
  );
}

function Acts({ order, owner, packs }: { order: DeskOrder; owner: boolean; packs: boolean }): ReactElement {
  const open = order.state === 'packing' || order.state === 'packed';
  return (
    <>
      {owner && order.cancellable ? <CancelOrder order={order} /> : null}
      {packs && order.state === 'ready' ? <PackButton order={order.number} /> : null}
      {open || order.state === 'shipped' ? (
        <Button component={Link} to={`/counter/parcels/${order.parcel}`} variant={open ? 'contained' : 'outlined'}>
          {order.state === 'packing' ? 'Go on packing' : 'Open the parcel'}
        </Button>
      ) : null}
    </>
  );
}

function Line({ line, here }: { line: DeskOrder['lines'][number]; here: boolean }): ReactElement {
  return (
    <Sheet
      title={`${line.quantity} × ${line.title}`}
      aside={line.net ? <Money value={line.net} /> : <Tag kind="part" code={line.part} />}
    >
      <table>
        <thead>
          <tr>
            <th scope="col">Part</th>
            <th scope="col">Bag</th>
            <th scope="col" className="number">
              Needed
            </th>
            {here ? <th scope="col">Where it is</th> : null}
          </tr>
        </thead>
        <tbody>
          {line.needs.map((need) => (
            <tr key={`${need.bag} ${need.part}`}>
              <td>
                <Tag kind="part" code={need.part} story={need.partName} />
              </td>
              <td>{need.bag}</td>
              <td className="number">
                <Quantity value={need.quantity} unit={need.measure} />
              </td>
              {here ? (
                <td>
                  <Sentence text={whereabouts(need)} />
                  {need.short === '0' ? null : (
                    <>
                      {' '}
                      <Flag tone="hot">{need.short} short</Flag>
                    </>
                  )}
                </td>
              ) : null}
            </tr>
          ))}
        </tbody>
      </table>
    </Sheet>
  );
}

function whereabouts({ fromShelf, batches }: DeskOrder['lines'][number]['needs'][number]): string {
  const waits = batches.map((code) => `{batch:${code}}`).join(', ');
  return [fromShelf === '0' ? '' : `${fromShelf} claimed on the shelf`, waits && `to come from ${waits}`]
    .filter((text) => text !== '')
    .join('; ');
}
