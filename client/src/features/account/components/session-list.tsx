import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { ErrorState, LoadingState } from '../../../components/states';
import { notify } from '../../../lib/notify';
import { ownSessionsQuery, useEndOtherSessions, useEndSession } from '../api/account';
import { deviceWords } from './device-words';

const List = styled('ul')(({ theme }) => ({
  listStyle: 'none',
  margin: '0 0 14px',
  padding: 0,
  '& li': {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: '4px 16px',
    padding: '9px 0',
    borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  },
  '& .where': { flex: '1 1 200px', minWidth: 0 },
  '& small': { display: 'block', fontSize: '0.8125rem', color: theme.vars.palette.tone.inkSoft },
}));

export function SessionList(): ReactElement {
  const sessions = useQuery(ownSessionsQuery);
  const end = useEndSession();
  const endOthers = useEndOtherSessions();
  const [asking, setAsking] = useState(false);
  if (sessions.isError)
    return <ErrorState error={sessions.error} onRetry={() => void sessions.refetch()} what="Your sessions" />;
  if (sessions.isPending) return <LoadingState lines={3} />;
  return (
    <>
      <List>
        {sessions.data.map(({ key, current, device, address, lastSeenAt }) => (
          <li key={key}>
            <span className="where" title={device}>
              {deviceWords(device)}
              <small>
                from {address}, used <When instant={lastSeenAt} />
              </small>
            </span>
            {current ? (
              <Flag tone="sound">this one</Flag>
            ) : (
              <Button
                size="small"
                disabled={end.isPending}
                onClick={() => end.mutate(key, { onSuccess: () => notify('That session is ended.') })}
              >
                End it
              </Button>
            )}
          </li>
        ))}
      </List>
      {sessions.data.length > 1 ? <Button onClick={() => setAsking(true)}>Sign out everywhere else</Button> : null}
      <ConfirmDialog
        open={asking}
        title="Sign out everywhere else?"
        confirmLabel="Sign out there"
        onConfirm={() => endOthers.mutateAsync()}
        onClose={() => setAsking(false)}
      >
        Every other device must sign in again. What is not yet sent from them may be lost.
      </ConfirmDialog>
    </>
  );
}
