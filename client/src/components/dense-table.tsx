import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { VisuallyHidden } from './visually-hidden';

const Frame = styled('section')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    overflowX: 'auto',
    border: `1px solid ${tone.line}`,
    background: tone.sheet,
    '&:focus-visible': { outline: `2px solid ${tone.board}`, outlineOffset: 2 },
    '& table': { width: '100%', borderCollapse: 'collapse', fontSize: '0.875rem' },
    '& th': {
      ...theme.typography.h3,
      fontSize: '0.8125rem',
      textAlign: 'left',
      color: tone.inkSoft,
      whiteSpace: 'nowrap',
      padding: '9px 12px',
      borderBottom: `1px solid ${tone.edge}`,
    },
    '& td': { padding: '6px 12px', verticalAlign: 'middle', borderBottom: `1px solid ${tone.line}` },
    '& tbody tr:last-of-type td': { borderBottom: 0 },
    '& .figure': { textAlign: 'right', whiteSpace: 'nowrap' },
    '& time': { whiteSpace: 'nowrap' },
    '& .quiet': { color: tone.inkSoft },
    '& .what': { minWidth: 180 },
  };
});

export interface DenseColumn {
  key: string;
  title: string;
  /** Figures stand right, under each other. */
  figure?: boolean;
  /** In pixels, where tables under each other should line up. */
  width?: number;
}

interface DenseTableProps {
  label: string;
  columns: readonly DenseColumn[];
  children: ReactNode;
}

/** Rows that belong together and are read as a whole, without paging; it scrolls sideways where it is too wide. */
export function DenseTable({ label, columns, children }: DenseTableProps): ReactElement {
  return (
    // A region that scrolls must be reachable by keyboard.
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <Frame tabIndex={0} aria-label={`${label}, rows`}>
      <table aria-label={label}>
        <thead>
          <tr>
            {columns.map(({ key, title, figure, width }) => (
              <th key={key} scope="col" className={figure ? 'figure' : undefined} style={{ width }}>
                {/* A column of acts needs no title to be seen, but one to be heard. */}
                {title === '' ? <VisuallyHidden>Acts</VisuallyHidden> : title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </Frame>
  );
}
