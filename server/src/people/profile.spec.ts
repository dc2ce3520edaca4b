import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { mailsTo, tokenIn } from '../testing/mails.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser, testPassword } from '../testing/users.js';

describe('one’s own account', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  it('shows who one is, and nothing of the password', async () => {
    const user = await addUser(app.database.handle, { role: 'customer' });
    const { body } = await (await app.agentOf(user)).get('/api/profile').expect(200);
    expect(body).toEqual({
      id: user.id,
      name: user.name,
      email: user.email,
      role: 'customer',
      memberSince: '2027-03-01T09:00:00.000Z',
      version: 1,
    });
  });

  it('takes a new name over the version that was seen', async () => {
    const user = await addUser(app.database.handle);
    const agent = await app.agentOf(user);
    const renamed = await agent.patch('/api/profile', { name: '  Zoë Bench ', version: 1 }).expect(200);
    expect(renamed.body).toMatchObject({ name: 'Zoë Bench', version: 2 });
    const stale = await agent.patch('/api/profile', { name: 'Other', version: 1 }).expect(409);
    expect(stale.body).toMatchObject({ code: 'changed_meanwhile', current: { name: 'Zoë Bench' } });
  });

  it.each([
    ['role', 'owner'],
    ['id', 1],
    ['status', 'active'],
    ['email', 'x@y.example'],
    ['customerId', 1],
    ['createdAt', '2020-01-01'],
  ])('does not let one write one’s own %s', async (field, value) => {
    const agent = await app.agentFor('customer');
    const answer = await agent.patch('/api/profile', { name: 'Me', version: 1, [field]: value }).expect(400);
    expect(answer.body).toMatchObject({ errors: [{ pointer: `/${field}`, code: 'unknown_field' }] });
  });

  it('changes the password with the old one, and signs out everywhere else', async () => {
    const user = await addUser(app.database.handle);
    const [here, there] = [await app.agentOf(user), await app.agentOf(user)];
    const wrong = await here.post('/api/password-changes', {
      currentPassword: 'a guess',
      newPassword: 'some new words',
    });
    expect(wrong.body).toMatchObject({ code: 'invalid_input', errors: [{ pointer: '/currentPassword' }] });
    await here.post('/api/password-changes', { newPassword: 'some new words' }).expect(400);
    const weak = await here.post('/api/password-changes', { currentPassword: testPassword, newPassword: 'password1' });
    expect(weak.body).toMatchObject({ errors: [{ pointer: '/newPassword' }] });
    await here
      .post('/api/password-changes', { currentPassword: testPassword, newPassword: 'some new words' })
      .expect(204);
    await here.get('/api/profile').expect(200);
    await there.get('/api/profile').expect(401);
    await (await app.visitor()).signIn(user.email, 'some new words');
    expect((await mailsTo(app.database.handle, user.email)).at(-1)?.subject).toBe('Your password was changed');
  });

  it('limits guesses at the password of an account that somebody left open', async () => {
    const agent = await app.agentOf(await addUser(app.database.handle));
    const guesses = await Promise.all(
      Array.from({ length: 12 }, () =>
        agent.post('/api/password-changes', { currentPassword: 'a guess', newPassword: 'some new words' }),
      ),
    );
    expect(guesses.filter((answer) => answer.status === 429)).toHaveLength(2);
  });

  it('moves to a new address once that is confirmed, and tells the old one', async () => {
    const user = await addUser(app.database.handle);
    const agent = await app.agentOf(user);
    const asked = { currentPassword: testPassword, email: 'moved@fernhollow.example' };
    await agent.post('/api/email-changes', { ...asked, currentPassword: 'a guess' }).expect(400);
    await agent.post('/api/email-changes', asked).expect(202);
    expect((await agent.get('/api/profile')).body).toMatchObject({ email: user.email });
    const [mail] = await mailsTo(app.database.handle, 'moved@fernhollow.example');
    const visitor = await app.visitor();
    await visitor.post('/api/email-change-completions', { token: tokenIn(mail) }).expect(204);
    await visitor.post('/api/email-change-completions', { token: tokenIn(mail) }).expect(410);
    expect((await agent.get('/api/profile')).body).toMatchObject({ email: 'moved@fernhollow.example' });
    const [told] = await mailsTo(app.database.handle, user.email);
    expect(told?.subject).toBe('Your account uses another address now');
  });

  it('does not say on the page that an address is somebody else’s', async () => {
    const [user, other] = [await addUser(app.database.handle), await addUser(app.database.handle)];
    const agent = await app.agentOf(user);
    await agent.post('/api/email-changes', { currentPassword: testPassword, email: other.email }).expect(202);
    const [mail] = await mailsTo(app.database.handle, other.email);
    expect(mail?.subject).toBe('You have an account already');
  });
});
