import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Typography from '@mui/material/Typography';
import { useId, useState, type ReactElement, type ReactNode } from 'react';
import { sentenceOf } from '../lib/problem';

interface ConfirmDialogProps {
  open: boolean;
  /** Names the thing: `Scrap unit WR-2648-0093-41?` */
  title: string;
  /** Says the consequence. */
  children: ReactNode;
  /** Says the act, not "OK": `Scrap it`. */
  confirmLabel: string;
  onConfirm: () => Promise<unknown>;
  onClose: () => void;
  /** For acts that destroy or can't be taken back. */
  grave?: boolean;
}

/** Asks before something that can't be undone. Stays open and says why if the act is refused. */
export function ConfirmDialog(props: ConfirmDialogProps): ReactElement {
  const { open, title, children, confirmLabel, onConfirm, onClose, grave = false } = props;
  const [busy, setBusy] = useState(false);
  const [fault, setFault] = useState<unknown>();
  const [titleId, textId] = [useId(), useId()];
  const close = (): void => {
    setFault(undefined);
    onClose();
  };
  const confirm = async (): Promise<void> => {
    setBusy(true);
    setFault(undefined);
    try {
      await onConfirm();
      onClose();
    } catch (error) {
      setFault(error);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Dialog
      open={open}
      onClose={busy ? undefined : close}
      aria-labelledby={titleId}
      aria-describedby={textId}
      maxWidth="xs"
      fullWidth
    >
      <DialogTitle id={titleId}>{title}</DialogTitle>
      <DialogContent id={textId}>
        {typeof children === 'string' ? <Typography>{children}</Typography> : children}
        {fault === undefined ? null : (
          <Typography role="alert" color="error" sx={{ mt: 1.5 }}>
            ✕ {sentenceOf(fault).sentence}
          </Typography>
        )}
      </DialogContent>
      <DialogActions>
        <Button variant="contained" color={grave ? 'error' : 'primary'} disabled={busy} onClick={() => void confirm()}>
          {confirmLabel}
        </Button>
        <Button onClick={close} disabled={busy}>
          Leave it as it is
        </Button>
      </DialogActions>
    </Dialog>
  );
}
