import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatQuantity } from '../../../lib/format-quantity';
import { buildableQuery, type Buildable, type RevisionPlace } from '../api/bills';
import { unitOf } from './design-words';

const Body = styled('div')(({ theme }) => ({
  '& .many': { ...theme.typography.h1, margin: 0 },
  '& p': { margin: '2px 0 0', color: theme.vars.palette.tone.inkSoft },
  '& ul': { listStyle: 'none', margin: '10px 0 0', padding: 0 },
  '& li': { padding: '9px 0', borderTop: `1px solid ${theme.vars.palette.tone.line}` },
  '& li > div': { display: 'flex', flexWrap: 'wrap', gap: '4px 12px', alignItems: 'center' },
  '& details': { marginTop: 12 },
  '& summary': { cursor: 'pointer', color: theme.vars.palette.tone.board },
}));

/** How many could be built from what is free, and what stops the next one. */
export function BuildableSheet({ place }: { place: RevisionPlace }): ReactElement {
  const buildable = useQuery(buildableQuery(place));
  return (
    <Sheet title="How many now">
      {buildable.isError ? (
        <ErrorState error={buildable.error} onRetry={() => void buildable.refetch()} what="The count" />
      ) : null}
      {buildable.isPending ? <LoadingState lines={3} label="Counting what could be built" /> : null}
      {buildable.data ? <Counted buildable={buildable.data} /> : null}
    </Sheet>
  );
}

function Counted({ buildable }: { buildable: Buildable }): ReactElement {
  const { quantity, atMost, stops, aloneEnough, proven } = buildable;
  const oneWouldDo = stops.length > 1 && aloneEnough.length > 0;
  return (
    <Body>
      <p className="many">{quantity}</p>
      <p>
        could be built from what is free
        {atMost === quantity ? '.' : `; more than ${atMost} is not possible, and in between it was not decided.`}
      </p>
      {stops.length > 0 ? (
        <>
          <p style={{ marginTop: 14 }}>{proven ? 'The next one needs' : 'The next one needs no more than'}</p>
          <ul aria-label="What stops the next one">
            {stops.map((stop) => (
              <Missing key={stop.part.code} stop={stop} />
            ))}
          </ul>
        </>
      ) : null}
      {oneWouldDo ? <p>Any one of {aloneEnough.map(({ part }) => part.code).join(', ')} would be enough.</p> : null}
      <TakenParts buildable={buildable} />
    </Body>
  );
}

function Missing({ stop }: { stop: Buildable['stops'][number] }): ReactElement {
  const { part, missing, onShelf, usable, claimed } = stop;
  const unit = unitOf(part.measure);
  const words = [onShelf === '0' ? 'none on the shelf' : `${formatQuantity(onShelf, unit)} on the shelf`];
  if (usable !== onShelf) words.push(`${formatQuantity(usable, unit)} of it usable`);
  if (claimed !== '0') words.push(`${formatQuantity(claimed, unit)} promised`);
  return (
    <li>
      <div>
        <Quantity value={missing} unit={unit} /> more of <Tag kind="part" code={part.code} story={part.name} />
      </div>
      <p>
        {part.name}: {words.join(', ')}.
      </p>
    </li>
  );
}

function TakenParts({ buildable }: { buildable: Buildable }): ReactElement | null {
  if (buildable.takes.length === 0) return null;
  return (
    <details>
      <summary>What they would take</summary>
      <ul aria-label="What they would take">
        {buildable.takes.map(({ part, taken, free }) => (
          <li key={part.code}>
            <div>
              <Tag kind="part" code={part.code} story={part.name} />
              <span>
                <Quantity value={taken} unit={unitOf(part.measure)} /> of{' '}
                <Quantity value={free} unit={unitOf(part.measure)} />
              </span>
            </div>
          </li>
        ))}
      </ul>
    </details>
  );
}
