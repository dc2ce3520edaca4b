import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useId, useState, type ReactElement } from 'react';
import { usePerson } from '../../../api/session';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { RadioInput } from '../../../components/form/choice-fields';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { notify } from '../../../lib/notify';
import { useEditStaff, useEndStaffSessions, useInviteAgain, type StaffMember } from '../api/staff';
import { roleChoices } from './role-choices';

interface StaffMemberDialogProps {
  member: StaffMember;
  onClose: () => void;
}

/** Somebody's role, and whether they may sign in. */
export function StaffMemberDialog({ member, onClose }: StaffMemberDialogProps): ReactElement {
  const edit = useEditStaff();
  const titleId = useId();
  const form = useDraftForm({ name: `staff:${member.id}`, defaultValues: { role: member.role } });
  const send = async ({ role }: Pick<StaffMember, 'role'>): Promise<void> => {
    await edit.mutateAsync({ id: member.id, version: member.version, role });
    notify(`${member.name} has another role now.`);
    onClose();
  };
  return (
    <Dialog open onClose={onClose} aria-labelledby={titleId} maxWidth="xs" fullWidth>
      <DialogTitle id={titleId}>{member.name}</DialogTitle>
      <DialogContent sx={{ display: 'grid', gap: 2.5 }}>
        <Form form={form} onSubmit={send} onCancel={onClose} submitLabel="Keep this role">
          <RadioInput name="role" label="Role" choices={roleChoices} required />
        </Form>
        <Access member={member} onDone={onClose} />
      </DialogContent>
    </Dialog>
  );
}

function Access({ member, onDone }: { member: StaffMember; onDone: () => void }): ReactElement | null {
  const edit = useEditStaff();
  const again = useInviteAgain();
  const endSessions = useEndStaffSessions();
  const [asking, setAsking] = useState<'shut' | 'end'>();
  const self = usePerson()?.id === member.id;
  if (self) return null;
  const setStatus = async (status: 'active' | 'disabled'): Promise<void> => {
    await edit.mutateAsync({ id: member.id, version: member.version, status });
    notify(status === 'active' ? `${member.name} may sign in again.` : `${member.name} is shut out.`);
    onDone();
  };
  if (member.status === 'invited' || member.status === 'unconfirmed') {
    const sent = (): void =>
      notify(`Another invitation is on its way to ${member.email}. The one before no longer works.`);
    return (
      <Button disabled={again.isPending} onClick={() => again.mutate(member.id, { onSuccess: sent })}>
        Send the invitation again
      </Button>
    );
  }
  if (member.status === 'disabled')
    return <Button onClick={() => void setStatus('active')}>Let {member.name} in again</Button>;
  return (
    <>
      <Button onClick={() => setAsking('end')}>Sign {member.name} out everywhere</Button>
      <Button color="error" onClick={() => setAsking('shut')}>
        Shut {member.name} out
      </Button>
      <ConfirmDialog
        open={asking === 'shut'}
        grave
        title={`Shut ${member.name} out?`}
        confirmLabel="Shut out"
        onConfirm={() => setStatus('disabled')}
        onClose={() => setAsking(undefined)}
      >
        {member.name} is signed out at once and can’t sign in until you let them in again. What they did stays on
        record.
      </ConfirmDialog>
      <ConfirmDialog
        open={asking === 'end'}
        title={`Sign ${member.name} out everywhere?`}
        confirmLabel="Sign out"
        onConfirm={() =>
          endSessions.mutateAsync(member.id).then(() => notify(`${member.name} is signed out everywhere.`))
        }
        onClose={() => setAsking(undefined)}
      >
        Readings not yet sent from a tablet wait there until {member.name} signs in again.
      </ConfirmDialog>
    </>
  );
}
