import { ahead } from '../features/ahead/area';
import { bench } from '../features/bench/area';
import { books } from '../features/books/area';
import { counter } from '../features/counter/area';
import { designs } from '../features/designs/area';
import { setup } from '../features/setup/area';
import { shelf } from '../features/shelf/area';
import { today } from '../features/today/area';
import type { Role } from '../api/session';
import type { AreaParts, StaffRole } from '../lib/area';

export interface Area extends AreaParts {
  path: string;
  label: string;
  roles: readonly StaffRole[];
}

const everyone: readonly StaffRole[] = ['owner', 'assembler', 'accountant'];

/** The areas of the staff shell and who may enter; what a role may do inside is the server's to decide. */
export const areas: readonly Area[] = [
  { path: '/today', label: 'Today', roles: everyone, ...today },
  { path: '/shelf', label: 'Shelf', roles: everyone, ...shelf },
  { path: '/designs', label: 'Designs', roles: ['owner', 'assembler'], ...designs },
  { path: '/ahead', label: 'Ahead', roles: everyone, ...ahead },
  { path: '/bench', label: 'Bench', roles: ['owner', 'assembler'], ...bench },
  { path: '/counter', label: 'Counter', roles: everyone, ...counter },
  { path: '/books', label: 'Books', roles: ['owner', 'accountant'], ...books },
  { path: '/setup', label: 'Set-up', roles: ['owner', 'accountant'], ...setup },
];

export function isStaff(role: Role): role is StaffRole {
  return role !== 'customer';
}

/** The areas a role may enter, leaving out those that have no page. */
export function areasFor(role: StaffRole): readonly Area[] {
  return areas.filter((area) => area.roles.includes(role) && area.routes.length > 0);
}
