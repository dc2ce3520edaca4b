import Dialog from '@mui/material/Dialog';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Typography from '@mui/material/Typography';
import { useId, type ReactElement } from 'react';
import type { Person } from '../api/session';
import { SignInForm } from '../features/account/components/sign-in-form';

interface SignInAgainProps {
  person: Person;
  onDone: (signedIn: boolean) => void;
}

/** Over the page whose session ended: what was typed there stays, and is sent once the same person is back. */
export default function SignInAgain({ person, onDone }: SignInAgainProps): ReactElement {
  const titleId = useId();
  return (
    <Dialog open maxWidth="xs" fullWidth aria-labelledby={titleId}>
      <DialogTitle id={titleId}>Please sign in again</DialogTitle>
      <DialogContent>
        <Typography sx={{ mb: 2 }}>
          Your session has ended. Nothing you typed is lost; it goes on as soon as you are back.
        </Typography>
        <SignInForm
          name="sign-in-again"
          email={person.email}
          onSignedIn={(who) => {
            // Somebody else must not send what the first one typed.
            if (who.id === person.id) onDone(true);
            else location.assign('/');
          }}
          onCancel={() => onDone(false)}
        />
      </DialogContent>
    </Dialog>
  );
}
