import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { Decimal } from '../measure/decimal.js';
import type { BillLine } from './bill-lines.js';
import { alternate, line } from './bill.builders.js';
import type { BuildQuestion } from './build-network.js';
import type { BuildPlan } from './build-plan.js';
import { buildable } from './buildable.js';

const pieces = (): number => 0;

function question(bills: Record<string, BillLine[]>, onHand: Record<string, string | number>): BuildQuestion {
  return {
    bills: new Map(Object.entries(bills)),
    part: 'iron',
    onHand: new Map(Object.entries(onHand)),
    decimals: pieces,
  };
}

function quantity(bills: Record<string, BillLine[]>, onHand: Record<string, string | number>): string {
  const result = buildable(question(bills, onHand));
  expect(result.atMost.toFixed()).toBe(result.quantity.toFixed());
  return result.quantity.toFixed();
}

describe('buildable quantity', () => {
  test('an empty shelf builds nothing', () => {
    expect(quantity({ iron: [line('1', 'core', 1)] }, {})).toBe('0');
  });

  test('the scarcest part decides', () => {
    expect(quantity({ iron: [line('1', 'core', 1), line('2', 'cell', 6)] }, { core: 9, cell: 41 })).toBe('6');
  });

  test('finished ones on the shelf are not built again', () => {
    expect(quantity({ iron: [line('1', 'core', 1)] }, { iron: 100, core: 2 })).toBe('2');
  });

  test('sub-assemblies on the shelf come before those that can be made', () => {
    const bills = { iron: [line('1', 'pack', 1)], pack: [line('1', 'cell', 3)] };
    expect(quantity(bills, { pack: 2, cell: 7 })).toBe('4');
  });

  test('a part used directly and in a sub-assembly is counted once', () => {
    const bills = { iron: [line('1', 'board', 1), line('2', 'screw', 2)], board: [line('1', 'screw', 4)] };
    expect(quantity(bills, { screw: 30 })).toBe('5');
    expect(quantity(bills, { screw: 30, board: 3 })).toBe('7');
  });

  test('a loss on a batch costs whole pieces of the batch, not of each unit', () => {
    const bills = { iron: [line('1', 'sleeve', 1, { scrap: '0.02' })] };
    expect(quantity(bills, { sleeve: 51 })).toBe('49');
    expect(quantity(bills, { sleeve: 50 })).toBe('49');
    expect(quantity(bills, { sleeve: 1 })).toBe('0');
  });

  test('what two lines could take is left to the line that has no other choice', () => {
    const bills = {
      iron: [line('1', 'switch A', 1, { alternates: [alternate('switch B')] }), line('2', 'switch A', 1)],
    };
    expect(quantity(bills, { 'switch A': 5, 'switch B': 5 })).toBe('5');
  });

  test('a chain of alternates is pulled through: filling lines one after another would stop at zero', () => {
    const bills = {
      iron: [
        line('1', 'a', 1, { alternates: [alternate('b')] }),
        line('2', 'a', 1, { alternates: [alternate('c')] }),
        line('3', 'b', 1, { alternates: [alternate('c')] }),
      ],
    };
    expect(quantity(bills, { a: 4, b: 4, c: 4 })).toBe('4');
  });

  test('one unit holds one kind on a line, unless the line says that kinds may mix', () => {
    const stock = { bolt: 3, screw: 7 };
    const mixed = { ...line('1', 'bolt', 5, { alternates: [alternate('screw')] }), alternatesMix: true };
    expect(quantity({ iron: [{ ...mixed, alternatesMix: false }] }, stock)).toBe('1');
    expect(quantity({ iron: [mixed] }, stock)).toBe('2');
  });

  test('two of an alternate may stand for one', () => {
    const bills = { iron: [line('1', 'big', 1, { alternates: [alternate('small', 1, 2)] })] };
    expect(quantity(bills, { big: 1, small: 5 })).toBe('3');
  });

  test('an alternate may be made', () => {
    const bills = {
      iron: [line('1', 'bought tip', 1, { alternates: [alternate('own tip')] })],
      'own tip': [line('1', 'rod', '0.08', { scrap: '0.2' })],
    };
    const asked = {
      ...question(bills, { 'bought tip': 2, 'own tip': 1, rod: '1' }),
      decimals: (part: string) => (part === 'rod' ? 3 : 0),
    };
    expect(buildable(asked).quantity.toFixed()).toBe('13');
  });

  test('stock beyond a whole step does not count', () => {
    expect(quantity({ iron: [line('1', 'core', 1)] }, { core: '2.999999' })).toBe('2');
  });

  test('large stocks are counted to the last piece', () => {
    expect(quantity({ iron: [line('1', 'screw', 7)] }, { screw: 6_999_999_999 })).toBe('999999999');
  });

  test('the plan keeps to the line’s own part where it can', () => {
    const bills = { iron: [line('1', 'a', 1, { alternates: [alternate('b')] }), line('2', 'core', 1)] };
    const { plan } = buildable(question(bills, { a: 9, b: 9, core: 5 }));
    expect(plan.takes.map(({ part, quantity: taken }) => `${taken.toFixed()} ${part}`)).toEqual(['5 a', '5 core']);
  });

  test.each<[string, Record<string, BillLine[]>, Record<string, string | number>]>([
    ['iron has no bill', {}, { core: 5 }],
    ['iron has no bill', { iron: [] }, { core: 5 }],
    ['contains itself: iron → pack → iron', { iron: [line('1', 'pack', 1)], pack: [line('1', 'iron', 1)] }, {}],
    ['stock of core of -1 is below zero', { iron: [line('1', 'core', 1)] }, { core: -1 }],
    ['too large to be counted', { iron: [line('1', 'core', 1)] }, { core: '1e9'.replace('e9', '0'.repeat(14)) }],
  ])('is refused: %s', (reason, bills, onHand) => {
    expect(() => buildable(question(bills, onHand))).toThrow(reason);
  });
});

/** A bill as plain whole numbers: a scrap share of s tenths, parts p0 … p6, lines only downward. */
interface Case {
  readonly decimals: readonly number[];
  readonly stock: readonly number[];
  readonly lines: readonly {
    readonly parent: number;
    readonly options: readonly { readonly part: number; readonly factor: number }[];
    readonly per: number;
    readonly scrapTenths: number;
    readonly mix: boolean;
  }[];
}

const partCount = 6;

const cases: fc.Arbitrary<Case> = fc
  .record({
    decimals: fc
      .array(fc.constantFrom(0, 0, 0, 1), { minLength: partCount, maxLength: partCount })
      .map((d) => [0, ...d.slice(1)]),
    stock: fc.array(fc.nat(9), { minLength: partCount, maxLength: partCount }),
    lines: fc
      .array(
        fc.record({
          parent: fc.constantFrom(0, 0, 0, 1, 2),
          parts: fc.uniqueArray(fc.integer({ min: 1, max: partCount - 1 }), { minLength: 1, maxLength: 3 }),
          factors: fc.array(fc.constantFrom(1, 1, 2), { minLength: 3, maxLength: 3 }),
          per: fc.constantFrom(1, 1, 2, 3),
          scrapTenths: fc.constantFrom(0, 0, 1, 5),
          mix: fc.boolean(),
        }),
        { minLength: 1, maxLength: 5 },
      )
      .map((rows) =>
        rows
          .map(({ parts, factors, parent, ...row }) => ({
            ...row,
            parent,
            options: parts
              .filter((p) => p > parent)
              .map((part, n) => ({ part, factor: n === 0 ? 1 : (factors[n] ?? 1) })),
          }))
          .filter(({ options }) => options.length > 0),
      ),
  })
  .filter(({ lines }) => lines.some(({ parent }) => parent === 0));

function toQuestion({ decimals, stock, lines }: Case): BuildQuestion {
  const bills = new Map<string, BillLine[]>();
  lines.forEach(({ parent, options, per, scrapTenths, mix }, index) => {
    const [own, ...others] = options;
    const alternates = others.map(({ part, factor }, rank) => alternate(`p${part}`, rank, factor));
    const row = line(`${index}`, `p${own?.part}`, per, { scrap: `0.${scrapTenths}`, alternates });
    bills.set(`p${parent}`, [...(bills.get(`p${parent}`) ?? []), { ...row, alternatesMix: mix }]);
  });
  const onHand = new Map(stock.map((steps, part) => [`p${part}`, new Decimal(steps).div(10 ** (decimals[part] ?? 0))]));
  return { bills, part: 'p0', onHand, decimals: (part) => decimals[Number(part.slice(1))] ?? 0 };
}

const rowsOf = ({ lines }: Case, part: number): Case['lines'] => lines.filter(({ parent }) => parent === part);

/** Independent model: try every division of every line among its options, in plain whole numbers. */
function isPossible(shop: Case, quantity: number): boolean {
  const size = (part: number): number => 10 ** (shop.decimals[part] ?? 0);
  const visitPart = (part: number, need: readonly number[]): boolean => {
    if (part === partCount) return true;
    const rows = rowsOf(shop, part);
    const short = part === 0 ? quantity : Math.max(0, (need[part] ?? 0) - (shop.stock[part] ?? 0));
    if (short > 0 && rows.length === 0) return false;
    return visitLine(part, rows, 0, short, need);
  };
  const visitLine = (
    part: number,
    rows: Case['lines'],
    at: number,
    built: number,
    need: readonly number[],
  ): boolean => {
    const row = rows[at];
    if (row === undefined) return visitPart(part + 1, need);
    const keep = 10 - row.scrapTenths;
    const own = row.options[0]?.part ?? 0;
    const total = row.mix ? Math.ceil((built * row.per * 10 * size(own)) / (keep * size(part))) : built;
    const taken = (option: number, factor: number, share: number): number =>
      row.mix
        ? Math.ceil((share * factor * size(option)) / size(own))
        : Math.ceil((share * row.per * factor * 10 * size(option)) / (keep * size(part)));
    const divide = (index: number, left: number, sums: readonly number[]): boolean => {
      const option = row.options[index];
      if (option === undefined) return left === 0 && visitLine(part, rows, at + 1, built, sums);
      const from = index === row.options.length - 1 ? left : 0;
      for (let share = from; share <= left; share += 1) {
        const steps = taken(option.part, option.factor, share);
        const bought = rowsOf(shop, option.part).length === 0;
        if (bought && (sums[option.part] ?? 0) + steps > (shop.stock[option.part] ?? 0)) return false;
        if (
          divide(
            index + 1,
            left - share,
            sums.map((sum, p) => (p === option.part ? sum + steps : sum)),
          )
        )
          return true;
      }
      return false;
    };
    return divide(0, total, need);
  };
  return visitPart(
    0,
    shop.stock.map(() => 0),
  );
}

function greatestByTrying(shop: Case): number {
  let quantity = 0;
  while (isPossible(shop, quantity + 1)) quantity += 1;
  return quantity;
}

/** A plan is good if every line gets what it needs and nothing is taken that is not there. */
function checkPlan(shop: Case, built: number, plan: BuildPlan): void {
  const asked = toQuestion(shop);
  expect(plan.missing).toEqual([]);
  const made = new Map(plan.made.map(({ part, quantity: amount }) => [part, amount]));
  expect((made.get('p0') ?? new Decimal(0)).toNumber()).toBe(built);
  for (let part = 1; part < partCount; part += 1) {
    const taken = plan.takes.filter((take) => take.part === `p${part}`).map((take) => take.quantity);
    const sum = taken.reduce((total, amount) => total.plus(amount), new Decimal(0));
    const there = new Decimal(asked.onHand.get(`p${part}`) ?? 0).plus(made.get(`p${part}`) ?? 0);
    expect(sum.lessThanOrEqualTo(there)).toBe(true);
  }
}

describe('buildable quantity against trying everything', () => {
  test('is the same, is proven, and comes with a plan that adds up', () => {
    fc.assert(
      fc.property(cases, (shop) => {
        const result = buildable(toQuestion(shop));
        expect(result.quantity.toNumber()).toBe(greatestByTrying(shop));
        expect(result.atMost.toFixed()).toBe(result.quantity.toFixed());
        checkPlan(shop, result.quantity.toNumber(), result.plan);
      }),
      { numRuns: 600 },
    );
  });
});
