import { ArithmeticError } from '../errors/arithmetic-error.js';
import { decimalText, onCommonScale, type DecimalInput } from '../measure/decimal.js';
import { roundToTotal } from './apportion.js';
import { addMinor, minorAmountOf, subtractMinor, sumMinor, zeroAmount, type MinorAmount } from './minor-units.js';
import { netWithinGross, vatOnNet } from './vat-amount.js';
import { vatRate, type VatCategory } from './vat-category.js';

/** An amount of a document with the VAT it falls under: a line, an allowance or a charge. */
export interface VatEntry {
  /** Minor units; lines may be negative (returned goods), allowances and charges are written positive. */
  readonly amount: MinorAmount;
  readonly category: VatCategory;
  /** Percent, for example "23"; zero for category O. */
  readonly ratePercent: DecimalInput;
}

/** What a document's totals are worked out from; every amount in minor units of the document's one currency. */
export interface VatDocument {
  readonly lines: readonly VatEntry[];
  /** Discounts on the whole document. */
  readonly allowances?: readonly VatEntry[];
  /** Shipping and the like. */
  readonly charges?: readonly VatEntry[];
  /** Paid already (BT-113). */
  readonly prepaid?: MinorAmount;
  /** Rounding of the amount due, where the shop has such a custom (BT-114). */
  readonly rounding?: MinorAmount;
}

/** One line of the VAT breakdown (BG-23). */
export interface VatGroup {
  readonly category: VatCategory;
  /** Percent in plain notation without trailing zeros. */
  readonly ratePercent: string;
  /** BT-116, minor units. */
  readonly taxable: MinorAmount;
  /** BT-117, minor units. */
  readonly vat: MinorAmount;
}

/** The totals of a document (BG-22 and BG-23) in minor units. */
export interface DocumentTotals {
  /** BT-106: sum of the lines' net amounts. */
  readonly lineNet: MinorAmount;
  /** BT-107 */
  readonly allowances: MinorAmount;
  /** BT-108 */
  readonly charges: MinorAmount;
  /** BT-109 */
  readonly withoutVat: MinorAmount;
  /** BT-110 */
  readonly vat: MinorAmount;
  /** BT-112 */
  readonly withVat: MinorAmount;
  /** BT-113 */
  readonly prepaid: MinorAmount;
  /** BT-114 */
  readonly rounding: MinorAmount;
  /** BT-115 */
  readonly payable: MinorAmount;
  /** One per category and rate, in the order in which they first appear. */
  readonly groups: readonly VatGroup[];
}

/**
 * Works out a document's totals from amounts without VAT.
 *
 * @param document lines, allowances and charges, all net; minor units
 * @returns the totals; VAT is worked out once per category and rate and rounded half away from zero
 * @throws ArithmeticError `money_vat_rate_negative`, `money_vat_rate_for_category`, `money_vat_outside_scope_mixed`,
 *   `money_too_large`
 * @source EN 16931-1:2017, rules BR-CO-10 to BR-CO-17, BR-S-08 and its like for the other categories, BR-O-11 to 14.
 *   The standard names no rule for ties; half away from zero reproduces its sample invoices.
 */
export function totalsFromNet(document: VatDocument): DocumentTotals {
  const groups = groupEntries(signedEntries(document)).map((group): VatGroup => {
    const taxable = sumMinor(group.entries.map((entry) => entry.amount));
    return { ...group.key, taxable, vat: vatOnNet(taxable, group.key.ratePercent) };
  });
  return totals(document, groups, document.rounding ?? zeroAmount);
}

/**
 * How VAT inside a price is settled when no net amount gives back exactly the gross one (100.00 at 21 % is such).
 *
 * - `vat-within-gross`: VAT is the share of the gross amount, net the rest; the total is the price that was shown.
 *   BT-117 may then differ by one minor unit from BT-116 × rate, within the slack of the published rules.
 * - `vat-on-net`: VAT is worked out on the rounded net amount (BR-CO-17 to the digit), and the minor unit that is
 *   missing or too much stands as rounding (BT-114), so that what is due is still the price that was shown.
 */
export type GrossSettlement = 'vat-within-gross' | 'vat-on-net';

/** Totals worked out from gross prices, with the net amount of each entry, in the document's order. */
export interface GrossDocumentTotals extends DocumentTotals {
  readonly lineNets: readonly MinorAmount[];
  readonly allowanceNets: readonly MinorAmount[];
  readonly chargeNets: readonly MinorAmount[];
}

/**
 * Works out a document's totals from amounts that include VAT. Each group's net amount is rounded once and spread over
 * its entries by the largest remainder, so that the lines add up to the totals.
 *
 * @param document lines, allowances and charges, all gross; minor units
 * @param settlement what to do where no net amount gives back the gross one
 * @returns the totals with `payable + prepaid` = the gross sum (plus the document's own rounding), and each entry's net
 * @throws ArithmeticError as {@link totalsFromNet}
 * @source EN 16931-1:2017 as for net; net = gross × 100 / (100 + rate), Directive 2006/112/EC, articles 73 and 78.
 */
export function totalsFromGross(
  document: VatDocument,
  settlement: GrossSettlement = 'vat-within-gross',
): GrossDocumentTotals {
  const entries = signedEntries(document);
  const settled = groupEntries(entries).map((group) => settleGross(group, settlement));
  const nets = new Map(settled.flatMap((group) => group.nets));
  const net = (entry: SignedEntry): MinorAmount => nets.get(entry) ?? zeroAmount;
  const of = (role: SignedEntry['role']) => entries.filter((entry) => entry.role === role);
  const netDocument = {
    prepaid: document.prepaid ?? zeroAmount,
    lines: of('line').map((entry) => ({ ...entry, amount: net(entry) })),
    allowances: of('allowance').map((entry) => ({ ...entry, amount: subtractMinor(zeroAmount, net(entry)) })),
    charges: of('charge').map((entry) => ({ ...entry, amount: net(entry) })),
  };
  return {
    ...totals(
      netDocument,
      settled.map((group) => group.breakdown),
      sumMinor([document.rounding ?? zeroAmount, ...settled.map((group) => group.rounding)]),
    ),
    lineNets: netDocument.lines.map((entry) => entry.amount),
    allowanceNets: netDocument.allowances.map((entry) => entry.amount),
    chargeNets: netDocument.charges.map((entry) => entry.amount),
  };
}

interface SignedEntry extends VatEntry {
  readonly role: 'line' | 'allowance' | 'charge';
}

interface EntryGroup {
  readonly key: Pick<VatGroup, 'category' | 'ratePercent'>;
  readonly entries: SignedEntry[];
}

/** Allowances enter their group with a minus, so that a group's amount is a plain sum. */
function signedEntries(document: VatDocument): readonly SignedEntry[] {
  return [
    ...document.lines.map((entry): SignedEntry => ({ ...entry, role: 'line' })),
    ...(document.allowances ?? []).map((entry): SignedEntry => ({
      ...entry,
      amount: subtractMinor(zeroAmount, entry.amount),
      role: 'allowance',
    })),
    ...(document.charges ?? []).map((entry): SignedEntry => ({ ...entry, role: 'charge' })),
  ];
}

function groupEntries(entries: readonly SignedEntry[]): readonly EntryGroup[] {
  const groups = new Map<string, EntryGroup>();
  for (const entry of entries) {
    const ratePercent = decimalText(vatRate(entry.category, entry.ratePercent));
    const name = `${entry.category} ${ratePercent}`;
    const group = groups.get(name) ?? { key: { category: entry.category, ratePercent }, entries: [] };
    group.entries.push(entry);
    groups.set(name, group);
  }
  const all = [...groups.values()];
  if (all.length > 1 && all.some((group) => group.key.category === 'O')) {
    throw new ArithmeticError('money_vat_outside_scope_mixed');
  }
  return all;
}

interface SettledGroup {
  readonly breakdown: VatGroup;
  /** What is missing to the gross amount, minor units. */
  readonly rounding: MinorAmount;
  readonly nets: readonly (readonly [SignedEntry, MinorAmount])[];
}

function settleGross(group: EntryGroup, settlement: GrossSettlement): SettledGroup {
  const gross = sumMinor(group.entries.map((entry) => entry.amount));
  const [hundred = 100n, rate = 0n] = onCommonScale([100, group.key.ratePercent]).integers;
  const taxable = netWithinGross(gross, group.key.ratePercent);
  const shares = roundToTotal(
    group.entries.map((entry) => BigInt(entry.amount) * hundred),
    hundred + rate,
    BigInt(taxable),
  );
  const nets = group.entries.map((entry, index) => [entry, minorAmountOf(shares[index] ?? 0n)] as const);
  const within = subtractMinor(gross, taxable);
  const vat = settlement === 'vat-within-gross' ? within : vatOnNet(taxable, group.key.ratePercent);
  return { breakdown: { ...group.key, taxable, vat }, rounding: subtractMinor(within, vat), nets };
}

function totals(document: VatDocument, groups: readonly VatGroup[], rounding: MinorAmount): DocumentTotals {
  const sum = (entries: readonly VatEntry[] = []) => sumMinor(entries.map((entry) => entry.amount));
  const lineNet = sum(document.lines);
  const allowances = sum(document.allowances);
  const charges = sum(document.charges);
  const withoutVat = addMinor(subtractMinor(lineNet, allowances), charges);
  const vat = sumMinor(groups.map((group) => group.vat));
  const withVat = addMinor(withoutVat, vat);
  const prepaid = document.prepaid ?? zeroAmount;
  const payable = addMinor(subtractMinor(withVat, prepaid), rounding);
  return { lineNet, allowances, charges, withoutVat, vat, withVat, prepaid, rounding, payable, groups };
}
