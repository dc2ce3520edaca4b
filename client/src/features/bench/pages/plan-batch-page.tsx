import { textLimit } from '@emberlot/shared/limits/text';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { ChoiceInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { DayInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { ErrorState, LoadingState } from '../../../components/states';
import { buildablePartsQuery, usePlanBatch } from '../api/bench';
import { batchAddress } from '../components/addresses';

interface Planned {
  part: string;
  quantity: string;
  startOn: string;
  dueOn: string;
  note: string;
}

export function Component(): ReactElement {
  const parts = useQuery(buildablePartsQuery);
  const plan = usePlanBatch();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const form = useDraftForm<Planned>({
    name: 'new-batch',
    defaultValues: { part: search.get('part') ?? '', quantity: '', startOn: '', dueOn: '', note: '' },
  });
  const send = async ({ part, quantity, startOn, dueOn, note }: Planned): Promise<void> => {
    const body = { part, quantity: Number(quantity), startOn: startOn || null, dueOn, note: note.trim() || null };
    const { number } = await plan.mutateAsync({ body, key: keyFor(body) });
    done();
    await navigate(batchAddress(number));
  };
  if (parts.isError && !parts.data) {
    return <ErrorState error={parts.error} onRetry={() => void parts.refetch()} what="The parts to build" />;
  }
  if (!parts.data) return <LoadingState lines={6} label="Loading the parts to build" />;
  const choices = parts.data.items.map(({ code, name }) => ({ value: code, label: `${code} ${name}` }));
  return (
    <>
      <PageHeading
        title="Plan a batch"
        lead="What is free on the shelf is claimed for it at once; what is not there is named as missing."
      />
      <Form form={form} onSubmit={send} onCancel={() => void navigate('/bench')} submitLabel="Plan the batch">
        <ChoiceInput name="part" label="What to build" choices={choices} none="Choose a part" required />
        <QuantityInput name="quantity" label="How many" places={0} required />
        <DayInput name="startOn" label="Start on" />
        <DayInput name="dueOn" label="Due on" required />
        <TextInput name="note" label="Note" longest={textLimit.note} />
      </Form>
    </>
  );
}
