import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { TagActions } from '../../../components/tag/tag-actions';
import { formatDay } from '../../../lib/format-time';
import { partQuery, useRetirePart, type Part, type PartStory } from '../api/parts';
import { adjustAddress, partAddress, receiveAddress, transferAddress } from '../components/addresses';
import { amountWords } from '../components/amount';
import { MovesTable } from '../components/moves-table';
import { Columns, Loaded } from '../components/page-body';
import { ClaimsTable, PartFacts, PartFigures, PlacesTable, UsesTable } from '../components/part-sheets';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  return (
    <Loaded query={useQuery(partQuery(code))} what="The part">
      {(story) => <Story story={story} />}
    </Loaded>
  );
}

function Story({ story }: { story: PartStory }): ReactElement {
  const { part, figures, places, claims, uses, moves, currency } = story;
  const role = usePerson()?.role;
  return (
    <>
      <PageHeading
        title={part.name}
        lead={leadOf(story)}
        tags={
          <>
            <Tag kind="part" code={part.code} size="big" to={null} />
            {part.retiredOn ? <Flag tone="cool">retired {formatDay(part.retiredOn)}</Flag> : null}
            <TagActions kind="part" code={part.code} story={part.name} />
          </>
        }
        actions={role === 'owner' || role === 'assembler' ? <Acts part={part} owner={role === 'owner'} /> : null}
      />
      <Columns>
        <div>
          <Sheet title="Where it lies">
            <PlacesTable places={places} measure={part.measure} part={part.code} mayMove={role !== 'accountant'} />
          </Sheet>
          <Sheet title="Who claims it">
            <ClaimsTable claims={claims} measure={part.measure} />
          </Sheet>
          <Sheet
            title="What moved"
            aside={<Link to={`/shelf/moves?part=${encodeURIComponent(part.code)}`}>All moves</Link>}
          >
            <MovesTable moves={moves.slice(0, 20)} about="part" />
          </Sheet>
        </div>
        <div>
          <Sheet title="How much there is">
            <PartFigures figures={figures} part={part} currency={currency} />
          </Sheet>
          <Sheet title="What it is">
            <PartFacts part={part} />
          </Sheet>
          <Sheet title="Where it is used">
            <UsesTable uses={uses} measure={part.measure} />
          </Sheet>
        </div>
      </Columns>
    </>
  );
}

function leadOf({ part, figures }: PartStory): string {
  const free = amountWords(figures.free, part.measure);
  if (figures.short !== null)
    return `More is claimed than can be used: ${amountWords(figures.short, part.measure)} are missing.`;
  if (figures.belowReorderPoint) return `Only ${free} free: time to order.`;
  return `${free} free of ${amountWords(figures.onShelf, part.measure)} on the shelf.`;
}

function Acts({ part, owner }: { part: Part; owner: boolean }): ReactElement {
  const [asking, setAsking] = useState(false);
  const retire = useRetirePart(part.code);
  const bringsBack = part.retiredOn !== null;
  const canReceive = owner && part.traced !== 'single' && !bringsBack;
  return (
    <>
      <Button component={Link} to={transferAddress({ part: part.code })}>
        Move some
      </Button>
      <Button component={Link} to={adjustAddress({ part: part.code })}>
        Adjust
      </Button>
      {owner ? (
        <>
          <Button onClick={() => setAsking(true)}>{bringsBack ? 'Bring back' : 'Retire'}</Button>
          <Button component={Link} to={`${partAddress(part.code)}/edit`}>
            Edit
          </Button>
        </>
      ) : null}
      {canReceive ? (
        <Button
          variant="contained"
          component={Link}
          to={receiveAddress({ part: part.code, supplier: part.suppliers[0]?.supplier })}
        >
          Receive some
        </Button>
      ) : null}
      <ConfirmDialog
        open={asking}
        title={bringsBack ? `Bring ${part.code} back?` : `Retire ${part.code}?`}
        confirmLabel={bringsBack ? 'Bring it back' : 'Retire it'}
        onConfirm={() => retire.mutateAsync({ version: part.version, retire: !bringsBack })}
        onClose={() => setAsking(false)}
      >
        {bringsBack
          ? 'It can be bought, built and offered again.'
          : 'It is no longer bought, built or offered. What lies on the shelf may still be used up, and its history stays.'}
      </ConfirmDialog>
    </>
  );
}
