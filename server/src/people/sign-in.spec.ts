import { hash } from '@node-rs/argon2';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser, testPassword } from '../testing/users.js';
import { peopleLimits } from './limits.js';

/** Everything of an answer that a stranger could compare. */
function visible(response: { status: number; headers: Record<string, unknown>; body: Record<string, unknown> }) {
  const { requestId: _requestId, ...body } = response.body;
  const names = Object.keys(response.headers).toSorted();
  return { status: response.status, names, body };
}

function medianOf(values: readonly number[]): number {
  return values.toSorted((one, other) => one - other)[Math.floor(values.length / 2)] ?? 0;
}

describe('signing in', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp({ env: { TRUST_PROXY: '1' } });
  });

  afterAll(() => app.close());

  /** Each visitor comes from a network address of its own, so that one test's tries do not count in another. */
  let addresses = 0;
  const nextAddress = () => `198.51.100.${(addresses += 1)}`;

  const attempt = async (email: string, password: string, address = nextAddress()) => {
    const visitor = await app.visitor();
    return visitor.post('/api/session', { email, password }).set('X-Forwarded-For', address);
  };

  it('lets somebody in by address, in any case, and password', async () => {
    const user = await addUser(app.database.handle, { role: 'accountant' });
    const answer = await attempt(user.email.toUpperCase(), testPassword);
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({ person: { id: user.id, role: 'accountant', email: user.email } });
  });

  it('answers the same to an unknown address, a wrong password and a closed account', async () => {
    const known = await addUser(app.database.handle);
    const closed = await addUser(app.database.handle, { status: 'disabled' });
    const answers = [
      await attempt('nobody@fernhollow.example', testPassword),
      await attempt(known.email, 'not the password'),
      await attempt(closed.email, testPassword),
    ].map(visible);
    expect(answers[0]).toMatchObject({ status: 401, body: { code: 'wrong_credentials' } });
    expect(answers[1]).toEqual(answers[0]);
    expect(answers[2]).toEqual(answers[0]);
  });

  it('takes as long for an unknown address as for a wrong password', async () => {
    const times = { known: [] as number[], unknown: [] as number[] };
    const visitor = await app.visitor();
    for (let round = 0; round < 30; round += 1) {
      const user = await addUser(app.database.handle);
      for (const [kind, email] of [
        ['known', user.email],
        ['unknown', `nobody-${round}@fernhollow.example`],
      ] as const) {
        const started = performance.now();
        await visitor
          .post('/api/session', { email, password: 'not the password' })
          .set('X-Forwarded-For', nextAddress());
        times[kind].push(performance.now() - started);
      }
    }
    const [known, unknown] = [medianOf(times.known), medianOf(times.unknown)];
    expect(Math.abs(known - unknown) / Math.max(known, unknown)).toBeLessThan(0.2);
  }, 60_000);

  it('keeps passwords apart that differ in case or in their eightieth character', async () => {
    const long = `${'a long sentence about a small iron that nobody would guess in a hundred years'.padEnd(79, '.')}x`;
    expect(long).toHaveLength(80);
    const passwordHash = await hash(long, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });
    const user = await addUser(app.database.handle);
    await app.database.handle
      .updateTable('app_user')
      .set({ password_hash: passwordHash })
      .where('id', '=', user.id)
      .execute();
    expect((await attempt(user.email, long.toUpperCase())).status).toBe(401);
    expect((await attempt(user.email, `${long.slice(0, 79)}y`)).status).toBe(401);
    expect((await attempt(user.email, long)).status).toBe(200);
  });

  it('refuses a password of ten kilobytes before it is hashed', async () => {
    const started = performance.now();
    const answer = await attempt('nobody@fernhollow.example', 'x'.repeat(10_000));
    expect(answer.body).toMatchObject({ code: 'invalid_input', errors: [{ pointer: '/password' }] });
    expect(performance.now() - started).toBeLessThan(500);
  });

  it('makes an older hash anew at the next sign-in', async () => {
    const user = await addUser(app.database.handle);
    const older = await hash(testPassword, { memoryCost: 8_192, timeCost: 1, parallelism: 1 });
    const accounts = app.database.handle;
    await accounts.updateTable('app_user').set({ password_hash: older }).where('id', '=', user.id).execute();
    expect((await attempt(user.email, testPassword)).status).toBe(200);
    const { password_hash: newer } = await accounts
      .selectFrom('app_user')
      .select('password_hash')
      .where('id', '=', user.id)
      .executeTakeFirstOrThrow();
    expect(newer).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect((await attempt(user.email, testPassword)).status).toBe(200);
  });

  it('stops guesses at one account, wherever they come from and however many at once', async () => {
    const user = await addUser(app.database.handle);
    const answers = await Promise.all(Array.from({ length: 14 }, (_, guess) => attempt(user.email, `guess ${guess}`)));
    const refused = answers.filter((answer) => answer.status === 429);
    expect(refused).toHaveLength(4);
    expect(Number(refused[0]?.headers['retry-after'])).toBeGreaterThan(0);
    const right = await attempt(user.email, testPassword);
    expect(right.body).toMatchObject({ code: 'too_many_tries' });
    app.clock.advance({ minutes: 16 });
    expect((await attempt(user.email, testPassword)).status).toBe(200);
  });

  it('does not lock somebody out of a place they signed in from before', async () => {
    const user = await addUser(app.database.handle);
    const home = nextAddress();
    expect((await attempt(user.email, testPassword, home)).status).toBe(200);
    await Promise.all(Array.from({ length: 12 }, (_, guess) => attempt(user.email, `guess ${guess}`)));
    expect((await attempt(user.email, testPassword)).status).toBe(429);
    expect((await attempt(user.email, testPassword, home)).status).toBe(200);
  });

  const useUp = async (address: string) => {
    for (let guess = 0; guess < peopleLimits.signInFromAddress.attempts; guess += 1) {
      await app.get(AttemptLimits).take(peopleLimits.signInFromAddress, address);
    }
  };

  it('stops one network address from trying many accounts', async () => {
    const address = nextAddress();
    await useUp(address);
    const answer = await attempt('somebody@elsewhere.example', 'a guess', address);
    expect(answer.body).toMatchObject({ status: 429, code: 'too_many_tries' });
    expect((await attempt('somebody@elsewhere.example', 'a guess')).status).toBe(401);
  });

  it('counts by the address that the nearest proxy saw, not by what the client claims', async () => {
    const address = nextAddress();
    await useUp(address);
    const forged = `203.0.113.9, ${address}`;
    expect((await attempt('somebody@elsewhere.example', 'a guess', forged)).status).toBe(429);
  });

  it('records who came in and which tries were refused', async () => {
    const user = await addUser(app.database.handle, { name: 'The recorded one' });
    await attempt(user.email, 'not the password');
    await attempt(user.email, testPassword);
    const entries = await app.database.handle
      .selectFrom('audit_entry')
      .select(['action', 'actor_id'])
      .where('subject_id', '=', user.id)
      .where('subject_kind', '=', 'app_user')
      .orderBy('id')
      .execute();
    expect(entries).toEqual([
      { action: 'session.refused', actor_id: null },
      { action: 'session.started', actor_id: user.id },
    ]);
  });

  it('leaves the server quick for others while many sign in', async () => {
    const user = await addUser(app.database.handle);
    const rush = Promise.all(Array.from({ length: 50 }, () => attempt(user.email, 'a guess')));
    const times: number[] = [];
    for (let look = 0; look < 5; look += 1) {
      const started = performance.now();
      await (await app.visitor()).get('/api/health').expect(200);
      times.push(performance.now() - started);
    }
    await rush;
    expect(medianOf(times)).toBeLessThan(200);
  });
});
