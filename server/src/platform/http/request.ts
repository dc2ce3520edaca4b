import type { IncomingMessage } from 'node:http';
import type { SignedInUser } from '../auth/signed-in-user.js';

declare global {
  // Express keeps its types in this namespace; there is no other way to add to them.
  namespace Express {
    interface Request {
      /** Names the request in the log and in every refusal. */
      id: IncomingMessage['id'];
    }
    interface User extends SignedInUser {}
  }
}

declare module 'http' {
  interface IncomingMessage {
    id: string | number | object;
  }
}

declare module 'express-session' {
  interface SessionData {
    /** Who it belongs to, kept by passport. */
    passport?: { user?: number };
    /** When this session began, in milliseconds; it ends a fixed time later whatever is done in it. */
    createdAt?: number;
    /** When it was last used, to the minute. */
    lastSeenAt?: number;
    /** What the browser calls itself, for the list of one's own sessions. */
    device?: string;
    /** The network address it was begun from. */
    address?: string;
  }
}
