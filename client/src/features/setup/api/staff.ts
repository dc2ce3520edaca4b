import { queryOptions, useMutation, type UseMutationResult } from '@tanstack/react-query';
import { answer, api, type Dto } from '../../../api/client';
import { list } from '../../../api/list';
import type { ListState } from '../../../lib/list-state';

export type StaffMember = Dto<'StaffMemberDto'>;
export type Invitation = Dto<'InvitationDto'>;
export type StaffEdit = Dto<'StaffEditDto'> & { id: number };

const staffKey = ['staff'] as const;

export const staffQuery = (state: ListState) =>
  queryOptions({
    queryKey: [...staffKey, state] as const,
    queryFn: ({ signal }) => list('/api/staff', state, signal),
  });

export function useInvite(): UseMutationResult<StaffMember, Error, { body: Invitation; key: string }> {
  return useMutation({
    mutationFn: ({ body, key }) =>
      answer(api.POST('/api/invitations', { body, params: { header: { 'Idempotency-Key': key } } })),
    meta: { touches: [staffKey], showsRefusal: true },
  });
}

export function useInviteAgain(): UseMutationResult<unknown, Error, number> {
  return useMutation({
    mutationFn: (id) => answer(api.POST('/api/staff/{id}/invitations', { params: { path: { id } } })),
  });
}

export function useEditStaff(): UseMutationResult<StaffMember, Error, StaffEdit> {
  return useMutation({
    mutationFn: ({ id, ...body }) => answer(api.PATCH('/api/staff/{id}', { body, params: { path: { id } } })),
    meta: { touches: [staffKey, ['session']], showsRefusal: true },
  });
}

export function useEndStaffSessions(): UseMutationResult<unknown, Error, number> {
  return useMutation({
    mutationFn: (id) => answer(api.DELETE('/api/staff/{id}/sessions', { params: { path: { id } } })),
    meta: { showsRefusal: true },
  });
}
