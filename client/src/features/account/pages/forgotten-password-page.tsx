import { textLimit } from '@emberlot/shared/limits/text';
import { useState, type ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { askForPassword } from '../api/account';
import { Narrow } from '../components/narrow';

export function Component(): ReactElement {
  const [sentTo, setSentTo] = useState<string>();
  const form = useDraftForm({ name: 'forgotten-password', defaultValues: { email: '' } });
  if (sentTo) {
    return (
      <Narrow>
        <PageHeading
          title="Look into your mail"
          lead={`A message is on its way to ${sentTo}. The link in it works for half an hour.`}
        />
        <div className="ways">
          <Link to="/sign-in">Sign in</Link>
        </div>
      </Narrow>
    );
  }
  return (
    <Narrow>
      <PageHeading
        title="A new password"
        lead="Give the address you sign in with; the link to choose another password comes by mail."
      />
      <Form
        form={form}
        onSubmit={(values) => askForPassword(values).then(() => setSentTo(values.email))}
        submitLabel="Send me the link"
      >
        <TextInput
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="username"
          longest={textLimit.email}
          required
        />
      </Form>
      <div className="ways">
        <Link to="/sign-in">Sign in</Link>
      </div>
    </Narrow>
  );
}
