import type { StaffRole } from '../../../lib/area';

export const roleChoices: readonly { value: StaffRole; label: string; hint: string }[] = [
  { value: 'owner', label: 'Owner', hint: 'Sees and decides everything.' },
  { value: 'assembler', label: 'Assembler', hint: 'Builds, measures, counts and packs; sees no prices.' },
  { value: 'accountant', label: 'Accountant', hint: 'Keeps the books; reads the rest.' },
];

export function roleLabel(role: string | null): string {
  return roleChoices.find(({ value }) => value === role)?.label ?? (role === 'customer' ? 'Customer' : '');
}
