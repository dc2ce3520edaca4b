import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { DefinitionList } from '../../../components/definition-list';
import { DenseTable } from '../../../components/dense-table';
import { UnitCost, When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { TagActions } from '../../../components/tag/tag-actions';
import { formatDay } from '../../../lib/format-time';
import { lotQuery, type Lot } from '../api/lots';
import { adjustAddress, transferAddress } from '../components/addresses';
import { DocumentTag } from '../components/document-tag';
import { LotStatusDialog } from '../components/lot-status-dialog';
import { LotStatusFlag } from '../components/lot-status-flag';
import { MovesTable } from '../components/moves-table';
import { Columns, Loaded } from '../components/page-body';
import { Amount, amountWords, costUnitOf } from '../components/amount';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  return (
    <Loaded query={useQuery(lotQuery(code))} what="The lot">
      {(lot) => <LotStory lot={lot} />}
    </Loaded>
  );
}

function LotStory({ lot }: { lot: Lot }): ReactElement {
  const role = usePerson()?.role;
  const mayAct = role === 'owner' || role === 'assembler';
  return (
    <>
      <PageHeading
        title={`${lot.name}, lot ${lot.code}`}
        lead={leadOf(lot)}
        tags={
          <>
            <Tag kind="lot" code={lot.code} size="big" to={null} />
            <Tag kind="part" code={lot.part} story={lot.name} />
            <LotStatusFlag status={lot.status} expired={lot.expired} />
            <TagActions kind="lot" code={lot.code} story={`${lot.part}, ${lot.name}`} />
          </>
        }
        actions={mayAct ? <Acts lot={lot} /> : null}
      />
      <Columns>
        <div>
          <Sheet title="Where it lies">
            <Places lot={lot} mayAct={mayAct} />
          </Sheet>
          <Sheet
            title="What moved"
            aside={<Link to={`/shelf/moves?lot=${encodeURIComponent(lot.code)}`}>All moves</Link>}
          >
            <MovesTable moves={lot.moves.slice(0, 30)} about="lot" />
          </Sheet>
        </div>
        <div>
          <Sheet title="Where it came from">
            <Origin lot={lot} />
          </Sheet>
          <Sheet title="Which batches took of it">
            <Batches lot={lot} />
          </Sheet>
          {lot.statusChanges.length > 0 ? (
            <Sheet title="Held and released">
              <StatusChanges lot={lot} />
            </Sheet>
          ) : null}
        </div>
      </Columns>
    </>
  );
}

function leadOf(lot: Lot): string {
  const amount = amountWords(lot.quantity, lot.measure);
  if (lot.quantity === '0') return 'Nothing of it is left on the shelf.';
  if (lot.status === 'held') return `${amount} wait to be looked at and can’t be picked.`;
  if (lot.status === 'rejected') return `${amount} are rejected and can’t be picked.`;
  if (lot.expired) return `${amount} are out of date and can’t be picked.`;
  return `${amount} on the shelf.`;
}

function Acts({ lot }: { lot: Lot }): ReactElement {
  const owner = usePerson()?.role === 'owner';
  const [status, setStatus] = useState<Lot['status']>();
  const hasStatus = lot.kind === 'delivery' || lot.kind === 'made';
  return (
    <>
      <Button component={Link} to={adjustAddress({ part: lot.part, lot: lot.code, bin: lot.bins[0] })}>
        Adjust
      </Button>
      {lot.quantity === '0' ? null : (
        <Button component={Link} to={transferAddress({ part: lot.part, lot: lot.code, bin: lot.bins[0] })}>
          Move some
        </Button>
      )}
      {hasStatus && lot.status !== 'held' ? <Button onClick={() => setStatus('held')}>Hold it back</Button> : null}
      {hasStatus && owner && lot.status !== 'rejected' ? (
        <Button color="error" onClick={() => setStatus('rejected')}>
          Reject
        </Button>
      ) : null}
      {hasStatus && owner && lot.status !== 'released' ? (
        <Button variant="contained" onClick={() => setStatus('released')}>
          Release
        </Button>
      ) : null}
      {status ? <LotStatusDialog lot={lot} status={status} onClose={() => setStatus(undefined)} /> : null}
    </>
  );
}

function Places({ lot, mayAct }: { lot: Lot; mayAct: boolean }): ReactElement {
  if (lot.places.length === 0) return <p>Nothing of it lies on the shelf.</p>;
  const columns = [
    { key: 'bin', title: 'Bin' },
    { key: 'quantity', title: 'Quantity', figure: true },
    ...(mayAct ? [{ key: 'act', title: '' }] : []),
  ];
  return (
    <DenseTable label="Where it lies" columns={columns}>
      {lot.places.map((place) => (
        <tr key={place.bin}>
          <td>
            <Tag kind="bin" code={place.bin} /> {place.quarantine ? <Flag tone="tape">quarantine</Flag> : null}
          </td>
          <td className="figure">
            <Amount value={place.quantity} measure={lot.measure} />
          </td>
          {mayAct ? (
            <td>
              <Button
                size="small"
                variant="text"
                component={Link}
                to={transferAddress({ part: lot.part, lot: lot.code, bin: place.bin, quantity: place.quantity })}
                aria-label={`Move out of ${place.bin}`}
              >
                Move
              </Button>
            </td>
          ) : null}
        </tr>
      ))}
    </DenseTable>
  );
}

const kindWords: Readonly<Record<string, string>> = {
  standing: 'the standing lot of a part followed by count',
  delivery: 'a delivery',
  made: 'made here',
  unit: 'one unit',
};

function Origin({ lot }: { lot: Lot }): ReactElement {
  return (
    <DefinitionList
      items={[
        { term: 'It is', value: kindWords[lot.kind] ?? lot.kind },
        {
          term: 'Came with',
          value: lot.origin ? <DocumentTag number={lot.origin} kind={lot.originKind ?? ''} /> : undefined,
        },
        { term: 'Supplier', value: lot.supplier ? <Tag kind="supplier" code={lot.supplier} /> : undefined },
        { term: 'Supplier’s lot', value: lot.supplierLot ?? undefined },
        { term: 'Received', value: lot.receivedOn ? formatDay(lot.receivedOn) : undefined },
        { term: 'Expires', value: lot.expiresOn ? formatDay(lot.expiresOn) : undefined },
        {
          term: 'Cost when it came',
          value:
            lot.unitCost && lot.currency ? (
              <UnitCost cost={lot.unitCost} currency={lot.currency} unit={costUnitOf(lot.measure)} />
            ) : undefined,
        },
        { term: 'Note', value: lot.note ?? undefined },
      ]}
    />
  );
}

function Batches({ lot }: { lot: Lot }): ReactElement {
  if (lot.batches.length === 0) return <p>None so far.</p>;
  return (
    <DenseTable
      label="Batches"
      columns={[
        { key: 'batch', title: 'Batch' },
        { key: 'part', title: 'Of' },
        { key: 'quantity', title: 'Took', figure: true },
      ]}
    >
      {lot.batches.map((batch) => (
        <tr key={batch.number}>
          <td>
            <Tag kind="batch" code={batch.number} />
          </td>
          <td>
            <Tag kind="part" code={batch.part} />
          </td>
          <td className="figure">
            <Amount value={batch.quantity} measure={lot.measure} />
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}

function StatusChanges({ lot }: { lot: Lot }): ReactElement {
  return (
    <DefinitionList
      items={lot.statusChanges.map((change) => ({
        term: `${change.document}: ${change.from} to ${change.to}`,
        value: (
          <>
            {change.reason} {change.person ?? ''} <When instant={change.occurredAt} />
          </>
        ),
      }))}
    />
  );
}
