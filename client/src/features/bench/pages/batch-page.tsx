import Button from '@mui/material/Button';
import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { Money } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Strip } from '../../../components/strip/strip';
import { Tag } from '../../../components/tag/tag';
import { formatDay } from '../../../lib/format-time';
import { batchQuery, useClaimMissing, type Batch } from '../api/bench';
import { buildAddress, pickingAddress, unitAddress } from '../components/addresses';
import { BatchLines } from '../components/batch-lines';
import { BatchSteps } from '../components/batch-steps';
import { MadePieces } from '../components/made-pieces';
import { NextAct } from '../components/next-act';
import { SubAssemblies } from '../components/sub-assemblies';
import { WithdrawDialog } from '../components/withdraw-dialog';

export function Component(): ReactElement {
  const { number = '' } = useParams();
  const batch = useQuery(batchQuery(number));
  if (batch.isError && !batch.data) {
    return <ErrorState error={batch.error} onRetry={() => void batch.refetch()} what={`Batch ${number}`} />;
  }
  if (!batch.data) return <LoadingState lines={10} label={`Loading batch ${number}`} />;
  return <BatchView batch={batch.data} />;
}

function BatchView({ batch }: { batch: Batch }): ReactElement {
  const navigate = useNavigate();
  const { number } = batch;
  return (
    <>
      <PageHeading
        tags={<Tag kind="batch" code={number} size="big" to={null} />}
        title={`${batch.quantity} ${batch.part.name}`}
        documentTitle={`Batch ${number}`}
        lead={
          <>
            {batch.next.sentence} Due {formatDay(batch.dueOn)}. {batch.late ? <Flag tone="hot">late</Flag> : null}
          </>
        }
        actions={<Acts batch={batch} />}
      />
      <Box sx={{ display: 'grid', gap: 3 }}>
        {batch.units.length > 0 ? (
          <Strip
            label={`Batch ${number}`}
            units={batch.units}
            onOpen={(serial) =>
              void navigate(batch.status === 'in_build' ? buildAddress(number, serial) : unitAddress(serial))
            }
          />
        ) : null}
        {batch.status === 'in_build' && batch.part.traced !== 'single' ? <MadePieces batch={batch} /> : null}
        <Sheet title="Parts">
          <BatchLines batch={batch} />
        </Sheet>
        {batch.subAssemblies.length > 0 ? (
          <Sheet title="Sub-assemblies">
            <SubAssemblies batch={batch} />
          </Sheet>
        ) : null}
        <Sheet title="Steps">
          <BatchSteps batch={batch} />
        </Sheet>
        <Facts batch={batch} />
      </Box>
    </>
  );
}

function Acts({ batch }: { batch: Batch }): ReactElement {
  const claim = useClaimMissing();
  const owner = usePerson()?.role === 'owner';
  const [withdrawing, setWithdrawing] = useState(false);
  const { number, status } = batch;
  const open = status === 'planned' || status === 'picking' || status === 'in_build';
  const labels = `/api/batches/${encodeURIComponent(number)}/labels`;
  return (
    <>
      {owner && (status === 'planned' || status === 'picking') ? (
        <Button onClick={() => setWithdrawing(true)}>Withdraw</Button>
      ) : null}
      {batch.units.length > 0 ? (
        <Button component="a" href={labels} target="_blank" rel="noopener">
          Print labels
        </Button>
      ) : null}
      {open && batch.linesShort > 0 && batch.next.act !== 'claim' ? (
        <Button disabled={claim.isPending} onClick={() => claim.mutate(number)}>
          Claim what is missing
        </Button>
      ) : null}
      {status === 'picking' || status === 'in_build' ? (
        batch.next.act === 'pick' ? null : (
          <Button component={Link} to={pickingAddress(number)}>
            Parts in and out
          </Button>
        )
      ) : null}
      {open && !(batch.next.act === 'build' && batch.units.length === 0) ? <NextAct batch={batch} main /> : null}
      {withdrawing ? <WithdrawDialog batch={batch} onClose={() => setWithdrawing(false)} /> : null}
    </>
  );
}

function Facts({ batch }: { batch: Batch }): ReactElement {
  const { cost } = batch;
  return (
    <Sheet title={cost ? 'What it cost so far' : 'About it'}>
      <DefinitionList
        items={[
          { term: 'Built to', value: `${batch.part.code} revision ${batch.revision}` },
          { term: 'Finished', value: `${batch.finished} of ${batch.quantity}` },
          { term: 'Scrapped', value: batch.scrapped > 0 ? String(batch.scrapped) : undefined },
          { term: 'Note', value: batch.note ?? undefined },
          { term: 'Materials picked', value: cost ? <Money value={cost.materialsIn} /> : undefined },
          { term: 'Materials finished or given back', value: cost ? <Money value={cost.materialsOut} /> : undefined },
          { term: 'Lost', value: cost ? <Money value={cost.loss} /> : undefined },
          { term: 'Still in work', value: cost ? <Money value={cost.held} /> : undefined },
          { term: 'Labour of finished pieces', value: cost ? <Money value={cost.labour} /> : undefined },
        ]}
      />
    </Sheet>
  );
}
