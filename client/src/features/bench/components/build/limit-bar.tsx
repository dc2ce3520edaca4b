import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { formatReading } from '../../../../lib/format-quantity';
import type { Characteristic } from '../../api/bench';

const Bar = styled('div')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    position: 'relative',
    height: 72,
    '& i': { position: 'absolute', top: 16, height: 14 },
    '& .out': { left: 0, right: 0, background: tone.hotSoft, borderRadius: 3 },
    '& .in': {
      background: tone.soundSoft,
      borderLeft: `2px solid ${tone.sound}`,
      borderRight: `2px solid ${tone.sound}`,
    },
    '& .in[data-open="lower"]': { borderLeft: 0 },
    '& .in[data-open="upper"]': { borderRight: 0 },
    '& .mark': { top: 0, width: 4, height: 46, marginLeft: -2, background: tone.ink },
    '& span': {
      position: 'absolute',
      top: 40,
      transform: 'translateX(-50%)',
      fontFamily: theme.typography.mono.fontFamily,
      fontSize: '0.9375rem',
      color: tone.inkSoft,
      whiteSpace: 'nowrap',
    },
  };
});

/** Where limits stand on the bar, in percent of its width. */
const [lowerAt, upperAt] = [18, 80];

function placeOf(value: number, { lowerLimit, upperLimit }: Characteristic): number {
  const lower = lowerLimit === null ? undefined : Number(lowerLimit);
  const upper = upperLimit === null ? undefined : Number(upperLimit);
  const known = lower ?? upper ?? 0;
  const width = lower !== undefined && upper !== undefined ? upper - lower : Math.abs(known) || 1;
  const share =
    lower === undefined ? upperAt + ((value - known) / width) * 62 : lowerAt + ((value - lower) / width) * 62;
  return Math.min(99, Math.max(1, share));
}

/** The allowed range with its limits, and where the reading lies. For the eye; the words beside it say the same. */
export function LimitBar({ characteristic, value }: { characteristic: Characteristic; value: string }): ReactElement {
  const { lowerLimit, upperLimit, unit } = characteristic;
  const number = Number(value);
  const shown = value !== '' && Number.isFinite(number);
  const from = lowerLimit === null ? 0 : lowerAt;
  const to = upperLimit === null ? 100 : upperAt;
  const open = lowerLimit === null ? 'lower' : upperLimit === null ? 'upper' : undefined;
  return (
    <Bar aria-hidden="true">
      <i className="out" />
      <i className="in" data-open={open} style={{ left: `${from}%`, width: `${to - from}%` }} />
      {lowerLimit === null ? null : (
        <span style={{ left: `${lowerAt}%` }}>{formatReading(lowerLimit, unit ?? undefined)}</span>
      )}
      {upperLimit === null ? null : (
        <span style={{ left: `${upperAt}%` }}>{formatReading(upperLimit, unit ?? undefined)}</span>
      )}
      {shown ? <i className="mark" style={{ left: `${placeOf(number, characteristic)}%` }} /> : null}
    </Bar>
  );
}
