import Box from '@mui/material/Box';
import useMediaQuery from '@mui/material/useMediaQuery';
import { DataGrid, type GridColDef, type GridSortModel, type GridValidRowModel } from '@mui/x-data-grid';
import type { MouseEvent, ReactElement, ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { styleNonce } from '../../lib/nonce';
import { EmptyState, ErrorState } from '../states';
import { useColumnChoice } from './column-choice';
import { GridBar } from './grid-bar';
import { GridPager } from './grid-pager';
import { PhoneList } from './phone-list';
import type { ServerGridModel } from './use-server-grid';
import Button from '@mui/material/Button';

export interface ServerGridProps<Row extends GridValidRowModel> {
  grid: ServerGridModel<Row>;
  columns: readonly GridColDef<Row>[];
  rowId: (row: Row) => string | number;
  /** Names the list for those who can't see it: `Parts`. */
  label: string;
  /** `part` and `parts`, for the count. */
  counted: readonly [one: string, many: string];
  /** The row's own address. */
  rowHref?: (row: Row) => string;
  /** Where the server writes what is shown as CSV; it is given the same filters and order. */
  exportPath?: string;
  /** What an untouched, empty list says to do first. */
  empty: ReactElement;
  /** Columns that are hidden until chosen. */
  hiddenAtFirst?: readonly string[];
  /** A row on a phone; without it the columns stand under each other. */
  phoneRow?: (row: Row) => ReactNode;
  searchLabel?: string;
}

/** Every list of the staff shell. */
export function ServerGrid<Row extends GridValidRowModel>(props: ServerGridProps<Row>): ReactElement {
  const { grid, columns, counted, exportPath, empty, hiddenAtFirst, searchLabel, label } = props;
  const choice = useColumnChoice(grid.name, columns, hiddenAtFirst);
  const narrow = useMediaQuery('(max-width: 599.95px)', { noSsr: true });
  if (grid.error && grid.rows.length === 0) return <ErrorState error={grid.error} onRetry={grid.retry} what={label} />;
  const untouched = !grid.loading && grid.total === 0 && !grid.narrowed;
  if (untouched) return empty;
  return (
    <>
      <GridBar grid={grid} counted={counted} exportPath={exportPath} choice={choice} searchLabel={searchLabel} />
      {grid.error ? (
        <ErrorState error={grid.error} onRetry={grid.retry} what={label} />
      ) : (
        <Rows {...props} choice={choice} narrow={narrow} />
      )}
      <GridPager grid={grid} />
    </>
  );
}

type RowsProps<Row extends GridValidRowModel> = ServerGridProps<Row> & {
  choice: ReturnType<typeof useColumnChoice>;
  narrow: boolean;
};

function Rows<Row extends GridValidRowModel>({ narrow, choice, ...props }: RowsProps<Row>): ReactElement {
  const { grid, columns, rowId, phoneRow, label } = props;
  if (!grid.loading && grid.rows.length === 0) {
    return (
      <EmptyState title="Nothing matches" action={<Button onClick={grid.clearFilters}>Show all again</Button>}>
        No line fits what is asked for above.
      </EmptyState>
    );
  }
  if (narrow) {
    const shown = columns.filter(({ field }) => choice.visible[field] !== false);
    return <PhoneList grid={grid} columns={shown} rowId={rowId} phoneRow={phoneRow} label={label} />;
  }
  return <WideRows {...props} choice={choice} />;
}

function WideRows<Row extends GridValidRowModel>({
  grid,
  columns,
  rowId,
  rowHref,
  label,
  choice,
}: Omit<RowsProps<Row>, 'narrow'>): ReactElement {
  const navigate = useNavigate();
  const open = (row: Row, event: MouseEvent | React.KeyboardEvent): void => {
    if (!rowHref || (event.target as Element).closest('a, button, input, label')) return;
    if (event.ctrlKey || event.metaKey) window.open(rowHref(row), '_blank', 'noopener');
    else void navigate(rowHref(row));
  };
  return (
    // The column layout lets the grid be as tall as its rows, so that the page scrolls and not a box within it.
    <Box sx={{ display: 'flex', flexDirection: 'column', minHeight: grid.rows.length === 0 ? 160 : undefined }}>
      <DataGrid<Row>
        aria-label={label}
        rows={grid.rows}
        columns={columns}
        getRowId={rowId}
        rowHeight={40}
        columnHeaderHeight={38}
        hideFooter
        disableColumnMenu
        disableColumnFilter
        disableRowSelectionOnClick
        disableVirtualization={false}
        columnVisibilityModel={choice.visible}
        loading={grid.loading}
        slotProps={{ loadingOverlay: { variant: 'skeleton', noRowsVariant: 'skeleton' } }}
        sortingMode="server"
        sortingOrder={['asc', 'desc']}
        sortModel={sortModelOf(grid.state.sort)}
        onSortModelChange={(model) => grid.change({ sort: sortOf(model) })}
        paginationMode="server"
        rowCount={grid.total ?? -1}
        paginationModel={{ page: 0, pageSize: 100 }}
        onRowClick={({ row }, event) => open(row, event)}
        onCellKeyDown={({ row }, event) => {
          if (event.key === 'Enter') open(row, event);
        }}
        sx={rowHref ? undefined : { '& .MuiDataGrid-row': { cursor: 'default' } }}
        nonce={styleNonce()}
      />
    </Box>
  );
}

function sortModelOf(sort: string | undefined): GridSortModel {
  if (!sort) return [];
  return sort.startsWith('-') ? [{ field: sort.slice(1), sort: 'desc' }] : [{ field: sort, sort: 'asc' }];
}

function sortOf([first]: GridSortModel): string | undefined {
  return first ? `${first.sort === 'desc' ? '-' : ''}${first.field}` : undefined;
}
