import type { LithiumContent, TransportMode } from './lithium-parcel.js';
import type { LithiumEdition, LithiumRule, SizeLimits } from './lithium-rules.js';

/** Why the answer is what it is; each has its sentence in `lithium-words`. */
export type LithiumReasonCode =
  | 'no_edition_on_record'
  | 'letter_post'
  | 'damaged'
  | 'recalled'
  | 'faulty'
  | 'for_disposal'
  | 'loose_cells_in_kit'
  | 'design_not_tested'
  | 'watt_hours_not_on_case'
  | 'mixed_placements'
  | 'mixed_chemistries'
  | 'within_small_limits'
  | 'above_small_limits'
  | 'not_on_passenger_aircraft'
  | 'over_net_mass'
  | 'over_gross_mass'
  | 'more_than_needed_sets'
  | 'charge_above_limit';

/** What nobody has said yet and the answer hangs on. */
export type LithiumMissingCode =
  | 'contents'
  | 'mode'
  | 'day'
  | 'parcels_in_consignment'
  | 'gross_mass'
  | 'chemistry'
  | 'form'
  | 'placement'
  | 'condition'
  | 'design_test'
  | 'count'
  | 'watt_hours'
  | 'lithium_grams'
  | 'watt_hours_on_case'
  | 'charge'
  | 'needed_by_equipment'
  | 'net_mass';

export interface LithiumReason {
  readonly code: LithiumReasonCode;
  /** The rule it rests on, as its edition names it. */
  readonly rule: string;
  /** What the reason alone comes to. */
  readonly answer: 'lighter_rules' | 'full_rules' | 'forbidden' | 'ask';
  /** Index of the content it is about; undefined for the whole parcel. */
  readonly content?: number;
}

export interface LithiumMissing {
  readonly code: LithiumMissingCode;
  readonly content?: number;
}

export interface ContentFinding {
  readonly rule: LithiumRule | undefined;
  readonly reasons: readonly LithiumReason[];
  readonly missing: readonly LithiumMissing[];
}

export const isAir = (mode: TransportMode): boolean => mode === 'passenger_aircraft' || mode === 'cargo_aircraft';

/** A figure that is not a positive number is as good as none. */
export const isKnown = (value: number | undefined): value is number =>
  value !== undefined && Number.isFinite(value) && value > 0;

const isWholeCount = (value: number | undefined): value is number => isKnown(value) && Number.isSafeInteger(value);

function conditionReasons(content: LithiumContent, edition: LithiumEdition): readonly Omit<LithiumReason, 'content'>[] {
  switch (content.condition) {
    case 'damaged':
    case 'recalled':
      return [{ code: content.condition, rule: edition.damaged.rule, answer: edition.damaged.answer }];
    case 'faulty':
      return [{ code: 'faulty', rule: edition.damaged.rule, answer: 'ask' }];
    case 'for_disposal':
      return [{ code: 'for_disposal', rule: edition.forDisposal.rule, answer: edition.forDisposal.answer }];
    default:
      return [];
  }
}

function stopReasons(content: LithiumContent, edition: LithiumEdition): readonly Omit<LithiumReason, 'content'>[] {
  const reasons = [...conditionReasons(content, edition)];
  if (content.placement === 'loose_in_kit') {
    reasons.push({ code: 'loose_cells_in_kit', rule: 'not covered by the tables', answer: 'ask' });
  }
  if (content.designTest === 'not_passed') {
    reasons.push({ code: 'design_not_tested', rule: edition.untested.rule, answer: 'ask' });
  }
  if (needsCaseMarking(content) && content.wattHoursOnCase === false) {
    reasons.push({
      code: 'watt_hours_not_on_case',
      rule: 'UN special provisions 188 (b) and 348',
      answer: 'forbidden',
    });
  }
  return reasons;
}

const needsCaseMarking = (content: LithiumContent): boolean =>
  content.chemistry === 'lithium_ion' && content.form === 'battery';

function missingFacts(content: LithiumContent): readonly LithiumMissingCode[] {
  const missing: LithiumMissingCode[] = [];
  if (content.chemistry === 'unknown') missing.push('chemistry');
  if (content.form === 'unknown') missing.push('form');
  if (content.placement === 'unknown') missing.push('placement');
  if (content.condition === 'unknown') missing.push('condition');
  if (content.designTest === 'unknown') missing.push('design_test');
  if (!isWholeCount(content.count)) missing.push('count');
  if (content.chemistry === 'lithium_ion' && !isKnown(content.wattHours)) missing.push('watt_hours');
  if (content.chemistry === 'lithium_metal' && !isKnown(content.lithiumGrams)) missing.push('lithium_grams');
  if (needsCaseMarking(content) && content.wattHoursOnCase === undefined) missing.push('watt_hours_on_case');
  return missing;
}

/** Whether it is within the limits; undefined where a figure that decides is missing. The limits are inclusive. */
function isSmall(content: LithiumContent, limits: SizeLimits): boolean | undefined {
  if (content.form === 'unknown' || content.chemistry === 'unknown') return undefined;
  const battery = content.form === 'battery';
  if (content.chemistry === 'lithium_ion') {
    if (!isKnown(content.wattHours)) return undefined;
    return content.wattHours <= (battery ? limits.batteryWattHours : limits.cellWattHours);
  }
  if (!isKnown(content.lithiumGrams)) return undefined;
  return content.lithiumGrams <= (battery ? limits.batteryLithiumGrams : limits.cellLithiumGrams);
}

function findRule(content: LithiumContent, edition: LithiumEdition): LithiumRule | undefined {
  const small = isSmall(content, edition.limits);
  if (small === undefined) return undefined;
  return edition.rules.find(
    (rule) =>
      rule.chemistry === content.chemistry &&
      rule.placement === content.placement &&
      rule.size === (small ? 'small' : 'large'),
  );
}

function setFindings(content: LithiumContent, rule: LithiumRule): Omit<ContentFinding, 'rule'> {
  if (rule.setsPerEquipment === undefined || !isWholeCount(content.count)) return { reasons: [], missing: [] };
  if (!isWholeCount(content.neededByEquipment)) return { reasons: [], missing: [{ code: 'needed_by_equipment' }] };
  if (content.count <= content.neededByEquipment * rule.setsPerEquipment) return { reasons: [], missing: [] };
  return { reasons: [{ code: 'more_than_needed_sets', rule: rule.rule, answer: 'forbidden' }], missing: [] };
}

function chargeFindings(content: LithiumContent, rule: LithiumRule): Omit<ContentFinding, 'rule'> {
  const limit = rule.chargeLimits?.find(
    (each) => isKnown(content.wattHours) && content.wattHours > each.aboveWattHours,
  );
  if (limit?.force !== 'must') return { reasons: [], missing: [] };
  const charge = content.chargePercent;
  if (charge === undefined || !(charge >= 0 && charge <= 100)) return { reasons: [], missing: [{ code: 'charge' }] };
  if (charge <= limit.percent) return { reasons: [], missing: [] };
  return { reasons: [{ code: 'charge_above_limit', rule: rule.rule, answer: 'ask' }], missing: [] };
}

/**
 * What one kind of cell or battery comes to by itself, before the parcel is looked at as a whole.
 *
 * @param content what is known about it
 * @param index its place in the parcel's contents, to point back at
 * @param edition the edition in force
 * @returns the line of the table, the reasons and what is missing
 */
export function checkContent(content: LithiumContent, index: number, edition: LithiumEdition): ContentFinding {
  const rule = findRule(content, edition);
  const size: readonly Omit<LithiumReason, 'content'>[] =
    rule === undefined
      ? []
      : [
          {
            code: rule.size === 'small' ? 'within_small_limits' : 'above_small_limits',
            rule: rule.rule,
            answer: rule.answer,
          },
        ];
  const sets = rule === undefined ? { reasons: [], missing: [] } : setFindings(content, rule);
  const charge = rule === undefined ? { reasons: [], missing: [] } : chargeFindings(content, rule);
  const codes = missingFacts(content).map((code) => ({ code }));
  return {
    rule,
    reasons: [...stopReasons(content, edition), ...size, ...sets.reasons, ...charge.reasons].map((reason) => ({
      ...reason,
      content: index,
    })),
    missing: [...codes, ...sets.missing, ...charge.missing].map((each) => ({ ...each, content: index })),
  };
}
