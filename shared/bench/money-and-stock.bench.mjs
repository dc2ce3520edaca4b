// How long the arithmetic of documents, stock values, serial numbers, formulas and kits takes on large inputs.
import { issueFifo, addLayer } from '@emberlot/shared/costing/fifo';
import { fifoValuation, movingAverageValuation } from '@emberlot/shared/costing/stock-valuation';
import { evaluateFormula, readFormula } from '@emberlot/shared/judge/formula';
import { planWeighings } from '@emberlot/shared/kit/sub-weighings';
import { Decimal } from '@emberlot/shared/measure/decimal';
import { cheapestPacks } from '@emberlot/shared/measure/pack-choice';
import { apportion } from '@emberlot/shared/money/apportion';
import { minorAmount } from '@emberlot/shared/money/minor-units';
import { totalsFromGross, totalsFromNet } from '@emberlot/shared/money/vat-totals';
import { readSerialNumber, serialNumber } from '@emberlot/shared/serial/serial-number';
import { median, random, timed } from './bench-tools.mjs';

const runs = 7;
const row = (subject, what, work, goal) => {
  const value = median(Array.from({ length: runs }, () => timed(work).ms));
  return { subject, what: `${what}: median of ${runs}`, value, unit: 'ms', ...(goal && { goal }) };
};

function document(lines) {
  const next = random(1);
  const rates = ['23', '13.5', '9'];
  return {
    lines: Array.from({ length: lines }, () => ({
      amount: minorAmount(Math.floor(next() * 1e6)),
      category: 'S',
      ratePercent: rates[Math.floor(next() * 3)],
    })),
  };
}

/** Receipts and issues in turn, such that about a hundred layers are open at a time. */
function history(events) {
  const next = random(2);
  let held = 0;
  return Array.from({ length: events }, (_, index) => {
    if (index < 100 || held < 500 || next() < 0.5) {
      const quantity = 1 + Math.floor(next() * 50);
      held += quantity;
      return { kind: 'in', quantity, value: minorAmount(Math.floor(next() * 1e5)) };
    }
    const quantity = 1 + Math.floor(next() * 50);
    held -= quantity;
    return { kind: 'out', quantity };
  });
}

function kit(lines) {
  const next = random(3);
  return Array.from({ length: lines }, (_, index) => {
    const grams = Math.round(10 ** (next() * 3 - 0.5) * 100) / 100;
    return { part: `part ${index}`, pieces: 1 + Math.floor(next() * 8), grams, spreadGrams: grams * 0.01 * next() };
  });
}

export function rows() {
  const weights = Array.from({ length: 10_000 }, (_, index) => (index * 7919) % 1000);
  const events = history(10_000);
  const serials = Array.from({ length: 10_000 }, (_, index) =>
    serialNumber({ product: 'WR', year: 2026, week: 1 + (index % 52), running: index + 1 }),
  );
  const formula = readFormula('u * i / (up * ip)', { u: 'mV', i: 'A', up: 'V', ip: 'A' }, '%');
  const layers = Array.from({ length: 1000 }, (_, order) => ({
    id: `${order}`,
    order,
    quantity: new Decimal(3),
    value: minorAmount(1000),
  }));
  const packs = [10, 25, 100, 1000].map((size, index) => ({ size, price: minorAmount(size * (20 - index)) }));
  const rule = { scaleGrams: 0.05, falseAlarmShare: 0.01, confidence: 0.99 };
  return [
    row('money', '10,000 shares of one amount', () => apportion(minorAmount(123_456_789), weights)),
    row('money', 'totals of 1,000 net lines', () => totalsFromNet(document(1000))),
    row('money', 'totals of 1,000 gross lines', () => totalsFromGross(document(1000))),
    row('costing', '10,000 movements by moving average', () => movingAverageValuation(events)),
    row('costing', '10,000 movements first in, first out', () => fifoValuation(events)),
    row('costing', 'an issue over 1,000 layers', () => addLayer(issueFifo(layers, 2999).layers, layers[0])),
    row('serial', '10,000 serial numbers read', () => serials.map((text) => readSerialNumber(text))),
    row('judge', '100 results of a formula with units', () => {
      for (let n = 1; n <= 100; n += 1) evaluateFormula(formula, { u: n, i: 60, up: '11.1', ip: '1.5' });
    }),
    row('kit', 'fewest weighings of a kit of 40 lines, proven', () => planWeighings(kit(40), rule)),
    row('measure', 'cheapest packs for 1,000,007 pieces', () => cheapestPacks(1_000_007, packs)),
  ];
}
