import { styled } from '@mui/material/styles';

/** The bench's own dark ground, whatever the rest of the product shows. */
export const Frame = styled('div')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    flex: 1,
    display: 'grid',
    gridTemplateRows: 'auto 1fr',
    minHeight: 0,
    background: tone.canvas,
    color: tone.ink,
    '& > header': {
      display: 'flex',
      flexWrap: 'wrap',
      alignItems: 'center',
      gap: '10px 20px',
      padding: '14px 24px',
      borderBottom: `1px solid ${tone.line}`,
    },
    '& > header > .strip': { marginLeft: 'auto' },
    '& > header a': { color: tone.board },
    '& > .halves': { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr) 316px', minHeight: 0 },
    '& .front': { display: 'flex', flexDirection: 'column', gap: 12, padding: '22px 30px', overflow: 'auto' },
    '& .front h1': { ...theme.typography.h1, fontSize: '2.5rem', lineHeight: 1.15, margin: 0 },
    '& .front h1[data-verdict]': { fontSize: '4rem' },
    '& .front h1[data-verdict="within"]': { color: tone.sound },
    '& .front h1[data-verdict="outside"]': { color: tone.hot },
    '& .place': { margin: 0, color: tone.inkSoft },
    '& .remark': { margin: 0, color: tone.tape, fontWeight: 500 },
    '& .acts': { display: 'flex', flexWrap: 'wrap', gap: 12, margin: '6px 0' },
    '& .aside': {
      display: 'flex',
      flexDirection: 'column',
      padding: '18px 20px',
      background: tone.sheet,
      borderLeft: `1px solid ${tone.line}`,
      overflow: 'auto',
    },
    '& .aside h2': { ...theme.typography.h3, fontSize: '1.125rem', margin: '0 0 4px' },
    '& .sent': { marginTop: 'auto', fontSize: '0.875rem', color: tone.inkSoft },
    '& .sent[data-waits]': { color: tone.tape, fontWeight: 500 },
    [theme.breakpoints.down('md')]: {
      '& > .halves': { gridTemplateColumns: '1fr', overflow: 'auto' },
      '& .aside': { borderLeft: 0, borderTop: `1px solid ${tone.line}`, overflow: 'visible' },
      '& .front': { overflow: 'visible', padding: '16px' },
    },
  };
});
