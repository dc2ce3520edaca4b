import type { ReactElement } from 'react';
import { ChoosePasswordPage } from '../components/choose-password-page';

/** Behind the link of an invitation to the staff. */
export function Component(): ReactElement {
  return (
    <ChoosePasswordPage
      link="invitation-completions"
      title="Join the workshop"
      lead="Choose a password for your account; you are signed in with it at once."
      submitLabel="Join"
      another={<span>If the link no longer works, ask the owner to send another.</span>}
    />
  );
}
