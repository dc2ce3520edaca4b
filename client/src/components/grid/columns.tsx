import type { GridColDef, GridValidRowModel } from '@mui/x-data-grid';
import type { ReactNode } from 'react';
import { formatDayShort } from '../../lib/format-time';
import type { MoneyAmount } from '../../lib/format-money';
import { Money, Quantity, When } from '../figures';
import { VisuallyHidden } from '../visually-hidden';
import { Tag } from '../tag/tag';
import type { TagKind } from '../tag/tag-kinds';

type More<Row extends GridValidRowModel> = Partial<
  Pick<GridColDef<Row>, 'width' | 'minWidth' | 'flex' | 'sortable' | 'hideable' | 'description'>
>;

/** Any column: its value is drawn from the row alone, so that it can also be drawn on a phone. */
export function column<Row extends GridValidRowModel>(
  field: string,
  title: string,
  draw: (row: Row) => ReactNode,
  more: More<Row> = {},
): GridColDef<Row> {
  return { field, headerName: title, flex: 1, minWidth: 120, ...more, renderCell: ({ row }) => whole(draw(row)) };
}

/** Text that does not fit ends in dots and is whole on hover. */
function whole(drawn: ReactNode): ReactNode {
  return typeof drawn === 'string' ? (
    <span className="text" title={drawn}>
      {drawn}
    </span>
  ) : (
    drawn
  );
}

/** The thing itself, as its tag; never hidden, since it is the way to the thing. */
export function tagColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  kind: TagKind,
  of: (row: Row) => { code: string; story?: string } | undefined,
  more: More<Row> = {},
): GridColDef<Row> {
  const draw = (row: Row): ReactNode => {
    const thing = of(row);
    return thing ? <Tag kind={kind} code={thing.code} story={thing.story} /> : null;
  };
  return column(field, title, draw, { width: 170, flex: 0, hideable: false, ...more });
}

/** The one thing that can be done with each line, without a title that is seen. */
export function actColumn<Row extends GridValidRowModel>(
  title: string,
  draw: (row: Row) => ReactNode,
  width: number,
): GridColDef<Row> {
  return {
    ...column('act', title, draw, { sortable: false, flex: 0, width, hideable: false }),
    renderHeader: () => <VisuallyHidden>{title}</VisuallyHidden>,
  };
}

function rightColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  draw: (row: Row) => ReactNode,
  more: More<Row>,
): GridColDef<Row> {
  return { ...column(field, title, draw, { flex: 0, width: 130, ...more }), align: 'right', headerAlign: 'right' };
}

export function moneyColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  of: (row: Row) => MoneyAmount | undefined,
  more: More<Row> = {},
): GridColDef<Row> {
  return rightColumn(
    field,
    title,
    (row) => {
      const value = of(row);
      return value ? <Money value={value} /> : null;
    },
    more,
  );
}

export function quantityColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  of: (row: Row) => { value: string; unit?: string; decimals?: number } | undefined,
  more: More<Row> = {},
): GridColDef<Row> {
  return rightColumn(
    field,
    title,
    (row) => {
      const quantity = of(row);
      return quantity ? <Quantity {...quantity} /> : null;
    },
    more,
  );
}

/** A plain day, `YYYY-MM-DD`. */
export function dayColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  of: (row: Row) => string | null | undefined,
  more: More<Row> = {},
): GridColDef<Row> {
  return column(field, title, (row) => formatDayOrNothing(of(row)), { flex: 0, width: 120, ...more });
}

function formatDayOrNothing(day: string | null | undefined): string {
  return day ? formatDayShort(day) : '';
}

/** An instant, as how long ago. */
export function whenColumn<Row extends GridValidRowModel>(
  field: string,
  title: string,
  of: (row: Row) => string | null | undefined,
  more: More<Row> = {},
): GridColDef<Row> {
  return column(
    field,
    title,
    (row) => {
      const instant = of(row);
      return instant ? <When instant={instant} /> : null;
    },
    { flex: 0, width: 150, ...more },
  );
}
