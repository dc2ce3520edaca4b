import { mdiMenu } from '@mdi/js';
import IconButton from '@mui/material/IconButton';
import Menu from '@mui/material/Menu';
import MenuItem from '@mui/material/MenuItem';
import { useState, type ReactElement } from 'react';
import { Link, useLocation } from 'react-router-dom';
import { Icon } from '../../components/icon';
import type { StaffRole } from '../../lib/area';
import { areasFor } from '../areas';

/** The areas where the bar has no room for them. */
export function AreaMenu({ role }: { role: StaffRole }): ReactElement {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const { pathname } = useLocation();
  return (
    <>
      <IconButton
        aria-label="Areas"
        aria-haspopup="menu"
        aria-expanded={anchor !== null}
        onClick={(event) => setAnchor(event.currentTarget)}
        sx={{ display: { md: 'none' }, minWidth: 44, minHeight: 44, color: 'text.primary' }}
      >
        <Icon path={mdiMenu} size={24} />
      </IconButton>
      <Menu open={anchor !== null} anchorEl={anchor} onClose={() => setAnchor(null)}>
        {areasFor(role).map(({ path, label }) => (
          <MenuItem
            key={path}
            component={Link}
            to={path}
            selected={pathname.startsWith(path)}
            onClick={() => setAnchor(null)}
            sx={{ minHeight: 48, minWidth: 200 }}
          >
            {label}
          </MenuItem>
        ))}
      </Menu>
    </>
  );
}
