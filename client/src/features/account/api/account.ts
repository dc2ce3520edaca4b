import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import type { Session } from '../../../api/session';

export type Profile = Dto<'ProfileDto'>;
export type OwnSession = Dto<'OwnSessionDto'>;
export type FirstOwner = Dto<'FirstOwnerDto'>;

export const profileQuery = queryOptions({
  queryKey: ['profile'],
  queryFn: ({ signal }) => answer(api.GET('/api/profile', { signal })),
});

export const ownSessionsQuery = queryOptions({
  queryKey: ['sessions'],
  queryFn: async ({ signal }) => (await answer(api.GET('/api/sessions', { signal }))).items,
});

export const signIn = (body: Dto<'SignInDto'>): Promise<Session> => answer(api.POST('/api/session', { body }));

export const askForAccount = (body: Dto<'SignUpDto'>): Promise<unknown> => answer(api.POST('/api/sign-ups', { body }));

export const askForPassword = (body: Dto<'EmailOnlyDto'>): Promise<unknown> =>
  answer(api.POST('/api/password-resets', { body }));

/** The three links from mails that end in choosing a password. */
export type PasswordLink = 'sign-up-completions' | 'password-reset-completions' | 'invitation-completions';

export const choosePassword = (link: PasswordLink, body: Dto<'LinkWithPasswordDto'>): Promise<Session> =>
  answer(api.POST(`/api/${link}`, { body }));

export const confirmNewAddress = (token: string): Promise<unknown> =>
  answer(api.POST('/api/email-change-completions', { body: { token } }));

export const makeFirstOwner = (body: FirstOwner): Promise<Session> => answer(api.POST('/api/first-owner', { body }));

export const changePassword = (body: Dto<'PasswordChangeDto'>): Promise<unknown> =>
  answer(api.POST('/api/password-changes', { body }));

export const askForNewAddress = (body: Dto<'EmailChangeDto'>): Promise<unknown> =>
  answer(api.POST('/api/email-changes', { body }));

export function useRename(): UseMutationResult<Profile, Error, Dto<'ProfileEditDto'>> {
  return useMutation({
    mutationFn: (body) => answer(api.PATCH('/api/profile', { body })),
    meta: { touches: [profileQuery.queryKey, ['session']], showsRefusal: true },
  });
}

export function useEndSession(): UseMutationResult<unknown, Error, string> {
  return useMutation({
    mutationFn: (key) => answer(api.DELETE('/api/sessions/{key}', { params: { path: { key } } })),
    meta: { touches: [ownSessionsQuery.queryKey] },
  });
}

export function useEndOtherSessions(): UseMutationResult<unknown, Error, void> {
  return useMutation({
    mutationFn: () => answer(api.DELETE('/api/sessions')),
    meta: { touches: [ownSessionsQuery.queryKey], showsRefusal: true },
  });
}
