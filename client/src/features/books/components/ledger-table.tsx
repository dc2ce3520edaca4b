import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';

const Scroll = styled('section')(({ theme }) => ({
  overflowX: 'auto',
  '& table': { width: '100%', borderCollapse: 'collapse', fontVariantNumeric: 'tabular-nums' },
  '& th, & td': {
    padding: '8px 14px 8px 0',
    textAlign: 'left',
    verticalAlign: 'top',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& thead th': { ...theme.typography.h3, fontSize: '0.8125rem', color: theme.vars.palette.tone.inkSoft },
  '& .figure': { textAlign: 'right', whiteSpace: 'nowrap' },
  '& tfoot td, & tfoot th': { fontWeight: 600 },
}));

export interface LedgerColumn {
  title: string;
  /** Amounts stand to the right. */
  figure?: boolean;
}

interface LedgerTableProps {
  label: string;
  columns: readonly LedgerColumn[];
  rows: readonly { key: string; cells: readonly ReactNode[] }[];
  /** Totals, a cell for each column. */
  foot?: readonly ReactNode[];
}

/** A plain table of the books, whole on one page. */
export function LedgerTable({ label, columns, rows, foot }: LedgerTableProps): ReactElement {
  const side = (index: number): string | undefined => (columns[index]?.figure ? 'figure' : undefined);
  return (
    <Scroll tabIndex={0} aria-label={label}>
      <table>
        <thead>
          <tr>
            {columns.map(({ title }, index) => (
              <th key={title} scope="col" className={side(index)}>
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, cells }) => (
            <tr key={key}>
              {cells.map((cell, index) => (
                <td key={columns[index]?.title} className={side(index)}>
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
        {foot ? (
          <tfoot>
            <tr>
              {foot.map((cell, index) => (
                <td key={columns[index]?.title} className={side(index)}>
                  {cell}
                </td>
              ))}
            </tr>
          </tfoot>
        ) : null}
      </table>
    </Scroll>
  );
}
