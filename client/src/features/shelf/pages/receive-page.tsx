import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { useFieldArray } from 'react-hook-form';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { sessionQuery } from '../../../api/session';
import { CheckInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { MoneyInput, QuantityInput } from '../../../components/form/number-fields';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { shopDay } from '../../../lib/format-time';
import { notify } from '../../../lib/notify';
import { useReceive } from '../api/stock';
import { CodeInput } from '../components/code-input';
import { deliveryInput, emptyDeliveryLine, type DeliveryValues } from '../components/line-values';
import { useLinePart } from '../components/lot-input';
import { RowList } from '../components/row-list';

export function Component(): ReactElement {
  const receive = useReceive();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const currency = useQuery(sessionQuery).data?.shop?.currency ?? 'EUR';
  const part = search.get('part') ?? '';
  const [today] = useState(() => shopDay(Date.now()));
  const form = useDraftForm<DeliveryValues>({
    name: `delivery:${part}`,
    defaultValues: {
      supplier: search.get('supplier') ?? '',
      deliveryNote: '',
      receivedOn: today,
      note: '',
      lines: [{ ...emptyDeliveryLine, part }],
    },
  });
  const send = async (values: DeliveryValues): Promise<void> => {
    const body = deliveryInput(values, currency);
    const delivery = await receive.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`Delivery ${delivery.number} is on the shelf.`);
    await navigate(`/shelf/deliveries/${encodeURIComponent(delivery.number)}`);
  };
  return (
    <>
      <PageHeading
        title="Receive a delivery"
        lead="Each line becomes a lot with its own history; its value goes into the books."
      />
      <Form
        wide
        form={form}
        onSubmit={send}
        onCancel={() => void navigate('/shelf/deliveries')}
        submitLabel="Put it on the shelf"
      >
        <fieldset>
          <legend>The delivery</legend>
          <CodeInput kind="supplier" name="supplier" label="Supplier" required width={280} />
          <TextInput name="deliveryNote" label="Delivery note" longest={textLimit.code} width={280} />
          <DayInput name="receivedOn" label="Received on" latest={today} required />
          <TextInput name="note" label="Note" longest={textLimit.note} rows={2} width={640} />
        </fieldset>
        <Lines currency={currency} />
      </Form>
    </>
  );
}

function Lines({ currency }: { currency: string }): ReactElement {
  const rows = useFieldArray({ name: 'lines' });
  return (
    <RowList
      legend="What came"
      rows={rows.fields.map(({ id }, index) => ({
        key: id,
        fields: <Line line={`lines.${index}`} currency={currency} />,
      }))}
      fewest={1}
      addLabel="Add a line"
      rowName={(index) => `line ${index + 1}`}
      onAdd={() => rows.append(emptyDeliveryLine)}
      onRemove={(index) => rows.remove(index)}
    />
  );
}

function Line({ line, currency }: { line: string; currency: string }): ReactElement {
  const part = useLinePart(`${line}.part`)?.part;
  const hasLots = part?.traced !== 'count';
  return (
    <>
      <CodeInput kind="part" name={`${line}.part`} label="Part" required width={200} />
      <QuantityInput name={`${line}.quantity`} label="Quantity" unit={part?.measure} places={6} required width={150} />
      <CodeInput kind="bin" name={`${line}.bin`} label="Bin" required width={130} />
      <MoneyInput
        name={`${line}.unitPrice`}
        label="Price of one"
        currency={currency}
        places={6}
        hint="without VAT"
        width={150}
      />
      <MoneyInput
        name={`${line}.lineValueMinor`}
        label="Line value"
        currency={currency}
        hint="instead of the price"
        width={180}
      />
      {hasLots ? (
        <>
          <TextInput name={`${line}.supplierLot`} label="Supplier’s lot" longest={textLimit.code} width={170} />
          <DayInput name={`${line}.expiresOn`} label="Expires on" width={170} />
          <CheckInput name={`${line}.held`} label="Hold it back" />
        </>
      ) : null}
    </>
  );
}
