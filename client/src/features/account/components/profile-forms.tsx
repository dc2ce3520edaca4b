import { textLimit } from '@emberlot/shared/limits/text';
import type { ReactElement } from 'react';
import { Form } from '../../../components/form/form';
import { PasswordInput, TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { notify } from '../../../lib/notify';
import { askForNewAddress, changePassword, useRename, type Profile } from '../api/account';
import { NewPasswordInput } from './new-password-input';

type NameValues = Pick<Profile, 'name' | 'version'>;

const nameValues = ({ name, version }: NameValues): NameValues => ({ name, version });

export function NameForm({ profile }: { profile: Profile }): ReactElement {
  const rename = useRename();
  const form = useDraftForm({ name: 'profile-name', defaultValues: nameValues(profile) });
  const send = async (values: NameValues): Promise<Profile> => {
    const kept = await rename.mutateAsync(values);
    notify('Your name is changed.');
    return kept;
  };
  return (
    <Form
      form={form}
      onSubmit={send}
      submitLabel="Keep this name"
      valuesOf={(current) => nameValues(current as Profile)}
    >
      <TextInput name="name" label="Name" autoComplete="name" longest={textLimit.name} required />
    </Form>
  );
}

export function PasswordForm(): ReactElement {
  const empty = { currentPassword: '', newPassword: '' };
  const form = useDraftForm({
    name: 'profile-password',
    defaultValues: empty,
    secret: ['currentPassword', 'newPassword'],
  });
  const send = async (values: typeof empty): Promise<void> => {
    await changePassword(values);
    notify('Your password is changed. You are signed out everywhere else.');
  };
  return (
    <Form form={form} onSubmit={send} after="empty" submitLabel="Change the password">
      <PasswordInput name="currentPassword" label="Password so far" autoComplete="current-password" required />
      <NewPasswordInput name="newPassword" label="New password" />
    </Form>
  );
}

export function AddressForm(): ReactElement {
  const empty = { email: '', currentPassword: '' };
  const form = useDraftForm({ name: 'profile-address', defaultValues: empty, secret: ['currentPassword'] });
  const send = async (values: typeof empty): Promise<void> => {
    await askForNewAddress(values);
    notify(`A link is on its way to ${values.email}. The address counts once you have opened it.`);
  };
  return (
    <Form form={form} onSubmit={send} after="empty" submitLabel="Send a link to it">
      <TextInput
        name="email"
        label="New address"
        type="email"
        autoComplete="email"
        longest={textLimit.email}
        required
      />
      <PasswordInput name="currentPassword" label="Your password" autoComplete="current-password" required />
    </Form>
  );
}
