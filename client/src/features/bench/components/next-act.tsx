import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useClaimMissing, useStartBuilding, type BatchItem } from '../api/bench';
import { batchAddress, buildAddress, pickingAddress } from './addresses';

/** The one thing to do next about a batch. */
export function NextAct({ batch, main = false }: { batch: BatchItem; main?: boolean }): ReactElement {
  const claim = useClaimMissing();
  const start = useStartBuilding();
  const navigate = useNavigate();
  const { number } = batch;
  const variant = main ? 'contained' : 'outlined';
  switch (batch.next.act) {
    case 'claim':
      return (
        <Button
          variant={variant}
          disabled={claim.isPending}
          onClick={() => claim.mutate(number)}
          aria-label={`Claim what is missing for ${number}`}
        >
          Claim what is missing
        </Button>
      );
    case 'pick':
      return (
        <Button variant={variant} component={Link} to={pickingAddress(number)} aria-label={`Pick ${number}`}>
          Pick
        </Button>
      );
    case 'start_building':
      return (
        <Button
          variant={variant}
          disabled={start.isPending}
          aria-label={`Start building ${number}`}
          onClick={() =>
            start.mutate(number, {
              onSuccess: ({ units }) => void navigate(units.length > 0 ? buildAddress(number) : batchAddress(number)),
            })
          }
        >
          Start building
        </Button>
      );
    case 'build':
      return (
        <Button
          variant={variant}
          component={Link}
          to={batch.units.length > 0 ? buildAddress(number) : batchAddress(number)}
          aria-label={`Build ${number}`}
        >
          Build
        </Button>
      );
    default:
      return (
        <Button variant={variant} component={Link} to={batchAddress(number)} aria-label={`Look at ${number}`}>
          Look at it
        </Button>
      );
  }
}
