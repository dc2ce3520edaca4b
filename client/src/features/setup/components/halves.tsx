import { styled } from '@mui/material/styles';

/** A list and, beside it, the form that adds to it. */
export const Halves = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 3fr) minmax(0, 2fr)',
  gap: 24,
  alignItems: 'start',
  maxWidth: 1180,
  '& + &': { marginTop: 40 },
  [theme.breakpoints.down('md')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));
