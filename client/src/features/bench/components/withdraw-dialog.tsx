import OutlinedInput from '@mui/material/OutlinedInput';
import Typography from '@mui/material/Typography';
import { useState, type ReactElement } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { useWithdraw, type Batch } from '../api/bench';

export function WithdrawDialog({ batch, onClose }: { batch: Batch; onClose: () => void }): ReactElement {
  const withdraw = useWithdraw(batch.number);
  const [reason, setReason] = useState('');
  return (
    <ConfirmDialog
      open
      grave
      title={`Withdraw batch ${batch.number}?`}
      confirmLabel="Withdraw it"
      onConfirm={() => withdraw.mutateAsync(reason)}
      onClose={onClose}
    >
      <Typography>
        Its claims on the shelf are free again, and whoever waits for it goes short. It cannot be taken up again.
      </Typography>
      <Typography component="label" htmlFor="withdraw-reason" sx={{ display: 'block', mt: 2, mb: 0.5 }}>
        Why will it not be built?
      </Typography>
      <OutlinedInput
        id="withdraw-reason"
        fullWidth
        value={reason}
        onChange={({ target }) => setReason(target.value)}
        inputProps={{ maxLength: 200 }}
      />
    </ConfirmDialog>
  );
}
