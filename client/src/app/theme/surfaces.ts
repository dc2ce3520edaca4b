import type { Components, Theme } from '@mui/material/styles';
import { fontText } from '../../lib/fonts';

/** Everything that lies on the page: no shadows and no gradients, a line instead. */
export const surfaces: Components<Theme> = {
  MuiCssBaseline: {
    styleOverrides: (theme) => ({
      html: { WebkitTextSizeAdjust: '100%' },
      body: {
        fontFamily: fontText,
        fontVariantNumeric: 'tabular-nums',
        overflowWrap: 'break-word',
      },
      'a:not([class])': { color: theme.vars.palette.tone.board, textUnderlineOffset: 3 },
      // Focus is always visible, also where a component takes the browser's ring away.
      ':focus-visible': { outline: `2px solid ${theme.vars.palette.tone.board}`, outlineOffset: 2 },
      'h1[tabindex="-1"]:focus, main[tabindex="-1"]:focus': { outline: 'none' },
      '@media (prefers-reduced-motion: reduce)': {
        '*, *::before, *::after': {
          animationDuration: '0.01ms !important',
          animationIterationCount: '1 !important',
          transitionDuration: '0.01ms !important',
          scrollBehavior: 'auto !important',
        },
      },
      '@media screen': { '[data-print-label]': { display: 'none' } },
      '@media print': {
        'body[data-printing="label"] > *:not([data-print-label])': { display: 'none !important' },
        body: { backgroundColor: '#fff !important' },
      },
    }),
  },
  MuiPaper: {
    defaultProps: { elevation: 0 },
    styleOverrides: { root: { backgroundImage: 'none' } },
  },
  MuiDialog: {
    styleOverrides: {
      paper: ({ theme }) => ({ border: `1px solid ${theme.vars.palette.tone.edge}`, backgroundImage: 'none' }),
    },
  },
  MuiDialogTitle: { styleOverrides: { root: ({ theme }) => ({ ...theme.typography.h2, padding: '18px 24px 6px' }) } },
  MuiDialogActions: { styleOverrides: { root: { padding: '12px 24px 20px', gap: 8, justifyContent: 'flex-start' } } },
  MuiPopover: {
    styleOverrides: { paper: ({ theme }) => ({ border: `1px solid ${theme.vars.palette.tone.edge}` }) },
  },
  MuiTooltip: {
    styleOverrides: {
      tooltip: ({ theme }) => ({
        backgroundColor: theme.vars.palette.tone.ink,
        color: theme.vars.palette.tone.canvas,
        fontSize: '0.8125rem',
        fontWeight: 400,
        borderRadius: 3,
      }),
    },
  },
  MuiBackdrop: {
    styleOverrides: { root: { '&:not(.MuiBackdrop-invisible)': { backgroundColor: 'rgba(10, 16, 13, 0.55)' } } },
  },
  MuiSkeleton: {
    defaultProps: { animation: false, variant: 'rectangular' },
    styleOverrides: { root: ({ theme }) => ({ backgroundColor: theme.vars.palette.tone.line, borderRadius: 3 }) },
  },
  MuiTableCell: {
    styleOverrides: {
      root: ({ theme }) => ({ borderBottomColor: theme.vars.palette.tone.line, padding: '7px 12px' }),
      head: ({ theme }) => ({
        ...theme.typography.h3,
        color: theme.vars.palette.tone.inkSoft,
        borderBottomColor: theme.vars.palette.tone.edge,
      }),
    },
  },
};
