import type { LithiumPlacement } from './lithium-parcel.js';

/** Lighter rules: not otherwise subject to the regulations if every condition is met. Full rules: class 9 goods. */
export type LithiumAnswer = 'no_lithium' | 'lighter_rules' | 'full_rules' | 'forbidden' | 'ask';

export type RuledChemistry = 'lithium_ion' | 'lithium_metal';
export type RuledPlacement = Exclude<LithiumPlacement, 'loose_in_kit' | 'unknown'>;

/** What the packer confirms before the parcel is closed; each has its sentence in `lithium-words`. */
export type PackingCondition =
  | 'protect_from_short_circuit'
  | 'enclose_in_inner_packaging'
  | 'prevent_accidental_start'
  | 'secure_in_outer_packaging'
  | 'withstand_drop'
  | 'withstand_stack'
  | 'quality_programme'
  | 'offer_test_summary'
  | 'approved_packaging'
  | 'trained_person'
  | 'keep_charge_low'
  | 'tell_the_sender';

export type ParcelLabel = 'class_9_lithium' | 'cargo_aircraft_only';

/** Words that a paper has to carry; `{...}` is filled in by the shop. */
export interface PaperStatement {
  readonly paper: 'transport_document' | 'dangerous_goods_note' | 'air_waybill' | 'shippers_declaration';
  readonly says: string;
  /** Only where the parcel bears the mark. */
  readonly onlyWithMark?: boolean;
}

export interface ChargeLimit {
  /** Percent of rated capacity. */
  readonly percent: number;
  /** Must: above it only with the States' approval. Should: recommended. */
  readonly force: 'must' | 'should';
  /** Applies to cells and batteries above these watt-hours. */
  readonly aboveWattHours: number;
}

/** One line of a decision table. */
export interface LithiumRule {
  readonly chemistry: RuledChemistry;
  readonly placement: RuledPlacement;
  /** Small: within the edition's limits of watt-hours or grams. */
  readonly size: 'small' | 'large';
  readonly answer: 'lighter_rules' | 'full_rules';
  readonly unNumber: 'UN 3480' | 'UN 3481' | 'UN 3090' | 'UN 3091';
  readonly properName: string;
  /** Packing instruction or special provision, with its section. */
  readonly instruction: string;
  readonly rule: string;
  readonly mark: 'always' | 'unless_few_contained' | 'never';
  readonly labels: readonly ParcelLabel[];
  readonly papers: readonly PaperStatement[];
  readonly conditions: readonly PackingCondition[];
  /** Net mass of cells or batteries per parcel in kilograms; 'forbidden' where that aircraft may not carry it. */
  readonly netKilograms?: { readonly passenger: number | 'forbidden'; readonly cargo: number };
  /** Gross mass per parcel in kilograms. */
  readonly grossKilograms?: number;
  /** How often the set that the equipment needs may be in the parcel: itself and the spare sets. */
  readonly setsPerEquipment?: number;
  /** The first that applies counts. */
  readonly chargeLimits?: readonly ChargeLimit[];
}

/** Limits up to and including which a cell or battery counts as small. */
export interface SizeLimits {
  readonly cellWattHours: number;
  readonly batteryWattHours: number;
  readonly cellLithiumGrams: number;
  readonly batteryLithiumGrams: number;
}

/** How few cells or batteries installed in equipment go without the mark, and in how few parcels. */
export interface MarkExemption {
  readonly cells: number;
  readonly batteries: number;
  readonly parcels: number;
  readonly rule: string;
}

export interface LithiumEdition {
  readonly id: string;
  readonly title: string;
  readonly modes: readonly ('road' | 'sea' | 'passenger_aircraft' | 'cargo_aircraft')[];
  /** First and last day of force, `YYYY-MM-DD`, both included; transition periods counted in. */
  readonly from: string;
  readonly until: string;
  /** The day these tables were last compared with what the edition was reported to say. */
  readonly recordedOn: string;
  readonly limits: SizeLimits;
  readonly markExemption: MarkExemption;
  /** The rule for damaged or defective cells and batteries, and what it comes to. */
  readonly damaged: { readonly answer: 'forbidden' | 'ask'; readonly rule: string };
  readonly untested: { readonly rule: string };
  readonly forDisposal: { readonly answer: 'forbidden' | 'ask'; readonly rule: string };
  readonly rules: readonly LithiumRule[];
}

export const properNames = {
  'UN 3480': 'LITHIUM ION BATTERIES',
  'UN 3090': 'LITHIUM METAL BATTERIES',
} as const;

/**
 * UN number and proper shipping name of a chemistry and placement.
 *
 * @source UN Model Regulations, Dangerous Goods List, entries 3090, 3091, 3480, 3481.
 */
export function entryOf(
  chemistry: RuledChemistry,
  placement: RuledPlacement,
): Pick<LithiumRule, 'unNumber' | 'properName'> {
  const ion = chemistry === 'lithium_ion';
  const name = ion ? properNames['UN 3480'] : properNames['UN 3090'];
  if (placement === 'alone') return { unNumber: ion ? 'UN 3480' : 'UN 3090', properName: name };
  const suffix = placement === 'contained_in_equipment' ? 'CONTAINED IN EQUIPMENT' : 'PACKED WITH EQUIPMENT';
  return { unNumber: ion ? 'UN 3481' : 'UN 3091', properName: `${name} ${suffix}` };
}

/** Size limits of special provision 188 and of the lighter sections by air, the same in all editions on record. */
export const smallLimits: SizeLimits = {
  cellWattHours: 20,
  batteryWattHours: 100,
  cellLithiumGrams: 1,
  batteryLithiumGrams: 2,
};
