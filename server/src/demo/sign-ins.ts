import type { Role } from '../platform/auth/signed-in-user.js';

interface DemoSignIn {
  readonly role: Role;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/** The people of the demo, one of each role. The start command prints them; a real shop has its own. */
export const demoSignIns: readonly [DemoSignIn, ...DemoSignIn[]] = [
  { role: 'owner', name: 'The owner', email: 'owner@fernhollow.example', password: 'amber tape on every box' },
  {
    role: 'assembler',
    name: 'The assembler',
    email: 'assembler@fernhollow.example',
    password: 'eight strands side by side',
  },
  {
    role: 'accountant',
    name: 'The accountant',
    email: 'accountant@fernhollow.example',
    password: 'debit equals credit always',
  },
  {
    role: 'customer',
    name: 'A customer',
    email: 'customer@fernhollow.example',
    password: 'a warm tip in three seconds',
  },
];
