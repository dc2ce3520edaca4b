import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { useIdempotencyKey } from '../../../api/idempotency';
import { useOpenParcel } from '../api/counter';

/** Opens a parcel for an order and goes to it. */
export function PackButton({ order, plain = false }: { order: string; plain?: boolean }): ReactElement {
  const open = useOpenParcel();
  const { keyFor, done } = useIdempotencyKey();
  const navigate = useNavigate();
  const pack = async (): Promise<void> => {
    const { number } = await open.mutateAsync({ order, key: keyFor({ order }) });
    done();
    await navigate(`/counter/parcels/${number}`);
  };
  return (
    <Button
      variant={plain ? 'outlined' : 'contained'}
      loading={open.isPending}
      onClick={() => void pack().catch(() => undefined)}
    >
      Pack it
    </Button>
  );
}
