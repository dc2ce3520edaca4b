import type { ReactElement } from 'react';
import { AskForPasswordLink, ChoosePasswordPage } from '../components/choose-password-page';

/** Behind the link of a password reset. */
export function Component(): ReactElement {
  return (
    <ChoosePasswordPage
      link="password-reset-completions"
      title="Choose a new password"
      lead="The old one stops working, and you are signed out everywhere else."
      submitLabel="Use this password"
      another={<AskForPasswordLink />}
    />
  );
}
