import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { addUser, testPassword } from '../../testing/users.js';
import { isOwnOrigin } from './own-origin.js';

describe('changes sent by other sites', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  const rename = { name: 'Renamed', version: 1 };

  it('are refused without the token of the session', async () => {
    const agent = await app.agentOf(await addUser(app.database.handle));
    await agent.patch('/api/profile', rename).set('x-csrf-token', '').expect(403);
    await agent.patch('/api/profile', rename).set('x-csrf-token', 'f'.repeat(64)).expect(403);
    const refused = await agent.patch('/api/profile', rename).unset('x-csrf-token').expect(403);
    expect(refused.body).toMatchObject({ code: 'stale_form' });
    await agent.patch('/api/profile', rename).expect(200);
  });

  it('are refused with the token from before signing in, and with somebody else’s', async () => {
    const user = await addUser(app.database.handle);
    const agent = await app.visitor();
    const before = agent.token;
    await agent.signIn(user.email, testPassword);
    expect(agent.token).not.toBe(before);
    await agent.patch('/api/profile', rename).set('x-csrf-token', before).expect(403);
    const other = await app.agentFor('owner');
    await agent.patch('/api/profile', rename).set('x-csrf-token', other.token).expect(403);
  });

  it('are refused at sign-in and sign-out, too', async () => {
    const user = await addUser(app.database.handle);
    const visitor = await app.visitor();
    const body = { email: user.email, password: testPassword };
    await visitor.post('/api/session', body).unset('x-csrf-token').expect(403);
    const agent = await app.agentOf(user);
    await agent.delete('/api/session').unset('x-csrf-token').expect(403);
    await agent.get('/api/profile').expect(200);
  });

  it.each([
    ['Origin', 'https://elsewhere.example'],
    ['Origin', 'null'],
    ['Origin', 'http://127.0.0.1:4311'],
    ['Sec-Fetch-Site', 'cross-site'],
    ['Sec-Fetch-Site', 'same-site'],
  ])('are refused when the browser says %s: %s, even with the token', async (header, value) => {
    const agent = await app.agentFor('assembler');
    await agent.patch('/api/profile', rename).set(header, value).expect(403);
  });

  it('get no leave to be read from other sites', async () => {
    const agent = await app.visitor();
    const answer = await agent.get('/api/session').set('Origin', 'https://elsewhere.example').expect(200);
    expect(answer.headers['access-control-allow-origin']).toBeUndefined();
    const preflight = await (await app.visitor()).get('/api/session').set('Origin', 'null');
    expect(preflight.headers['access-control-allow-origin']).toBeUndefined();
  });
});

describe('one’s own origin', () => {
  it.each([
    [undefined, 'https://shop.example', true],
    ['https://shop.example', 'https://shop.example', true],
    ['http://shop.example', 'https://shop.example', false],
    ['https://shop.example.evil.example', 'https://shop.example', false],
    ['http://localhost:4310', 'http://127.0.0.1:4310', true],
    ['http://localhost:4311', 'http://127.0.0.1:4310', false],
    ['http://localhost:4310', 'https://shop.example', false],
    ['null', 'http://127.0.0.1:4310', false],
  ])('with %s sent to %s: %s', (origin, baseUrl, own) => {
    expect(isOwnOrigin(origin, baseUrl)).toBe(own);
  });
});
