// How long the exact buildable quantity takes on a bill of 500 lines with alternates and shared parts.
import { Decimal } from '@emberlot/shared/measure/decimal';
import { buildable } from '@emberlot/shared/bill/buildable';
import { nextUnit } from '@emberlot/shared/bill/next-unit';
import { median, random, timed } from './bench-tools.mjs';

/** 500 lines on three levels; every `every`-th line may take one or two parts that other lines need too. */
function question(every, seed) {
  const next = random(seed);
  const pick = (count) => Math.floor(next() * count);
  const bills = new Map([['p0', []]]);
  for (let m = 1; m <= 20; m += 1) bills.set(`made${m}`, []);
  const parents = [...bills.keys()];
  for (let n = 0; n < 480; n += 1) {
    const parent = parents[n % parents.length];
    const alternates =
      n % every === 0
        ? [...new Set([`part${pick(300)}`, `part${pick(300)}`])].map((part, priority) => ({
            part,
            priority,
            factor: new Decimal(1),
          }))
        : [];
    const part = `part${pick(300)}`;
    bills.get(parent).push({
      position: `${n}`,
      part,
      quantityPer: new Decimal(1 + pick(4)),
      scrapShare: new Decimal(n % 7 === 0 ? '0.02' : '0'),
      alternates: alternates.filter((alternate) => alternate.part !== part),
    });
  }
  for (let m = 1; m <= 20; m += 1) {
    const parent = m <= 5 ? 'p0' : `made${1 + (m % 5)}`;
    bills.get(parent).push({
      position: `s${m}`,
      part: `made${m}`,
      quantityPer: new Decimal(1),
      scrapShare: new Decimal(0),
      alternates: [],
    });
  }
  const onHand = new Map(Array.from({ length: 300 }, (_, n) => [`part${n}`, 200 + pick(400)]));
  for (let m = 1; m <= 20; m += 1) onHand.set(`made${m}`, pick(10));
  return { bills, part: 'p0', onHand, decimals: () => 0 };
}

/** The hardest of its size: every one of 500 lines may take any of three parts, and all parts are scarce. */
function contested(seed) {
  const next = random(seed);
  const pick = (count) => Math.floor(next() * count);
  const lines = Array.from({ length: 500 }, (_, n) => {
    const [part, ...others] = new Set([pick(200), pick(200), pick(200)].map((number) => `part${number}`));
    return {
      position: `${n}`,
      part,
      quantityPer: new Decimal(1 + pick(4)),
      scrapShare: new Decimal(0),
      alternates: others.map((other, priority) => ({ part: other, priority, factor: new Decimal(1) })),
    };
  });
  const onHand = new Map(Array.from({ length: 200 }, (_, n) => [`part${n}`, 20 + pick(400)]));
  return { bills: new Map([['p0', lines]]), part: 'p0', onHand, decimals: () => 0 };
}

function contestedRows() {
  const runs = [1, 2, 3].map((seed) => timed(() => buildable(contested(seed))));
  const exact = runs.filter(({ result }) => result.quantity.equals(result.atMost)).length;
  const what = 'all 500 lines contested';
  return [
    { subject: 'buildable', what: `${what}: median of 3`, value: median(runs.map(({ ms }) => ms)), unit: 'ms' },
    { subject: 'buildable', what: `${what}: proven exact`, value: exact, unit: 'of 3' },
  ];
}

export function rows() {
  const usual = [10, 4, 2].flatMap((every) => {
    const questions = Array.from({ length: 7 }, (_, seed) => question(every, seed + 1));
    const runs = questions.map((asked) => timed(() => buildable(asked)));
    const exact = runs.filter(({ result }) => result.quantity.equals(result.atMost)).length;
    const stops = questions.map((asked, index) => timed(() => nextUnit(asked, runs[index].result.quantity)));
    const share = `${Math.round(480 / every)} of 500 lines with alternates`;
    return [
      {
        subject: 'buildable',
        what: `${share}: median of 7`,
        value: median(runs.map(({ ms }) => ms)),
        unit: 'ms',
        goal: 200,
      },
      {
        subject: 'buildable',
        what: `${share}: slowest of 7`,
        value: Math.max(...runs.map(({ ms }) => ms)),
        unit: 'ms',
        goal: 200,
      },
      { subject: 'buildable', what: `${share}: proven exact`, value: exact, unit: 'of 7' },
      {
        subject: 'buildable',
        what: `${share}: what stops the next, median`,
        value: median(stops.map(({ ms }) => ms)),
        unit: 'ms',
      },
    ];
  });
  return [...usual, ...contestedRows()];
}
