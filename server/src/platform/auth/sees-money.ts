import type { SignedInUser } from './signed-in-user.js';

/** Assemblers work without prices and costs; what they are sent holds none. */
export function seesMoney(person: Pick<SignedInUser, 'role'>): boolean {
  return person.role === 'owner' || person.role === 'accountant';
}
