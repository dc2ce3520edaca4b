import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Flag, type Tone } from '../../../components/flag';
import { Sheet } from '../../../components/sheet';
import { formatCount } from '../../../lib/format-quantity';
import { formatInstantShort } from '../../../lib/format-time';
import type { Bill } from '../api/bills';
import { billAddress, compareAddress, whereUsedAddress } from './addresses';
import { statusWords } from './design-words';

const List = styled('ul')(({ theme }) => ({
  listStyle: 'none',
  margin: 0,
  padding: 0,
  '& > li': { padding: '10px 0', borderTop: `1px solid ${theme.vars.palette.tone.line}` },
  '& > li:first-of-type': { borderTop: 0, paddingTop: 0 },
  '& .head': { display: 'flex', flexWrap: 'wrap', gap: '4px 12px', alignItems: 'center' },
  '& p': { margin: '2px 0 0', color: theme.vars.palette.tone.inkSoft },
}));

const tones: Record<Bill['revisions'][number]['status'], Tone> = {
  draft: 'tape',
  released: 'sound',
  superseded: 'cool',
};

/** All revisions of a bill, the newest first, each with the way to what changed in it. */
export function RevisionsSheet({ bill, shown }: { bill: Bill; shown: number }): ReactElement {
  const { revisions, part } = bill;
  return (
    <Sheet
      title="Revisions"
      aside={<Link to={whereUsedAddress(part.code)}>in {formatCount(bill.usedIn, 'released bill')}</Link>}
    >
      <List>
        {revisions.map((revision, place) => {
          const earlier = revisions[place + 1];
          return (
            <li key={revision.number}>
              <div className="head">
                {revision.number === shown ? (
                  <b aria-current="true">Revision {revision.number}</b>
                ) : (
                  <Link to={billAddress(part.code, revision.number)}>Revision {revision.number}</Link>
                )}
                <Flag tone={tones[revision.status]}>{statusWords[revision.status]}</Flag>
                {earlier ? (
                  <Link to={compareAddress(part.code, earlier.number, revision.number)}>
                    what changed since {earlier.number}
                  </Link>
                ) : null}
              </div>
              <p>
                {revision.releasedAt
                  ? `released ${formatInstantShort(revision.releasedAt)}${revision.releasedBy ? ` by ${revision.releasedBy}` : ''}`
                  : `begun ${formatInstantShort(revision.createdAt)}${revision.createdBy ? ` by ${revision.createdBy}` : ''}`}
                , {formatCount(revision.lines, 'line')}
              </p>
              {revision.note ? <p>{revision.note}</p> : null}
            </li>
          );
        })}
      </List>
    </Sheet>
  );
}
