import { describe, expect, test } from '@jest/globals';
import fc from 'fast-check';
import type { BillLine } from './bill-lines.js';
import { alternate, line } from './bill.builders.js';
import { compareBills } from './compare.js';

describe('comparison of two revisions', () => {
  test('equal bills have no changes, also when numbers are written differently', () => {
    const before = [line('1', 'screw', '2', { alternates: [alternate('bolt'), alternate('rivet', 2)] })];
    const after = [line('1', 'screw', '2.00', { alternates: [alternate('rivet', 2, '1.0'), alternate('bolt')] })];
    expect(compareBills(before, after)).toEqual([]);
  });

  test('every changed field is named', () => {
    const [before] = [line('1', 'screw', 2)];
    const after = line('1', 'screw', 3, { scrap: '0.1', alternates: [alternate('bolt')] });
    expect(compareBills([before], [after])).toEqual([
      { kind: 'changed', before, after, fields: ['quantityPer', 'scrapShare', 'alternates'] },
    ]);
  });

  test('an exchanged part at the same position is a change, not a removal and an addition', () => {
    const [before, after] = [line('R1', 'resistor 47', 1), line('R1', 'resistor 100', 1)];
    expect(compareBills([before], [after])).toEqual([{ kind: 'changed', before, after, fields: ['part'] }]);
  });

  test('a deleted line with the rest renumbered does not read as all changed', () => {
    const before = [line('1', 'a', 1), line('2', 'b', 1), line('3', 'c', 1)];
    const after = [line('1', 'b', 1), line('2', 'c', 1)];
    expect(compareBills(before, after).map((change) => change.kind)).toEqual(['changed', 'changed', 'removed']);
    expect(compareBills(before, after)[0]).toMatchObject({ fields: ['position'], before: { part: 'b' } });
  });

  test('from nothing everything is added, to nothing everything is removed', () => {
    const rows = [line('1', 'a', 1), line('2', 'b', 1)];
    expect(compareBills([], rows).map((change) => change.kind)).toEqual(['added', 'added']);
    expect(compareBills(rows, []).map((change) => change.kind)).toEqual(['removed', 'removed']);
    expect(compareBills([], [])).toEqual([]);
  });

  test('applying the changes to the earlier revision gives the later one', () => {
    const lines = fc
      .uniqueArray(fc.tuple(fc.nat(8), fc.nat(5), fc.integer({ min: 1, max: 3 })), {
        selector: ([position]) => position,
      })
      .map((rows) => rows.map(([position, part, per]) => line(`${position}`, `part ${part}`, per)));
    const text = (rows: readonly BillLine[]): string[] => rows.map((row) => JSON.stringify(row)).toSorted();
    fc.assert(
      fc.property(lines, lines, (before, after) => {
        const changes = compareBills(before, after);
        const gone = new Set(changes.flatMap((change) => (change.kind === 'added' ? [] : [change.before])));
        const come = changes.flatMap((change) => (change.kind === 'removed' ? [] : [change.after]));
        expect(text([...before.filter((row) => !gone.has(row)), ...come])).toEqual(text(after));
      }),
    );
  });
});
