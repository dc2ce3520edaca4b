import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { NavLink } from 'react-router-dom';
import type { StaffRole } from '../../lib/area';
import { areasFor, type Area } from '../areas';

const Areas = styled('nav')(({ theme }) => ({
  display: 'flex',
  gap: 22,
  '& a': {
    color: theme.vars.palette.tone.inkSoft,
    textDecoration: 'none',
    fontWeight: 500,
    lineHeight: '50px',
    borderTop: '3px solid transparent',
    borderBottom: '3px solid transparent',
  },
  '& a:hover': { color: theme.vars.palette.tone.ink },
  '& a[aria-current]': { color: theme.vars.palette.tone.ink, borderBottomColor: theme.vars.palette.tone.board },
  [theme.breakpoints.down('lg')]: { gap: 16 },
  [theme.breakpoints.down('md')]: { display: 'none' },
}));

export function AreaNav({ role }: { role: StaffRole }): ReactElement {
  return (
    <Areas aria-label="Areas">
      {areasFor(role).map(({ path, label }) => (
        <NavLink key={path} to={path}>
          {label}
        </NavLink>
      ))}
    </Areas>
  );
}

const Lists = styled('nav')(({ theme }) => ({
  display: 'flex',
  gap: 22,
  padding: '0 24px',
  overflowX: 'auto',
  background: theme.vars.palette.tone.sheet,
  borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  '& a': {
    color: theme.vars.palette.tone.inkSoft,
    textDecoration: 'none',
    whiteSpace: 'nowrap',
    padding: '10px 0',
    outlineOffset: -2,
  },
  '& a:hover': { color: theme.vars.palette.tone.ink },
  '& a[aria-current]': { color: theme.vars.palette.tone.ink, fontWeight: 500 },
  [theme.breakpoints.down('sm')]: { padding: '0 16px' },
}));

/** The lists of the area one is in, as a short line of links. */
export function SubLinks({ area, role }: { area: Area; role: StaffRole }): ReactElement | null {
  const links = area.links.filter(({ roles }) => !roles || roles.includes(role));
  if (links.length === 0) return null;
  return (
    <Lists aria-label={`In ${area.label}`}>
      {links.map(({ label, to }) => (
        <NavLink key={to} to={to} end={to === area.path}>
          {label}
        </NavLink>
      ))}
    </Lists>
  );
}
