import { ApiProblem, problemOf, unreachable } from '../lib/problem';

/**
 * The one function that talks to the server. It adds the form-protection token, asks for a new one once if the server
 * finds it stale, lets the person sign in again where the session ended, and turns refusals into `ApiProblem`.
 */

let token: string | undefined;
let askToSignInAgain: (() => Promise<boolean>) | undefined;

/** The token that came with the session; every answer of `GET /api/session` brings one. */
export function rememberToken(value: string | undefined): void {
  token = value;
}

/** The shell offers a dialog; it answers true once the same person is signed in again. */
export function onSessionEnd(ask: (() => Promise<boolean>) | undefined): void {
  askToSignInAgain = ask;
}

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

async function fetchOnce(request: Request): Promise<Response> {
  const copy = request.clone();
  if (!safeMethods.has(copy.method)) copy.headers.set('x-csrf-token', await currentToken());
  try {
    return await fetch(copy);
  } catch (fault) {
    if (fault instanceof DOMException && fault.name === 'AbortError') throw fault;
    throw unreachable();
  }
}

async function currentToken(): Promise<string> {
  if (token === undefined) await fetchToken();
  return token ?? '';
}

async function fetchToken(): Promise<void> {
  const response = await fetch(
    new Request(new URL('/api/session', location.origin), { headers: { accept: 'application/json' } }),
  );
  if (!response.ok) throw await problemOf(response);
  const session = (await response.json()) as { csrfToken: string };
  rememberToken(session.csrfToken);
}

/**
 * Sends a request and gives its answer if it was accepted.
 * @throws ApiProblem for every refusal, and when nothing answers
 */
export async function send(request: Request): Promise<Response> {
  let response = await fetchOnce(request);
  if (response.ok) return response;
  let problem = await problemOf(response);
  if (problem.code === 'stale_form') {
    await fetchToken();
    response = await fetchOnce(request);
    if (response.ok) return response;
    problem = await problemOf(response);
  }
  if (problem.code === 'not_signed_in' && askToSignInAgain) return resume(request, problem);
  throw problem;
}

async function resume(request: Request, problem: ApiProblem): Promise<Response> {
  const signedIn = await askToSignInAgain?.();
  if (!signedIn) throw problem;
  const response = await fetchOnce(request);
  if (response.ok) return response;
  throw await problemOf(response);
}
