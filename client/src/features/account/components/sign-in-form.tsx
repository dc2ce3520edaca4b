import { useQueryClient } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { request } from '../../../api/request';
import { sessionQuery, type Person } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { PasswordInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';

interface SignInFormProps {
  name: string;
  /** Whom the page already knows, where a session ended. */
  email?: string;
  onSignedIn: (person: Person) => void;
  onCancel?: () => void;
}

export function SignInForm({ name, email = '', onSignedIn, onCancel }: SignInFormProps): ReactElement {
  const queries = useQueryClient();
  const form = useDraftForm({ name, defaultValues: { email, password: '' }, secret: ['password'] });
  const signIn = async (values: { email: string; password: string }): Promise<void> => {
    await request('POST', '/api/session', { body: values });
    // The form-protection token belongs to the session, so a new session brings a new one.
    const session = await queries.fetchQuery({ ...sessionQuery, staleTime: 0 });
    if (session.person) onSignedIn(session.person);
  };
  return (
    <Form form={form} onSubmit={signIn} submitLabel="Sign in" onCancel={onCancel} label="Sign in">
      <TextInput name="email" label="E-mail address" type="email" autoComplete="username" required />
      <PasswordInput name="password" label="Password" autoComplete="current-password" required />
    </Form>
  );
}
