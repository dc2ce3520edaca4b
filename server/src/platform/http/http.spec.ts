import { mkdtemp, mkdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Body, Controller, Get, Module, Post, Query } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { sql } from 'kysely';
import pg from 'pg';
import { Agent } from '../../testing/agent.js';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { Public } from '../auth/access.js';
import { Database } from '../database/database.js';
import { ConstraintSentences } from '../errors/constraints.js';
import { IdParam } from '../validation/id-param.js';
import { Optional, Text } from '../validation/fields.js';
import { Readiness } from '../health/readiness.js';

class EchoDto {
  @Text({ max: 100 })
  text: string;
}

class EchoQuery {
  @Optional()
  @Text({ max: 100, min: 0 })
  text?: string;
}

@Controller('echo')
@Public()
class EchoController {
  constructor(private readonly database: Database) {}

  /** Goes through the database and back, as what people write does. */
  @Post()
  async post(@Body() body: EchoDto): Promise<{ text: string }> {
    const { rows } = await sql<{ text: string }>`select ${body.text}::text as text`.execute(this.database.handle);
    return { text: rows[0]?.text ?? '' };
  }

  @Get()
  get(@Query() query: EchoQuery): EchoQuery {
    return query;
  }

  @Get('number/:id')
  number(@IdParam() id: number): { id: number } {
    return { id };
  }

  @Get('broken')
  broken(): never {
    throw new Error('select secret from the inside');
  }

  @Get('badly-typed')
  async badlyTyped(): Promise<void> {
    await sql`select 'x'::integer`.execute(this.database.handle);
  }

  @Get('unnamed')
  async unnamed(): Promise<void> {
    await sql`insert into number_series values ('A bad name', '', 1)`.execute(this.database.handle);
  }

  @Get('too-large')
  async tooLarge(): Promise<void> {
    await sql`select 99999999999::integer`.execute(this.database.handle);
  }
}

@Module({ controllers: [EchoController] })
class EchoModule {
  constructor(constraints: ConstraintSentences) {
    constraints.add({
      number_series_series_check: { code: 'rule_broken', sentence: 'A series has a plain name.', pointer: '/series' },
    });
  }
}

describe('answers of the server', () => {
  let app: TestApp;
  let folder: string;
  let visitor: Agent;

  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'emberlot-client-'));
    await mkdir(join(folder, 'assets'));
    await writeFile(
      join(folder, 'index.html'),
      '<!doctype html><meta property="csp-nonce" nonce="__CSP_NONCE__"><script nonce="__CSP_NONCE__" src="/assets/a-1.js"></script>',
    );
    await writeFile(join(folder, 'assets/a-1.js'), 'export {};');
    await writeFile(join(folder, '.hidden'), 'nothing for strangers');
    app = await startTestApp({ modules: [EchoModule], env: { CLIENT_FOLDER: folder } });
    visitor = await app.visitor();
  });

  afterAll(async () => {
    await app.close();
    await rm(folder, { recursive: true });
  });

  it.each([
    '/',
    '/shelf/parts',
    '/assets/a-1.js',
    '/api/session',
    '/api/profile',
    '/api/none',
    '/none.js',
    '/api/echo/broken',
  ])('carry the security headers at %s', async (path) => {
    const { headers } = await visitor.get(path);
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'no-referrer',
      'x-frame-options': 'DENY',
      'strict-transport-security': 'max-age=31536000; includeSubDomains',
    });
    const policy = String(headers['content-security-policy']);
    for (const part of ["object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'", "script-src 'self';"]) {
      expect(policy).toContain(part);
    }
    expect(policy).not.toContain('unsafe');
    expect(headers['permissions-policy']).toContain('geolocation=()');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['content-type']).toBeDefined();
  });

  it('give each page a nonce of its own that the policy names, and are not kept', async () => {
    const [one, other] = [await visitor.get('/today').expect(200), await visitor.get('/today').expect(200)];
    const nonce = /nonce="([^"]+)"/.exec(one.text)?.[1] ?? '';
    expect(nonce).toHaveLength(24);
    expect(one.headers['content-security-policy']).toContain(`'nonce-${nonce}'`);
    expect(other.text).not.toContain(nonce);
    expect(one.text).not.toContain('__CSP_NONCE__');
    expect(one.headers['cache-control']).toBe('no-store');
  });

  it('let hashed files be kept for a year, and nothing of the API at all', async () => {
    const file = await visitor.get('/assets/a-1.js').expect(200);
    expect(file.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await visitor.get('/api/session')).headers['cache-control']).toBe('no-store');
    expect((await visitor.get('/api/profile/x.css').expect(404)).headers['cache-control']).toBe('no-store');
  });

  it.each([
    '/assets/none.js',
    '/assets/a-1.js.map',
    '/.hidden',
    '/.git/HEAD',
    '/.env',
    '/%2e%2e/package.json',
    '/api-docs.json',
    '/assets',
  ])('show no file at %s', async (path) => {
    const answer = await visitor.get(path);
    expect(answer.text).not.toContain('nothing for strangers');
    if (/\.\w+$/.test(path)) expect(answer.status).toBe(404);
  });

  it('name the request, in the header and in every refusal', async () => {
    const refused = await visitor.get('/api/none').expect(404);
    expect(refused.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    expect(refused.body).toEqual({
      type: 'urn:emberlot:problem:not_found',
      title: 'Not Found',
      status: 404,
      detail: 'There is nothing at this address.',
      code: 'not_found',
      errors: [],
      requestId: refused.headers['x-request-id'],
    });
  });

  it('say nothing of the inside when something breaks', async () => {
    const answer = await visitor.get('/api/echo/broken').expect(500);
    expect(answer.body).toMatchObject({ code: 'unexpected', title: 'Internal Server Error' });
    expect(answer.text).not.toMatch(/secret|inside|Error:|at /);
  });

  it('blame the request for what the database could not take', async () => {
    expect((await visitor.get('/api/echo/badly-typed')).body).toMatchObject({ status: 400, code: 'invalid_input' });
    expect((await visitor.get('/api/echo/too-large')).body).toMatchObject({ status: 400, code: 'invalid_input' });
    expect((await visitor.get('/api/echo/unnamed')).body).toMatchObject({
      code: 'rule_broken',
      detail: 'A series has a plain name.',
      errors: [{ pointer: '/series', code: 'rule_broken' }],
    });
  });

  it.each([
    ['a broken body', '{"text":', 400, 'invalid_input'],
    ['a bare word', 'text', 400, 'invalid_input'],
    ['NUL', JSON.stringify({ text: 'a\u0000b' }), 400, 'invalid_input'],
    ['half a surrogate pair', '{"text":"\\ud800"}', 400, 'invalid_input'],
    ['a key of JavaScript’s own', '{"__proto__":{"admin":true},"text":"a"}', 400, 'invalid_input'],
    ['an array for the whole', '[{"text":"a"}]', 400, 'invalid_input'],
    ['deep nesting', `{"text":${'['.repeat(100_000)}${']'.repeat(100_000)}}`, 400, 'invalid_input'],
    ['too much', JSON.stringify({ text: 'x'.repeat(600_000) }), 413, 'too_large'],
  ])('refuse a body with %s', async (_what, body, status, code) => {
    const answer = await visitor.post('/api/echo').set('Content-Type', 'application/json').send(body);
    expect(answer.body).toMatchObject({ status, code });
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'application/jsonx', 'text/json', ''])(
    'refuse a body of type "%s"',
    async (type) => {
      const answer = await visitor.post('/api/echo').set('Content-Type', type).send('{"text":"a"}');
      expect(answer.status).toBe(415);
    },
  );

  it.each([
    '/api/echo?text=a&text=b',
    '/api/echo?text=%00',
    '/api/echo?text[a]=1',
    '/api/echo?other=1',
    '/api/echo/number/%ff',
  ])('refuse the address %s', async (address) => {
    expect((await visitor.get(address)).body).toMatchObject({ status: 400, code: 'invalid_input' });
  });

  it('read what is encoded twice only once', async () => {
    expect((await visitor.get('/api/echo?text=%2527').expect(200)).body).toEqual({ text: '%27' });
  });

  it('never break, whatever text is sent', async () => {
    await fc.assert(
      fc.asyncProperty(fc.string({ unit: 'binary', maxLength: 120 }), async (text) => {
        const answer = await visitor.post('/api/echo', { text });
        if (answer.status === 201) return (answer.body as { text: string }).text === text.normalize('NFC').trim();
        return answer.status === 400;
      }),
      { numRuns: 100 },
    );
  }, 30_000);

  it('are ready until the server stops, alive all the time', async () => {
    await visitor.get('/api/health/ready').expect(200);
    app.get(Readiness).leave();
    const leaving = await visitor.get('/api/health/ready').expect(503);
    expect(leaving.body).toMatchObject({ code: 'service_unavailable' });
    await visitor.get('/api/health').expect(200);
  });
});

describe('a server whose database is gone', () => {
  it('lives, is not ready, and lets nobody in', async () => {
    const app = await startTestApp();
    const admin = new pg.Client(process.env['TEST_DATABASE_ADMIN_URL']);
    await admin.connect();
    try {
      const agent = await app.agentFor('owner');
      const name = new URL(app.config.databaseUrl).pathname.slice(1);
      await admin.query(`alter database ${name} with allow_connections false`);
      await admin.query('select pg_terminate_backend(pid) from pg_stat_activity where datname = $1', [name]);
      await agent.get('/api/health').expect(200);
      await agent.get('/api/health/ready').expect(503);
      const { status } = await agent.get('/api/staff');
      expect([500, 503]).toContain(status);
      await admin.query(`alter database ${name} with allow_connections true`);
      await agent.get('/api/staff').expect(200);
    } finally {
      await admin.end();
      await app.close();
    }
  });
});
