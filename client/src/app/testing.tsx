import { jest } from '@jest/globals';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { ThemeProvider } from '@mui/material/styles';
import { render, type RenderResult } from '@testing-library/react';
import axe from 'axe-core';
import { createMemoryRouter, RouterProvider, type RouteObject } from 'react-router-dom';
import type { Session } from '../api/session';
import { rememberToken } from '../api/send';
import { theme } from './theme/theme';

type Handler = (call: { body: unknown; url: URL; headers: Headers }) => Answer | Promise<Answer>;
type Answer = { status?: number; body?: unknown };

export interface Call {
  route: string;
  body: unknown;
  headers: Headers;
  search: URLSearchParams;
}

/** Stands in for the server: answers by method and path, and keeps what it was asked. */
export function serve(handlers: Record<string, Handler>): Call[] {
  const calls: Call[] = [];
  rememberToken(undefined);
  globalThis.fetch = jest.fn(async (input: RequestInfo | URL): Promise<Response> => {
    const request = input as Request;
    const url = new URL(request.url);
    const text = await request.clone().text();
    // A form with a file is left as it was sent.
    const json = request.headers.get('content-type')?.includes('json') ?? false;
    const body: unknown = text && json ? JSON.parse(text) : text || undefined;
    const route = `${request.method} ${url.pathname}`;
    calls.push({ route, body, headers: request.headers, search: url.searchParams });
    const handler = handlers[route];
    if (!handler) throw new Error(`The test serves no ${route}`);
    const answer = await handler({ body, url, headers: request.headers });
    const status = answer.status ?? 200;
    const type = status >= 400 ? 'application/problem+json' : 'application/json';
    return new Response(answer.body === undefined ? null : JSON.stringify(answer.body), {
      status,
      headers: { 'content-type': type },
    });
  });
  return calls;
}

export function refusal(status: number, code: string, detail: string, errors: unknown[] = []): Answer {
  return {
    status,
    body: { type: `urn:emberlot:problem:${code}`, title: 'x', status, code, detail, errors, requestId: 'request-1' },
  };
}

export const owner: Session = {
  csrfToken: 'token-1',
  person: { id: 1, name: 'Owner', email: 'owner@fernhollow.example', role: 'owner' },
  shop: { name: 'Fernhollow Tools', timeZone: 'Europe/Dublin', currency: 'EUR' },
  needsOwner: false,
};

interface Shown extends RenderResult {
  router: ReturnType<typeof createMemoryRouter>;
  queries: QueryClient;
}

/** Shows routes as the product does, beginning at an address. */
export function show(routes: RouteObject[], at = '/', queries = freshQueries()): Shown {
  const router = createMemoryRouter(routes, { initialEntries: [at] });
  const shown = render(
    <ThemeProvider theme={theme}>
      <QueryClientProvider client={queries}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ThemeProvider>,
  );
  return { ...shown, router, queries };
}

export function freshQueries(): QueryClient {
  return new QueryClient({ defaultOptions: { queries: { retry: false } } });
}

/** What axe finds against WCAG; contrast is computed from the tokens instead, as nothing is painted here. */
export async function faultsOfAccess(place: Element): Promise<string[]> {
  const { violations } = await axe.run(place, {
    rules: { 'color-contrast': { enabled: false }, region: { enabled: false } },
  });
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' | ')}`);
}
