import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import type { Batch } from '../../api/bench';
import type { Front, Item, ShownReading } from './in-hand';

const List = styled('ol')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    listStyle: 'none',
    margin: '0 0 18px',
    padding: 0,
    '& button': {
      display: 'flex',
      justifyContent: 'space-between',
      alignItems: 'center',
      gap: 12,
      width: '100%',
      minHeight: 48,
      padding: '4px 0',
      border: 0,
      borderBottom: `1px solid ${tone.line}`,
      background: 'transparent',
      color: tone.inkSoft,
      font: 'inherit',
      fontSize: '0.9375rem',
      textAlign: 'left',
      cursor: 'pointer',
    },
    '& button[data-done]': { color: tone.ink },
    '& button[aria-current]': { color: tone.board, fontWeight: 700 },
    '& button:focus-visible': { outline: `3px solid ${tone.board}` },
    '& code': { fontFamily: theme.typography.mono.fontFamily, whiteSpace: 'nowrap' },
    '& [data-verdict="within"]': { color: tone.sound },
    '& [data-verdict="outside"]': { color: tone.hot },
  };
});

interface SideListProps {
  batch: Batch;
  serial: string;
  shown: ReadonlyMap<number, ShownReading>;
  front: Front;
  onChoose: (item: Item) => void;
}

/** Everything that is done to a unit, in order; each line can be brought in front. */
export function SideList({ batch, serial, shown, front, onChoose }: SideListProps): ReactElement {
  const isFront = (kind: Item['kind'], position: number): 'true' | undefined =>
    front.kind === kind && front.position === position ? 'true' : undefined;
  return (
    <>
      <h2>Steps</h2>
      <List aria-label="Steps">
        {batch.steps.map(({ position, title, doneOn }) => (
          <li key={position}>
            <button
              type="button"
              data-done={doneOn.includes(serial) ? '' : undefined}
              aria-current={isFront('step', position)}
              onClick={() => onChoose({ kind: 'step', position })}
            >
              <span>{title}</span>
              {doneOn.includes(serial) ? <code data-verdict="within">✓ done</code> : null}
            </button>
          </li>
        ))}
      </List>
      <h2>Readings</h2>
      <List aria-label="Readings">
        {batch.testPlan.map(({ position, name, unit }) => {
          const reading = shown.get(position);
          return (
            <li key={position}>
              <button
                type="button"
                data-done={reading ? '' : undefined}
                aria-current={isFront('reading', position)}
                onClick={() => onChoose({ kind: 'reading', position })}
              >
                <span>{name}</span>
                {reading ? (
                  <code data-verdict={reading.verdict}>
                    {reading.verdict === 'outside' ? '✕' : '✓'} {reading.text} {unit}
                  </code>
                ) : null}
              </button>
            </li>
          );
        })}
      </List>
    </>
  );
}
