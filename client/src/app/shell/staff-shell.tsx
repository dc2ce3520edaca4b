import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Link, Outlet, useLocation } from 'react-router-dom';
import { usePerson } from '../../api/session';
import { areas, isStaff } from '../areas';
import { AreaMenu } from './area-menu';
import { AreaNav, SubLinks } from './area-nav';
import { FindField } from './find-field';
import { Notices } from './notices';
import { PersonMenu } from './person-menu';
import { SkipLink } from './skip-link';
import { Wordmark } from './wordmark';

const Bar = styled('header')(({ theme }) => ({
  display: 'flex',
  alignItems: 'center',
  gap: '0 28px',
  minHeight: 56,
  padding: '0 24px',
  background: theme.vars.palette.tone.sheet,
  borderBottom: `1px solid ${theme.vars.palette.tone.line}`,
  '& .home': { textDecoration: 'none', borderRadius: 3 },
  [theme.breakpoints.down('lg')]: { gap: '0 18px', padding: '0 16px' },
  [theme.breakpoints.down('sm')]: {
    flexWrap: 'wrap',
    paddingBottom: 10,
    gap: '0 10px',
    '& .home': { marginRight: 'auto' },
  },
}));

const Content = styled('main')(({ theme }) => ({
  padding: '26px 24px 64px',
  [theme.breakpoints.down('sm')]: { padding: '18px 16px 48px' },
}));

/** The frame of everything staff do: one bar, the lists of the area, the page. */
export function Component(): ReactElement | null {
  const person = usePerson();
  const { pathname } = useLocation();
  if (!person || !isStaff(person.role)) return null;
  const area = areas.find(({ path }) => pathname === path || pathname.startsWith(`${path}/`));
  return (
    <>
      <SkipLink />
      <Bar>
        <Link to="/today" className="home" aria-label="Emberlot, to Today">
          <Wordmark />
        </Link>
        <AreaNav role={person.role} />
        <FindField role={person.role} />
        <PersonMenu person={person} />
        <AreaMenu role={person.role} />
      </Bar>
      {area ? <SubLinks area={area} role={person.role} /> : null}
      <Content id="content" tabIndex={-1}>
        <Outlet />
      </Content>
      <Notices />
    </>
  );
}
