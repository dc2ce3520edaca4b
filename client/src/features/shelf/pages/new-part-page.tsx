import type { ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useAddPart } from '../api/parts';
import { partAddress } from '../components/addresses';
import { PartFields } from '../components/part-fields';
import { emptyPart, partInput, type PartValues } from '../components/part-values';

export function Component(): ReactElement {
  const add = useAddPart();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const form = useDraftForm<PartValues>({ name: 'part', defaultValues: emptyPart });
  const send = async (values: PartValues): Promise<void> => {
    const body = partInput(values);
    const part = await add.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`${part.code} is on record.`);
    await navigate(partAddress(part.code));
  };
  return (
    <>
      <PageHeading
        title="Add a part"
        lead="Anything that can lie on the shelf: bought, made, a kit or a finished tool."
      />
      <Form wide form={form} onSubmit={send} onCancel={() => void navigate('/shelf/parts')} submitLabel="Add the part">
        <PartFields moved={false} />
      </Form>
    </>
  );
}
