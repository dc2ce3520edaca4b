import { afterEach, describe, expect, it, jest } from '@jest/globals';
import { owner, refusal, serve } from '../app/testing';
import { ApiProblem } from '../lib/problem';
import { request } from './request';
import { onSessionEnd } from './send';

afterEach(() => onSessionEnd(undefined));

const session = { 'GET /api/session': () => ({ body: owner }) };

describe('a call that changes something', () => {
  it('fetches the form-protection token first and sends it back', async () => {
    const calls = serve({ ...session, 'POST /api/parts': () => ({ status: 201, body: { id: 7 } }) });
    await expect(request('POST', '/api/parts', { body: { code: 'CLAMP-N2' } })).resolves.toEqual({ id: 7 });
    expect(calls.map(({ route }) => route)).toEqual(['GET /api/session', 'POST /api/parts']);
    expect(calls[1]?.headers.get('x-csrf-token')).toBe('token-1');
    expect(calls[1]?.body).toEqual({ code: 'CLAMP-N2' });
  });

  it('asks for another token once when the server finds it stale, and sends the same again', async () => {
    let tokens = 0;
    const calls = serve({
      'GET /api/session': () => ({ body: { ...owner, csrfToken: `token-${++tokens}` } }),
      'POST /api/parts': ({ headers }) =>
        headers.get('x-csrf-token') === 'token-2'
          ? { body: { id: 7 } }
          : refusal(403, 'stale_form', 'This page is of an earlier session.'),
    });
    await expect(request('POST', '/api/parts', { body: { code: 'A' }, idempotencyKey: 'k' })).resolves.toEqual({
      id: 7,
    });
    const posts = calls.filter(({ route }) => route === 'POST /api/parts');
    expect(posts.map(({ headers }) => headers.get('idempotency-key'))).toEqual(['k', 'k']);
    expect(posts.map(({ body }) => body)).toEqual([{ code: 'A' }, { code: 'A' }]);
  });

  it('gives up when the new token is stale as well', async () => {
    const calls = serve({ ...session, 'POST /api/parts': () => refusal(403, 'stale_form', 'No.') });
    await expect(request('POST', '/api/parts', { body: {} })).rejects.toMatchObject({ code: 'stale_form' });
    expect(calls.filter(({ route }) => route === 'POST /api/parts')).toHaveLength(2);
  });
});

describe('a refusal', () => {
  it('is thrown with its code, its sentence, its faults and its request', async () => {
    const faults = [{ pointer: '/quantity', code: 'too_small', detail: 'Must be more than zero.' }];
    serve({ 'GET /api/parts': () => refusal(400, 'invalid_input', 'Look at the fields.', faults) });
    const problem = await request('GET', '/api/parts').catch((error: unknown) => error);
    expect(problem).toBeInstanceOf(ApiProblem);
    expect(problem).toMatchObject({
      status: 400,
      code: 'invalid_input',
      detail: 'Look at the fields.',
      errors: faults,
      requestId: 'request-1',
    });
  });

  it('that is no problem document is called unreadable, never shown as it came', async () => {
    globalThis.fetch = jest.fn(
      async () => new Response('<h1>Bad gateway</h1>', { status: 502, headers: { 'content-type': 'text/html' } }),
    );
    await expect(request('GET', '/api/parts')).rejects.toMatchObject({ code: 'unreadable', status: 502 });
  });

  it('says that nothing answers when nothing does', async () => {
    globalThis.fetch = jest.fn(() => Promise.reject(new TypeError('Failed to fetch')));
    await expect(request('GET', '/api/parts')).rejects.toMatchObject({ code: 'unreachable', status: 0 });
  });
});

describe('a session that ends', () => {
  it('is taken up again by the same request, once the person is back', async () => {
    let signedIn = false;
    const calls = serve({
      ...session,
      'POST /api/parts': () => (signedIn ? { body: { id: 7 } } : refusal(401, 'not_signed_in', 'Sign in.')),
    });
    onSessionEnd(async () => {
      signedIn = true;
      return true;
    });
    await expect(request('POST', '/api/parts', { body: { code: 'A' } })).resolves.toEqual({ id: 7 });
    expect(calls.filter(({ route }) => route === 'POST /api/parts').map(({ body }) => body)).toEqual([
      { code: 'A' },
      { code: 'A' },
    ]);
  });

  it('is a refusal when the person does not come back', async () => {
    serve({ ...session, 'POST /api/parts': () => refusal(401, 'not_signed_in', 'Sign in.') });
    onSessionEnd(() => Promise.resolve(false));
    await expect(request('POST', '/api/parts', { body: {} })).rejects.toMatchObject({ code: 'not_signed_in' });
  });
});
