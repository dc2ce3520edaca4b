import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { useTakeOut, type Parcel } from '../api/counter';

type Need = Parcel['needs'][number];

const Rows = styled('ul')(({ theme }) => ({
  listStyle: 'none',
  margin: 0,
  padding: 0,
  '& > li': { padding: '12px 0', borderBottom: `1px solid ${theme.vars.palette.tone.line}` },
  '& .need': { display: 'flex', flexWrap: 'wrap', gap: '8px 16px', alignItems: 'center' },
  '& .name': { flex: '1 1 12rem', minWidth: 0 },
  '& .place': { color: theme.vars.palette.tone.inkSoft, fontSize: '0.875rem', marginTop: 4 },
  '& .item': { display: 'flex', flexWrap: 'wrap', gap: '8px 16px', alignItems: 'center', padding: '6px 0 0 20px' },
  '& .item button': { minHeight: 40, marginLeft: 'auto' },
}));

/** What has to be in the parcel, bag by bag, with what is in it. */
export function ParcelContents({ parcel, packs }: { parcel: Parcel; packs: boolean }): ReactElement {
  return (
    <>
      {bagsOf(parcel.needs).map(([head, needs]) => (
        <Sheet key={head} title={head} aside={bagState(needs)}>
          <Rows>
            {needs.map((need) => (
              <NeedRow key={need.id} need={need} parcel={parcel} packs={packs && parcel.state === 'packing'} />
            ))}
          </Rows>
        </Sheet>
      ))}
    </>
  );
}

function bagsOf(needs: readonly Need[]): readonly (readonly [string, readonly Need[]])[] {
  const bags = new Map<string, Need[]>();
  for (const need of needs) {
    const head = need.bag === null ? need.title : `${need.title}, bag ${need.bag}`;
    bags.set(head, [...(bags.get(head) ?? []), need]);
  }
  return [...bags];
}

const isComplete = ({ packed, quantity }: Need): boolean => packed === quantity;

function bagState(needs: readonly Need[]): ReactElement {
  const done = needs.filter(isComplete).length;
  return done === needs.length ? (
    <Flag tone="sound">complete</Flag>
  ) : (
    <Flag tone="cool">
      {done} of {needs.length}
    </Flag>
  );
}

function NeedRow({ need, parcel, packs }: { need: Need; parcel: Parcel; packs: boolean }): ReactElement {
  const takeOut = useTakeOut(parcel.number);
  const items = parcel.items.filter(({ needId }) => needId === need.id);
  return (
    <li>
      <div className="need">
        <Tag kind="part" code={need.part} story={need.partName} />
        <span className="name">{need.partName}</span>
        <span>
          <Quantity value={need.packed} /> of <Quantity value={need.quantity} unit={need.measure} />
        </span>
        {isComplete(need) ? <Flag tone="sound">in</Flag> : null}
      </div>
      {packs && !isComplete(need) ? <div className="place">{placesOf(need)}</div> : null}
      {items.map((item) => (
        <div className="item" key={item.id}>
          {item.serial ? <Tag kind="unit" code={item.serial} /> : <Tag kind="lot" code={item.lot} />}
          <span>
            <Quantity value={item.quantity} unit={need.measure} /> from {item.bin}
          </span>
          {packs ? (
            <Button
              variant="text"
              aria-label={`Take ${item.serial ?? item.lot} out`}
              onClick={() => takeOut.mutate(item.id)}
            >
              Take it out
            </Button>
          ) : null}
        </div>
      ))}
    </li>
  );
}

function placesOf({ places }: Need): string {
  if (places.length === 0) return 'None lies on the shelf that may be packed.';
  return places.map(({ bin, lot, quantity }) => `${bin}: ${quantity} of ${lot}`).join(' · ');
}
