import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { KeyboardEvent, ReactElement, ReactNode } from 'react';
import { VisuallyHidden } from '../../../../components/visually-hidden';

const Frame = styled('section')(({ theme }) => ({
  '& > header': { display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', gap: '4px 16px', marginBottom: 8 },
  '& h2': { ...theme.typography.h2, margin: 0 },
  '& .hint': { color: theme.vars.palette.tone.inkSoft, fontSize: '0.8125rem' },
  '& .scroll': {
    overflowX: 'auto',
    border: `1px solid ${theme.vars.palette.tone.line}`,
    background: theme.vars.palette.tone.sheet,
  },
  '& table': { width: '100%', minWidth: 860, borderCollapse: 'collapse', fontSize: '0.875rem' },
  '& th': {
    ...theme.typography.h3,
    fontSize: '0.8125rem',
    textAlign: 'left',
    color: theme.vars.palette.tone.inkSoft,
    whiteSpace: 'nowrap',
    padding: '8px 6px',
    borderBottom: `1px solid ${theme.vars.palette.tone.edge}`,
  },
  '& td': { padding: '4px 6px', verticalAlign: 'top' },
  '& tr + tr > td': { borderTop: `1px solid ${theme.vars.palette.tone.line}` },
  '& .more': { marginTop: 8 },
}));

/** Columns that need no heading for the eye. */
const hiddenTitle: Readonly<Record<string, string>> = { acts: 'Acts', number: 'Number' };

export interface RowColumn {
  key: string;
  title: string;
  /** In CSS; columns of figures stay narrow, words take what is left. */
  width?: number | string;
}

interface EditableRowsProps {
  title: string;
  hint: string;
  columns: readonly RowColumn[];
  count: number;
  /** Says the act: `Add a line`. */
  addLabel: string;
  onAdd: () => void;
  onRemove: (row: number) => void;
  /** Where the order is the rows' own. */
  onMove?: (from: number, to: number) => void;
  children: ReactNode;
}

/**
 * A table to type in, for hands that stay on the keyboard: Enter goes down and adds a row after the last, Alt with the
 * arrows moves a row where rows have an order, Alt with Delete takes it out.
 */
export function EditableRows(props: EditableRowsProps): ReactElement {
  const { title, hint, columns, count, addLabel, onAdd, children } = props;
  return (
    <Frame aria-label={title} onKeyDown={(event) => rowKey(event, props)}>
      <header>
        <h2>{title}</h2>
        <span className="hint">{hint}</span>
      </header>
      {count > 0 ? (
        <div className="scroll">
          <table aria-label={title}>
            <thead>
              <tr>
                {columns.map(({ key, title: head, width }) =>
                  head === '' ? (
                    <th key={key} scope="col" style={{ width }}>
                      <VisuallyHidden>{hiddenTitle[key] ?? key}</VisuallyHidden>
                    </th>
                  ) : (
                    <th key={key} scope="col" style={{ width }}>
                      {head}
                    </th>
                  ),
                )}
              </tr>
            </thead>
            <tbody>{children}</tbody>
          </table>
        </div>
      ) : null}
      <Button className="more" onClick={onAdd}>
        {addLabel}
      </Button>
    </Frame>
  );
}

function rowKey(event: KeyboardEvent<HTMLElement>, { count, onAdd, onRemove, onMove }: EditableRowsProps): void {
  const field = event.target as HTMLElement;
  const { row: place, column } = field.dataset;
  if (place === undefined || column === undefined) return;
  const row = Number(place);
  const section = event.currentTarget;
  const focus = (to: number): void => {
    section.querySelector<HTMLElement>(`[data-row="${to}"][data-column="${column}"]`)?.focus();
  };
  const steps: Partial<Record<string, number>> = { ArrowUp: -1, ArrowDown: 1 };
  const step = steps[event.key];
  if (event.key === 'Enter' && !event.ctrlKey && !event.metaKey && !(field instanceof HTMLTextAreaElement)) {
    event.preventDefault();
    if (row + 1 < count) focus(row + 1);
    else onAdd();
  } else if (event.altKey && event.key === 'Delete') {
    event.preventDefault();
    onRemove(row);
    requestAnimationFrame(() => focus(Math.min(row, count - 2)));
  } else if (event.altKey && step !== undefined && onMove) {
    event.preventDefault();
    const to = row + step;
    if (to < 0 || to >= count) return;
    onMove(row, to);
    requestAnimationFrame(() => focus(to));
  } else if (step !== undefined && field instanceof HTMLInputElement && !field.hasAttribute('list')) {
    event.preventDefault();
    focus(row + step);
  }
}

interface RowActsProps {
  /** `line 3` */
  what: string;
  row: number;
  count: number;
  onRemove: (row: number) => void;
  onMove?: (from: number, to: number) => void;
}

/** The same acts for hands on the mouse or the screen. */
export function RowActs({ what, row, count, onRemove, onMove }: RowActsProps): ReactElement {
  const look = { minWidth: 0, padding: '3px 8px' };
  return (
    <td style={{ whiteSpace: 'nowrap' }}>
      {onMove ? (
        <>
          <Button
            size="small"
            variant="text"
            sx={look}
            disabled={row === 0}
            aria-label={`Move ${what} up`}
            onClick={() => onMove(row, row - 1)}
          >
            ↑
          </Button>
          <Button
            size="small"
            variant="text"
            sx={look}
            disabled={row + 1 === count}
            aria-label={`Move ${what} down`}
            onClick={() => onMove(row, row + 1)}
          >
            ↓
          </Button>
        </>
      ) : null}
      <Button size="small" variant="text" sx={look} aria-label={`Remove ${what}`} onClick={() => onRemove(row)}>
        ✕
      </Button>
    </td>
  );
}
