import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { Tag } from '../../../components/tag/tag';
import { notify } from '../../../lib/notify';
import { partQuery, useEditPart, type Part } from '../api/parts';
import { partAddress } from '../components/addresses';
import { Loaded } from '../components/page-body';
import { PartFields } from '../components/part-fields';
import { partInput, partValues, type PartValues } from '../components/part-values';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const query = useQuery({ ...partQuery(code), staleTime: 0 });
  return (
    <Loaded query={query} what="The part">
      {({ part }) => <EditPart key={`${part.code}/${part.version}`} part={part} />}
    </Loaded>
  );
}

function EditPart({ part }: { part: Part }): ReactElement {
  const edit = useEditPart(part.code);
  const navigate = useNavigate();
  const form = useDraftForm<PartValues>({ name: `part:${part.code}`, defaultValues: partValues(part) });
  const send = async (values: PartValues): Promise<void> => {
    const after = await edit.mutateAsync({ ...partInput(values), version: part.version });
    notify(`${after.code} is kept as you wrote it.`);
    await navigate(partAddress(after.code));
  };
  return (
    <>
      <PageHeading title={`Edit ${part.name}`} tags={<Tag kind="part" code={part.code} size="big" />} />
      <Form
        wide
        form={form}
        onSubmit={send}
        onCancel={() => void navigate(partAddress(part.code))}
        submitLabel="Keep these changes"
      >
        <PartFields moved={part.moved} />
      </Form>
    </>
  );
}
