import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';

const Skip = styled('a')(({ theme }) => ({
  position: 'absolute',
  left: 12,
  top: -60,
  zIndex: theme.zIndex.tooltip,
  padding: '9px 18px',
  background: theme.vars.palette.tone.board,
  color: theme.vars.palette.tone.onBoard,
  borderRadius: 3,
  '&:focus': { top: 8 },
}));

export function SkipLink(): ReactElement {
  return <Skip href="#content">Skip to the content</Skip>;
}
