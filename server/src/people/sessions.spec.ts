import { setTimeout as wait } from 'node:timers/promises';
import { Controller, Get, Module, Req } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Request } from 'express';
import supertest from 'supertest';
import { Public } from '../platform/auth/access.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser, testPassword } from '../testing/users.js';

@Controller('slow')
class SlowController {
  /** Changes the session, and answers only after a while. */
  @Get()
  @Public()
  async slow(@Req() request: Request): Promise<{ done: true }> {
    request.session.device = 'changed while the person signed out';
    await wait(300);
    return { done: true };
  }
}

@Module({ controllers: [SlowController] })
class SlowModule {}

/** The cookie of an answer, to be sent by hand. */
function cookieOf(headers: Record<string, unknown>): string {
  const [cookie] = headers['set-cookie'] as string[];
  return cookie?.split(';')[0] ?? '';
}

describe('sessions', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp({ modules: [SlowModule] });
  });

  afterAll(() => app.close());

  const personBehind = async (cookie: string) => {
    const answer = await supertest(app.url).get('/api/session').set('Cookie', cookie).expect(200);
    return (answer.body as { person: { id: number } | null }).person;
  };

  /** Signs in by hand, for tests about the cookies themselves. */
  const signInByHand = async (email: string) => {
    const first = await supertest(app.url).get('/api/session').expect(200);
    const before = cookieOf(first.headers);
    const token = (first.body as { csrfToken: string }).csrfToken;
    const answer = await supertest(app.url)
      .post('/api/session')
      .set({ Cookie: before, 'x-csrf-token': token })
      .send({ email, password: testPassword })
      .expect(200);
    return { before, after: cookieOf(answer.headers), token: (answer.body as { csrfToken: string }).csrfToken };
  };

  it('shows a visitor no person, and that the shop needs an owner', async () => {
    const agent = await app.visitor();
    const { body } = await agent.get('/api/session').expect(200);
    expect(body).toEqual({ csrfToken: agent.token, person: null, shop: null, needsOwner: true });
  });

  it('marks the cookie so that scripts and other sites cannot use it', async () => {
    const { headers } = await supertest(app.url).get('/api/session').expect(200);
    const [cookie] = headers['set-cookie'] as unknown as string[];
    expect(cookie).toMatch(/^emberlot=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/);
  });

  it('gives a new session at sign-in and leaves the old one without a person', async () => {
    const user = await addUser(app.database.handle);
    const { before, after } = await signInByHand(user.email);
    expect(after).not.toBe(before);
    expect(await personBehind(after)).toMatchObject({ id: user.id });
    expect(await personBehind(before)).toBeNull();
  });

  it('keeps no session id in the database, only its digest', async () => {
    const user = await addUser(app.database.handle);
    const { after } = await signInByHand(user.email);
    const id =
      decodeURIComponent(after.split('=')[1] ?? '')
        .slice(2)
        .split('.')[0] ?? '';
    const rows = await app.database.handle.selectFrom('user_session').select(['sid', 'sess']).execute();
    expect(id).toHaveLength(32);
    expect(rows.some((row) => row.sid.includes(id) || JSON.stringify(row.sess).includes(id))).toBe(false);
  });

  it('ends the session at sign-out, even while a slow request is running in it', async () => {
    const user = await addUser(app.database.handle);
    const { after, token } = await signInByHand(user.email);
    const slow = supertest(app.url)
      .get('/api/slow')
      .set('Cookie', after)
      .then((answer) => answer.status);
    await wait(100);
    const answer = await supertest(app.url)
      .delete('/api/session')
      .set({ Cookie: after, 'x-csrf-token': token })
      .expect(204);
    expect(answer.headers['clear-site-data']).toContain('storage');
    expect(await slow).toBe(200);
    expect(await personBehind(after)).toBeNull();
    await supertest(app.url).get('/api/profile').set('Cookie', after).expect(401);
  });

  it('does not accept an edited cookie', async () => {
    const user = await addUser(app.database.handle);
    const { after } = await signInByHand(user.email);
    const edited = after.replace(/.$/, (last) => (last === 'A' ? 'B' : 'A'));
    expect(await personBehind(edited)).toBeNull();
  });

  it('ends after twelve hours without use', async () => {
    const user = await addUser(app.database.handle);
    const { after } = await signInByHand(user.email);
    app.clock.advance({ hours: 11 });
    expect(await personBehind(after)).not.toBeNull();
    app.clock.advance({ hours: 11 });
    expect(await personBehind(after)).not.toBeNull();
    app.clock.advance({ hours: 12, minutes: 2 });
    expect(await personBehind(after)).toBeNull();
  });

  it('ends after a week however much it is used', async () => {
    const user = await addUser(app.database.handle);
    const { after } = await signInByHand(user.email);
    for (let hours = 0; hours < 7 * 24; hours += 8) {
      expect(await personBehind(after)).not.toBeNull();
      app.clock.advance({ hours: 8 });
    }
    app.clock.advance({ minutes: 2 });
    expect(await personBehind(after)).toBeNull();
  });

  it('follows a change of role, and the closing of the account, with the next request', async () => {
    const user = await addUser(app.database.handle, { role: 'accountant' });
    const agent = await app.agentOf(user);
    await agent.get('/api/audit-entries').expect(200);
    const change = app.database.handle.updateTable('app_user').where('id', '=', user.id);
    await change.set({ role: 'assembler' }).execute();
    await agent.get('/api/audit-entries').expect(403);
    await change.set({ status: 'disabled' }).execute();
    await agent.get('/api/audit-entries').expect(401);
  });

  it('lists where one is signed in, and ends one of them or all others', async () => {
    const user = await addUser(app.database.handle);
    const [here, there, elsewhere] = [await app.agentOf(user), await app.agentOf(user), await app.agentOf(user)];
    const { body } = await here.get('/api/sessions').expect(200);
    const items = (body as { items: { key: string; current: boolean }[] }).items;
    expect(items).toHaveLength(3);
    expect(items.filter((item) => item.current)).toHaveLength(1);
    const other = (await there.get('/api/sessions').expect(200)).body;
    const key = (other as { items: { key: string; current: boolean }[] }).items.find((item) => item.current)?.key ?? '';
    await here.delete(`/api/sessions/${key}`).expect(204);
    await there.get('/api/profile').expect(401);
    await elsewhere.get('/api/profile').expect(200);
    await here.delete('/api/sessions').expect(204);
    await elsewhere.get('/api/profile').expect(401);
    await here.get('/api/profile').expect(200);
  });

  it('does not end somebody else’s session', async () => {
    const [one, other] = [await app.agentFor('assembler'), await app.agentFor('customer')];
    const { body } = await other.get('/api/sessions').expect(200);
    const key = (body as { items: { key: string }[] }).items[0]?.key ?? '';
    const refused = await one.delete(`/api/sessions/${key}`).expect(404);
    const missing = await one.delete('/api/sessions/none').expect(404);
    expect({ ...refused.body, requestId: '' }).toEqual({ ...missing.body, requestId: '' });
    await other.get('/api/profile').expect(200);
  });
});

describe('the session cookie over TLS', () => {
  it('is bound to this host and this scheme', async () => {
    const app = await startTestApp({ env: { BASE_URL: 'https://shop.fernhollow.example', TRUST_PROXY: '1' } });
    try {
      const behindProxy = await supertest(app.url).get('/api/session').set('X-Forwarded-Proto', 'https').expect(200);
      const [cookie] = behindProxy.headers['set-cookie'] as unknown as string[];
      expect(cookie).toMatch(/^__Host-emberlot=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; Secure; SameSite=Lax$/);
      const inTheOpen = await supertest(app.url).get('/api/session').expect(200);
      expect(inTheOpen.headers['set-cookie']).toBeUndefined();
    } finally {
      await app.close();
    }
  });
});
