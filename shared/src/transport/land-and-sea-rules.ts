import type { LithiumRule, PackingCondition, PaperStatement, RuledChemistry, RuledPlacement } from './lithium-rules.js';
import { entryOf } from './lithium-rules.js';

/*
 * Road (ADR) and sea (IMDG Code) share special provision 188 for small cells and batteries and packing instruction
 * P903 for the others. Sources: UN Model Regulations, special provision 188 (a) to (h), read in its IMDG wording;
 * P903 and the entries of the transport document from memory.
 */

const smallConditions: Record<RuledPlacement, readonly PackingCondition[]> = {
  contained_in_equipment: ['prevent_accidental_start', 'secure_in_outer_packaging', 'protect_from_short_circuit'],
  packed_with_equipment: [
    'enclose_in_inner_packaging',
    'protect_from_short_circuit',
    'secure_in_outer_packaging',
    'withstand_drop',
  ],
  alone: ['enclose_in_inner_packaging', 'protect_from_short_circuit', 'secure_in_outer_packaging', 'withstand_drop'],
};

function smallRule(chemistry: RuledChemistry, placement: RuledPlacement, code: 'ADR' | 'IMDG'): LithiumRule {
  return {
    chemistry,
    placement,
    size: 'small',
    answer: 'lighter_rules',
    ...entryOf(chemistry, placement),
    instruction: 'SP 188',
    rule: `${code} special provision 188`,
    mark: placement === 'contained_in_equipment' ? 'unless_few_contained' : 'always',
    labels: [],
    papers: [],
    conditions: [...smallConditions[placement], 'quality_programme', 'offer_test_summary'],
    ...(placement === 'alone' ? { grossKilograms: 30 } : {}),
  };
}

function fullPaper(chemistry: RuledChemistry, placement: RuledPlacement, code: 'ADR' | 'IMDG'): PaperStatement {
  const { unNumber, properName } = entryOf(chemistry, placement);
  return code === 'ADR'
    ? {
        paper: 'transport_document',
        says: `${unNumber} ${properName}, 9, (E); {number and kind of packages}, {net mass}`,
      }
    : {
        paper: 'dangerous_goods_note',
        says: `${unNumber}, ${properName}, class 9; {number and kind of packages}, {mass}`,
      };
}

function largeRule(chemistry: RuledChemistry, placement: RuledPlacement, code: 'ADR' | 'IMDG'): LithiumRule {
  return {
    chemistry,
    placement,
    size: 'large',
    answer: 'full_rules',
    ...entryOf(chemistry, placement),
    instruction: 'P903',
    rule:
      code === 'ADR' ? 'ADR 2.2.9.1.7, 4.1.4.1 P903, 5.2.2 label 9A' : 'IMDG Code 2.9.4, 4.1.4.1 P903, 5.2.2 label 9A',
    mark: 'never',
    labels: ['class_9_lithium'],
    papers: [fullPaper(chemistry, placement, code)],
    conditions: [
      'trained_person',
      ...(placement === 'contained_in_equipment'
        ? (['prevent_accidental_start', 'secure_in_outer_packaging'] as const)
        : (['approved_packaging'] as const)),
      'protect_from_short_circuit',
      'quality_programme',
      'offer_test_summary',
    ],
  };
}

const chemistries = ['lithium_ion', 'lithium_metal'] as const;
const placements = ['contained_in_equipment', 'packed_with_equipment', 'alone'] as const;

/**
 * The decision table of one surface code.
 *
 * @param code ADR for road, IMDG for sea
 * @returns a line for each chemistry, placement and size
 */
export function landAndSeaRules(code: 'ADR' | 'IMDG'): readonly LithiumRule[] {
  return chemistries.flatMap((chemistry) =>
    placements.flatMap((placement) => [smallRule(chemistry, placement, code), largeRule(chemistry, placement, code)]),
  );
}
