import { textLimit } from '@emberlot/shared/limits/text';
import { useState, type ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { askForAccount } from '../api/account';
import { Narrow } from '../components/narrow';

export function Component(): ReactElement {
  const [sentTo, setSentTo] = useState<string>();
  const form = useDraftForm({ name: 'sign-up', defaultValues: { name: '', email: '' } });
  if (sentTo) {
    return (
      <Narrow>
        <PageHeading
          title="Look into your mail"
          lead={`A message is on its way to ${sentTo}. Open the link in it to choose a password; it works for a day.`}
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
        title="Make an account"
        lead="With it you can follow your orders, find your invoices, and register your tools."
      />
      <Form
        form={form}
        onSubmit={(values) => askForAccount(values).then(() => setSentTo(values.email))}
        submitLabel="Send me the link"
      >
        <TextInput name="name" label="Name" autoComplete="name" longest={textLimit.name} required />
        <TextInput
          name="email"
          label="E-mail address"
          type="email"
          autoComplete="email"
          longest={textLimit.email}
          required
        />
      </Form>
      <div className="ways">
        <Link to="/sign-in">I have an account</Link>
      </div>
    </Narrow>
  );
}
