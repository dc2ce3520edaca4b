import { ApiError, badParameter, missingParameter, noSuch } from './api-error.js';
import { checkedCurrency } from './currency.js';
import { identifier } from './identifier.js';
import type { Parameters } from './parameters.js';
import type { WireLineItem, WirePrice } from './wire.js';

const LONGEST_NAME = 5000;

/** Reads the lines of a checkout session; each brings its price with it. */
export function readLines(lines: readonly Parameters[], now: number): WireLineItem[] {
  if (lines.length === 0) throw missingParameter('line_items');
  if (lines.length > 100) throw badParameter('line_items', 'A session can have up to 100 lines');
  const read = lines.map((line) => readLine(line, now));
  const currencies = new Set(read.map((line) => line.currency));
  if (currencies.size > 1) throw badParameter('line_items', 'All lines of a session must have the same currency');
  return read;
}

function readLine(line: Parameters, now: number): WireLineItem {
  const stored = line.text('price');
  // The stand-in keeps no price list: each line brings its price_data.
  if (stored !== undefined) throw noSuch('price', stored, line.name('price'), 400);
  const priceData = line.child('price_data');
  if (!priceData) throw missingParameter(line.name('price_data'));
  const quantity = line.requiredInteger('quantity', { least: 1, most: 999_999 });
  const metadata = line.metadata('metadata');
  line.refuseUnknown();
  const { price, name } = readPrice(priceData, now);
  const amount = (price.unit_amount ?? 0) * quantity;
  if (!Number.isSafeInteger(amount)) throw badParameter(line.name('quantity'), 'The amount is too large');
  return {
    id: identifier('li_'),
    object: 'item',
    adjustable_quantity: null,
    amount_discount: 0,
    amount_subtotal: amount,
    amount_tax: 0,
    amount_total: amount,
    currency: price.currency,
    description: name,
    metadata,
    price,
    quantity,
  } satisfies WireLineItem;
}

function readPrice(data: Parameters, now: number): { readonly price: WirePrice; readonly name: string } {
  const currency = checkedCurrency(data.requiredText('currency'), data.name('currency'));
  const unitAmount = readUnitAmount(data);
  const taxBehavior = data.text('tax_behavior', { oneOf: ['exclusive', 'inclusive', 'unspecified'] });
  const product = data.child('product_data');
  if (!product) throw missingParameter(data.name('product_data'));
  if (data.has('recurring')) throw notSpoken(data.name('recurring'));
  data.refuseUnknown();
  const name = product.requiredText('name', { longest: LONGEST_NAME });
  product.text('description');
  product.texts('images');
  product.metadata('metadata');
  product.text('tax_code');
  product.text('unit_label');
  product.refuseUnknown();
  const price = {
    id: identifier('price_'),
    object: 'price',
    active: false,
    billing_scheme: 'per_unit',
    created: now,
    currency,
    custom_unit_amount: null,
    livemode: false,
    lookup_key: null,
    metadata: {},
    nickname: null,
    product: identifier('prod_', 14),
    recurring: null,
    tax_behavior: taxBehavior ?? 'unspecified',
    tiers_mode: null,
    transform_quantity: null,
    type: 'one_time',
    unit_amount: unitAmount,
    unit_amount_decimal: String(unitAmount),
  } satisfies WirePrice;
  return { price, name };
}

function readUnitAmount(data: Parameters): number {
  const whole = data.integer('unit_amount', { least: 0 });
  const decimal = data.text('unit_amount_decimal');
  if (whole !== undefined && decimal !== undefined) {
    throw badParameter(data.name('unit_amount'), 'Give unit_amount or unit_amount_decimal, not both');
  }
  if (whole !== undefined) return whole;
  if (decimal === undefined) throw missingParameter(data.name('unit_amount'));
  if (!/^\d{1,15}$/.test(decimal)) throw notSpoken(data.name('unit_amount_decimal'), 'with parts of a minor unit');
  return Number(decimal);
}

/** The real service knows it, the stand-in does not: better refused than quietly ignored. */
export function notSpoken(param: string, what = ''): ApiError {
  const sentence = `The payments stand-in does not speak ${param}${what === '' ? '' : ` ${what}`}`;
  return new ApiError(400, 'invalid_request_error', sentence, { param });
}
