import type { Components, Theme } from '@mui/material/styles';
import { fontHeading } from '../../lib/fonts';

/** The data grid drawn as a plain ruled table. Only the look: the grid itself is loaded by the screens that use it. */
export const gridLook: Components<Theme> = {
  MuiDataGrid: {
    styleOverrides: {
      root: ({ theme }) => ({
        border: `1px solid ${theme.vars.palette.tone.line}`,
        borderRadius: 0,
        fontSize: '0.9375rem',
        '--DataGrid-rowBorderColor': theme.vars.palette.tone.line,
        '& .MuiDataGrid-columnHeader': { backgroundColor: theme.vars.palette.tone.sheet },
        '& .MuiDataGrid-columnHeaderTitle': {
          fontFamily: fontHeading,
          fontWeight: 600,
          color: theme.vars.palette.tone.inkSoft,
        },
        '& .MuiDataGrid-columnHeaders [role="row"]': { borderBottom: `1px solid ${theme.vars.palette.tone.edge}` },
        '& .MuiDataGrid-columnSeparator': { color: theme.vars.palette.tone.line, opacity: 0 },
        '& .MuiDataGrid-columnHeaders:hover .MuiDataGrid-columnSeparator': { opacity: 1 },
        '& .MuiDataGrid-cell .text': { overflow: 'hidden', textOverflow: 'ellipsis' },
        '& .MuiDataGrid-cell': { display: 'flex', alignItems: 'center', gap: 8 },
        '& .MuiDataGrid-cell--textRight': { justifyContent: 'flex-end' },
        '& .MuiDataGrid-row': { cursor: 'pointer' },
        '& .MuiDataGrid-row:hover': { backgroundColor: theme.vars.palette.tone.boardSoft },
        '& .MuiDataGrid-cell:focus, & .MuiDataGrid-cell:focus-within, & .MuiDataGrid-columnHeader:focus, & .MuiDataGrid-columnHeader:focus-within':
          { outline: 'none' },
        '& .MuiDataGrid-cell:focus-visible, & .MuiDataGrid-columnHeader:focus-visible': {
          outline: `2px solid ${theme.vars.palette.tone.board}`,
          outlineOffset: -2,
        },
      }),
    },
  },
};
