import OutlinedInput from '@mui/material/OutlinedInput';
import Typography from '@mui/material/Typography';
import { useId, useState, type ReactElement } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';

interface ReasonDialogProps {
  title: string;
  consequence: string;
  question: string;
  confirmLabel: string;
  grave?: boolean;
  onConfirm: (reason: string) => Promise<unknown>;
  onClose: () => void;
}

/** Asks before something that needs a reason on record. */
export function ReasonDialog(props: ReasonDialogProps): ReactElement {
  const { title, consequence, question, confirmLabel, grave = false, onConfirm, onClose } = props;
  const [reason, setReason] = useState('');
  const id = useId();
  return (
    <ConfirmDialog
      open
      grave={grave}
      title={title}
      confirmLabel={confirmLabel}
      onConfirm={() => onConfirm(reason)}
      onClose={onClose}
    >
      <Typography>{consequence}</Typography>
      <Typography component="label" htmlFor={id} sx={{ display: 'block', mt: 2, mb: 0.5 }}>
        {question}
      </Typography>
      <OutlinedInput
        id={id}
        fullWidth
        value={reason}
        onChange={({ target }) => setReason(target.value)}
        inputProps={{ maxLength: 200 }}
      />
    </ConfirmDialog>
  );
}
