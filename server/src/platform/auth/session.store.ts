import { createHash } from 'node:crypto';
import { callbackify } from 'node:util';
import connectPgSimple from 'connect-pg-simple';
import session, { type SessionData } from 'express-session';
import type pg from 'pg';

const PgStore = connectPgSimple(session);

/** Marks session data that came from the table, so that it is only ever written back over its own row. */
const loaded = Symbol('loaded');

type Loadable = SessionData & { [loaded]?: true };

/** Only a digest of the session's id is kept: who reads the table cannot take over a session. */
export function sessionDigest(sessionId: string): string {
  return createHash('sha256').update(sessionId).digest('base64url');
}

/**
 * connect-pg-simple over our own table, with two differences: it keeps digests in place of ids, and it never brings
 * back a session that was ended while a slow request was still running in it.
 */
export class SessionStore extends PgStore {
  constructor(
    private readonly connections: pg.Pool,
    options: { readonly pruneSeconds: number | false; readonly onError: (...args: unknown[]) => void },
  ) {
    super({
      pool: connections,
      tableName: 'user_session',
      // Its expiry moves only when the data is written, once a minute: enough for timeouts of hours.
      disableTouch: true,
      pruneSessionInterval: options.pruneSeconds,
      errorLog: options.onError,
    });
  }

  override get(sessionId: string, callback: (error: unknown, data?: SessionData | null) => void): void {
    super.get(sessionDigest(sessionId), (error: unknown, data?: SessionData | null) => {
      if (data) Object.defineProperty(data, loaded, { value: true });
      callback(error, data);
    });
  }

  override createSession(request: Parameters<session.Store['createSession']>[0], data: SessionData) {
    const made = super.createSession(request, data);
    if ((data as Loadable)[loaded]) Object.defineProperty(made, loaded, { value: true });
    return made;
  }

  override set(sessionId: string, data: SessionData, callback?: (error?: unknown) => void): void {
    if (!(data as Loadable)[loaded]) {
      super.set(sessionDigest(sessionId), data, callback);
      return;
    }
    callbackify(() => this.#overwrite(sessionDigest(sessionId), data))((error) => callback?.(error));
  }

  override destroy(sessionId: string, callback?: (error?: unknown) => void): void {
    super.destroy(sessionDigest(sessionId), callback);
  }

  async #overwrite(digest: string, data: SessionData): Promise<void> {
    await this.connections.query('update user_session set sess = $2, expire = $3 where sid = $1', [
      digest,
      data,
      data.cookie.expires ?? null,
    ]);
  }
}
