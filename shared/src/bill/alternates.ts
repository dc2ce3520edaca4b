import { Decimal, type DecimalInput } from '../measure/decimal.js';
import { type BillLine, type PartKey, alternatesInOrder, quantityFrom } from './bill-lines.js';
import { type PartParameters, type Refusal, type RuleCondition, checkAlternateRule } from './alternate-rule.js';

/** A part that could be taken, as it is now. */
export interface Candidate {
  readonly part: PartKey;
  /** What is free of it, in its stock unit. */
  readonly available: DecimalInput;
  readonly parameters: PartParameters;
  /** Set where it must not be used, for instance because it is held; it is then refused whatever the rule says. */
  readonly blocked?: string;
}

export type Standing = 'own' | 'named' | 'by_rule';

export interface JudgedCandidate {
  readonly part: PartKey;
  readonly standing: Standing;
  readonly allowed: boolean;
  /** Why not, where the rule refuses it. */
  readonly refusals: readonly Refusal[];
  readonly blocked?: string;
  /** What to take of it, in its stock unit. */
  readonly take: Decimal;
}

export interface ChosenAlternates {
  /** In the order in which they are taken: own part, named ones by priority, those the rule allows, then the refused. */
  readonly candidates: readonly JudgedCandidate[];
  /** What of the need is left, in the stock unit of the line's own part. */
  readonly short: Decimal;
}

/**
 * Chooses what to take for one line: its own part first, then named alternates by priority, then parts that the line's
 * rule allows, in the order given; each as far as it goes. Refused ones are listed with the reasons.
 * (How much can be built when several lines want the same parts is the question of `buildable`, not of this.)
 *
 * @param line the bill's line
 * @param need how much of its own part is needed, in that part's stock unit
 * @param rule the line's rule over parameters; none allows none
 * @param candidates the parts that may come into question; those the line does not name are judged by the rule
 * @throws ArithmeticError `bill_quantity_negative`, `bill_rule_broken`
 * Source: common practice, no source.
 */
export function chooseAlternates(
  line: BillLine,
  need: DecimalInput,
  rule: readonly RuleCondition[],
  candidates: readonly Candidate[],
): ChosenAlternates {
  const named = alternatesInOrder(line);
  const rank = new Map([line.part, ...named.map(({ part }) => part)].map((part, index) => [part, index]));
  const factors = new Map(named.map(({ part, factor }) => [part, factor]));
  const rankOf = ({ part }: { part: PartKey }): number => rank.get(part) ?? rank.size;
  const judged = candidates
    .map((candidate) => judge(candidate, line, rule, rank.has(candidate.part)))
    .toSorted((a, b) => Number(b.allowed) - Number(a.allowed) || rankOf(a) - rankOf(b));
  let short = quantityFrom(need, 'need');
  const taken = judged.map(({ available, ...candidate }) => {
    const factor = factors.get(candidate.part) ?? new Decimal(1);
    const take = candidate.allowed ? Decimal.min(short.times(factor), available) : new Decimal(0);
    short = take.equals(short.times(factor)) ? new Decimal(0) : short.minus(take.div(factor));
    return { ...candidate, take };
  });
  return { candidates: taken, short };
}

function judge(
  candidate: Candidate,
  line: BillLine,
  rule: readonly RuleCondition[],
  isNamed: boolean,
): Omit<JudgedCandidate, 'take'> & { readonly available: Decimal } {
  const { part, blocked } = candidate;
  const standing = part === line.part ? 'own' : isNamed ? 'named' : 'by_rule';
  const { accepted, refusals } = isNamed
    ? { accepted: true, refusals: [] }
    : checkAlternateRule(rule, candidate.parameters);
  const available = quantityFrom(candidate.available, `stock of ${part}`);
  const allowed = accepted && blocked === undefined;
  return { part, standing, allowed, refusals, available, ...(blocked !== undefined && { blocked }) };
}
