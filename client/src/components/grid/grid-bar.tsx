import Link from '@mui/material/Link';
import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { apiUrl } from '../../lib/api-url';
import { formatCount } from '../../lib/format-quantity';
import { ColumnChoiceButton, type ColumnChoice } from './column-choice';
import { FilterChips } from './filter-chips';
import { listQuery } from '../../lib/list-state';
import type { ServerGridModel } from './use-server-grid';

const Bar = styled('div')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: '8px 10px',
  margin: '14px 0',
  '& .end': {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '4px 18px',
    marginLeft: 'auto',
    color: theme.vars.palette.tone.inkSoft,
  },
}));

interface GridBarProps<Row> {
  grid: ServerGridModel<Row>;
  counted: readonly [one: string, many: string];
  exportPath?: string;
  choice: ColumnChoice;
  searchLabel?: string;
}

/** What narrows a list, how much of it there is, and its export. */
export function GridBar<Row>({ grid, counted, exportPath, choice, searchLabel }: GridBarProps<Row>): ReactElement {
  const { page: _page, pageSize: _size, ...asked } = listQuery(grid.state);
  return (
    <Bar>
      <FilterChips grid={grid} searchLabel={searchLabel} />
      <div className="end">
        <output>{grid.total === undefined ? 'Counting' : formatCount(grid.total, counted[0], counted[1])}</output>
        <ColumnChoiceButton choice={choice} />
        {exportPath && grid.total ? (
          <Link href={apiUrl(exportPath, asked)} download>
            Export these
          </Link>
        ) : null}
      </div>
    </Bar>
  );
}
