import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { Form } from '../../../components/form/form';
import { QuantityInput } from '../../../components/form/number-fields';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { useRework, type Fault } from '../api/bench';

interface Work {
  cause: string;
  action: string;
  minutes: string;
}

/** What was done about a fault; it closes the fault and voids earlier passes, so that the unit is measured again. */
export function ReworkForm({ fault }: { fault: Fault }): ReactElement {
  const rework = useRework(fault.number);
  const form = useDraftForm<Work>({
    name: `rework-${fault.number}`,
    defaultValues: { cause: '', action: '', minutes: '' },
  });
  const send = async ({ cause, action, minutes }: Work): Promise<void> => {
    await rework.mutateAsync({ cause, action, minutes: minutes || '0', version: fault.version });
  };
  return (
    <Form form={form} onSubmit={send} submitLabel="Rework is done" label={`Rework for ${fault.number}`}>
      <TextInput name="cause" label="What was the cause" longest={textLimit.line} required />
      <TextInput name="action" label="What was done" longest={textLimit.line} required />
      <QuantityInput name="minutes" label="Time it took" unit="min" places={2} allow="zero" required />
    </Form>
  );
}
