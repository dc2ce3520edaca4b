import { styled } from '@mui/material/styles';
import { useId, type ReactElement, type ReactNode } from 'react';

const Tape = styled('aside')(({ theme }) => ({
  position: 'relative',
  padding: '10px 14px 10px 24px',
  background: theme.vars.palette.tone.tapeSoft,
  color: theme.vars.palette.tone.ink,
  fontSize: '0.9375rem',
  '& > svg': {
    position: 'absolute',
    inset: '0 auto 0 0',
    width: 10,
    height: '100%',
    color: theme.vars.palette.tone.tape,
  },
  '& p': { margin: 0 },
  '& p + p': { marginTop: 4 },
}));

/** A safety text where the action is, edged with hatched tape. The words must be complete without the colour. */
export function Caution({ children, label = 'Caution' }: { children: ReactNode; label?: string }): ReactElement {
  const hatch = useId();
  return (
    <Tape role="note" aria-label={label}>
      <svg aria-hidden="true">
        <defs>
          <pattern id={hatch} width="12" height="12" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
            <rect width="6" height="12" fill="currentColor" />
          </pattern>
        </defs>
        <rect width="10" height="100%" fill={`url(#${hatch})`} />
      </svg>
      {children}
    </Tape>
  );
}
