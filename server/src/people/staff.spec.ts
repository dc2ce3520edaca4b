import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../testing/agent.js';
import { mailsTo, tokenIn } from '../testing/mails.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { addUser, testPassword } from '../testing/users.js';

interface Member {
  readonly id: number;
  readonly role: string;
  readonly status: string;
  readonly version: number;
}

describe('the staff', () => {
  let app: TestApp;
  let owner: Agent;

  beforeAll(async () => {
    app = await startTestApp();
    owner = await app.agentFor('owner');
  });

  afterAll(() => app.close());

  const invite = async (email: string, role = 'assembler') => {
    const answer = await owner.create('/api/invitations', { name: 'Ada Bench', email, role }).expect(201);
    return answer.body as Member;
  };

  const join = async (token: string) =>
    (await app.visitor()).post('/api/invitation-completions', { token, password: testPassword });

  it('joins by an invitation that works once and for a week', async () => {
    const invited = await invite('ada@fernhollow.example');
    expect(invited).toMatchObject({ role: 'assembler', status: 'invited' });
    const [mail] = await mailsTo(app.database.handle, 'ada@fernhollow.example');
    app.clock.advance({ days: 6 });
    const joined = await join(tokenIn(mail));
    expect(joined.body).toMatchObject({ person: { id: invited.id, role: 'assembler' } });
    expect((await join(tokenIn(mail))).status).toBe(410);
  });

  it('cannot join by an invitation that is too old, or was sent again', async () => {
    owner = await app.agentOf(await addUser(app.database.handle, { role: 'owner' }));
    const { id } = await invite('late@fernhollow.example');
    await owner.post(`/api/staff/${id}/invitations`).expect(204);
    const [first, second] = await mailsTo(app.database.handle, 'late@fernhollow.example');
    expect((await join(tokenIn(first))).status).toBe(410);
    app.clock.advance({ days: 7, minutes: 1 });
    expect((await join(tokenIn(second))).status).toBe(410);
    owner = await app.agentOf(await addUser(app.database.handle, { role: 'owner' }));
  });

  it('is not invited twice under one address', async () => {
    await invite('once@fernhollow.example');
    const again = await owner.create('/api/invitations', {
      name: 'Ada Bench',
      email: 'ONCE@fernhollow.example',
      role: 'owner',
    });
    expect(again.body).toMatchObject({ code: 'already_exists', errors: [{ pointer: '/email' }] });
  });

  it('sends one invitation for one key, also when the button is pressed twice', async () => {
    const body = { name: 'Ada Bench', email: 'double@fernhollow.example', role: 'assembler' };
    const key = 'double-press-0001';
    const answers = await Promise.all([
      owner.create('/api/invitations', body, key),
      owner.create('/api/invitations', body, key),
    ]);
    expect(answers.map((answer) => answer.status)).toEqual([201, 201]);
    expect(answers[0]?.body).toEqual(answers[1]?.body);
    expect(await mailsTo(app.database.handle, 'double@fernhollow.example')).toHaveLength(1);
  });

  it('cannot be given a customer’s role, or a role by a stranger’s hand', async () => {
    const body = { name: 'Ada Bench', email: 'role@fernhollow.example', role: 'customer' };
    expect((await owner.create('/api/invitations', body)).body).toMatchObject({ errors: [{ pointer: '/role' }] });
    const more = { ...body, role: 'assembler', status: 'active' };
    const refused = await owner.create('/api/invitations', more);
    expect(refused.body).toMatchObject({ errors: [{ pointer: '/status', code: 'unknown_field' }] });
  });

  it('changes role and access at once, on record, and only over the version that was seen', async () => {
    const member = await addUser(app.database.handle, { role: 'assembler' });
    const agent = await app.agentOf(member);
    const changed = await owner.patch(`/api/staff/${member.id}`, { role: 'accountant', version: member.version });
    expect(changed.body).toMatchObject({ role: 'accountant', status: 'active', version: member.version + 1 });
    await agent.get('/api/audit-entries').expect(200);
    const stale = await owner.patch(`/api/staff/${member.id}`, { status: 'disabled', version: member.version });
    expect(stale.body).toMatchObject({ code: 'changed_meanwhile', current: { role: 'accountant' } });
    await agent.get('/api/profile').expect(200);
    const version = (changed.body as Member).version;
    await owner.patch(`/api/staff/${member.id}`, { status: 'disabled', version }).expect(200);
    await agent.get('/api/profile').expect(401);
    const entries = await owner.get(`/api/audit-entries?subjectId=${member.id}&action=user.`).expect(200);
    expect(entries.body).toMatchObject({
      total: 2,
      items: [
        { action: 'user.status_changed', before: { status: 'active' }, after: { status: 'disabled' } },
        { action: 'user.role_changed', before: { role: 'assembler' }, after: { role: 'accountant' } },
      ],
    });
  });

  it('is invited again, not let in, when somebody who never chose a password is opened again', async () => {
    const { id, version } = await invite('reopened@fernhollow.example');
    await owner.patch(`/api/staff/${id}`, { status: 'disabled', version }).expect(200);
    const opened = await owner.patch(`/api/staff/${id}`, { status: 'active', version: version + 1 }).expect(200);
    expect(opened.body).toMatchObject({ status: 'invited' });
  });

  it('can be signed out everywhere by the owner', async () => {
    const member = await addUser(app.database.handle);
    const agent = await app.agentOf(member);
    await owner.delete(`/api/staff/${member.id}/sessions`).expect(204);
    await agent.get('/api/profile').expect(401);
  });

  it('does not hold customers', async () => {
    const customer = await addUser(app.database.handle, { role: 'customer', name: 'Cora Customer' });
    const listed = await owner.get('/api/staff?q=Cora').expect(200);
    expect(listed.body).toEqual({ items: [], total: 0 });
    await owner.patch(`/api/staff/${customer.id}`, { role: 'owner', version: 1 }).expect(404);
  });

  it('is found by parts of a name, with wildcards meaning themselves, and sorted', async () => {
    await addUser(app.database.handle, { name: 'Percy 100%' });
    await addUser(app.database.handle, { name: 'Percy 1000' });
    const found = await owner.get('/api/staff').query({ q: '100%' }).expect(200);
    expect(found.body).toMatchObject({ total: 1, items: [{ name: 'Percy 100%' }] });
    const sorted = await owner.get('/api/staff?q=Percy&sort=-name&pageSize=1').expect(200);
    expect(sorted.body).toMatchObject({ total: 2, items: [{ name: 'Percy 1000' }] });
    await owner.get('/api/staff?sort=passwordHash').expect(400);
    await owner.get('/api/staff?pageSize=201').expect(400);
    await owner.get('/api/staff?page=1&page=2').expect(400);
  });
});

describe('the last owner', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  it('cannot be removed, nor can two owners remove each other at once', async () => {
    const one = await addUser(app.database.handle, { role: 'owner' });
    const first = await app.agentOf(one);
    const alone = await first.patch(`/api/staff/${one.id}`, { role: 'assembler', version: one.version });
    expect(alone.body).toMatchObject({ code: 'rule_broken' });
    const closed = await first.patch(`/api/staff/${one.id}`, { status: 'disabled', version: one.version });
    expect(closed.body).toMatchObject({ code: 'rule_broken' });
    const other = await addUser(app.database.handle, { role: 'owner' });
    const second = await app.agentOf(other);
    const answers = await Promise.all([
      first.patch(`/api/staff/${other.id}`, { role: 'accountant', version: other.version }),
      second.patch(`/api/staff/${one.id}`, { role: 'accountant', version: one.version }),
    ]);
    expect(answers.filter((answer) => answer.status === 200)).toHaveLength(1);
    const left = await app.database.handle
      .selectFrom('app_user')
      .select('id')
      .where('role', '=', 'owner')
      .where('status', '=', 'active')
      .execute();
    expect(left).toHaveLength(1);
  });
});
