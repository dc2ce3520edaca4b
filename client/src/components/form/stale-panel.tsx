import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { use, type ReactElement } from 'react';
import { FormFieldsContext } from './field-names';

const Box = styled('div')(({ theme }) => ({
  padding: '12px 16px',
  border: `1px solid ${theme.vars.palette.tone.tape}`,
  borderLeftWidth: 4,
  background: theme.vars.palette.tone.tapeSoft,
  color: theme.vars.palette.tone.ink,
  '& p': { margin: 0, fontWeight: 500 },
  '& dl': { margin: '8px 0' },
  '& dt': { fontWeight: 500, marginTop: 6 },
  '& dd': { margin: 0 },
  '& .acts': { display: 'flex', flexWrap: 'wrap', gap: 10, marginTop: 10 },
}));

type Values = Readonly<Record<string, unknown>>;

interface StalePanelProps {
  /** What the server has now. */
  theirs: Values;
  /** What is typed here. */
  mine: Values;
  onTakeTheirs: () => void;
  onKeepMine: () => void;
}

function words(value: unknown): string {
  if (value === null || value === undefined || value === '') return 'nothing';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return typeof value === 'string' || typeof value === 'number' ? String(value) : JSON.stringify(value);
}

/** Somebody else kept another state meanwhile: both are shown, and the person decides. */
export function StalePanel({ theirs, mine, onTakeTheirs, onKeepMine }: StalePanelProps): ReactElement {
  const { names } = use(FormFieldsContext);
  const differing = [...names].filter(([name]) => words(theirs[name]) !== words(mine[name]));
  return (
    <Box role="alert">
      <p>△ Somebody else changed this while you were typing</p>
      {differing.length === 0 ? <div>What they kept is the same as what stands here.</div> : null}
      <dl>
        {differing.map(([name, label]) => (
          <div key={name}>
            <dt>{label}</dt>
            <dd>
              There it is {words(theirs[name])}; here it is {words(mine[name])}.
            </dd>
          </div>
        ))}
      </dl>
      <div className="acts">
        <Button size="small" onClick={onKeepMine}>
          Keep mine
        </Button>
        <Button size="small" onClick={onTakeTheirs}>
          Take theirs
        </Button>
      </div>
    </Box>
  );
}
