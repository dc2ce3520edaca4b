import { describe, expect, test } from '@jest/globals';
import { bills } from '../bill/bill.builders.js';
import type { PartPlan } from './netting.js';
import { planRequirements } from './netting.js';
import { plannedPart, timed } from './plan.builders.js';
import { plainPeriods } from './timeline.js';

/** The books count periods from 1; so does this: period → quantity, zeros left out. */
function row(values: readonly number[] | undefined, first = 1): Record<number, number> {
  return Object.fromEntries(
    (values ?? []).map((value, index) => [index + first, value]).filter(([, value]) => value !== 0),
  );
}

function releases(plan: PartPlan | undefined, first = 1): Record<number, number> {
  const sums: Record<number, number> = {};
  for (const { start, started } of plan?.orders ?? []) sums[start + first] = (sums[start + first] ?? 0) + started;
  return sums;
}

function record(plan: PartPlan | undefined): unknown {
  return {
    gross: row(plan?.gross),
    net: row(plan?.net),
    receipts: row(plan?.planned),
    releases: releases(plan),
    end: plan?.projected.at(-1),
  };
}

describe('netting against published records', () => {
  test('speaker kit over four levels, lot for lot', () => {
    // J. Heizer and B. Render, Operations Management, chapter on material requirements planning, multi-level speaker kit
    // (from memory, recomputed).
    const structure = bills({
      A: [
        ['B', 2],
        ['C', 3],
      ],
      B: [
        ['D', 2],
        ['E', 2],
      ],
      C: [
        ['E', 2],
        ['F', 2],
      ],
      F: [
        ['D', 2],
        ['G', 1],
      ],
    });
    const items: [string, number, number][] = [
      ['A', 1, 10],
      ['B', 2, 15],
      ['C', 1, 20],
      ['D', 1, 10],
      ['E', 2, 10],
      ['F', 3, 5],
      ['G', 2, 0],
    ];
    const parts = items.map(([part, leadTime, stock]) =>
      plannedPart(part, { leadTime, stock, demands: part === 'A' ? timed('week', { 7: 50 }) : [] }),
    );
    const plan = planRequirements(structure, parts, plainPeriods(8));
    const expected = {
      A: { gross: { 8: 50 }, net: { 8: 40 }, receipts: { 8: 40 }, releases: { 7: 40 }, end: 0 },
      B: { gross: { 7: 80 }, net: { 7: 65 }, receipts: { 7: 65 }, releases: { 5: 65 }, end: 0 },
      C: { gross: { 7: 120 }, net: { 7: 100 }, receipts: { 7: 100 }, releases: { 6: 100 }, end: 0 },
      E: {
        gross: { 5: 130, 6: 200 },
        net: { 5: 120, 6: 200 },
        receipts: { 5: 120, 6: 200 },
        releases: { 3: 120, 4: 200 },
        end: 0,
      },
      F: { gross: { 6: 200 }, net: { 6: 195 }, receipts: { 6: 195 }, releases: { 3: 195 }, end: 0 },
      D: {
        gross: { 3: 390, 5: 130 },
        net: { 3: 380, 5: 130 },
        receipts: { 3: 380, 5: 130 },
        releases: { 2: 380, 4: 130 },
        end: 0,
      },
      G: { gross: { 3: 195 }, net: { 3: 195 }, receipts: { 3: 195 }, releases: { 1: 195 }, end: 0 },
    };
    for (const [part, rows] of Object.entries(expected)) expect([part, record(plan.get(part))]).toEqual([part, rows]);
  });

  test('trumpet: valve casings in weeks 8 to 17, and three valves for each', () => {
    // S. Nahmias, Production and Operations Analysis, chapter on material requirements planning (from memory,
    // recomputed). Period 0 is week 1.
    const gross = Object.fromEntries(
      [77, 42, 38, 21, 26, 112, 45, 14, 76, 38].map((value, index) => [index + 7, value]),
    );
    const casing = plannedPart('casing', {
      leadTime: 4,
      receipts: timed('open', { 6: 23, 7: 12, 9: 6, 10: 9 }),
      demands: timed('trumpets', gross),
    });
    const valve = plannedPart('valve', { leadTime: 3, receipts: timed('open', { 2: 186, 5: 96 }) });
    const plan = planRequirements(bills({ casing: [['valve', 3]] }), [valve, casing], plainPeriods(17));
    const casingNet = [42, 42, 32, 12, 26, 112, 45, 14, 76, 38];
    expect(row(plan.get('casing')?.net)).toEqual(
      Object.fromEntries(casingNet.map((value, index) => [index + 8, value])),
    );
    expect(releases(plan.get('casing'))).toEqual(
      Object.fromEntries(casingNet.map((value, index) => [index + 4, value])),
    );
    const valveGross = [126, 126, 96, 36, 78, 336, 135, 42, 228, 114];
    expect(row(plan.get('valve')?.gross)).toEqual(
      Object.fromEntries(valveGross.map((value, index) => [index + 4, value])),
    );
    expect(row(plan.get('valve')?.net)).toEqual({ 5: 66, 7: 36, 8: 78, 9: 336, 10: 135, 11: 42, 12: 228, 13: 114 });
    expect(releases(plan.get('valve'))).toEqual({ 2: 66, 4: 36, 5: 78, 6: 336, 7: 135, 8: 42, 9: 228, 10: 114 });
  });

  test('six items with open receipts and fixed lots', () => {
    // End-of-chapter problem of Jacobs and Chase, Operations and Supply Chain Management; worked by hand.
    const structure = bills({
      A: [
        ['B', 1],
        ['C', 1],
      ],
      B: [
        ['D', 3],
        ['F', 1],
      ],
      C: [
        ['B', 3],
        ['D', 1],
        ['E', 4],
      ],
      D: [['E', 1]],
    });
    const fixed = (size: number): { kind: 'fixed'; size: number } => ({ kind: 'fixed', size });
    const parts = [
      plannedPart('A', {
        leadTime: 2,
        stock: 5,
        receipts: timed('open', { 2: 10 }),
        lot: fixed(20),
        demands: timed('week', { 9: 20 }),
      }),
      plannedPart('B', { leadTime: 2, stock: 10, receipts: timed('open', { 6: 20 }), lot: fixed(40) }),
      plannedPart('C', { leadTime: 1 }),
      plannedPart('D', { leadTime: 3, stock: 100, lot: fixed(160) }),
      plannedPart('E', { leadTime: 2, stock: 100, receipts: timed('open', { 1: 60 }) }),
      plannedPart('F', { leadTime: 2, receipts: timed('open', { 4: 40 }) }),
    ];
    const plan = planRequirements(structure, parts, plainPeriods(10));
    const expected = {
      A: { gross: { 10: 20 }, net: { 10: 5 }, receipts: { 10: 20 }, releases: { 8: 20 }, end: 15 },
      C: { gross: { 8: 20 }, net: { 8: 20 }, receipts: { 8: 20 }, releases: { 7: 20 }, end: 0 },
      B: {
        gross: { 7: 60, 8: 20 },
        net: { 7: 30, 8: 10 },
        receipts: { 7: 40, 8: 40 },
        releases: { 5: 40, 6: 40 },
        end: 30,
      },
      D: { gross: { 5: 120, 6: 120, 7: 20 }, net: { 5: 20 }, receipts: { 5: 160 }, releases: { 2: 160 }, end: 0 },
      F: { gross: { 5: 40, 6: 40 }, net: { 6: 40 }, receipts: { 6: 40 }, releases: { 4: 40 }, end: 0 },
      E: { gross: { 2: 160, 7: 80 }, net: { 7: 80 }, receipts: { 7: 80 }, releases: { 5: 80 }, end: 0 },
    };
    for (const [part, rows] of Object.entries(expected)) expect([part, record(plan.get(part))]).toEqual([part, rows]);
  });

  test('a record with safety stock and fixed lots: constructed, no published source', () => {
    const part = plannedPart('P', {
      stock: 60,
      safetyStock: 15,
      leadTime: 2,
      lot: { kind: 'fixed', size: 50 },
      receipts: timed('open', { 1: 50 }),
      demands: timed('week', { 0: 30, 2: 45, 3: 20, 5: 60, 6: 25, 7: 35 }),
    });
    const plan = planRequirements(new Map(), [part], plainPeriods(8)).get('P');
    expect(plan?.projected).toEqual([30, 80, 35, 15, 15, 55, 30, 45]);
    expect(plan?.net).toEqual([0, 0, 0, 0, 0, 60, 0, 20]);
    expect(plan?.planned).toEqual([0, 0, 0, 0, 0, 100, 0, 50]);
    expect(releases(plan)).toEqual({ 4: 100, 6: 50 });
  });
});
