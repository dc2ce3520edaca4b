import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { useAdoptSession } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { makeFirstOwner, type FirstOwner } from '../api/account';
import { Narrow } from '../components/narrow';
import { NewPasswordInput } from '../components/new-password-input';

export function Component(): ReactElement {
  const adopt = useAdoptSession();
  const navigate = useNavigate();
  const form = useDraftForm<FirstOwner>({
    name: 'first-owner',
    defaultValues: { setupCode: '', name: '', email: '', password: '' },
    secret: ['setupCode', 'password'],
  });
  const send = async (values: FirstOwner): Promise<void> => {
    adopt(await makeFirstOwner(values));
    await navigate('/today', { replace: true });
  };
  return (
    <Narrow>
      <PageHeading
        title="Begin here"
        lead="Nobody can sign in yet. The first owner opens the shop and invites everybody else."
      />
      <Form form={form} onSubmit={send} submitLabel="Open the shop">
        <TextInput
          name="setupCode"
          label="Code of the server"
          hint="It was printed where the server was started."
          code
          autoComplete="off"
          longest={textLimit.line}
          required
        />
        <TextInput name="name" label="Name" autoComplete="name" longest={textLimit.name} required />
        <TextInput
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="username"
          longest={textLimit.email}
          required
        />
        <NewPasswordInput name="password" />
      </Form>
    </Narrow>
  );
}
