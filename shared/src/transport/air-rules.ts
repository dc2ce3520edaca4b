import type { ChargeLimit, LithiumRule, PackingCondition, RuledChemistry } from './lithium-rules.js';
import { entryOf } from './lithium-rules.js';

/*
 * Packing instructions 965 to 970 of the ICAO Technical Instructions, as the IATA Dangerous Goods Regulations print
 * them. Section II of 965 and 968 was withdrawn on 1 April 2022: small cells and batteries by themselves go under
 * Section IB. Net masses of sections I, IA, IB and the lithium metal lines are from memory.
 */

/** What changed between the editions on record. */
export interface AirEditionOptions {
  /** Charge limits on lithium ion packed with and contained in equipment; none where the edition is silent. */
  readonly packedWithCharge: readonly ChargeLimit[];
  readonly containedCharge: readonly ChargeLimit[];
  /** Whether the three metre stack test is asked for. */
  readonly stackTest: boolean;
}

interface InstructionNumbers {
  readonly alone: string;
  readonly packedWith: string;
  readonly contained: string;
}

const numbers: Record<RuledChemistry, InstructionNumbers> = {
  lithium_ion: { alone: 'PI 965', packedWith: 'PI 966', contained: 'PI 967' },
  lithium_metal: { alone: 'PI 968', packedWith: 'PI 969', contained: 'PI 970' },
};

const always: readonly PackingCondition[] = ['protect_from_short_circuit', 'quality_programme', 'offer_test_summary'];

/** State of charge of lithium ion batteries by themselves, since 1 April 2016. */
const aloneCharge: readonly ChargeLimit[] = [{ percent: 30, force: 'must', aboveWattHours: 0 }];

const withCharge = (chemistry: RuledChemistry, chargeLimits: readonly ChargeLimit[]): Partial<LithiumRule> =>
  chemistry === 'lithium_ion' && chargeLimits.length > 0 ? { chargeLimits } : {};

function declaration(entry: Pick<LithiumRule, 'unNumber' | 'properName'>, instruction: string): LithiumRule['papers'] {
  return [
    {
      paper: 'shippers_declaration',
      says: `${entry.unNumber}, ${entry.properName}, 9, {number and type of packages, net mass}, ${instruction}`,
    },
    { paper: 'air_waybill', says: 'Dangerous goods as per associated Shipper’s Declaration' },
  ];
}

function aloneRules(chemistry: RuledChemistry): readonly LithiumRule[] {
  const number = numbers[chemistry].alone;
  const entry = entryOf(chemistry, 'alone');
  const ion = chemistry === 'lithium_ion';
  const line = (size: 'small' | 'large', section: 'IA' | 'IB', kilograms: number): LithiumRule => ({
    chemistry,
    placement: 'alone',
    size,
    answer: 'full_rules',
    ...entry,
    instruction: `${number} Section ${section}`,
    rule: `${number} Section ${section}`,
    mark: section === 'IB' ? 'always' : 'never',
    labels: ['class_9_lithium', 'cargo_aircraft_only'],
    papers: declaration(entry, section === 'IB' ? `${number} IB` : number),
    conditions: [
      'trained_person',
      ...(section === 'IA' ? (['approved_packaging'] as const) : (['withstand_drop', 'withstand_stack'] as const)),
      'enclose_in_inner_packaging',
      ...always,
    ],
    netKilograms: { passenger: 'forbidden', cargo: kilograms },
    ...withCharge(chemistry, aloneCharge),
  });
  return [line('small', 'IB', ion ? 10 : 2.5), line('large', 'IA', 35)];
}

const waybill = (chemistry: RuledChemistry, instruction: string): string =>
  `Lithium ${chemistry === 'lithium_ion' ? 'ion' : 'metal'} batteries in compliance with Section II of ${instruction.replace('PI ', 'PI')}`;

function packedWithRules(chemistry: RuledChemistry, options: AirEditionOptions): readonly LithiumRule[] {
  const number = numbers[chemistry].packedWith;
  const entry = entryOf(chemistry, 'packed_with_equipment');
  const shared = {
    chemistry,
    placement: 'packed_with_equipment',
    ...entry,
    setsPerEquipment: 3,
    ...withCharge(chemistry, options.packedWithCharge),
  } as const;
  const stack: readonly PackingCondition[] = options.stackTest ? ['withstand_stack'] : [];
  const small: LithiumRule = {
    ...shared,
    size: 'small',
    answer: 'lighter_rules',
    instruction: `${number} Section II`,
    rule: `${number} Section II`,
    mark: 'always',
    labels: [],
    papers: [{ paper: 'air_waybill', says: waybill(chemistry, number) }],
    conditions: ['enclose_in_inner_packaging', 'secure_in_outer_packaging', 'withstand_drop', ...stack, ...always],
    netKilograms: { passenger: 5, cargo: 5 },
  };
  const large: LithiumRule = {
    ...shared,
    size: 'large',
    answer: 'full_rules',
    instruction: `${number} Section I`,
    rule: `${number} Section I`,
    mark: 'never',
    labels: ['class_9_lithium'],
    papers: declaration(entry, number),
    conditions: ['trained_person', 'approved_packaging', 'enclose_in_inner_packaging', ...always],
    netKilograms: { passenger: 5, cargo: 35 },
  };
  return [small, large];
}

function containedRules(chemistry: RuledChemistry, options: AirEditionOptions): readonly LithiumRule[] {
  const number = numbers[chemistry].contained;
  const entry = entryOf(chemistry, 'contained_in_equipment');
  const shared = {
    chemistry,
    placement: 'contained_in_equipment',
    ...entry,
    ...withCharge(chemistry, options.containedCharge),
  } as const;
  const stack: readonly PackingCondition[] = options.stackTest ? ['withstand_stack'] : [];
  const small: LithiumRule = {
    ...shared,
    size: 'small',
    answer: 'lighter_rules',
    instruction: `${number} Section II`,
    rule: `${number} Section II`,
    mark: 'unless_few_contained',
    labels: [],
    papers: [{ paper: 'air_waybill', says: waybill(chemistry, number), onlyWithMark: true }],
    conditions: ['prevent_accidental_start', 'secure_in_outer_packaging', ...stack, ...always],
    netKilograms: { passenger: 5, cargo: 5 },
  };
  const large: LithiumRule = {
    ...shared,
    size: 'large',
    answer: 'full_rules',
    instruction: `${number} Section I`,
    rule: `${number} Section I`,
    mark: 'never',
    labels: ['class_9_lithium'],
    papers: declaration(entry, number),
    conditions: ['trained_person', 'prevent_accidental_start', 'secure_in_outer_packaging', ...always],
    netKilograms: { passenger: 5, cargo: 35 },
  };
  return [small, large];
}

/**
 * The decision table of one edition by air.
 *
 * @param options what this edition asks beyond the lines that all share
 * @returns a line for each chemistry, placement and size
 */
export function airRules(options: AirEditionOptions): readonly LithiumRule[] {
  return (['lithium_ion', 'lithium_metal'] as const).flatMap((chemistry) => [
    ...aloneRules(chemistry),
    ...packedWithRules(chemistry, options),
    ...containedRules(chemistry, options),
  ]);
}
