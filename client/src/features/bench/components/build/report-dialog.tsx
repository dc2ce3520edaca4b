import type { ReactElement } from 'react';
import { useIdempotencyKey } from '../../../../api/idempotency';
import { useReportFault } from '../../api/bench';
import { ReasonDialog } from '../reason-dialog';

interface ReportDialogProps {
  serial: string;
  /** The step in front, if one is. */
  step: number | null;
  onClose: () => void;
}

/** Somebody sees something wrong, without a measurement. */
export function ReportDialog({ serial, step, onClose }: ReportDialogProps): ReactElement {
  const report = useReportFault(serial);
  const { keyFor } = useIdempotencyKey();
  const send = (what: string): Promise<unknown> => {
    const body = { what, step };
    return report.mutateAsync({ body, key: keyFor(body) });
  };
  return (
    <ReasonDialog
      title={`Something is wrong with ${serial}?`}
      consequence="A fault is opened. The unit cannot be finished until somebody has seen to it."
      question="What is wrong?"
      confirmLabel="Open a fault"
      onConfirm={send}
      onClose={onClose}
    />
  );
}
