import { styled } from '@mui/material/styles';

/** Lines of a basket or an order. */
export const LineTable = styled('table')(({ theme }) => ({
  borderCollapse: 'collapse',
  width: '100%',
  maxWidth: 900,
  background: theme.vars.palette.tone.sheet,
  border: `1px solid ${theme.vars.palette.tone.line}`,
  '& th': { textAlign: 'left', color: theme.vars.palette.tone.inkSoft, fontFamily: theme.typography.h1.fontFamily },
  '& th, & td': { padding: '8px 12px', borderBottom: `1px solid ${theme.vars.palette.tone.line}` },
  '& .figure': { textAlign: 'right', whiteSpace: 'nowrap' },
  [theme.breakpoints.down('sm')]: { '& th, & td': { padding: '8px' }, '& .wide': { display: 'none' } },
  '& .quantity': { display: 'inline-flex', flexWrap: 'wrap', gap: 8 },
  '& input': {
    font: 'inherit',
    width: 64,
    padding: '6px 8px',
    color: theme.vars.palette.tone.ink,
    background: theme.vars.palette.tone.sheet,
    border: `1px solid ${theme.vars.palette.tone.edge}`,
    borderRadius: 3,
  },
}));
