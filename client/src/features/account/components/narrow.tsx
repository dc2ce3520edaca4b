import { styled } from '@mui/material/styles';

/** The column that account pages stand in. */
export const Narrow = styled('div')(({ theme }) => ({
  maxWidth: 460,
  '& .ways': {
    marginTop: 22,
    paddingTop: 16,
    borderTop: `1px solid ${theme.vars.palette.tone.line}`,
    display: 'grid',
    gap: 6,
  },
}));
