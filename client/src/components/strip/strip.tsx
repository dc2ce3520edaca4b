import { styled } from '@mui/material/styles';
import { useRef, useState, type KeyboardEvent, type ReactElement } from 'react';
import { rovingTarget } from '../../lib/keyboard';
import { cellSentence, stripSentence, verdictGlyph, type StripUnit } from './strip-words';

interface StripProps {
  /** What the strip belongs to, for its sentence: `Batch B-117`. */
  label: string;
  units: readonly StripUnit[];
  /** Serial of the unit in hand. */
  current?: string;
  size?: 'normal' | 'bench';
  /** Opens a unit; without it the cells can still be walked and read. */
  onOpen?: (serial: string) => void;
}

const Row = styled('div')({ display: 'flex', flexWrap: 'wrap', gap: 3, alignItems: 'flex-end' });

const Cell = styled('button')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    position: 'relative',
    width: '1.375rem',
    height: '2.25rem',
    padding: 0,
    border: `1px solid ${tone.edge}`,
    borderRadius: 2,
    background: tone.sheet,
    color: tone.ink,
    font: 'inherit',
    fontWeight: 700,
    fontSize: '0.8125rem',
    lineHeight: '1rem',
    cursor: 'default',
    overflow: 'hidden',
    '&[data-opens]': { cursor: 'pointer' },
    '&[data-size="bench"]': { width: 38, height: 52, minWidth: 38, fontSize: '1.125rem', lineHeight: '26px' },
    '& i': {
      position: 'absolute',
      inset: 'auto 0 0 0',
      background: tone.boardSoft,
      borderTop: `2px solid ${tone.board}`,
    },
    '& i[data-level="0"]': { borderTop: 0 },
    '& span': { position: 'absolute', inset: '1px 0 auto 0' },
    '&[data-verdict="passed"]': { color: tone.sound, '& i': { background: tone.soundSoft, borderColor: tone.sound } },
    '&[data-verdict="failed"]': {
      color: tone.hot,
      borderColor: tone.hot,
      '& i': { background: tone.hotSoft, borderColor: tone.hot },
    },
    '&[data-verdict="rework"]': {
      color: tone.tape,
      borderColor: tone.tape,
      '& i': { background: tone.tapeSoft, borderTop: 0 },
    },
    '&[data-verdict="scrapped"]': { color: tone.inkSoft, '& i': { background: tone.line, borderColor: tone.inkSoft } },
    '& i[data-level="1"]': { borderTop: 0 },
    '&[aria-current]': { outline: `2px solid ${tone.board}`, outlineOffset: 2 },
    '&:focus-visible': { outline: `3px solid ${tone.board}`, outlineOffset: 2 },
  };
});

/** A batch as a row of cells, one per unit, filled from the bottom as its steps are done. */
export function Strip({ label, units, current, size = 'normal', onOpen }: StripProps): ReactElement {
  const [focused, setFocused] = useState(() =>
    Math.max(
      0,
      units.findIndex((unit) => unit.serial === current),
    ),
  );
  const row = useRef<HTMLDivElement>(null);
  const onKeyDown = (event: KeyboardEvent): void => {
    const next = rovingTarget(event.key, focused, units.length);
    if (next === undefined) return;
    event.preventDefault();
    setFocused(next);
    row.current?.querySelectorAll('button')[next]?.focus();
  };
  const tabStop = Math.min(focused, units.length - 1);
  return (
    <Row ref={row} role="toolbar" aria-label={stripSentence(label, units)} onKeyDown={onKeyDown} data-strip="">
      {units.map((unit, place) => (
        <Cell
          key={unit.serial}
          type="button"
          tabIndex={place === tabStop ? 0 : -1}
          title={cellSentence(unit)}
          aria-label={cellSentence(unit)}
          aria-current={unit.serial === current ? 'true' : undefined}
          data-verdict={unit.verdict}
          data-size={size}
          data-opens={onOpen ? '' : undefined}
          onFocus={() => setFocused(place)}
          onClick={() => onOpen?.(unit.serial)}
        >
          <i data-level={levelOf(unit)} style={{ height: `${Math.round(levelOf(unit) * 100)}%` }} />
          {verdictGlyph[unit.verdict] ? <span>{verdictGlyph[unit.verdict]}</span> : null}
        </Cell>
      ))}
    </Row>
  );
}

function levelOf({ stepsDone, stepsTotal, verdict }: StripUnit): number {
  if (verdict === 'passed' || verdict === 'failed' || verdict === 'scrapped') return 1;
  return stepsTotal > 0 ? Math.min(1, stepsDone / stepsTotal) : 0;
}
