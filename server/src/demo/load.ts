import { sql } from 'kysely';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '../app.module.js';
import { AccountsService } from '../people/accounts.service.js';
import { PasswordHasher } from '../people/password-hasher.js';
import type { SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { Chance } from './chance.js';
import { DemoBench, type Drift } from './demo-bench.js';
import { DemoCounter } from './demo-counter.js';
import { DemoShop } from './demo-shop.js';
import { demoSignIns } from './sign-ins.js';
import { TurnedClock } from './turned-clock.js';

const monthsOfHistory = 6;
const day = 86_400_000;

const steady: Drift = () => 0;
/** The warm-up and the pack current wander off together, as they do when a lot of clamps is poor. */
const wandering: Drift = (name) =>
  name === 'Pack current at working drive' ? 0.45 : name === 'Time to 350 °C' ? 0.5 : 0.1;

/** Fills an empty database with six months of a small shop, through the services, with the clock turned back. */
async function load(): Promise<void> {
  const app = await NestFactory.createApplicationContext(AppModule, { logger: ['error', 'warn'] });
  try {
    const { handle } = app.get(Database);
    const anybody = await handle.selectFrom('app_user').select('id').limit(1).executeTakeFirst();
    if (anybody) {
      process.stdout.write('This database is in use already: no demo was loaded.\n');
      return;
    }
    const today = new Date();
    today.setUTCHours(8, 0, 0, 0);
    const clock = new TurnedClock(app.get(Clock), new Date(today.getTime() - monthsOfHistory * 30 * day));
    const people = await addPeople(app);
    const shop = new DemoShop(app, clock, people.owner);
    const bench = new DemoBench(app, clock, new Chance(60_140), people.owner, people.assembler);
    await shop.setUp();
    await shop.addParts();
    await shop.releaseBills();
    await shop.receive(2);
    await shop.offer();
    const counter = new DemoCounter(app, clock, people.owner, people.assembler);
    await history({ shop, bench, counter, clock, today });
    await counter.sell(['wren-60'], people.customer);
    await counter.sell(['heron-140']);
    await letHistoryRest(app.get(Database));
  } finally {
    await app.close();
  }
}

interface Story {
  readonly shop: DemoShop;
  readonly bench: DemoBench;
  readonly counter: DemoCounter;
  readonly clock: TurnedClock;
  readonly today: Date;
}

/** What is bought after each round of batches. */
const orders = [
  ['wren-60'],
  ['wren-60-kit'],
  ['wren-60', 'tip-wren-stepped'],
  ['heron-140'],
  ['heron-140-kit'],
  ['wren-60', 'rest-bent-wire'],
  ['heron-140', 'charging-lead'],
  ['wren-60'],
  ['heron-140'],
];

/** Batch after batch, a fortnight apart; deliveries in between; the last ones are still on the bench. */
async function history({ shop, bench, counter, clock, today }: Story): Promise<void> {
  const rounds = 6;
  for (let round = 0; round < rounds; round += 1) {
    if (round > 0) await shop.receive(1);
    for (const [part, bin] of [
      ['TRANSFORMER-W', 'G1'],
      ['DRIVE-W', 'G1'],
      ['PACK-W', 'A1'],
      ['TIP-W-STEPPED', 'G1'],
      ['TRANSFORMER-H', 'G1'],
      ['DRIVE-H', 'G1'],
      ['PACK-H', 'A1'],
      ['TIP-H-STEPPED', 'G1'],
    ] as const) {
      // prettier-ignore
      await bench.makeParts(part, part.startsWith('TIP') ? 24 : 16, bin);
      clock.advance({ hours: 4 });
    }
    const drift = round === 3 ? wandering : steady;
    await bench.buildIrons('WREN-60', 8, drift, round % 2 === 0 ? 5 : -1);
    clock.advance({ days: 2 });
    await bench.buildIrons('HERON-140', 6, drift, round === 3 ? 2 : -1);
    for (const slugs of orders) {
      const id = await counter.sell(slugs);
      clock.advance({ hours: 5 });
      if (id !== undefined) await counter.send(id);
      clock.advance({ hours: 19 });
    }
    const next = today.getTime() - (rounds - 1 - round) * 26 * day - 4 * day;
    clock.advance({ minutes: Math.max(60, Math.floor((next - clock.now().getTime()) / 60_000)) });
  }
  await bench.buildIrons('WREN-60', 8, steady, -1, 5);
  await bench.plan('HERON-140', 6, new Date(today.getTime() + 9 * day).toISOString().slice(0, 10));
}

async function addPeople(app: Awaited<ReturnType<typeof NestFactory.createApplicationContext>>) {
  const accounts = app.get(AccountsService);
  const made = new Map<string, SignedInUser>();
  for (const { role, name, email, password } of demoSignIns) {
    const passwordHash = await app.get(PasswordHasher).hash(password);
    const user = await app.get(Transactions).run((trx) => accounts.create(trx, { role, name, email, passwordHash }));
    made.set(role, { id: user.id, role, name, email, customerId: null });
  }
  const owner = made.get('owner');
  const assembler = made.get('assembler');
  const customer = made.get('customer');
  if (!owner || !assembler || !customer) throw new Error('the demo needs an owner, an assembler and a customer');
  return { owner, assembler, customer };
}

/** The mails of the history left long ago, and its fees were asked for then: nothing of it is to be done again. */
async function letHistoryRest(database: Database): Promise<void> {
  await sql`update outbox_mail set sent_at = created_at where sent_at is null`.execute(database.handle);
  await sql`delete from graphile_worker._private_jobs`.execute(database.handle);
}

await load();
