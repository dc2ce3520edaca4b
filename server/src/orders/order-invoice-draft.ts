import { Decimal } from '@emberlot/shared/measure/decimal';
import { currencyCode, currencyExponent } from '@emberlot/shared/money/currency';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import type { InvoiceDraft, InvoiceDraftLine, VatTreatment } from '../invoicing/invoice-draft.js';
import type { Order, OrderLines } from './orders.service.js';

/** An order as it stands on its invoice: every amount is the order's own, nothing is priced again. */
export function orderInvoiceDraft(order: Order, lines: OrderLines): InvoiceDraft {
  const scale = new Decimal(10).pow(currencyExponent(currencyCode(order.currency)));
  const [first] = lines;
  if (!first) throw new Error(`order ${order.number} has no lines`);
  const rated = {
    vatCategory: first.vat_category as InvoiceDraftLine['vatCategory'],
    vatRate: first.vat_rate,
  };
  return {
    customerId: order.customer_id,
    buyer: {
      name: order.company ?? order.recipient,
      addressLine: order.address_line,
      ...(order.address_line_2 === null ? {} : { addressLine2: order.address_line_2 }),
      city: order.city,
      postcode: order.postcode,
      countryCode: order.country_code,
      email: order.email,
    },
    reference: order.number,
    treatment: order.vat_treatment as VatTreatment,
    vatNote: order.vat_note,
    lines: lines.map((line) => ({
      partId: line.part_id,
      code: line.code,
      description: line.title,
      quantity: String(line.quantity),
      measure: line.measure,
      unitNet: new Decimal(line.unit_net_minor).div(scale).toFixed(),
      net: minorAmount(line.net_minor),
      vatCategory: line.vat_category as InvoiceDraftLine['vatCategory'],
      vatRate: line.vat_rate,
    })),
    charges:
      order.delivery_net_minor === 0
        ? []
        : [{ reason: 'Delivery', amount: minorAmount(order.delivery_net_minor), ...rated }],
    prepaid: minorAmount(order.gross_minor),
    recordedBy: null,
  };
}
