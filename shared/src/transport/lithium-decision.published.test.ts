import { describe, expect, test } from '@jest/globals';
import { decideLithium } from './lithium-decision.js';
import type { LithiumContent, LithiumParcel } from './lithium-parcel.js';
import { cellWattHours, packWattHours } from './watt-hours.js';

const pack: LithiumContent = {
  chemistry: 'lithium_ion',
  form: 'battery',
  placement: 'contained_in_equipment',
  condition: 'sound',
  designTest: 'passed',
  count: 1,
  wattHours: 36,
  wattHoursOnCase: true,
  chargePercent: 30,
  neededByEquipment: 1,
  netKilograms: 0.3,
};
const parcel: LithiumParcel = {
  mode: 'road',
  day: '2026-12-01',
  direction: 'outbound',
  contents: [pack],
  parcelsInConsignment: 1,
  grossKilograms: 2,
};

describe('watt-hours and the limits of special provision 188', () => {
  // UN Model Regulations, special provision 188 (a) and (b): 20 Wh a cell, 100 Wh a battery, both inclusive.
  test.each([
    ['one cell of 3.6 V 2.5 Ah', 3.6, 2.5, 1, 1, 9, 'cell', 'lighter_rules'],
    ['one cell of 3.7 V 5.5 Ah', 3.7, 5.5, 1, 1, 20.35, 'cell', 'full_rules'],
    ['3S1P of 3.6 V 2.5 Ah', 3.6, 2.5, 3, 1, 27, 'battery', 'lighter_rules'],
    ['4S2P of 3.6 V 2.5 Ah', 3.6, 2.5, 4, 2, 72, 'battery', 'lighter_rules'],
    ['6S2P of 3.6 V 2.5 Ah', 3.6, 2.5, 6, 2, 108, 'battery', 'full_rules'],
    ['5S1P of 3.6 V 5.0 Ah', 3.6, 5, 5, 1, 90, 'battery', 'lighter_rules'],
    ['7S1P of 3.65 V 4.0 Ah', 3.65, 4, 7, 1, 102.2, 'battery', 'full_rules'],
  ] as const)('%s', (_name, nominalVolts, ampereHours, series, parallel, wattHours, form, answer) => {
    expect(packWattHours({ nominalVolts, ampereHours }, series, parallel)).toBe(wattHours);
    expect(decideLithium({ ...parcel, contents: [{ ...pack, form, wattHours }] }).answer).toBe(answer);
  });

  test('the limits are inclusive', () => {
    expect(cellWattHours({ nominalVolts: 3.2, ampereHours: 6.25 })).toBe(20);
    const at = (form: 'cell' | 'battery', wattHours: number) =>
      decideLithium({ ...parcel, contents: [{ ...pack, form, wattHours }] }).answer;
    expect([at('cell', 20), at('cell', 20.01), at('battery', 100), at('battery', 100.01)]).toEqual([
      'lighter_rules',
      'full_rules',
      'lighter_rules',
      'full_rules',
    ]);
  });
});

describe('the lithium battery mark', () => {
  // UN Model Regulations, special provision 188 (f); IATA Dangerous Goods Regulations, 67th edition (2026), PI 965-967.
  test.each([
    ['contained_in_equipment', 'battery', 1, 1, false, 'UN 3481', 'PI 967'],
    ['contained_in_equipment', 'battery', 2, 2, false, 'UN 3481', 'PI 967'],
    ['contained_in_equipment', 'battery', 2, 3, true, 'UN 3481', 'PI 967'],
    ['contained_in_equipment', 'battery', 3, 1, true, 'UN 3481', 'PI 967'],
    ['contained_in_equipment', 'cell', 4, 2, false, 'UN 3481', 'PI 967'],
    ['contained_in_equipment', 'cell', 5, 1, true, 'UN 3481', 'PI 967'],
    ['packed_with_equipment', 'battery', 1, 1, true, 'UN 3481', 'PI 966'],
    ['alone', 'battery', 1, 1, true, 'UN 3480', 'PI 965'],
  ] as const)('%s, %s, %d a parcel, %d parcels', (placement, form, count, parcels, required, unNumber, instruction) => {
    const contents = [{ ...pack, placement, form, count, wattHours: 18 }];
    for (const mode of ['road', 'cargo_aircraft'] as const) {
      const decision = decideLithium({ ...parcel, mode, contents, parcelsInConsignment: parcels });
      expect(decision.mark?.required).toBe(required);
      expect(decision.mark?.unNumbers).toEqual(required ? [unNumber] : []);
      expect(decision.applied[0]?.unNumber).toBe(unNumber);
      expect(decision.applied[0]?.instruction).toMatch(mode === 'road' ? 'SP 188' : instruction);
    }
  });
});

test('by road 72 Wh in a tool has the lighter rules, 108 Wh the full ones', () => {
  // ADR, special provision 188; ADR 4.1.4.1 P903 and label 9A from memory.
  const at = (wattHours: number) => decideLithium({ ...parcel, contents: [{ ...pack, wattHours }] });
  expect(at(72)).toMatchObject({ answer: 'lighter_rules', papers: [], labels: [] });
  expect(at(108)).toMatchObject({
    answer: 'full_rules',
    labels: ['class_9_lithium'],
    applied: [{ unNumber: 'UN 3481', instruction: 'P903' }],
  });
});

describe('state of charge by air in 2026', () => {
  // IATA Dangerous Goods Regulations, 67th edition (2026), PI 965-967 as summarised by carriers and test houses.
  test.each([
    ['alone', 36, 30, true, false],
    ['alone', 36, 40, false, false],
    ['packed_with_equipment', 36, 30, true, false],
    ['packed_with_equipment', 36, 50, false, false],
    ['packed_with_equipment', 2.5, 50, true, true],
    ['contained_in_equipment', 36, 60, true, true],
  ] as const)('%s, %d Wh, %d percent', (placement, wattHours, chargePercent, allowed, recommended) => {
    const contents = [{ ...pack, placement, wattHours, chargePercent }];
    const decision = decideLithium({ ...parcel, mode: 'cargo_aircraft', contents });
    expect(decision.mayLeave).toBe(allowed);
    if (!allowed) expect(decision.reasons.map((reason) => reason.code)).toContain('charge_above_limit');
    if (recommended) expect(decision.conditions).toContain('keep_charge_low');
  });

  test('before 1 January 2026 the limit on batteries packed with equipment was advice', () => {
    const contents = [{ ...pack, placement: 'packed_with_equipment' as const, chargePercent: 50 }];
    const decision = decideLithium({ ...parcel, mode: 'passenger_aircraft', day: '2025-12-31', contents });
    expect(decision).toMatchObject({ answer: 'lighter_rules', edition: { id: 'iata-dgr-66' } });
  });
});
