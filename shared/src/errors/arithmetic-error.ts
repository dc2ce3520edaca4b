import { arithmeticFaults, type ArithmeticFault } from './arithmetic-faults.js';

export type FaultDetails = Readonly<Record<string, string | number>>;

/**
 * What every function of `shared` throws when it is asked for something that has no right answer.
 *
 * A screen decides by `code`, shows `message` (the sentence of the fault's table with the details filled in) and may
 * point to the place with `details`. Nothing else is thrown on purpose: any other error is a mistake of ours.
 */
export class ArithmeticError extends Error {
  override readonly name = 'ArithmeticError';
  readonly code: ArithmeticFault;
  readonly details: FaultDetails;

  constructor(code: ArithmeticFault, details: FaultDetails = {}) {
    super(faultSentence(code, details));
    this.code = code;
    this.details = details;
  }
}

/**
 * The sentence of a fault with its details filled in.
 *
 * @param code the fault
 * @param details values for the `{names}` in the fault's sentence; a name without a value stays as it is
 * @returns one plain sentence
 */
export function faultSentence(code: ArithmeticFault, details: FaultDetails = {}): string {
  return arithmeticFaults[code].replace(/\{(\w+)\}/g, (whole, name: string) => String(details[name] ?? whole));
}

export type Attempt<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly fault: ArithmeticError };

/**
 * Runs a computation and hands its fault back as a value, for callers that show it rather than stop (forms, imports).
 *
 * @param compute the computation
 * @returns the value, or the {@link ArithmeticError}
 * @throws whatever else `compute` throws, unchanged
 */
export function attempt<T>(compute: () => T): Attempt<T> {
  try {
    return { ok: true, value: compute() };
  } catch (error) {
    if (error instanceof ArithmeticError) return { ok: false, fault: error };
    throw error;
  }
}
