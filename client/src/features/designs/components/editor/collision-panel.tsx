import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { DenseTable, type DenseColumn } from '../dense-table';
import type { Difference } from './differences';

const Panel = styled('section')(({ theme }) => ({
  padding: '16px 18px',
  border: `1px solid ${theme.vars.palette.tone.tape}`,
  background: theme.vars.palette.tone.tapeSoft,
  '& h2': { ...theme.typography.h2, margin: 0 },
  '& p': { margin: '4px 0 12px' },
  '& .acts': { display: 'flex', flexWrap: 'wrap', gap: 10, marginTop: 12 },
}));

const columns: readonly DenseColumn[] = [
  { key: 'what', title: 'Where' },
  { key: 'yours', title: 'Yours' },
  { key: 'theirs', title: 'Theirs' },
];

interface CollisionPanelProps {
  what: string;
  differences: readonly Difference[];
  onKeepYours: () => void;
  onTakeTheirs: () => void;
}

/** Somebody else saved first: both states side by side, and the choice between them. */
export function CollisionPanel({ what, differences, onKeepYours, onTakeTheirs }: CollisionPanelProps): ReactElement {
  return (
    <Panel aria-label="Changed meanwhile">
      <h2>Somebody saved {what} while you had it open</h2>
      <p>
        {differences.length === 0
          ? 'What they saved is the same as yours.'
          : 'Nothing of yours is lost. Look at where the two differ, then choose.'}
      </p>
      {differences.length > 0 ? (
        <DenseTable label="Where the two differ" columns={columns}>
          {differences.map(({ what: where, field, yours, theirs }) => (
            <tr key={`${where} ${field}`}>
              <td>
                {where}
                {field ? <span className="quiet"> {field}</span> : null}
              </td>
              <td>{yours}</td>
              <td>{theirs}</td>
            </tr>
          ))}
        </DenseTable>
      ) : null}
      <div className="acts">
        <Button type="submit" variant="contained" onClick={onKeepYours}>
          Keep yours, and save again
        </Button>
        <Button onClick={onTakeTheirs}>Take theirs</Button>
      </div>
    </Panel>
  );
}
