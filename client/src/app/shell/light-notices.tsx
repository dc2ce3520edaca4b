import { styled } from '@mui/material/styles';
import { useEffect, useState, type ReactElement } from 'react';
import { onNotice, type Notice } from '../../lib/notify';

const Line = styled('output')(({ theme }) => ({
  position: 'fixed',
  left: 16,
  bottom: 16,
  maxWidth: 'calc(100vw - 32px)',
  display: 'flex',
  alignItems: 'center',
  gap: 14,
  padding: '10px 16px',
  border: `1px solid ${theme.vars.palette.tone.sound}`,
  borderRadius: 3,
  background: theme.vars.palette.tone.sheet,
  '&:empty': { display: 'none' },
  '&[data-tone="hot"]': { borderColor: theme.vars.palette.tone.hot, background: theme.vars.palette.tone.hotSoft },
  '& button': {
    border: 0,
    background: 'none',
    color: theme.vars.palette.tone.board,
    font: 'inherit',
    fontWeight: 500,
    minHeight: 32,
    cursor: 'pointer',
  },
}));

const shownFor = 6000;

/** Notices without a library: one at a time, read out, gone after a while unless something went wrong. */
export function LightNotices(): ReactElement {
  const [notice, setNotice] = useState<Notice>();
  useEffect(() => onNotice(setNotice), []);
  useEffect(() => {
    if (!notice || notice.tone === 'hot') return undefined;
    const timer = setTimeout(() => setNotice(undefined), shownFor);
    return () => clearTimeout(timer);
  }, [notice]);
  return (
    <Line data-tone={notice?.tone}>
      {notice ? (
        <>
          <span>
            <span aria-hidden="true">{notice.tone === 'hot' ? '✕ ' : '✓ '}</span>
            {notice.text}
          </span>
          {notice.action ? (
            <button
              type="button"
              onClick={() => {
                notice.action?.run();
                setNotice(undefined);
              }}
            >
              {notice.action.label}
            </button>
          ) : null}
          <button type="button" aria-label="Close this message" onClick={() => setNotice(undefined)}>
            ✕
          </button>
        </>
      ) : null}
    </Line>
  );
}
