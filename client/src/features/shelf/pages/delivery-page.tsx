import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { useParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { sessionQuery, usePerson } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { DenseTable } from '../../../components/dense-table';
import { Money, UnitCost, When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { formatDay, formatDayShort } from '../../../lib/format-time';
import { notify } from '../../../lib/notify';
import { deliveryQuery, useReverse, type Delivery } from '../api/stock';
import { DocumentTag } from '../components/document-tag';
import { LotStatusFlag } from '../components/lot-status-flag';
import { Columns, Loaded } from '../components/page-body';
import { ReasonDialog } from '../components/reason-dialog';
import { Amount } from '../components/amount';

export function Component(): ReactElement {
  const { number = '' } = useParams();
  return (
    <Loaded query={useQuery(deliveryQuery(number))} what="The delivery">
      {(delivery) => <DeliveryStory delivery={delivery} />}
    </Loaded>
  );
}

function DeliveryStory({ delivery }: { delivery: Delivery }): ReactElement {
  const owner = usePerson()?.role === 'owner';
  const [reversing, setReversing] = useState(false);
  return (
    <>
      <PageHeading
        title={`Delivery ${delivery.number}`}
        lead={`From ${delivery.supplierName}, received ${formatDay(delivery.receivedOn)}.`}
        tags={
          <>
            <Tag kind="document" code={delivery.number} to={null} size="big" />
            {delivery.reversedBy ? <Flag tone="tape">taken back by {delivery.reversedBy}</Flag> : null}
          </>
        }
        actions={
          owner && !delivery.reversedBy ? <Button onClick={() => setReversing(true)}>Take it back</Button> : null
        }
      />
      <Columns>
        <div>
          <Sheet title="What came">
            <Lines delivery={delivery} />
          </Sheet>
        </div>
        <div>
          <Sheet title="About it">
            <DefinitionList
              items={[
                {
                  term: 'Supplier',
                  value: <Tag kind="supplier" code={delivery.supplier} story={delivery.supplierName} />,
                },
                { term: 'Delivery note', value: delivery.deliveryNote ?? undefined },
                { term: 'Value', value: delivery.value ? <Money value={delivery.value} /> : undefined },
                { term: 'Recorded by', value: delivery.recordedBy ?? undefined },
                { term: 'Recorded', value: <When instant={delivery.occurredAt} /> },
                { term: 'Note', value: delivery.note ?? undefined },
                {
                  term: 'Taken back by',
                  value: delivery.reversedBy ? <DocumentTag number={delivery.reversedBy} kind="reversal" /> : undefined,
                },
              ]}
            />
          </Sheet>
        </div>
      </Columns>
      {reversing ? <TakeBack delivery={delivery} onClose={() => setReversing(false)} /> : null}
    </>
  );
}

function Lines({ delivery }: { delivery: Delivery }): ReactElement {
  const currency = useQuery(sessionQuery).data?.shop?.currency;
  const money = delivery.lines.some(({ value }) => value !== undefined);
  const columns = [
    { key: 'part', title: 'Part' },
    { key: 'lot', title: 'Lot' },
    { key: 'status', title: 'May be used' },
    { key: 'bin', title: 'Into' },
    { key: 'expires', title: 'Expires' },
    { key: 'quantity', title: 'Quantity', figure: true },
    ...(money
      ? [
          { key: 'cost', title: 'Each', figure: true },
          { key: 'value', title: 'Value', figure: true },
        ]
      : []),
  ];
  return (
    <DenseTable label="What came" columns={columns}>
      {delivery.lines.map((line) => (
        <tr key={`${line.lot} ${line.bin} ${line.quantity}`}>
          <td>
            <Tag kind="part" code={line.part} story={line.name} />
          </td>
          <td>
            <Tag
              kind="lot"
              code={line.lot}
              story={line.supplierLot ? `Supplier’s lot ${line.supplierLot}` : undefined}
            />
          </td>
          <td>
            <LotStatusFlag status={line.lotStatus} />
          </td>
          <td>
            <Tag kind="bin" code={line.bin} />
          </td>
          <td>{line.expiresOn ? formatDayShort(line.expiresOn) : ''}</td>
          <td className="figure">
            <Amount value={line.quantity} measure={line.measure} />
          </td>
          {money ? (
            <>
              <td className="figure">
                {line.unitCost && currency ? <UnitCost cost={line.unitCost} currency={currency} /> : null}
              </td>
              <td className="figure">{line.value ? <Money value={line.value} /> : null}</td>
            </>
          ) : null}
        </tr>
      ))}
    </DenseTable>
  );
}

function TakeBack({ delivery, onClose }: { delivery: Delivery; onClose: () => void }): ReactElement {
  const reverse = useReverse(delivery.number);
  const { keyFor, done } = useIdempotencyKey();
  return (
    <ReasonDialog
      name={`reversal:${delivery.number}`}
      title={`Take delivery ${delivery.number} back?`}
      submitLabel="Take it back"
      longest={200}
      onSubmit={async (reason) => {
        const body = { reason };
        const made = await reverse.mutateAsync({ body, key: keyFor(body) });
        done();
        notify(`${delivery.number} is taken back by ${made.number}.`);
      }}
      onClose={onClose}
    >
      Everything it brought leaves the shelf again, and the books follow. Both documents stay on record. It works only
      while all of it still lies where it was put.
    </ReasonDialog>
  );
}
