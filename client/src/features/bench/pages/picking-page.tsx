import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import Button from '@mui/material/Button';
import { PageHeading } from '../../../components/page-heading';
import { Quantity } from '../../../components/figures';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { notify } from '../../../lib/notify';
import { useScan } from '../../../lib/use-scan';
import { batchQuery, pickListQuery, useGiveBack, useIssue, type PickRow } from '../api/bench';
import { batchAddress } from '../components/addresses';
import { NextAct } from '../components/next-act';
import { PickLine } from '../components/pick-line';

const keyOf = ({ path, part, lot, bin }: Pick<PickRow, 'path' | 'part' | 'lot' | 'bin'>): string =>
  [path, part.code, lot ?? '', bin].join(' ');

/** Scanned: a bin, a lot, or a part that lies by count. */
function answersTo(row: PickRow, code: string): boolean {
  return row.lot === code || row.bin === code || (row.lot === null && row.part.code === code);
}

export function Component(): ReactElement {
  const { number = '' } = useParams();
  const list = useQuery(pickListQuery(number));
  const batch = useQuery(batchQuery(number)).data;
  const issue = useIssue(number);
  const giveBack = useGiveBack(number);
  const [inHand, setInHand] = useState<string>();
  useScan((scanned) => {
    const code = scanned.trim().toUpperCase();
    const found = list.data?.rows.find((row) => answersTo(row, code));
    if (!found) {
      if (list.data?.rows.length) notify(`${code} is not on this list.`, { tone: 'hot' });
      return true;
    }
    setInHand(keyOf(found));
    return true;
  });
  if (list.isError && !list.data) {
    return <ErrorState error={list.error} onRetry={() => void list.refetch()} what="The pick list" />;
  }
  if (!list.data) return <LoadingState lines={8} label="Loading the pick list" />;
  const { rows, shortages, picked } = list.data;
  return (
    <>
      <PageHeading
        tags={<Tag kind="batch" code={number} size="big" />}
        title={`Pick for ${number}`}
        lead="In the order of the bins. Scan the bin, then the lot; or press Take beside the line."
        actions={
          <>
            <Button component={Link} to={batchAddress(number)}>
              Back to the batch
            </Button>
            {batch && batch.next.act !== 'pick' && batch.next.act !== 'none' ? <NextAct batch={batch} main /> : null}
          </>
        }
      />
      <Box sx={{ display: 'grid', gap: 3 }}>
        {rows.length > 0 ? (
          <Sheet title="To take">
            <Box component="ol" aria-label="To take" sx={{ listStyle: 'none', m: 0, p: 0 }}>
              {rows.map((row) => (
                <PickLine
                  key={keyOf(row)}
                  line={row}
                  verb="Take"
                  changeable
                  inHand={inHand === keyOf(row)}
                  onDo={(line, key) => issue.mutateAsync({ body: [line], key })}
                />
              ))}
            </Box>
          </Sheet>
        ) : null}
        {rows.length === 0 && shortages.length === 0 ? (
          <EmptyState title="Everything is picked">
            Nothing more is to be taken from the shelf for this batch.
          </EmptyState>
        ) : null}
        {shortages.length > 0 ? (
          <Sheet title="Not on the shelf">
            <ul>
              {shortages.map(({ path, part, quantity }) => (
                <li key={path}>
                  <Quantity value={quantity} unit={part.measure} /> of{' '}
                  <Tag kind="part" code={part.code} story={part.name} /> {part.name} are missing.
                </li>
              ))}
            </ul>
          </Sheet>
        ) : null}
        {picked.length > 0 ? (
          <Sheet title="Picked">
            <Box component="ol" aria-label="Picked" sx={{ listStyle: 'none', m: 0, p: 0 }}>
              {picked.map((line) => (
                <PickLine
                  key={keyOf(line)}
                  line={{ ...line, marks: null, standsInFor: null }}
                  verb="Give back"
                  inHand={false}
                  onDo={(back, key) => giveBack.mutateAsync({ body: [back], key })}
                />
              ))}
            </Box>
          </Sheet>
        ) : null}
      </Box>
    </>
  );
}
