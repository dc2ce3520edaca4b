import type { ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useAddBin, type BinInput } from '../api/bins';
import { BinFields } from '../components/bin-fields';

export function Component(): ReactElement {
  const add = useAddBin();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const form = useDraftForm<BinInput>({ name: 'bin', defaultValues: { code: '', name: '', quarantine: false } });
  const send = async (body: BinInput): Promise<void> => {
    const bin = await add.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`Bin ${bin.code} is there.`);
    await navigate(`/shelf/bins/${encodeURIComponent(bin.code)}`);
  };
  return (
    <>
      <PageHeading title="Add a bin" lead="A place on the shelf: a drawer, a box, a hook." />
      <Form form={form} onSubmit={send} onCancel={() => void navigate('/shelf/bins')} submitLabel="Add the bin">
        <BinFields />
      </Form>
    </>
  );
}
