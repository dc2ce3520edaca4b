import Button from '@mui/material/Button';
import { useMutation } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { sentenceOf } from '../../../lib/problem';
import { PageHeading } from '../../../components/page-heading';
import { confirmNewAddress } from '../api/account';
import { Narrow } from '../components/narrow';
import { useLinkToken } from '../components/use-link-token';

/** Behind the link to a changed address. It asks for a press, since mail programs open links by themselves. */
export function Component(): ReactElement {
  const token = useLinkToken();
  const confirm = useMutation({
    mutationFn: () => confirmNewAddress(token),
    meta: { touches: [['session'], ['profile']], showsRefusal: true },
  });
  if (confirm.isSuccess) {
    return (
      <Narrow>
        <PageHeading title="This is your address now" lead="From now on you sign in with it, and mail comes to it." />
        <div className="ways">
          <Link to="/profile">To your profile</Link>
        </div>
      </Narrow>
    );
  }
  return (
    <Narrow>
      <PageHeading
        title="Use this address"
        lead={
          token
            ? 'It replaces the one you have signed in with so far.'
            : 'This address is not complete. Open the link from the mail once more, or copy all of it.'
        }
      />
      {confirm.isError ? <p role="alert">✕ {sentenceOf(confirm.error).sentence}</p> : null}
      {token ? (
        <Button variant="contained" disabled={confirm.isPending} onClick={() => confirm.mutate()}>
          Yes, use it
        </Button>
      ) : null}
    </Narrow>
  );
}
