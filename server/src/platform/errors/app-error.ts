import { errorStatus, type ErrorCode } from '@emberlot/shared/errors/codes';

/** One field of a request that needs another look. */
export interface FieldFault {
  /** JSON pointer (RFC 6901) into the body, such as `/lines/0/quantity`; for a query or path, `/` and its name. */
  readonly pointer: string;
  /** What kind of fault, for a program. */
  readonly code: string;
  /** What to do about it, for a person. */
  readonly detail: string;
}

export interface AppErrorMore {
  readonly faults?: readonly FieldFault[];
  /** Further members of the answer, such as the state that a stale edit collided with. */
  readonly extra?: Readonly<Record<string, unknown>>;
  readonly cause?: unknown;
}

/** What every service throws when it refuses: the filter turns it into the answer. */
export class AppError extends Error {
  override readonly name = 'AppError';
  readonly faults: readonly FieldFault[];
  readonly extra: Readonly<Record<string, unknown>>;

  /**
   * @param code decides the status and what the client does
   * @param sentence says to a person what happened and what to do
   */
  constructor(
    readonly code: ErrorCode,
    sentence: string,
    more: AppErrorMore = {},
  ) {
    super(sentence, { cause: more.cause });
    this.faults = more.faults ?? [];
    this.extra = more.extra ?? {};
  }

  get status(): number {
    return errorStatus[this.code];
  }
}

/** The same answer for what does not exist and for what is somebody else's. */
export function notFound(what = 'thing'): AppError {
  return new AppError('not_found', `There is no such ${what} here.`);
}

/** One field is wrong in a way that only the service could know. */
export function fieldFault(pointer: string, code: string, detail: string): AppError {
  return new AppError('invalid_input', detail, { faults: [{ pointer, code, detail }] });
}

/** Somebody else saved a newer version; the client shows both. */
export function changedMeanwhile(current: object): AppError {
  return new AppError('changed_meanwhile', 'Somebody changed this while you had it open. Look at both before saving.', {
    extra: { current },
  });
}
