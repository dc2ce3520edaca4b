import { styled } from '@mui/material/styles';
import { useId, type ReactElement, type ReactNode } from 'react';

const Ground = styled('section')(({ theme }) => ({
  '&[data-drawn]': {
    background: theme.vars.palette.tone.sheet,
    border: `1px solid ${theme.vars.palette.tone.line}`,
    padding: '18px 20px',
  },
  '& > header > h2': { ...theme.typography.h2, margin: 0 },
  '& > header > h3': { ...theme.typography.h3, margin: 0 },
  '& > header': { display: 'flex', alignItems: 'baseline', gap: 16, marginBottom: 10 },
  '& > header > div': { marginLeft: 'auto' },
}));

interface SheetProps {
  title: ReactNode;
  children: ReactNode;
  /** One link or button beside the heading. */
  aside?: ReactNode;
  /** Without a surface of its own, as the two halves of Today. */
  bare?: boolean;
  level?: 2 | 3;
}

/** A section of a page, with its heading. */
export function Sheet({ title, children, aside, bare = false, level = 2 }: SheetProps): ReactElement {
  const id = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <Ground aria-labelledby={id} data-drawn={bare ? undefined : ''}>
      <header>
        <Heading id={id}>{title}</Heading>
        {aside ? <div>{aside}</div> : null}
      </header>
      {children}
    </Ground>
  );
}
