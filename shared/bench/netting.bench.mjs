// How long the netting of a large plan takes and how that grows, and the cheapest plan of lots for a long horizon.
import { Decimal } from '@emberlot/shared/measure/decimal';
import { planRequirements } from '@emberlot/shared/plan/netting';
import { pegPart } from '@emberlot/shared/plan/pegging';
import { planMessages } from '@emberlot/shared/plan/plan-messages';
import { plainPeriods } from '@emberlot/shared/plan/timeline';
import { wagnerWhitin } from '@emberlot/shared/plan/wagner-whitin';
import { median, random, timed } from './bench-tools.mjs';

const costs = { order: 40, holding: 0.05 };
const policies = [
  { kind: 'lot_for_lot' },
  { kind: 'fixed', size: 50 },
  { kind: 'minimum_and_multiple', minimum: 20, multiple: 10 },
  { kind: 'period', periods: 4 },
  { kind: 'economic', costs },
  { kind: 'silver_meal', costs },
  { kind: 'wagner_whitin', costs },
];

/** Ten levels of equal size; every part above the last has three lines below it; all demands are for the first level. */
function shop(partCount, demandCount, weeks) {
  const next = random(7);
  const pick = (count) => Math.floor(next() * count);
  const levels = 10;
  const width = partCount / levels;
  const bills = new Map();
  const parts = Array.from({ length: partCount }, (_, n) => {
    const level = Math.floor(n / width);
    if (level < levels - 1) {
      const components = new Set([0, 1, 2].map(() => (level + 1) * width + pick(width)));
      const rows = [...components].map((component, position) => ({
        position: `${position}`,
        part: `p${component}`,
        quantityPer: new Decimal(1 + pick(3)),
        scrapShare: new Decimal(pick(5) === 0 ? '0.02' : '0'),
        alternates: [],
      }));
      bills.set(`p${n}`, rows);
    }
    return {
      part: `p${n}`,
      decimals: 0,
      onHand: [{ quantity: pick(100) }],
      safetyStock: pick(20),
      leadTime: pick(3),
      lot: policies[n % policies.length],
      receipts: pick(4) === 0 ? [{ id: `r${n}`, period: pick(10), quantity: 50 }] : [],
      demands: [],
    };
  });
  for (let n = 0; n < demandCount; n += 1) {
    parts[pick(width)].demands.push({ id: `d${n}`, period: 10 + pick(weeks - 10), quantity: 1 + pick(20) });
  }
  return { bills, parts, timeline: plainPeriods(weeks) };
}

const plan = ({ bills, parts, timeline }) => planRequirements(bills, parts, timeline);

function growth(sizes) {
  const times = sizes.map((size) => {
    const asked = shop(size, Math.round(size * 0.4), 52);
    return median([0, 1, 2, 3, 4].map(() => timed(() => plan(asked)).ms));
  });
  const [first, last] = [times[0], times.at(-1)];
  return Math.log(last / first) / Math.log(sizes.at(-1) / sizes[0]);
}

function wagnerWhitinRows() {
  const next = random(3);
  const need = Array.from({ length: 1000 }, () => Math.floor(next() * 100));
  const same = (value) => need.map(() => value);
  const long = median(Array.from({ length: 9 }, () => timed(() => wagnerWhitin(need, same(500), same(1))).ms));
  const cheapHolding = median(
    Array.from({ length: 9 }, () => timed(() => wagnerWhitin(need, same(5e6), same(0.01))).ms),
  );
  return [
    { subject: 'lot sizing', what: 'cheapest plan, 1,000 periods: median of 9', value: long, unit: 'ms', goal: 50 },
    {
      subject: 'lot sizing',
      what: 'the same when one order covers hundreds',
      value: cheapHolding,
      unit: 'ms',
      goal: 50,
    },
  ];
}

export function rows() {
  const asked = shop(5000, 2000, 52);
  plan(shop(500, 200, 52));
  const runs = [0, 1, 2].map(() => timed(() => plan(asked)));
  const plans = [...runs[0].result.values()];
  const orders = plans.reduce((sum, { orders: list }) => sum + list.length, 0);
  const pegging = timed(() => plans.reduce((sum, part) => sum + pegPart(part).length + planMessages(part).length, 0));
  const what = '5,000 parts, 10 levels, 52 weeks, 2,000 demands';
  return [
    {
      subject: 'netting',
      what: `${what}: median of 3`,
      value: median(runs.map(({ ms }) => ms)),
      unit: 'ms',
      goal: 1000,
    },
    { subject: 'netting', what: `${what}: planned orders`, value: orders, unit: 'orders' },
    { subject: 'netting', what: 'pegs and messages of all parts', value: pegging.ms, unit: 'ms' },
    {
      subject: 'netting',
      what: 'exponent of growth, 1,000 to 16,000 parts',
      value: growth([1000, 4000, 16_000]),
      unit: '',
      goal: 1.1,
    },
    ...wagnerWhitinRows(),
  ];
}
