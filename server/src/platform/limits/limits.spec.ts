import { Controller, Module, Post } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { addUser } from '../../testing/users.js';
import { Public } from '../auth/access.js';
import { AttemptLimits } from './attempt-limits.js';
import { Limited } from './limited.js';

const limit = { name: 'spec', attempts: 3, minutes: 10 };

@Controller('costly')
class CostlyController {
  @Post()
  @Public()
  @Limited({ name: 'costly', attempts: 2, minutes: 1 })
  run(): { done: true } {
    return { done: true };
  }
}

@Module({ controllers: [CostlyController] })
class CostlyModule {}

describe('limits of attempts', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp({ modules: [CostlyModule] });
  });

  afterAll(() => app.close());

  const take = (whom: string) => app.get(AttemptLimits).take(limit, whom);

  it('let so many through in a window, also when they come at once', async () => {
    const tries = await Promise.allSettled(Array.from({ length: 8 }, () => take('one')));
    expect(tries.filter((attempt) => attempt.status === 'fulfilled')).toHaveLength(3);
    await expect(take('another')).resolves.toBeUndefined();
  });

  it('say how long to wait, and end by themselves', async () => {
    await Promise.allSettled(Array.from({ length: 4 }, () => take('waiting')));
    app.clock.advance({ minutes: 4 });
    await expect(take('waiting')).rejects.toMatchObject({
      code: 'too_many_tries',
      message: 'Too many tries. Wait 6 minutes, then try again.',
      extra: { retryAfterSeconds: 360 },
    });
    app.clock.advance({ minutes: 6 });
    await expect(take('waiting')).resolves.toBeUndefined();
  });

  it('are not made longer by trying on', async () => {
    await Promise.allSettled(Array.from({ length: 50 }, () => take('stubborn')));
    app.clock.advance({ minutes: 10 });
    await expect(take('stubborn')).resolves.toBeUndefined();
  });

  it('keep nobody’s address in clear, and are swept out when they are over', async () => {
    await take('person@buyers.example');
    const rows = await app.database.handle.selectFrom('attempt_count').select('bucket').execute();
    expect(JSON.stringify(rows)).not.toContain('person@');
    app.clock.advance({ minutes: 11 });
    await app.get(AttemptLimits).prune();
    expect(await app.database.handle.selectFrom('attempt_count').selectAll().execute()).toEqual([]);
  });

  it('bound a route by network address, and for people by person', async () => {
    const [visitor, other] = [await app.visitor(), await app.visitor()];
    const person = await app.agentOf(await addUser(app.database.handle));
    await visitor.post('/api/costly').expect(201);
    await other.post('/api/costly').expect(201);
    const refused = await visitor.post('/api/costly').expect(429);
    expect(refused.body).toMatchObject({ code: 'too_many_tries', retryAfterSeconds: 60 });
    expect(refused.headers['retry-after']).toBe('60');
    await person.post('/api/costly').expect(201);
  });
});
