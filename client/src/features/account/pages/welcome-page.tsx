import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { ChoosePasswordPage } from '../components/choose-password-page';

/** Behind the link that confirms an address. */
export function Component(): ReactElement {
  return (
    <ChoosePasswordPage
      link="sign-up-completions"
      title="Choose a password"
      lead="That confirms your address and opens your account."
      submitLabel="Open my account"
      another={<Link to="/sign-up">The link no longer works: send me another</Link>}
    />
  );
}
