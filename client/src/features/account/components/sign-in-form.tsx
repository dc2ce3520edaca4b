import type { ReactElement } from 'react';
import { textLimit } from '@emberlot/shared/limits/text';
import { useAdoptSession, type Person } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { PasswordInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { signIn } from '../api/account';

interface SignInFormProps {
  name: string;
  /** Whom the page already knows, where a session ended. */
  email?: string;
  onSignedIn: (person: Person) => void;
  onCancel?: () => void;
}

export function SignInForm({ name, email = '', onSignedIn, onCancel }: SignInFormProps): ReactElement {
  const adopt = useAdoptSession();
  const form = useDraftForm({ name, defaultValues: { email, password: '' }, secret: ['password'] });
  const send = async (values: { email: string; password: string }): Promise<void> => {
    const session = await signIn(values);
    adopt(session);
    if (session.person) onSignedIn(session.person);
  };
  return (
    <Form form={form} onSubmit={send} submitLabel="Sign in" onCancel={onCancel} label="Sign in">
      <TextInput
        name="email"
        label="E-mail address"
        type="email"
        autoComplete="username"
        longest={textLimit.email}
        required
      />
      <PasswordInput name="password" label="Password" autoComplete="current-password" required />
    </Form>
  );
}
