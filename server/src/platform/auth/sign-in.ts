import type { Request, Response } from 'express';
import type { Clock } from '../clock/clock.js';
import type { SignedInUser } from './signed-in-user.js';

/** Starts a session under a new id (the visitor's old one is dead) that belongs to this person. */
export async function startSession(request: Request, user: SignedInUser, clock: Clock): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    request.logIn(user, (error: unknown) => (error ? reject(asError(error)) : resolve()));
  });
  const now = clock.now().getTime();
  request.session.createdAt = now;
  request.session.lastSeenAt = now;
  request.session.device = (request.get('user-agent') ?? '').slice(0, 200);
  request.session.address = request.ip ?? '';
}

/** Ends the session in the database and makes the browser forget what it holds of it. */
export async function endSession(request: Request, response: Response, cookieName: string): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    request.session.destroy((error: unknown) => (error ? reject(asError(error)) : resolve()));
  });
  response.clearCookie(cookieName, { path: '/' });
  response.setHeader('Clear-Site-Data', '"cache", "storage"');
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}
