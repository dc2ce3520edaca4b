import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import { bills, line } from '../bill/bill.builders.js';
import type { BillLine } from '../bill/bill-lines.js';
import { isoDay } from './iso-day.js';
import { type PartPlan, planRequirements } from './netting.js';
import { type PegTarget, finalPegs, pegPart } from './pegging.js';
import { plannedPart, timed } from './plan.builders.js';
import { planMessages } from './plan-messages.js';
import type { LotPolicy, PlannedPart } from './planned-part.js';
import { plainPeriods, weeksFrom } from './timeline.js';

function planOne(part: PlannedPart, periods = 8): PartPlan {
  const plan = planRequirements(new Map(), [part], plainPeriods(periods)).get(part.part);
  if (plan === undefined) throw new Error('not planned');
  return plan;
}

const messages = (plan: PartPlan): string[] => planMessages(plan).map((message) => Object.values(message).join(' '));

describe('netting', () => {
  test('nothing wanted, nothing planned', () => {
    expect(planRequirements(new Map(), [], plainPeriods(4))).toEqual(new Map());
    expect(planOne(plannedPart('P', { stock: 5 })).orders).toEqual([]);
  });

  test('a loss makes more be started than is wanted, and components follow what is started', () => {
    const parts = [plannedPart('iron', { lossShare: '0.1', demands: timed('order', { 2: 20 }) }), plannedPart('core')];
    const plan = planRequirements(bills({ iron: [['core', 1]] }), parts, plainPeriods(4));
    expect(plan.get('iron')?.orders).toMatchObject([{ good: 20, started: 23, due: 2 }]);
    expect(plan.get('core')?.gross).toEqual([0, 0, 23, 0]);
  });

  test('what expires is not counted on, and what expires first is used first', () => {
    const flux = plannedPart('flux', {
      onHand: [{ quantity: 10 }, { quantity: 6, expires: 2 }],
      demands: timed('batch', { 0: 4, 3: 9 }),
    });
    const plan = planOne(flux, 4);
    expect(plan.expired).toEqual([0, 0, 2, 0]);
    expect(plan.projected).toEqual([12, 12, 10, 1]);
    expect(messages(plan)).toEqual(['expires_unused 2 2']);
  });

  test('an order covers no more periods than what arrives can be kept', () => {
    const glue = plannedPart('glue', {
      shelfLife: 2,
      lot: { kind: 'period', periods: 5 },
      demands: timed('batch', { 0: 1, 1: 2, 2: 4, 3: 8 }),
    });
    expect(planOne(glue, 4).planned).toEqual([3, 0, 12, 0]);
  });

  test('a lot that must be large and spoils is ordered again', () => {
    const glue = plannedPart('glue', {
      shelfLife: 2,
      lot: { kind: 'fixed', size: 10 },
      demands: timed('batch', { 0: 1, 3: 1 }),
    });
    const plan = planOne(glue, 4);
    expect(plan.planned).toEqual([10, 0, 0, 10]);
    expect(plan.expired).toEqual([0, 0, 9, 0]);
  });

  test('a late start is planned and told, and asks for components at once', () => {
    const parts = [
      plannedPart('iron', { leadTime: 3, demands: timed('order', { 1: 5 }) }),
      plannedPart('core', { leadTime: 1 }),
    ];
    const plan = planRequirements(bills({ iron: [['core', 1]] }), parts, plainPeriods(4));
    expect(plan.get('iron')?.orders).toMatchObject([{ due: 1, start: 0, late: 2 }]);
    expect(plan.get('core')?.orders).toMatchObject([{ due: 0, start: 0, late: 1 }]);
  });

  test('demands before the horizon count now, demands beyond it not at all', () => {
    const plan = planOne(plannedPart('P', { demands: timed('order', { '-3': 2, 3: 1, 9: 50 }) }), 4);
    expect(plan.gross).toEqual([2, 0, 0, 1]);
    expect(messages(plan)).toContain('demand_overdue order -3 2');
  });

  test('a rule’s order is raised to what can be bought', () => {
    const lot: LotPolicy = { kind: 'period', periods: 2 };
    const part = plannedPart('P', {
      lot,
      least: { minimum: 10, multiple: 4 },
      demands: timed('order', { 0: 3, 1: 4, 3: 20 }),
    });
    expect(planOne(part, 4).planned).toEqual([12, 0, 0, 16]);
  });

  test('lengths are planned in steps of their own decimals', () => {
    const parts = [
      plannedPart('iron', { demands: timed('order', { 0: 7 }) }),
      plannedPart('wire', { decimals: 3, stock: '1.5' }),
    ];
    const plan = planRequirements(
      new Map([['iron', [line('1', 'wire', '0.3333', { scrap: '0.1' })]]]),
      parts,
      plainPeriods(1),
    );
    expect(plan.get('wire')?.gross).toEqual([2593]);
    expect(plan.get('wire')?.orders).toMatchObject([{ good: 1093 }]);
  });

  test.each<[string, () => unknown]>([
    [
      'screw, used in iron, is not among',
      () =>
        planRequirements(
          bills({ iron: [['screw', 1]] }),
          [plannedPart('iron', { demands: timed('o', { 0: 1 }) })],
          plainPeriods(2),
        ),
    ],
    ['contains itself', () => planRequirements(bills({ A: [['A', 1]] }), [], plainPeriods(2))],
    ['A plan of 0 periods', () => plainPeriods(0)],
    ['A lead time of -1', () => planOne(plannedPart('P', { leadTime: -1, demands: timed('o', { 0: 1 }) }))],
    ['A lead time of 1.5', () => planOne(plannedPart('P', { leadTime: 1.5, demands: timed('o', { 0: 1 }) }))],
    ['is not from 0 to below 1', () => planOne(plannedPart('P', { lossShare: 1, demands: timed('o', { 0: 1 }) }))],
    ['The quantity -4 of P', () => planOne(plannedPart('P', { demands: timed('o', { 0: -4 }) }))],
    ['of P cannot be planned', () => planOne(plannedPart('P', { demands: timed('o', { 0: '9'.repeat(17) }) }))],
    [
      'of P cannot be planned',
      () => planOne(plannedPart('P', { demands: timed('o', { 0: '9007199254740990', 1: '9007199254740990' }) })),
    ],
  ])('is refused: %s', (reason, run) => {
    expect(run).toThrow(reason);
  });
});

describe('exceptions', () => {
  test('a receipt that comes after an order should come earlier', () => {
    const plan = planOne(
      plannedPart('P', { leadTime: 1, receipts: timed('open', { 5: 8 }), demands: timed('order', { 2: 6, 6: 2 }) }),
    );
    expect(messages(plan)).toEqual(['bring_forward open 5 5 2 6', 'put_off open 5 5 6 2', 'not_needed open 5 6']);
  });

  test('orders to start now and receipts that are overdue', () => {
    const plan = planOne(
      plannedPart('P', {
        leadTime: 2,
        safetyStock: 3,
        receipts: timed('open', { '-1': 1 }),
        demands: timed('order', { 2: 6 }),
      }),
    );
    expect(messages(plan)).toEqual([
      'receipt_overdue open -1 1',
      'start_is_late 0 2 2',
      'start_now 1 6',
      'below_safety_stock 3',
    ]);
  });

  test('a receipt that comes in time and is used says nothing', () => {
    expect(
      messages(planOne(plannedPart('P', { receipts: timed('open', { 2: 6 }), demands: timed('order', { 2: 6 }) }))),
    ).toEqual([]);
  });
});

describe('weeks of a calendar', () => {
  const calendar = { weekdays: [1, 2, 3, 4, 5], closedDays: new Set([isoDay('2026-12-25'), isoDay('2026-12-28')]) };
  const weeks = weeksFrom(isoDay('2026-12-16'), 4, calendar);

  test('begin on Monday, and what a week needs is due on its first working day from today on', () => {
    expect(weeks.mondays).toEqual(['2026-12-14', '2026-12-21', '2026-12-28', '2027-01-04']);
    expect(weeks.dueDays).toEqual(['2026-12-16', '2026-12-21', '2026-12-29', '2027-01-04']);
    expect(['2026-12-13', '2026-12-14', '2027-01-10', '2027-01-11'].map((day) => weeks.weekOf(isoDay(day)))).toEqual([
      -1, 0, 3, 4,
    ]);
  });

  test('lead times count working days and pass over closed days', () => {
    expect(weeks.startDay(2, 4)).toBe('2026-12-21');
    expect(weeks.startFor(2, 4)).toEqual({ period: 1, late: 0 });
    expect(weeks.startFor(2, 7)).toEqual({ period: 0, late: 0 });
    expect(weeks.startFor(2, 11)).toEqual({ period: 0, late: 4 });
    expect(weeks.startDay(2, 11)).toBeUndefined();
    expect(weeks.startFor(1, 0)).toEqual({ period: 1, late: 0 });
  });
});

describe('messages about receipts', () => {
  test('can all be followed together: the plan still keeps the safety stock', () => {
    const rows = fc
      .array(fc.tuple(fc.nat(7), fc.nat(30)), { maxLength: 4 })
      .map((list) => list.map(([period, quantity], index) => ({ id: `${index}`, period, quantity })));
    fc.assert(
      fc.property(fc.nat(20), fc.nat(6), rows, rows, (stock, safetyStock, receipts, demands) => {
        const plan = planOne(plannedPart('P', { stock, safetyStock, receipts, demands }));
        const projected = [...plan.projected];
        for (const message of planMessages(plan)) {
          const from = receipts.find(({ id }) => 'receipt' in message && id === message.receipt)?.period ?? 0;
          const to = message.kind === 'put_off' ? message.to : message.kind === 'not_needed' ? 8 : from;
          for (let period = from; period < to; period += 1)
            projected[period] = (projected[period] ?? 0) - message.quantity;
        }
        expect(Math.min(...projected)).toBeGreaterThanOrEqual(safetyStock);
      }),
    );
  });
});

const policies: LotPolicy[] = [
  { kind: 'lot_for_lot' },
  { kind: 'fixed', size: 7 },
  { kind: 'minimum_and_multiple', minimum: 5, multiple: 3 },
  { kind: 'period', periods: 3 },
  { kind: 'economic', costs: { order: 20, holding: 1 } },
  { kind: 'silver_meal', costs: { order: 20, holding: 1 } },
  { kind: 'wagner_whitin', costs: { order: 20, holding: 1 } },
];

const timedRows = fc
  .array(fc.tuple(fc.integer({ min: -1, max: 9 }), fc.nat(30)), { maxLength: 4 })
  .map((rows) => rows.map(([period, quantity], index) => ({ id: `${index}`, period, quantity })));

const anyPart = (part: string): fc.Arbitrary<PlannedPart> =>
  fc.record({
    part: fc.constant(part),
    decimals: fc.constant(0),
    onHand: fc.array(fc.record({ quantity: fc.nat(20), expires: fc.option(fc.nat(8), { nil: undefined }) }), {
      maxLength: 3,
    }),
    safetyStock: fc.constantFrom(0, 0, 5),
    leadTime: fc.nat(3),
    lot: fc.constantFrom(...policies),
    lossShare: fc.constantFrom('0', '0', '0.1'),
    shelfLife: fc.constantFrom(undefined, undefined, 3),
    receipts: timedRows,
    demands: timedRows,
  }) as fc.Arbitrary<PlannedPart>;

const shops = fc.record({
  parts: fc.tuple(...['p0', 'p1', 'p2', 'p3', 'p4'].map(anyPart)),
  edges: fc.array(
    fc.tuple(fc.nat(3), fc.integer({ min: 1, max: 4 }), fc.integer({ min: 1, max: 3 }), fc.constantFrom('0', '0.05')),
    { maxLength: 6 },
  ),
});

function planShop({
  parts,
  edges,
}: {
  parts: PlannedPart[];
  edges: [number, number, number, string][];
}): ReadonlyMap<string, PartPlan> {
  const rows = new Map<string, BillLine[]>();
  edges.forEach(([parent, step, per, scrap], index) => {
    if (parent + step > 4) return;
    const key = `p${parent}`;
    rows.set(key, [...(rows.get(key) ?? []), line(`${index}`, `p${parent + step}`, per, { scrap })]);
  });
  return planRequirements(rows, parts, plainPeriods(8));
}

describe('any plan', () => {
  test('never falls below the safety stock, and each period follows from the one before', () => {
    fc.assert(
      fc.property(shops, (shop) => {
        for (const plan of planShop(shop).values()) {
          let stock = plan.part.onHand.reduce((sum, { quantity }) => sum + Number(quantity), 0);
          plan.gross.forEach((gross, period) => {
            stock += (plan.scheduled[period] ?? 0) + (plan.planned[period] ?? 0) - gross - (plan.expired[period] ?? 0);
            expect(plan.projected[period]).toBe(stock);
            expect(stock).toBeGreaterThanOrEqual(Number(plan.part.safetyStock));
            if ((plan.planned[period] ?? 0) > 0) expect(plan.net[period]).toBeGreaterThan(0);
          });
        }
      }),
      { numRuns: 300 },
    );
  });

  test('what components are asked for is what started orders take', () => {
    fc.assert(
      fc.property(shops, (shop) => {
        const plans = planShop(shop);
        for (const plan of plans.values()) {
          expect(plan.requirements.reduce((sum, { quantity }) => sum + quantity, 0)).toBe(
            plan.gross.reduce((sum, q) => sum + q, 0),
          );
          for (const { cause, period } of plan.requirements) {
            if (cause.kind === 'order') expect(plans.get(cause.part)?.orders[cause.index]?.start).toBe(period);
          }
        }
      }),
    );
  });

  test('pegs add up on both sides, and nothing is used before it is there', () => {
    fc.assert(
      fc.property(shops, (shop) => {
        for (const plan of planShop(shop).values()) {
          const taken = new Map<string, number>();
          for (const { quantity, pegs, period } of pegPart(plan)) {
            expect(pegs.reduce((sum, peg) => sum + peg.quantity, 0)).toBe(quantity);
            for (const peg of pegs) {
              expect(peg.period).toBeGreaterThanOrEqual(period);
              const key = JSON.stringify([peg.target, peg.period]);
              taken.set(key, peg.quantity + (taken.get(key) ?? 0));
            }
          }
          const asked = new Map<string, number>();
          for (const { cause, period, quantity } of plan.requirements) {
            const key = JSON.stringify([cause satisfies PegTarget, period]);
            asked.set(key, quantity + (asked.get(key) ?? 0));
          }
          for (const [key, quantity] of asked) expect(taken.get(key)).toBe(quantity);
        }
      }),
      { numRuns: 300 },
    );
  });

  test('followed to the end, the pegs of every order add up to what is started', () => {
    fc.assert(
      fc.property(shops, (shop) => {
        const plans = planShop(shop);
        const final = finalPegs(plans);
        for (const [part, plan] of plans) {
          for (const { index, started } of plan.orders) {
            expect(final(part, index).reduce((sum, { quantity }) => sum + quantity, 0)).toBe(started);
          }
        }
      }),
      { numRuns: 200 },
    );
  });

  test('every lot is of the size its rule allows', () => {
    fc.assert(
      fc.property(shops, (shop) => {
        for (const { part, orders } of planShop(shop).values()) {
          for (const { good } of orders) {
            if (part.lot.kind === 'fixed') expect(good % 7).toBe(0);
            if (part.lot.kind === 'minimum_and_multiple') expect([good >= 5, good % 3]).toEqual([true, 0]);
          }
        }
      }),
    );
  });
});

describe('one part, lot for lot, against a plain model', () => {
  test('orders exactly what is short, when it is short', () => {
    fc.assert(
      fc.property(fc.nat(20), fc.nat(6), timedRows, timedRows, (stock, safetyStock, receipts, demands) => {
        const plan = planOne(plannedPart('P', { stock, safetyStock, receipts, demands }));
        const at = (rows: typeof demands, period: number): number =>
          rows.filter((row) => Math.max(0, row.period) === period).reduce((sum, row) => sum + row.quantity, 0);
        let there = stock;
        const expected = Array.from({ length: 8 }, (_, period) => {
          there += at(receipts, period) - at(demands, period);
          const order = there < safetyStock ? safetyStock - there : 0;
          there += order;
          return order;
        });
        expect(plan.planned).toEqual(expected);
      }),
    );
  });
});
