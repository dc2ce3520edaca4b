import Dialog from '@mui/material/Dialog';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Typography from '@mui/material/Typography';
import { useId, type ReactElement, type ReactNode } from 'react';
import { Form } from '../../../components/form/form';
import { TextInput } from '../../../components/form/text-fields';
import { useDraftForm } from '../../../components/form/use-draft-form';

interface ReasonDialogProps {
  /** Names the draft. */
  name: string;
  /** Names the thing: `Reject lot L-0042?` */
  title: string;
  /** Says the consequence. */
  children: ReactNode;
  submitLabel: string;
  longest: number;
  onSubmit: (reason: string) => Promise<unknown>;
  onClose: () => void;
}

/** An act that is kept on record with its reason. */
export function ReasonDialog(props: ReasonDialogProps): ReactElement {
  const { name, title, children, submitLabel, longest, onSubmit, onClose } = props;
  const titleId = useId();
  const form = useDraftForm<{ reason: string }>({ name, defaultValues: { reason: '' } });
  const send = async ({ reason }: { reason: string }): Promise<void> => {
    await onSubmit(reason);
    onClose();
  };
  return (
    <Dialog open onClose={onClose} aria-labelledby={titleId} maxWidth="xs" fullWidth>
      <DialogTitle id={titleId}>{title}</DialogTitle>
      <DialogContent sx={{ display: 'grid', gap: 2 }}>
        <Typography component="div">{children}</Typography>
        <Form form={form} onSubmit={send} onCancel={onClose} submitLabel={submitLabel}>
          <TextInput name="reason" label="Reason" longest={longest} rows={2} required />
        </Form>
      </DialogContent>
    </Dialog>
  );
}
