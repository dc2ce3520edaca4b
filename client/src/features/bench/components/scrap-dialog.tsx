import type { ReactElement } from 'react';
import { useScrapUnit } from '../api/bench';
import { ReasonDialog } from './reason-dialog';

export function ScrapDialog({ serial, onClose }: { serial: string; onClose: () => void }): ReactElement {
  const scrap = useScrapUnit(serial);
  return (
    <ReasonDialog
      grave
      title={`Scrap unit ${serial}?`}
      consequence="Its serial number is never used again, and what went into it is borne by the other units of its batch."
      question="Why is it given up?"
      confirmLabel="Scrap it"
      onConfirm={(reason) => scrap.mutateAsync(reason)}
      onClose={onClose}
    />
  );
}
