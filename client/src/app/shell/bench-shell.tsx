import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Outlet } from 'react-router-dom';
import { Notices } from './notices';
import { SkipLink } from './skip-link';

const Screen = styled('div')(({ theme }) => ({
  minHeight: '100dvh',
  display: 'flex',
  flexDirection: 'column',
  fontSize: '1.125rem',
  '& > main': { flex: 1, display: 'flex', flexDirection: 'column', minHeight: 0 },
  // Gloves: nothing that is pressed is smaller than 48 px here.
  '& .MuiButton-root, & .MuiIconButton-root': { minHeight: 48, minWidth: 48, fontSize: '1.125rem' },
  '& .MuiInputBase-root': { minHeight: 48, fontSize: '1.125rem' },
  [theme.breakpoints.up('md')]: { height: '100dvh', overflow: 'hidden', '& > main': { overflow: 'auto' } },
}));

/** One unit in front, nothing else: the whole screen belongs to the page. */
export function Component(): ReactElement {
  return (
    <Screen>
      <SkipLink />
      <main id="content" tabIndex={-1}>
        <Outlet />
      </main>
      <Notices />
    </Screen>
  );
}
