import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { AttemptLimits } from '../platform/limits/attempt-limits.js';
import type { Agent } from '../testing/agent.js';
import { mailsTo, tokenIn } from '../testing/mails.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser, testPassword } from '../testing/users.js';
import { peopleLimits } from './limits.js';

function statusesOf(answers: readonly { status: number }[]): readonly number[] {
  return answers.map((answer) => answer.status).toSorted((one, other) => one - other);
}

describe('coming in by mail', () => {
  let app: TestApp;
  let visitor: Agent;

  beforeAll(async () => {
    app = await startTestApp();
    visitor = await app.visitor();
  });

  afterAll(() => app.close());

  const lastMailTo = async (address: string) => {
    await app.runJobs();
    return (await mailsTo(app.database.handle, address)).at(-1);
  };

  const signUp = async (email: string, name = 'A buyer') => {
    await visitor.post('/api/sign-ups', { name, email }).expect(202);
    return lastMailTo(email);
  };

  const complete = async (kind: string, token: string, password = testPassword) =>
    (await app.visitor()).post(`/api/${kind}-completions`, { token, password });

  describe('signing up', () => {
    it('makes a customer who is in as soon as the address is confirmed with a password', async () => {
      const mail = await signUp('new@buyers.example', 'Nora New');
      expect(mail?.subject).toBe('Confirm your address');
      expect(mail?.body_text).toContain('http://127.0.0.1:4310/welcome#');
      const agent = await app.visitor();
      const answer = await agent.post('/api/sign-up-completions', { token: tokenIn(mail), password: testPassword });
      expect(answer.body).toMatchObject({ person: { name: 'Nora New', role: 'customer' } });
      await agent.get('/api/profile').expect(200);
      await (await app.visitor()).signIn('new@buyers.example', testPassword);
    });

    it('answers the same whether or not the address is known, and says by mail which', async () => {
      const known = await addUser(app.database.handle, { role: 'customer' });
      const closed = await addUser(app.database.handle, { role: 'customer', status: 'disabled' });
      const answers = [];
      for (const email of ['unknown@buyers.example', known.email, closed.email]) {
        const { status, text, headers } = await visitor.post('/api/sign-ups', { name: 'A buyer', email });
        answers.push({ status, text, names: Object.keys(headers).toSorted() });
      }
      expect(answers[0]).toMatchObject({ status: 202, text: '' });
      expect(answers[1]).toEqual(answers[0]);
      expect(answers[2]).toEqual(answers[0]);
      expect((await lastMailTo(known.email))?.subject).toBe('You have an account already');
      expect((await lastMailTo(closed.email))?.subject).toBe('Your account is closed');
      expect((await lastMailTo('unknown@buyers.example'))?.subject).toBe('Confirm your address');
    });

    it('makes one account when asked twice, and the first link dies', async () => {
      const first = await signUp('twice@buyers.example');
      const second = await signUp('TWICE@buyers.example', 'Second thought');
      expect(second).toBeUndefined();
      const both = await mailsTo(app.database.handle, 'twice@buyers.example');
      expect(both).toHaveLength(2);
      expect((await complete('sign-up', tokenIn(first))).body).toMatchObject({ code: 'link_expired' });
      expect((await complete('sign-up', tokenIn(both[1]))).status).toBe(200);
    });

    it('lets nobody in before the address is confirmed', async () => {
      await signUp('waiting@buyers.example');
      const answer = await visitor.post('/api/session', { email: 'waiting@buyers.example', password: testPassword });
      expect(answer.body).toMatchObject({ code: 'wrong_credentials' });
    });

    it('sends one mail even if the job runs twice', async () => {
      await visitor.post('/api/sign-ups', { name: 'A buyer', email: 'job-twice@buyers.example' }).expect(202);
      const { handle } = app.database;
      await app.runJobs();
      const mail = (await mailsTo(handle, 'job-twice@buyers.example'))[0];
      const { SignUpRequestedTask } = await import('./sign-up-requested.task.js');
      const row = await handle
        .selectFrom('outbox_mail')
        .select('dedupe_key')
        .where('recipient', '=', 'job-twice@buyers.example')
        .executeTakeFirstOrThrow();
      const request = row.dedupe_key.replace('sign_up ', '');
      await app.get(SignUpRequestedTask).run({ name: 'A buyer', email: 'job-twice@buyers.example', request });
      expect(await mailsTo(handle, 'job-twice@buyers.example')).toHaveLength(1);
      expect((await complete('sign-up', tokenIn(mail))).status).toBe(200);
    });

    it.each([
      ['a@b.example\r\nBcc: c@d.example', '/email'],
      ['a@b.example, c@d.example', '/email'],
      ['A <a@b.example>', '/email'],
      ['not an address', '/email'],
      ['', '/email'],
    ])('refuses %j as an address', async (email, pointer) => {
      const answer = await visitor.post('/api/sign-ups', { name: 'A buyer', email }).expect(400);
      expect(answer.body).toMatchObject({ code: 'invalid_input', errors: [{ pointer }] });
    });

    it('puts no line of a name into a header, and shows its markup as text', async () => {
      const refused = await visitor.post('/api/sign-ups', { name: 'A\r\nBcc: x@y.example', email: 'h@b.example' });
      expect(refused.status).toBe(400);
      const mail = await signUp('markup@buyers.example', '<b onload=x>{{7*7}}');
      expect(mail?.body_html).toContain('&lt;b onload=x&gt;{{7*7}}');
      expect(mail?.body_html).not.toContain('<b onload');
    });

    it('limits how many mails one address can be sent', async () => {
      for (let tries = 0; tries < peopleLimits.mailToAccount.attempts; tries += 1) {
        await app.get(AttemptLimits).take(peopleLimits.mailToAccount, 'flooded@buyers.example');
      }
      await visitor.post('/api/sign-ups', { name: 'A buyer', email: 'flooded@buyers.example' }).expect(429);
      await visitor.post('/api/password-resets', { email: 'Flooded@buyers.example' }).expect(429);
    });
  });

  describe('a forgotten password', () => {
    const ask = async (email: string) => {
      await visitor.post('/api/password-resets', { email }).expect(202);
      return lastMailTo(email);
    };

    it('is replaced by the link, which also ends all sessions and tells the person', async () => {
      const user = await addUser(app.database.handle);
      const elsewhere = await app.agentOf(user);
      const mail = await ask(user.email);
      const answer = await complete('password-reset', tokenIn(mail), 'a new sentence for the bench');
      expect(answer.body).toMatchObject({ person: { id: user.id } });
      await elsewhere.get('/api/profile').expect(401);
      await (await app.visitor()).signIn(user.email, 'a new sentence for the bench');
      expect((await lastMailTo(user.email))?.subject).toBe('Your password was changed');
    });

    it('answers the same whether or not the address is known', async () => {
      const user = await addUser(app.database.handle);
      const known = await visitor.post('/api/password-resets', { email: user.email });
      const unknown = await visitor.post('/api/password-resets', { email: 'nobody@buyers.example' });
      expect({ status: unknown.status, text: unknown.text }).toEqual({ status: known.status, text: known.text });
      expect(Object.keys(unknown.headers).toSorted()).toEqual(Object.keys(known.headers).toSorted());
      expect((await lastMailTo('nobody@buyers.example'))?.subject).toBe('There is no account with this address');
    });

    it('works once, also when the link is opened twice at the same moment', async () => {
      const user = await addUser(app.database.handle);
      const token = tokenIn(await ask(user.email));
      const answers = await Promise.all([complete('password-reset', token), complete('password-reset', token)]);
      expect(statusesOf(answers)).toEqual([200, 410]);
      expect((await complete('password-reset', token)).status).toBe(410);
    });

    it('works for half an hour', async () => {
      const user = await addUser(app.database.handle);
      const token = tokenIn(await ask(user.email));
      app.clock.advance({ minutes: 31 });
      expect((await complete('password-reset', token)).body).toMatchObject({ code: 'link_expired' });
    });

    it('keeps only a digest of the token, and not the text of the mail once it has left', async () => {
      const user = await addUser(app.database.handle);
      const mail = await ask(user.email);
      const token = tokenIn(mail);
      const tokens = await app.database.handle.selectFrom('user_token').selectAll().execute();
      expect(JSON.stringify(tokens)).not.toContain(token);
      const { OutboxRepository } = await import('../platform/mail/outbox.repository.js');
      await app.get(OutboxRepository).markSent(app.database.handle, mail?.id ?? 0, app.clock.now());
      const [sent] = (await mailsTo(app.database.handle, user.email)).slice(-1);
      expect([sent?.body_text, sent?.body_html]).toEqual(['', '']);
    });

    it('is no use at another door', async () => {
      const user = await addUser(app.database.handle);
      const token = tokenIn(await ask(user.email));
      expect((await complete('sign-up', token)).status).toBe(410);
      expect((await complete('invitation', token)).status).toBe(410);
      const email = await (await app.visitor()).post('/api/email-change-completions', { token });
      expect(email.status).toBe(410);
      expect((await complete('password-reset', token)).status).toBe(200);
    });

    it('refuses a weak password and leaves the link usable', async () => {
      const user = await addUser(app.database.handle);
      const token = tokenIn(await ask(user.email));
      const refused = await complete('password-reset', token, 'qwertyuiop');
      expect(refused.body).toMatchObject({ errors: [{ pointer: '/password', code: 'password_common' }] });
      expect((await complete('password-reset', token)).status).toBe(200);
    });

    it('leads to the configured address, whatever the request calls the host', async () => {
      const user = await addUser(app.database.handle);
      await visitor
        .post('/api/password-resets', { email: user.email })
        .set({ Host: 'evil.example', 'X-Forwarded-Host': 'evil.example', 'X-Forwarded-Proto': 'https' })
        .expect(202);
      const mail = await lastMailTo(user.email);
      expect(mail?.body_text).toContain('http://127.0.0.1:4310/new-password#');
      expect(`${mail?.body_text}${mail?.body_html}`).not.toContain('evil');
    });

    it('clears the count of guesses that stood in the person’s way', async () => {
      const user = await addUser(app.database.handle);
      for (let guess = 0; guess < peopleLimits.signInToAccount.attempts; guess += 1) {
        await app.get(AttemptLimits).take(peopleLimits.signInToAccount, user.email);
      }
      expect((await visitor.post('/api/session', { email: user.email, password: testPassword })).status).toBe(429);
      await complete('password-reset', tokenIn(await ask(user.email)));
      expect((await visitor.post('/api/session', { email: user.email, password: testPassword })).status).toBe(200);
      await visitor.refresh();
    });

    it('does not open a closed account', async () => {
      const user = await addUser(app.database.handle);
      const token = tokenIn(await ask(user.email));
      await app.database.handle.updateTable('app_user').set({ status: 'disabled' }).where('id', '=', user.id).execute();
      expect((await complete('password-reset', token)).status).toBe(410);
    });
  });
});

describe('the first owner', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  const make = async (more: object = {}) =>
    (await app.visitor()).post('/api/first-owner', {
      setupCode: app.config.setupCode,
      name: 'The owner',
      email: 'owner@fernhollow.example',
      password: testPassword,
      ...more,
    });

  it('needs the code that the server printed', async () => {
    const refused = await make({ setupCode: 'a guess' });
    expect(refused.body).toMatchObject({ code: 'invalid_input', errors: [{ pointer: '/setupCode' }] });
  });

  it('needs a password that is not guessed at once', async () => {
    expect((await make({ password: 'emberlot1' })).body).toMatchObject({ errors: [{ pointer: '/password' }] });
  });

  it('is made once, even when asked twice at the same moment, and is in', async () => {
    expect((await (await app.visitor()).get('/api/session')).body).toMatchObject({ needsOwner: true });
    const answers = await Promise.all([make(), make({ email: 'other@fernhollow.example' })]);
    expect(statusesOf(answers)).toEqual([200, 409]);
    const made = answers.find((answer) => answer.status === 200);
    expect(made?.body).toMatchObject({ person: { role: 'owner' }, needsOwner: false });
    expect((await make()).body).toMatchObject({ code: 'wrong_state' });
    expect((await (await app.visitor()).get('/api/session')).body).toMatchObject({ needsOwner: false });
  });
});
