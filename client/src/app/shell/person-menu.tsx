import Button from '@mui/material/Button';
import Popover from '@mui/material/Popover';
import Typography from '@mui/material/Typography';
import Box from '@mui/material/Box';
import { useState, type ReactElement } from 'react';
import { Link } from 'react-router-dom';
import type { Person } from '../../api/session';
import { signOut } from '../../api/sign-out';
import { SchemeChoice } from './scheme-choice';

const roleWords: Record<Person['role'], string> = {
  owner: 'Owner',
  assembler: 'Assembler',
  accountant: 'Accountant',
  customer: 'Customer',
};

export function PersonMenu({ person }: { person: Person }): ReactElement {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const close = (): void => setAnchor(null);
  return (
    <>
      <Button
        variant="text"
        aria-haspopup="dialog"
        aria-expanded={anchor !== null}
        onClick={(event) => setAnchor(event.currentTarget)}
        sx={{ color: 'text.secondary', px: 1, fontWeight: 400, whiteSpace: 'nowrap' }}
      >
        {roleWords[person.role]}
      </Button>
      <Popover
        open={anchor !== null}
        anchorEl={anchor}
        onClose={close}
        anchorOrigin={{ vertical: 'bottom', horizontal: 'right' }}
        transformOrigin={{ vertical: 'top', horizontal: 'right' }}
        slotProps={{ paper: { role: 'dialog', 'aria-label': 'You', sx: { p: 2, minWidth: 240 } } }}
      >
        <Typography sx={{ fontWeight: 500 }}>{person.name}</Typography>
        <Typography variant="body2" color="text.secondary" sx={{ mb: 1.5, overflowWrap: 'anywhere' }}>
          {person.email}
        </Typography>
        <SchemeChoice />
        <Box sx={{ display: 'flex', gap: 1, mt: 1.5 }}>
          <Button size="small" component={Link} to="/profile" onClick={close}>
            Profile
          </Button>
          <Button size="small" onClick={() => void signOut()}>
            Sign out
          </Button>
        </Box>
      </Popover>
    </>
  );
}
