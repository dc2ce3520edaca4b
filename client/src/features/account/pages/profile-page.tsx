import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { signOut } from '../../../api/sign-out';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { formatDay, shopDay } from '../../../lib/format-time';
import { profileQuery } from '../api/account';
import { AddressForm, NameForm, PasswordForm } from '../components/profile-forms';
import { SessionList } from '../components/session-list';

const Columns = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) minmax(0, 1fr)',
  gap: 24,
  alignItems: 'start',
  maxWidth: 1180,
  '& > div': { display: 'grid', gap: 24 },
  [theme.breakpoints.down('md')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));

export function Component(): ReactElement {
  const profile = useQuery(profileQuery);
  if (profile.isError)
    return <ErrorState error={profile.error} onRetry={() => void profile.refetch()} what="Your profile" />;
  if (profile.isPending) return <LoadingState />;
  return (
    <>
      <PageHeading
        title={profile.data.name}
        documentTitle="Profile"
        lead={`${profile.data.email}. Here since ${formatDay(shopDay(profile.data.memberSince))}.`}
        actions={<Button onClick={() => void signOut()}>Sign out</Button>}
      />
      <Columns>
        <div>
          <Sheet title="What you are called">
            <NameForm profile={profile.data} />
          </Sheet>
          <Sheet title="Where you are signed in">
            <SessionList />
          </Sheet>
        </div>
        <div>
          <Sheet title="Password">
            <PasswordForm />
          </Sheet>
          <Sheet title="E-mail address">
            <AddressForm />
          </Sheet>
        </div>
      </Columns>
    </>
  );
}
