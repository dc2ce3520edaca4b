import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, NavLink, Outlet } from 'react-router-dom';
import { sessionQuery } from '../../api/session';
import { useBasket } from '../../features/shop/basket';
import { plainLinks, shopLinks } from '../../features/shop/links';
import { isStaff } from '../areas';
import { Notices } from './notices';
import { SkipLink } from './skip-link';

const Top = styled('header')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: '4px 28px',
  minHeight: 72,
  padding: '10px 56px',
  '& a': { color: theme.vars.palette.tone.ink, textDecoration: 'none' },
  '& a:hover': { textDecoration: 'underline' },
  '& a[aria-current]': {
    textDecoration: 'underline',
    textDecorationColor: theme.vars.palette.tone.copper,
    textDecorationThickness: 2,
  },
  '& .shop': { fontFamily: theme.typography.h1.fontFamily, fontWeight: 600, fontSize: '1.25rem' },
  '& nav': { display: 'flex', flexWrap: 'wrap', gap: '4px 28px', marginLeft: 'auto' },
  '& nav a': { padding: '6px 0' },
  [theme.breakpoints.down('md')]: { padding: '10px 24px' },
  [theme.breakpoints.down('sm')]: { padding: '10px 16px', minHeight: 0, '& nav': { marginLeft: 0, gap: '0 18px' } },
}));

const Content = styled('main')(({ theme }) => ({
  padding: '20px 56px 56px',
  maxWidth: 1440,
  margin: '0 auto',
  [theme.breakpoints.down('md')]: { padding: '16px 24px 48px' },
  [theme.breakpoints.down('sm')]: { padding: '12px 16px 40px' },
}));

const Foot = styled('footer')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  gap: '6px 28px',
  padding: '18px 56px 32px',
  maxWidth: 1440,
  margin: '0 auto',
  borderTop: `1px solid ${theme.vars.palette.tone.line}`,
  color: theme.vars.palette.tone.inkSoft,
  '& nav': { display: 'flex', flexWrap: 'wrap', gap: '6px 28px' },
  '& a': { color: theme.vars.palette.tone.ink },
  [theme.breakpoints.down('md')]: { padding: '18px 24px 28px' },
  [theme.breakpoints.down('sm')]: { padding: '18px 16px 24px' },
}));

/** The storefront's own light frame: no grid, no menus, nothing a visitor would have to wait for. */
export function Component(): ReactElement {
  const session = useQuery(sessionQuery).data;
  const person = session?.person;
  const { count } = useBasket();
  return (
    <>
      <SkipLink />
      <Top>
        <Link to="/" className="shop">
          {session?.shop?.name ?? 'Shop'}
        </Link>
        <nav aria-label="Shop">
          {shopLinks.map(({ to, label }) => (
            <NavLink key={to} to={to}>
              {to === '/basket' && count > 0 ? `${label} (${count})` : label}
            </NavLink>
          ))}
          {person && isStaff(person.role) ? <NavLink to="/today">Workshop</NavLink> : null}
          {person ? <NavLink to="/profile">Profile</NavLink> : <NavLink to="/sign-in">Sign in</NavLink>}
        </nav>
      </Top>
      <Content id="content" tabIndex={-1}>
        <Outlet />
      </Content>
      <Foot>
        <nav aria-label="About the shop">
          {plainLinks.map(({ to, label }) => (
            <Link key={to} to={to}>
              {label}
            </Link>
          ))}
        </nav>
      </Foot>
      <Notices />
    </>
  );
}
