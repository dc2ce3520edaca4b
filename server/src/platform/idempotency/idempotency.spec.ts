import { setTimeout as wait } from 'node:timers/promises';
import { Body, Controller, Injectable, Module, Post } from '@nestjs/common';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import type { Agent } from '../../testing/agent.js';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { Public } from '../auth/access.js';
import { Transactions } from '../database/transactions.js';
import { AppError } from '../errors/app-error.js';
import { Numbers } from '../numbers/numbers.js';
import { Text } from '../validation/fields.js';
import { Creates } from './creates.js';

class SlipDto {
  @Text({ max: 40 })
  word: string;
}

@Injectable()
class SlipsService {
  /** Fails so often before it works: a fault that goes away. */
  faults = 0;

  constructor(
    private readonly transactions: Transactions,
    private readonly numbers: Numbers,
  ) {}

  async make(word: string): Promise<{ number: number; word: string }> {
    if (word === 'refused first') throw new AppError('rule_broken', 'No such slip is made.');
    const number = await this.transactions.run(async (trx) => {
      await wait(30);
      const next = await this.numbers.next(trx, 'slip', '');
      if (this.faults > 0) {
        this.faults -= 1;
        throw new AppError('rule_broken', 'Not this time.');
      }
      return next;
    });
    if (word === 'refused after') throw new AppError('service_unavailable', 'Made, but the rest did not work.');
    return { number, word };
  }
}

@Controller('slips')
class SlipsController {
  constructor(private readonly slips: SlipsService) {}

  @Post()
  @Public()
  @Creates()
  async make(@Body() body: SlipDto): Promise<{ number: number; word: string }> {
    return this.slips.make(body.word);
  }
}

@Module({ controllers: [SlipsController], providers: [SlipsService] })
class SlipsModule {}

describe('a request that creates something', () => {
  let app: TestApp;
  let agent: Agent;
  let keys = 0;

  beforeAll(async () => {
    app = await startTestApp({ modules: [SlipsModule] });
    agent = await app.agentFor('owner');
  });

  beforeEach(() => {
    app.get(SlipsService).faults = 0;
    keys += 1;
  });

  afterAll(() => app.close());

  const key = () => `key-of-this-test-${keys}`;

  const slipsMade = async () => {
    const row = await app.database.handle
      .selectFrom('number_series')
      .select('last_number')
      .where('series', '=', 'slip')
      .executeTakeFirst();
    return row?.last_number ?? 0;
  };

  it('needs a key', async () => {
    const answer = await agent.post('/api/slips', { word: 'no key' }).expect(400);
    expect(answer.body).toMatchObject({ errors: [{ pointer: '/Idempotency-Key' }] });
    await agent.create('/api/slips', { word: 'short key' }, 'short').expect(400);
  });

  it('sent again, creates nothing and gets the same answer', async () => {
    const first = await agent.create('/api/slips', { word: 'once' }, key()).expect(201);
    const made = await slipsMade();
    const again = await agent.create('/api/slips', { word: 'once' }, key()).expect(201);
    expect(again.body).toEqual(first.body);
    expect(again.headers['idempotency-replayed']).toBe('true');
    expect(await slipsMade()).toBe(made);
  });

  it('sent ten times at once, creates one thing', async () => {
    const before = await slipsMade();
    const answers = await Promise.all(
      Array.from({ length: 10 }, () => agent.create('/api/slips', { word: 'pressed' }, key())),
    );
    expect(new Set(answers.map((answer) => JSON.stringify([answer.status, answer.body]))).size).toBe(1);
    expect(answers[0]?.status).toBe(201);
    expect(await slipsMade()).toBe(before + 1);
  });

  it('is refused when the key came with something else before', async () => {
    await agent.create('/api/slips', { word: 'this' }, key()).expect(201);
    const other = await agent.create('/api/slips', { word: 'that' }, key()).expect(422);
    expect(other.body).toMatchObject({ code: 'key_reused' });
  });

  it('does not meet the key of another person', async () => {
    const other = await app.agentFor('customer');
    await agent.create('/api/slips', { word: 'mine' }, key()).expect(201);
    const theirs = await other.create('/api/slips', { word: 'theirs' }, key()).expect(201);
    expect(theirs.body).toMatchObject({ word: 'theirs' });
  });

  it('leaves the key free when nothing was made', async () => {
    app.get(SlipsService).faults = 1;
    await agent.create('/api/slips', { word: 'later' }, key()).expect(422);
    const made = await agent.create('/api/slips', { word: 'later' }, key()).expect(201);
    expect(made.headers['idempotency-replayed']).toBeUndefined();
  });

  it('keeps a refusal that came after something was made', async () => {
    const before = await slipsMade();
    const first = await agent.create('/api/slips', { word: 'refused after' }, key()).expect(503);
    const again = await agent.create('/api/slips', { word: 'refused after' }, key()).expect(503);
    expect({ ...again.body, requestId: '' }).toEqual({ ...first.body, requestId: '' });
    expect(await slipsMade()).toBe(before + 1);
  });

  it('says so when its answer was lost with the server that gave it', async () => {
    await agent.create('/api/slips', { word: 'lost' }, key()).expect(201);
    await app.database.handle
      .updateTable('idempotency_key')
      .set({ status: null, answer: null, answered_at: null })
      .where('key', '=', key())
      .execute();
    const again = await agent.create('/api/slips', { word: 'lost' }, key()).expect(409);
    expect(again.body).toMatchObject({ code: 'already_exists' });
  }, 10_000);

  it('of a visitor is bound to their session', async () => {
    const visitor = await app.visitor();
    const made = await visitor.create('/api/slips', { word: 'guest' }, key()).expect(201);
    expect((await visitor.create('/api/slips', { word: 'guest' }, key())).body).toEqual(made.body);
    const other = await (await app.visitor()).create('/api/slips', { word: 'guest' }, key()).expect(201);
    expect(other.body).not.toEqual(made.body);
  });
});
