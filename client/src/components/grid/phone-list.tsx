import { styled } from '@mui/material/styles';
import type { GridColDef, GridRenderCellParams, GridValidRowModel } from '@mui/x-data-grid';
import type { ReactElement, ReactNode } from 'react';
import { LoadingState } from '../states';
import type { ServerGridModel } from './use-server-grid';

const List = styled('ul')(({ theme }) => ({
  listStyle: 'none',
  margin: 0,
  padding: 0,
  borderTop: `1px solid ${theme.vars.palette.tone.line}`,
  '& > li': { position: 'relative', padding: '12px 2px', borderBottom: `1px solid ${theme.vars.palette.tone.line}` },
  // The tag's link is stretched over its whole line; whatever else can be pressed lies above it.
  '& .lead a::after': { content: '""', position: 'absolute', inset: 0 },
  '& dd a, & dd button': { position: 'relative', zIndex: 1 },
  '& dl': { display: 'grid', gridTemplateColumns: 'auto 1fr', gap: '2px 12px', margin: '6px 0 0' },
  '& dt': { color: theme.vars.palette.tone.inkSoft, fontSize: '0.8125rem' },
  '& dd': { margin: 0, textAlign: 'right', overflowWrap: 'anywhere' },
}));

interface PhoneListProps<Row extends GridValidRowModel> {
  grid: ServerGridModel<Row>;
  columns: readonly GridColDef<Row>[];
  rowId: (row: Row) => string | number;
  phoneRow?: (row: Row) => ReactNode;
  label: string;
}

/** The same list where a table has no room: a line each, its facts under each other. */
export function PhoneList<Row extends GridValidRowModel>(props: PhoneListProps<Row>): ReactElement {
  const { grid, columns, rowId, phoneRow, label } = props;
  if (grid.loading && grid.rows.length === 0) return <LoadingState />;
  const [lead, ...facts] = columns;
  return (
    <List aria-label={label} aria-busy={grid.loading}>
      {grid.rows.map((row) => (
        <li key={rowId(row)}>
          {phoneRow ? (
            phoneRow(row)
          ) : (
            <>
              <div className="lead">{lead ? cellOf(lead, row) : null}</div>
              <dl>
                {facts.map((column) => (
                  <Fact key={column.field} column={column} row={row} />
                ))}
              </dl>
            </>
          )}
        </li>
      ))}
    </List>
  );
}

function Fact<Row extends GridValidRowModel>({ column, row }: { column: GridColDef<Row>; row: Row }): ReactElement {
  return (
    <>
      <dt>{column.headerName}</dt>
      <dd>{cellOf(column, row)}</dd>
    </>
  );
}

/** Draws a cell outside the grid; columns made by `columns.tsx` look at the row alone. */
function cellOf<Row extends GridValidRowModel>(column: GridColDef<Row>, row: Row): ReactNode {
  const value: unknown = (row as Record<string, unknown>)[column.field];
  if (column.renderCell) return column.renderCell({ row, value, field: column.field } as GridRenderCellParams<Row>);
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}
