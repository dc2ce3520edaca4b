import { describe, expect, it } from '@jest/globals';
import { minorAmount } from './minor-units.js';
import { brokenTotals } from './vat-check.js';
import { totalsFromNet, type DocumentTotals, type VatDocument } from './vat-totals.js';

describe('checking the figures on a document', () => {
  const document: VatDocument = {
    lines: [
      { amount: minorAmount(10_000), category: 'S', ratePercent: '23' },
      { amount: minorAmount(2_000), category: 'Z', ratePercent: 0 },
    ],
    allowances: [{ amount: minorAmount(500), category: 'S', ratePercent: '23' }],
    charges: [{ amount: minorAmount(700), category: 'S', ratePercent: '23' }],
    prepaid: minorAmount(1_000),
  };
  const right = totalsFromNet(document);
  const rules = (change: Partial<DocumentTotals>) =>
    brokenTotals(document, { ...right, ...change }).map(({ rule }) => rule);
  const one = minorAmount(1);

  it('finds nothing in sound ones', () => {
    expect(brokenTotals(document, right)).toEqual([]);
  });

  it.each<[keyof DocumentTotals, string[]]>([
    ['lineNet', ['BR-CO-10', 'BR-CO-13']],
    ['allowances', ['BR-CO-11', 'BR-CO-13']],
    ['charges', ['BR-CO-12', 'BR-CO-13']],
    ['withoutVat', ['BR-CO-13', 'BR-CO-15']],
    ['vat', ['BR-CO-14', 'BR-CO-15']],
    ['withVat', ['BR-CO-15', 'BR-CO-16']],
    ['prepaid', ['BR-CO-16']],
    ['rounding', ['BR-CO-16']],
    ['payable', ['BR-CO-16']],
  ])('names the rules that a wrong %s breaks', (figure, broken) => {
    expect(rules({ [figure]: one })).toEqual(broken);
  });

  it('names a VAT amount one cent off, where the published checks leave slack', () => {
    const groups = right.groups.map((group) =>
      group.category === 'S' ? { ...group, vat: minorAmount(2_347) } : group,
    );
    expect(
      brokenTotals(document, {
        ...right,
        groups,
        vat: minorAmount(2_347),
        withVat: minorAmount(14_547),
        payable: minorAmount(13_547),
      }),
    ).toEqual([{ rule: 'BR-CO-17', expected: 2_346, found: 2_347, group: { category: 'S', ratePercent: '23' } }]);
  });

  it('names a taxable amount that is not the sum of its lines, and a group too few', () => {
    const groups = right.groups.map((group) =>
      group.category === 'Z' ? { ...group, taxable: minorAmount(1_999) } : group,
    );
    expect(rules({ groups })).toEqual(['BR-S-08']);
    expect(rules({ groups: right.groups.slice(0, 1) })).toEqual(['BR-CO-18']);
  });
});
