// How long the build mix of 40 products over shared parts and sub-assemblies takes.
import { Decimal } from '@emberlot/shared/measure/decimal';
import { buildMix } from '@emberlot/shared/plan/build-mix';
import loadSolver from 'highs';
import { median, random, timed } from './bench-tools.mjs';

function question(seed) {
  const next = random(seed);
  const pick = (count) => Math.floor(next() * count);
  const line = (position, part, quantity, alternates = []) => ({
    position: `${position}`,
    part,
    quantityPer: new Decimal(quantity),
    scrapShare: new Decimal(pick(8) === 0 ? '0.02' : '0'),
    alternates: alternates.map((other, priority) => ({ part: other, priority, factor: new Decimal(1) })),
  });
  const bills = new Map();
  const products = Array.from({ length: 40 }, (_, n) => {
    const parts = [...new Set(Array.from({ length: 12 }, () => `part${pick(120)}`))];
    const subs = [...new Set([pick(15), pick(15)])].map((number) => `sub${number}`);
    const rows = parts.map((part, position) =>
      line(position, part, 1 + pick(4), position === 0 ? [`spare${pick(10)}`] : []),
    );
    bills.set(`product${n}`, [...rows, ...subs.map((sub, index) => line(`s${index}`, sub, 1))]);
    const earns = 20 + pick(150);
    return {
      part: `product${n}`,
      earns,
      promised: pick(6),
      promiseWeight: 1 + pick(3),
      atLeast: 0,
      atMost: 5 + pick(30),
    };
  });
  for (let n = 0; n < 15; n += 1) {
    bills.set(
      `sub${n}`,
      Array.from({ length: 5 }, (_, position) => line(position, `part${n * 8 + position}`, 1 + pick(3))),
    );
  }
  const names = [
    ...Array.from({ length: 120 }, (_, n) => `part${n}`),
    ...Array.from({ length: 10 }, (_, n) => `spare${n}`),
  ];
  const onHand = new Map([
    ...names.map((name) => [name, 40 + pick(200)]),
    ...Array.from({ length: 15 }, (_, n) => [`sub${n}`, pick(10)]),
  ]);
  const minutes = (part) => (part.startsWith('sub') ? 12 : 45);
  return { bills, onHand, decimals: () => 0, products, minutes, minutesAvailable: 4800 };
}

export async function rows() {
  const solver = await loadSolver();
  const questions = [1, 2, 3, 4, 5].map(question);
  return ['earn_most', 'serve_promises'].flatMap((aim) => {
    const runs = questions.map((asked) => timed(() => buildMix(asked, aim, solver)));
    const times = runs.map(({ ms }) => ms);
    const what = `40 products, ${aim === 'earn_most' ? 'earn most' : 'serve promises'}`;
    return [
      { subject: 'build mix', what: `${what}: median of 5`, value: median(times), unit: 'ms', goal: 2000 },
      { subject: 'build mix', what: `${what}: slowest of 5`, value: Math.max(...times), unit: 'ms', goal: 2000 },
      {
        subject: 'build mix',
        what: `${what}: solved`,
        value: runs.filter(({ result }) => result.status === 'optimal').length,
        unit: 'of 5',
      },
    ];
  });
}
