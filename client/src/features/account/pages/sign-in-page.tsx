import type { ReactElement } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { PageHeading } from '../../../components/page-heading';
import { safeReturnPath } from '../../../lib/return-path';
import { SignInForm } from '../components/sign-in-form';

export function Component(): ReactElement {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return (
    <>
      <PageHeading title="Sign in" />
      <SignInForm
        name="sign-in"
        onSignedIn={(person) => {
          const usual = person.role === 'customer' ? '/' : '/today';
          void navigate(safeReturnPath(search.get('to')) ?? usual, { replace: true });
        }}
      />
    </>
  );
}
