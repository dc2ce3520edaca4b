import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';

export type Tone = 'hot' | 'tape' | 'cool' | 'sound';

const glyphs: Record<Tone, string> = { hot: '✕', tape: '△', cool: '◔', sound: '✓' };

const Box = styled('span')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    display: 'inline-flex',
    gap: 6,
    alignItems: 'center',
    padding: '0 8px',
    borderRadius: 3,
    fontSize: '0.8125rem',
    fontWeight: 500,
    lineHeight: '1.5rem',
    whiteSpace: 'nowrap',
    fontFamily: theme.typography.fontFamily,
    '&[data-tone="hot"]': { color: tone.hot, background: tone.hotSoft },
    '&[data-tone="tape"]': { color: tone.tape, background: tone.tapeSoft },
    '&[data-tone="cool"]': { color: tone.cool, background: tone.coolSoft },
    '&[data-tone="sound"]': { color: tone.sound, background: tone.soundSoft },
  };
});

interface FlagProps {
  tone: Tone;
  children: ReactNode;
  /** Another glyph than the tone's own; colour never stands alone. */
  glyph?: string;
}

/** A word that must be noticed: failed or late, needs attention, under way, sound. */
export function Flag({ tone, children, glyph = glyphs[tone] }: FlagProps): ReactElement {
  return (
    <Box data-tone={tone}>
      <span aria-hidden="true">{glyph}</span>
      {children}
    </Box>
  );
}
