import { describe, expect, it } from '@jest/globals';
import { minorAmountFromMajor } from './amount-text.js';
import { euro } from './currency.js';
import { lineAmount } from './line-amount.js';
import { minorAmount } from './minor-units.js';
import type { VatCategory } from './vat-category.js';
import { vatOnNet } from './vat-amount.js';
import { totalsFromGross, totalsFromNet, type VatEntry } from './vat-totals.js';

const cents = (text: string) => minorAmountFromMajor(text, euro);
const entry = (amount: string, ratePercent: string, category: VatCategory = 'S'): VatEntry => ({
  amount: cents(amount),
  category,
  ratePercent,
});

describe('sample invoices published with the validation rules of EN 16931', () => {
  // CEN/TC 434 validation artefacts (eInvoicing-EN16931, commit b6c9e06), ubl/examples/ubl-tc434-example1.xml.
  it('example 1: twenty lines at 6 % and 21 %, goods returned', () => {
    const low = '19.90 9.85 8.29 14.46 35.00 35.00 10.65 1.55 14.37 8.29 16.58 9.95 3.30 3.90 102.12 -109.98';
    const high = '10.80 7.60 9.34 18.63';
    const lines = [
      ...low.split(' ').map((amount) => entry(amount, '6')),
      ...high.split(' ').map((amount) => entry(amount, '21')),
    ];
    expect(totalsFromNet({ lines })).toEqual({
      lineNet: 22960,
      allowances: 0,
      charges: 0,
      withoutVat: 22960,
      vat: 2073,
      withVat: 25033,
      prepaid: 0,
      rounding: 0,
      payable: 25033,
      groups: [
        { category: 'S', ratePercent: '6', taxable: 18323, vat: 1099 },
        { category: 'S', ratePercent: '21', taxable: 4637, vat: 974 },
      ],
    });
  });

  // The same, ubl-tc434-example2.xml: 1460.50 at 25 % is an exact tie.
  it('example 2: three categories, an allowance, a charge, a prepayment', () => {
    const totals = totalsFromNet({
      lines: [
        entry('1273.00', '25'),
        entry('-3.96', '15'),
        entry('4.96', '15.0'),
        entry('-25.00', '0', 'E'),
        entry('187.50', '25'),
      ],
      allowances: [entry('100.00', '25')],
      charges: [entry('100.00', '25')],
      prepaid: cents('1000.00'),
    });
    expect(totals).toEqual({
      lineNet: 143650,
      allowances: 10000,
      charges: 10000,
      withoutVat: 143650,
      vat: 36528,
      withVat: 180178,
      prepaid: 100000,
      rounding: 0,
      payable: 80178,
      groups: [
        { category: 'S', ratePercent: '25', taxable: 146050, vat: 36513 },
        { category: 'S', ratePercent: '15', taxable: 100, vat: 15 },
        { category: 'E', ratePercent: '0', taxable: -2500, vat: 0 },
      ],
    });
  });

  // The same, ubl-tc434-example8.xml: unit prices with five decimals and prices per dozen.
  it('example 8: line amounts from price, quantity and price base', () => {
    const priced: readonly (readonly [string, string, string, string])[] = [
      ['16000', '0.00880', '1', '140.80'],
      ['16000', '0.00101', '1', '16.16'],
      ['132', '15.24', '12', '167.64'],
      ['58', '1.53', '1', '88.74'],
      ['1', '441.00', '12', '36.75'],
      ['1', '678.00', '12', '56.50'],
      ['1', '83.34', '1', '83.34'],
      ['1', '190.31', '1', '190.31'],
      ['1', '64.21', '1', '64.21'],
      ['1', '64.46', '1', '64.46'],
    ];
    const amounts = priced.map(([quantity, price, perQuantity]) => lineAmount({ quantity, price, perQuantity }, euro));
    expect(amounts).toEqual(priced.map(([, , , net]) => cents(net)));
    const totals = totalsFromNet({ lines: amounts.map((amount) => ({ amount, category: 'S', ratePercent: 21 })) });
    expect([totals.lineNet, totals.vat, totals.withVat]).toEqual([90891, 19087, 109978]);
  });
});

describe('constructed cases, computed with exact rationals, no source', () => {
  it.each([
    ['0.07', 3, '21', 4],
    ['9.99', 7, '19', 1329],
    ['1.02', 25, '20', 510],
  ])('rounds once per rate: %s × %i at %s %%', (net, count, rate, vat) => {
    const lines = Array.from({ length: count }, () => entry(net, rate));
    expect(totalsFromNet({ lines }).vat).toBe(vat);
  });

  it.each([
    ['119.00', '19', 10000, 1900],
    ['100.00', '21', 8264, 1736],
    ['49.99', '23', 4064, 935],
    ['0.01', '20', 1, 0],
    ['1234.56', '5.5', 117020, 6436],
    ['19.95', '25', 1596, 399],
  ])('finds the net in %s at %s %%', (gross, rate, net, vat) => {
    const totals = totalsFromGross({ lines: [entry(gross, rate)] });
    expect([totals.withoutVat, totals.vat, totals.withVat]).toEqual([net, vat, cents(gross)]);
  });

  it.each([
    ['84.03', '19', 1597],
    ['82.64', '21', 1735],
    ['40.64', '23', 935],
    ['0.02', '20', 0],
  ])('adds VAT to %s at %s %%', (net, rate, vat) => {
    expect(vatOnNet(cents(net), rate)).toBe(vat);
  });

  it('settles 100.00 at 21 % by rounding what is due when VAT must follow the net amount', () => {
    const totals = totalsFromGross({ lines: [entry('100.00', '21')] }, 'vat-on-net');
    expect(totals).toMatchObject({
      withoutVat: 8264,
      vat: 1735,
      withVat: 9999,
      rounding: 1,
      payable: minorAmount(10000),
    });
  });
});
