import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { sentenceOf } from '../lib/problem';
import { Press } from './press';

const Place = styled('div')(({ theme }) => ({
  padding: '32px 20px',
  border: `1px solid ${theme.vars.palette.tone.line}`,
  background: theme.vars.palette.tone.sheet,
  '& > p': { margin: 0, maxWidth: 560 },
  '& > .title': theme.typography.h2,
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
      <p className="title">{title}</p>
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
      <p className="title">{what} can’t be shown just now</p>
      <p>{sentence}</p>
      {requestId ? <p>Quote {requestId} when you report it.</p> : null}
      {onRetry ? (
        <div className="act">
          <Press onPress={onRetry}>Try again</Press>
        </div>
      ) : null}
    </Place>
  );
}

const Bars = styled('output')(({ theme }) => ({
  display: 'block',
  '& i': { display: 'block', height: 22, margin: '10px 0', borderRadius: 3, background: theme.vars.palette.tone.line },
}));

/** Where a page's content will be; says that it loads to those who can't see the grey bars. */
export function LoadingState({ lines = 6, label = 'Loading' }: { lines?: number; label?: string }): ReactElement {
  return (
    <Bars aria-label={label}>
      {Array.from({ length: lines }, (_, line) => (
        <i key={line} style={{ width: `${88 - (line % 4) * 14}%` }} />
      ))}
    </Bars>
  );
}
