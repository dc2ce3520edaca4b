import type { Components, Theme } from '@mui/material/styles';

/** Everything that is pressed or typed into. */
export const controls: Components<Theme> = {
  MuiButtonBase: {
    defaultProps: { disableRipple: true },
    styleOverrides: {
      root: ({ theme }) => ({
        '&.Mui-focusVisible': { outline: `2px solid ${theme.vars.palette.tone.board}`, outlineOffset: 2 },
      }),
    },
  },
  MuiButton: {
    defaultProps: { disableElevation: true, variant: 'outlined' },
    styleOverrides: {
      root: { padding: '8px 18px', minWidth: 0, borderWidth: 1, borderStyle: 'solid', borderColor: 'transparent' },
      sizeSmall: { padding: '3px 12px' },
      sizeLarge: { padding: '12px 34px', fontSize: '1.125rem' },
      contained: { borderColor: 'currentColor' },
      outlined: { borderColor: 'currentColor' },
    },
    variants: [
      {
        props: { variant: 'contained', color: 'primary' },
        style: ({ theme }) => ({
          borderColor: theme.vars.palette.tone.board,
          '&:hover': { backgroundColor: theme.vars.palette.tone.board, filter: 'brightness(0.92)' },
        }),
      },
    ],
  },
  MuiIconButton: { styleOverrides: { root: { borderRadius: 3 } } },
  MuiLink: { defaultProps: { underline: 'always' }, styleOverrides: { root: { textUnderlineOffset: 3 } } },
  MuiOutlinedInput: {
    styleOverrides: {
      root: ({ theme }) => ({
        backgroundColor: theme.vars.palette.tone.sheet,
        '& .MuiOutlinedInput-notchedOutline': { borderColor: theme.vars.palette.tone.edge },
        '&:hover:not(.Mui-error) .MuiOutlinedInput-notchedOutline': { borderColor: theme.vars.palette.tone.ink },
        '&.Mui-disabled': { backgroundColor: theme.vars.palette.tone.canvas },
      }),
      input: { padding: '9px 12px', height: 'auto', '&:focus-visible': { outline: 'none' } },
      multiline: { padding: 0 },
      notchedOutline: { top: 0, '& legend': { display: 'none' } },
    },
  },
  MuiFormLabel: {
    styleOverrides: {
      root: ({ theme }) => ({ color: theme.vars.palette.tone.ink, fontWeight: 500, fontSize: '0.9375rem' }),
    },
  },
  MuiFormHelperText: {
    styleOverrides: { root: { margin: '4px 0 0', fontSize: '0.8125rem' } },
  },
  MuiMenuItem: { styleOverrides: { root: { fontSize: '0.9375rem', minHeight: 40 } } },
  MuiChip: { styleOverrides: { root: { borderRadius: 3 } } },
};
