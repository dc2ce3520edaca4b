import type { ReactElement } from 'react';
import { notify } from '../../../lib/notify';
import { useChangeLotStatus, type Lot } from '../api/lots';
import { ReasonDialog } from './reason-dialog';

const words = {
  held: {
    title: 'Hold',
    act: 'Hold it back',
    text: 'It can’t be picked until it is released. Claims on it stay, as a named shortage.',
  },
  released: { title: 'Release', act: 'Release it', text: 'It can be picked and packed from now on.' },
  rejected: {
    title: 'Reject',
    act: 'Reject it',
    text: 'It can’t be picked. It stays on the shelf, and in its value, until it is sent back or thrown away.',
  },
} as const;

interface LotStatusDialogProps {
  lot: Lot;
  status: Lot['status'];
  onClose: () => void;
}

export function LotStatusDialog({ lot, status, onClose }: LotStatusDialogProps): ReactElement {
  const change = useChangeLotStatus(lot.code);
  const { title, act, text } = words[status];
  return (
    <ReasonDialog
      name={`lot-status:${lot.code}:${status}`}
      title={`${title} lot ${lot.code}?`}
      submitLabel={act}
      longest={500}
      onSubmit={async (reason) => {
        await change.mutateAsync({ status, reason, version: lot.version });
        notify(`${lot.code} is ${status}.`);
      }}
      onClose={onClose}
    >
      {text}
    </ReasonDialog>
  );
}
