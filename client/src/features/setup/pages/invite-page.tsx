import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { RadioInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { notify } from '../../../lib/notify';
import { useInvite, type Invitation } from '../api/staff';
import { roleChoices } from '../components/role-choices';

export function Component(): ReactElement {
  const invite = useInvite();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const back = { pathname: '/setup/people', search: search.toString() };
  const form = useDraftForm<Invitation>({
    name: 'invitation',
    defaultValues: { name: '', email: '', role: 'assembler' },
  });
  const send = async (body: Invitation): Promise<void> => {
    await invite.mutateAsync({ body, key: keyFor(body) });
    done();
    notify(`An invitation is on its way to ${body.email}. It works for a week.`);
    await navigate(back);
  };
  return (
    <>
      <PageHeading title="Invite somebody" lead="They get a link by mail, choose a password, and are in." />
      <Form form={form} onSubmit={send} onCancel={() => void navigate(back)} submitLabel="Send the invitation">
        <TextInput name="name" label="Name" longest={textLimit.name} autoComplete="off" required />
        <TextInput
          name="email"
          label="E-mail address"
          type="email"
          longest={textLimit.email}
          autoComplete="off"
          required
        />
        <RadioInput name="role" label="Role" choices={roleChoices} required />
      </Form>
    </>
  );
}
