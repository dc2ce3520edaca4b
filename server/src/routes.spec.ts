import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import supertest from 'supertest';
import { AppModule } from './app.module.js';
import { roles } from './platform/auth/signed-in-user.js';
import type { Agent } from './testing/agent.js';
import { publicRoutes } from './testing/public-routes.js';
import { declaredRoutes, routedPaths, type Route } from './testing/routes.js';
import { startTestApp, type TestApp } from './testing/test-app.js';

const safe = new Set(['GET', 'HEAD']);

/** An address of the route, with ids of things that do not exist. */
function addressOf(route: Route): string {
  return route.path.replaceAll(/:\w+/g, '2147483647');
}

describe('the routes of the whole server', () => {
  let app: TestApp;
  let routes: readonly Route[];

  beforeAll(async () => {
    app = await startTestApp({ modules: [AppModule] });
    routes = declaredRoutes(app);
  });

  afterAll(() => app.close());

  const send = (agent: Agent, route: Route) => {
    const path = addressOf(route);
    switch (route.method) {
      case 'GET':
        return agent.get(path);
      case 'POST':
        return agent.post(path, {});
      case 'PUT':
        return agent.put(path, {});
      case 'PATCH':
        return agent.patch(path, {});
      default:
        return agent.delete(path);
    }
  };

  it('are those that controllers declare, and no others', () => {
    const declared = routes.map((route) => `${route.method} ${route.path}`);
    expect(routedPaths(app).toSorted()).toEqual(declared.toSorted());
  });

  it('each say who may call them', () => {
    expect(routes.filter((route) => route.access === undefined)).toEqual([]);
  });

  it('are public only where the list gives a reason', () => {
    const open = routes.filter((route) => route.access === 'public').map((route) => `${route.method} ${route.path}`);
    expect(open.toSorted()).toEqual(Object.keys(publicRoutes).toSorted());
  });

  it('refuse a visitor', async () => {
    const visitor = await app.visitor();
    const answers = [];
    for (const route of routes.filter(({ access }) => access !== 'public')) {
      const { status } = await send(visitor, route);
      answers.push(`${route.method} ${route.path} ${status}`);
    }
    expect(answers.filter((answer) => !answer.endsWith(' 401'))).toEqual([]);
  });

  it('refuse every role that they do not name, before anything is looked at', async () => {
    const wrong = [];
    for (const role of roles) {
      const agent = await app.agentFor(role);
      for (const route of routes.filter(({ access }) => access !== 'public' && !access?.includes(role))) {
        const { status } = await send(agent, route);
        if (status !== 403) wrong.push(`${role}: ${route.method} ${route.path} ${status}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('let in every role that they name', async () => {
    const wrong = [];
    for (const role of roles) {
      for (const route of routes.filter(({ access }) => access !== 'public' && access?.includes(role))) {
        const { status } = await send(await app.agentFor(role), route);
        if (status === 401 || status === 403 || status >= 500) {
          wrong.push(`${role}: ${route.method} ${route.path} ${status}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });

  it('take no change without the form token, or in any form but JSON', async () => {
    const wrong = [];
    for (const route of routes.filter(({ method, webhook }) => !safe.has(method) && !webhook)) {
      const bare = supertest(app.url);
      const method = route.method.toLowerCase() as 'post' | 'put' | 'patch' | 'delete';
      const { status, body } = await bare[method](addressOf(route)).send({});
      if (status !== 403 || (body as { code: string }).code !== 'stale_form') wrong.push(`${route.path} ${status}`);
      for (const type of ['text/plain', 'application/x-www-form-urlencoded']) {
        const odd = await bare[method](addressOf(route)).set('Content-Type', type).send('a=1');
        if (odd.status !== 415) wrong.push(`${route.path} as ${type} ${odd.status}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('take no field that is not theirs', async () => {
    const wrong = [];
    for (const route of routes.filter(({ method, webhook }) => ['POST', 'PUT', 'PATCH'].includes(method) && !webhook)) {
      const role = route.access === 'public' ? undefined : route.access?.[0];
      const agent = role ? await app.agentFor(role) : await app.visitor();
      const body = { unheardOf: 1, status: 'paid', totalMinor: 1, userId: 1 };
      const answer = await send(agent, route).set('Idempotency-Key', 'unheard-of-1').send(body);
      // Without a body of its own a route reads none; it must then not succeed by chance either.
      if (answer.status < 400 || answer.status >= 500) wrong.push(`${route.method} ${route.path} ${answer.status}`);
    }
    expect(wrong).toEqual([]);
  });

  it('change nothing when they are only read', async () => {
    const before = await fingerprint(app);
    for (const role of roles) {
      const agent = await app.agentFor(role);
      for (const route of routes.filter(({ method }) => method === 'GET')) await agent.get(addressOf(route));
    }
    expect(await fingerprint(app)).toEqual(before);
  });
});

/** How many rows were ever written to each table, sessions and counts of attempts aside. */
async function fingerprint(app: TestApp): Promise<Readonly<Record<string, string>>> {
  const { rows } = await app.database.pool.query<{ name: string }>(
    `select table_name as name from information_schema.tables
     where table_schema = 'public' and table_type = 'BASE TABLE'
       and table_name not in ('user_session', 'attempt_count', 'user_known_address')
     order by 1`,
  );
  const found: Record<string, string> = {};
  for (const { name } of rows) {
    const { rows: sums } = await app.database.pool.query<{ sum: string }>(
      `select coalesce(md5(string_agg(t::text, '|' order by t::text)), '') as sum from "${name}" t`,
    );
    found[name] = sums[0]?.sum ?? '';
  }
  return found;
}
