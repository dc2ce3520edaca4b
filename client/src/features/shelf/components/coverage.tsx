import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { formatCount } from '../../../lib/format-quantity';

const Bar = styled('span')(({ theme }) => ({
  display: 'inline-block',
  width: 84,
  height: 8,
  marginRight: 8,
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 2,
  background: theme.vars.palette.tone.sheet,
  verticalAlign: 'middle',
  overflow: 'hidden',
  '& > i': { display: 'block', height: '100%', background: theme.vars.palette.tone.board },
}));

/** The bar is full from here on: two months are nothing to look at. */
const fullDays = 60;

/** How long the free quantity lasts at the present pace. */
export function Coverage({ days }: { days: number | null }): ReactElement {
  if (days === null) return <span>not used lately</span>;
  return (
    <span>
      <Bar aria-hidden="true">
        <i style={{ width: `${Math.min(100, (days / fullDays) * 100)}%` }} />
      </Bar>
      {days > 400 ? 'over a year' : formatCount(days, 'day')}
    </span>
  );
}
