import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';

const List = styled('ol')(({ theme }) => ({
  listStyle: 'none',
  margin: '18px 0 0',
  padding: 0,
  borderTop: `1px solid ${theme.vars.palette.tone.line}`,
  '& > li': {
    display: 'grid',
    gridTemplateColumns: '6rem minmax(0, 1fr) auto',
    gap: '6px 20px',
    alignItems: 'center',
    padding: '14px 4px',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& .when': { ...theme.typography.h3, color: theme.vars.palette.tone.ink },
  '& .when[data-late]': { color: theme.vars.palette.tone.hot },
  '& .says > div + div': { color: theme.vars.palette.tone.inkSoft, fontSize: '0.8125rem', marginTop: 2 },
  [theme.breakpoints.down('sm')]: {
    '& > li': { gridTemplateColumns: '1fr', padding: '14px 0' },
    '& .act > *': { width: '100%' },
  },
}));

export interface QueueItem {
  key: string;
  /** The day it is promised or due, in words: `Wed 2 Dec`. */
  when?: string;
  late?: boolean;
  sentence: ReactNode;
  /** A second, quieter line: why, or what else is known. */
  because?: ReactNode;
  /** The one action. */
  action?: ReactNode;
}

/** What needs a hand: sentences with one action each, the oldest promise first. */
export function QueueList({ items, label }: { items: readonly QueueItem[]; label: string }): ReactElement {
  return (
    <List aria-label={label}>
      {items.map(({ key, when, late, sentence, because, action }) => (
        <li key={key}>
          <span className="when" data-late={late ? '' : undefined}>
            {when}
            {late ? <span aria-hidden="true"> ✕</span> : null}
          </span>
          <div className="says">
            <div>{sentence}</div>
            {because ? <div>{because}</div> : null}
          </div>
          <div className="act">{action}</div>
        </li>
      ))}
    </List>
  );
}
