import { minorAmount, sumMinor, type MinorAmount } from './minor-units.js';
import { vatOnNet } from './vat-amount.js';
import { totalsFromNet, type DocumentTotals, type VatDocument } from './vat-totals.js';

/** A calculation rule of EN 16931. */
export type TotalsRule =
  | 'BR-CO-10'
  | 'BR-CO-11'
  | 'BR-CO-12'
  | 'BR-CO-13'
  | 'BR-CO-14'
  | 'BR-CO-15'
  | 'BR-CO-16'
  | 'BR-CO-17'
  | 'BR-CO-18'
  | 'BR-S-08';

/** A rule that figures break, with what it asks for and what stands there, minor units. */
export interface BrokenRule {
  readonly rule: TotalsRule;
  readonly expected: MinorAmount;
  readonly found: MinorAmount;
  /** The VAT group, for the rules that look at one. */
  readonly group?: { readonly category: string; readonly ratePercent: string };
}

/**
 * Checks the figures that stand on somebody's document, a supplier's invoice for example, against its lines. Exact: the
 * slack of up to one currency unit that the published checks leave in BR-CO-17 is not left here.
 *
 * @param document lines, allowances and charges, net, minor units
 * @param claimed the totals as printed
 * @returns every broken rule, none if the document is sound; `BR-CO-18` stands for a group that is missing or too many,
 *   `BR-S-08` for a taxable amount that is not the sum of its entries, whatever the category
 * @throws ArithmeticError as `totalsFromNet`, if the lines themselves cannot stand together
 * @source EN 16931-1:2017, rules BR-CO-10 to BR-CO-18, BR-S-08 and its like.
 */
export function brokenTotals(document: VatDocument, claimed: DocumentTotals): readonly BrokenRule[] {
  const right = totalsFromNet(document);
  const withoutVat = claimed.lineNet - claimed.allowances + claimed.charges;
  const checks: readonly (readonly [TotalsRule, number, number])[] = [
    ['BR-CO-10', right.lineNet, claimed.lineNet],
    ['BR-CO-11', right.allowances, claimed.allowances],
    ['BR-CO-12', right.charges, claimed.charges],
    ['BR-CO-13', withoutVat, claimed.withoutVat],
    ['BR-CO-14', sumMinor(claimed.groups.map((group) => group.vat)), claimed.vat],
    ['BR-CO-15', claimed.withoutVat + claimed.vat, claimed.withVat],
    ['BR-CO-16', claimed.withVat - claimed.prepaid + claimed.rounding, claimed.payable],
    ['BR-CO-18', right.groups.length, claimed.groups.length],
  ];
  const broken = checks
    .filter(([, expected, found]) => expected !== found)
    .map(([rule, expected, found]): BrokenRule => ({
      rule,
      expected: minorAmount(expected),
      found: minorAmount(found),
    }));
  return [...broken, ...brokenGroups(right, claimed)];
}

function brokenGroups(right: DocumentTotals, claimed: DocumentTotals): readonly BrokenRule[] {
  return claimed.groups.flatMap((group): readonly BrokenRule[] => {
    const { category, ratePercent, taxable, vat } = group;
    const own = right.groups.find((one) => one.category === category && one.ratePercent === ratePercent);
    const place = { category, ratePercent };
    const expectedTaxable = own?.taxable ?? sumMinor([]);
    const expectedVat = vatOnNet(taxable, ratePercent);
    return [
      ...(taxable === expectedTaxable
        ? []
        : [{ rule: 'BR-S-08' as const, expected: expectedTaxable, found: taxable, group: place }]),
      ...(vat === expectedVat ? [] : [{ rule: 'BR-CO-17' as const, expected: expectedVat, found: vat, group: place }]),
    ];
  });
}
