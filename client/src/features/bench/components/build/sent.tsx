import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { When } from '../../../../components/figures';
import type { OfflineQueue, QueueState } from '../../../../lib/offline-queue';

/** Says what waits on this device, and what the server would not take. */
export function Sent({ state, queue }: { state: QueueState; queue: OfflineQueue }): ReactElement {
  const { waiting, refused, lastSentAt, broken } = state;
  return (
    <>
      {refused.map(({ id, subject, refusal }) => (
        <div key={id} role="alert" className="sent" data-waits="">
          <p>
            ✕ A reading of {subject} was not taken. {refusal?.detail}
          </p>
          <p className="acts">
            <Button size="small" onClick={() => void queue.retry(id)}>
              Try again
            </Button>
            <Button size="small" onClick={() => void queue.discard(id)}>
              Forget it
            </Button>
          </p>
        </div>
      ))}
      <output className="sent" data-waits={waiting.length > 0 || broken ? '' : undefined}>
        {broken ? 'This browser keeps nothing: do not type readings here. ' : ''}
        {waiting.length === 0
          ? 'Nothing waits on this device.'
          : `${waiting.length} ${waiting.length === 1 ? 'reading waits' : 'readings wait'} on this device.`}{' '}
        {lastSentAt ? (
          <>
            Last sent <When instant={lastSentAt} />.
          </>
        ) : null}
      </output>
    </>
  );
}
