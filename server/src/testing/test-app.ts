import type { ModuleMetadata } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import type { Transaction } from 'kysely';
import type { DB } from '@emberlot/db/database.types';
import { createTestDatabase } from '@emberlot/db/testing';
import { PeopleModule } from '../people/people.module.js';
import type { Role, SignedInUser } from '../platform/auth/signed-in-user.js';
import { Clock } from '../platform/clock/clock.js';
import { SettableClock } from '../platform/clock/settable-clock.js';
import { Config } from '../platform/config/config.js';
import { Database } from '../platform/database/database.js';
import { Transactions } from '../platform/database/transactions.js';
import { configureApp } from '../platform/http/configure-app.js';
import { ServerAdapter } from '../platform/http/server.adapter.js';
import { JobRunner } from '../platform/jobs/job-runner.js';
import { PlatformModule } from '../platform/platform.module.js';
import { Agent } from './agent.js';
import { testConfig } from './test-config.js';
import { addUser, testPassword, type UserRow } from './users.js';

export interface TestAppOptions {
  /** The modules under test; the platform and people are always there. */
  readonly modules?: NonNullable<ModuleMetadata['imports']>;
  /** Where the clock stands at first. */
  readonly startsAt?: Date;
  /** Environment variables that differ from those of `testConfig`. */
  readonly env?: Readonly<Record<string, string>>;
}

/** The real application over a database of its own, with a clock that the spec moves. */
export class TestApp {
  readonly #signedIn = new Map<Role, Agent>();

  constructor(
    readonly nest: NestExpressApplication,
    readonly clock: SettableClock,
    /** The address the application listens at. */
    readonly url: string,
    /** Connects as the schema's owner, for what the server's role may not do. */
    readonly ownerUrl: string,
    private readonly drop: () => Promise<void>,
  ) {}

  get database(): Database {
    return this.nest.get(Database);
  }

  get config(): Config {
    return this.nest.get(Config);
  }

  /** A provider of any module, by its class. */
  get<Provider>(type: abstract new (...args: never[]) => Provider): Provider {
    return this.nest.get(type, { strict: false });
  }

  async transaction<Result>(work: (trx: Transaction<DB>) => Promise<Result>): Promise<Result> {
    return this.nest.get(Transactions).run(work);
  }

  /** A browser of nobody. */
  async visitor(): Promise<Agent> {
    return Agent.open(this.url);
  }

  /** The browser of somebody of this role, signed in; the same one each time. */
  async agentFor(role: Role): Promise<Agent> {
    const known = this.#signedIn.get(role);
    if (known) return known;
    const agent = await this.agentOf(await addUser(this.database.handle, { role }, this.clock.now()));
    this.#signedIn.set(role, agent);
    return agent;
  }

  /** The browser of a certain person, signed in. Made by `addUser`, so with the password of all specs. */
  async agentOf(user: Pick<UserRow, 'email'>): Promise<Agent> {
    const agent = await this.visitor();
    await agent.signIn(user.email, testPassword);
    return agent;
  }

  /** Who an agent is signed in as: for services that are called without a request. */
  async userOf(agent: Agent): Promise<SignedInUser> {
    const { body } = await agent.get('/api/session').expect(200);
    return { ...(body as { person: Omit<SignedInUser, 'customerId'> }).person, customerId: null };
  }

  /** Does the jobs that are due by the spec's clock, once each. */
  async runJobs(): Promise<void> {
    await this.nest.get(JobRunner).runPending(this.clock.now());
  }

  async close(): Promise<void> {
    await this.nest.close();
    await this.drop();
  }
}

/** Starts the application; close it in `afterAll`. */
export async function startTestApp(options: TestAppOptions = {}): Promise<TestApp> {
  const database = await createTestDatabase('server');
  const clock = new SettableClock(options.startsAt ?? new Date('2027-03-01T09:00:00Z'));
  const module = await Test.createTestingModule({
    imports: [PlatformModule, PeopleModule, ...(options.modules ?? [])],
  })
    .overrideProvider(Config)
    .useValue(testConfig(database.serverUrl, options.env))
    .overrideProvider(Clock)
    .useValue(clock)
    .compile();
  const nest = module.createNestApplication<NestExpressApplication>(new ServerAdapter(), {
    bodyParser: false,
    logger: false,
    rawBody: true,
  });
  configureApp(nest);
  await nest.listen(0, '127.0.0.1');
  return new TestApp(nest, clock, await nest.getUrl(), database.ownerUrl, () => database.drop());
}
