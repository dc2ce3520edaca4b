import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { groupDigits } from '../../lib/format-money';
import { pageSizes } from '../../lib/list-state';
import type { ServerGridModel } from './use-server-grid';

const Row = styled('nav')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: 12,
  padding: '10px 0',
  color: theme.vars.palette.tone.inkSoft,
  '& label': { display: 'flex', alignItems: 'center', gap: 8, marginLeft: 'auto' },
  '& select': {
    font: 'inherit',
    color: theme.vars.palette.tone.ink,
    background: theme.vars.palette.tone.sheet,
    border: `1px solid ${theme.vars.palette.tone.edge}`,
    borderRadius: 3,
    minHeight: 32,
  },
}));

/** Turns the pages of a list; not there at all while everything fits on one. */
export function GridPager<Row>({ grid }: { grid: ServerGridModel<Row> }): ReactElement | null {
  const { total = 0 } = grid;
  const { page, pageSize } = grid.state;
  if (total <= pageSizes[0] && page === 1) return null;
  const last = Math.max(1, Math.ceil(total / pageSize));
  const count = (value: number): string => groupDigits(String(value));
  const from = Math.min(total, (page - 1) * pageSize + 1);
  return (
    <Row aria-label="Pages">
      <Button size="small" disabled={page <= 1} onClick={() => grid.change({ page: Math.min(page - 1, last) })}>
        Earlier
      </Button>
      <span>
        {count(from)} to {count(Math.min(total, page * pageSize))} of {count(total)}
      </span>
      <Button size="small" disabled={page >= last} onClick={() => grid.change({ page: page + 1 })}>
        Further
      </Button>
      <label>
        Lines a page
        <select value={pageSize} onChange={({ target }) => grid.change({ pageSize: Number(target.value) })}>
          {pageSizes.map((size) => (
            <option key={size}>{size}</option>
          ))}
        </select>
      </label>
    </Row>
  );
}
