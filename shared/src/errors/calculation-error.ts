import type { CalculationCode } from './calculation-codes.js';

export type CalculationDetail = string | number | readonly string[];

/**
 * A calculation that refuses its input.
 * Callers decide by `code` and build a person's sentence from `details`; `message` is for the log.
 */
export class CalculationError extends Error {
  override readonly name = 'CalculationError';

  /**
   * @param code what is wrong, one of the codes of `calculation-codes`
   * @param message the fault in a plain sentence
   * @param details the values the sentence speaks of (part, line, quantity as text)
   */
  constructor(
    readonly code: CalculationCode,
    message: string,
    readonly details: Readonly<Record<string, CalculationDetail>> = {},
  ) {
    super(message);
  }
}
