import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { request } from '../../../api/request';
import type { Person, Session } from '../../../api/session';

export interface Profile extends Person {
  memberSince: string;
  version: number;
}

export interface OwnSession {
  key: string;
  current: boolean;
  /** What the browser calls itself. */
  device: string;
  address: string;
  startedAt: string;
  lastSeenAt: string;
}

export const profileQuery = queryOptions({
  queryKey: ['profile'],
  queryFn: ({ signal }) => request<Profile>('GET', '/api/profile', { signal }),
});

export const ownSessionsQuery = queryOptions({
  queryKey: ['sessions'],
  queryFn: async ({ signal }) =>
    (await request<{ items: readonly OwnSession[] }>('GET', '/api/sessions', { signal })).items,
});

export const signIn = (body: { email: string; password: string }): Promise<Session> =>
  request('POST', '/api/session', { body });

export const askForAccount = (body: { name: string; email: string }): Promise<void> =>
  request('POST', '/api/sign-ups', { body });

export const askForPassword = (body: { email: string }): Promise<void> =>
  request('POST', '/api/password-resets', { body });

/** The three links from mails that end in choosing a password. */
export type PasswordLink = 'sign-up-completions' | 'password-reset-completions' | 'invitation-completions';

export const choosePassword = (link: PasswordLink, body: { token: string; password: string }): Promise<Session> =>
  request('POST', `/api/${link}`, { body });

export const confirmNewAddress = (token: string): Promise<void> =>
  request('POST', '/api/email-change-completions', { body: { token } });

export interface FirstOwner {
  setupCode: string;
  name: string;
  email: string;
  password: string;
}

export const makeFirstOwner = (body: FirstOwner): Promise<Session> => request('POST', '/api/first-owner', { body });

export const changePassword = (body: { currentPassword: string; newPassword: string }): Promise<void> =>
  request('POST', '/api/password-changes', { body });

export const askForNewAddress = (body: { currentPassword: string; email: string }): Promise<void> =>
  request('POST', '/api/email-changes', { body });

export function useRename(): UseMutationResult<Profile, Error, { name: string; version: number }> {
  return useMutation({
    mutationFn: (body) => request<Profile>('PATCH', '/api/profile', { body }),
    meta: { touches: [profileQuery.queryKey, ['session']], showsRefusal: true },
  });
}

export function useEndSession(): UseMutationResult<void, Error, string> {
  return useMutation({
    mutationFn: (key) => request<void>('DELETE', `/api/sessions/${encodeURIComponent(key)}`),
    meta: { touches: [ownSessionsQuery.queryKey] },
  });
}

export function useEndOtherSessions(): UseMutationResult<void, Error, void> {
  return useMutation({
    mutationFn: () => request<void>('DELETE', '/api/sessions'),
    meta: { touches: [ownSessionsQuery.queryKey], showsRefusal: true },
  });
}
