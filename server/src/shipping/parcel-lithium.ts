import { Decimal } from '@emberlot/shared/measure/decimal';
import { decideLithium, type LithiumDecision } from '@emberlot/shared/transport/lithium-decision';
import type { LithiumContent } from '@emberlot/shared/transport/lithium-parcel';
import {
  answerSentences,
  conditionSentences,
  labelSentences,
  missingSentences,
  paperNames,
  reasonSentences,
} from '@emberlot/shared/transport/lithium-words';
import type { LithiumContentRow } from './lithium-contents.repository.js';
import type { ParcelLithiumDto, ParcelMode } from './parcel.dto.js';

/** What a person said about a parcel, kept with it. */
export interface LithiumFacts {
  readonly mode: ParcelMode;
  readonly wattHoursOnCase: boolean | null;
  readonly chargePercent: number | null;
}

/** What is kept of a parcel's lithium: what was said, what the carrier answered, and at dispatch what was decided. */
export interface KeptLithium {
  readonly facts?: LithiumFacts;
  readonly carrierAnswer?: { readonly note: string; readonly by: string; readonly at: string };
}

interface ParcelFacts {
  readonly day: string;
  readonly weightG: number | null;
  readonly equipment: number;
  readonly facts: LithiumFacts | undefined;
}

/** Batteries whose own design has not passed its transport test: with one of them a parcel never leaves. */
export function untested(rows: readonly LithiumContentRow[]): readonly string[] {
  return rows.filter(({ kind, tested }) => kind === 'battery' && !tested).map(({ part }) => part);
}

/** The decision of the rules on a parcel; whatever nobody said stays unknown and is asked for. */
export function decideParcel(rows: readonly LithiumContentRow[], parcel: ParcelFacts): LithiumDecision {
  return decideLithium({
    mode: parcel.facts?.mode ?? 'unknown',
    day: parcel.day,
    direction: 'outbound',
    parcelsInConsignment: 1,
    grossKilograms: parcel.weightG === null ? undefined : new Decimal(parcel.weightG).div(1000).toNumber(),
    contents: rows.map((row) => contentOf(row, parcel)),
  });
}

function contentOf(row: LithiumContentRow, { facts, equipment }: ParcelFacts): LithiumContent {
  const count = new Decimal(row.count);
  return {
    chemistry: row.chemistry,
    form: row.kind,
    placement: placementOf(row),
    condition: 'sound',
    designTest: row.tested ? 'passed' : 'not_passed',
    count: count.toNumber(),
    wattHours: row.wattHours === null ? undefined : Number(row.wattHours),
    lithiumGrams: row.lithiumGrams === null ? undefined : Number(row.lithiumGrams),
    wattHoursOnCase: facts?.wattHoursOnCase ?? undefined,
    chargePercent: facts?.chargePercent ?? undefined,
    neededByEquipment: equipment > 0 ? equipment : undefined,
    netKilograms: row.weightG === null ? undefined : count.times(row.weightG).div(1000).toNumber(),
  };
}

/** Loose cells of a kit are joined by the buyer; a battery of a kit travels beside the tool that it will run. */
function placementOf({ lies, kind }: LithiumContentRow): LithiumContent['placement'] {
  if (lies === 'contained') return 'contained_in_equipment';
  if (lies === 'alone') return 'alone';
  return kind === 'cell' ? 'loose_in_kit' : 'packed_with_equipment';
}

/** The decision in sentences, for the packing screen and the packing slip. */
export function lithiumDto(
  decision: LithiumDecision,
  kept: KeptLithium,
  rows: readonly LithiumContentRow[],
): ParcelLithiumDto {
  const about = (content: number | undefined) => {
    const row = content === undefined ? undefined : rows[content];
    return row ? `${row.part}: ` : '';
  };
  return {
    answer: decision.answer,
    sentence: answerSentences[decision.answer],
    mayLeave: decision.mayLeave,
    edition: decision.edition?.title ?? null,
    rules: decision.applied.map(({ unNumber, properName, instruction, rule }) => ({
      unNumber,
      properName,
      instruction,
      rule,
    })),
    mark: markSentence(decision),
    labels: decision.labels.map((label) => labelSentences[label]),
    papers: decision.papers.map(({ paper, says }) => `On the ${paperNames[paper]}: ${says}`),
    conditions: decision.conditions.map((condition) => conditionSentences[condition]),
    reasons: decision.reasons.map(({ code, content }) => `${about(content)}${reasonSentences[code]}`),
    missing: decision.missing.map(({ code, content }) => `${about(content)}${missingSentences[code]}`),
    caution: decision.caution,
    carrierAnswer: kept.carrierAnswer ? `${kept.carrierAnswer.by}: ${kept.carrierAnswer.note}` : null,
    mode: kept.facts?.mode ?? null,
    wattHoursOnCase: kept.facts?.wattHoursOnCase ?? null,
    chargePercent: kept.facts?.chargePercent ?? null,
  };
}

function markSentence({ mark }: LithiumDecision): string | null {
  if (!mark) return null;
  return mark.required
    ? `The lithium battery mark with ${mark.unNumbers.join(' and ')} goes on the parcel (${mark.rule}).`
    : `No lithium battery mark is required (${mark.rule}).`;
}
