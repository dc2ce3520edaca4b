import Button from '@mui/material/Button';
import Skeleton from '@mui/material/Skeleton';
import { styled } from '@mui/material/styles';
import Typography from '@mui/material/Typography';
import type { ReactElement, ReactNode } from 'react';
import { sentenceOf } from '../lib/problem';

const Place = styled('div')(({ theme }) => ({
  padding: '32px 20px',
  border: `1px solid ${theme.vars.palette.tone.line}`,
  background: theme.vars.palette.tone.sheet,
  '& > p': { margin: 0, maxWidth: 560 },
  '& > p + p': { marginTop: 6, color: theme.vars.palette.tone.inkSoft },
  '& > .act': { marginTop: 16, display: 'flex', flexWrap: 'wrap', gap: 10 },
}));

interface EmptyStateProps {
  /** What is not there yet: `No parts yet.` */
  title: string;
  /** What to do first. */
  children?: ReactNode;
  action?: ReactNode;
}

export function EmptyState({ title, children, action }: EmptyStateProps): ReactElement {
  return (
    <Place>
      <Typography variant="h2" component="p">
        {title}
      </Typography>
      {children ? <p>{children}</p> : null}
      {action ? <div className="act">{action}</div> : null}
    </Place>
  );
}

interface ErrorStateProps {
  error: unknown;
  onRetry?: () => void;
  /** What could not be shown, for the heading: `The parts` */
  what?: string;
}

export function ErrorState({ error, onRetry, what = 'This' }: ErrorStateProps): ReactElement {
  const { sentence, requestId } = sentenceOf(error);
  return (
    <Place role="alert">
      <Typography variant="h2" component="p">
        {what} can’t be shown just now
      </Typography>
      <p>{sentence}</p>
      {requestId ? <p>Quote {requestId} when you report it.</p> : null}
      {onRetry ? (
        <div className="act">
          <Button onClick={onRetry}>Try again</Button>
        </div>
      ) : null}
    </Place>
  );
}

/** Where a page's content will be; says that it loads to those who can't see the grey bars. */
export function LoadingState({ lines = 6, label = 'Loading' }: { lines?: number; label?: string }): ReactElement {
  return (
    <output aria-label={label} style={{ display: 'block' }}>
      {Array.from({ length: lines }, (_, line) => (
        <Skeleton key={line} height={22} width={`${88 - (line % 4) * 14}%`} sx={{ my: 1.25 }} />
      ))}
    </output>
  );
}
