import type { ReactElement } from 'react';
import { useIdempotencyKey } from '../../../api/idempotency';
import { CheckInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { Sheet } from '../../../components/sheet';
import { notify } from '../../../lib/notify';
import { useMakePieces, type Batch } from '../api/bench';

interface Made {
  quantity: string;
  bin: string;
  last: boolean;
}

/** Pieces of a part that is not followed one by one go onto the shelf together. */
export function MadePieces({ batch }: { batch: Batch }): ReactElement {
  const make = useMakePieces(batch.number);
  const { keyFor, done } = useIdempotencyKey();
  const left = batch.quantity - batch.finished;
  const form = useDraftForm<Made>({
    name: `made-${batch.number}`,
    defaultValues: { quantity: String(left), bin: '', last: false },
  });
  const send = async ({ quantity, bin, last }: Made): Promise<void> => {
    const body = { quantity: Number(quantity), bin, last };
    await make.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`${quantity} ${batch.part.name} lie in ${bin.toUpperCase()}.`);
  };
  return (
    <Sheet title="Put made pieces on the shelf">
      <Form form={form} onSubmit={send} submitLabel="Put them on the shelf" label="Made pieces">
        <QuantityInput name="quantity" label="How many" places={0} hint={`${left} are still to come.`} required />
        <TextInput name="bin" label="Into bin" code width={240} required />
        <CheckInput name="last" label="Nothing more comes of this batch; the rest is lost" />
      </Form>
    </Sheet>
  );
}
