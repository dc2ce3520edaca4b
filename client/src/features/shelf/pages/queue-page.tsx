import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { PageHeading } from '../../../components/page-heading';
import { QueueList, type QueueItem } from '../../../components/queue-list';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatDayShort } from '../../../lib/format-time';
import { capital, numberWord } from '../../../lib/number-words';
import { queueQuery, type ShelfQueue } from '../api/stock';
import { lotAddress, partAddress, receiveAddress } from '../components/addresses';
import { Loaded } from '../components/page-body';
import { amountWords } from '../components/amount';

type Short = ShelfQueue['shortParts'][number];
type Held = ShelfQueue['heldLots'][number];
type Expiring = ShelfQueue['expiringLots'][number];

export function Component(): ReactElement {
  const queue = useQuery(queueQuery);
  return (
    <Loaded query={queue} what="The shelf’s queue">
      {(answer) => <Queue queue={answer} />}
    </Loaded>
  );
}

function Queue({ queue }: { queue: ShelfQueue }): ReactElement {
  const owner = usePerson()?.role === 'owner';
  const items = [
    ...queue.shortParts.filter(({ short }) => short !== null).map((part) => missing(part, owner)),
    ...queue.expiringLots.map(expiring),
    ...queue.heldLots.map((lot) => held(lot, owner)),
    ...queue.shortParts.filter(({ short }) => short === null).map((part) => runningLow(part, owner)),
  ];
  return (
    <>
      <PageHeading
        title="Shelf"
        lead={leadOf(queue)}
        actions={
          owner ? (
            <Button variant="contained" component={Link} to={receiveAddress({})}>
              Receive a delivery
            </Button>
          ) : null
        }
      />
      {items.length > 0 ? (
        <QueueList label="What needs a hand" items={items} />
      ) : (
        <EmptyState
          title="Nothing on the shelf needs a hand"
          action={
            <Button component={Link} to="/shelf/parts">
              Look at the parts
            </Button>
          }
        >
          Held lots, parts that run short and lots that expire would stand here.
        </EmptyState>
      )}
    </>
  );
}

function leadOf({ shortPartCount, heldLotCount, expiringLotCount }: ShelfQueue): string {
  const says = [
    shortPartCount > 0 ? `${numberWord(shortPartCount)} ${shortPartCount === 1 ? 'part runs' : 'parts run'} short` : '',
    heldLotCount > 0 ? `${numberWord(heldLotCount)} ${heldLotCount === 1 ? 'lot is' : 'lots are'} held` : '',
    expiringLotCount > 0 ? `${numberWord(expiringLotCount)} ${expiringLotCount === 1 ? 'expires' : 'expire'} soon` : '',
  ].filter(Boolean);
  return says.length > 0 ? `${capital(says.join(', '))}.` : 'Everything lies where it should.';
}

function act(to: string, label: string): ReactElement {
  return (
    <Button component={Link} to={to}>
      {label}
    </Button>
  );
}

function missing(part: Short, owner: boolean): QueueItem {
  return {
    key: `short ${part.part}`,
    when: 'short',
    late: true,
    sentence: (
      <>
        <Tag kind="part" code={part.part} story={part.name} /> is claimed beyond what can be used:{' '}
        {amountWords(part.short ?? '0', part.measure)} are missing.
      </>
    ),
    because: `${part.name}. ${part.claimed} are claimed.`,
    action: act(partAddress(part.part), owner ? 'See who waits for it' : 'Open the part'),
  };
}

function runningLow(part: Short, owner: boolean): QueueItem {
  return {
    key: `low ${part.part}`,
    sentence: (
      <>
        <Tag kind="part" code={part.part} story={part.name} /> runs low: {amountWords(part.free, part.measure)} free,
        and it is to be ordered below {part.reorderPoint}.
      </>
    ),
    because: part.supplier ? `${part.name}, from ${part.supplier}` : `${part.name}, no supplier named`,
    action: owner
      ? act(receiveAddress({ part: part.part, supplier: part.supplier ?? undefined }), 'Receive some')
      : act(partAddress(part.part), 'Open the part'),
  };
}

function held(lot: Held, owner: boolean): QueueItem {
  return {
    key: `held ${lot.lot}`,
    when: lot.receivedOn ? formatDayShort(lot.receivedOn) : undefined,
    sentence: (
      <>
        <Tag kind="lot" code={lot.lot} /> is held: {amountWords(lot.quantity, lot.measure)} of{' '}
        <Tag kind="part" code={lot.part} story={lot.name} /> wait to be looked at.
      </>
    ),
    because: `In ${lot.bins.join(', ')}${lot.supplier ? `, from ${lot.supplier}` : ''}`,
    action: act(lotAddress(lot.lot), owner ? 'Decide about it' : 'Open the lot'),
  };
}

function expiring(lot: Expiring): QueueItem {
  return {
    key: `expires ${lot.lot}`,
    when: formatDayShort(lot.expiresOn),
    late: lot.expired,
    sentence: (
      <>
        <Tag kind="lot" code={lot.lot} /> {lot.expired ? 'is out of date' : 'expires'}:{' '}
        {amountWords(lot.quantity, lot.measure)} of <Tag kind="part" code={lot.part} story={lot.name} />.
      </>
    ),
    because: lot.expired ? 'It can no longer be picked.' : 'Use it first.',
    action: act(lotAddress(lot.lot), 'Open the lot'),
  };
}
