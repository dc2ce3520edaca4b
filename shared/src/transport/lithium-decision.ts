import type { ContentFinding, LithiumMissing, LithiumReason } from './lithium-content-check.js';
import { checkContent, isAir, isKnown } from './lithium-content-check.js';
import { editionFor, lithiumCaution } from './lithium-editions.js';
import { decideMark } from './lithium-mark.js';
import type { LithiumContent, LithiumParcel } from './lithium-parcel.js';
import type {
  LithiumAnswer,
  LithiumEdition,
  LithiumRule,
  PackingCondition,
  PaperStatement,
  ParcelLabel,
} from './lithium-rules.js';

/** What the packing screen shows about one parcel. */
export interface LithiumDecision {
  readonly answer: LithiumAnswer;
  /** False for "forbidden" and "ask": the parcel stays until that is settled. */
  readonly mayLeave: boolean;
  readonly edition: Pick<LithiumEdition, 'id' | 'title' | 'from' | 'until' | 'recordedOn'> | undefined;
  /** The lines of the table that were found, each with the content it is for. */
  readonly applied: readonly AppliedRule[];
  /** Undefined while the parcel may not leave. */
  readonly mark: MarkDecision | undefined;
  readonly labels: readonly ParcelLabel[];
  readonly papers: readonly PaperStatement[];
  /** What the packer confirms before closing the parcel. */
  readonly conditions: readonly PackingCondition[];
  readonly reasons: readonly LithiumReason[];
  readonly missing: readonly LithiumMissing[];
  readonly caution: string;
}

export interface AppliedRule extends Pick<LithiumRule, 'unNumber' | 'properName' | 'instruction' | 'rule' | 'size'> {
  readonly content: number;
}

export interface MarkDecision {
  readonly required: boolean;
  /** UN numbers that the mark bears. */
  readonly unNumbers: readonly string[];
  readonly rule: string;
}

/** The rule of a parcel as a whole: nothing of the tables covers these mixtures. */
const outsideTables = 'not covered by the tables';

const uniqueOf = <T>(values: readonly T[]): readonly T[] => [...new Set(values)];

function parcelReasons(contents: readonly LithiumContent[]): readonly LithiumReason[] {
  const reasons: LithiumReason[] = [];
  const placements = uniqueOf(contents.map((content) => content.placement));
  if (placements.includes('alone') && placements.length > 1) {
    reasons.push({ code: 'mixed_placements', rule: outsideTables, answer: 'ask' });
  }
  if (uniqueOf(contents.map((content) => content.chemistry)).length > 1) {
    reasons.push({ code: 'mixed_chemistries', rule: outsideTables, answer: 'ask' });
  }
  return reasons;
}

/** Net mass is limited per parcel, so all contents under the same line are added up. */
function netMassFindings(parcel: LithiumParcel, findings: readonly ContentFinding[]): Omit<ContentFinding, 'rule'> {
  const reasons: LithiumReason[] = [];
  const missing: LithiumMissing[] = [];
  if (!isAir(parcel.mode)) return { reasons, missing };
  for (const rule of uniqueOf(findings.map((finding) => finding.rule))) {
    const limit = rule?.netKilograms?.[parcel.mode === 'passenger_aircraft' ? 'passenger' : 'cargo'];
    if (rule === undefined || limit === undefined) continue;
    if (limit === 'forbidden') {
      reasons.push({ code: 'not_on_passenger_aircraft', rule: rule.rule, answer: 'forbidden' });
      continue;
    }
    const masses = (parcel.contents ?? []).flatMap((content, index) =>
      findings[index]?.rule === rule ? [{ index, kilograms: content.netKilograms }] : [],
    );
    missing.push(
      ...masses.flatMap(({ index, kilograms }) =>
        isKnown(kilograms) ? [] : [{ code: 'net_mass' as const, content: index }],
      ),
    );
    const total = masses.reduce((sum, { kilograms }) => sum + (isKnown(kilograms) ? kilograms : 0), 0);
    if (total > limit) reasons.push({ code: 'over_net_mass', rule: rule.rule, answer: 'forbidden' });
  }
  return { reasons, missing };
}

function grossMassFindings(parcel: LithiumParcel, findings: readonly ContentFinding[]): Omit<ContentFinding, 'rule'> {
  const limited = findings.find((finding) => finding.rule?.grossKilograms !== undefined)?.rule;
  if (limited?.grossKilograms === undefined) return { reasons: [], missing: [] };
  if (!isKnown(parcel.grossKilograms)) return { reasons: [], missing: [{ code: 'gross_mass' }] };
  if (parcel.grossKilograms <= limited.grossKilograms) return { reasons: [], missing: [] };
  return { reasons: [{ code: 'over_gross_mass', rule: limited.rule, answer: 'forbidden' }], missing: [] };
}

function answerOf(reasons: readonly LithiumReason[], missing: readonly LithiumMissing[]): LithiumAnswer {
  const answers = reasons.map((reason) => reason.answer);
  if (answers.includes('forbidden')) return 'forbidden';
  if (missing.length > 0 || answers.includes('ask')) return 'ask';
  if (answers.includes('full_rules')) return 'full_rules';
  return answers.includes('lighter_rules') ? 'lighter_rules' : 'ask';
}

function undecided(reasons: readonly LithiumReason[], missing: readonly LithiumMissing[]): LithiumDecision {
  return {
    answer: answerOf(reasons, missing),
    mayLeave: false,
    edition: undefined,
    applied: [],
    mark: undefined,
    labels: [],
    papers: [],
    conditions: [],
    reasons,
    missing,
    caution: lithiumCaution,
  };
}

function findEdition(parcel: LithiumParcel): LithiumEdition | LithiumDecision {
  if (parcel.mode === 'unknown') return undecided([], [{ code: 'mode' }]);
  if (!/^\d{4}-\d{2}-\d{2}$/.test(parcel.day)) return undecided([], [{ code: 'day' }]);
  if (parcel.mode === 'letter_post') {
    return undecided([{ code: 'letter_post', rule: 'rules of the postal operator', answer: 'ask' }], []);
  }
  const edition = editionFor(parcel.mode, parcel.day);
  return edition ?? undecided([{ code: 'no_edition_on_record', rule: 'editions on record', answer: 'ask' }], []);
}

const appliedRules = (findings: readonly ContentFinding[]): readonly AppliedRule[] =>
  findings.flatMap(({ rule }, content) =>
    rule === undefined
      ? []
      : [
          {
            content,
            unNumber: rule.unNumber,
            properName: rule.properName,
            instruction: rule.instruction,
            rule: rule.rule,
            size: rule.size,
          },
        ],
  );

function conditionsOf(parcel: LithiumParcel, rules: readonly LithiumRule[]): readonly PackingCondition[] {
  const advised = rules.some((rule) => rule.chargeLimits !== undefined);
  return uniqueOf([
    ...rules.flatMap((rule) => rule.conditions),
    ...(advised ? (['keep_charge_low'] as const) : []),
    ...(parcel.direction === 'inbound' ? (['tell_the_sender'] as const) : []),
  ]);
}

function decideContents(
  parcel: LithiumParcel,
  contents: readonly LithiumContent[],
  edition: LithiumEdition,
): LithiumDecision {
  const findings = contents.map((content, index) => checkContent(content, index, edition));
  const rules = uniqueOf(findings.flatMap(({ rule }) => (rule === undefined ? [] : [rule])));
  const mark = decideMark(parcel, contents, rules, edition);
  const whole = [netMassFindings(parcel, findings), grossMassFindings(parcel, findings)];
  const reasons = [...parcelReasons(contents), ...[...findings, ...whole].flatMap((finding) => finding.reasons)];
  const missing = [
    ...[...findings, ...whole].flatMap((finding) => finding.missing),
    ...(mark === 'parcels_in_consignment' ? [{ code: mark }] : []),
  ];
  const answer = answerOf(reasons, missing);
  const mayLeave = answer === 'lighter_rules' || answer === 'full_rules';
  const marked = mark === 'parcels_in_consignment' ? undefined : mark;
  const papers = rules
    .flatMap((rule) => rule.papers)
    .filter((paper) => paper.onlyWithMark !== true || marked?.required === true);
  const { id, title, from, until, recordedOn } = edition;
  return {
    answer,
    mayLeave,
    edition: { id, title, from, until, recordedOn },
    applied: appliedRules(findings),
    mark: mayLeave ? marked : undefined,
    labels: mayLeave ? uniqueOf(rules.flatMap((rule) => rule.labels)) : [],
    papers: mayLeave ? papers : [],
    conditions: mayLeave ? conditionsOf(parcel, rules) : [],
    reasons,
    missing,
    caution: lithiumCaution,
  };
}

/**
 * Which transport rules a parcel with lithium cells or batteries falls under.
 *
 * Walks the decision tables of the edition in force on the day. Whatever is not known makes the answer "ask", never
 * a lighter one; so do damaged or faulty cells, loose cells in a kit and a design without its own passed test. The
 * worst of the contents decides for the parcel. It helps to prepare; the caution belongs beside every answer.
 *
 * @param parcel what is known: mode, day (`YYYY-MM-DD`), contents (Wh, g, kg, %), parcels in the consignment
 * @returns the answer, the rules it rests on, mark, labels, papers, conditions to confirm, and what is missing; it
 * does not throw: a figure that makes no sense counts as unknown
 * @source UN Model Regulations SP 188, SP 376, P903 (ADR, IMDG Code); ICAO Technical Instructions PI 965 to 970
 */
export function decideLithium(parcel: LithiumParcel): LithiumDecision {
  const { contents } = parcel;
  if (contents === undefined) return undecided([], [{ code: 'contents' }]);
  if (contents.length === 0) return { ...undecided([], []), answer: 'no_lithium', mayLeave: true };
  const edition = findEdition(parcel);
  return 'answer' in edition ? edition : decideContents(parcel, contents, edition);
}
