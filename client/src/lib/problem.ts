import type { ErrorCode } from '@emberlot/shared/errors/codes';

/** One fault of one field: `pointer` is a JSON pointer (RFC 6901) into what was sent. */
export interface FieldFault {
  pointer: string;
  code: string;
  detail: string;
}

/** Codes that only arise on this side: nothing answered, or what answered was not the product. */
export type ClientCode = 'unreachable' | 'unreadable';

export interface ProblemBody {
  code: ErrorCode | ClientCode;
  detail: string;
  errors: readonly FieldFault[];
  requestId?: string;
  /** The other state, where somebody else changed the thing in between. */
  current?: unknown;
}

/** A refusal as RFC 9457 describes it. Screens decide by `code`, never by text. */
export class ApiProblem extends Error {
  readonly code: ProblemBody['code'];
  readonly detail: string;
  readonly errors: readonly FieldFault[];
  readonly status: number;
  readonly requestId: string | undefined;
  readonly current: unknown;

  constructor(status: number, body: ProblemBody) {
    super(body.detail);
    this.name = 'ApiProblem';
    this.status = status;
    this.code = body.code;
    this.detail = body.detail;
    this.errors = body.errors;
    this.requestId = body.requestId;
    this.current = body.current;
  }
}

interface AnsweredProblem extends Partial<ProblemBody> {
  requestId?: string;
  request_id?: string;
}

/** Reads a refusal; what is not a problem document becomes one that says so. */
export async function problemOf(response: Response): Promise<ApiProblem> {
  const requestId = response.headers.get('x-request-id') ?? undefined;
  const body = await readJson(response);
  if (!body?.code || !body.detail) {
    const detail =
      'The server answered something this page does not understand. Load the page again; if it stays, tell the owner.';
    return new ApiProblem(response.status, { code: 'unreadable', detail, errors: [], requestId });
  }
  return new ApiProblem(response.status, {
    code: body.code,
    detail: body.detail,
    errors: body.errors ?? [],
    requestId: body.requestId ?? body.request_id ?? requestId,
    current: body.current,
  });
}

async function readJson(response: Response): Promise<AnsweredProblem | undefined> {
  if (!response.headers.get('content-type')?.includes('json')) return undefined;
  try {
    return (await response.json()) as AnsweredProblem;
  } catch {
    return undefined;
  }
}

export function unreachable(): ApiProblem {
  const detail = 'The server does not answer. What you typed is still here; try again when the connection is back.';
  return new ApiProblem(0, { code: 'unreachable', detail, errors: [] });
}

/** A sentence for any fault, and the request id to quote where only the server's log knows more. */
export function sentenceOf(error: unknown): { sentence: string; requestId?: string } {
  if (error instanceof ApiProblem) {
    return { sentence: error.detail, requestId: error.code === 'unexpected' ? error.requestId : undefined };
  }
  return {
    sentence: 'Something on this page went wrong. Load it again; if it stays, tell the owner what you were doing.',
  };
}
