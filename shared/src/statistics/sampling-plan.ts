import { ArithmeticError } from '../errors/arithmetic-error.js';
import { requireCount } from './checks.js';
import {
  type AcceptanceQualityLimit,
  type CodeLetter,
  type InspectionLevel,
  acceptanceQualityLimits,
  acceptanceSequence,
  codeLetters,
  firstColumnZero,
  inspectionLevels,
  lotBands,
  sampleSizes,
} from './sampling-tables.js';

export interface SamplingPlan {
  /** Letter that the lot size gives. */
  readonly codeLetter: CodeLetter;
  /** Letter whose plan is used, after following the arrows. */
  readonly planLetter: CodeLetter;
  /** Pieces to inspect: the plan's sample, or the whole lot if that is no larger. */
  readonly sample: number;
  /** Accept the lot with at most this many nonconforming pieces. */
  readonly accept: number;
  /** Do not accept it with this many or more. */
  readonly reject: number;
  readonly inspectAll: boolean;
}

/**
 * Sample size code letter of a lot.
 *
 * @param lotSize pieces in the lot, at least 1
 * @param level inspection level
 * @returns the letter
 * @throws ArithmeticError `statistics_not_a_count`
 * @source ISO 2859-1:1999, Table 1; a lot of one piece, which the table leaves out, takes the first row
 */
export function codeLetterOf(lotSize: number, level: InspectionLevel = 'II'): CodeLetter {
  requireCount('lot size', lotSize, 1);
  const row = lotBands.find(([upTo]) => lotSize <= upTo)?.[1] ?? '';
  const letter = row[inspectionLevels.indexOf(level)];
  return codeLetters.find((each) => each === letter) ?? 'A';
}

/** What the table shows at a letter of a column. Outside the sequence the only plans lie the other way. */
function cellOf(letter: number, column: number): number | 'up' | 'down' {
  const place = letter - (firstColumnZero - column);
  if (place < 0) return 'down';
  return acceptanceSequence[place] ?? 'up';
}

/** Follows the arrows; one that points out of the table is turned round. */
function resolveArrows(letter: number, column: number): { readonly letter: number; readonly accept: number } {
  const walk = (from: number, step: 1 | -1): { readonly letter: number; readonly accept: number } | undefined => {
    for (let at = from; at >= 0 && at < codeLetters.length; at += step) {
      const cell = cellOf(at, column);
      if (typeof cell === 'number') return { letter: at, accept: cell };
    }
    return undefined;
  };
  const down = cellOf(letter, column) === 'down';
  return walk(letter, down ? 1 : -1) ?? walk(letter, down ? -1 : 1) ?? { letter, accept: 0 };
}

/**
 * Single sampling plan for normal inspection. Where the table shows an arrow, the plan it points to is used with its own
 * sample size.
 *
 * @param lotSize pieces in the lot, at least 1
 * @param limit acceptance quality limit in percent nonconforming, one of the preferred values from 0.010 to 10
 * @param level inspection level
 * @returns how many to inspect and how many nonconforming ones to accept
 * @throws ArithmeticError `statistics_not_a_count`, `statistics_no_such_aql`
 * @source ISO 2859-1:1999, Tables 1 and 2-A; columns outside 0.65 to 4.0 from memory
 */
export function samplingPlan(lotSize: number, limit: number, level: InspectionLevel = 'II'): SamplingPlan {
  const column = acceptanceQualityLimits.indexOf(limit as AcceptanceQualityLimit);
  if (column < 0) throw new ArithmeticError('statistics_no_such_aql', { aql: String(limit) });
  const codeLetter = codeLetterOf(lotSize, level);
  const { letter, accept } = resolveArrows(codeLetters.indexOf(codeLetter), column);
  const size = sampleSizes[letter] ?? lotSize;
  return {
    codeLetter,
    planLetter: codeLetters[letter] ?? codeLetter,
    sample: Math.min(size, lotSize),
    accept,
    reject: accept + 1,
    inspectAll: size >= lotSize,
  };
}

/**
 * After which lot normal inspection has to become tightened: two of five or fewer lots in a row were not accepted.
 *
 * @param accepted results of consecutive original lots on normal inspection, in order
 * @returns position of that lot counted from 1, or undefined
 * @source ISO 2859-1:1999, 9.3.1
 */
export function tightenedAfter(accepted: readonly boolean[]): number | undefined {
  const index = accepted.findIndex(
    (result, at) => !result && accepted.slice(Math.max(0, at - 4), at + 1).filter((each) => !each).length >= 2,
  );
  return index < 0 ? undefined : index + 1;
}
