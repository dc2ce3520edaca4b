import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';

const Pad = styled('fieldset')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    display: 'grid',
    gridTemplateColumns: 'repeat(4, minmax(56px, 1fr)) minmax(180px, 2fr)',
    gap: 8,
    margin: 'auto 0 0',
    padding: 0,
    border: 0,
    minWidth: 0,
    '& button': {
      minHeight: 60,
      border: `1px solid ${tone.edge}`,
      borderRadius: 3,
      background: tone.sheet,
      color: tone.ink,
      font: 'inherit',
      fontSize: '1.5rem',
      fontWeight: 500,
      cursor: 'pointer',
    },
    '& button:disabled': { color: tone.inkSoft, cursor: 'default' },
    '& button:focus-visible': { outline: `3px solid ${tone.board}`, outlineOffset: 2 },
    '& .wide': { gridColumn: 5, fontSize: '1.25rem' },
    '& .act': { background: tone.board, borderColor: tone.board, color: tone.onBoard },
    '& .act:disabled': { background: tone.line, borderColor: tone.line, color: tone.inkSoft },
    '& .warn': { borderColor: tone.tape, color: tone.tape, background: 'transparent' },
    [theme.breakpoints.down('sm')]: {
      gridTemplateColumns: 'repeat(4, 1fr)',
      '& .wide': { gridColumn: '1 / -1' },
    },
  };
});

const rows = [
  ['7', '8', '9', '.'],
  ['4', '5', '6', 'Backspace'],
  ['1', '2', '3', '0'],
] as const;

const faces: Partial<Record<string, string>> = { Backspace: '⌫' };
const names: Partial<Record<string, string>> = { Backspace: 'Take the last digit back', '.': 'Point' };

interface KeypadProps {
  /** Digits are pressed by hand, with gloves. */
  onKey: (key: string) => void;
  /** Keys are of no use for what stands in front. */
  idle: boolean;
  /** Beside the first, second and third row. */
  beside: readonly [ReactNode, ReactNode, ReactNode];
}

/** The keys keep their place whatever stands in front; pressing one leaves the focus where it was. */
export function Keypad({ onKey, idle, beside }: KeypadProps): ReactElement {
  return (
    <Pad aria-label="Keys">
      {rows.map((row, place) => [
        ...row.map((key) => (
          <button
            key={key}
            type="button"
            tabIndex={-1}
            disabled={idle}
            aria-label={names[key]}
            onMouseDown={(event) => event.preventDefault()}
            onClick={() => onKey(key)}
          >
            {faces[key] ?? key}
          </button>
        )),
        beside[place] ?? <span key={`beside-${row[0]}`} className="wide" />,
      ])}
    </Pad>
  );
}
