import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import { useState, type ReactElement } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { Flag } from '../../../components/flag';
import { Sheet } from '../../../components/sheet';
import { useSettleReview, type DeskOrder } from '../api/counter';

type Review = DeskOrder['reviews'][number];

/** Payments that do not fit the order: nothing is packed or sent until the owner has looked. */
export function PaymentReviews({ reviews, settles }: { reviews: readonly Review[]; settles: boolean }): ReactElement {
  const [settling, setSettling] = useState<Review>();
  const [resolution, setResolution] = useState('');
  const settle = useSettleReview();
  return (
    <Sheet title="Payments in doubt">
      {reviews.map((review) => (
        <div key={review.id}>
          <p>{review.what}</p>
          {review.resolution === null ? null : <p>Settled: {review.resolution}</p>}
          {review.resolution === null && settles ? (
            <Button variant="outlined" onClick={() => setSettling(review)}>
              Say what was done
            </Button>
          ) : null}
          {review.resolution === null && !settles ? <Flag tone="tape">waits for the owner</Flag> : null}
        </div>
      ))}
      <ConfirmDialog
        open={settling !== undefined}
        title="Settle this payment?"
        confirmLabel="It is settled"
        onConfirm={async () => {
          if (settling) await settle.mutateAsync({ id: settling.id, resolution });
        }}
        onClose={() => setSettling(undefined)}
      >
        <TextField
          label="What was found and done"
          value={resolution}
          onChange={(event) => setResolution(event.target.value)}
          required
          fullWidth
          multiline
          slotProps={{ htmlInput: { maxLength: 200 } }}
        />
      </ConfirmDialog>
    </Sheet>
  );
}
