import { styled } from '@mui/material/styles';

/** Rows that are read as a whole, without paging; it scrolls sideways where it is too wide. */
export const DenseTable = styled('table')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    width: '100%',
    borderCollapse: 'collapse',
    '& th': {
      ...theme.typography.h3,
      fontSize: '0.8125rem',
      textAlign: 'left',
      color: tone.inkSoft,
      padding: '8px 10px 8px 0',
      borderBottom: `1px solid ${tone.edge}`,
    },
    '& td': { padding: '7px 10px 7px 0', verticalAlign: 'middle', borderBottom: `1px solid ${tone.line}` },
    '& tbody tr:last-of-type td': { borderBottom: 0 },
    '& .figure': { textAlign: 'right', whiteSpace: 'nowrap' },
    '& .quiet': { color: tone.inkSoft },
    [theme.breakpoints.down('sm')]: {
      '& thead': { display: 'none' },
      '& tr': { display: 'block', padding: '8px 0', borderBottom: `1px solid ${tone.line}` },
      '& td': { display: 'block', border: 0, padding: '3px 0' },
      '& .figure': { textAlign: 'left' },
      '& td[data-label]::before': { content: 'attr(data-label) ": "', color: tone.inkSoft },
    },
  };
});
