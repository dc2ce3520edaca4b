import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { decideLithium } from './lithium-decision.js';
import { editionFor, lithiumEditions } from './lithium-editions.js';
import type { LithiumContent, LithiumParcel } from './lithium-parcel.js';
import { conditionSentences, missingSentences, reasonSentences } from './lithium-words.js';
import { packWattHours } from './watt-hours.js';

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
const decide = (content: Partial<LithiumContent>, rest: Partial<LithiumParcel> = {}) =>
  decideLithium({ ...parcel, ...rest, contents: [{ ...pack, ...content }] });
const codes = (decision: ReturnType<typeof decide>) => decision.reasons.map((reason) => reason.code);

describe('an iron with its pack inside', () => {
  test('goes by road under the lighter rules, with its edition and the caution', () => {
    expect(decide({})).toMatchObject({
      answer: 'lighter_rules',
      mayLeave: true,
      edition: { id: 'adr-2025', recordedOn: '2026-12-01' },
      applied: [
        {
          content: 0,
          unNumber: 'UN 3481',
          properName: 'LITHIUM ION BATTERIES CONTAINED IN EQUIPMENT',
          instruction: 'SP 188',
        },
      ],
      mark: { required: false },
      papers: [],
      missing: [],
      caution: 'Check the current edition and local rules; ask your carrier.',
    });
  });

  test('by air the waybill speaks only where the parcel is marked', () => {
    const unmarked = decide({}, { mode: 'passenger_aircraft' });
    const marked = decide({ count: 3 }, { mode: 'passenger_aircraft' });
    expect(unmarked.papers).toEqual([]);
    expect(marked.papers.map((paper) => paper.says)).toEqual([
      'Lithium ion batteries in compliance with Section II of PI967',
    ]);
  });

  test('that comes back is asked about in the same way, and its sender is told', () => {
    const inbound = decide({}, { direction: 'inbound' });
    expect(inbound.conditions).toContain('tell_the_sender');
    expect(decide({ condition: 'unknown' }, { direction: 'inbound' }).answer).toBe('ask');
  });
});

describe('what is not fine', () => {
  test.each([
    [{ condition: 'damaged' }, 'damaged', 'ask'],
    [{ condition: 'recalled' }, 'recalled', 'ask'],
    [{ condition: 'faulty' }, 'faulty', 'ask'],
    [{ condition: 'for_disposal' }, 'for_disposal', 'ask'],
    [{ placement: 'loose_in_kit', form: 'cell', wattHours: 9 }, 'loose_cells_in_kit', 'ask'],
    [{ designTest: 'not_passed' }, 'design_not_tested', 'ask'],
    [{ wattHoursOnCase: false }, 'watt_hours_not_on_case', 'forbidden'],
  ] as const)('%o by road', (content, code, answer) => {
    const decision = decide(content);
    expect(decision).toMatchObject({ answer, mayLeave: false, mark: undefined, labels: [], conditions: [] });
    expect(codes(decision)).toContain(code);
  });

  test('damaged or recalled by air is forbidden, faulty is asked', () => {
    const by = (condition: LithiumContent['condition']) => decide({ condition }, { mode: 'cargo_aircraft' }).answer;
    expect([by('damaged'), by('recalled'), by('faulty')]).toEqual(['forbidden', 'forbidden', 'ask']);
  });

  test('batteries by themselves do not fly with passengers', () => {
    const decision = decide({ placement: 'alone' }, { mode: 'passenger_aircraft' });
    expect(decision.answer).toBe('forbidden');
    expect(codes(decision)).toContain('not_on_passenger_aircraft');
  });

  test('batteries by themselves fly on cargo aircraft as class 9, up to 10 kg', () => {
    const at = (netKilograms: number) => decide({ placement: 'alone', netKilograms }, { mode: 'cargo_aircraft' });
    expect(at(10)).toMatchObject({ answer: 'full_rules', labels: ['class_9_lithium', 'cargo_aircraft_only'] });
    expect(at(10.001).answer).toBe('forbidden');
  });

  test('net mass counts over all contents of a line', () => {
    const contents = [
      { ...pack, netKilograms: 3 },
      { ...pack, netKilograms: 3 },
    ];
    const decision = decideLithium({ ...parcel, mode: 'passenger_aircraft', contents });
    expect(codes(decision)).toContain('over_net_mass');
  });

  test('more than two spare sets do not fly packed with the tool', () => {
    const at = (count: number) => decide({ placement: 'packed_with_equipment', count }, { mode: 'cargo_aircraft' });
    expect(at(3).mayLeave).toBe(true);
    expect(codes(at(4))).toContain('more_than_needed_sets');
  });

  test('batteries by themselves by road: up to 30 kg gross, and the parcel is weighed', () => {
    expect(decide({ placement: 'alone' }, { grossKilograms: 30 }).answer).toBe('lighter_rules');
    expect(decide({ placement: 'alone' }, { grossKilograms: 30.1 }).answer).toBe('forbidden');
    expect(decide({ placement: 'alone' }, { grossKilograms: undefined }).missing).toEqual([{ code: 'gross_mass' }]);
  });

  test('letter post, unknown ways and days without an edition are asked', () => {
    expect(codes(decide({}, { mode: 'letter_post' }))).toEqual(['letter_post']);
    expect(decide({}, { mode: 'unknown' }).missing).toEqual([{ code: 'mode' }]);
    expect(codes(decide({}, { day: '2022-12-31' }))).toEqual(['no_edition_on_record']);
    expect(codes(decide({}, { day: '2031-01-01' }))).toEqual(['no_edition_on_record']);
    expect(decide({}, { day: 'tomorrow' }).missing).toEqual([{ code: 'day' }]);
  });

  test('mixtures outside the tables are asked', () => {
    const alone: LithiumContent = { ...pack, placement: 'alone' };
    const metal: LithiumContent = { ...pack, chemistry: 'lithium_metal', form: 'cell', lithiumGrams: 0.5 };
    expect(codes(decideLithium({ ...parcel, contents: [pack, alone] }))).toContain('mixed_placements');
    expect(codes(decideLithium({ ...parcel, contents: [pack, metal] }))).toContain('mixed_chemistries');
  });
});

describe('the mark', () => {
  test('is left off for button cells in tools, however many', () => {
    const coin = { chemistry: 'lithium_metal', form: 'button_cell', lithiumGrams: 0.1, count: 40 } as const;
    expect(decide(coin, { parcelsInConsignment: undefined }).mark).toMatchObject({ required: false });
  });

  test('is put on where cells and batteries share a parcel, since the exemption names one or the other', () => {
    const contents: LithiumContent[] = [pack, { ...pack, form: 'cell', wattHours: 9 }];
    expect(decideLithium({ ...parcel, contents }).mark?.required).toBe(true);
  });

  test('needs the number of parcels only where that decides', () => {
    expect(decide({ count: 2 }, { parcelsInConsignment: undefined })).toMatchObject({
      answer: 'ask',
      missing: [{ code: 'parcels_in_consignment' }],
    });
    expect(decide({ count: 3 }, { parcelsInConsignment: undefined }).mark?.required).toBe(true);
  });
});

test('a parcel without lithium may leave; a parcel nobody has looked into may not', () => {
  expect(decideLithium({ ...parcel, contents: [] })).toMatchObject({ answer: 'no_lithium', mayLeave: true });
  expect(decideLithium({ ...parcel, contents: undefined })).toMatchObject({
    answer: 'ask',
    missing: [{ code: 'contents' }],
  });
});

test.each([0, -36, Number.NaN, Number.POSITIVE_INFINITY, undefined])('%p watt-hours count as unknown', (wattHours) => {
  expect(decide({ wattHours })).toMatchObject({ answer: 'ask', missing: [{ code: 'watt_hours', content: 0 }] });
});

test('watt-hours of nonsense ratings are not guessed', () => {
  const cell = { nominalVolts: 3.6, ampereHours: 2.5 };
  expect(packWattHours(cell, 3, 0)).toBeUndefined();
  expect(packWattHours(cell, 1.5, 1)).toBeUndefined();
  expect(packWattHours({ ...cell, ampereHours: Number.NaN }, 3, 1)).toBeUndefined();
});

const contents: fc.Arbitrary<LithiumContent> = fc.record({
  chemistry: fc.constantFrom('lithium_ion', 'lithium_metal', 'unknown'),
  form: fc.constantFrom('cell', 'button_cell', 'battery', 'unknown'),
  placement: fc.constantFrom('contained_in_equipment', 'packed_with_equipment', 'alone', 'loose_in_kit', 'unknown'),
  condition: fc.constantFrom('sound', 'sound', 'sound', 'damaged', 'faulty', 'recalled', 'for_disposal', 'unknown'),
  designTest: fc.constantFrom('passed', 'passed', 'not_passed', 'unknown'),
  count: fc.option(fc.integer({ min: 0, max: 8 }), { nil: undefined }),
  wattHours: fc.option(fc.double({ min: 0, max: 200, noNaN: true }), { nil: undefined }),
  lithiumGrams: fc.option(fc.double({ min: 0, max: 4, noNaN: true }), { nil: undefined }),
  wattHoursOnCase: fc.option(fc.boolean(), { nil: undefined }),
  chargePercent: fc.option(fc.integer({ min: 0, max: 100 }), { nil: undefined }),
  neededByEquipment: fc.option(fc.integer({ min: 1, max: 4 }), { nil: undefined }),
  netKilograms: fc.option(fc.double({ min: 0.001, max: 12, noNaN: true }), { nil: undefined }),
});
const parcels: fc.Arbitrary<LithiumParcel> = fc.record({
  mode: fc.constantFrom('road', 'sea', 'passenger_aircraft', 'cargo_aircraft', 'letter_post', 'unknown'),
  day: fc.constantFrom('2022-06-01', '2024-05-05', '2025-07-01', '2026-12-01', '2040-01-01'),
  direction: fc.constantFrom('outbound', 'inbound'),
  contents: fc.option(fc.array(contents, { minLength: 1, maxLength: 3 }), { nil: undefined, freq: 20 }),
  parcelsInConsignment: fc.option(fc.integer({ min: 1, max: 4 }), { nil: undefined }),
  grossKilograms: fc.option(fc.double({ min: 0.1, max: 40, noNaN: true }), { nil: undefined }),
});

describe('for any parcel', () => {
  test('what may leave has every deciding fact known, sound and tested', () => {
    let left = 0;
    fc.assert(
      fc.property(parcels, (any) => {
        const decision = decideLithium(any);
        if (!decision.mayLeave) return;
        left += 1;
        expect(decision.missing).toEqual([]);
        expect(decision.applied).toHaveLength(any.contents?.length ?? -1);
        expect(decision.mark).toBeDefined();
        for (const content of any.contents ?? []) {
          expect([content.condition, content.designTest]).toEqual(['sound', 'passed']);
          expect([content.placement, content.form, content.chemistry]).not.toContain('unknown');
          expect(content.placement).not.toBe('loose_in_kit');
        }
      }),
      { numRuns: 20_000, seed: 1 },
    );
    expect(left).toBeGreaterThan(50);
  });

  test('forgetting a fact never makes the answer better', () => {
    const facts = ['chemistry', 'form', 'placement', 'condition', 'designTest'] as const;
    fc.assert(
      fc.property(parcels, fc.constantFrom(...facts), (any, fact) => {
        const forgotten = { ...any, contents: any.contents?.map((each) => ({ ...each, [fact]: 'unknown' as const })) };
        expect(decideLithium(forgotten).mayLeave).toBe(false);
      }),
      { numRuns: 2000, seed: 2 },
    );
  });

  test('one damaged battery keeps the whole parcel back, and each code has its sentence', () => {
    fc.assert(
      fc.property(parcels, (any) => {
        const decision = decideLithium({
          ...any,
          contents: [...(any.contents ?? []), { ...pack, condition: 'damaged' }],
        });
        expect(decision.mayLeave).toBe(false);
        for (const { code } of decision.reasons) expect(reasonSentences[code]).toMatch(/\.$/);
        for (const { code } of decision.missing) expect(missingSentences[code]).toMatch(/\.$/);
        for (const code of decision.conditions) expect(conditionSentences[code]).toMatch(/\.$/);
      }),
      { numRuns: 2000, seed: 3 },
    );
  });
});

describe('the tables', () => {
  test('each edition has one line per chemistry, placement and size', () => {
    for (const edition of lithiumEditions) {
      const keys = edition.rules.map((rule) => `${rule.chemistry} ${rule.placement} ${rule.size}`);
      expect(new Set(keys).size).toBe(12);
      expect(keys).toHaveLength(12);
      expect(edition.from < edition.until).toBe(true);
    }
  });

  test('while two editions overlap the newer one counts', () => {
    expect(editionFor('road', '2025-03-01')?.id).toBe('adr-2025');
    expect(editionFor('road', '2024-12-31')?.id).toBe('adr-2023');
    expect(editionFor('sea', '2025-03-01')?.id).toBe('imdg-42-24');
  });
});
