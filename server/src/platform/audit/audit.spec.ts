import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { Agent } from '../../testing/agent.js';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { addUser } from '../../testing/users.js';
import { Audit } from './audit.js';

describe('the record of who did what', () => {
  let app: TestApp;
  let accountant: Agent;

  beforeAll(async () => {
    app = await startTestApp({ startsAt: new Date('2027-06-30T22:30:00Z') });
    accountant = await app.agentFor('accountant');
    const actor = await addUser(app.database.handle, { role: 'owner', name: 'Olga Owner' });
    const audit = app.get(Audit);
    await app.transaction(async (trx) => {
      await audit.record(trx, {
        actor,
        action: 'part.renamed',
        subjectKind: 'part',
        subjectId: 7,
        subjectCode: 'TIP-03',
        before: { name: 'Tip' },
        after: { name: 'Chisel tip', since: new Date('2027-07-01T00:00:00Z') },
      });
    });
    // Half past eleven in the evening in Dublin becomes half past midnight of the next day.
    app.clock.advance({ hours: 1 });
    await app.transaction((trx) =>
      audit.record(trx, { actor: null, action: 'payment.matched', subjectKind: 'payment', subjectId: 3 }),
    );
  });

  afterAll(() => app.close());

  it('shows each deed with person, instant and values', async () => {
    const { body } = await accountant.get('/api/audit-entries?subjectKind=part').expect(200);
    expect(body).toEqual({
      total: 1,
      items: [
        {
          id: expect.any(Number),
          recordedAt: '2027-06-30T22:30:00.000Z',
          actorId: expect.any(Number),
          actorName: 'Olga Owner',
          actorRole: 'owner',
          action: 'part.renamed',
          subjectKind: 'part',
          subjectId: 7,
          subjectCode: 'TIP-03',
          before: { name: 'Tip' },
          after: { name: 'Chisel tip', since: '2027-07-01T00:00:00.000Z' },
        },
      ],
    });
  });

  it.each([
    ['?q=tip-0', ['part.renamed']],
    ['?q=olga', ['part.renamed']],
    ['?q=%25', []],
    ['?action=pay', ['payment.matched']],
    ['?action=p_y', []],
    ['?subjectKind=part&subjectId=8', []],
    ['?actorRole=owner', ['part.renamed']],
    ['?subjectKind=payment&from=2027-07-01', ['payment.matched']],
    ['?subjectKind=part&from=2027-07-01', []],
    ['?subjectKind=part&to=2027-06-30', ['part.renamed']],
    ['?subjectKind=payment&to=2027-06-30', []],
  ])('is searched by days of the shop, people and things: %s', async (query, actions) => {
    const { body } = await accountant.get(`/api/audit-entries${query}`).expect(200);
    expect((body as { items: { action: string }[] }).items.map((item) => item.action)).toEqual(actions);
  });

  it('comes in pages that do not overlap, newest first', async () => {
    const seen: number[] = [];
    const { body: whole } = await accountant.get('/api/audit-entries').expect(200);
    for (let page = 1; page <= (whole as { total: number }).total; page += 1) {
      const { body } = await accountant.get(`/api/audit-entries?page=${page}&pageSize=1`).expect(200);
      seen.push(...(body as { items: { id: number }[] }).items.map((item) => item.id));
    }
    expect(seen).toEqual((whole as { items: { id: number }[] }).items.map((item) => item.id));
    expect(new Set(seen).size).toBe(seen.length);
  });

  it('is not for assemblers and customers', async () => {
    await (await app.agentFor('assembler')).get('/api/audit-entries').expect(403);
    await (await app.agentFor('customer')).get('/api/audit-entries').expect(403);
  });
});
