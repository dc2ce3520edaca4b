import { styled } from '@mui/material/styles';
import { useEffect, useId, useRef, useState, type ReactElement, type SyntheticEvent } from 'react';
import { createPortal } from 'react-dom';

interface Place {
  left: number;
  top: number;
}

const Card = styled('div')(({ theme }) => ({
  position: 'fixed',
  zIndex: theme.zIndex.tooltip,
  display: 'flex',
  alignItems: 'baseline',
  gap: 12,
  maxWidth: 'min(420px, calc(100vw - 24px))',
  padding: '6px 10px',
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  background: theme.vars.palette.tone.sheet,
  color: theme.vars.palette.tone.ink,
  fontSize: '0.8125rem',
  lineHeight: 1.4,
  '& button': {
    flex: 'none',
    padding: 0,
    border: 0,
    background: 'none',
    color: theme.vars.palette.tone.board,
    font: 'inherit',
    textDecoration: 'underline',
    cursor: 'pointer',
  },
}));

/** Long enough to reach the card with the pointer, as W3C WCAG 2.2 (1.4.13) asks of content shown on hover. */
const lingering = 150;

function placeUnder(element: Element): Place {
  const box = element.getBoundingClientRect();
  const below = window.innerHeight - box.bottom > 60;
  return {
    left: Math.max(12, Math.min(box.left, window.innerWidth - 432)),
    top: below ? box.bottom + 4 : box.top - 40,
  };
}

/**
 * One line about a thing, shown while the pointer or the focus is on it; Escape puts it away.
 * It hangs from the page's body, since a table's cells would cut it off.
 */
export function useHoverCard(story: string | undefined, acts: { onCopy: () => void; onPrint: () => void }) {
  const id = useId();
  const leaving = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const [place, setPlace] = useState<Place>();
  const open = place !== undefined && story !== undefined;
  const show = ({ currentTarget }: SyntheticEvent): void => {
    clearTimeout(leaving.current);
    if (story) setPlace(placeUnder(currentTarget));
  };
  const stay = (): void => clearTimeout(leaving.current);
  const hideSoon = (): void => {
    leaving.current = setTimeout(() => setPlace(undefined), lingering);
  };
  useEffect(() => {
    if (!open) return undefined;
    const close = (event: Event): void => {
      if (!(event instanceof KeyboardEvent) || event.key === 'Escape') setPlace(undefined);
    };
    document.addEventListener('keydown', close);
    window.addEventListener('scroll', close, true);
    return () => {
      document.removeEventListener('keydown', close);
      window.removeEventListener('scroll', close, true);
    };
  }, [open]);
  useEffect(() => () => clearTimeout(leaving.current), []);
  const card: ReactElement | null = open ? (
    <Card style={place} onMouseEnter={stay} onMouseLeave={hideSoon}>
      <span role="tooltip" id={id}>
        {story}
      </span>
      <button type="button" tabIndex={-1} title="Ctrl+C does the same" onClick={acts.onCopy}>
        Copy
      </button>
      <button type="button" tabIndex={-1} onClick={acts.onPrint}>
        Print
      </button>
    </Card>
  ) : null;
  const anchor = {
    onMouseEnter: show,
    onMouseLeave: hideSoon,
    onFocus: show,
    onBlur: hideSoon,
    'aria-describedby': open ? id : undefined,
  };
  return { anchor, card: card ? createPortal(card, document.body) : null };
}
