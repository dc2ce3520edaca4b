import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { VisuallyHidden } from './visually-hidden';

const Frame = styled('section')(({ theme }) => ({
  // Holds what is read out only: else it would widen the page by where it would stand unscrolled.
  position: 'relative',
  overflowX: 'auto',
  border: `1px solid ${theme.vars.palette.tone.line}`,
  background: theme.vars.palette.tone.sheet,
  '& table': { width: '100%', borderCollapse: 'collapse' },
  '& th, & td': {
    padding: '7px 12px',
    textAlign: 'left',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
    verticalAlign: 'middle',
  },
  '& thead th': {
    ...theme.typography.h3,
    color: theme.vars.palette.tone.inkSoft,
    borderBottomColor: theme.vars.palette.tone.edge,
    whiteSpace: 'nowrap',
  },
  '& tbody th': { fontWeight: 400 },
  '& tbody tr:last-of-type > *': { borderBottom: 0 },
  '& .right': { textAlign: 'right', whiteSpace: 'nowrap' },
  '& .line': { whiteSpace: 'nowrap' },
  '& .free': { minWidth: 180 },
  '& tfoot th, & tfoot td': {
    borderTop: `1px solid ${theme.vars.palette.tone.edge}`,
    borderBottom: 0,
    fontWeight: 500,
  },
}));

export interface TableColumn<Row> {
  key: string;
  title: string;
  draw: (row: Row) => ReactNode;
  /** Figures stand to the right, on one line. */
  right?: boolean;
  /** Days and short words that must not break. */
  oneLine?: boolean;
  /** The title is read out only, where what stands below says it. */
  quiet?: boolean;
}

function classOf({ right, oneLine }: Pick<TableColumn<never>, 'right' | 'oneLine'>): string {
  if (right) return 'right';
  return oneLine ? 'line' : 'free';
}

interface RuledTableProps<Row> {
  /** Names the table. */
  label: string;
  columns: readonly TableColumn<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string | number;
  /** A last row, as sums: one cell for each column. */
  foot?: readonly ReactNode[];
}

/**
 * A short table that is shown whole: lines of a document, rates, readings. What can be long is a grid instead.
 * Where it is wider than the screen it scrolls by itself, also with the keyboard.
 */
export function RuledTable<Row>({ label, columns, rows, rowKey, foot }: RuledTableProps<Row>): ReactElement {
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- a region that scrolls must be reachable by keyboard
    <Frame aria-label={label} tabIndex={0}>
      <table>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" className={classOf(column)}>
                {column.quiet ? <VisuallyHidden>{column.title}</VisuallyHidden> : column.title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column, place) => {
                const Cell = place === 0 ? 'th' : 'td';
                return (
                  <Cell key={column.key} scope={place === 0 ? 'row' : undefined} className={classOf(column)}>
                    {column.draw(row)}
                  </Cell>
                );
              })}
            </tr>
          ))}
        </tbody>
        {foot ? (
          <tfoot>
            <tr>
              {columns.map((column, place) => (
                <td key={column.key} className={classOf(column)}>
                  {foot[place]}
                </td>
              ))}
            </tr>
          </tfoot>
        ) : null}
      </table>
    </Frame>
  );
}
