import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import { type ParameterValue, type RuleCondition, checkAlternateRule } from './alternate-rule.js';
import { type Candidate, chooseAlternates } from './alternates.js';
import { alternate, line } from './bill.builders.js';

const rule: RuleCondition[] = [
  { parameter: 'channel', kind: 'one_of', words: ['N'] },
  { parameter: 'drain-source voltage', kind: 'at_least', value: 30, unit: 'V' },
  { parameter: 'on resistance', kind: 'at_most', value: '8', unit: 'mΩ' },
  { parameter: 'case', kind: 'one_of', words: ['TO-220', 'TO-247'] },
];

const parameters = (rows: Record<string, ParameterValue>): Map<string, ParameterValue> => new Map(Object.entries(rows));

const good = {
  channel: { text: 'n' },
  'drain-source voltage': { number: 40, unit: 'V' },
  'on resistance': { number: '0.0065', unit: 'Ω' },
  case: { text: ' to-220 ' },
};

describe('a rule over parameters', () => {
  test('accepts a part that meets every condition, in whatever unit it states it', () => {
    expect(checkAlternateRule(rule, parameters(good))).toEqual({ accepted: true, refusals: [] });
  });

  test('names every condition that fails, with what was found and what was wanted', () => {
    const bad = parameters({
      channel: { text: 'P' },
      'drain-source voltage': { number: 24, unit: 'V' },
      'on resistance': { number: 9, unit: 'mΩ' },
    });
    expect(checkAlternateRule(rule, bad)).toEqual({
      accepted: false,
      refusals: [
        { parameter: 'channel', reason: 'other_word', found: 'P', wanted: 'N' },
        { parameter: 'drain-source voltage', reason: 'too_low', found: '24 V', wanted: 'at least 30 V' },
        { parameter: 'on resistance', reason: 'too_high', found: '9 mΩ', wanted: 'at most 8 mΩ' },
        { parameter: 'case', reason: 'not_stated', wanted: 'TO-220 or TO-247' },
      ],
    });
  });

  test('the bound itself is good enough', () => {
    const edge = parameters({
      ...good,
      'drain-source voltage': { number: '30.0', unit: 'V' },
      'on resistance': { number: '0.008', unit: 'Ω' },
    });
    expect(checkAlternateRule(rule, edge).accepted).toBe(true);
  });

  test.each<[ParameterValue, string]>([
    [{ number: 30, unit: 'A' }, 'unit_does_not_fit'],
    [{ number: 30 }, 'unit_does_not_fit'],
    [{ number: 30, unit: 'furlong' }, 'unit_does_not_fit'],
    [{ text: '30 V' }, 'not_a_number'],
    [{ number: 'NaN', unit: 'V' }, 'not_a_number'],
  ])('a statement that cannot be compared is refused: %p', (stated, reason) => {
    const row = parameters({ ...good, 'drain-source voltage': stated });
    expect(checkAlternateRule(rule, row).refusals.map((refusal) => refusal.reason)).toEqual([reason]);
  });

  test('a rule that asks nothing accepts nothing', () => {
    expect(checkAlternateRule([], parameters(good)).accepted).toBe(false);
  });

  test.each<RuleCondition>([
    { parameter: 'x', kind: 'one_of', words: [] },
    { parameter: 'x', kind: 'at_least', value: 'many', unit: 'V' },
    { parameter: 'x', kind: 'at_least', value: 1, unit: 'furlong' },
    { parameter: 'x', kind: 'between', low: 2, high: 1 },
  ])('a broken rule is refused: %p', (broken) => {
    expect(() => checkAlternateRule([broken], new Map())).toThrow('The rule on x');
  });

  test('between is at least and at most together', () => {
    fc.assert(
      fc.property(fc.integer({ min: -20, max: 20 }), fc.integer({ min: -9, max: 0 }), fc.nat(9), (value, low, high) => {
        const stated = parameters({ x: { number: value } });
        const verdict = (condition: RuleCondition): boolean => checkAlternateRule([condition], stated).accepted;
        expect(verdict({ parameter: 'x', kind: 'between', low, high })).toBe(
          verdict({ parameter: 'x', kind: 'at_least', value: low }) &&
            verdict({ parameter: 'x', kind: 'at_most', value: high }),
        );
      }),
    );
  });
});

describe('choosing among alternates', () => {
  const part = (name: string, available: number, more: Partial<Candidate> = {}): Candidate => ({
    part: name,
    available,
    parameters: parameters(good),
    ...more,
  });
  const text = (candidates: Candidate[], need: number): string[] => {
    const row = line('1', 'own', 1, {
      alternates: [alternate('second', 2), alternate('first', 1), alternate('double', 3, 2)],
    });
    const { candidates: chosen, short } = chooseAlternates(row, need, rule, candidates);
    return [
      ...chosen.map(({ part: name, standing, allowed, take }) => `${name} ${standing} ${allowed} ${take.toFixed()}`),
      `short ${short.toFixed()}`,
    ];
  };

  test('own part, then named ones by priority, then what the rule allows, then the refused', () => {
    const candidates = [
      part('weak', 99, { parameters: parameters({ ...good, channel: { text: 'P' } }) }),
      part('allowed', 9),
      part('second', 2),
      part('held', 50, { blocked: 'held for inspection' }),
      part('first', 3),
      part('own', 4),
    ];
    expect(text(candidates, 12)).toEqual([
      'own own true 4',
      'first named true 3',
      'second named true 2',
      'allowed by_rule true 3',
      'weak by_rule false 0',
      'held by_rule false 0',
      'short 0',
    ]);
  });

  test('a named alternate is not judged by the rule, a blocked own part is not taken', () => {
    expect(text([part('own', 5, { blocked: 'expired' }), part('first', 1, { parameters: new Map() })], 2)).toEqual([
      'first named true 1',
      'own own false 0',
      'short 1',
    ]);
  });

  test('two that stand for one count for half', () => {
    expect(text([part('double', 5)], 4)).toEqual(['double named true 5', 'short 1.5']);
  });

  test('what is taken and what is short add up to the need', () => {
    fc.assert(
      fc.property(fc.nat(50), fc.nat(20), fc.nat(20), fc.nat(20), (need, a, b, c) => {
        const row = line('1', 'own', 1, { alternates: [alternate('first')] });
        const { candidates, short } = chooseAlternates(row, need, rule, [
          part('other', c),
          part('first', b),
          part('own', a),
        ]);
        const sum = candidates.reduce((total, { take }) => total.plus(take), short);
        expect(sum.toNumber()).toBe(need);
        expect(short.toNumber()).toBe(Math.max(0, need - a - b - c));
        expect(new Decimal(candidates[0]?.take ?? 0).toNumber()).toBe(Math.min(need, a));
      }),
    );
  });
});
