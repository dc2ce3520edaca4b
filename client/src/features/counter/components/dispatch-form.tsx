import type { ReactElement } from 'react';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { Sheet } from '../../../components/sheet';
import { notify } from '../../../lib/notify';
import { useDispatch, type Parcel } from '../api/counter';

interface Sending {
  carrier: string;
  trackingCode: string;
}

/** The last act: the parcel leaves, the buyer is told. */
export function DispatchForm({ parcel }: { parcel: Parcel }): ReactElement {
  const dispatch = useDispatch(parcel.number);
  const form = useDraftForm<Sending>({
    name: `parcel ${parcel.number} sending`,
    defaultValues: { carrier: '', trackingCode: '' },
  });
  const send = async ({ carrier, trackingCode }: Sending): Promise<void> => {
    const tracking = trackingCode.trim();
    await dispatch.mutateAsync({ carrier, trackingCode: tracking === '' ? null : tracking, version: parcel.version });
    notify(`${parcel.number} has left. The buyer gets a mail.`);
  };
  return (
    <Sheet title="Send it off">
      <p>It leaves the shelf, and the buyer gets a mail. This cannot be undone.</p>
      <Form form={form} onSubmit={send} submitLabel="It has left">
        <TextInput name="carrier" label="Carrier" longest={60} required />
        <TextInput name="trackingCode" label="Tracking code" longest={60} />
      </Form>
    </Sheet>
  );
}
