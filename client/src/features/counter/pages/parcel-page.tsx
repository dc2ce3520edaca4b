import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { Caution } from '../../../components/caution';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatPromise } from '../../../lib/format-time';
import { parcelQuery, useParcelAct, type Parcel } from '../api/counter';
import { DispatchForm } from '../components/dispatch-form';
import { LithiumSheet } from '../components/lithium-sheet';
import { ParcelContents } from '../components/parcel-contents';
import { ScanField } from '../components/scan-field';

const Layout = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1fr) 360px',
  gap: 24,
  alignItems: 'start',
  '& > div': { display: 'grid', gap: 20, minWidth: 0 },
  [theme.breakpoints.down('md')]: { gridTemplateColumns: 'minmax(0, 1fr)' },
}));

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const parcel = useQuery(parcelQuery(code));
  if (parcel.isError)
    return <ErrorState error={parcel.error} onRetry={() => void parcel.refetch()} what="The parcel" />;
  if (!parcel.data) return <LoadingState lines={8} label="Loading the parcel" />;
  return <ParcelContent parcel={parcel.data} />;
}

function ParcelContent({ parcel }: { parcel: Parcel }): ReactElement {
  const role = usePerson()?.role;
  const packs = role === 'owner' || role === 'assembler';
  return (
    <>
      <PageHeading
        title={`Parcel ${parcel.number}`}
        lead={standing(parcel)}
        tags={<Tag kind="order" code={parcel.order} story={parcel.recipient} size="big" />}
        actions={<Acts parcel={parcel} packs={packs} />}
      />
      {packs && parcel.state === 'packing' ? <ScanField parcel={parcel.number} /> : null}
      <Layout sx={{ marginTop: '20px' }}>
        <div>
          <ParcelContents parcel={parcel} packs={packs} />
        </div>
        <div>
          {packs && parcel.state === 'packed' ? <DispatchForm parcel={parcel} /> : null}
          <LithiumSheet
            key={`${parcel.number} ${parcel.version}`}
            parcel={parcel}
            packs={packs}
            owner={role === 'owner'}
          />
          <Sheet title="Goes to">
            {parcel.address.map((text) => (
              <div key={text}>{text}</div>
            ))}
          </Sheet>
          {parcel.cautions.map((text) => (
            <Caution key={text}>{text}</Caution>
          ))}
        </div>
      </Layout>
    </>
  );
}

function Acts({ parcel, packs }: { parcel: Parcel; packs: boolean }): ReactElement {
  const close = useParcelAct(parcel.number, 'packed');
  const reopen = useParcelAct(parcel.number, 'reopened');
  const complete = parcel.needs.every(({ packed, quantity }) => packed === quantity);
  return (
    <>
      <Button variant="outlined" component="a" href={`/api/parcels/${parcel.number}/packing-slip`} download>
        Packing slip
      </Button>
      {packs && parcel.state === 'packed' ? (
        <Button variant="outlined" loading={reopen.isPending} onClick={() => reopen.mutate(parcel.version)}>
          Open it again
        </Button>
      ) : null}
      {packs && parcel.state === 'packing' ? (
        <Button
          variant={complete ? 'contained' : 'outlined'}
          loading={close.isPending}
          onClick={() => close.mutate(parcel.version)}
        >
          It is packed
        </Button>
      ) : null}
    </>
  );
}

function standing(parcel: Parcel): string {
  const missing = parcel.needs.filter(({ packed, quantity }) => packed !== quantity).length;
  switch (parcel.state) {
    case 'packing':
      return missing === 0
        ? 'Everything is in it. Close it.'
        : `${missing} of ${parcel.needs.length} lines still to be packed, for ${formatPromise(parcel.promisedOn)}.`;
    case 'packed':
      return `Closed, and promised for ${formatPromise(parcel.promisedOn)}. Weigh it, then send it off.`;
    case 'shipped':
      return `Has left with ${[parcel.carrier, parcel.trackingCode].join(' ').trim()}.`;
    default:
      return 'Was taken apart: its order was cancelled.';
  }
}
