import { lazy, Suspense, type ReactElement } from 'react';
import { Outlet, ScrollRestoration } from 'react-router-dom';
import { LoadingState } from '../components/states';
import { useNavigationFocus } from './navigation-focus';
import { useSessionEnd } from './session-end';

const SignInAgain = lazy(() => import('./sign-in-again'));

export function Root(): ReactElement {
  useNavigationFocus();
  const ended = useSessionEnd();
  return (
    <>
      <Outlet />
      {ended ? (
        <Suspense>
          <SignInAgain person={ended.person} onDone={ended.settle} />
        </Suspense>
      ) : null}
      <ScrollRestoration />
    </>
  );
}

export function PageLoading(): ReactElement {
  return (
    <main style={{ padding: '34px 24px', maxWidth: 1180, margin: '0 auto' }}>
      <LoadingState label="The page is loading" />
    </main>
  );
}
