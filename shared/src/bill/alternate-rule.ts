import { ArithmeticError, attempt } from '../errors/arithmetic-error.js';
import { convertMeasure } from '../measure/convert-measure.js';
import { type Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { unitOf } from '../measure/unit.js';

/** What a part says of itself: a number with its unit (none for a bare number), or a word. */
export type ParameterValue = { readonly number: DecimalInput; readonly unit?: string } | { readonly text: string };

export type PartParameters = ReadonlyMap<string, ParameterValue>;

/** One condition of a rule such as "drain-source voltage at least 30 V". All conditions of a rule must hold. */
export type RuleCondition =
  | {
      readonly parameter: string;
      readonly kind: 'at_least' | 'at_most';
      readonly value: DecimalInput;
      readonly unit?: string;
    }
  | {
      readonly parameter: string;
      readonly kind: 'between';
      readonly low: DecimalInput;
      readonly high: DecimalInput;
      readonly unit?: string;
    }
  | { readonly parameter: string; readonly kind: 'one_of'; readonly words: readonly string[] };

export type RefusalReason =
  'not_stated' | 'not_a_number' | 'not_a_word' | 'unit_does_not_fit' | 'too_low' | 'too_high' | 'other_word';

export interface Refusal {
  readonly parameter: string;
  readonly reason: RefusalReason;
  /** What the part says, as written; missing where it says nothing. */
  readonly found?: string;
  /** What the rule asks for, as written. */
  readonly wanted: string;
}

/**
 * Checks a part against a rule over parameters and says why it is refused.
 * Numbers are compared in the rule's unit, exactly; words without regard to case and surrounding spaces. A parameter
 * that the part does not state refuses it: unknown is never good enough.
 *
 * @param rule conditions that must all hold; a rule without conditions accepts nothing, since it asks nothing
 * @param parameters what the part states, by name
 * @returns every condition that fails, in the order of the rule; accepted when there is none
 * @throws ArithmeticError `bill_rule_broken` for a rule with an unknown unit, a value that is no number, no words, or
 *   bounds the wrong way round
 * Source: common practice, no source.
 */
export function checkAlternateRule(
  rule: readonly RuleCondition[],
  parameters: PartParameters,
): { readonly accepted: boolean; readonly refusals: readonly Refusal[] } {
  for (const condition of rule) checkCondition(condition);
  const refusals = rule.flatMap((condition) => refusalOf(condition, parameters.get(condition.parameter)) ?? []);
  return { accepted: rule.length > 0 && refusals.length === 0, refusals };
}

function refusalOf(condition: RuleCondition, stated: ParameterValue | undefined): Refusal | undefined {
  const { parameter } = condition;
  const wanted = wantedText(condition);
  if (stated === undefined) return { parameter, reason: 'not_stated', wanted };
  const found = statedText(stated);
  const reason = condition.kind === 'one_of' ? wordReason(condition.words, stated) : numberReason(condition, stated);
  return reason === undefined ? undefined : { parameter, reason, found, wanted };
}

function wordReason(words: readonly string[], stated: ParameterValue): RefusalReason | undefined {
  if (!('text' in stated)) return 'not_a_word';
  return words.some((word) => plain(word) === plain(stated.text)) ? undefined : 'other_word';
}

function numberReason(
  condition: Exclude<RuleCondition, { kind: 'one_of' }>,
  stated: ParameterValue,
): RefusalReason | undefined {
  if (!('number' in stated)) return 'not_a_number';
  const value = attempt(() => inUnit(stated.number, stated.unit, condition.unit));
  if (!value.ok) return value.fault.code.startsWith('measure_not') ? 'not_a_number' : 'unit_does_not_fit';
  const [low, high] = boundsOf(condition);
  if (low !== undefined && value.value.lessThan(low)) return 'too_low';
  return high !== undefined && value.value.greaterThan(high) ? 'too_high' : undefined;
}

/** A bare number goes only with a rule that names no unit either. */
function inUnit(value: DecimalInput, from: string | undefined, to: string | undefined): Decimal {
  if (from === undefined && to === undefined) return decimal(value);
  return convertMeasure(value, unitOf(from ?? ''), unitOf(to ?? ''));
}

function boundsOf(condition: Exclude<RuleCondition, { kind: 'one_of' }>): [Decimal | undefined, Decimal | undefined] {
  if (condition.kind === 'between') return [decimal(condition.low), decimal(condition.high)];
  const bound = decimal(condition.value);
  return condition.kind === 'at_least' ? [bound, undefined] : [undefined, bound];
}

function checkCondition(condition: RuleCondition): void {
  const sound = attempt(() => {
    if (condition.kind === 'one_of') return condition.words.length > 0;
    if (condition.unit !== undefined) unitOf(condition.unit);
    const [low, high] = boundsOf(condition);
    return low === undefined || high === undefined || low.lessThanOrEqualTo(high);
  });
  if (!sound.ok || !sound.value) {
    throw new ArithmeticError('bill_rule_broken', { parameter: condition.parameter, wanted: wantedText(condition) });
  }
}

function wantedText(condition: RuleCondition): string {
  if (condition.kind === 'one_of') return condition.words.join(' or ');
  const unit = condition.unit === undefined ? '' : ` ${condition.unit}`;
  if (condition.kind === 'between') return `${asText(condition.low)} to ${asText(condition.high)}${unit}`;
  return `at ${condition.kind === 'at_least' ? 'least' : 'most'} ${asText(condition.value)}${unit}`;
}

function statedText(stated: ParameterValue): string {
  if ('text' in stated) return stated.text;
  return stated.unit === undefined ? asText(stated.number) : `${asText(stated.number)} ${stated.unit}`;
}

function asText(value: DecimalInput): string {
  return typeof value === 'object' ? value.toFixed() : String(value);
}

function plain(word: string): string {
  return word.trim().toLowerCase();
}
