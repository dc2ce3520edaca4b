import { describe, expect, it } from '@jest/globals';
import { attempt } from '../errors/arithmetic-error.js';
import type { DecimalInput } from './decimal.js';
import { isStockMeasure, stockMeasureCodes, stockMeasures, type StockMeasure } from './stock-measures.js';
import { positiveStockQuantity, stockQuantity } from './stock-quantity.js';

const codeOf = (compute: () => unknown) => {
  const result = attempt(compute);
  return result.ok ? undefined : result.fault.code;
};

describe('quantities of stock', () => {
  it.each<[DecimalInput, StockMeasure, string]>([
    ['0', 'piece', '0'],
    ['3.000', 'piece', '3'],
    [999_999_999, 'piece', '999999999'],
    ['12.345678', 'm', '12.345678'],
    ['0.5', 'mm', '0.5'],
  ])('take %p %s', (quantity, measure, text) => {
    expect(stockQuantity(quantity, measure).toFixed()).toBe(text);
  });

  it.each<[DecimalInput, StockMeasure, string]>([
    ['-1', 'piece', 'measure_quantity_negative'],
    ['0.5', 'piece', 'measure_too_many_decimals'],
    ['0.0000001', 'm', 'measure_too_many_decimals'],
    ['0.0001', 'mm', 'measure_too_many_decimals'],
    ['999999999.1', 'm', 'measure_quantity_too_large'],
    ['1e30', 'm', 'measure_not_a_number'],
    [NaN, 'm', 'measure_not_a_number'],
    ['', 'm', 'measure_not_a_number'],
  ])('refuse %p %s', (quantity, measure, code) => {
    expect(codeOf(() => stockQuantity(quantity, measure))).toBe(code);
  });

  it('refuse zero where something must move', () => {
    expect(codeOf(() => positiveStockQuantity('0.000', 'm'))).toBe('measure_quantity_not_positive');
    expect(positiveStockQuantity('0.001', 'm').toFixed()).toBe('0.001');
  });

  it('know their measures', () => {
    expect(stockMeasureCodes).toHaveLength(9);
    expect(isStockMeasure('piece')).toBe(true);
    expect(isStockMeasure('toString')).toBe(false);
    expect(isStockMeasure('pcs')).toBe(false);
    expect(new Set(stockMeasureCodes.map((code) => stockMeasures[code].recommendation20)).size).toBe(9);
  });
});
