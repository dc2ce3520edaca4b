export const roles = ['owner', 'assembler', 'accountant', 'customer'] as const;

export type Role = (typeof roles)[number];

export const staffRoles = ['owner', 'assembler', 'accountant'] as const satisfies readonly Role[];

/** Who sent the request, read from the database for each one, so that a change of role takes effect at once. */
export interface SignedInUser {
  readonly id: number;
  readonly role: Role;
  readonly name: string;
  readonly email: string;
  /** Whose orders, units and invoices they see; none for staff. */
  readonly customerId: number | null;
}
