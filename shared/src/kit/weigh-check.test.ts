import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { expectedWeight, type KitLine, type WeighingRule } from './kit-weight.js';
import { noticeableFrom, omissions, unnoticeable } from './noticeable.js';
import { planWeighings } from './sub-weighings.js';
import { weighCheck } from './weigh-verdict.js';
import { fewestGroups, type GroupItem } from './weighing-groups.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};
const rule: WeighingRule = { scaleGrams: 0.05, falseAlarmShare: 0.01, confidence: 0.99 };
const line = (
  part: string,
  pieces: number,
  grams: number,
  spreadGrams: number,
  meanUncertaintyGrams?: number,
): KitLine => ({
  part,
  pieces,
  grams,
  spreadGrams,
  meanUncertaintyGrams,
});
const kit = [
  line('case', 1, 84, 0.6),
  line('core', 1, 22, 0.2),
  line('cell', 3, 46, 0.15),
  line('screw', 12, 0.62, 0.01),
  line('resistor', 8, 0.09, 0.002),
];

describe('what a kit weighs', () => {
  it('is the sum of its pieces, and its variance the sum of theirs and the scale’s', () => {
    const { grams, spreadGrams, lowest, highest } = expectedWeight(kit, rule);
    expect(grams).toBeCloseTo(84 + 22 + 138 + 7.44 + 0.72, 10);
    // 0.36 + 0.04 + 3 × 0.0225 + 12 × 0.0001 + 8 × 0.000004 + 0.0025
    expect(spreadGrams ** 2).toBeCloseTo(0.471232, 10);
    expect([lowest, highest].map((limit) => (limit - grams) / spreadGrams)).toEqual([
      expect.closeTo(-2.575829, 5),
      expect.closeTo(2.575829, 5),
    ]);
  });

  it('counts the uncertainty of a mean once per piece, not by its root', () => {
    const sure = { ...rule, scaleGrams: 1e-9 };
    expect(expectedWeight([line('a', 100, 1, 0.1)], sure).spreadGrams).toBeCloseTo(1, 6);
    expect(expectedWeight([line('a', 100, 1, 0, 0.1)], sure).spreadGrams).toBeCloseTo(10, 6);
  });

  it.each<[string, readonly KitLine[], WeighingRule, string]>([
    ['nothing in it', [], rule, 'kit_empty'],
    ['no pieces of a part', [line('a', 0, 1, 0)], rule, 'kit_pieces'],
    ['half a piece', [line('a', 0.5, 1, 0)], rule, 'kit_pieces'],
    ['a part without weight', [line('a', 1, 0, 0)], rule, 'kit_weight'],
    ['a weight that is no number', [line('a', 1, NaN, 0)], rule, 'kit_weight'],
    ['a negative spread', [line('a', 1, 1, -1)], rule, 'kit_spread'],
    ['an endless mean uncertainty', [line('a', 1, 1, 0, Infinity)], rule, 'kit_spread'],
    ['a perfect scale', [line('a', 1, 1, 0)], { ...rule, scaleGrams: 0 }, 'kit_scale'],
    ['no false alarms at all', [line('a', 1, 1, 0)], { ...rule, falseAlarmShare: 0 }, 'kit_share'],
    ['certainty', [line('a', 1, 1, 0)], { ...rule, confidence: 1 }, 'kit_share'],
  ])('cannot be said with %s', (_what, lines, weighing, code) => {
    expect(codeOf(() => expectedWeight(lines, weighing))).toBe(code);
  });
});

describe('a weighed kit', () => {
  const { grams } = expectedWeight(kit, rule);

  it('is complete within the limits', () => {
    expect(weighCheck(grams + 1.7, kit, rule)).toMatchObject({ verdict: 'complete', explanations: [] });
    expect(weighCheck(grams - 1.7, kit, rule).verdict).toBe('complete');
  });

  it('that is too light names the piece that explains it', () => {
    const check = weighCheck(grams - 46.3, kit, rule);
    expect(check.verdict).toBe('too-light');
    expect(check.explanations.map(({ part, what }) => [part, what])).toEqual([['cell', 'missing']]);
  });

  it('that is too heavy names the piece too many', () => {
    const check = weighCheck(grams + 22.1, kit, rule);
    expect([check.verdict, check.explanations[0]?.part, check.explanations[0]?.what]).toEqual([
      'too-heavy',
      'core',
      'too-many',
    ]);
  });

  it('may be wrong in a way no single piece explains', () => {
    expect(weighCheck(grams - 60, kit, rule)).toMatchObject({ verdict: 'too-light', explanations: [] });
    expect(weighCheck(0, kit, rule).verdict).toBe('too-light');
  });

  it('needs a weight', () => {
    expect(codeOf(() => weighCheck(NaN, kit, rule))).toBe('kit_reading');
  });
});

describe('a missing piece', () => {
  it('that is light against the spread is not noticed', () => {
    expect(unnoticeable(kit, rule)).toEqual(['screw', 'resistor']);
  });

  it('is noticed with the probability of the normal distribution, summed up by small steps', () => {
    const { spreadGrams, grams, lowest } = expectedWeight(kit, rule);
    omissions(kit, rule).forEach(({ probability }, index) => {
      const { grams: own = 0, spreadGrams: ownSpread = 0 } = kit[index] ?? {};
      const spread = Math.sqrt(spreadGrams ** 2 - ownSpread ** 2);
      const mean = grams - own;
      let below = 0;
      const step = spread / 2000;
      for (let weight = mean - 9 * spread + step / 2; weight < Math.min(lowest, mean + 9 * spread); weight += step) {
        below += (step / (spread * Math.sqrt(2 * Math.PI))) * Math.exp(-(((weight - mean) / spread) ** 2) / 2);
      }
      expect(probability).toBeCloseTo(below, 3);
    });
  });
});

describe('the spread without the missing piece', () => {
  it('is the smaller one', () => {
    // Two pieces of 1 g ± 0.3 g: 0.4272 g with both, 0.3041 g with one; the alarm lies 2.5758 × 0.4272 below 2 g.
    const [omission] = omissions([line('a', 2, 1, 0.3)], rule);
    // Φ((1 − 1.1004) / 0.3041) = Φ(−0.330), from a table of the normal distribution.
    expect(omission?.probability).toBeCloseTo(0.3707, 3);
  });
});

describe('grouping into the fewest weighings', () => {
  const item = (size: number, room: number): GroupItem => ({ size, room });

  it('needs none for nothing and one for what fits together', () => {
    expect(fewestGroups([])).toEqual({ groups: [], proven: true });
    expect(fewestGroups([item(1, 3), item(2, 9)])).toMatchObject({ proven: true, groups: [expect.any(Array)] });
  });

  it('does better than putting each where it first fits', () => {
    const found = fewestGroups([4, 4, 3, 3, 3, 3].map((size) => item(size, 10)));
    expect(found.proven).toBe(true);
    expect(found.groups.map((group) => group.map(({ size }) => size))).toEqual([
      [4, 3, 3],
      [4, 3, 3],
    ]);
  });

  it('agrees with trying every grouping', () => {
    const items = fc.array(
      fc
        .record({ size: fc.integer({ min: 0, max: 20 }), more: fc.integer({ min: 0, max: 30 }) })
        .map(({ size, more }) => item(size, size + more)),
      { minLength: 1, maxLength: 7 },
    );
    fc.assert(
      fc.property(items, (list) => {
        let fewest = list.length;
        const tryAll = (index: number, groups: readonly (readonly GroupItem[])[]): void => {
          const next = list[index];
          if (!next) {
            const good = groups.every(
              (group) => group.reduce((sum, { size }) => sum + size, 0) <= Math.min(...group.map(({ room }) => room)),
            );
            if (good) fewest = Math.min(fewest, groups.length);
            return;
          }
          groups.forEach((_group, place) =>
            tryAll(
              index + 1,
              groups.map((group, at) => (at === place ? [...group, next] : group)),
            ),
          );
          tryAll(index + 1, [...groups, [next]]);
        };
        tryAll(0, []);
        const found = fewestGroups(list);
        expect(found.proven).toBe(true);
        expect(found.groups).toHaveLength(fewest);
        expect(found.groups.flat()).toHaveLength(list.length);
        expect(new Set(found.groups.flat()).size).toBe(list.length);
        for (const group of found.groups) {
          const size = group.reduce((sum, member) => sum + member.size, 0);
          expect(size).toBeLessThanOrEqual(Math.min(...group.map(({ room }) => room)));
        }
      }),
    );
  });
});

describe('the plan of weighings', () => {
  it('weighs screws and resistors apart from the rest', () => {
    const plan = planWeighings(kit, rule);
    expect(plan.weighings.map(({ lines }) => lines.map(({ part, pieces }) => [part, pieces]))).toEqual([
      [['screw', 12]],
    ]);
    expect(plan.countByHand).toEqual(['resistor']);
    expect(plan.proven).toBe(true);
  });

  it('weighs nothing apart when the whole kit says enough', () => {
    expect(planWeighings([line('case', 1, 84, 0.6), line('cell', 3, 46, 0.15)], rule)).toEqual({
      weighings: [],
      countByHand: [],
      proven: true,
    });
  });

  it('splits a line whose own spread hides a piece, into nearly equal lots', () => {
    const plan = planWeighings([line('spring', 50, 1, 0.1), line('case', 1, 84, 3)], rule);
    // A gram shows while the variance is at most (1 / 4.902)² − 0.05² = 0.0391: three pieces of 0.01, not four.
    expect(plan.weighings.map(({ lines }) => lines.map(({ pieces }) => pieces))).toEqual([
      ...Array.from({ length: 16 }, () => [3]),
      [2],
    ]);
    expect(plan.weighings.flatMap(({ lines }) => lines).reduce((sum, { pieces }) => sum + pieces, 0)).toBe(50);
  });

  it('leaves what no weighing shows to counting', () => {
    expect(planWeighings([line('washer', 5, 0.1, 0.05), line('case', 1, 84, 3)], rule).countByHand).toEqual(['washer']);
  });

  it('makes every missing piece show, or says to count it', () => {
    const lines = fc
      .array(
        fc.record({
          pieces: fc.integer({ min: 1, max: 20 }),
          grams: fc.integer({ min: 1, max: 3000 }).map((value) => value / 100),
          spread: fc.integer({ min: 0, max: 40 }),
          mean: fc.integer({ min: 0, max: 5 }),
        }),
        { minLength: 1, maxLength: 12 },
      )
      .map((list) =>
        list.map(({ pieces, grams, spread, mean }, index) =>
          line(`part ${index}`, pieces, grams, (grams * spread) / 1000, (grams * mean) / 1000),
        ),
      );
    fc.assert(
      fc.property(lines, (list) => {
        const plan = planWeighings(list, rule);
        const hidden = unnoticeable(list, rule);
        for (const { lines: onScale, expected } of plan.weighings) {
          for (const { noticeable, probability } of omissions(onScale, rule)) {
            expect(noticeable).toBe(true);
            expect(probability).toBeGreaterThanOrEqual(rule.confidence - 1e-9);
          }
          expect(Math.min(...onScale.map(({ grams }) => grams))).toBeGreaterThanOrEqual(
            noticeableFrom(expected.spreadGrams, rule) * (1 - 1e-12),
          );
        }
        const weighed = new Map<string, number>();
        for (const { part, pieces } of plan.weighings.flatMap(({ lines: onScale }) => onScale)) {
          weighed.set(part, (weighed.get(part) ?? 0) + pieces);
        }
        for (const { part, pieces } of list) {
          const wanted = hidden.includes(part) && !plan.countByHand.includes(part) ? pieces : undefined;
          expect(weighed.get(part)).toBe(wanted);
        }
      }),
    );
  });
});
