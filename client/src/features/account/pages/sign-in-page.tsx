import type { ReactElement } from 'react';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { PageHeading } from '../../../components/page-heading';
import { safeReturnPath } from '../../../lib/return-path';
import { Narrow } from '../components/narrow';
import { SignInForm } from '../components/sign-in-form';

export function Component(): ReactElement {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return (
    <Narrow>
      <PageHeading title="Sign in" />
      <SignInForm
        name="sign-in"
        onSignedIn={(person) => {
          const usual = person.role === 'customer' ? '/' : '/today';
          void navigate(safeReturnPath(search.get('to')) ?? usual, { replace: true });
        }}
      />
      <div className="ways">
        <Link to="/forgotten-password">I don’t know my password</Link>
        <Link to="/sign-up">I have no account yet</Link>
      </div>
    </Narrow>
  );
}
