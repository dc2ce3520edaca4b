import { styled } from '@mui/material/styles';
import { useEffect, useRef, useState, type ReactElement } from 'react';
import { onNotice, type Notice } from '../../lib/notify';

const Stack = styled('div')(({ theme }) => ({
  position: 'fixed',
  zIndex: theme.zIndex.snackbar,
  left: 16,
  bottom: 16,
  display: 'grid',
  justifyItems: 'start',
  gap: 8,
  maxWidth: 'min(560px, calc(100vw - 32px))',
  '& > div': {
    display: 'flex',
    alignItems: 'center',
    gap: 14,
    padding: '8px 10px 8px 16px',
    border: `1px solid ${theme.vars.palette.tone.sound}`,
    borderRadius: 3,
    background: theme.vars.palette.tone.sheet,
    color: theme.vars.palette.tone.ink,
  },
  '& > [data-tone="hot"]': { borderColor: theme.vars.palette.tone.hot, background: theme.vars.palette.tone.hotSoft },
  '& > [data-tone="cool"]': { borderColor: theme.vars.palette.tone.cool },
  '& button': {
    border: 0,
    background: 'none',
    color: theme.vars.palette.tone.board,
    font: 'inherit',
    fontWeight: 500,
    minWidth: 32,
    minHeight: 32,
    cursor: 'pointer',
  },
}));

const glyphs: Record<Notice['tone'], string> = { sound: '✓', hot: '✕', cool: '◔' };
const most = 3;
const shownFor = 5000;
const shownWithAction = 12_000;

type Shown = Notice & { id: number };

/** What `notify` says, at the foot of the page: read out, and gone after a while unless something went wrong. */
export function Notices(): ReactElement {
  const [shown, setShown] = useState<readonly Shown[]>([]);
  const count = useRef(0);
  useEffect(
    () =>
      onNotice((notice) => {
        count.current += 1;
        const next = { ...notice, id: count.current };
        setShown((before) => [...before.filter(({ text }) => text !== notice.text), next].slice(-most));
      }),
    [],
  );
  const close = (id: number): void => setShown((before) => before.filter((notice) => notice.id !== id));
  return (
    <Stack role="log" aria-label="Notices">
      {shown.map((notice) => (
        <OneNotice key={notice.id} notice={notice} onClose={() => close(notice.id)} />
      ))}
    </Stack>
  );
}

function OneNotice({ notice, onClose }: { notice: Notice; onClose: () => void }): ReactElement {
  const { text, tone, action } = notice;
  const close = useRef(onClose);
  useEffect(() => {
    close.current = onClose;
  });
  useEffect(() => {
    // What went wrong stays until it is read.
    if (tone === 'hot') return undefined;
    const timer = setTimeout(() => close.current(), action ? shownWithAction : shownFor);
    return () => clearTimeout(timer);
  }, [tone, action]);
  return (
    <div data-tone={tone}>
      <span>
        <span aria-hidden="true">{glyphs[tone]} </span>
        {text}
      </span>
      {action ? (
        <button
          type="button"
          onClick={() => {
            action.run();
            onClose();
          }}
        >
          {action.label}
        </button>
      ) : null}
      <button type="button" aria-label="Close this message" onClick={onClose}>
        ✕
      </button>
    </div>
  );
}
