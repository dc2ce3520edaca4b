import Button from '@mui/material/Button';
import { useState, type ReactElement } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { notify } from '../../../lib/notify';
import { sentenceOf } from '../../../lib/problem';
import { useBeginDraft, useDiscardDraft, useRelease, type Bill } from '../api/bills';
import { billAddress, editAddress } from './addresses';

/** Begins a draft, from the released revision where there is one, and goes on to edit it. */
export function BeginDraft({ bill }: { bill: Bill }): ReactElement {
  const { code } = bill.part;
  const begin = useBeginDraft();
  const navigate = useNavigate();
  const { keyFor, done } = useIdempotencyKey();
  const from = bill.released === null ? 'nothing' : 'released';
  const start = async (): Promise<void> => {
    try {
      const draft = await begin.mutateAsync({ code, from, key: keyFor({ code, from }) });
      done();
      await navigate(editAddress({ code, number: draft.number }));
    } catch (error) {
      notify(sentenceOf(error).sentence, { tone: 'hot' });
    }
  };
  return (
    <Button variant="contained" disabled={begin.isPending} onClick={() => void start()}>
      {from === 'released' ? `Make a draft from revision ${bill.released}` : 'Begin a bill'}
    </Button>
  );
}

/** What the owner can do with a bill: draft, edit, release, throw a draft away. */
export function BillActs({ bill, shown }: { bill: Bill; shown: number | null }): ReactElement | null {
  if (bill.revisions.length === 0) return null;
  if (bill.draft === null) return <BeginDraft bill={bill} />;
  if (shown !== bill.draft) {
    return (
      <Button variant="contained" component={Link} to={billAddress(bill.part.code, bill.draft)}>
        Look at draft {bill.draft}
      </Button>
    );
  }
  return <DraftActs bill={bill} number={bill.draft} />;
}

function DraftActs({ bill, number }: { bill: Bill; number: number }): ReactElement {
  const { code, name } = bill.part;
  const place = { code, number };
  const version = bill.revisions.find((revision) => revision.number === number)?.version ?? 0;
  const release = useRelease(place);
  const discard = useDiscardDraft(place);
  const navigate = useNavigate();
  const [asking, setAsking] = useState<'release' | 'discard'>();
  const close = (): void => setAsking(undefined);
  return (
    <>
      <Button color="error" variant="text" onClick={() => setAsking('discard')}>
        Throw the draft away
      </Button>
      <Button component={Link} to={editAddress(place)}>
        Edit the draft
      </Button>
      <Button variant="contained" onClick={() => setAsking('release')}>
        Release revision {number}
      </Button>
      <ConfirmDialog
        open={asking === 'release'}
        title={`Release revision ${number} of ${code}?`}
        confirmLabel="Release it"
        onConfirm={() => release.mutateAsync(version).then(() => notify(`Revision ${number} of ${code} is in force.`))}
        onClose={close}
      >
        From now on {name} is built to it, and it cannot change any more.
        {bill.released === null ? '' : ` Revision ${bill.released} is superseded; batches planned to it stay with it.`}
      </ConfirmDialog>
      <ConfirmDialog
        open={asking === 'discard'}
        grave
        title={`Throw away draft ${number} of ${code}?`}
        confirmLabel="Throw it away"
        onConfirm={async () => {
          await discard.mutateAsync(version);
          notify(`Draft ${number} of ${code} is gone.`);
          await navigate(billAddress(code), { replace: true });
        }}
        onClose={close}
      >
        Its lines, steps and test plan are gone for good. What is released stays as it is.
      </ConfirmDialog>
    </>
  );
}
