import type { FieldErrors, FieldValues, Path, UseFormReturn } from 'react-hook-form';
import type { ApiProblem, FieldFault } from '../../lib/problem';

/** `/lines/0/quantity` as react-hook-form names it: `lines.0.quantity` (JSON pointer, RFC 6901). */
export function fieldOfPointer(pointer: string): string {
  return pointer
    .replace(/^#?\//, '')
    .split('/')
    .map((step) => step.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}

/**
 * Puts the server's faults on their fields.
 * @returns those that belong to no field of the form, for the summary
 */
export function placeFaults<Values extends FieldValues>(
  form: UseFormReturn<Values>,
  problem: ApiProblem,
  fields: { has: (name: string) => boolean },
): readonly FieldFault[] {
  const homeless: FieldFault[] = [];
  for (const fault of problem.errors) {
    const field = fieldOfPointer(fault.pointer);
    if (fields.has(field)) form.setError(field as Path<Values>, { type: 'server', message: fault.detail });
    else homeless.push(fault);
  }
  return homeless;
}

export interface NamedFault {
  field: string;
  message: string;
}

/** Every fault of a form as one list, in the order of the fields. */
export function faultsOf(errors: FieldErrors, before = ''): readonly NamedFault[] {
  return Object.entries(errors).flatMap(([name, error]): readonly NamedFault[] => {
    if (!error || name === 'root') return [];
    const field = before + name;
    if (typeof error.message === 'string') return [{ field, message: error.message }];
    return faultsOf(error as FieldErrors, `${field}.`);
  });
}
