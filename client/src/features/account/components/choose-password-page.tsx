import { useState, type ReactElement } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useAdoptSession } from '../../../api/session';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { choosePassword, type PasswordLink } from '../api/account';
import { useLinkToken } from './use-link-token';
import { Narrow } from './narrow';
import { NewPasswordInput } from './new-password-input';

interface ChoosePasswordPageProps {
  link: PasswordLink;
  title: string;
  lead: string;
  submitLabel: string;
  /** Where another link is asked for, if this one is used or too old. */
  another: ReactElement;
}

/** The page behind a link from a mail: choosing a password uses the link and signs in. */
export function ChoosePasswordPage({ link, title, lead, submitLabel, another }: ChoosePasswordPageProps): ReactElement {
  const token = useLinkToken();
  const adopt = useAdoptSession();
  const navigate = useNavigate();
  const form = useDraftForm({ name: link, defaultValues: { password: '' }, secret: ['password'] });
  const [done, setDone] = useState(false);
  if (!token && !done) {
    return (
      <Narrow>
        <PageHeading
          title={title}
          lead="This address is not complete. Open the link from the mail once more, or copy all of it."
        />
        <div className="ways">{another}</div>
      </Narrow>
    );
  }
  const send = async ({ password }: { password: string }): Promise<void> => {
    const session = await choosePassword(link, { token, password });
    setDone(true);
    adopt(session);
    await navigate(session.person?.role === 'customer' ? '/' : '/today', { replace: true });
  };
  return (
    <Narrow>
      <PageHeading title={title} lead={lead} />
      <Form form={form} onSubmit={send} submitLabel={submitLabel}>
        <NewPasswordInput name="password" />
      </Form>
      <div className="ways">{another}</div>
    </Narrow>
  );
}

export function AskForPasswordLink(): ReactElement {
  return <Link to="/forgotten-password">The link no longer works: send me another</Link>;
}
