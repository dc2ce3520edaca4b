import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { startTestApp, type TestApp } from '../testing/test-app.js';

describe('signing in', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await startTestApp();
  });

  afterAll(() => app.close());

  it('shows a visitor no person and gives a token', async () => {
    const agent = await app.visitor();
    const { body } = await agent.get('/api/session').expect(200);
    expect(body).toEqual({ csrfToken: agent.token, person: null, shop: null, needsOwner: true });
  });

  it('lets an owner in', async () => {
    const agent = await app.agentFor('owner');
    const { body } = await agent.get('/api/session').expect(200);
    expect(body).toMatchObject({ person: { role: 'owner' } });
    await agent.get('/api/staff').expect(200);
  });
});
