export type ErrorType = 'api_error' | 'card_error' | 'idempotency_error' | 'invalid_request_error';

export type ErrorBody = {
  readonly error: {
    readonly type: ErrorType;
    readonly message: string;
    readonly code?: string;
    readonly param?: string;
    readonly decline_code?: string;
    readonly doc_url?: string;
    readonly request_log_url?: string;
  };
};

type Detail = { readonly code?: string; readonly param?: string };

/**
 * An error answer in the processor's documented shape (docs.stripe.com/api/errors).
 * `started` says that the request had passed its parameter checks: only then is its answer kept under its
 * idempotency key (docs.stripe.com/api/idempotent_requests).
 */
export class ApiError extends Error {
  constructor(
    readonly status: number,
    readonly type: ErrorType,
    message: string,
    readonly detail: Detail = {},
    readonly started = false,
  ) {
    super(message);
  }

  get body(): ErrorBody {
    return { error: { type: this.type, message: this.message, ...this.detail } };
  }
}

export function badParameter(param: string, message: string, code?: string): ApiError {
  return new ApiError(400, 'invalid_request_error', message, { param, ...(code === undefined ? {} : { code }) });
}

export function missingParameter(param: string): ApiError {
  return badParameter(param, `Missing required param: ${param}.`, 'parameter_missing');
}

export function noSuch(kind: string, id: string, param = 'id', status = 404): ApiError {
  return new ApiError(status, 'invalid_request_error', `No such ${kind}: '${id}'`, { code: 'resource_missing', param });
}

/** A refusal because of the state of a thing; its answer is kept under the idempotency key. */
export function refused(message: string, detail: Detail = {}): ApiError {
  return new ApiError(400, 'invalid_request_error', message, detail, true);
}
