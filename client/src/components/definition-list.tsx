import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';

const List = styled('dl')(({ theme }) => ({
  margin: 0,
  '& > div': {
    display: 'flex',
    justifyContent: 'space-between',
    alignItems: 'baseline',
    flexWrap: 'wrap',
    columnGap: 20,
    padding: '9px 0',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& dt': { color: theme.vars.palette.tone.ink },
  '& dd': { margin: 0, marginLeft: 'auto', textAlign: 'right', color: theme.vars.palette.tone.inkSoft },
}));

export interface Definition {
  term: string;
  /** `undefined` leaves the line out. */
  value: ReactNode;
}

/** Facts about one thing, a line each. */
export function DefinitionList({ items }: { items: readonly Definition[] }): ReactElement {
  return (
    <List>
      {items
        .filter(({ value }) => value !== undefined)
        .map(({ term, value }) => (
          <div key={term}>
            <dt>{term}</dt>
            <dd>{value}</dd>
          </div>
        ))}
    </List>
  );
}
