import { styled } from '@mui/material/styles';
import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactElement, ReactNode } from 'react';
import { ErrorState, LoadingState } from '../../../components/states';

/** Two columns where there is room: the story on the left, what belongs to it on the right. */
export const Columns = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 2fr) minmax(0, 1fr)',
  gap: 20,
  alignItems: 'start',
  '& > div': { display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: 20, minWidth: 0 },
  [theme.breakpoints.down('md')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));

interface LoadedProps<Answer> {
  query: UseQueryResult<Answer>;
  /** What could not be shown: `The part`. */
  what: string;
  children: (answer: Answer) => ReactNode;
}

/** The page of one thing once it has come; until then where it will be, or why it can't be shown. */
export function Loaded<Answer>({ query, what, children }: LoadedProps<Answer>): ReactElement {
  if (query.isPending) return <LoadingState lines={8} />;
  if (query.isError) return <ErrorState error={query.error} what={what} onRetry={() => void query.refetch()} />;
  return <>{children(query.data)}</>;
}
