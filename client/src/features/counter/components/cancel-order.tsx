import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState, type ReactElement } from 'react';
import { useIdempotencyKey } from '../../../api/idempotency';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { notify } from '../../../lib/notify';
import { useCancelOrder, type DeskOrder } from '../api/counter';

/** Asks for the reason and says what cancelling does before it is done. */
export function CancelOrder({ order }: { order: DeskOrder }): ReactElement {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const cancel = useCancelOrder();
  const { keyFor, done } = useIdempotencyKey();
  const paid = order.documents.some(({ kind }) => kind === 'payment');
  const confirm = async (): Promise<void> => {
    const body = { order: order.number, reason };
    const { creditNote } = await cancel.mutateAsync({ ...body, key: keyFor(body) });
    done();
    notify(creditNote ? `${order.number} is cancelled; ${creditNote} credits it.` : `${order.number} is cancelled.`);
  };
  return (
    <>
      <Button variant="outlined" color="error" onClick={() => setOpen(true)}>
        Cancel the order
      </Button>
      <ConfirmDialog
        open={open}
        title={`Cancel order ${order.number}?`}
        confirmLabel="Cancel the order"
        onConfirm={confirm}
        onClose={() => setOpen(false)}
        grave
      >
        <Typography sx={{ mb: 2 }}>
          {paid
            ? 'The whole payment goes back to the buyer with a credit note, and what it held is free again. This cannot be undone.'
            : 'What it held is free again, and it can no longer be paid. This cannot be undone.'}
        </Typography>
        <TextField
          label="Reason"
          helperText="Stands in the credit note and in the buyer's mail."
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          required
          fullWidth
          multiline
          slotProps={{ htmlInput: { maxLength: 500 } }}
        />
      </ConfirmDialog>
    </>
  );
}
