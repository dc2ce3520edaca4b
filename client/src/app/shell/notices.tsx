import Button from '@mui/material/Button';
import { styled } from '@mui/material/styles';
import { closeSnackbar, enqueueSnackbar, MaterialDesignContent, SnackbarProvider } from 'notistack';
import { useEffect, type ReactElement } from 'react';
import { onNotice, type Notice } from '../../lib/notify';

const Paper = styled(MaterialDesignContent)(({ theme }) => {
  const { tone } = theme.vars.palette;
  const base = {
    border: '1px solid',
    borderRadius: 3,
    boxShadow: 'none',
    fontFamily: theme.typography.fontFamily,
    fontSize: '0.9375rem',
  };
  return {
    '&.notistack-MuiContent-success': {
      ...base,
      backgroundColor: tone.sheet,
      color: tone.ink,
      borderColor: tone.sound,
    },
    '&.notistack-MuiContent-error': { ...base, backgroundColor: tone.hotSoft, color: tone.ink, borderColor: tone.hot },
    '&.notistack-MuiContent-info': { ...base, backgroundColor: tone.sheet, color: tone.ink, borderColor: tone.cool },
  };
});

const variants = { sound: 'success', hot: 'error', cool: 'info' } as const;
const glyphs = { success: '✓\u2002', error: '✕\u2002', info: '◔\u2002' };

function show({ text, tone, action }: Notice): void {
  enqueueSnackbar(text, {
    variant: variants[tone],
    // What went wrong, or can be undone, must not slip by.
    autoHideDuration: tone === 'hot' ? null : action ? 12_000 : 5000,
    action: (key) => (
      <>
        {action ? (
          <Button
            size="small"
            variant="text"
            onClick={() => {
              action.run();
              closeSnackbar(key);
            }}
          >
            {action.label}
          </Button>
        ) : null}
        <Button size="small" variant="text" onClick={() => closeSnackbar(key)} aria-label="Close this message">
          ✕
        </Button>
      </>
    ),
  });
}

/** Reads notices out at the foot of the page. */
export function Notices(): ReactElement {
  useEffect(() => onNotice(show), []);
  return (
    <SnackbarProvider
      maxSnack={3}
      iconVariant={glyphs}
      Components={{ success: Paper, error: Paper, info: Paper }}
      anchorOrigin={{ vertical: 'bottom', horizontal: 'left' }}
    />
  );
}
