import { ArithmeticError } from '../errors/arithmetic-error.js';
import { Decimal, type DecimalInput, decimal } from '../measure/decimal.js';
import { purchasableQuantity } from '../measure/purchasable.js';

/** From a quantity on, all units cost this. */
export interface PriceBreak {
  readonly from: DecimalInput;
  /** Per unit, major units of one currency. */
  readonly unitPrice: DecimalInput;
}

export interface SupplierOffer {
  readonly supplier: string;
  readonly breaks: readonly PriceBreak[];
  /** Cost of one order: carriage, handling. */
  readonly orderCost: DecimalInput;
  readonly minimum?: DecimalInput;
  readonly multiple?: DecimalInput;
  /** Working days or periods; only compared. */
  readonly leadTime: number;
}

/** What is wanted, and what surplus is worth. */
export interface PurchaseNeed {
  readonly quantity: DecimalInput;
  /** Longest lead time that still serves; none by default. */
  readonly withinLeadTime?: number;
  /** How much of a surplus will surely be used later; the rest is reckoned as worth nothing. None by default. */
  readonly usedLater?: DecimalInput;
  /** Share of its price that holding used surplus costs until then: 0.1 for a tenth. None by default. */
  readonly holdingShare?: DecimalInput;
}

export interface PurchaseOption {
  readonly supplier: string;
  readonly quantity: Decimal;
  readonly unitPrice: Decimal;
  /** Quantity × unit price + order cost: what is paid. */
  readonly paid: Decimal;
  readonly surplus: Decimal;
  /** Paid, less the price of surplus that is used later, plus what holding that costs: what options are compared by. */
  readonly effective: Decimal;
  readonly leadTime: number;
  readonly inTime: boolean;
}

/**
 * Works out how much to buy where: for each supplier and each price break, the least quantity that covers the need,
 * reaches the break, and can be bought. Buying more at a lower price can cost less in all.
 *
 * @param need what is wanted
 * @param offers suppliers with prices for all units from each break on
 * @returns options, those in time first, then the cheapest, then the smaller quantity, then the shorter lead time, then
 *   in the order given; a supplier without a price for the quantity has none
 * @throws ArithmeticError `plan_offer` for a price, break or order cost below zero or two breaks at one quantity, and as
 *   `purchasableQuantity` and `decimal`
 * Source: all-units price breaks; common practice, no source.
 */
export function purchaseOptions(need: PurchaseNeed, offers: readonly SupplierOffer[]): PurchaseOption[] {
  const wanted = decimal(need.quantity);
  if (wanted.lessThanOrEqualTo(0)) return [];
  const options = offers.flatMap((offer) => optionsOf(offer, wanted, need));
  return options.toSorted(
    (a, b) =>
      Number(b.inTime) - Number(a.inTime) ||
      a.effective.comparedTo(b.effective) ||
      a.quantity.comparedTo(b.quantity) ||
      a.leadTime - b.leadTime,
  );
}

function optionsOf(offer: SupplierOffer, wanted: Decimal, need: PurchaseNeed): PurchaseOption[] {
  const breaks = sortedBreaks(offer);
  const quantities = new Map<string, Decimal>();
  for (const { from } of breaks) {
    const rule = {
      ...(offer.minimum !== undefined && { minimum: offer.minimum }),
      ...(offer.multiple !== undefined && { multiple: offer.multiple }),
    };
    const { order: quantity } = purchasableQuantity(Decimal.max(wanted, from), rule);
    quantities.set(quantity.toFixed(), quantity);
  }
  return [...quantities.values()].flatMap((quantity) => {
    const price = breaks.findLast(({ from }) => quantity.greaterThanOrEqualTo(from))?.unitPrice;
    return price === undefined ? [] : [optionFor(offer, quantity, price, wanted, need)];
  });
}

function optionFor(
  offer: SupplierOffer,
  quantity: Decimal,
  unitPrice: Decimal,
  wanted: Decimal,
  need: PurchaseNeed,
): PurchaseOption {
  const surplus = quantity.minus(wanted);
  const paid = quantity.times(unitPrice).plus(decimal(offer.orderCost));
  const usedLater = Decimal.min(surplus, decimal(need.usedLater ?? 0)).times(unitPrice);
  const worth = usedLater.times(
    decimal(need.holdingShare ?? 0)
      .negated()
      .plus(1),
  );
  const { supplier, leadTime } = offer;
  const inTime = leadTime <= (need.withinLeadTime ?? Infinity);
  return { supplier, quantity, unitPrice, paid, surplus, effective: paid.minus(worth), leadTime, inTime };
}

function sortedBreaks({ supplier, breaks, orderCost }: SupplierOffer): { from: Decimal; unitPrice: Decimal }[] {
  const rows = breaks.map(({ from, unitPrice }) => ({ from: decimal(from), unitPrice: decimal(unitPrice) }));
  const sorted = rows.toSorted((a, b) => a.from.comparedTo(b.from));
  const twice = sorted.some(({ from }, index) => sorted[index + 1]?.from.equals(from));
  const negative = rows.some(({ from, unitPrice }) => from.lessThan(0) || unitPrice.lessThan(0));
  if (twice || negative || decimal(orderCost).lessThan(0)) throw new ArithmeticError('plan_offer', { supplier });
  return sorted;
}
