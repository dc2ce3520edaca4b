import { describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { attempt } from '../errors/arithmetic-error.js';
import { Decimal } from '../measure/decimal.js';
import { minorAmount, sumMinor } from './minor-units.js';
import { roundDecimal } from './round.js';
import type { VatCategory } from './vat-category.js';
import { totalsFromGross, totalsFromNet, type VatDocument, type VatEntry } from './vat-totals.js';

const entry = (amount: number, ratePercent: string | number, category: VatCategory = 'S'): VatEntry => ({
  amount: minorAmount(amount),
  category,
  ratePercent,
});
const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

const entries = (least: number) =>
  fc
    .record({
      amount: fc.integer({ min: least, max: 5_000_000 }),
      rate: fc.constantFrom('23', '21', '13.5', '5.5', '0'),
    })
    .map(({ amount, rate }) => entry(amount, rate, rate === '0' ? 'Z' : 'S'));
const documents: fc.Arbitrary<VatDocument> = fc.record({
  lines: fc.array(entries(-100_000), { maxLength: 12 }),
  allowances: fc.array(entries(0), { maxLength: 3 }),
  charges: fc.array(entries(0), { maxLength: 3 }),
  prepaid: fc.integer({ min: 0, max: 100_000 }).map(minorAmount),
});

describe('totals of a document', () => {
  it('gives an empty document zeros and no group', () => {
    const totals = totalsFromNet({ lines: [] });
    expect(totals.groups).toEqual([]);
    expect([totals.lineNet, totals.vat, totals.payable]).toEqual([0, 0, 0]);
    expect(totalsFromGross({ lines: [] })).toMatchObject({ payable: 0, lineNets: [] });
  });

  it('takes "23", "23.00" and 23 as one rate, and keeps categories apart', () => {
    const totals = totalsFromNet({
      lines: [entry(100, '23'), entry(100, '23.00'), entry(100, 23), entry(50, '0', 'G'), entry(50, 0, 'K')],
    });
    expect(totals.groups.map((group) => [group.category, group.ratePercent, group.taxable])).toEqual([
      ['S', '23', 300],
      ['G', '0', 50],
      ['K', '0', 50],
    ]);
  });

  it('adds the rounding of the amount due after the prepayment', () => {
    const totals = totalsFromNet({
      lines: [entry(1000, '23')],
      prepaid: minorAmount(1000),
      rounding: minorAmount(-2),
    });
    expect(totals).toMatchObject({ withVat: 1230, prepaid: 1000, rounding: -2, payable: 228 });
  });

  it.each<[string, VatEntry[], string]>([
    ['a standard rate of zero', [entry(1, '0', 'S')], 'money_vat_rate_for_category'],
    ['an export with a rate', [entry(1, '23', 'G')], 'money_vat_rate_for_category'],
    ['an exempt line with a rate', [entry(1, '0.1', 'E')], 'money_vat_rate_for_category'],
    ['a negative rate', [entry(1, '-1', 'S')], 'money_vat_rate_negative'],
    ['outside the scope beside another', [entry(1, 0, 'O'), entry(1, '23')], 'money_vat_outside_scope_mixed'],
    ['a rate that is no number', [entry(1, 'x')], 'measure_not_a_number'],
  ])('refuses %s', (_what, lines, code) => {
    expect(codeOf(() => totalsFromNet({ lines }))).toBe(code);
    expect(codeOf(() => totalsFromGross({ lines }))).toBe(code);
  });

  it('spreads the net of gross lines so that shipping, discount and lines add up', () => {
    const totals = totalsFromGross({
      lines: [entry(999, '23'), entry(999, '23'), entry(999, '23')],
      allowances: [entry(500, '23')],
      charges: [entry(795, '23')],
    });
    expect(totals.withVat).toBe(3 * 999 - 500 + 795);
    expect(totals.lineNets).toEqual([812, 812, 812]);
    expect(totals.allowanceNets).toEqual([406]);
    expect(totals.chargeNets).toEqual([646]);
  });
});

describe('every document', () => {
  it('holds BR-CO-10 to BR-CO-17 and BR-S-08 from net amounts', () => {
    fc.assert(
      fc.property(documents, (document) => {
        const totals = totalsFromNet(document);
        const sum = (list: readonly VatEntry[] = []) => list.reduce((all, { amount }) => all + amount, 0);
        expect(totals.lineNet).toBe(sum(document.lines));
        expect(totals.allowances).toBe(sum(document.allowances));
        expect(totals.charges).toBe(sum(document.charges));
        expect(totals.withoutVat).toBe(totals.lineNet - totals.allowances + totals.charges);
        expect(totals.vat).toBe(sumMinor(totals.groups.map((group) => group.vat)));
        expect(totals.withVat).toBe(totals.withoutVat + totals.vat);
        expect(totals.payable).toBe(totals.withVat - totals.prepaid + totals.rounding);
        expect(sumMinor(totals.groups.map((group) => group.taxable))).toBe(totals.withoutVat);
        for (const group of totals.groups) {
          const of = (list: readonly VatEntry[] = []) =>
            sum(list.filter((one) => one.ratePercent === group.ratePercent));
          expect(group.taxable).toBe(of(document.lines) - of(document.allowances) + of(document.charges));
          const exact = new Decimal(group.taxable).times(group.ratePercent).div(100);
          expect(group.vat).toBe(roundDecimal(exact, 0, 'half-up').toNumber());
        }
      }),
    );
  });

  it('leaves the buyer the price shown, nets that add up, and VAT within a unit of the net times the rate', () => {
    fc.assert(
      fc.property(documents, fc.constantFrom('vat-within-gross', 'vat-on-net'), (document, settlement) => {
        const totals = totalsFromGross(document, settlement);
        const sum = (list: readonly VatEntry[] = []) => list.reduce((all, { amount }) => all + amount, 0);
        const shown = sum(document.lines) - sum(document.allowances) + sum(document.charges);
        expect(totals.payable + totals.prepaid).toBe(shown);
        expect(sumMinor(totals.lineNets)).toBe(totals.lineNet);
        expect(sumMinor(totals.allowanceNets)).toBe(totals.allowances);
        expect(sumMinor(totals.chargeNets)).toBe(totals.charges);
        expect(totals.withoutVat).toBe(totals.lineNet - totals.allowances + totals.charges);
        expect(sumMinor(totals.groups.map((group) => group.taxable))).toBe(totals.withoutVat);
        for (const group of totals.groups) {
          const exact = new Decimal(group.taxable).times(group.ratePercent).div(100);
          const slack = settlement === 'vat-on-net' ? 0.5 : 1;
          expect(exact.minus(group.vat).abs().lessThanOrEqualTo(slack)).toBe(true);
        }
        document.lines.forEach((line, index) => {
          const exact = new Decimal(line.amount).times(100).div(new Decimal(100).plus(line.ratePercent.toString()));
          expect(
            exact
              .minus(totals.lineNets[index] ?? NaN)
              .abs()
              .lessThanOrEqualTo(1),
          ).toBe(true);
        });
      }),
    );
  });
});
